#include "limits/sha256.h"

#include <openssl/sha.h>

#include <array>

namespace dosimetry {

std::string sha256_hex(std::string_view bytes) {
    std::array<unsigned char, SHA256_DIGEST_LENGTH> digest{};
    const void* data = bytes.data();
    SHA256(static_cast<const unsigned char*>(data), bytes.size(), digest.data());
    static constexpr std::string_view hex = "0123456789abcdef";
    std::string text;
    for (unsigned char byte : digest) {
        text += hex[byte >> 4U];
        text += hex[byte & 15U];
    }
    return text;
}

}  // namespace dosimetry
