// Hazard distances: inside them the exposure is above the limit, beyond them nowhere.

#include "assessment/assess.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::agrees;
using testing_support::any_setup;
using testing_support::assessed;
using testing_support::green_setup;
using testing_support::position;
using testing_support::printed;
using testing_support::ratio_at;
using testing_support::relatively_near;

const HazardDistance& distance_of(const Assessment& assessment, Tissue tissue) {
    for (const HazardDistance& d : assessment.hazard_distances)
        if (d.tissue == tissue) return d;
    throw std::runtime_error("no such distance");
}

// A Gaussian beam falls to the limit where 1 − exp(−2a²/d²) = E_EL π a²/(4 P). With a = 7 mm, E_EL
// = 25.455844 W/m² and P = 5 W the share is 1.9593110e-4, so d = a √(2 / −ln(1 − share)) = 707.195 mm and z =
// √(d² − d0²)/θ.
TEST(HazardDistance, OfTheGreenBeamInClosedForm) {
    const double limit = 18 * std::pow(0.25, -0.25);
    const double share = limit * pi * 0.007 * 0.007 / 4 / 5;
    const double d = 0.007 * std::sqrt(-2 / std::log1p(-share));
    const double z = std::sqrt(d * d - 0.002 * 0.002) / 1e-3;
    const Assessment assessment = assessed(green_setup());
    EXPECT_TRUE(relatively_near(distance_of(assessment, Tissue::eye).distance->in_si(), z, 1e-9));
    EXPECT_TRUE(agrees(distance_of(assessment, Tissue::eye).distance->in_si(), printed(707.2, 1)));
}

// Handbooks give the linear form (√(4P/(π E)) − d0)/θ for a top-hat of spreading edge. The beam here is a
// hyperbola, √(4P/(π E) − d0²)/θ: 500.088 mm and 2 mm give 500.084 m, the linear form 498.088 m.
TEST(HazardDistance, OfATopHatInClosedForm) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].beam.profile = Profile::top_hat;
    const double limit = 18 * std::pow(0.25, -0.25);
    const double z = std::sqrt(4 * 5 / (pi * limit) - 0.002 * 0.002) / 1e-3;
    EXPECT_TRUE(relatively_near(distance_of(assessed(setup), Tissue::eye).distance->in_si(), z, 1e-9));
    EXPECT_TRUE(agrees(distance_of(assessed(setup), Tissue::eye).distance->in_si(), printed(500.084, 3)));
}

TEST(HazardDistance, ZeroForAHarmlessBeam) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("0.1 mW");
    const HazardDistance d = distance_of(assessed(setup), Tissue::eye);
    EXPECT_EQ(d.distance, metres(0));
    EXPECT_FALSE(d.beyond_search.has_value());
}

TEST(HazardDistance, BeyondTheSearchForAParallelBeam) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].beam.divergence = Stated<PlaneAngle>("1e-8 rad");
    const HazardDistance d = distance_of(assessed(setup), Tissue::eye);
    EXPECT_FALSE(d.distance.has_value());
    EXPECT_EQ(d.beyond_search, farthest_search);
}

TEST(HazardDistance, OnePerTissueAndDifferentExposure) {
    dosimetry::Setup setup = green_setup();
    setup.positions.push_back(position("b", "1 m", "250 ms"));  // the same duration in other words
    setup.positions.push_back(position("c", "1 m", "10 s"));
    EXPECT_EQ(assessed(setup).hazard_distances.size(), 4u);
}

// A focus 20 m away: at the exit the wide beam is harmless, around the focus it is not.
TEST(HazardDistance, ReachesBeyondAFocus) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("10 mW");
    setup.sources[0].beam.diameter = Stated<Length>("200 mm");
    setup.sources[0].beam.divergence.reset();
    setup.sources[0].beam.waist = Stated<Length>("0.1 mm");
    setup.sources[0].beam.waist_at = Stated<Length>("20 m");
    EXPECT_LT(ratio_at(setup, metres(0.01), seconds(0.25), Tissue::eye), 1.0);
    const Length edge = *distance_of(assessed(setup), Tissue::eye).distance;
    EXPECT_GT(edge, metres(20));
    EXPECT_LT(edge, metres(30));
}

void expect_distances_hold(const Setup& setup) {
    const Assessment assessment = assessed(setup);
    for (const HazardDistance& d : assessment.hazard_distances) {
        const auto ratio = [&](double z_m) {
            return ratio_at(setup, metres(z_m), d.exposure.value, d.tissue);
        };
        if (!d.distance) {
            RC_ASSERT(ratio(farthest_search.in_si()) > 1.0);
            continue;
        }
        double from_m = d.distance->in_si();
        if (from_m > 0) {
            RC_ASSERT(ratio(from_m) <= 1.0);
            RC_ASSERT(ratio(from_m * (1 - 1e-8)) > 1.0);
        } else {
            from_m = nearest_search.in_si();
        }
        constexpr int steps = 3000;
        const double decades = std::log10(farthest_search.in_si() / from_m);
        for (int i = 1; i < steps; ++i)
            RC_ASSERT(ratio(from_m * std::pow(10.0, decades * i / steps)) <= 1.0 + 1e-12);
    }
}

RC_GTEST_PROP(HazardDistanceProperty, NothingBeyondIsAboveALimit, ()) {
    expect_distances_hold(*any_setup());
}

// Extended sources: the limit falls with the distance while the beam still keeps its size, so the ratio has a
// maximum away from the exit. The power is chosen such that only its tip is above the limit.
RC_GTEST_PROP(HazardDistanceProperty, ASmallSummitIsNotOverlooked, ()) {
    dosimetry::Setup setup = *any_setup();
    LaserSetup& laser = setup.sources.front();
    laser.wavelength =
        Stated<Length>(testing_support::with_unit(*testing_support::log_uniform(400, 1350), "nm"));
    laser.apparent_source =
        Stated<Length>(testing_support::with_unit(*testing_support::log_uniform(1e-4, 0.3), "m"));
    laser.power = Stated<RadiantPower>("1 W");
    double summit = 0;
    constexpr int steps = 30000;
    for (int i = 0; i <= steps; ++i)
        summit = std::max(summit, ratio_at(setup, metres(1e-3 * std::pow(10.0, 9.0 * i / steps)),
                                           setup.positions.front().exposure.value, Tissue::eye));
    laser.power = Stated<RadiantPower>(testing_support::with_unit(1.001 / summit, "W"));
    expect_distances_hold(setup);
    const Length distance = distance_of(assessed(setup), Tissue::eye).distance.value_or(farthest_search);
    RC_ASSERT(distance > metres(0));
}

// Large areas of skin above 1400 nm: on the plateau between 0.01 and 0.1 m² limit and exposure fall together.
RC_GTEST_PROP(HazardDistanceProperty, LargeAreasOfSkin, ()) {
    dosimetry::Setup setup = *any_setup();
    LaserSetup& laser = setup.sources.front();
    laser.wavelength = Stated<Length>("10.6 um");
    laser.power =
        Stated<RadiantPower>(testing_support::with_unit(5.0 * (1 + 1e-4 * *rc::gen::inRange(-20, 21)), "W"));
    setup.positions.front().exposure = Stated<Duration>("100 s");
    expect_distances_hold(setup);
}

}  // namespace
}  // namespace dosimetry
