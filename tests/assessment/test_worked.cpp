// Complete examples worked by hand.

#include "assessment/assess.h"
#include "support/expect.h"
#include "support/setups.h"

namespace dosimetry {
namespace {

using namespace testing_support;

// A workshop laser: 10.6 µm, 100 W, flat top of 10 mm, 5 mrad, 2 m away, 10 s.
//   d = √(10² + 10²) mm = 14.1421356 mm; 4 · 100 W / (π d²) = 636619.77 W/m², the same in every aperture
//   inside the beam. From 10 s on 1000 W/m² at the eye (3.5 mm) and at the skin (3.5 mm, exposed area 1.57e-4
//   m² below 0.01 m²); at exactly 10 s the rows that end there hold too: 5600 · 10^0.25 / 10 = 995.8364 W/m².
//   Ratio 639.2815. Permitted: 636619.77 t = 5600 t^0.25, t = (5600/636619.77)^(4/3) = 1.8158384 ms.
TEST(Worked, CarbonDioxideLaserInAWorkshop) {
    dosimetry::Setup setup = green_setup();
    LaserSetup& laser = setup.sources[0];
    laser.wavelength = Stated<Length>("10.6 um");
    laser.power = Stated<RadiantPower>("100 W");
    laser.beam.profile = Profile::top_hat;
    laser.beam.diameter = Stated<Length>("10 mm");
    laser.beam.divergence = Stated<PlaneAngle>("5 mrad");
    setup.positions = {position("bench", "2 m", "10 s")};
    const PositionAssessment p = assessed(setup).positions[0];
    EXPECT_TRUE(agrees(p.beam_diameter.in_si() * 1e3, printed(14.1421356, 7)));
    EXPECT_TRUE(agrees(p.peak_irradiance.in_si(), printed(636619.77, 2)));
    ASSERT_EQ(p.criteria.size(), 4u);
    for (const Criterion& c : p.criteria) {
        EXPECT_TRUE(agrees(si(c.exposure), printed(636619.77, 2)));
        EXPECT_EQ(c.aperture, millimetres(3.5));
    }
    EXPECT_TRUE(agrees(p.governing.ratio, printed(639.2814, 4)));
    EXPECT_TRUE(agrees(p.permitted_exposure->in_si() * 1e3, printed(1.8158384, 7)));
    // beyond 10 s only 1000 W/m² is left
    setup.positions = {position("bench", "2 m", "11 s")};
    EXPECT_TRUE(agrees(assessed(setup).positions[0].governing.ratio, printed(636.61977, 5)));
}

// A blue source seen as 30 mm at 1 m, 1 mW, 5 mm, 20 mrad, 50 s.
//   α = 2 atan(0.015) = 29.99775 mrad; d = √(5² + 20²) mm = 20.6155281 mm; η(7 mm) = 0.205933633; E
//   = 5.35107847 W/m². Photochemical: the cone of 11 mrad holds (11/29.99775)² = 0.134464611 of it,
//   0.719530683 W/m², 35.9765341 J/m² in 50 s; limit 100 · CB(450 nm) = 100 J/m². Ratio 0.359765341. Thermal,
//   beyond T2 = 10 · 10^((29.99775 − 1.5)/98.5) = 19.4678173 s: 18 · (29.99775/1.5) · T2^-0.25 = 171.372296
//   W/m².
TEST(Worked, ExtendedBlueSource) {
    dosimetry::Setup setup = green_setup();
    LaserSetup& laser = setup.sources[0];
    laser.wavelength = Stated<Length>("450 nm");
    laser.power = Stated<RadiantPower>("1 mW");
    laser.beam.diameter = Stated<Length>("5 mm");
    laser.beam.divergence = Stated<PlaneAngle>("20 mrad");
    laser.apparent_source = Stated<Length>("30 mm");
    setup.positions = {position("viewer", "1 m", "50 s")};
    const PositionAssessment p = assessed(setup).positions[0];
    const Criterion& blue = criterion(p, Tissue::eye, Effect::retinal_photochemical);
    EXPECT_EQ(blue.quantity, LimitQuantity::radiant_exposure);
    EXPECT_TRUE(agrees(si(blue.exposure), printed(35.9765341, 7)));
    EXPECT_TRUE(relatively_near(si(blue.limit), 100, 1e-12));
    EXPECT_TRUE(agrees(blue.ratio, printed(0.359765341, 9)));
    EXPECT_TRUE(agrees(blue.subtense.in_si() * 1e3, printed(29.99775, 5)));
    const Criterion& thermal = criterion(p, Tissue::eye, Effect::retinal_thermal);
    EXPECT_TRUE(agrees(si(thermal.exposure), printed(5.35107847, 8)));
    EXPECT_TRUE(agrees(si(thermal.limit), printed(171.372296, 6)));
    EXPECT_EQ(p.governing.effect, Effect::retinal_photochemical);
    EXPECT_TRUE(p.within_limits());
}

// Two limits for one eye: 1310 nm, 0.5 W, 0.1 mm and 1 mrad at 0.1 m, 100 s, smaller than every aperture.
//   Retina: 0.5 W / (π 0.007²/4) = 12992.24 W/m² against 10 · 5 · CC, CC = 8 + 10^2.4 = 259.1886: 12959.43
//   W/m², 1.00253. Cornea and lens: 0.5 W / (π 0.0035²/4) = 51968.96 W/m² against 2000 · 5 = 10000
//   W/m², 5.196896, which governs.
TEST(Worked, TheSecondLimitOfTheEyeGovernsAt1310Nanometres) {
    dosimetry::Setup setup = green_setup();
    LaserSetup& laser = setup.sources[0];
    laser.wavelength = Stated<Length>("1310 nm");
    laser.power = Stated<RadiantPower>("0.5 W");
    laser.beam.diameter = Stated<Length>("0.1 mm");
    setup.positions = {position("fibre", "0.1 m", "100 s")};
    const PositionAssessment p = assessed(setup).positions[0];
    EXPECT_TRUE(agrees(criterion(p, Tissue::eye, Effect::retinal_thermal).ratio, printed(1.00253, 5)));
    EXPECT_TRUE(agrees(criterion(p, Tissue::eye, Effect::anterior_thermal).ratio, printed(5.196896, 6)));
    EXPECT_EQ(p.governing.effect, Effect::anterior_thermal);
}

// Ultraviolet dose over a day: 275 nm, 1 µW, flat top of 1 cm, 1 hour. 1e-6 W / (π 0.01²/4) = 0.01273240
// W/m²; in 3600 s 45.83662 J/m² against 30 J/m²: 1.527887 times; permitted 30/0.01273240 = 2356.194 s.
TEST(Worked, UltravioletDose) {
    dosimetry::Setup setup = green_setup();
    LaserSetup& laser = setup.sources[0];
    laser.wavelength = Stated<Length>("275 nm");
    laser.power = Stated<RadiantPower>("1 uW");
    laser.beam.profile = Profile::top_hat;
    laser.beam.diameter = Stated<Length>("10 mm");
    laser.beam.divergence = Stated<PlaneAngle>("1e-9 rad");
    setup.positions = {position("bench", "0.3 m", "1 h")};
    const PositionAssessment p = assessed(setup).positions[0];
    ASSERT_EQ(p.criteria.size(), 2u);
    for (const Criterion& c : p.criteria) {
        EXPECT_EQ(c.quantity, LimitQuantity::radiant_exposure);
        EXPECT_TRUE(agrees(si(c.exposure), printed(45.83662, 5)));
        EXPECT_TRUE(agrees(c.ratio, printed(1.527887, 6)));
    }
    EXPECT_TRUE(agrees(p.permitted_exposure->in_si(), printed(2356.194, 3)));
}

}  // namespace
}  // namespace dosimetry
