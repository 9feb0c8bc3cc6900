#include "toml/key_depth.h"

#include <algorithm>

namespace dosimetry {
namespace {

/// Offset of the last character of the string that starts at `begin`, or of the text. One that is not closed
/// on its line ends there; the parser will complain.
std::size_t end_of_string(std::string_view toml, std::size_t begin) {
    const char quote = toml[begin];
    const std::string_view triple = toml.substr(begin, 3);
    const bool many_lines = triple.size() == 3 && triple[1] == quote && triple[2] == quote;
    const std::string_view closing = toml.substr(begin, many_lines ? 3 : 1);
    for (std::size_t i = begin + closing.size(); i < toml.size(); ++i) {
        if (toml[i] == '\\' && quote == '"')
            ++i;
        else if (toml.substr(i).starts_with(closing))
            return i + closing.size() - 1;
        else if (toml[i] == '\n' && !many_lines)
            return i;
    }
    return toml.size();
}

}  // namespace

std::size_t too_deep_key(std::string_view toml, int most) {
    constexpr std::string_view ends_a_key = "\n=,[]{}";
    int dots = 0;
    for (std::size_t i = 0; i < toml.size(); ++i) {
        if (toml[i] == '#') {
            i = std::min(toml.find('\n', i), toml.size());
            dots = 0;
        } else if (toml[i] == '"' || toml[i] == '\'') {
            i = end_of_string(toml, i);
        } else if (toml[i] == '.') {
            if (++dots > most) return i;
        } else if (ends_a_key.find(toml[i]) != std::string_view::npos) {
            dots = 0;
        }
    }
    return std::string_view::npos;
}

}  // namespace dosimetry
