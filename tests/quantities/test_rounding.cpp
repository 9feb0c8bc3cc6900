// Rounding to the safe side: an exposure is never shown below itself, a limit never above.

#include <cmath>
#include <cstdlib>

#include "quantities/decimal.h"
#include "support/expect.h"
#include "support/property.h"

namespace dosimetry {
namespace {

std::string rounded(double value, int significant, Rounding rounding) {
    return plain_digits(round_decimal(value, significant, rounding));
}

TEST(RoundDecimal, NeverShowsTheWrongSide) {
    EXPECT_EQ(rounded(25.455844, 4, Rounding::down), "25.45");
    EXPECT_EQ(rounded(25.455844, 4, Rounding::up), "25.46");
    EXPECT_EQ(rounded(25.455844, 4, Rounding::nearest), "25.46");
    EXPECT_EQ(rounded(25.454, 4, Rounding::up), "25.46");
}

TEST(RoundDecimal, CarriesThroughNines) {
    EXPECT_EQ(rounded(9.999, 3, Rounding::up), "10.0");
    EXPECT_EQ(rounded(9.999, 3, Rounding::nearest), "10.0");
    EXPECT_EQ(rounded(9.999, 3, Rounding::down), "9.99");
    EXPECT_EQ(rounded(0.99991, 4, Rounding::up), "1.000");
    EXPECT_EQ(rounded(0.99991, 4, Rounding::down), "0.9999");
    EXPECT_EQ(rounded(99950, 3, Rounding::up), "100000");
}

TEST(RoundDecimal, LeavesValuesThatNeedNoRounding) {
    EXPECT_EQ(rounded(1.000, 4, Rounding::down), "1.000");
    EXPECT_EQ(rounded(1.000, 4, Rounding::up), "1.000");
    EXPECT_EQ(rounded(25.45, 4, Rounding::down), "25.45");
    EXPECT_EQ(rounded(25.45, 4, Rounding::up), "25.45");
}

TEST(RoundDecimal, BinaryNoiseDoesNotCountAsADigit) {
    EXPECT_EQ(rounded(0.1 + 0.2, 3, Rounding::up), "0.300");
    EXPECT_EQ(rounded(0.1 + 0.2, 3, Rounding::down), "0.300");
    EXPECT_EQ(rounded(1.1 * 3, 2, Rounding::up), "3.3");
    // Just beyond the noise it does.
    EXPECT_EQ(rounded(0.3 * (1 + 1e-11), 3, Rounding::up), "0.301");
    EXPECT_EQ(rounded(0.3 * (1 - 1e-11), 3, Rounding::down), "0.299");
    EXPECT_EQ(rounded(1.0 - 1e-11, 3, Rounding::down), "0.999");
}

TEST(RoundDecimal, UpAndDownAreTowardsTheInfinities) {
    EXPECT_EQ(rounded(-1.234, 3, Rounding::up), "−1.23");
    EXPECT_EQ(rounded(-1.234, 3, Rounding::down), "−1.24");
}

TEST(RoundDecimal, Zero) {
    EXPECT_EQ(rounded(0.0, 3, Rounding::up), "0.00");
    EXPECT_EQ(rounded(-0.0, 3, Rounding::down), "0.00");
}

TEST(PlainDigits, ShiftsTheDecimalPoint) {
    const DecimalNumber number = round_decimal(1.23e-4, 3, Rounding::nearest);
    EXPECT_EQ(plain_digits(number), "0.000123");
    EXPECT_EQ(plain_digits(number, 3), "0.123");
    EXPECT_EQ(plain_digits(number, 4), "1.23");
    EXPECT_EQ(plain_digits(number, 6), "123");
    EXPECT_EQ(plain_digits(number, 8), "12300");
}

/// Magnitudes from 1e-30 to 1e30, either sign, with few or many digits.
rc::Gen<double> any_value() {
    return rc::gen::map(rc::gen::tuple(rc::gen::inRange<std::int64_t>(1, 1'000'000'000'000'000),
                                       rc::gen::inRange(-45, 16), rc::gen::arbitrary<bool>()),
                        [](const std::tuple<std::int64_t, int, bool>& t) {
                            const double value =
                                static_cast<double>(std::get<0>(t)) * std::pow(10.0, std::get<1>(t));
                            return std::get<2>(t) ? -value : value;
                        });
}

double value_of(const DecimalNumber& number) {
    const std::string text =
        number.digits.substr(0, 1) + "." + number.digits.substr(1) + "e" + std::to_string(number.exponent);
    return (number.negative ? -1.0 : 1.0) * std::strtod(text.c_str(), nullptr);
}

RC_GTEST_PROP(RoundDecimalProperty, UpIsNeverBelowAndDownNeverAbove, ()) {
    const double value = *any_value();
    const int significant = *rc::gen::inRange(1, 10);
    const double noise = 1.0000001e-12 * std::fabs(value);
    const double up = value_of(round_decimal(value, significant, Rounding::up));
    const double down = value_of(round_decimal(value, significant, Rounding::down));
    RC_ASSERT(up >= value - noise);
    RC_ASSERT(down <= value + noise);
    // and never farther than one unit of the last digit
    const double unit = std::pow(10.0, std::floor(std::log10(std::fabs(value))) - significant + 1);
    RC_ASSERT(up - value <= unit * 1.0000001);
    RC_ASSERT(value - down <= unit * 1.0000001);
}

RC_GTEST_PROP(RoundDecimalProperty, NearestIsWithinHalfAUnit, ()) {
    const double value = *any_value();
    const int significant = *rc::gen::inRange(1, 15);
    const DecimalNumber nearest = round_decimal(value, significant, Rounding::nearest);
    RC_ASSERT(nearest.digits.size() == static_cast<std::size_t>(significant));
    const double unit = std::pow(10.0, std::floor(std::log10(std::fabs(value))) - significant + 1);
    RC_ASSERT(std::fabs(value_of(nearest) - value) <= unit * 0.5000001);
}

RC_GTEST_PROP(RoundDecimalProperty, ARoundedValueStaysAsItIs, ()) {
    const double value = *any_value();
    const int significant = *rc::gen::inRange(1, 10);
    for (Rounding rounding : {Rounding::up, Rounding::down, Rounding::nearest}) {
        const DecimalNumber once = round_decimal(value, significant, rounding);
        const DecimalNumber twice = round_decimal(value_of(once), significant, rounding);
        RC_ASSERT(once.digits == twice.digits);
        RC_ASSERT(once.exponent == twice.exponent);
    }
}

}  // namespace
}  // namespace dosimetry
