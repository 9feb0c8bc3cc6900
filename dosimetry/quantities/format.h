#pragma once

#include <string>

#include "quantities/decimal.h"
#include "quantities/quantity.h"

namespace dosimetry {

/// A number for people: "25.4", "0.0123", "1.30×10¹⁹"; minus is U+2212. Infinite or NaN is a programming
/// error.
std::string format_number(double value, int significant, Rounding rounding);

/// A value with the unit that suits its size: "5.00 mW", "706.8 m", "25.4 W/m²", "1.34×10¹⁹ 1/s".
std::string format_quantity_si(double value_si, Dimension dimension, int significant, Rounding rounding);

template <Dimension D, class W>
std::string format(Quantity<D, W> quantity, int significant, Rounding rounding) {
    return format_quantity_si(quantity.in_si(), D, significant, rounding);
}

/// A round value as people write it, nearest, at most six digits and no trailing zeros: "180 nm", "1 mm",
/// "100 fs".
std::string format_round_si(double value_si, Dimension dimension);

template <Dimension D, class W>
std::string format_round(Quantity<D, W> quantity) {
    return format_round_si(quantity.in_si(), D);
}

/// Enough digits to repeat a calculation by hand (9 significant), trailing zeros left out, in the SI unit.
std::string exact_number(double value);
/// The same inside a formula: in parentheses where it has a power of ten, so that (2×10⁻⁵)² is not read as
/// 10⁻⁵².
std::string exact_term(double value);
std::string exact_quantity_si(double value_si, Dimension dimension);

template <Dimension D, class W>
std::string exact(Quantity<D, W> quantity) {
    return exact_quantity_si(quantity.in_si(), D);
}

/// The SI unit of a dimension with superscripts: "W/m²", "J/(m² sr)", "1/s".
std::string si_unit(Dimension dimension);

}  // namespace dosimetry
