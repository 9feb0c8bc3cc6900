// The small formula language of the tables.

#include "limits/formula.h"

#include <array>
#include <cmath>

#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::message_of;

const std::array<std::string, 2> names{"x", "long_name"};

double value(std::string_view text, double x = 3, double y = 5) {
    return Formula(text, names).value(std::array{x, y});
}

TEST(FormulaValue, FollowsTheUsualOrderOfOperations) {
    EXPECT_EQ(value("1 + 2*3"), 7);
    EXPECT_EQ(value("(1 + 2)*3"), 9);
    EXPECT_EQ(value("10 - 4 - 3"), 3);
    EXPECT_EQ(value("24/4/2"), 3);
    EXPECT_EQ(value("2*3^2"), 18);
    EXPECT_EQ(value("2^3^2"), 512);  // to the right
    EXPECT_EQ(value("-2^2"), -4);    // the power first
    EXPECT_EQ(value("2^-1"), 0.5);
    EXPECT_EQ(value("2--1"), 3);
    EXPECT_EQ(value("1.5e2"), 150);
    EXPECT_EQ(value("x*long_name"), 15);
    EXPECT_EQ(value("10^(0.002*(x - 700))", 905), std::pow(10, 0.002 * 205));
}

TEST(FormulaValue, ShowsItsNumbers) {
    const Formula formula("8 + 10^(0.04*(x - 1250))", names);
    EXPECT_EQ(formula.with_numbers(names, std::array{1310.0, 0.0}), "8 + 10^(0.04·(1310 − 1250))");
    EXPECT_EQ(pretty_formula(formula.text()), "8 + 10^(0.04·(x − 1250))");
    EXPECT_EQ(Formula("long_name + x + x", names).used(), (std::vector<std::size_t>{1, 0}));
}

TEST(FormulaErrors, QuoteWhatWasNotUnderstood) {
    EXPECT_EQ(message_of([] { value("2*y"); }),
              "the formula \"2*y\" is not understood at \"y\"; accepted: numbers, + - * / ^ ( ) and the "
              "names of variables "
              "and factors given before");
    for (const char* text : {"", " ", "1 +", "(1", "1)", "()", "2 3", "x x", "1,5", "nan", "inf", "1e400",
                             "sin(x)", "*2", "2**3", "x=3", "+1", "0x10", "1..2"})
        EXPECT_THROW(value(text), InputError) << text;
}

TEST(FormulaErrors, DeepNestingIsRefusedNotFollowed) {
    EXPECT_THROW(value(std::string(100'000, '(') + "1" + std::string(100'000, ')')), InputError);
    EXPECT_THROW(value(std::string(100'000, '-') + "1"), InputError);
    std::string tower = "1";
    for (int i = 0; i < 1000; ++i) tower += "^1";
    EXPECT_THROW(value(tower), InputError);
    std::string deep_stack = "1";
    for (int i = 0; i < 1000; ++i) deep_stack = "1+(" + deep_stack;
    EXPECT_THROW(value(deep_stack), InputError);
    EXPECT_EQ(value("((((1))))"), 1);
}

}  // namespace
}  // namespace dosimetry
