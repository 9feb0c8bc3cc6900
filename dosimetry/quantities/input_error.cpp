#include "quantities/input_error.h"

#include <utility>

namespace dosimetry {
namespace {

std::string sentence_of(const std::string& problem, const std::string& accepted) {
    return accepted.empty() ? problem : problem + "; accepted: " + accepted;
}

std::string full_message(const std::string& problem, const std::string& accepted, const TextPosition& where) {
    std::string place;
    if (!where.file.empty()) {
        place = where.file + ":";
        if (where.line > 0) place += std::to_string(where.line) + ":" + std::to_string(where.column) + ":";
        place += " ";
    }
    return place + sentence_of(problem, accepted);
}

}  // namespace

InputError::InputError(std::string problem, std::string accepted, std::string key, TextPosition where)
    : std::runtime_error(full_message(problem, accepted, where)),
      problem_(std::move(problem)),
      accepted_(std::move(accepted)),
      key_(std::move(key)),
      where_(std::move(where)) {}

std::string InputError::sentence() const {
    return sentence_of(problem_, accepted_);
}

InputError InputError::with_key(std::string key) const {
    return {problem_, accepted_, std::move(key), where_};
}

InputError InputError::at(TextPosition where) const {
    return {problem_, accepted_, key_, std::move(where)};
}

std::string quoted(const std::string& value) {
    constexpr std::size_t longest = 60;
    std::string shown;
    for (char c : value) {
        const auto byte = static_cast<unsigned char>(c);
        // Never cut inside a UTF-8 sequence: only a byte that starts a character may end the loop.
        const bool starts_character = (byte & 0xC0U) != 0x80U;
        if (shown.size() >= longest && starts_character) {
            shown += "…";
            break;
        }
        shown += (byte < 0x20 || byte == 0x7F) ? '?' : c;
    }
    return "\"" + shown + "\"";
}

}  // namespace dosimetry
