// INSHT (Spain), technical guide on artificial optical radiation, June 2015, Appendix 4: Table 8 (limits at
// 10 s for small sources, at 0.25 s in the visible) and example 5. The guide applies Directive 2006/25/EC;
// its rows used here have the same numbers in ICNIRP 2013.
//
// Left out, because the number differs from ICNIRP 2013 or is not printed right:
//   308 nm 39.8 W/m² (0.031 mW), 302.5 nm 3.16 W/m² and just below 315 nm 1000 W/m²: the guide uses the
//   formula of IEC
//     there, not the list of whole nanometres;
//   1400 nm 400 W/m² (15 mW): CC = 8 of 2006, which ICNIRP 2013 replaced;
//   700 nm 0.39 mW and 750 nm 0.49 mW: these powers follow from 18 · 10^-0.25 = 10.12 W/m² instead of the
//   printed 10 W/m²; example 5, 0.0098 W: misprinted by a factor of 10.

#include "published/limit_value.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using namespace testing_support;

constexpr LimitQuantity H = LimitQuantity::radiant_exposure;
constexpr LimitQuantity E = LimitQuantity::irradiance;

/// Digits cut off instead of rounded: the value lies in the printed last digit.
::testing::AssertionResult truncated_to(double actual, double printed_value, int decimals) {
    const double unit = std::pow(10.0, -decimals);
    if (actual >= printed_value && actual < printed_value + unit) return ::testing::AssertionSuccess();
    return ::testing::AssertionFailure()
           << actual << " is not " << printed_value << " with its digits cut off";
}

double ultraviolet_at_10_s(double nm) {
    return icnirp(Tissue::eye, Effect::ultraviolet_photochemical, H, nm, 10) / 10;
}
double retina_at_10_s(double nm) {
    return icnirp(Tissue::eye, Effect::retinal_thermal, E, nm, 10);
}

TEST(Insht2015Table8, Ultraviolet250Nanometres10Seconds) {
    EXPECT_TRUE(agrees(ultraviolet_at_10_s(250), printed(3, 0)));
    EXPECT_TRUE(agrees(power_mW(ultraviolet_at_10_s(250), 1), printed(0.0024, 4)));
}
TEST(Insht2015Table8, Ultraviolet310Nanometres10Seconds) {
    EXPECT_TRUE(agrees(ultraviolet_at_10_s(310), printed(100, 0)));
    EXPECT_TRUE(agrees(power_mW(ultraviolet_at_10_s(310), 1), printed(0.079, 3)));
}
TEST(Insht2015Table8, Ultraviolet350Nanometres10Seconds) {
    EXPECT_TRUE(agrees(ultraviolet_at_10_s(350), printed(1000, 0)));
    EXPECT_TRUE(agrees(power_mW(ultraviolet_at_10_s(350), 1), printed(0.79, 2)));
}
// 25.4 is the quotient of the rounded 6.36 J/m² and 0.25 s; the unrounded value is 25.456.
TEST(Insht2015Table8, Visible550NanometresQuarterSecond) {
    const double h = icnirp(Tissue::eye, Effect::retinal_thermal, H, 550, 0.25);
    EXPECT_TRUE(truncated_to(h / 0.25, 25.4, 1));
    EXPECT_TRUE(agrees(power_mW(h / 0.25, 7), printed(0.98, 2)));
}
TEST(Insht2015Table8, NearInfrared700To1000Nanometres10Seconds) {
    EXPECT_TRUE(agrees(retina_at_10_s(700), printed(10, 0)));
    EXPECT_TRUE(truncated_to(retina_at_10_s(750), 12.5, 1));  // 12.59
    EXPECT_TRUE(truncated_to(retina_at_10_s(850), 19.9, 1));  // 19.95
    EXPECT_TRUE(agrees(power_mW(retina_at_10_s(850), 7), printed(0.77, 2)));
    EXPECT_TRUE(agrees(retina_at_10_s(900), printed(25.1, 1)));
    EXPECT_TRUE(agrees(power_mW(retina_at_10_s(900), 7), printed(0.97, 2)));
    EXPECT_TRUE(agrees(retina_at_10_s(1000), printed(39.8, 1)));
    EXPECT_TRUE(agrees(power_mW(retina_at_10_s(1000), 7), printed(1.5, 1)));
}
TEST(Insht2015Table8, NearInfrared1050Nanometres10Seconds) {
    EXPECT_TRUE(agrees(retina_at_10_s(1049.9), printed(50, 0)));  // upper end of 700-1050 nm
    EXPECT_TRUE(agrees(power_mW(retina_at_10_s(1049.9), 7), printed(1.9, 1)));
    EXPECT_TRUE(agrees(retina_at_10_s(1050), printed(50, 0)));  // lower end of 1050-1400 nm
    EXPECT_TRUE(agrees(power_mW(retina_at_10_s(1050), 7), printed(1.9, 1)));
}
TEST(Insht2015Table8, NearInfrared1190Nanometres10Seconds) {
    EXPECT_TRUE(agrees(retina_at_10_s(1190), printed(262, 0)));
    EXPECT_TRUE(agrees(power_mW(retina_at_10_s(1190), 7), printed(10, 0)));
}
TEST(Insht2015Example5, LaserPointer650NanometresQuarterSecond) {
    EXPECT_TRUE(agrees(icnirp(Tissue::eye, Effect::retinal_thermal, H, 650, 0.25), printed(6.36, 2)));
}

}  // namespace
}  // namespace dosimetry
