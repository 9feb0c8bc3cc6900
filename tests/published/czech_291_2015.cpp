// Czech Government Regulation 291/2015 Sb., Annex 3, which transposes Directive 2006/25/EC: Tables 1 to 12.
// Only rows and factors whose numbers are the same in ICNIRP 2013.
//
// Left out, because the editions differ: the retinal rows below 18 µs and 50 µs (Table 10: 1.5e-4 and 5e-3
// J/m², 2.7e4 t^0.75); the ceiling of 1000 W/m² of the near infrared; the row for extended near-infrared
// sources before T2, printed without CE; the thermal-confinement times of Table 9 (pulse trains); averaging
// over 1.5 and 3.5 mm in the ultraviolet, where this program keeps 1 mm, which is stricter; the crossover
// times of 310 and 314 nm, printed from a rounded exponent.

#include "published/limit_value.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using namespace testing_support;

constexpr LimitQuantity H = LimitQuantity::radiant_exposure;
constexpr LimitQuantity E = LimitQuantity::irradiance;

struct PrintedRow {
    const char* where;
    Tissue tissue;
    Effect effect;
    LimitQuantity quantity;
    double nm, t_s;
    double coefficient, t_power;
    double factors;  ///< product of the correction factors there, from their printed formulas
};

class Czech291 : public ::testing::TestWithParam<PrintedRow> {};

TEST_P(Czech291, RowHasThePrintedCoefficient) {
    const PrintedRow& r = GetParam();
    const double ours = icnirp(r.tissue, r.effect, r.quantity, r.nm, r.t_s);
    EXPECT_TRUE(relatively_near(ours, r.coefficient * std::pow(r.t_s, r.t_power) * r.factors, 1e-12))
        << r.where;
}

const double ca_900 = std::pow(10, 0.002 * 200);
const double cb_500 = std::pow(10, 0.02 * 50);
constexpr Effect uv = Effect::ultraviolet_photochemical;
constexpr Effect uv_cap = Effect::ultraviolet_thermal;
constexpr Effect retina = Effect::retinal_thermal;
constexpr Effect blue = Effect::retinal_photochemical;
constexpr Effect cornea = Effect::anterior_thermal;
constexpr Effect burn = Effect::skin_thermal;
constexpr Tissue eye = Tissue::eye;
constexpr Tissue skin = Tissue::skin;

// clang-format off
INSTANTIATE_TEST_SUITE_P(Tables, Czech291, ::testing::Values(
    PrintedRow{"Table 11, 180-302.5 nm", eye, uv, H, 250, 100, 30, 0, 1},
    PrintedRow{"Table 11, 315-400 nm", eye, uv, H, 350, 100, 1e4, 0, 1},
    PrintedRow{"Table 11, 305 nm", eye, uv, H, 305, 100, 100, 0, 1},
    PrintedRow{"Table 11, 310 nm", eye, uv, H, 310, 100, 1000, 0, 1},
    PrintedRow{"Table 11, 400-600 nm, small source, before T1", eye, retina, E, 500, 50, 10, 0, 1},
    PrintedRow{"Table 11, 400-600 nm, photochemical, to 100 s", eye, blue, H, 500, 50, 100, 0, cb_500},
    PrintedRow{"Table 11, 400-600 nm, photochemical, to 10^4 s", eye, blue, E, 500, 1000, 1, 0, cb_500},
    PrintedRow{"Table 11, 400-600 nm, photochemical, beyond", eye, blue, E, 500, 2e4, 1, 0, cb_500},
    PrintedRow{"Table 11, 700-1400 nm, small source", eye, retina, E, 900, 100, 10, 0, ca_900},
    PrintedRow{"Table 11, 1400-1500 nm", eye, cornea, E, 1450, 100, 1000, 0, 1},
    PrintedRow{"Table 11, 1500-1800 nm", eye, cornea, E, 1600, 100, 1000, 0, 1},
    PrintedRow{"Table 11, 2600 nm-1 mm", eye, cornea, E, 10000, 100, 1000, 0, 1},
    PrintedRow{"Table 10, 180-400 nm, below 1 ns", eye, uv_cap, E, 250, 1e-11, 3e10, 0, 1},
    PrintedRow{"Table 10, 180-302.5 nm", eye, uv, H, 250, 1e-3, 30, 0, 1},
    PrintedRow{"Table 10, 1400-1500 nm, below 1 ns", eye, cornea, E, 1450, 1e-11, 1e12, 0, 1},
    PrintedRow{"Table 10, 1400-1500 nm, to 1 ms", eye, cornea, H, 1450, 1e-6, 1000, 0, 1},
    PrintedRow{"Table 10, 1400-1500 nm, to 10 s", eye, cornea, H, 1450, 0.1, 5600, 0.25, 1},
    PrintedRow{"Table 10, 1500-1800 nm", eye, cornea, H, 1600, 1e-3, 1e4, 0, 1},
    PrintedRow{"Table 10, 1800-2600 nm, below 1 ns", eye, cornea, E, 2000, 1e-11, 1e12, 0, 1},
    PrintedRow{"Table 10, 1800-2600 nm, to 1 ms", eye, cornea, H, 2000, 1e-6, 1000, 0, 1},
    PrintedRow{"Table 10, 2600 nm-1 mm, below 1 ns", eye, cornea, E, 10000, 1e-11, 1e11, 0, 1},
    PrintedRow{"Table 10, 2600 nm-1 mm, to 100 ns", eye, cornea, H, 10000, 1e-8, 100, 0, 1},
    PrintedRow{"Table 10, 2600 nm-1 mm, to 10 s", eye, cornea, H, 10000, 1e-3, 5600, 0.25, 1},
    PrintedRow{"Table 12, 180-400 nm, below 1 ns", skin, uv_cap, E, 250, 1e-11, 3e10, 0, 1},
    PrintedRow{"Table 12, 700-1400 nm, below 1 ns", skin, burn, E, 900, 1e-11, 2e11, 0, ca_900},
    PrintedRow{"Table 12, 400-1400 nm, to 100 ns", skin, burn, H, 900, 1e-8, 200, 0, ca_900},
    PrintedRow{"Table 12, 400-1400 nm, to 10 s", skin, burn, H, 900, 1e-3, 11000, 0.25, ca_900},
    PrintedRow{"Table 12, 1400-1500 nm, below 1 ns", skin, burn, E, 1450, 1e-11, 1e12, 0, 1},
    PrintedRow{"Table 12, 1500-1800 nm, below 1 ns", skin, burn, E, 1600, 1e-11, 1e13, 0, 1},
    PrintedRow{"Table 12, 2600 nm-1 mm, below 1 ns", skin, burn, E, 10000, 1e-11, 1e11, 0, 1},
    PrintedRow{"Table 12, 315-400 nm, from 10 s", skin, uv, H, 350, 100, 1e4, 0, 1},
    PrintedRow{"Table 12, 180-302.5 nm, from 10 s", skin, uv, H, 250, 100, 30, 0, 1},
    PrintedRow{"Table 12, 1400 nm-1 mm, from 10 s", skin, burn, E, 1600, 100, 1000, 0, 1}));
// clang-format on

// Table 11, 400-700 nm, extended source beyond T2: 18 CE T2^-0.25. At 20 mrad CE = 13.33333, T2 = 10 ·
// 10^(18.5/98.5).
TEST(Czech291Table11, ExtendedSourceBeyondT2) {
    const double t2 = 10 * std::pow(10, 18.5 / 98.5);
    EXPECT_TRUE(
        relatively_near(icnirp(eye, retina, E, 650, 1000, 20), 18 * (20 / 1.5) * std::pow(t2, -0.25), 1e-12));
}

// Table 11 prints the ultraviolet by its formula with four digits; the list of ICNIRP is that, rounded to
// two.
TEST(Czech291Table11, TheUltravioletListIsThePrintedFormulaRoundedToTwoDigits) {
    for (const auto& [nm, printed_J_per_m2] :
         {std::pair{303, 39.81}, std::pair{306, 158.5}, std::pair{307, 251.2}, std::pair{309, 631.0},
          std::pair{311, 1585.0}, std::pair{313, 3981.0}, std::pair{314, 6310.0}}) {
        const double unit = std::pow(10, std::floor(std::log10(printed_J_per_m2)) - 1);
        EXPECT_TRUE(
            relatively_near(icnirp(eye, uv, H, nm, 100), std::round(printed_J_per_m2 / unit) * unit, 1e-12))
            << nm;
    }
}

TEST(Czech291Table1, LimitingApertures) {
    const auto mm = [](double nm, double t_s) {
        return icnirp_limits(Tissue::eye, nm, t_s).back().aperture.in_si() * 1e3;
    };
    EXPECT_NEAR(mm(900, 1), 7, 1e-12);
    EXPECT_NEAR(mm(1600, 1), 1.5, 1e-12);
    EXPECT_NEAR(mm(1600, 100), 3.5, 1e-12);
    EXPECT_NEAR(mm(2e5, 1), 11, 1e-12);
    EXPECT_NEAR(icnirp_limits(skin, 900, 1).back().aperture.in_si() * 1e3, 3.5, 1e-12);  // Table 12
}

// Tables 2 to 8: CA(1200 nm) = 5, seen in 2000 CA at the skin; acceptance angle 11 mrad at 50 s, 110 mrad at
// 20000 s; T2 is 100 s at 200 mrad: 18 CE T2^-0.25 with CE = 200²/(1.5 · 100).
TEST(Czech291Tables2To8, CorrectionFactors) {
    EXPECT_TRUE(relatively_near(icnirp(skin, burn, E, 1200, 100) / 2000, 5, 1e-12));
    const auto acceptance_mrad = [](double t_s) {
        return icnirp_limits(Tissue::eye, 500, t_s).back().acceptance.in_si() * 1e3;
    };
    EXPECT_NEAR(acceptance_mrad(50), 11, 1e-9);
    EXPECT_NEAR(acceptance_mrad(2e4), 110, 1e-9);
    EXPECT_TRUE(relatively_near(icnirp(eye, retina, E, 650, 1000, 200),
                                18 * 200 * 200 / (1.5 * 100) * std::pow(100, -0.25), 1e-12));
}

// T1 = 10 s at 440 nm and 100 s at 550 nm: there a small source passes from the thermal to the photochemical
// limit.
TEST(Czech291Tables2To8, T1) {
    EXPECT_TRUE(relatively_near(icnirp(eye, blue, H, 440, 10) / 10, icnirp(eye, retina, E, 440, 10), 1e-12));
    const double cb_550 = std::pow(10, 0.02 * 100);
    EXPECT_TRUE(relatively_near(icnirp(eye, blue, H, 550, 99) / 99, 100 * cb_550 / 99, 1e-12));
    // beyond 500 nm the photochemical limit never falls below the thermal one of a small source
    EXPECT_GT(icnirp(eye, blue, E, 550, 100), icnirp(eye, retina, E, 550, 100));
}

}  // namespace
}  // namespace dosimetry
