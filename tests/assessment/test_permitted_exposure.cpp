// The longest permitted exposure: no shorter one is above a limit, the next longer one is.

#include "assessment/assess.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::any_setup;
using testing_support::assessed;
using testing_support::green_setup;
using testing_support::ratio_at;
using testing_support::relatively_near;

double worst(const Setup& setup, double t_s) {
    const PositionSetup& p = setup.positions.front();
    double largest = 0;
    for (Tissue tissue : {Tissue::eye, Tissue::skin})
        if (p.has(tissue)) largest = std::max(largest, ratio_at(setup, p.at.value, seconds(t_s), tissue));
    return largest;
}

/// Durations to try: evenly over the decades, and each edge with its neighbours.
std::vector<double> durations_to(double longest_s) {
    std::vector<double> durations;
    constexpr int steps = 1500;
    for (int i = 0; i <= steps; ++i)
        durations.push_back(1e-13 * std::pow(longest_s / 1e-13, static_cast<double>(i) / steps));
    for (double edge :
         {1e-13, 1e-11, 1e-9, 1e-7, 5e-6, 13e-6, 625e-6, 1e-3, 0.25, 0.35, 10.0, 100.0, 1e4, 3e4})
        for (double t : {std::nextafter(edge, 0.0), edge, std::nextafter(edge, 1e9)}) durations.push_back(t);
    std::erase_if(durations, [=](double t) { return !(t >= 1e-13 && t <= longest_s); });
    return durations;
}

void expect_permitted_exposure_holds(const Setup& setup) {
    const Assessment assessment = assessed(setup);
    const PositionAssessment& position = assessment.positions.front();
    if (!position.permitted_exposure) {
        RC_ASSERT(worst(setup, 1e-13) > 1.0);
        return;
    }
    const double longest_s = position.permitted_exposure->in_si();
    for (double t : durations_to(longest_s)) RC_ASSERT(worst(setup, t) <= 1.0 + 1e-12);
    RC_ASSERT(worst(setup, longest_s) <= 1.0);
    RC_ASSERT(position.permitted_for_whole_range == (longest_s == 3e4));
    if (!position.permitted_for_whole_range) {
        RC_ASSERT(worst(setup, std::nextafter(longest_s * (1 + 1e-9), 1e9)) > 1.0);
    }
}

RC_GTEST_PROP(PermittedExposureProperty, NothingShorterIsAboveALimit, ()) {
    expect_permitted_exposure_holds(*any_setup());
}

RC_GTEST_PROP(PermittedExposureProperty, EachTissueAlone, ()) {
    dosimetry::Setup setup = *any_setup();
    (*rc::gen::arbitrary<bool>() ? setup.positions.front().eye : setup.positions.front().skin) = false;
    expect_permitted_exposure_holds(setup);
}

// At 10 ps the retinal limit doubles. Between 2.9 kW and 5.8 kW the limit is reached before and not right
// after. By hand: 1e-3 J/m² · π · 0.007²/4 = 3.848451e-8 J through the pupil; at 5 kW that takes 7.696902 ps.
TEST(PermittedExposure, ReachedJustBeforeALimitStepsUp) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("5 kW");
    const Assessment assessment = assessed(setup);
    ASSERT_TRUE(assessment.positions[0].permitted_exposure.has_value());
    EXPECT_TRUE(relatively_near(assessment.positions[0].permitted_exposure->in_si(), 7.696902e-12, 1e-6));
}

TEST(PermittedExposure, SweepOfPowersAcrossEveryStep) {
    dosimetry::Setup setup = green_setup();
    for (int i = -300; i <= 300; ++i) {
        setup.sources[0].power = Stated<RadiantPower>(shortest(std::pow(10, i / 50.0)) + " W");
        const PositionAssessment position = assessed(setup).positions[0];
        if (!position.permitted_exposure) continue;
        EXPECT_LE(worst(setup, position.permitted_exposure->in_si()), 1.0) << setup.sources[0].power.text;
    }
}

TEST(PermittedExposure, NoneWhereTheShortestDurationIsAboveTheLimit) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("1e9 W");
    const PositionAssessment position = assessed(setup).positions[0];
    EXPECT_FALSE(position.permitted_exposure.has_value());
    EXPECT_FALSE(position.permitted_for_whole_range);
}

TEST(PermittedExposure, TheWholeRangeForAWeakBeam) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("1 uW");
    const PositionAssessment position = assessed(setup).positions[0];
    EXPECT_EQ(position.permitted_exposure, seconds(3e4));
    EXPECT_TRUE(position.permitted_for_whole_range);
}

}  // namespace
}  // namespace dosimetry
