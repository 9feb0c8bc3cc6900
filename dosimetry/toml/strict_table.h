#pragma once

#include <toml++/toml.h>

#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "quantities/input_error.h"

namespace dosimetry {

/// Parses a TOML 1.0 text. Throws InputError with file, line and column for anything that is not one: too
/// long, not UTF-8, binary, syntax errors.
toml::table parse_toml(std::string_view bytes, const std::string& file_name, std::size_t most_bytes);

/// A TOML table whose keys are all known beforehand. Every accessor throws InputError that names the key, the
/// value found and what would be accepted (for a missing value, `example`), with its place in the file.
class StrictTable {
  public:
    /// Throws if the table holds a key that is in neither list. Messages list the known ones; a reader uses
    /// the other list for keys that it knows and refuses with a reason of its own. `path` is the table's own
    /// key ("source[0]").
    StrictTable(const toml::table& table, std::string file_name, std::string path,
                const std::vector<std::string>& known, const std::vector<std::string>& refused = {});

    const std::string& path() const { return path_; }
    const std::string& file_name() const { return file_name_; }
    bool has(const std::string& key) const { return table_->contains(key); }
    std::string path_of(const std::string& key) const { return path_.empty() ? key : path_ + "." + key; }
    /// The place of a key's value; of the table itself if the key is not there.
    TextPosition where(const std::string& key = {}) const;
    InputError error(const std::string& key, const std::string& problem, const std::string& accepted) const;

    /// The node of a required key.
    const toml::node& node(const std::string& key, const std::string& example = "…") const;
    std::string text(const std::string& key, const std::string& example = "\"…\"") const;
    std::optional<std::string> maybe_text(const std::string& key) const;
    /// A finite number, whole or not.
    double number(const std::string& key, const std::string& example = "1.2") const;
    std::optional<double> maybe_number(const std::string& key) const;
    bool flag(const std::string& key, bool when_missing) const;
    std::vector<std::string> texts(const std::string& key, const std::string& example = "[\"…\"]") const;
    StrictTable table(const std::string& key, const std::vector<std::string>& known,
                      const std::vector<std::string>& refused = {}) const;
    /// An array of tables; empty if the key is missing.
    std::vector<StrictTable> tables(const std::string& key, const std::vector<std::string>& known,
                                    const std::vector<std::string>& refused = {}) const;
    const toml::array& array(const std::string& key, const std::string& example = "[ … ]") const;

  private:
    /// The header a file would write for a table at that key, "source.beam" for "source[0].beam".
    std::string header_of(const std::string& key) const;

    const toml::table* table_;
    std::string file_name_;
    std::string path_;
};

/// What a TOML value is, for messages: "the number 5", "the text \"5\"".
std::string described(const toml::node& node);

TextPosition position_of(const toml::node& node, const std::string& file_name);

}  // namespace dosimetry
