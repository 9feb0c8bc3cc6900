#include "quantities/decimal.h"

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>
#include <limits>

#include "quantities/input_error.h"

namespace dosimetry {
namespace {

bool is_digit(char c) {
    return c >= '0' && c <= '9';
}

DecimalNumber nearest_decimal(double magnitude, int significant) {
    std::array<char, 64> buffer{};
    const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), magnitude,
                                   std::chars_format::scientific, significant - 1)
                         .ptr;
    const std::string_view text(buffer.data(), static_cast<std::size_t>(end - buffer.data()));
    DecimalNumber result;
    const auto e = text.find('e');
    for (char c : text.substr(0, e))
        if (is_digit(c)) result.digits += c;
    const char* first = text.data() + e + (text[e + 1] == '+' ? 2 : 1);
    std::from_chars(first, end, result.exponent);
    return result;
}

double to_double(const DecimalNumber& number) {
    const std::string text =
        number.digits.substr(0, 1) + "." + number.digits.substr(1) + "e" + std::to_string(number.exponent);
    double value = std::numeric_limits<double>::infinity();
    std::from_chars(text.data(), text.data() + text.size(), value);
    return value;
}

void increase_last_digit(DecimalNumber& number) {
    for (std::size_t i = number.digits.size(); i-- > 0;) {
        if (number.digits[i] != '9') {
            ++number.digits[i];
            return;
        }
        number.digits[i] = '0';
    }
    number.digits.insert(number.digits.begin(), '1');
    number.digits.pop_back();
    ++number.exponent;
}

void decrease_last_digit(DecimalNumber& number) {
    const bool power_of_ten =
        number.digits[0] == '1' &&
        std::all_of(number.digits.begin() + 1, number.digits.end(), [](char c) { return c == '0'; });
    if (power_of_ten) {  // 1.00 goes to 9.99 one decade lower
        std::fill(number.digits.begin(), number.digits.end(), '9');
        --number.exponent;
        return;
    }
    for (std::size_t i = number.digits.size(); i-- > 0;) {
        if (number.digits[i] != '0') {
            --number.digits[i];
            return;
        }
        number.digits[i] = '9';
    }
}

}  // namespace

std::size_t number_prefix_length(std::string_view text) {
    std::size_t i = 0;
    if (i < text.size() && (text[i] == '+' || text[i] == '-')) ++i;
    while (i < text.size() && (is_digit(text[i]) || text[i] == '.' || text[i] == ',')) ++i;
    // An exponent needs digits behind it: "5 eV" and "5e" keep the letter out of the number.
    if (i > 0 && i < text.size() && (text[i] == 'e' || text[i] == 'E')) {
        std::size_t j = i + 1;
        if (j < text.size() && (text[j] == '+' || text[j] == '-')) ++j;
        if (j < text.size() && is_digit(text[j])) {
            while (j < text.size() && is_digit(text[j])) ++j;
            i = j;
        }
    }
    return i;
}

double parse_number(std::string_view text, DecimalMark mark) {
    const std::string given(text);
    const std::string accepted = mark == DecimalMark::point
                                     ? "a number with a decimal point, such as 0.25 or 2.5e-3"
                                     : "a number without group separators, such as 0.25 or 2.5e-3";
    std::string plain = given;
    const auto commas = std::count(plain.begin(), plain.end(), ',');
    const auto points = std::count(plain.begin(), plain.end(), '.');
    if (commas > 0 && mark == DecimalMark::point)
        throw InputError("a comma stands in the number " + quoted(given), accepted);
    if (commas + points > 1)
        throw InputError("the number " + quoted(given) + " has more than one decimal mark", accepted);
    std::replace(plain.begin(), plain.end(), ',', '.');
    const bool looks_numeric = !plain.empty() && number_prefix_length(plain) == plain.size();
    if (!plain.empty() && plain.front() == '+') plain.erase(0, 1);  // from_chars knows no plus sign

    double value = 0.0;
    const auto [end, error] = std::from_chars(plain.data(), plain.data() + plain.size(), value);
    if (!looks_numeric || error == std::errc::invalid_argument || end != plain.data() + plain.size())
        throw InputError(quoted(given) + " is not a number", accepted);
    if (error == std::errc::result_out_of_range)
        throw InputError("the number " + quoted(given) + " is too large or too small to calculate with",
                         "magnitudes from 1e-300 to 1e300");
    return value;
}

DecimalNumber round_decimal(double value, int significant, Rounding rounding) {
    if (value == 0.0) return {false, std::string(static_cast<std::size_t>(significant), '0'), 0};
    const bool negative = value < 0.0;
    const double magnitude = std::fabs(value);
    DecimalNumber result = nearest_decimal(magnitude, significant);
    if (rounding != Rounding::nearest) {
        constexpr double noise = 1e-12;
        const bool away_from_zero = (rounding == Rounding::up) != negative;
        const double rounded = to_double(result);
        if (away_from_zero && rounded < magnitude * (1.0 - noise)) increase_last_digit(result);
        if (!away_from_zero && rounded > magnitude * (1.0 + noise)) decrease_last_digit(result);
    }
    result.negative = negative;
    return result;
}

std::string plain_digits(const DecimalNumber& number, int shift) {
    const int point = number.exponent + shift + 1;  // how many digits stand before the decimal point
    const int count = static_cast<int>(number.digits.size());
    std::string text;
    if (point <= 0) {
        text = "0." + std::string(static_cast<std::size_t>(-point), '0') + number.digits;
    } else if (point >= count) {
        text = number.digits + std::string(static_cast<std::size_t>(point - count), '0');
    } else {
        text = number.digits.substr(0, static_cast<std::size_t>(point)) + "." +
               number.digits.substr(static_cast<std::size_t>(point));
    }
    return (number.negative ? "−" : "") + text;
}

std::string shortest(double value) {
    std::array<char, 40> buffer{};
    const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), value).ptr;
    return {buffer.data(), end};
}

}  // namespace dosimetry
