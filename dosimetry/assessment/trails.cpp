#include "assessment/trails.h"

#include <algorithm>
#include <cmath>

#include "beams/names.h"
#include "quantities/format.h"
#include "radiation/constants.h"

namespace dosimetry {
namespace {

const std::string input = "input";
const std::string definition = "definition";

std::string number(double value) {
    return exact_number(value);
}

/// A number as part of the "with numbers" column, and a quantity as its SI number without unit.
std::string term(double value) {
    return exact_term(value);
}
template <class Q>
std::string si(Q quantity) {
    return term(quantity.in_si());
}

std::string with_unit(double value, const std::string& unit) {
    return number(value) + (unit.empty() ? "" : " " + unit);
}

std::string definition_name(WidthDefinition definition_) {
    return std::string(name_of_choice(width_names, definition_).shown);
}

std::string reference_name(Profile profile) {
    return std::string(reference_diameter_name(profile));
}

void add_beam_steps(Trail& trail, const LaserSetup& stated, const Laser& laser, Length at) {
    const BeamSetup& b = stated.beam;
    const CircularBeam& beam = laser.beam;
    const double k = reference_over_measured(b.profile, b.measured_at);
    const std::string definition_source = "common practice; profile definition, docs/methods";
    const std::string iso = "ISO 11146-1:2021, clause 5 (clause from memory)";
    const Stated<Length>& width = b.waist ? *b.waist : *b.diameter;
    trail.steps.push_back({"d_w", reference_name(b.profile) + " of the waist",
                           "k · " + definition_name(b.measured_at) + " diameter",
                           term(k) + " · " + si(width.value), exact(beam.waist()), definition_source});
    if (b.divergence) {
        trail.steps.push_back(
            {"θ", "full-angle divergence for that diameter", "k · θ(" + definition_name(b.measured_at) + ")",
             term(k) + " · " + si(b.divergence->value), exact(beam.divergence()), definition_source});
    } else if (b.m2) {
        trail.steps.push_back(
            {"θ", "full-angle divergence", "4 M² λ / (π d_w)",
             "4 · " + term(*b.m2) + " · " + si(laser.wavelength) + " / (π · " + si(beam.waist()) + ")",
             exact(beam.divergence()), "ISO 11146-1:2021, clause 3 (clause from memory)"});
    } else {
        const Length d = b.diameter->value * k;
        trail.steps.push_back(
            {"θ", "full-angle divergence from the diameter at the exit", "√(d_exit² − d_w²) / |z_w|",
             "√(" + si(d) + "² − " + si(beam.waist()) + "²) / |" + si(beam.waist_at()) + "|",
             exact(beam.divergence()), iso});
    }
    trail.steps.push_back({"d", reference_name(b.profile) + " at the position", "√(d_w² + θ² (z − z_w)²)",
                           "√(" + si(beam.waist()) + "² + " + si(beam.divergence()) + "² · (" + si(at) +
                               " − " + si(beam.waist_at()) + ")²)",
                           exact(beam.diameter_at(at)), iso});
}

void add_limit_steps(Trail& trail, const Limit& limit, const LimitSet& set, const LimitQuery& query) {
    const LimitRow& row = *limit.row;
    const std::string& id = set.edition().id;
    for (const FactorStep& f : set.derivation(row, query))
        trail.steps.push_back({f.symbol, f.meaning, f.formula, f.with_numbers, with_unit(f.value, f.unit),
                               id + ", " + f.clause + " (" + f.provenance + ")"});
}

void add_limit_value(Trail& trail, const Limit& limit, const LimitSet& set, const LimitQuery& query) {
    const LimitRow& row = *limit.row;
    std::string formula = number(row.coefficient);
    std::string numbers = formula;
    if (row.t_power != 0.0) {
        formula += " · t^" + number(row.t_power);
        numbers += " · " + si(query.exposure) + "^" + number(row.t_power);
    }
    for (const FactorPower& f : row.factors) {
        const std::string& symbol = set.factors()[f.factor].symbol;
        std::string value;
        for (const TrailStep& step : trail.steps)
            if (step.symbol == symbol) value = step.result;
        const std::string power = f.power == 1.0 ? "" : "^" + number(f.power);
        formula += " · " + symbol + power;
        numbers += " · " + value + power;
    }
    const bool dose = row.quantity == LimitQuantity::radiant_exposure;
    const double value_si = std::visit([](auto q) { return q.in_si(); }, limit.value);
    trail.steps.push_back({dose ? "H_EL" : "E_EL", "exposure limit", formula, numbers,
                           with_unit(value_si, unit_of(row.quantity)),
                           set.edition().id + ", " + row.clause + " (" + row.provenance + ")" +
                               (row.note.empty() ? "" : "; " + row.note)});
}

std::string fraction_formula(Profile profile) {
    return profile == Profile::gaussian ? "1 − exp(−2 a²/d²)" : "min(1, a²/d²)";
}

std::string fraction_numbers(Profile profile, Length aperture, Length diameter) {
    const std::string ratio = si(aperture) + "²/" + si(diameter) + "²";
    return profile == Profile::gaussian ? "1 − exp(−2 · " + ratio + ")" : "min(1, " + ratio + ")";
}

void add_exposure_steps(Trail& trail, const Arrival& arrival, Duration exposure, const Evaluated& e) {
    const Length a = e.limit.aperture;
    const double share = arrival.fraction_through(a);
    const Irradiance averaged = arrival.averaged_over(a);
    trail.steps.push_back({"η", "share of the power inside the aperture", fraction_formula(arrival.profile()),
                           fraction_numbers(arrival.profile(), a, arrival.beam_diameter()), number(share),
                           "common practice; integral of the profile, docs/methods"});
    trail.steps.push_back({"E", "irradiance averaged over the aperture", "4 P η / (π a²)",
                           "4 · " + si(arrival.power()) + " · " + term(share) + " / (π · " + si(a) + "²)",
                           exact(averaged), definition});
    if (e.acceptance_share < 1.0)
        trail.steps.push_back(
            {"E_γ", "part of it inside the acceptance angle, uniform round source", "E · (γ/α)²",
             si(averaged) + " · (" + si(e.limit.acceptance) + "/" + si(arrival.subtense()) + ")²",
             exact(averaged * e.acceptance_share), definition});
    if (e.quantity == LimitQuantity::radiant_exposure) {
        const Irradiance counted = averaged * e.acceptance_share;
        trail.steps.push_back({"H", "radiant exposure", "E · t", si(counted) + " · " + si(exposure),
                               exact(std::get<RadiantExposure>(e.exposure)), definition});
    }
}

void add_subtense_step(Trail& trail, const Arrival& arrival, const Laser& laser) {
    if (arrival.small_source()) return;
    trail.steps.push_back(
        {"α", "angular subtense of the apparent source, seen from at least 100 mm", "2 atan(s / (2 r))",
         "2 atan(" + si(*laser.apparent_source) + " / (2 · " + si(arrival.viewing_distance()) + "))",
         exact(arrival.subtense()), "definition; 100 mm: BGI 832 and BGV B2"});
}

}  // namespace

Trail trail_of_criterion(const LaserSetup& stated, const Arrival& arrival, const Laser& laser,
                         Duration exposure, const Evaluated& e, const LimitSet& set) {
    Trail trail;
    const LimitRow& row = *e.limit.row;
    const LimitQuery query = query_for(arrival, exposure, row.tissue);
    trail.subject = name_of(row.tissue, row.effect) + ": exposure divided by limit";
    trail.steps.push_back({"λ", "wavelength", "", stated.wavelength.text, exact(laser.wavelength), input});
    trail.steps.push_back({"P", "power", "", stated.power.text, exact(laser.power), input});
    trail.steps.push_back({"z", "distance from the exit", "", "", exact(arrival.distance()), input});
    trail.steps.push_back({"t", "exposure", "", "", exact(exposure), input});
    add_beam_steps(trail, stated, laser, arrival.distance());
    add_subtense_step(trail, arrival, laser);
    if (row.depends_on_area)
        trail.steps.push_back({"A", "exposed area, disc of the " + reference_name(stated.beam.profile),
                               "π d²/4", "π · " + si(arrival.beam_diameter()) + "²/4",
                               exact(arrival.exposed_area()), definition});
    add_limit_steps(trail, e.limit, set, query);
    add_exposure_steps(trail, arrival, exposure, e);
    add_limit_value(trail, e.limit, set, query);
    const auto value = [](const LimitValue& v) {
        return std::visit([](auto q) { return term(q.in_si()); }, v);
    };
    const bool dose = e.quantity == LimitQuantity::radiant_exposure;
    if (row.quantity != e.quantity)
        trail.steps.push_back({"E_EL", "the same limit as a constant irradiance over the exposure",
                               "H_EL / t", value(e.limit.value) + " / " + si(exposure),
                               exact(std::get<Irradiance>(e.compared_limit)), definition});
    trail.steps.push_back({"R", "exposure divided by limit", dose ? "H / H_EL" : "E / E_EL",
                           value(e.exposure) + " / " + value(e.compared_limit), number(e.ratio), definition});
    return trail;
}

Trail trail_of_photon_energy(const Laser& laser) {
    const PhotonEnergy energy = photon_energy(laser.wavelength);
    Trail trail{"Energy of one photon", {}};
    trail.steps.push_back({"Q", "photon energy", "h c / λ",
                           term(constants::planck_J_s) + " · " + term(constants::speed_of_light_m_per_s) +
                               " / " + si(laser.wavelength),
                           exact(energy), "Planck relation; h and c exact, SI Brochure 9th edition, 2.2"});
    trail.steps.push_back(
        {"Q", "the same in electronvolts", "Q / e", si(energy) + " / " + term(constants::electronvolt_J),
         number(in_electronvolts(energy)) + " eV", "e exact, SI Brochure 9th edition, 2.2"});
    return trail;
}

Trail trail_of_photon_rate(const Laser& laser) {
    Trail trail = trail_of_photon_energy(laser);
    trail.subject = "Photons per second in the beam";
    trail.steps.pop_back();
    trail.steps.push_back({"N/t", "photons per second", "P / Q",
                           si(laser.power) + " / " + si(photon_energy(laser.wavelength)),
                           exact(photon_rate(laser.power, laser.wavelength)), definition});
    return trail;
}

Trail trail_of_photons_per_area(const LaserSetup& stated, const Arrival& arrival, const Laser& laser,
                                Duration exposure) {
    Trail trail{"Photons per area at the centre of the beam", {}};
    add_beam_steps(trail, stated, laser, arrival.distance());
    const bool gaussian = arrival.profile() == Profile::gaussian;
    const Irradiance peak = arrival.peak_irradiance();
    trail.steps.push_back(
        {"E₀", "irradiance on the axis", gaussian ? "8 P / (π d²)" : "4 P / (π d²)",
         (gaussian ? "8 · " : "4 · ") + si(laser.power) + " / (π · " + si(arrival.beam_diameter()) + "²)",
         exact(peak), "common practice; integral of the profile, docs/methods"});
    trail.steps.push_back({"H₀", "radiant exposure on the axis", "E₀ · t", si(peak) + " · " + si(exposure),
                           exact(peak * exposure), definition});
    trail.steps.push_back({"Q", "photon energy", "h c / λ", "", exact(photon_energy(laser.wavelength)),
                           "Planck relation; SI Brochure 9th edition, 2.2"});
    trail.steps.push_back({"N/A", "photons per area", "H₀ / Q",
                           si(peak * exposure) + " / " + si(photon_energy(laser.wavelength)),
                           exact(photon_exposure(peak * exposure, laser.wavelength)), definition});
    return trail;
}

Trail trail_of_permitted_exposure(const PermittedExposure& permitted,
                                  const std::vector<Evaluated>& at_permitted, const LimitSet& set) {
    Trail trail{"Longest permitted exposure", {}};
    const Edition& edition = set.edition();
    const std::string source = "search over all limits that apply; " + edition.id;
    if (!permitted.duration) {
        trail.steps.push_back({"t_max", "longest permitted exposure", "longest t with all R(t') ≤ 1, t' ≤ t",
                               "", "none: above a limit from " + number(edition.s_from) + " s on", source});
        return trail;
    }
    for (const Evaluated& e : at_permitted)
        trail.steps.push_back({"R", name_of(e.limit.row->tissue, e.limit.row->effect) + ", at t_max",
                               "exposure / limit",
                               std::visit([](auto q) { return term(q.in_si()); }, e.exposure) + " / " +
                                   std::visit([](auto q) { return term(q.in_si()); }, e.compared_limit),
                               number(e.ratio), edition.id + ", " + e.limit.row->clause});
    trail.steps.push_back(
        {"t_max", "longest permitted exposure", "longest t with all R(t') ≤ 1, t' ≤ t", "",
         exact(*permitted.duration) + (permitted.whole_range ? " (end of the published range)" : ""),
         source});
    return trail;
}

Trail trail_of_permitted_power(const Laser& laser, double ratio) {
    Trail trail{"Highest permitted power", {}};
    trail.steps.push_back({"P_max", "power at which the governing ratio is 1", "P / R",
                           si(laser.power) + " / " + term(ratio), exact(laser.power / ratio),
                           "exposures are proportional to the power"});
    return trail;
}

Trail trail_of_density(Tissue tissue, double ratio) {
    Trail trail{"Required optical density, " + name_of(tissue), {}};
    trail.steps.push_back({"D", "optical density that brings the exposure to the limit", "max(0, log₁₀ R)",
                           "max(0, log₁₀ " + term(ratio) + ")", number(std::max(0.0, std::log10(ratio))),
                           "definition of optical density"});
    return trail;
}

Trail trail_of_distance(const LaserSetup& stated, const Laser& laser, const LimitSet& set, Tissue tissue,
                        Duration exposure, const OuterEdge& edge) {
    Trail trail{"Hazard distance, " + name_of(tissue), {}};
    const std::string source = "search on the exact aperture-averaged exposure, docs/methods";
    if (!edge.distance) {
        trail.steps.push_back({"NOHD", "hazard distance", "farthest z with R(z) = 1", "",
                               "beyond " + exact(farthest_search) + ", where R is still above 1", source});
        return trail;
    }
    if (*edge.distance <= metres(0)) {
        trail.steps.push_back({"NOHD", "hazard distance", "farthest z with R(z) = 1", "",
                               "none: R ≤ 1 from " + exact(nearest_search) + " on", source});
        return trail;
    }
    const Arrival arrival(laser, *edge.distance);
    const auto answer = evaluate(arrival, exposure, tissue, set);
    const auto& evaluated = std::get<std::vector<Evaluated>>(answer);
    const auto governing =
        std::max_element(evaluated.begin(), evaluated.end(),
                         [](const Evaluated& a, const Evaluated& b) { return a.ratio < b.ratio; });
    trail = trail_of_criterion(stated, arrival, laser, exposure, *governing, set);
    trail.subject =
        "Hazard distance, " + name_of(tissue) + ": check that the exposure there equals the limit";
    trail.steps.push_back(
        {"NOHD", "hazard distance", "farthest z with R(z) = 1", "", exact(*edge.distance), source});
    return trail;
}

}  // namespace dosimetry
