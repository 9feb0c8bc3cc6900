#pragma once

#include <cstddef>
#include <cstdint>
#include <cstdlib>

/// One input; libFuzzer or the replay calls it.
extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size);

/// What must hold for any input. Not assert: the targets run in release builds too.
inline void require(bool holds) {
    if (!holds) std::abort();
}
