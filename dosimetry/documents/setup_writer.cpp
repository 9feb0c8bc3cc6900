#include "beams/names.h"
#include "documents/setup_document.h"

namespace dosimetry {
namespace {

/// A TOML basic string.
std::string in_quotes(std::string_view text) {
    static constexpr std::string_view hex = "0123456789ABCDEF";
    std::string result = "\"";
    for (char c : text) {
        const auto byte = static_cast<unsigned char>(c);
        if (c == '"' || c == '\\') {
            result += '\\';
            result += c;
        } else if (c == '\n') {
            result += "\\n";
        } else if (c == '\t') {
            result += "\\t";
        } else if (byte < 0x20 || byte == 0x7F) {
            result += "\\u00";
            result += hex[byte >> 4U];
            result += hex[byte & 15U];
        } else {
            result += c;
        }
    }
    return result + "\"";
}

void line(std::string& out, const std::string& key, const std::string& value) {
    out += key + " = " + value + "\n";
}

void text_line(std::string& out, const std::string& key, std::string_view text) {
    if (!text.empty()) line(out, key, in_quotes(text));
}

template <class Q>
void stated_line(std::string& out, const std::string& key, const std::optional<Stated<Q>>& stated) {
    if (stated) line(out, key, in_quotes(stated->text));
}

}  // namespace

std::string write_setup(const Setup& setup) {
    std::string out = "format = 1\n\n[assessment]\n";
    text_line(out, "title", setup.title);
    text_line(out, "place", setup.place);
    text_line(out, "assessor", setup.assessor);
    if (!setup.date.empty()) line(out, "date", setup.date);
    std::string ids;
    for (const std::string& id : setup.limits) ids += (ids.empty() ? "" : ", ") + in_quotes(id);
    line(out, "limits", "[" + ids + "]");
    text_line(out, "note", setup.note);
    for (const LaserSetup& source : setup.sources) {
        const BeamSetup& beam = source.beam;
        out += "\n[[source]]\n";
        line(out, "id", in_quotes(source.id));
        line(out, "kind", in_quotes("laser"));
        line(out, "wavelength", in_quotes(source.wavelength.text));
        stated_line(out, "apparent_source", source.apparent_source);
        out += "[source.emission]\n";
        line(out, "mode", in_quotes("continuous"));
        line(out, "power", in_quotes(source.power.text));
        out += "[source.beam]\n";
        line(out, "profile", in_quotes(name_of_choice(profile_names, beam.profile).in_files));
        stated_line(out, "diameter", beam.diameter);
        line(out, "measured_at", in_quotes(name_of_choice(width_names, beam.measured_at).in_files));
        stated_line(out, "divergence", beam.divergence);
        if (beam.m2) line(out, "m2", shortest(*beam.m2));
        stated_line(out, "waist", beam.waist);
        stated_line(out, "waist_at", beam.waist_at);
    }
    for (const PositionSetup& position : setup.positions) {
        out += "\n[[position]]\n";
        line(out, "id", in_quotes(position.id));
        line(out, "at", in_quotes(position.at.text));
        line(out, "exposure", in_quotes(position.exposure.text));
        const char* tissues = position.eye && position.skin ? "[\"eye\", \"skin\"]"
                              : position.eye                ? "[\"eye\"]"
                                                            : "[\"skin\"]";
        line(out, "tissues", tissues);
    }
    return out;
}

}  // namespace dosimetry
