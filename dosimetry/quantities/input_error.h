#pragma once

#include <stdexcept>
#include <string>

namespace dosimetry {

/// Where in a text an input stands. Line and column count from 1; 0 means not known.
struct TextPosition {
    std::string file;
    int line = 0;
    int column = 0;
};

/// The one exception for bad input. It knows what is wrong (with the offending value quoted), what would be
/// accepted, which key it concerns ("source[0].beam.diameter") and, once a reader has added it, the place.
class InputError : public std::runtime_error {
  public:
    InputError(std::string problem, std::string accepted, std::string key = {}, TextPosition where = {});

    const std::string& problem() const { return problem_; }
    const std::string& accepted() const { return accepted_; }
    const std::string& key() const { return key_; }
    const TextPosition& where() const { return where_; }

    /// One sentence, problem and what would be accepted, without the place.
    std::string sentence() const;
    /// The same error with the key or the place filled in.
    InputError with_key(std::string key) const;
    InputError at(TextPosition where) const;

  private:
    std::string problem_;
    std::string accepted_;
    std::string key_;
    TextPosition where_;
};

/// A user's value as it may be quoted in a message: in quotation marks, shortened, control characters shown.
std::string quoted(const std::string& value);

}  // namespace dosimetry
