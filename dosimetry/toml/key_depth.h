#pragma once

#include <cstddef>
#include <string_view>

namespace dosimetry {

/// Where in a TOML text a dotted key (a.b.c) has more than `most` dots, npos if nowhere. toml++ makes one
/// table inside the other for each and calls itself once for each when it clears them away: a long enough key
/// would end the program.
std::size_t too_deep_key(std::string_view toml, int most);

}  // namespace dosimetry
