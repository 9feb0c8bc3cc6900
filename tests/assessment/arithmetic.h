#pragma once

#include <string>
#include <string_view>

namespace testing_support {

/// The value of a sum as a trail writes it: "√(0.002² + 0.001² · (0.5 − 0)²)", "18 · 0.25^0.75 · 1",
/// "6.36×10⁻⁷". Throws std::runtime_error that quotes what it could not read.
double value_of(std::string_view text);

/// The leading number of a result: "6.36396103 J/m²" is 6.36396103.
double leading_number(std::string_view text);

}  // namespace testing_support
