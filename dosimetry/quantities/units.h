#pragma once

#include <string>
#include <string_view>

#include "quantities/decimal.h"
#include "quantities/quantity.h"

namespace dosimetry {

/// A value read with its unit, converted to SI.
struct ReadQuantity {
    double value_si = 0.0;
    Dimension dimension;
};

/// Reads "5 mW", "0.2 µW/cm²", "0.2 uW/cm2", "1.2 mrad", "35 fs", "100 W m^-2 sr^-1": a number, then a
/// product of units with SI prefixes (both spellings of micro, and u). Throws InputError that quotes the
/// text.
ReadQuantity read_quantity(std::string_view text, DecimalMark mark);

/// Reads and checks the dimension; a wrong one is named: power expected, "5 nm" is a length.
double read_quantity_si(std::string_view text, Dimension expected, DecimalMark mark);

template <class Q>
Q parse(std::string_view text, DecimalMark mark = DecimalMark::point) {
    return Q::from_si(read_quantity_si(text, Q::dimension, mark));
}

/// "length", "power", "irradiance" …; SI base units where there is no name.
std::string name_of(Dimension dimension);

/// "a length", "an energy" …
std::string name_with_article(Dimension dimension);

/// A value with unit of that dimension as one may write it, for messages: "5 mW", "532 nm".
std::string example_of(Dimension dimension);

}  // namespace dosimetry
