#include "quantities/units.h"

#include <array>
#include <cmath>
#include <optional>

#include "quantities/input_error.h"
#include "quantities/radiometry.h"

namespace dosimetry {
namespace {

struct Unit {
    std::string_view symbol;
    double in_si;
    Dimension dimension;
    bool takes_prefix;
};

// SI Brochure, 9th edition (2019), tables 2, 4 and 8 (h, min, deg); eV exact by the SI of 2019.
constexpr std::array units{
    Unit{"m", 1.0, dimensions::length, true},          Unit{"s", 1.0, dimensions::time, true},
    Unit{"J", 1.0, dimensions::energy, true},          Unit{"W", 1.0, dimensions::power, true},
    Unit{"rad", 1.0, dimensions::angle, true},         Unit{"sr", 1.0, dimensions::solid_angle, true},
    Unit{"Hz", 1.0, dimensions::time.times(-1), true}, Unit{"eV", 1.602176634e-19, dimensions::energy, true},
    Unit{"min", 60.0, dimensions::time, false},        Unit{"h", 3600.0, dimensions::time, false},
    Unit{"deg", pi / 180.0, dimensions::angle, false}, Unit{"°", pi / 180.0, dimensions::angle, false},
};

struct Prefix {
    std::string_view symbol;
    int exponent;  // of ten
};
// SI Brochure, 9th edition, table 7. Micro in its three spellings: U+00B5, U+03BC and the letter u.
constexpr std::array prefixes{
    Prefix{"a", -18},     Prefix{"f", -15}, Prefix{"p", -12}, Prefix{"n", -9}, Prefix{"\u00B5", -6},
    Prefix{"\u03BC", -6}, Prefix{"u", -6},  Prefix{"m", -3},  Prefix{"c", -2}, Prefix{"d", -1},
    Prefix{"k", 3},       Prefix{"M", 6},   Prefix{"G", 9},   Prefix{"T", 12}, Prefix{"P", 15},
};

/// A factor to SI units with the powers of ten kept apart: 5 µs is then 5 / 10^6 s, the double nearest to
/// 5e-6, whereas 5 × 1e-6 is the one below it and would fall short of a limit row that starts at 5e-6 s.
struct Scale {
    double factor = 1.0;
    int exponent = 0;
    Dimension dimension;
};

double scaled(double number, const Scale& scale) {
    const double power = std::pow(10.0, std::abs(scale.exponent));
    return scale.exponent < 0 ? number * scale.factor / power : number * scale.factor * power;
}

std::optional<Scale> find_unit(std::string_view symbol) {
    for (const Unit& unit : units)
        if (unit.symbol == symbol) return Scale{unit.in_si, 0, unit.dimension};
    for (const Prefix& prefix : prefixes) {
        if (!symbol.starts_with(prefix.symbol)) continue;
        const std::string_view rest = symbol.substr(prefix.symbol.size());
        for (const Unit& unit : units)
            if (unit.takes_prefix && unit.symbol == rest)
                return Scale{unit.in_si, prefix.exponent, unit.dimension};
    }
    return std::nullopt;
}

/// Reads a product of units: W/cm2, W cm^-2, W·cm⁻², W/(m2 sr).
class UnitReader {
  public:
    explicit UnitReader(std::string_view text) : rest_(text) {}

    Scale read() {
        Scale result = product();
        if (!rest_.empty()) fail();
        return result;
    }

  private:
    [[noreturn]] void fail() const { throw InputError("", ""); }

    bool take(std::string_view token) {
        if (!rest_.starts_with(token)) return false;
        rest_.remove_prefix(token.size());
        return true;
    }

    void skip_spaces() {
        while (take(" ") || take("\u00A0") || take("\u202F")) {
        }
    }

    Scale product() {
        Scale result;
        int sign = 1;
        bool first = true;
        while (true) {
            skip_spaces();
            if (rest_.empty() || rest_.front() == ')') break;
            if (!first) {
                if (take("/"))
                    sign = -1;
                else if (take("*") || take("·") || take("⋅"))
                    sign = 1;
                else
                    sign = 1;  // a space alone multiplies: W m-2 sr-1
                skip_spaces();
            }
            first = false;
            const Scale f = factor();
            result.factor *= sign > 0 ? f.factor : 1.0 / f.factor;
            result.exponent += sign * f.exponent;
            result.dimension = result.dimension + f.dimension.times(sign);
        }
        if (first) fail();
        return result;
    }

    Scale factor() {
        if (take("(")) {
            if (++depth_ > deepest) fail();
            Scale inner = product();
            if (!take(")")) fail();
            --depth_;
            return inner;
        }
        std::size_t length = 0;
        while (length < rest_.size()) {
            const auto byte = static_cast<unsigned char>(rest_[length]);
            const std::string_view tail = rest_.substr(length);
            const bool letter = (byte >= 'A' && byte <= 'Z') || (byte >= 'a' && byte <= 'z');
            if (letter)
                ++length;
            else if (tail.starts_with("\u00B5") || tail.starts_with("\u03BC") || tail.starts_with("°"))
                length += 2;
            else
                break;
        }
        const auto unit = find_unit(rest_.substr(0, length));
        if (!unit) fail();
        rest_.remove_prefix(length);
        const int power = exponent();
        return {std::pow(unit->factor, power), unit->exponent * power, unit->dimension.times(power)};
    }

    int exponent() {
        const bool announced = take("^");
        int sign = 1;
        if (take("-") || take("−") || take("⁻")) sign = -1;
        for (int digit = 1; digit <= 3; ++digit) {
            static constexpr std::array<std::string_view, 4> superscripts{"", "¹", "²", "³"};
            if (take(std::to_string(digit)) || take(superscripts[static_cast<std::size_t>(digit)]))
                return sign * digit;
        }
        if (sign < 0 || announced) fail();
        return 1;
    }

    static constexpr int deepest = 8;  ///< of nested parentheses; the reader calls itself for each
    std::string_view rest_;
    int depth_ = 0;
};

std::string_view trimmed(std::string_view text) {
    constexpr std::string_view space = " \t\r\n";
    const auto first = text.find_first_not_of(space);
    if (first == std::string_view::npos) return {};
    return text.substr(first, text.find_last_not_of(space) - first + 1);
}

struct Named {
    Dimension dimension;
    std::string_view name;
    std::string_view example;
};
constexpr std::array named{
    Named{Length::dimension, "length", "532 nm"},
    Named{Area::dimension, "area", "3 mm2"},
    Named{Duration::dimension, "duration", "0.25 s"},
    Named{Frequency::dimension, "frequency", "20 kHz"},
    Named{RadiantEnergy::dimension, "energy", "2 mJ"},
    Named{RadiantPower::dimension, "power", "5 mW"},
    Named{PlaneAngle::dimension, "angle", "1.2 mrad"},
    Named{SolidAngle::dimension, "solid angle", "0.1 sr"},
    Named{Irradiance::dimension, "irradiance", "0.2 uW/cm2"},
    Named{RadiantExposure::dimension, "radiant exposure", "20 J/cm2"},
    Named{RadiantIntensity::dimension, "radiant intensity", "0.5 W/sr"},
    Named{Radiance::dimension, "radiance", "100 W/(m2 sr)"},
    Named{RadianceDose::dimension, "radiance dose", "1e6 J/(m2 sr)"},
    Named{Dimension{}, "plain number", "1.2"},
};

const Named* find_name(Dimension dimension) {
    for (const Named& n : named)
        if (n.dimension == dimension) return &n;
    return nullptr;
}

}  // namespace

ReadQuantity read_quantity(std::string_view text, DecimalMark mark) {
    const std::string given(text);
    std::string_view rest = trimmed(text);
    if (rest.empty()) throw InputError("the text is empty", "a number and a unit");
    const std::size_t length = number_prefix_length(rest);
    if (length == 0 || (length == 1 && (rest[0] == '-' || rest[0] == '+')))
        throw InputError(quoted(given) + " does not start with a number", "a number and a unit");
    const double number = parse_number(rest.substr(0, length), mark);
    rest = trimmed(rest.substr(length));
    if (rest.empty()) return {number, Dimension{}};
    Scale scale;
    try {
        scale = UnitReader(rest).read();
    } catch (const InputError&) {
        throw InputError(
            quoted(std::string(rest)) + " in " + quoted(given) + " is not a known unit",
            "m, s, min, h, J, W, eV, Hz, rad, deg, sr with SI prefixes, such as nm, mW, W/cm2, mrad");
    }
    const double value_si = scaled(number, scale);
    if (!std::isfinite(value_si) || (value_si == 0.0 && number != 0.0))
        throw InputError(quoted(given) + " is too large or too small to calculate with",
                         "magnitudes from 1e-300 to 1e300 in SI units");
    return {value_si, scale.dimension};
}

double read_quantity_si(std::string_view text, Dimension expected, DecimalMark mark) {
    ReadQuantity read;
    try {
        read = read_quantity(text, mark);
    } catch (const InputError& error) {
        throw InputError(name_of(expected) + " expected, " + error.problem(),
                         error.accepted() + " (for example " + example_of(expected) + ")");
    }
    if (read.dimension == expected) return read.value_si;
    const std::string given = quoted(std::string(trimmed(text)));
    const std::string what = read.dimension == Dimension{}
                                 ? given + " has no unit"
                                 : given + " is " + name_with_article(read.dimension);
    throw InputError(name_of(expected) + " expected, " + what, "a value such as " + example_of(expected));
}

std::string name_of(Dimension dimension) {
    if (const Named* n = find_name(dimension)) return std::string(n->name);
    std::string text;
    const auto part = [&text](std::string_view symbol, int exponent) {
        if (exponent == 0) return;
        if (!text.empty()) text += " ";
        text += symbol;
        if (exponent != 1) text += std::to_string(exponent);
    };
    part("J", dimension.energy);
    part("m", dimension.length);
    part("s", dimension.time);
    part("rad", dimension.angle);
    part("sr", dimension.solid_angle);
    return "quantity in " + text;
}

std::string name_with_article(Dimension dimension) {
    const std::string name = name_of(dimension);
    const bool vowel = std::string_view("aei").find(name.front()) != std::string_view::npos;
    return (vowel ? "an " : "a ") + name;
}

std::string example_of(Dimension dimension) {
    const Named* n = find_name(dimension);
    return n ? std::string(n->example) : "a value in SI units";
}

}  // namespace dosimetry
