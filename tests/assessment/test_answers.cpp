// What every answer holds, whatever the question.

#include "assessment/assess.h"
#include "documents/result.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::any_setup;
using testing_support::assessed;
using testing_support::green_setup;
using testing_support::position;
using testing_support::relatively_near;

bool has(const std::vector<std::string>& texts, const std::string& part) {
    return std::any_of(texts.begin(), texts.end(),
                       [&](const std::string& t) { return t.find(part) != std::string::npos; });
}

RC_GTEST_PROP(AnswersProperty, RatiosScaleWithThePower, ()) {
    dosimetry::Setup setup = *any_setup();
    const Assessment one = assessed(setup);
    const double factor = *testing_support::log_uniform(1e-3, 1e3);
    setup.sources[0].power =
        Stated<RadiantPower>(testing_support::with_unit(setup.sources[0].power.value.in_si() * factor, "W"));
    const Assessment other = assessed(setup);
    RC_ASSERT(one.positions[0].criteria.size() == other.positions[0].criteria.size());
    for (std::size_t i = 0; i < one.positions[0].criteria.size(); ++i)
        RC_ASSERT(relatively_near(other.positions[0].criteria[i].ratio,
                                  factor * one.positions[0].criteria[i].ratio, 1e-12));
    RC_ASSERT(relatively_near(other.positions[0].permitted_power.in_si(),
                              one.positions[0].permitted_power.in_si(), 1e-12));
}

RC_GTEST_PROP(AnswersProperty, AtThePermittedPowerTheGoverningRatioIsOne, ()) {
    dosimetry::Setup setup = *any_setup();
    setup.sources[0].power.value = assessed(setup).positions[0].permitted_power;
    RC_ASSERT(relatively_near(
        assess(setup, testing_support::library(), Trails::off).positions[0].governing.ratio, 1, 1e-12));
}

RC_GTEST_PROP(AnswersProperty, TheGoverningRatioIsTheLargestOne, ()) {
    const PositionAssessment p = assessed(*any_setup()).positions[0];
    double largest = 0;
    for (const Criterion& c : p.criteria) {
        RC_ASSERT(std::isfinite(c.ratio));
        RC_ASSERT(c.ratio > 0);
        RC_ASSERT(
            relatively_near(c.ratio, testing_support::si(c.exposure) / testing_support::si(c.limit), 1e-12));
        largest = std::max(largest, c.ratio);
    }
    RC_ASSERT(p.governing.ratio == largest);
    RC_ASSERT(p.within_limits() == (largest <= 1));
    RC_ASSERT(p.governing_criterion() != nullptr);
    RC_ASSERT(std::max(*p.required_density_eye, *p.required_density_skin) ==
              std::max(0.0, std::log10(largest)));
}

RC_GTEST_PROP(AnswersProperty, SameInputSameBytes, ()) {
    const dosimetry::Setup setup = *any_setup();
    RC_ASSERT(result_json(setup, assessed(setup), "x") == result_json(setup, assessed(setup), "x"));
    RC_ASSERT(report(setup, assessed(setup)) == report(setup, assessed(setup)));
}

RC_GTEST_PROP(AnswersProperty, CautionsAreAlwaysThere, ()) {
    const dosimetry::Setup setup = *any_setup();
    const Assessment assessment = assessed(setup);
    for (const char* caution :
         {"does not replace one", "healthy adults", "Never look into a beam", "are not calculated here",
          "icnirp_2013_laser: The guideline itself could not be consulted"})
        RC_ASSERT(has(assessment.cautions, caution));
    RC_ASSERT(!assessment.assumptions.empty());
}

TEST(Answers, CautionsStandEvenWhereNothingIsCovered) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].wavelength = Stated<Length>("100 nm");
    EXPECT_TRUE(has(assessed(setup).cautions, "does not replace one"));
}

TEST(Answers, OutsideTheTablesNothingIsAssessed) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].wavelength = Stated<Length>("100 nm");
    setup.positions.push_back(position("b", "1 m", "35 fs"));
    const Assessment assessment = assessed(setup, Trails::record);
    EXPECT_FALSE(assessment.covered());
    EXPECT_FALSE(assessment.within_limits());
    EXPECT_TRUE(assessment.positions.empty());
    EXPECT_TRUE(assessment.hazard_distances.empty());
    ASSERT_EQ(assessment.uncovered.size(), 1u);  // once, though two positions ask
    EXPECT_EQ(assessment.uncovered[0].key, "source[0].wavelength");
}

TEST(Answers, EachExposureOutsideTheTablesIsNamed) {
    dosimetry::Setup setup = green_setup();
    setup.positions.push_back(position("b", "1 m", "35 fs"));
    setup.positions.push_back(position("c", "1 m", "31 ks"));
    // ks has no place in the table of units people use here, but s takes every prefix
    const Assessment assessment = assessed(setup);
    ASSERT_EQ(assessment.uncovered.size(), 2u);
    EXPECT_EQ(assessment.uncovered[0].key, "position[1].exposure");
    EXPECT_EQ(assessment.uncovered[0].reason,
              "an exposure of 35 fs is not covered by icnirp_2013_laser, which goes from 100 fs to "
              "30000 s");
    EXPECT_EQ(assessment.uncovered[1].key, "position[2].exposure");
}

TEST(Answers, OnlyTheTissuesAskedFor) {
    dosimetry::Setup setup = green_setup();
    setup.positions[0].skin = false;
    const PositionAssessment p = assessed(setup).positions[0];
    for (const Criterion& c : p.criteria) EXPECT_EQ(c.tissue, Tissue::eye);
    EXPECT_TRUE(p.required_density_eye.has_value());
    EXPECT_FALSE(p.required_density_skin.has_value());
}

TEST(Answers, BelowTheLimitNoDensityIsNeeded) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("0.5 mW");
    const Assessment assessment = assessed(setup);
    EXPECT_EQ(assessment.positions[0].required_density_eye, 0.0);
    EXPECT_TRUE(assessment.within_limits());
}

TEST(Answers, OnePositionAboveALimitIsEnough) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("0.9 mW");
    setup.positions.push_back(position("longer", "0.5 m", "10 s"));
    const Assessment assessment = assessed(setup);
    EXPECT_TRUE(assessment.positions[0].within_limits());
    EXPECT_FALSE(assessment.positions[1].within_limits());
    EXPECT_FALSE(assessment.within_limits());
}

TEST(Cautions, ShortExposuresMustRestOnSomething) {
    dosimetry::Setup setup = green_setup();
    EXPECT_FALSE(has(assessed(setup).cautions, "aversion"));
    EXPECT_TRUE(has(assessed(setup).assumptions, "presumes the aversion response"));
    setup.sources[0].wavelength = Stated<Length>("1064 nm");
    EXPECT_TRUE(has(assessed(setup).cautions, "nobody sees 1064 nm"));
    EXPECT_FALSE(has(assessed(setup).assumptions, "presumes the aversion response"));
}

// By hand: the sample gives the eye 5103.834 times its limit, shown with three digits, rounded up.
TEST(Cautions, ATissueLeftOutThoughItIsInDanger) {
    dosimetry::Setup setup = green_setup();
    setup.positions[0].eye = false;
    EXPECT_TRUE(
        has(assessed(setup).cautions, "the eye is not assessed, but it would receive 5110 times its limit"));
    setup.sources[0].power = Stated<RadiantPower>("0.1 mW");
    EXPECT_FALSE(has(assessed(setup).cautions, "is not assessed"));
}

TEST(Cautions, LessDivergenceThanDiffractionAllows) {
    dosimetry::Setup setup = green_setup();
    EXPECT_FALSE(has(assessed(setup).cautions, "diffraction"));
    setup.sources[0].beam.divergence = Stated<PlaneAngle>("0.3 mrad");  // 2 mm at 532 nm need 0.339 mrad
    EXPECT_TRUE(has(assessed(setup).cautions, "diffraction"));
}

}  // namespace
}  // namespace dosimetry
