#pragma once

#include <string>
#include <string_view>

namespace dosimetry {

/// Which decimal mark a text may use. Files know the point only.
enum class DecimalMark { point, point_or_comma };

/// The number a text states, the whole text being the number.
/// Throws InputError for anything else: empty, trailing text, group separators, "nan", "inf", hexadecimal, or
/// a magnitude that a double cannot hold (1e400, 1e-400).
double parse_number(std::string_view text, DecimalMark mark);

/// The length of the leading part of `text` that looks like a number (digits, marks, exponent).
std::size_t number_prefix_length(std::string_view text);

/// Direction in which a shown number may differ from the true one. `up` and `down` are towards plus and minus
/// infinity: exposures and distances are shown rounded up, limits and permitted values rounded down.
enum class Rounding { nearest, up, down };

/// A number rounded to decimal digits: sign, digits d1 d2 d3 …, value = ±d1.d2d3… × 10^exponent.
struct DecimalNumber {
    bool negative = false;
    std::string digits;
    int exponent = 0;
};

/// Rounds a finite number to `significant` decimal digits in the stated direction. A value within 1e-12 of
/// the rounded one (relative) counts as that value, so that binary noise in 0.3 does not become 0.301.
DecimalNumber round_decimal(double value, int significant, Rounding rounding);

/// Plain digits for a number already rounded, its value multiplied by 10^shift: 1.23e-4 with shift 3 is
/// "0.123".
std::string plain_digits(const DecimalNumber& number, int shift = 0);

/// The shortest text that reads back as the same double ("0.002", "1e-13").
std::string shortest(double value);

}  // namespace dosimetry
