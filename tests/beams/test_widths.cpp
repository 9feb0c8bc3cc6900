// The six definitions of a beam's width, each checked against what it says, by integrals of the profile.

#include "beams/circular_beam.h"
#include "beams/names.h"
#include "support/expect.h"
#include "support/integral.h"

namespace dosimetry {
namespace {

using testing_support::integral;
using testing_support::relatively_near;

/// Profile of a beam whose diameter is 1 at the given definition.
double profile_at(Profile profile, double reference, double r) {
    if (profile == Profile::gaussian) return std::exp(-8 * r * r / (reference * reference));
    return r <= reference / 2 ? 1.0 : 0.0;
}

double reach(Profile profile, double reference) {
    return profile == Profile::gaussian ? 6 * reference : reference / 2;
}

double power_within(Profile profile, double reference, double radius) {
    return integral([=](double r) { return 2 * pi * r * profile_at(profile, reference, r); }, 0,
                    std::min(radius, reach(profile, reference)), 1e-13);
}

/// D4σ = 4 σ_x of the second moments; for a round beam σ_x² = ∫ r² E dA / (2 P).
double d4sigma(Profile profile, double reference) {
    const double moment =
        integral([=](double r) { return 2 * pi * r * r * r * profile_at(profile, reference, r); }, 0,
                 reach(profile, reference), 1e-13);
    return 4 * std::sqrt(moment / 2 / power_within(profile, reference, 1e9));
}

constexpr double e = 2.718281828459045235;

class Widths : public ::testing::TestWithParam<Profile> {};

TEST_P(Widths, EnclosedPowerIsWhatTheDefinitionSays) {
    for (const auto& [definition, share] : {std::pair{WidthDefinition::enclosed_63, 1 - 1 / e},
                                            std::pair{WidthDefinition::enclosed_86, 1 - 1 / (e * e)}}) {
        const double reference = reference_over_measured(GetParam(), definition);
        const double inside =
            power_within(GetParam(), reference, 0.5) / power_within(GetParam(), reference, 1e9);
        EXPECT_TRUE(relatively_near(inside, share, 1e-12));
    }
}

TEST_P(Widths, SecondMomentDiameterIsOne) {
    const double reference = reference_over_measured(GetParam(), WidthDefinition::d4sigma);
    EXPECT_TRUE(relatively_near(d4sigma(GetParam(), reference), 1.0, 1e-12));
}

INSTANTIATE_TEST_SUITE_P(Profiles, Widths, ::testing::Values(Profile::gaussian, Profile::top_hat));

TEST(GaussianWidths, IrradianceAtTheEdgeIsWhatTheDefinitionSays) {
    for (const auto& [definition, level] :
         {std::pair{WidthDefinition::one_over_e2, 1 / (e * e)}, std::pair{WidthDefinition::one_over_e, 1 / e},
          std::pair{WidthDefinition::fwhm, 0.5}}) {
        const double reference = reference_over_measured(Profile::gaussian, definition);
        EXPECT_TRUE(relatively_near(profile_at(Profile::gaussian, reference, 0.5), level, 1e-14));
    }
}

// Ratios in everyday use, from the closed forms: √2 = 1.41421, √(2/ln 2) = 1.69864.
TEST(GaussianWidths, ClosedForms) {
    EXPECT_NEAR(reference_over_measured(Profile::gaussian, WidthDefinition::one_over_e), 1.41421, 5e-6);
    EXPECT_NEAR(reference_over_measured(Profile::gaussian, WidthDefinition::fwhm), 1.69864, 5e-6);
}

TEST(TopHatWidths, EveryIrradianceLevelIsTheEdge) {
    for (WidthDefinition d :
         {WidthDefinition::one_over_e2, WidthDefinition::one_over_e, WidthDefinition::fwhm})
        EXPECT_EQ(reference_over_measured(Profile::top_hat, d), 1.0);
}

TEST(Names, AreWhatFilesUse) {
    EXPECT_EQ(name_of_choice(width_names, WidthDefinition::fwhm).in_files, "FWHM");
    EXPECT_EQ(name_of_choice(width_names, WidthDefinition::enclosed_86).in_files, "86.5%");
    EXPECT_EQ(name_of_choice(profile_names, Profile::top_hat).in_files, "top-hat");
    EXPECT_EQ(reference_diameter_name(Profile::gaussian), "1/e² diameter");
    EXPECT_EQ(reference_diameter_name(Profile::top_hat), "edge diameter");
}

}  // namespace
}  // namespace dosimetry
