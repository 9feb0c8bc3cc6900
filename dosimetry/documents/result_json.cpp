#include <nlohmann/json.hpp>

#include "documents/result.h"

namespace dosimetry {
namespace {

using Json = nlohmann::ordered_json;

Json or_null(const std::optional<double>& value) {
    return value ? Json(*value) : Json(nullptr);
}

template <class Q>
Json or_null(const std::optional<Q>& value) {
    return value ? Json(value->in_si()) : Json(nullptr);
}

Json si(const LimitValue& value) {
    return std::visit([](auto quantity) { return Json(quantity.in_si()); }, value);
}

/// Units in JSON are plain ASCII ("W/m2").
const char* ascii_unit(LimitQuantity quantity) {
    switch (quantity) {
        case LimitQuantity::irradiance:
            return "W/m2";
        case LimitQuantity::radiant_exposure:
            return "J/m2";
        case LimitQuantity::radiance:
            return "W/(m2 sr)";
        case LimitQuantity::radiance_dose:
            break;
    }
    return "J/(m2 sr)";
}

Json criterion_json(const Criterion& c) {
    return {{"limit_set", c.limit_set},
            {"source", c.source},
            {"wavelength_nm", in_nanometres(c.wavelength)},
            {"tissue", name_of(c.tissue)},
            {"effect", name_of(c.effect)},
            {"quantity", name_of(c.quantity)},
            {"unit", ascii_unit(c.quantity)},
            {"exposure", si(c.exposure)},
            {"limit", si(c.limit)},
            {"ratio", c.ratio},
            {"margin", c.margin()},
            {"rule", c.rule},
            {"aperture_m", c.aperture.in_si()},
            {"alpha_rad", c.subtense > radians(0) ? Json(c.subtense.in_si()) : Json(nullptr)},
            {"clause", c.clause},
            {"provenance", c.provenance}};
}

Json combined_json(const CombinedRatio& r) {
    return {{"limit_set", r.limit_set},
            {"tissue", name_of(r.tissue)},
            {"effect", name_of(r.effect)},
            {"ratio", r.ratio}};
}

Json position_json(const PositionAssessment& p) {
    Json criteria = Json::array();
    for (const Criterion& c : p.criteria) criteria.push_back(criterion_json(c));
    Json combined = Json::array();
    for (const CombinedRatio& r : p.combined) combined.push_back(combined_json(r));
    return {{"id", p.id},
            {"exposure_s", p.exposure.value.in_si()},
            {"criteria", std::move(criteria)},
            {"combined", std::move(combined)},
            {"governing", combined_json(p.governing)},
            {"permitted_exposure_s", or_null(p.permitted_exposure)},
            {"permitted_power_factor", p.permitted_power_factor},
            {"required_optical_density",
             {{"eye", or_null(p.required_density_eye)}, {"skin", or_null(p.required_density_skin)}}}};
}

}  // namespace

std::string program_name() {
    return "photon-margin " PHOTON_MARGIN_VERSION;
}

std::string result_json(const Setup& setup, const Assessment& assessment, const std::string& input_sha256) {
    Json json = {
        {"format", 1}, {"program", program_name()}, {"title", setup.title}, {"input_sha256", input_sha256}};
    json["limit_sets"] = Json::array();
    for (const LimitSet* set : assessment.limit_sets)
        json["limit_sets"].push_back(
            {{"id", set->edition().id}, {"title", set->edition().title}, {"sha256", set->edition().sha256}});
    json["sources"] = Json::array();
    for (const SourceAssessment& source : assessment.sources)
        json["sources"].push_back({{"id", source.id},
                                   {"photon_energy_eV", in_electronvolts(source.photon_energy)},
                                   {"photon_rate_per_s", source.photon_rate.in_si()},
                                   {"class", nullptr},
                                   {"risk_group", nullptr}});
    json["positions"] = Json::array();
    for (const PositionAssessment& position : assessment.positions)
        json["positions"].push_back(position_json(position));
    json["hazard_distances"] = Json::array();
    for (const HazardDistance& d : assessment.hazard_distances)
        json["hazard_distances"].push_back({{"source", d.source},
                                            {"limit_set", d.limit_set},
                                            {"exposure_s", d.exposure.value.in_si()},
                                            {"tissue", name_of(d.tissue)},
                                            {"viewing", "unaided"},
                                            {"kind", "direct"},
                                            {"distance_m", or_null(d.distance)},
                                            {"beyond_search_m", or_null(d.beyond_search)}});
    json["cautions"] = assessment.cautions;
    return json.dump(2) + "\n";
}

}  // namespace dosimetry
