#include <algorithm>
#include <array>
#include <optional>

#include "beams/names.h"
#include "documents/files.h"
#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "limits/sha256.h"
#include "toml/strict_table.h"

namespace dosimetry {
namespace {

class SetupReader {
  public:
    SetupReader(std::string_view bytes, const std::string& file_name)
        : document_(parse_toml(bytes, file_name, most_setup_bytes)),
          root_(document_, file_name, "", {"format", "assessment", "source", "position"}, {"path"}) {}

    SetupDocument read(const LimitLibrary& library) {
        if (root_.number("format", "1") != 1.0)
            throw root_.error("format", "the format of the file is " + described(root_.node("format")),
                              "format = 1");
        read_assessment();
        if (root_.has("path"))
            throw root_.error("path", "elements in the path of the beam are not part of this version",
                              "a file without [[path]]");
        note_place(root_, "source");
        note_place(root_, "position");
        for (const StrictTable& t : root_.tables(
                 "source", {"id", "kind", "wavelength", "apparent_source", "emission", "beam"},
                 {"lines", "flux", "intensity", "luminous_flux", "peak", "width", "size", "viewing_angle",
                  "temperature", "emissivity", "height", "file", "quantity", "at", "irradiance"}))
            result_.setup.sources.push_back(read_source(t));
        for (const StrictTable& t :
             root_.tables("position", {"id", "at", "exposure", "tissues", "viewing"}, {"angle", "eyewear"}))
            result_.setup.positions.push_back(read_position(t));
        try {
            check(result_.setup, library);
        } catch (const InputError& error) {
            throw error.at(result_.place_of(error.key(), root_.file_name()));
        }
        return std::move(result_);
    }

  private:
    void note_place(const StrictTable& t, const std::string& key) {
        if (t.has(key)) result_.places[t.path_of(key)] = t.where(key);
    }

    std::string text(const StrictTable& t, const std::string& key, const std::string& example = "…") {
        note_place(t, key);
        return t.text(key, "\"" + example + "\"");
    }

    std::string text_or_empty(const StrictTable& t, const std::string& key) {
        return t.has(key) ? text(t, key) : "";
    }

    /// A name that lists and messages use: not empty.
    std::string identifier(const StrictTable& t, const std::string& example) {
        std::string id = text(t, "id", example);
        if (id.empty()) throw t.error("id", "the id is empty", "a short name, such as \"" + example + "\"");
        return id;
    }

    template <class Q>
    Stated<Q> stated(const StrictTable& t, const std::string& key, const std::string& example) {
        note_place(t, key);
        const std::string accepted = key + " = \"" + example + "\"";
        const toml::node& node = t.node(key, "\"" + example + "\"");
        if (node.is_number())
            throw t.error(key, key + " is " + described(node) + " without a unit", accepted);
        if (!node.is_string())
            throw t.error(
                key,
                key + " must be a value with its unit in quotation marks, " + described(node) + " is not",
                accepted);
        try {
            return Stated<Q>(t.text(key));
        } catch (const InputError& error) {
            throw error.with_key(t.path_of(key)).at(t.where(key));
        }
    }

    template <class Q>
    std::optional<Stated<Q>> maybe_stated(const StrictTable& t, const std::string& key,
                                          const std::string& example) {
        return t.has(key) ? std::optional(stated<Q>(t, key, example)) : std::nullopt;
    }

    template <class Enum, std::size_t N>
    Enum choice(const StrictTable& t, const std::string& key, const std::array<ChoiceName<Enum>, N>& names) {
        const std::string given = text(t, key, std::string(names.front().in_files));
        std::string accepted;
        for (const auto& name : names) {
            if (name.in_files == given) return name.value;
            accepted += (accepted.empty() ? "\"" : ", \"") + std::string(name.in_files) + "\"";
        }
        throw t.error(key, key + " " + quoted(given) + " is not known in this version", accepted);
    }

    /// The files of this format know more than this version calculates; what it cannot do it refuses by name.
    void refuse(const StrictTable& t, std::initializer_list<const char*> keys,
                const std::string& reason) const {
        for (const char* key : keys)
            if (t.has(key))
                throw t.error(key, quoted(key) + " " + reason, "a setup without " + std::string(key));
    }

    void only(const StrictTable& t, const std::string& key, const std::string& supported) {
        const std::string given = text(t, key, supported);
        if (given != supported)
            throw t.error(key, key + " " + quoted(given) + " is not part of this version",
                          key + " = \"" + supported + "\"");
    }

    void read_assessment() {
        const StrictTable t =
            root_.table("assessment", {"title", "place", "assessor", "date", "limits", "note"});
        Setup& setup = result_.setup;
        setup.title = text_or_empty(t, "title");
        setup.place = text_or_empty(t, "place");
        setup.assessor = text_or_empty(t, "assessor");
        setup.note = text_or_empty(t, "note");
        if (t.has("date")) {
            const auto* date = t.node("date").as_date();
            if (!date)
                throw t.error(
                    "date",
                    "date must be a date without quotation marks, " + described(t.node("date")) + " is not",
                    "date = 2026-12-01");
            const auto two = [](unsigned n) { return (n < 10 ? "0" : "") + std::to_string(n); };
            const std::string year = std::to_string(date->get().year);
            setup.date = std::string(4 - year.size(), '0') + year + "-" + two(date->get().month) + "-" +
                         two(date->get().day);
        }
        note_place(t, "limits");
        setup.limits = t.texts("limits", "[\"icnirp_2013_laser\"]");
    }

    LaserSetup read_source(const StrictTable& t) {
        LaserSetup source;
        only(t, "kind", "laser");
        source.id = identifier(t, "green");
        refuse(t, {"lines"}, "(several wavelengths) is not part of this version");
        refuse(t,
               {"flux", "intensity", "luminous_flux", "peak", "width", "size", "viewing_angle", "temperature",
                "emissivity", "height", "file", "quantity", "at", "irradiance"},
               "does not belong to a laser");
        source.wavelength = stated<Length>(t, "wavelength", "532 nm");
        const StrictTable emission =
            t.table("emission", {"mode", "power"},
                    {"energy", "duration", "rate", "pulses_per_burst", "burst_rate", "file"});
        only(emission, "mode", "continuous");
        refuse(emission, {"energy", "duration", "rate", "pulses_per_burst", "burst_rate", "file"},
               "contradicts continuous emission, which is stated by its power alone");
        source.power = stated<RadiantPower>(emission, "power", "5 mW");
        note_place(t, "beam");
        source.beam = read_beam(
            t.table("beam", {"profile", "diameter", "measured_at", "divergence", "m2", "waist", "waist_at"},
                    {"diameter_x", "diameter_y", "core", "na", "mode"}));
        source.apparent_source = maybe_stated<Length>(t, "apparent_source", "3 mm");
        return source;
    }

    BeamSetup read_beam(const StrictTable& t) {
        BeamSetup beam;
        beam.profile = choice(t, "profile", profile_names);
        refuse(t, {"diameter_x", "diameter_y", "core", "na", "mode"}, "does not belong to a circular beam");
        if (!t.has("measured_at"))
            throw t.error(
                "",
                "the widths of the beam are given without measured_at, the definition they are measured by",
                "measured_at = \"1/e2\", \"1/e\", \"FWHM\", \"D4sigma\", \"63%\" or \"86.5%\"");
        beam.measured_at = choice(t, "measured_at", width_names);
        beam.diameter = maybe_stated<Length>(t, "diameter", "2 mm");
        beam.divergence = maybe_stated<PlaneAngle>(t, "divergence", "1.2 mrad");
        note_place(t, "m2");
        beam.m2 = t.maybe_number("m2");
        beam.waist = maybe_stated<Length>(t, "waist", "0.1 mm");
        beam.waist_at = maybe_stated<Length>(t, "waist_at", "0.3 m");
        return beam;
    }

    PositionSetup read_position(const StrictTable& t) {
        PositionSetup position;
        position.id = identifier(t, "operator");
        position.at = stated<Length>(t, "at", "0.5 m");
        position.exposure = stated<Duration>(t, "exposure", "0.25 s");
        refuse(t, {"angle", "eyewear"}, "is not part of this version");
        if (t.has("viewing") && t.node("viewing").is_table())
            throw t.error("viewing", "viewing aids are not part of this version", "viewing = \"unaided\"");
        if (t.has("viewing")) only(t, "viewing", "unaided");
        note_place(t, "tissues");
        if (t.has("tissues")) {
            position.eye = position.skin = false;
            for (const std::string& tissue : t.texts("tissues", "[\"eye\", \"skin\"]")) {
                bool& wanted = tissue == "eye" ? position.eye : position.skin;
                if (tissue != "eye" && tissue != "skin")
                    throw t.error("tissues", "unknown tissue " + quoted(tissue), "\"eye\", \"skin\"");
                if (wanted)
                    throw t.error("tissues", "the tissue " + quoted(tissue) + " is named twice",
                                  "\"eye\", \"skin\"");
                wanted = true;
            }
        }
        return position;
    }

    toml::table document_;
    StrictTable root_;
    SetupDocument result_;
};

}  // namespace

TextPosition SetupDocument::place_of(const std::string& key, const std::string& file_name) const {
    for (std::string k = key; !k.empty();) {
        if (const auto found = places.find(k); found != places.end()) return found->second;
        const auto cut = k.find_last_of(".[");
        k = cut == std::string::npos ? "" : k.substr(0, cut);
    }
    return {file_name, 1, 1};
}

SetupDocument read_setup(std::string_view toml, const std::string& file_name, const LimitLibrary& library) {
    SetupDocument document = SetupReader(toml, file_name).read(library);
    document.sha256 = sha256_hex(toml);
    return document;
}

}  // namespace dosimetry
