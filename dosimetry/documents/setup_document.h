#pragma once

#include <map>
#include <string>
#include <string_view>

#include "assessment/setup.h"
#include "quantities/input_error.h"

namespace dosimetry {

class LimitLibrary;

/// A setup as read from a file, with the place of every value, so that later answers ("not covered") can
/// point there.
struct SetupDocument {
    Setup setup;
    std::map<std::string, TextPosition> places;
    std::string sha256;  ///< of the bytes read

    /// The place of a key, or of the nearest key around it.
    TextPosition place_of(const std::string& key, const std::string& file_name) const;
};

/// Reads an assessment file (TOML 1.0, format 1; docs/assessment_file.md) and checks it. Throws InputError
/// with file, line and column for anything that is not in order; nothing is guessed and no key is ignored.
SetupDocument read_setup(std::string_view toml, const std::string& file_name, const LimitLibrary& library);

/// The setup as an assessment file; reading it gives an equal setup. Every quantity is written as it was
/// stated.
std::string write_setup(const Setup& setup);

}  // namespace dosimetry
