// How a beam spreads, against the textbook form of Gaussian beams (Saleh and Teich, Fundamentals of
// Photonics, section 3.1): w(z) = w0 √(1 + (z/zR)²), zR = π w0²/(M² λ).

#include "beams/circular_beam.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::agrees;
using testing_support::printed;
using testing_support::relatively_near;

TEST(Propagation, FollowsTheRayleighRangeForM2) {
    const double lambda_m = 1064e-9;
    for (double m2 : {1.0, 1.3, 25.0})
        for (double waist_at_m : {0.0, 0.7, -2.0}) {
            const double w0_m = 0.2e-3;
            const PlaneAngle divergence = divergence_from_m2(m2, metres(lambda_m), metres(2 * w0_m));
            const CircularBeam beam(Profile::gaussian, metres(2 * w0_m), metres(waist_at_m), divergence);
            const double rayleigh_m = pi * w0_m * w0_m / (m2 * lambda_m);
            for (double z_m : {0.0, 0.01, 0.5, 0.7, 3.0, 1000.0}) {
                const double x = (z_m - waist_at_m) / rayleigh_m;
                EXPECT_TRUE(relatively_near(beam.diameter_at(metres(z_m)).in_si(),
                                            2 * w0_m * std::sqrt(1 + x * x), 1e-14))
                    << m2 << " " << waist_at_m << " " << z_m;
            }
        }
}

// By hand: 4 · 532e-9 / (π · 2e-3) = 3.3868e-4 rad.
TEST(Propagation, DiffractionLimitOfTwoMillimetresAt532) {
    EXPECT_TRUE(
        agrees(divergence_from_m2(1, nanometres(532), millimetres(2)).in_si() * 1e4, printed(3.3868, 4)));
}

// By hand: √(2² + (1 mrad · 0.5 m = 0.5 mm)²) mm = √4.25 mm = 2.061553 mm.
TEST(Propagation, WaistAtTheExit) {
    const CircularBeam beam(Profile::gaussian, millimetres(2), metres(0), milliradians(1));
    EXPECT_EQ(beam.diameter_at(metres(0)), millimetres(2));
    EXPECT_TRUE(agrees(beam.diameter_at(metres(0.5)).in_si() * 1e3, printed(2.061553, 6)));
}

TEST(Propagation, IsSymmetricAboutTheWaistAndSmallestThere) {
    const CircularBeam beam(Profile::top_hat, millimetres(1), metres(0.4), milliradians(20));
    EXPECT_EQ(beam.diameter_at(metres(0.4)), millimetres(1));
    EXPECT_TRUE(
        relatively_near(beam.diameter_at(metres(0.3)).in_si(), beam.diameter_at(metres(0.5)).in_si(), 1e-13));
    for (double z_m = 0; z_m < 1; z_m += 0.01) EXPECT_GE(beam.diameter_at(metres(z_m)), millimetres(1));
}

TEST(Propagation, FarFieldIsDivergenceTimesDistance) {
    const CircularBeam beam(Profile::gaussian, millimetres(2), metres(0), milliradians(1));
    EXPECT_TRUE(relatively_near(beam.diameter_at(metres(1e6)).in_si(), 1000.0, 1e-11));
}

}  // namespace
}  // namespace dosimetry
