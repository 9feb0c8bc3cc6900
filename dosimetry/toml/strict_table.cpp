#include "toml/strict_table.h"

#include <algorithm>
#include <cmath>
#include <sstream>
#include <utility>

#include "quantities/decimal.h"

namespace dosimetry {
namespace {

std::string joined(const std::vector<std::string>& names) {
    std::string text;
    for (const std::string& name : names) text += (text.empty() ? "" : ", ") + name;
    return text;
}

/// Position of the first byte that does not continue valid UTF-8, or npos.
std::size_t first_invalid_utf8(std::string_view bytes) {
    std::size_t i = 0;
    const auto byte_at = [&](std::size_t n) { return static_cast<unsigned char>(bytes[n]); };
    while (i < bytes.size()) {
        const unsigned lead = byte_at(i);
        std::size_t length = 1;
        if (lead >= 0xC2 && lead <= 0xDF)
            length = 2;
        else if (lead >= 0xE0 && lead <= 0xEF)
            length = 3;
        else if (lead >= 0xF0 && lead <= 0xF4)
            length = 4;
        else if (lead >= 0x80)
            return i;
        if (i + length > bytes.size()) return i;
        for (std::size_t k = 1; k < length; ++k)
            if ((byte_at(i + k) & 0xC0U) != 0x80U) return i;
        i += length;
    }
    return std::string_view::npos;
}

TextPosition position_at(std::string_view bytes, std::size_t offset, const std::string& file_name) {
    const std::string_view before = bytes.substr(0, offset);
    const auto line = 1 + std::count(before.begin(), before.end(), '\n');
    const auto last_break = before.rfind('\n');
    const std::size_t column = last_break == std::string_view::npos ? offset + 1 : offset - last_break;
    return {file_name, static_cast<int>(line), static_cast<int>(column)};
}

TextPosition position_of(const toml::source_position& position, const std::string& file_name) {
    return {file_name, static_cast<int>(position.line), static_cast<int>(position.column)};
}

}  // namespace

toml::table parse_toml(std::string_view bytes, const std::string& file_name, std::size_t most_bytes) {
    const TextPosition start{file_name, 1, 1};
    if (bytes.size() > most_bytes)
        throw InputError("the file is longer than " + std::to_string(most_bytes / 1000000) + " MB",
                         "a TOML text file of a few kB", "", start);
    if (bytes.find_first_not_of(" \t\r\n") == std::string_view::npos)
        throw InputError("the file is empty", "a TOML text file", "", start);
    if (const auto nul = bytes.find('\0'); nul != std::string_view::npos)
        throw InputError("the file is not a text file, it holds a zero byte", "a TOML text file in UTF-8", "",
                         position_at(bytes, nul, file_name));
    if (const auto bad = first_invalid_utf8(bytes); bad != std::string_view::npos)
        throw InputError("the file is not encoded in UTF-8", "a TOML text file in UTF-8", "",
                         position_at(bytes, bad, file_name));
    try {
        return toml::parse(bytes, file_name);
    } catch (const toml::parse_error& error) {
        throw InputError("this is not valid TOML: " + std::string(error.description()), "TOML 1.0", "",
                         position_of(error.source().begin, file_name));
    }
}

TextPosition position_of(const toml::node& node, const std::string& file_name) {
    return position_of(node.source().begin, file_name);
}

std::string described(const toml::node& node) {
    if (const auto* text = node.as_string()) return "the text " + quoted(text->get());
    if (node.is_table()) return "a table";
    if (node.is_array()) return "a list";
    if (const auto* number = node.as_floating_point()) return "the number " + shortest(number->get());
    std::ostringstream stream;
    stream << toml::node_view<const toml::node>(node);
    const char* kind = node.is_number() ? "the number " : node.is_boolean() ? "" : "the date or time ";
    return kind + stream.str();
}

StrictTable::StrictTable(const toml::table& table, std::string file_name, std::string path,
                         std::vector<std::string> known)
    : table_(&table), file_name_(std::move(file_name)), path_(std::move(path)), known_(std::move(known)) {
    for (const auto& [key, value] : table) {
        if (std::find(known_.begin(), known_.end(), key.str()) != known_.end()) continue;
        throw InputError(
            "unknown key " + quoted(std::string(key.str())) + (path_.empty() ? "" : " in " + path_),
            joined(known_), path_of(std::string(key.str())), position_of(key.source().begin, file_name_));
    }
}

TextPosition StrictTable::where(const std::string& key) const {
    if (const toml::node* node = key.empty() ? nullptr : table_->get(key))
        return position_of(*node, file_name_);
    const TextPosition own = position_of(*table_, file_name_);
    return own.line > 0 ? own : TextPosition{file_name_, 1, 1};
}

InputError StrictTable::error(const std::string& key, const std::string& problem,
                              const std::string& accepted) const {
    return {problem, accepted, path_of(key), where(key)};
}

const toml::node& StrictTable::node(const std::string& key) const {
    const toml::node* found = table_->get(key);
    if (!found)
        throw error(key, "the key " + quoted(key) + " is missing" + (path_.empty() ? "" : " in " + path_),
                    key + " = …");
    return *found;
}

std::string StrictTable::text(const std::string& key) const {
    const toml::node& found = node(key);
    if (const auto* text = found.as_string()) return text->get();
    throw error(key, key + " must be a text in quotation marks, " + described(found) + " is not",
                key + " = \"…\"");
}

std::optional<std::string> StrictTable::maybe_text(const std::string& key) const {
    return has(key) ? std::optional(text(key)) : std::nullopt;
}

double StrictTable::number(const std::string& key) const {
    const toml::node& found = node(key);
    const std::optional<double> value = found.is_number() ? found.value<double>() : std::nullopt;
    if (!value || !std::isfinite(*value))
        throw error(key, key + " must be a finite number without a unit, " + described(found) + " is not",
                    key + " = 1.2");
    return *value;
}

std::optional<double> StrictTable::maybe_number(const std::string& key) const {
    return has(key) ? std::optional(number(key)) : std::nullopt;
}

bool StrictTable::flag(const std::string& key, bool when_missing) const {
    if (!has(key)) return when_missing;
    const toml::node& found = node(key);
    if (const auto* value = found.as_boolean()) return value->get();
    throw error(key, key + " must be true or false, " + described(found) + " is not", "true or false");
}

const toml::array& StrictTable::array(const std::string& key) const {
    const toml::node& found = node(key);
    if (const auto* list = found.as_array()) return *list;
    throw error(key, key + " must be a list, " + described(found) + " is not", key + " = [ … ]");
}

std::vector<std::string> StrictTable::texts(const std::string& key) const {
    std::vector<std::string> result;
    for (const toml::node& element : array(key)) {
        const auto* text = element.as_string();
        if (!text)
            throw InputError(key + " must be a list of texts, " + described(element) + " is not one",
                             key + " = [\"…\"]", path_of(key), position_of(element, file_name_));
        result.push_back(text->get());
    }
    return result;
}

StrictTable StrictTable::table(const std::string& key, std::vector<std::string> known) const {
    const toml::node& found = node(key);
    if (const auto* inner = found.as_table()) return {*inner, file_name_, path_of(key), std::move(known)};
    throw error(key, key + " must be a table, " + described(found) + " is not", "[" + path_of(key) + "]");
}

std::vector<StrictTable> StrictTable::tables(const std::string& key,
                                             const std::vector<std::string>& known) const {
    std::vector<StrictTable> result;
    if (!has(key)) return result;
    for (const toml::node& element : array(key)) {
        const auto* inner = element.as_table();
        if (!inner)
            throw InputError(key + " must be a list of tables, " + described(element) + " is not one",
                             "[[" + path_of(key) + "]]", path_of(key), position_of(element, file_name_));
        result.emplace_back(*inner, file_name_, path_of(key) + "[" + std::to_string(result.size()) + "]",
                            known);
    }
    return result;
}

}  // namespace dosimetry
