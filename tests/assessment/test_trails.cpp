// Every number can show how it came about: each step, done again from the numbers it shows, gives its result.

#include "assessment/arithmetic.h"
#include "assessment/assess.h"
#include "documents/result.h"
#include "quantities/format.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::any_setup;
using testing_support::assessed;
using testing_support::green_setup;
using testing_support::leading_number;
using testing_support::relatively_near;
using testing_support::value_of;

TEST(Arithmetic, ReadsWhatTrailsWrite) {
    EXPECT_EQ(value_of("1 − exp(−2 · 3²/3²)"), 1 - std::exp(-2));
    EXPECT_EQ(value_of("10^(0.002·(905 − 700))"), std::pow(10, 0.002 * 205));
    EXPECT_EQ(value_of("max(0, log₁₀ 100)"), 2);
    EXPECT_EQ(value_of("√(3² + 2² · (2 − 0)²) / |−1|"), 5);
    EXPECT_EQ(value_of("2 atan(0.03 / (2 · 1))"), 2 * std::atan(0.015));
    EXPECT_EQ(leading_number("1.3×10⁻⁷ J/m²"), 1.3e-7);
    EXPECT_THROW(value_of("2 + x"), std::runtime_error);
}

std::vector<const Trail*> all_trails(const Assessment& assessment) {
    std::vector<const Trail*> trails;
    for (const SourceAssessment& s : assessment.sources)
        trails.insert(trails.end(), {&s.photon_energy_trail, &s.photon_rate_trail});
    for (const PositionAssessment& p : assessment.positions) {
        for (const Criterion& c : p.criteria) trails.push_back(&c.trail);
        trails.insert(trails.end(),
                      {&p.photons_trail, &p.permitted_exposure_trail, &p.permitted_power_trail});
        if (p.required_density_eye) trails.push_back(&p.density_trail_eye);
        if (p.required_density_skin) trails.push_back(&p.density_trail_skin);
    }
    for (const HazardDistance& d : assessment.hazard_distances) trails.push_back(&d.trail);
    return trails;
}

/// What is wrong with a step, or nothing. Numbers are shown with nine digits; a few of them combined keep
/// eight, fewer where the formula takes a small difference of large numbers (1 − exp) or a large exponent.
std::string fault_of(const TrailStep& step) {
    if (step.symbol.empty() || step.meaning.empty() || step.result.empty() || step.source.empty())
        return "incomplete step " + step.symbol + " " + step.meaning;
    if (step.formula.empty() || step.with_numbers.empty()) return "";
    const double again = value_of(step.with_numbers);
    const double shown = leading_number(step.result);
    // The density is a logarithm: near a ratio of 1 its digits come from those behind the comma.
    const double absolute = step.symbol == "D" ? 1e-8 : 1e-15;
    if (relatively_near(shown, again, 2e-8) || std::fabs(shown - again) < absolute) return "";
    return step.symbol + ": " + step.with_numbers + " is " + std::to_string(again) + ", shown " + step.result;
}

std::string first_fault_of(const Assessment& assessment) {
    for (const Trail* trail : all_trails(assessment)) {
        if (trail->subject.empty() || trail->steps.empty()) return "an empty trail";
        for (const TrailStep& step : trail->steps)
            if (const std::string fault = fault_of(step); !fault.empty()) return fault;
    }
    return "";
}

// The waist stays at the exit here: nine digits of two distances leave fewer of their difference.
RC_GTEST_PROP(TrailProperty, EveryStepDoneAgainGivesItsResult, ()) {
    dosimetry::Setup setup = *any_setup();
    setup.sources[0].beam.waist_at = Stated<Length>("0 m");
    RC_ASSERT(first_fault_of(assessed(setup, Trails::record)) == "");
}

TEST(Trails, EveryWayOfStatingABeamCanBeDoneAgain) {
    dosimetry::Setup setup = green_setup();
    EXPECT_EQ(first_fault_of(assessed(setup, Trails::record)), "");
    BeamSetup& beam = setup.sources[0].beam;
    beam.measured_at = WidthDefinition::fwhm;
    EXPECT_EQ(first_fault_of(assessed(setup, Trails::record)), "");
    beam.divergence.reset();
    beam.m2 = 1.3;
    EXPECT_EQ(first_fault_of(assessed(setup, Trails::record)), "");
    beam.m2.reset();
    beam.waist = Stated<Length>("0.3 mm");
    beam.waist_at = Stated<Length>("-0.2 m");
    EXPECT_EQ(first_fault_of(assessed(setup, Trails::record)), "");
    beam.profile = Profile::top_hat;
    setup.sources[0].apparent_source = Stated<Length>("30 mm");
    setup.sources[0].wavelength = Stated<Length>("450 nm");
    setup.positions[0].exposure = Stated<Duration>("50 s");
    EXPECT_EQ(first_fault_of(assessed(setup, Trails::record)), "");
}

RC_GTEST_PROP(TrailProperty, TheLastStepOfACriterionIsItsRatio, ()) {
    const Assessment assessment = assessed(*any_setup(), Trails::record);
    for (const Criterion& c : assessment.positions.front().criteria) {
        const TrailStep& last = c.trail.steps.back();
        RC_ASSERT(last.symbol == "R");
        RC_ASSERT(last.result == exact_number(c.ratio));
        RC_ASSERT(relatively_near(leading_number(last.result), c.ratio, 1e-9 * 5.001));
    }
}

RC_GTEST_PROP(TrailProperty, RecordingChangesNoNumber, ()) {
    const dosimetry::Setup setup = *any_setup();
    const Assessment with = assessed(setup, Trails::record);
    const Assessment without = assessed(setup, Trails::off);
    RC_ASSERT(result_json(setup, with, "") == result_json(setup, without, ""));
}

TEST(Trails, AreEmptyWhenOff) {
    const Assessment assessment = assessed(green_setup(), Trails::off);
    for (const Trail* trail : all_trails(assessment)) EXPECT_TRUE(trail->steps.empty());
}

TEST(Trails, LimitValuesNameDocumentClauseAndProvenance) {
    const Assessment assessment = assessed(green_setup(), Trails::record);
    const Trail& trail = assessment.positions[0].criteria[0].trail;
    EXPECT_EQ(trail.subject, "eye, retinal thermal: exposure divided by limit");
    const auto step = [&](const std::string& symbol) {
        return *std::find_if(trail.steps.begin(), trail.steps.end(),
                             [&](const TrailStep& s) { return s.symbol == symbol; });
    };
    EXPECT_EQ(step("H_EL").formula, "18 · t^0.75 · CE");
    EXPECT_EQ(step("H_EL").with_numbers, "18 · 0.25^0.75 · 1");
    EXPECT_EQ(step("H_EL").result, "6.36396103 J/m²");
    EXPECT_NE(step("H_EL").source.find("icnirp_2013_laser, Table 5 (from memory"), std::string::npos);
    EXPECT_NE(step("CE").source.find("table of correction factors"), std::string::npos);
    EXPECT_EQ(step("λ").with_numbers, "532 nm");
    EXPECT_EQ(step("E_EL").with_numbers, "6.36396103 / 0.25");
}

// The trail of a hazard distance is a proof: the ratio there is 1.
TEST(Trails, AHazardDistanceShowsThatTheRatioThereIsOne) {
    const Assessment assessment = assessed(green_setup(), Trails::record);
    const auto& steps = assessment.hazard_distances[0].trail.steps;
    ASSERT_GE(steps.size(), 2u);
    EXPECT_EQ(steps.back().symbol, "NOHD");
    EXPECT_EQ(steps[steps.size() - 2].symbol, "R");
    EXPECT_NEAR(leading_number(steps[steps.size() - 2].result), 1.0, 1e-8);
}

}  // namespace
}  // namespace dosimetry
