#include "quantities/stated.h"

#include "quantities/input_error.h"

namespace dosimetry {

void require_between(double value_si, const std::string& text, double lowest_si, double highest_si,
                     const std::string& meaning, const std::string& range_text, const std::string& key) {
    if (value_si >= lowest_si && value_si <= highest_si) return;
    const std::string problem = value_si <= 0.0 ? " must be greater than zero, " + quoted(text) + " is not"
                                                : " " + quoted(text) + " is outside what can be calculated";
    throw InputError(meaning + problem, range_text, key);
}

}  // namespace dosimetry
