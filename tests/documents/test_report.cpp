// The report for people: complete, and rounded to the safe side.

#include "assessment/assessment.h"
#include "documents/result.h"
#include "limits/limit_library.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::any_setup;
using testing_support::green_setup;

Assessment assessed(const dosimetry::Setup& setup) {
    return assess(setup, LimitLibrary::embedded(), Trails::off);
}

TEST(Report, HoldsEveryAnswer) {
    dosimetry::Setup setup = green_setup();
    setup.title = "Alignment of the amplifier line";
    setup.note = "Doors open.";
    const Assessment assessment = assessed(setup);
    const std::string text = report(setup, assessment);
    for (const char* part : {"Alignment of the amplifier line\n",
                             "Doors open.",
                             "photon-margin ",
                             "icnirp_2013_laser, table SHA-256 ",
                             "532 nm",
                             "5 W",
                             "Gaussian",
                             "2 mm (1/e²)",
                             "2.331 eV",
                             "1.340×10¹⁹ 1/s",
                             "At 0.5 m the eye would receive 5104 times the limit",
                             "> eye, retinal thermal",
                             "130000 W/m²",
                             "25.45 W/m²",
                             "518100 W/m²",
                             "31110 W/m²",
                             "15.39 ns",
                             "979.6 µW",
                             "3.71",
                             "1.23",
                             "707.2 m",
                             "19.83 m",
                             "Assumptions",
                             "Cautions",
                             "does not replace one"})
        EXPECT_NE(text.find(part), std::string::npos) << part << "\n" << text;
}

TEST(Report, VerdictsBelowAndAboveTheLimit) {
    dosimetry::Setup setup = green_setup();
    EXPECT_EQ(verdict(assessed(setup).positions[0]),
              "ABOVE THE LIMIT. At 0.5 m the eye would receive 5104 times the limit (retinal thermal).");
    setup.sources[0].power = Stated<RadiantPower>("0.5 mW");
    EXPECT_EQ(
        verdict(assessed(setup).positions[0]),
        "Within the limits. At 0.5 m the eye would receive at most 0.511 of the limit (retinal thermal).");
}

TEST(Report, ATissueLeftOutIsNamed) {
    dosimetry::Setup setup = green_setup();
    setup.positions[0].eye = false;
    const Assessment assessment = assessed(setup);
    EXPECT_NE(verdict(assessment.positions[0]).find("The eye is NOT assessed."), std::string::npos);
    EXPECT_NE(report(setup, assessment).find("(skin only)"), std::string::npos);
}

TEST(Report, DensitiesAreRoundedUpToHundredths) {
    EXPECT_EQ(density_text(0), "0");
    EXPECT_EQ(density_text(3.7), "3.70");
    EXPECT_EQ(density_text(3.700001), "3.71");
    EXPECT_EQ(density_text(3.707897), "3.71");
    EXPECT_EQ(density_text(0.001), "0.01");
    EXPECT_EQ(density_text(0.991), "1.00");
    EXPECT_EQ(density_text(12.05), "12.05");
}

TEST(Report, DistancesAndDurationsInWords) {
    dosimetry::Setup setup = green_setup();
    EXPECT_EQ(distance_text(assessed(setup).hazard_distances[0]), "707.2 m");
    setup.sources[0].power = Stated<RadiantPower>("1 uW");
    EXPECT_EQ(distance_text(assessed(setup).hazard_distances[0]), "none, the limit is not exceeded");
    EXPECT_EQ(permitted_exposure_text(assessed(setup).positions[0]),
              "30000 s, the end of the published range");
    setup.sources[0].power = Stated<RadiantPower>("1e9 W");
    EXPECT_EQ(permitted_exposure_text(assessed(setup).positions[0]),
              "none within the published range of durations");
    setup.sources[0].beam.divergence = Stated<PlaneAngle>("1e-9 rad");
    EXPECT_EQ(distance_text(assessed(setup).hazard_distances[0]), "beyond 1000 km, where the search ends");
}

/// The value a report shows, or nothing if it shows words. The typography of powers of ten is undone.
std::optional<double> shown_value(std::string text) {
    text = text.substr(0, text.find(','));
    const auto replace = [&text](const std::string& from, const std::string& to) {
        for (auto at = text.find(from); at != std::string::npos; at = text.find(from))
            text.replace(at, from.size(), to);
    };
    replace("×10", "e");
    replace("⁻", "-");
    const char* digits[]{"⁰", "¹", "²", "³", "⁴", "⁵", "⁶", "⁷", "⁸", "⁹"};
    for (int i = 0; i < 10; ++i) replace(digits[i], std::to_string(i));
    if (text.empty() || text[0] < '0' || text[0] > '9') return std::nullopt;
    return read_quantity(text, DecimalMark::point).value_si;
}

RC_GTEST_PROP(ReportProperty, DistancesAreNeverShownShorterNorDurationsLonger, ()) {
    const Assessment assessment = assessed(*any_setup());
    for (const HazardDistance& d : assessment.hazard_distances)
        if (const auto shown = shown_value(distance_text(d)))
            RC_ASSERT(*shown >= d.distance->in_si() * (1 - 2e-12));
    const PositionAssessment& p = assessment.positions.front();
    if (const auto shown = shown_value(permitted_exposure_text(p)))
        RC_ASSERT(*shown <= p.permitted_exposure->in_si() * (1 + 2e-12));
}

// 4 digits rounded up can turn 0.99996 into 1.000: that is the safe side; 1.00001 must never read as 1.
TEST(Report, JustAboveTheLimitNeverReadsAsTheLimit) {
    PositionAssessment p = assessed(green_setup()).positions[0];
    p.governing.ratio = 1.00001;
    EXPECT_EQ(verdict(p),
              "ABOVE THE LIMIT. At 0.5 m the eye would receive 1.001 times the limit (retinal thermal).");
}

}  // namespace
}  // namespace dosimetry
