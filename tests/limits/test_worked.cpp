// Limits worked by hand from the formulas of ICNIRP 2013, the digits derived beside each value.

#include <cmath>

#include "limits/icnirp.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::agrees;
using testing_support::limits_of;
using testing_support::printed;
using testing_support::si;

double limit(Tissue tissue, Effect effect, double nm, double t_s, double alpha_mrad = 0, double area_m2 = 0) {
    for (const Limit& l :
         limits_of({tissue, nanometres(nm), seconds(t_s), milliradians(alpha_mrad), Area::from_si(area_m2)}))
        if (l.row->effect == effect && !l.row->alternative_form) return si(l.value);
    ADD_FAILURE() << "no such limit";
    return 0;
}

// 18 · 0.25^0.75 = 18 · 0.353553 = 6.36396 J/m².
TEST(Icnirp2013Worked, VisibleQuarterSecond) {
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_thermal, 532, 0.25), printed(6.36396, 5)));
}

// CA(905) = 10^(0.002 · 205) = 2.570396; from 10 s on a small source has 10 · CA
// = 25.70396 W/m².
TEST(Icnirp2013Worked, NearInfrared905LongerThan10Seconds) {
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_thermal, 905, 100), printed(25.70396, 5)));
}

// CC(1310) = 8 + 10^(0.04 · 60) = 8 + 251.18864 = 259.18864; 90 · 0.1^0.75 = 16.00451; product 4148.188 J/m².
TEST(Icnirp2013Worked, NearInfrared1310TenthOfASecond) {
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_thermal, 1310, 0.1), printed(4148.188, 3)));
    // beside it the borrowed limit of the skin, 11000 · 0.1^0.25 · 5 = 30928.8 J/m²
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::anterior_thermal, 1310, 0.1), printed(30928.8, 1)));
}

// Extended source, 20 mrad, below alpha_max = 100 mrad at 0.25 s: CE = 20/1.5; 6.363961 · 13.333333
// = 84.85281 J/m².
TEST(Icnirp2013Worked, ExtendedSourceBelowAlphaMax) {
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_thermal, 532, 0.25, 20), printed(84.85281, 5)));
}

// 300 mrad at 10 ms: alpha_max = 200 · 0.01^0.5 = 20 mrad, CE = 300²/(1.5 · 20) = 3000; 18 · 0.01^0.75 =
// 0.5692100; product 1707.630 J/m².
TEST(Icnirp2013Worked, ExtendedSourceAboveAlphaMaxThatGrowsWithTime) {
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_thermal, 532, 0.01, 300), printed(1707.630, 3)));
}

// 3 mrad at 1 µs: alpha_max = 5 mrad, CE = 2, 4e-3 J/m²; at 10 mrad CE = 100/(1.5 · 5) = 13.3333.
TEST(Icnirp2013Worked, ExtendedSourceShortPulse) {
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_thermal, 532, 1e-6, 3) * 1e3, printed(4.0, 6)));
    EXPECT_TRUE(
        agrees(limit(Tissue::eye, Effect::retinal_thermal, 532, 1e-6, 10) * 1e3, printed(26.66667, 5)));
}

// 50 mrad: T2 = 10 · 10^(48.5/98.5) = 31.0732 s. Before it 18 · t^0.75 · CE; beyond it
// 18 · (50/1.5) · 31.0732^-0.25 = 600 · 0.423549 = 254.129 W/m².
TEST(Icnirp2013Worked, ExtendedSourceAroundT2) {
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_thermal, 650, 1000, 50), printed(254.129, 3)));
    // at 20 s: 600 · 20^0.75 = 600 · 9.457416 = 5674.45 J/m²
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_thermal, 650, 20, 50), printed(5674.45, 2)));
}

// CB(488) = 10^(0.02 · 38) = 5.754399; 100 CB J/m² up to 100 s, then CB W/m².
TEST(Icnirp2013Worked, RetinalPhotochemical488) {
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_photochemical, 488, 50), printed(575.4399, 4)));
    EXPECT_TRUE(agrees(limit(Tissue::eye, Effect::retinal_photochemical, 488, 500), printed(5.754399, 6)));
}

// Acceptance angle: 11 mrad up to 100 s, 1.1 · √400 = 22 mrad at 400 s, 110 mrad from 10⁴ s on.
TEST(Icnirp2013Worked, AcceptanceAngleOfThePhotochemicalLimit) {
    for (const auto& [t, mrad] : {std::pair{50.0, 11.0}, std::pair{100.0, 11.0}, std::pair{400.0, 22.0},
                                  std::pair{1e4, 110.0}, std::pair{3e4, 110.0}})
        for (const Limit& l : limits_of({Tissue::eye, nanometres(450), seconds(t), radians(0), Area{}}))
            if (l.row->effect == Effect::retinal_photochemical) {
                EXPECT_NEAR(l.acceptance.in_si() * 1e3, mrad, 1e-9) << t;
            }
}

// The radiance form is the irradiance form seen through its cone: 1e6 J/(m² sr) over 11 mrad, π/4 · 0.011²
// sr, is 95 J/m².
TEST(Icnirp2013Worked, RadianceFormAgreesWithTheDoseForm) {
    for (const Limit& l : limits_of({Tissue::eye, nanometres(420), seconds(50), radians(0), Area{}}))
        if (l.row->alternative_form) {
            EXPECT_NEAR(si(l.value) * pi / 4 * 0.011 * 0.011, 95.0, 0.05);
        }
}

// 5600 · 1^0.25 J/m² and 3.5 mm at the skin; from 10 s 1000 W/m², less for large areas: 10 / 0.05 = 200 W/m².
TEST(Icnirp2013Worked, CarbonDioxideLaserOnTheSkin) {
    EXPECT_EQ(limit(Tissue::skin, Effect::skin_thermal, 10600, 1), 5600.0);
    EXPECT_EQ(limit(Tissue::skin, Effect::skin_thermal, 10600, 60, 0, 0.005), 1000.0);
    EXPECT_NEAR(limit(Tissue::skin, Effect::skin_thermal, 10600, 60, 0, 0.05), 200.0, 1e-10);
    EXPECT_NEAR(limit(Tissue::skin, Effect::skin_thermal, 10600, 60, 0, 2), 100.0, 1e-12);
    // shorter than 10 s and below 1400 nm the area does not matter
    EXPECT_EQ(limit(Tissue::skin, Effect::skin_thermal, 10600, 1, 0, 2), 5600.0);
    EXPECT_EQ(limit(Tissue::skin, Effect::skin_thermal, 1064, 60, 0, 2), 10000.0);
}

TEST(Icnirp2013Worked, LimitingApertures) {
    const auto aperture_mm = [](Tissue tissue, double nm, double t_s) {
        return limits_of({tissue, nanometres(nm), seconds(t_s), radians(0), Area{}}).back().aperture.in_si() *
               1e3;
    };
    EXPECT_NEAR(aperture_mm(Tissue::eye, 532, 1), 7, 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::eye, 250, 1e3), 1, 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::eye, 10600, 0.1), 1, 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::eye, 10600, 1), 1.5, 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::eye, 10600, 9.99), 1.5 * std::pow(9.99, 0.375), 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::eye, 10600, 10), 3.5, 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::eye, 1e5, 1), 11, 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::eye, 1300, 1), 3.5, 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::skin, 532, 1), 3.5, 1e-12);
    EXPECT_NEAR(aperture_mm(Tissue::skin, 2e5, 1), 11, 1e-12);
}

TEST(Icnirp2013Worked, SubtenseAsJudgedIsAtLeastAlphaMinOnTheRetina) {
    const auto judged = [](double nm, double mrad) {
        return limits_of({Tissue::eye, nanometres(nm), seconds(1), milliradians(mrad), Area{}})
            .front()
            .subtense;
    };
    EXPECT_EQ(judged(532, 0), milliradians(1.5));
    EXPECT_EQ(judged(532, 20), milliradians(20));
    EXPECT_EQ(judged(10600, 20), radians(0));
}

// What the trail of a limit needs: each factor after those it is made from, with its numbers.
TEST(Derivation, ShowsFactorsInTheOrderTheyAreNeeded) {
    const LimitQuery query{Tissue::eye, nanometres(905), seconds(0.01), milliradians(300), Area{}};
    const auto limits = limits_of(query);
    const auto steps = testing_support::icnirp().derivation(*limits.front().row, query);
    std::vector<std::string> symbols;
    for (const FactorStep& step : steps) symbols.push_back(step.symbol);
    EXPECT_EQ(symbols, (std::vector<std::string>{"CA", "alpha_min", "alpha_max", "CE", "a"}));
    EXPECT_EQ(steps[0].with_numbers, "10^(0.002·(905 − 700))");
    EXPECT_EQ(steps[3].with_numbers, "300^2/(1.5·20)");
    EXPECT_NEAR(steps[3].value, 3000, 1e-9);
    EXPECT_EQ(steps[4].unit, "mm");
    for (const FactorStep& step : steps) {
        EXPECT_FALSE(step.meaning.empty());
        EXPECT_FALSE(step.clause.empty());
        EXPECT_FALSE(step.provenance.empty());
    }
}

}  // namespace
}  // namespace dosimetry
