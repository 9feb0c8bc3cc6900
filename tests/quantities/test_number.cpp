// Numbers as files and people write them.

#include <clocale>
#include <cmath>
#include <limits>

#include "quantities/decimal.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::message_of;

double file_number(std::string_view text) {
    return parse_number(text, DecimalMark::point);
}
double typed_number(std::string_view text) {
    return parse_number(text, DecimalMark::point_or_comma);
}

TEST(ParseNumber, ReadsPlainAndScientificNotation) {
    EXPECT_EQ(file_number("5"), 5.0);
    EXPECT_EQ(file_number("0.25"), 0.25);
    EXPECT_EQ(file_number(".25"), 0.25);
    EXPECT_EQ(file_number("5."), 5.0);
    EXPECT_EQ(file_number("+5"), 5.0);
    EXPECT_EQ(file_number("-0.5"), -0.5);
    EXPECT_EQ(file_number("2.5e-3"), 2.5e-3);
    EXPECT_EQ(file_number("2.5E+3"), 2500.0);
    EXPECT_EQ(file_number("0"), 0.0);
}

TEST(ParseNumber, RefusesWhatIsNotAFiniteDecimalNumber) {
    for (const char* text :
         {"",    "nan", "NaN", "inf", "-inf", "infinity", "0x10", "0x1p3", "1e", "e5", "--5",
          "+-5", "++5", "5 ",  " 5",  "5mW",  "1_000",    "½",    "-",     "+",  "."})
        EXPECT_THROW(file_number(text), InputError) << text;
}

TEST(ParseNumber, RefusesMagnitudesThatADoubleCannotHold) {
    EXPECT_EQ(message_of([] { file_number("1e400"); }),
              "the number \"1e400\" is too large or too small to calculate with; "
              "accepted: magnitudes from 1e-300 to 1e300");
    EXPECT_THROW(file_number("-1e400"), InputError);
    EXPECT_THROW(file_number("1e-400"), InputError);
}

TEST(ParseNumber, FilesKnowTheDecimalPointOnly) {
    EXPECT_EQ(message_of([] { file_number("1,064"); }),
              "a comma stands in the number \"1,064\"; "
              "accepted: a number with a decimal point, such as 0.25 or 2.5e-3");
    EXPECT_THROW(file_number("1,000.5"), InputError);
    EXPECT_THROW(file_number("1.2.3"), InputError);
}

TEST(ParseNumber, TypedNumbersMayUseOneCommaOrOnePoint) {
    EXPECT_EQ(typed_number("1,064"), 1.064);
    EXPECT_EQ(typed_number("1.064"), 1.064);
    EXPECT_EQ(typed_number("2,5e-3"), 2.5e-3);
    // Group separators would make 1,064 ambiguous by a factor of a thousand.
    EXPECT_EQ(message_of([] { typed_number("1.000,5"); }),
              "the number \"1.000,5\" has more than one decimal mark; "
              "accepted: a number without group separators, such as 0.25 or 2.5e-3");
    EXPECT_THROW(typed_number("1,000,000"), InputError);
}

TEST(ParseNumber, DoesNotDependOnTheLocaleOfTheProcess) {
    const std::string before = std::setlocale(LC_ALL, nullptr);
    for (const char* name : {"de_DE.UTF-8", "fr_FR.UTF-8", "C.UTF-8"}) std::setlocale(LC_ALL, name);
    EXPECT_EQ(file_number("0.25"), 0.25);
    EXPECT_THROW(file_number("0,25"), InputError);
    EXPECT_EQ(shortest(0.25), "0.25");
    std::setlocale(LC_ALL, before.c_str());
}

TEST(NumberPrefix, LeavesUnitsThatBeginWithE) {
    EXPECT_EQ(number_prefix_length("5 eV"), 1u);
    EXPECT_EQ(number_prefix_length("5eV"), 1u);
    EXPECT_EQ(number_prefix_length("5e3eV"), 3u);
    EXPECT_EQ(number_prefix_length("5e-3 J"), 4u);
    EXPECT_EQ(number_prefix_length("eV"), 0u);
}

TEST(Shortest, ReadsBackAsTheSameDouble) {
    for (double value : {0.1, 0.002, 1e-13, 1.0 / 3.0, 6.62607015e-34, std::numeric_limits<double>::max(),
                         std::numeric_limits<double>::denorm_min()})
        EXPECT_EQ(file_number(shortest(value)), value);
    EXPECT_EQ(shortest(0.002), "0.002");
    EXPECT_EQ(shortest(1e-13), "1e-13");
}

}  // namespace
}  // namespace dosimetry
