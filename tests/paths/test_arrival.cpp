// What reaches a position through free space.

#include "paths/arrival.h"

#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::agrees;
using testing_support::printed;
using testing_support::relatively_near;

Laser laser(Profile profile = Profile::gaussian) {
    return {"green", nanometres(532), watts(5),
            CircularBeam(profile, millimetres(2), metres(0), milliradians(1)), std::nullopt};
}

// By hand: d = 2.061553 mm, 7 mm take 1 − exp(−2·(7/2.061553)²) = 1 − 9.7e-11 of 5 W;
// 5 W / (π · 0.007² / 4) = 129922.4 W/m².
TEST(Arrival, ABeamSmallerThanTheApertureIsDividedByTheAperture) {
    const Laser l = laser();
    EXPECT_TRUE(agrees(Arrival(l, metres(0.5)).averaged_over(millimetres(7)).in_si(), printed(129922.4, 1)));
    EXPECT_LT(Arrival(l, metres(0.5)).averaged_over(millimetres(7)),
              Arrival(l, metres(0.5)).peak_irradiance());
}

TEST(Arrival, ASmallApertureSeesThePeak) {
    for (Profile profile : {Profile::gaussian, Profile::top_hat}) {
        const Laser l = laser(profile);
        const Arrival arrival(l, metres(20));
        EXPECT_TRUE(relatively_near(arrival.averaged_over(metres(1e-7)).in_si(),
                                    arrival.peak_irradiance().in_si(), 1e-8));
    }
}

TEST(Arrival, WithoutAnApparentSourceTheSourceIsSmall) {
    const Laser l = laser();
    EXPECT_TRUE(Arrival(l, metres(1)).small_source());
    EXPECT_EQ(Arrival(l, metres(1)).subtense(), radians(0));
}

// By hand: 2 atan(3 mm / 2 / 0.3 m) = 9.99992 mrad.
TEST(Arrival, SubtenseOfAnApparentSource) {
    Laser l = laser();
    l.apparent_source = millimetres(3);
    EXPECT_FALSE(Arrival(l, metres(0.3)).small_source());
    EXPECT_TRUE(agrees(Arrival(l, metres(0.3)).subtense().in_si() * 1e3, printed(9.99992, 5)));
}

// BGI 832 and BGV B2 measure at 100 mm: nothing nearer can be in focus.
TEST(Arrival, NearerThan100MillimetresTheSubtenseIsThatAt100Millimetres) {
    Laser l = laser();
    l.apparent_source = millimetres(3);
    EXPECT_EQ(Arrival(l, millimetres(10)).viewing_distance(), millimetres(100));
    EXPECT_EQ(Arrival(l, millimetres(10)).subtense(), Arrival(l, millimetres(100)).subtense());
    EXPECT_EQ(Arrival(l, millimetres(101)).viewing_distance(), millimetres(101));
}

TEST(Arrival, ExposedAreaIsTheDiscOfTheReferenceDiameter) {
    const Laser l = laser();
    const double d = 2.061552812808830e-3;
    EXPECT_TRUE(relatively_near(Arrival(l, metres(0.5)).exposed_area().in_si(), pi * d * d / 4, 1e-14));
}

}  // namespace
}  // namespace dosimetry
