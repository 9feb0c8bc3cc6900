// Portuguese parliament journal, series II-A, bill transposing Directive 2006/25/EC: no. 121 (17 July 2010),
// p. 50, Table 2.2 (ultraviolet list and the times at which it passes the thermal limit), and no. 075 (6 May
// 2010), p. 43, notes to Table 2.3. Every number used here is the same in ICNIRP 2013; nothing of this source
// was left out.

#include "published/limit_value.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using namespace testing_support;

constexpr LimitQuantity H = LimitQuantity::radiant_exposure;
constexpr Effect uv = Effect::ultraviolet_photochemical;

TEST(PortugueseBillTable2_2, ListOfWholeNanometres) {
    for (const auto& [nm, h] :
         {std::pair{302, 30}, std::pair{303, 40}, std::pair{304, 60}, std::pair{306, 160},
          std::pair{307, 250}, std::pair{308, 400}, std::pair{310, 1000}, std::pair{311, 1600},
          std::pair{312, 2500}, std::pair{314, 6300}})
        EXPECT_EQ(icnirp(Tissue::eye, uv, H, nm, 1e-6), h) << nm;
}

// The time at which 5600 t^0.25 passes the value of the list, printed with two digits.
TEST(PortugueseBillTable2_2, CrossoverTimes) {
    for (const auto& [nm, t_s, decimals] :
         {std::tuple{303, 2.6e-9, 10}, std::tuple{304, 1.3e-8, 9}, std::tuple{305, 1.0e-7, 8},
          std::tuple{307, 4.0e-6, 7}, std::tuple{308, 2.6e-5, 6}, std::tuple{309, 1.6e-4, 5},
          std::tuple{311, 6.7e-3, 4}, std::tuple{312, 0.040, 3}, std::tuple{313, 0.26, 2}}) {
        const double thermal_at_1_s = icnirp(Tissue::eye, Effect::ultraviolet_thermal, H, nm, 1);
        const double crossover_s = std::pow(icnirp(Tissue::eye, uv, H, nm, 1) / thermal_at_1_s, 4);
        EXPECT_TRUE(agrees(crossover_s, printed(t_s, decimals))) << nm;
    }
}

// CB(500 nm) = 10. The averaging field of view is the acceptance angle.
TEST(PortugueseBillTable2_3, RadianceFormOfThePhotochemicalLimit) {
    EXPECT_TRUE(relatively_near(
        icnirp(Tissue::eye, Effect::retinal_photochemical, LimitQuantity::radiance_dose, 500, 100), 1e6 * 10,
        1e-12));
    EXPECT_TRUE(
        relatively_near(icnirp(Tissue::eye, Effect::retinal_photochemical, LimitQuantity::radiance, 500, 2e4),
                        100 * 10, 1e-12));
}

TEST(PortugueseBillTable2_3, ApertureOfTheFarthestInfrared) {
    EXPECT_NEAR(icnirp_limits(Tissue::eye, 2e5, 100).back().aperture.in_si() * 1e3, 11, 1e-12);
}

}  // namespace
}  // namespace dosimetry
