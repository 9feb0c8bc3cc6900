// Power through an aperture and irradiance on the axis, against numerical integration of the profiles.

#include "beams/circular_beam.h"
#include "support/expect.h"
#include "support/integral.h"

namespace dosimetry {
namespace {

using testing_support::integral;
using testing_support::relatively_near;

CircularBeam collimated(Profile profile, double diameter_m) {
    return {profile, metres(diameter_m), metres(0), radians(0)};
}

const double ratios[]{1e-4, 0.01, 0.1, 0.3, 0.7, 0.999, 1.0, 1.001, 1.5, 2.5, 4.0};

TEST(Aperture, GaussianAgreesWithTheIntegral) {
    const double d = 2.061553e-3;
    const auto ring = [d](double r) {
        return 2 * pi * r * 8 / (pi * d * d) * std::exp(-8 * r * r / (d * d));
    };
    for (double ratio : ratios) {
        const double expected = integral(ring, 0, ratio * d / 2, 1e-13);
        EXPECT_TRUE(relatively_near(
            collimated(Profile::gaussian, d).fraction_through(metres(ratio * d), metres(1)), expected, 1e-12))
            << ratio;
    }
}

TEST(Aperture, TopHatAgreesWithTheIntegral) {
    const double d = 5e-3;
    const auto ring = [d](double r) { return r <= d / 2 ? 2 * pi * r * 4 / (pi * d * d) : 0.0; };
    for (double ratio : ratios) {
        const double expected = integral(ring, 0, std::min(ratio, 1.0) * d / 2, 1e-13);
        EXPECT_TRUE(relatively_near(
            collimated(Profile::top_hat, d).fraction_through(metres(ratio * d), metres(1)), expected, 1e-10))
            << ratio;
    }
}

TEST(Aperture, IsTakenAtTheDistanceAskedFor) {
    const CircularBeam beam(Profile::gaussian, millimetres(2), metres(0.3), milliradians(5));
    const double d = beam.diameter_at(metres(2)).in_si();
    const double expected = integral(
        [d](double r) { return 16 * r / (d * d) * std::exp(-8 * r * r / (d * d)); }, 0, 3.5e-3, 1e-13);
    EXPECT_TRUE(relatively_near(beam.fraction_through(millimetres(7), metres(2)), expected, 1e-12));
}

TEST(Aperture, SmallSharesKeepTheirDigits) {
    // 1 − exp(−x) computed as written would have lost every digit here.
    const double share = collimated(Profile::gaussian, 1e6).fraction_through(millimetres(1), metres(1));
    EXPECT_TRUE(relatively_near(share, 2e-18, 1e-12));
}

TEST(PeakIrradiance, TheProfileItBelongsToHoldsThePower) {
    const double d = 3e-3;
    const double gaussian = collimated(Profile::gaussian, d).peak_irradiance(watts(5), metres(1)).in_si();
    const double power = integral(
        [=](double r) { return gaussian * 2 * pi * r * std::exp(-8 * r * r / (d * d)); }, 0, 4 * d, 1e-12);
    EXPECT_TRUE(relatively_near(power, 5.0, 1e-11));
    const double top_hat = collimated(Profile::top_hat, d).peak_irradiance(watts(5), metres(1)).in_si();
    EXPECT_TRUE(relatively_near(top_hat * pi * d * d / 4, 5.0, 1e-14));
}

}  // namespace
}  // namespace dosimetry
