// The sample of the file format: 532 nm, 5 W, 2 mm at 1/e², 1 mrad, someone at 0.5 m for 0.25 s.

#include "assessment/assess.h"
#include "support/expect.h"
#include "support/setups.h"

namespace dosimetry {
namespace {

using namespace testing_support;

class Sample : public ::testing::Test {
  protected:
    Assessment assessment = assessed(green_setup());
    const PositionAssessment& position = assessment.positions.front();
};

// d = √(2² + 0.5²) mm = 2.0615528 mm; the pupil of 7 mm takes all but 1e-10; 5 W / (π 0.007²/4) = 129922.4
// W/m². Limit 18 · 0.25^0.75 / 0.25 = 25.45584 W/m². Ratio 5103.834.
TEST_F(Sample, EyeRetinalThermal) {
    const Criterion& c = criterion(position, Tissue::eye, Effect::retinal_thermal);
    EXPECT_EQ(c.quantity, LimitQuantity::irradiance);
    EXPECT_TRUE(agrees(si(c.exposure), printed(129922.4, 1)));
    EXPECT_TRUE(agrees(si(c.limit), printed(25.456, 3)));
    EXPECT_TRUE(agrees(c.ratio, printed(5103.834, 3)));
    EXPECT_TRUE(agrees(c.margin() * 1e4, printed(1.959, 3)));
    EXPECT_EQ(c.aperture, millimetres(7));
    EXPECT_EQ(c.subtense, milliradians(1.5));
    EXPECT_EQ(c.clause, "Table 5");
    EXPECT_EQ(c.rule, "single exposure");
}

// 3.5 mm take 1 − exp(−2 · (3.5/2.0615528)²) = 0.99686368 of 5 W: 518059.70 W/m². Limit 11000 · 0.25^-0.75 =
// 31112.698.
TEST_F(Sample, Skin) {
    const Criterion& c = criterion(position, Tissue::skin, Effect::skin_thermal);
    EXPECT_TRUE(agrees(si(c.exposure), printed(518059.70, 2)));
    EXPECT_TRUE(agrees(si(c.limit), printed(31112.698, 3)));
    EXPECT_TRUE(agrees(c.ratio, printed(16.65107, 5)));
    EXPECT_EQ(c.subtense, radians(0));
}

TEST_F(Sample, TheEyeGoverns) {
    EXPECT_EQ(position.criteria.size(), 2u);
    EXPECT_EQ(position.combined.size(), 2u);
    EXPECT_EQ(position.governing.tissue, Tissue::eye);
    EXPECT_EQ(position.governing.effect, Effect::retinal_thermal);
    ASSERT_NE(position.governing_criterion(), nullptr);
    EXPECT_EQ(position.governing_criterion()->ratio, position.governing.ratio);
    EXPECT_FALSE(position.within_limits());
    EXPECT_FALSE(assessment.within_limits());
}

// 2e-3 J/m² / 129922.4 W/m² = 15.3938 ns, between 10 ps and 5 µs where that limit holds.
TEST_F(Sample, PermittedExposure) {
    EXPECT_TRUE(agrees(position.permitted_exposure->in_si() * 1e8, printed(1.54, 2)));
    EXPECT_TRUE(agrees(position.permitted_exposure->in_si() * 1e9, printed(15.3938, 4)));
}

// 5 W / 5103.834 = 0.97966 mW, the class 2 limit that everybody knows as 1 mW.
TEST_F(Sample, PermittedPower) {
    EXPECT_TRUE(agrees(position.permitted_power.in_si() * 1e3, printed(0.97966, 5)));
    EXPECT_TRUE(relatively_near(position.permitted_power_factor, 1 / position.governing.ratio, 1e-15));
}

// log10(5103.834) = 3.707897, log10(16.65107) = 1.221442.
TEST_F(Sample, RequiredOpticalDensity) {
    EXPECT_TRUE(agrees(*position.required_density_eye, printed(3.707897, 6)));
    EXPECT_TRUE(agrees(*position.required_density_skin, printed(1.221442, 6)));
}

// 8 P t / (π d²) / (h c / λ) = 2.0058391e24 photons per square metre.
TEST_F(Sample, Photons) {
    EXPECT_TRUE(agrees(position.photons_per_area.in_si() / 1e24, printed(2.0058391, 7)));
    EXPECT_TRUE(agrees(assessment.sources.front().photon_rate.in_si() / 1e19, printed(1.339, 3)));
    EXPECT_TRUE(
        agrees(assessment.sources.front().photon_energy.in_si() / 1.602176634e-19, printed(2.3305, 4)));
}

// Eye 707.2 m, by d² = d0² + θ² z²; skin: share 0.05986785, d = 19.92131 mm, z = 19.82066 m.
TEST_F(Sample, HazardDistances) {
    ASSERT_EQ(assessment.hazard_distances.size(), 2u);
    EXPECT_TRUE(agrees(assessment.hazard_distances[0].distance->in_si(), printed(707.2, 1)));
    EXPECT_TRUE(agrees(assessment.hazard_distances[1].distance->in_si(), printed(19.82066, 5)));
}

}  // namespace
}  // namespace dosimetry
