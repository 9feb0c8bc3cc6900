#pragma once

#include <string>
#include <vector>

namespace dosimetry {

/// One step of a derivation. Numbers are shown with nine significant digits, so that the step can be repeated
/// by hand with the same digits in the result.
struct TrailStep {
    std::string symbol;        ///< "H_EL"
    std::string meaning;       ///< "exposure limit"
    std::string formula;       ///< "18 · t^0.75 · CE"
    std::string with_numbers;  ///< "18 · 0.25^0.75 · 1"
    std::string result;        ///< "6.36396103 J/m²"
    std::string source;  ///< document and clause, or where the input stands; with provenance for limit values
};

/// How a number came about, inputs first, the number itself last. Empty where recording was off.
struct Trail {
    std::string subject;
    std::vector<TrailStep> steps;
};

}  // namespace dosimetry
