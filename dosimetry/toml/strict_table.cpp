#include "toml/strict_table.h"

#include <algorithm>
#include <cmath>
#include <sstream>
#include <utility>

#include "quantities/decimal.h"
#include "toml/key_depth.h"

namespace dosimetry {
namespace {

std::string joined(const std::vector<std::string>& names) {
    std::string text;
    for (const std::string& name : names) text += (text.empty() ? "" : ", ") + name;
    return text;
}

/// Length of the UTF-8 sequence that starts with the byte, 0 if none does; and the least and largest second
/// byte, which exclude overlong forms, surrogates and values above U+10FFFF (Unicode 15, table 3-7).
struct Sequence {
    std::size_t length = 0;
    unsigned second_from = 0x80;
    unsigned second_to = 0xBF;
};
Sequence sequence_of(unsigned lead) {
    if (lead < 0x80) return {1};
    if (lead >= 0xC2 && lead <= 0xDF) return {2};
    if (lead == 0xE0) return {3, 0xA0, 0xBF};
    if (lead == 0xED) return {3, 0x80, 0x9F};
    if (lead >= 0xE1 && lead <= 0xEF) return {3};
    if (lead == 0xF0) return {4, 0x90, 0xBF};
    if (lead >= 0xF1 && lead <= 0xF3) return {4};
    if (lead == 0xF4) return {4, 0x80, 0x8F};
    return {};
}

/// Position of the first byte that does not continue valid UTF-8, or npos.
std::size_t first_invalid_utf8(std::string_view bytes) {
    const auto byte_at = [&](std::size_t n) {
        return static_cast<unsigned>(static_cast<unsigned char>(bytes[n]));
    };
    std::size_t i = 0;
    while (i < bytes.size()) {
        const Sequence sequence = sequence_of(byte_at(i));
        if (sequence.length == 0 || i + sequence.length > bytes.size()) return i;
        for (std::size_t k = 1; k < sequence.length; ++k) {
            const unsigned byte = byte_at(i + k);
            const bool second = k == 1;
            if (byte < (second ? sequence.second_from : 0x80U) ||
                byte > (second ? sequence.second_to : 0xBFU))
                return i;
        }
        i += sequence.length;
    }
    return std::string_view::npos;
}

std::size_t characters_in(std::string_view text) {
    return static_cast<std::size_t>(std::count_if(
        text.begin(), text.end(), [](char c) { return (static_cast<unsigned char>(c) & 0xC0U) != 0x80U; }));
}

/// Columns count characters, as toml++ does.
TextPosition position_at(std::string_view bytes, std::size_t offset, const std::string& file_name) {
    const std::string_view before = bytes.substr(0, offset);
    const auto line = 1 + std::count(before.begin(), before.end(), '\n');
    const std::string_view in_line = before.substr(before.rfind('\n') + 1);
    return {file_name, static_cast<int>(line), static_cast<int>(characters_in(in_line) + 1)};
}

TextPosition position_of(const toml::source_position& position, const std::string& file_name) {
    return {file_name, static_cast<int>(position.line), static_cast<int>(position.column)};
}

/// Whether the place lies behind the last character of its line.
bool at_end_of_line(std::string_view bytes, const toml::source_position& position) {
    for (toml::source_index line = 1; line < position.line; ++line) {
        const auto end = bytes.find('\n');
        if (end == std::string_view::npos) return true;
        bytes.remove_prefix(end + 1);
    }
    return position.column > characters_in(bytes.substr(0, bytes.find('\n')));
}

/// toml++ says "Error while parsing string: reason"; people are told which part of their file it is.
InputError syntax_error(const toml::parse_error& error, std::string_view bytes,
                        const std::string& file_name) {
    const TextPosition where = position_of(error.source().begin, file_name);
    const std::string accepted = "TOML 1.0, such as power = \"5 mW\"";
    std::string_view reason = error.description();
    constexpr std::string_view start = "Error while parsing ";
    const auto colon = reason.find(": ");
    if (!reason.starts_with(start) || colon == std::string_view::npos)
        return {"this is not valid TOML: " + std::string(reason), accepted, "", where};
    const std::string part(reason.substr(start.size(), colon - start.size()));
    reason.remove_prefix(colon + 2);
    if (part == "string" && at_end_of_line(bytes, error.source().begin))
        return {"a text has no closing quotation mark on its line", accepted, "", where};
    return {"this " + part + " is not valid TOML: " + std::string(reason), accepted, "", where};
}

}  // namespace

toml::table parse_toml(std::string_view bytes, const std::string& file_name, std::size_t most_bytes) {
    const TextPosition start{file_name, 1, 1};
    if (bytes.size() > most_bytes)
        throw InputError("the file is longer than " + std::to_string(most_bytes / 1000000) + " MB",
                         "a TOML text file of a few kB", "", start);
    if (bytes.find_first_not_of(" \t\r\n") == std::string_view::npos)
        throw InputError("the file is empty", "a TOML text file", "", start);
    const auto nul = bytes.find('\0');
    const auto bad = first_invalid_utf8(bytes);
    if (nul < bad)
        throw InputError("the file is not a text file, it holds a zero byte", "a TOML text file in UTF-8", "",
                         position_at(bytes, nul, file_name));
    if (bad != std::string_view::npos)
        throw InputError("the file is not encoded in UTF-8", "a TOML text file in UTF-8", "",
                         position_at(bytes, bad, file_name));
    constexpr int most_dots = 16;
    if (const auto deep = too_deep_key(bytes, most_dots); deep != std::string_view::npos)
        throw InputError("a key has more than " + std::to_string(most_dots) + " dots",
                         "keys such as source.beam", "", position_at(bytes, deep, file_name));
    try {
        return toml::parse(bytes, file_name);
    } catch (const toml::parse_error& error) {
        throw syntax_error(error, bytes, file_name);
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
                         const std::vector<std::string>& known, const std::vector<std::string>& refused)
    : table_(&table), file_name_(std::move(file_name)), path_(std::move(path)) {
    const auto holds = [](const std::vector<std::string>& names, std::string_view name) {
        return std::find(names.begin(), names.end(), name) != names.end();
    };
    for (const auto& [key, value] : table)
        if (!holds(known, key.str()) && !holds(refused, key.str()))
            throw InputError(
                "unknown key " + quoted(std::string(key.str())) + (path_.empty() ? "" : " in " + path_),
                joined(known), path_of(std::string(key.str())), position_of(key.source().begin, file_name_));
}

std::string StrictTable::header_of(const std::string& key) const {
    std::string header = path_of(key);
    for (auto open = header.find('['); open != std::string::npos; open = header.find('['))
        header.erase(open, header.find(']', open) - open + 1);
    return header;
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

const toml::node& StrictTable::node(const std::string& key, const std::string& example) const {
    const toml::node* found = table_->get(key);
    if (!found)
        throw error(key, "the key " + quoted(key) + " is missing" + (path_.empty() ? "" : " in " + path_),
                    key + " = " + example);
    return *found;
}

std::string StrictTable::text(const std::string& key, const std::string& example) const {
    const toml::node& found = node(key, example);
    if (const auto* text = found.as_string()) return text->get();
    throw error(key, key + " must be a text in quotation marks, " + described(found) + " is not",
                key + " = " + example);
}

std::optional<std::string> StrictTable::maybe_text(const std::string& key) const {
    return has(key) ? std::optional(text(key)) : std::nullopt;
}

double StrictTable::number(const std::string& key, const std::string& example) const {
    const toml::node& found = node(key, example);
    const std::optional<double> value = found.is_number() ? found.value<double>() : std::nullopt;
    if (!value || !std::isfinite(*value))
        throw error(key, key + " must be a finite number without a unit, " + described(found) + " is not",
                    key + " = " + example);
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

const toml::array& StrictTable::array(const std::string& key, const std::string& example) const {
    const toml::node& found = node(key, example);
    if (const auto* list = found.as_array()) return *list;
    throw error(key, key + " must be a list, " + described(found) + " is not", key + " = " + example);
}

std::vector<std::string> StrictTable::texts(const std::string& key, const std::string& example) const {
    std::vector<std::string> result;
    for (const toml::node& element : array(key, example)) {
        const auto* text = element.as_string();
        if (!text)
            throw InputError(key + " must be a list of texts, " + described(element) + " is not one",
                             key + " = " + example, path_of(key), position_of(element, file_name_));
        result.push_back(text->get());
    }
    return result;
}

StrictTable StrictTable::table(const std::string& key, const std::vector<std::string>& known,
                               const std::vector<std::string>& refused) const {
    const std::string header = "[" + header_of(key) + "]";
    if (!has(key))
        throw error(key, "the table " + quoted(key) + " is missing" + (path_.empty() ? "" : " in " + path_),
                    header);
    const toml::node& found = node(key);
    if (const auto* inner = found.as_table()) return {*inner, file_name_, path_of(key), known, refused};
    throw error(key, key + " must be a table, " + described(found) + " is not", header);
}

std::vector<StrictTable> StrictTable::tables(const std::string& key, const std::vector<std::string>& known,
                                             const std::vector<std::string>& refused) const {
    std::vector<StrictTable> result;
    if (!has(key)) return result;
    const toml::array* list = node(key).as_array();
    const auto fail = [&](const toml::node& found) {
        throw InputError(key + " must be a list of tables, " + described(found) + " is not one",
                         "[[" + header_of(key) + "]]", path_of(key), position_of(found, file_name_));
    };
    if (!list) fail(node(key));
    for (const toml::node& element : *list) {
        const auto* inner = element.as_table();
        if (!inner) fail(element);
        result.emplace_back(*inner, file_name_, path_of(key) + "[" + std::to_string(result.size()) + "]",
                            known, refused);
    }
    return result;
}

}  // namespace dosimetry
