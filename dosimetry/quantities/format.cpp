#include "quantities/format.h"

#include <array>
#include <cassert>
#include <cmath>
#include <string_view>

#include "quantities/radiometry.h"

namespace dosimetry {
namespace {

std::string superscript(int number) {
    static constexpr std::array<std::string_view, 10> digits{"⁰", "¹", "²", "³", "⁴",
                                                             "⁵", "⁶", "⁷", "⁸", "⁹"};
    std::string text = number < 0 ? "⁻" : "";
    for (char c : std::to_string(std::abs(number))) text += digits[static_cast<std::size_t>(c - '0')];
    return text;
}

std::string scientific(DecimalNumber number) {
    const int exponent = number.exponent;
    number.exponent = 0;
    return plain_digits(number) + "×10" + superscript(exponent);
}

/// Plain digits where a person reads them at a glance, powers of ten elsewhere.
std::string readable(const DecimalNumber& number) {
    return number.exponent < -4 || number.exponent > 5 ? scientific(number) : plain_digits(number);
}

void drop_trailing_zeros(DecimalNumber& number) {
    while (number.digits.size() > 1 && number.digits.back() == '0') number.digits.pop_back();
}

struct Ladder {
    Dimension dimension;
    std::string_view unit;
    int smallest_power;  // of the prefixes this unit is shown with, in steps of 1000
    int largest_power;
};
constexpr std::array ladders{
    Ladder{Length::dimension, "m", -9, 3},         Ladder{Duration::dimension, "s", -15, 0},
    Ladder{RadiantEnergy::dimension, "J", -15, 3}, Ladder{RadiantPower::dimension, "W", -15, 6},
    Ladder{PlaneAngle::dimension, "rad", -6, 0},
};

std::string_view prefix_symbol(int power) {
    switch (power) {
        case -15:
            return "f";
        case -12:
            return "p";
        case -9:
            return "n";
        case -6:
            return "µ";
        case -3:
            return "m";
        case 3:
            return "k";
        case 6:
            return "M";
        default:
            return "";
    }
}

/// With the prefix that suits the number's size, for quantities that take one.
std::string with_suitable_unit(const DecimalNumber& number, bool zero, Dimension dimension) {
    for (const Ladder& ladder : ladders) {
        if (!(ladder.dimension == dimension)) continue;
        const std::string unit(ladder.unit);
        if (zero) return "0 " + unit;
        int power = 3 * static_cast<int>(std::floor(number.exponent / 3.0));
        power = std::min(std::max(power, ladder.smallest_power), ladder.largest_power);
        const int before_point = number.exponent - power;
        if (before_point < -3 || before_point > 5) return scientific(number) + " " + unit;
        return plain_digits(number, -power) + " " + std::string(prefix_symbol(power)) + unit;
    }
    const std::string unit = si_unit(dimension);
    return (zero ? "0" : readable(number)) + (unit.empty() ? "" : " " + unit);
}

}  // namespace

std::string format_number(double value, int significant, Rounding rounding) {
    assert(std::isfinite(value));
    if (value == 0.0) return "0";
    return readable(round_decimal(value, significant, rounding));
}

std::string format_quantity_si(double value_si, Dimension dimension, int significant, Rounding rounding) {
    assert(std::isfinite(value_si));
    return with_suitable_unit(round_decimal(value_si, significant, rounding), value_si == 0.0, dimension);
}

std::string format_round_si(double value_si, Dimension dimension) {
    assert(std::isfinite(value_si));
    DecimalNumber number = round_decimal(value_si, 6, Rounding::nearest);
    drop_trailing_zeros(number);
    return with_suitable_unit(number, value_si == 0.0, dimension);
}

std::string exact_number(double value) {
    assert(std::isfinite(value));
    if (value == 0.0) return "0";
    DecimalNumber number = round_decimal(value, 9, Rounding::nearest);
    drop_trailing_zeros(number);
    return readable(number);
}

std::string exact_term(double value) {
    const std::string number = exact_number(value);
    return number.find("×") == std::string::npos ? number : "(" + number + ")";
}

std::string exact_quantity_si(double value_si, Dimension dimension) {
    const std::string unit = si_unit(dimension);
    return exact_number(value_si) + (unit.empty() ? "" : " " + unit);
}

std::string si_unit(Dimension dimension) {
    std::string above;
    std::string below;
    int factors_below = 0;
    // Energy per time is written as power: W, W/m², W/(m² sr).
    const int watts = dimension.energy == 1 && dimension.time == -1 ? 1 : 0;
    const auto part = [&](std::string_view symbol, int exponent) {
        if (exponent == 0) return;
        std::string& side = exponent > 0 ? above : below;
        if (!side.empty()) side += " ";
        side += symbol;
        if (std::abs(exponent) != 1) side += superscript(std::abs(exponent));
        if (exponent < 0) ++factors_below;
    };
    part("W", watts);
    part("J", dimension.energy - watts);
    part("m", dimension.length);
    part("s", dimension.time + watts);
    part("rad", dimension.angle);
    part("sr", dimension.solid_angle);
    if (below.empty()) return above;
    if (above.empty()) above = "1";
    return above + "/" + (factors_below > 1 ? "(" + below + ")" : below);
}

}  // namespace dosimetry
