#include <algorithm>
#include <cmath>

#include "beams/names.h"
#include "documents/result.h"
#include "quantities/format.h"

namespace dosimetry {
namespace {

/// Number of characters shown, for columns: continuation bytes of UTF-8 take no room.
std::size_t width(const std::string& text) {
    return static_cast<std::size_t>(std::count_if(
        text.begin(), text.end(), [](char c) { return (static_cast<unsigned char>(c) & 0xC0U) != 0x80U; }));
}

std::string padded(std::string text, std::size_t columns) {
    const std::size_t w = width(text);
    if (w < columns) text.append(columns - w, ' ');
    return text;
}

std::string wrapped(const std::string& text, const std::string& first, const std::string& rest,
                    std::size_t columns) {
    std::string result = first;
    std::size_t used = width(first);
    std::size_t begin = 0;
    bool line_start = true;
    while (begin < text.size()) {
        std::size_t end = text.find(' ', begin);
        if (end == std::string::npos) end = text.size();
        const std::string word = text.substr(begin, end - begin);
        if (!line_start && used + 1 + width(word) > columns) {
            result += "\n" + rest;
            used = width(rest);
            line_start = true;
        }
        if (!line_start) {
            result += ' ';
            ++used;
        }
        result += word;
        used += width(word);
        line_start = false;
        begin = end + 1;
    }
    return result + "\n";
}

void head(std::string& out, const std::string& title) {
    out += "\n" + title + "\n";
}

void row(std::string& out, const std::string& label, const std::string& value) {
    if (!value.empty()) out += "  " + padded(label, 28) + value + "\n";
}

void source_part(std::string& out, const LaserSetup& source, const SourceAssessment& result) {
    const BeamSetup& beam = source.beam;
    const std::string at = " (" + std::string(name_of_choice(width_names, beam.measured_at).shown) + ")";
    head(out, "Source \"" + source.id + "\": continuous laser");
    row(out, "wavelength", source.wavelength.text);
    row(out, "power", source.power.text);
    row(out, "profile", std::string(name_of_choice(profile_names, beam.profile).shown));
    if (beam.diameter) row(out, "diameter at the exit", beam.diameter->text + at);
    if (beam.divergence) row(out, "divergence, full angle", beam.divergence->text + at);
    if (beam.m2) row(out, "beam propagation ratio M²", shortest(*beam.m2));
    if (beam.waist) row(out, "waist diameter", beam.waist->text + at + " at " + beam.waist_at->text);
    if (source.apparent_source) row(out, "apparent source", source.apparent_source->text);
    row(out, "photon energy",
        format_number(in_electronvolts(result.photon_energy), 4, Rounding::nearest) + " eV");
    row(out, "photons per second", format(result.photon_rate, 4, Rounding::up));
}

void position_part(std::string& out, const PositionAssessment& p) {
    head(out, "Position \"" + p.id + "\": " + p.at.text + " from the exit, exposure " + p.exposure.text);
    out += wrapped(verdict(p), "  ", "  ", 100);
    out += "  " + padded("tissue, effect", 34) + padded("exposure", 20) + padded("limit", 20) +
           padded("ratio", 12) + "clause\n";
    for (const Criterion& c : p.criteria) {
        const bool governs = &c == p.governing_criterion();
        out += (governs ? "> " : "  ") + padded(name_of(c.tissue, c.effect), 34) +
               padded(exposure_text(c), 20) + padded(limit_text(c), 20) +
               padded(format_number(c.ratio, 4, Rounding::up), 12) + c.limit_set + ", " + c.clause + "\n";
    }
    row(out, "irradiance on the axis", format(p.peak_irradiance, 4, Rounding::up));
    row(out, "photons per area", format(p.photons_per_area, 4, Rounding::up) + " on the axis");
    row(out, "longest permitted exposure", permitted_exposure_text(p) + tissue_remark(p));
    row(out, "highest permitted power", format(p.permitted_power, 4, Rounding::down) + tissue_remark(p));
    if (p.required_density_eye) row(out, "optical density, eye", density_text(*p.required_density_eye));
    if (p.required_density_skin) row(out, "optical density, skin", density_text(*p.required_density_skin));
}

}  // namespace

std::string exposure_text(const Criterion& c) {
    return std::visit([](auto q) { return format(q, 4, Rounding::up); }, c.exposure);
}

std::string limit_text(const Criterion& c) {
    return std::visit([](auto q) { return format(q, 4, Rounding::down); }, c.limit);
}

std::string density_text(double density) {
    const long hundredths = std::lround(std::ceil(density * 100.0 * (1.0 - 1e-12)));
    if (hundredths == 0) return "0";
    const std::string decimals = std::to_string(hundredths % 100);
    return std::to_string(hundredths / 100) + "." + (decimals.size() < 2 ? "0" : "") + decimals;
}

std::string tissue_remark(const PositionAssessment& p) {
    return p.eye && p.skin ? "" : p.eye ? " (eye only)" : " (skin only)";
}

std::string verdict(const PositionAssessment& p) {
    const bool above = p.governing.ratio > 1.0;
    std::string text = above ? "ABOVE THE LIMIT. " : "Within the limits. ";
    text += "At " + p.at.text + " the " + name_of(p.governing.tissue) + " would receive ";
    text += above ? format_number(p.governing.ratio, 4, Rounding::up) + " times the limit"
                  : "at most " + format_number(p.governing.ratio, 3, Rounding::up) + " of the limit";
    text += " (" + name_of(p.governing.effect) + ").";
    if (!p.eye) text += " The eye is NOT assessed.";
    if (!p.skin) text += " The skin is NOT assessed.";
    return text;
}

std::string distance_text(const HazardDistance& d) {
    if (!d.distance)
        return "beyond " + format(*d.beyond_search, 4, Rounding::nearest) + ", where the search ends";
    if (*d.distance <= metres(0)) return "none, the limit is not exceeded";
    return format(*d.distance, 4, Rounding::up);
}

std::string permitted_exposure_text(const PositionAssessment& p) {
    if (!p.permitted_exposure) return "none within the published range of durations";
    const std::string duration = format(*p.permitted_exposure, 4, Rounding::down);
    return p.permitted_for_whole_range ? duration + ", the end of the published range" : duration;
}

std::string report(const Setup& setup, const Assessment& assessment) {
    std::string out = setup.title.empty() ? "Assessment\n" : setup.title + "\n";
    row(out, "place", setup.place);
    row(out, "assessor", setup.assessor);
    row(out, "date", setup.date);
    row(out, "calculated by", program_name());
    for (const LimitSet* set : assessment.limit_sets)
        row(out, "limits",
            set->edition().id + ", table SHA-256 " + set->edition().sha256.substr(0, 16) + "…");
    if (!setup.note.empty()) out += wrapped(setup.note, "  ", "  ", 100);
    for (std::size_t i = 0; i < assessment.sources.size(); ++i)
        source_part(out, setup.sources[i], assessment.sources[i]);
    for (const PositionAssessment& position : assessment.positions) position_part(out, position);
    head(out, "Hazard distances along the direct beam, unaided");
    for (const HazardDistance& d : assessment.hazard_distances)
        row(out, name_of(d.tissue) + ", " + d.exposure.text, distance_text(d) + "  (" + d.limit_set + ")");
    head(out, "Assumptions");
    for (const std::string& text : assessment.assumptions) out += wrapped(text, "  - ", "    ", 100);
    head(out, "Cautions");
    for (const std::string& text : assessment.cautions) out += wrapped(text, "  ! ", "    ", 100);
    return out;
}

}  // namespace dosimetry
