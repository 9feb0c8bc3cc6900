#pragma once

#include <string>

namespace dosimetry {

/// Longest assessment file that is read, in bytes. Real ones have a few thousand.
inline constexpr std::size_t most_setup_bytes = 1'000'000;

/// The bytes of a file, "-" meaning standard input; reads at most one byte more than `most_setup_bytes`, so
/// that a huge file is refused without being read. Throws InputError if it cannot be read.
std::string read_file(const std::string& name);

}  // namespace dosimetry
