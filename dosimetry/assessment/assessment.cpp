#include "assessment/assessment.h"

#include <algorithm>
#include <array>
#include <cmath>

#include "assessment/cautions.h"
#include "assessment/exposure.h"
#include "assessment/search.h"
#include "assessment/trails.h"
#include "limits/limit_library.h"

namespace dosimetry {
namespace {

constexpr std::array both_tissues{Tissue::eye, Tissue::skin};

/// Everything one run needs; the setup is checked.
struct Context {
    const Setup& setup;
    std::vector<const LimitSet*> sets;
    const LaserSetup& stated;
    Laser laser;
    bool record;
};

void find_uncovered(const Context& c, std::vector<Uncovered>& uncovered) {
    for (const LimitSet* set : c.sets)
        for (std::size_t i = 0; i < c.setup.positions.size(); ++i) {
            const PositionSetup& p = c.setup.positions[i];
            const auto answer =
                set->limits_for({Tissue::eye, c.laser.wavelength, p.exposure.value, radians(0), Area{}});
            const auto* outside = std::get_if<NotCovered>(&answer);
            if (!outside) continue;
            const bool wavelength = outside->what == "wavelength";
            Uncovered entry{
                wavelength ? "source[0].wavelength" : "position[" + std::to_string(i) + "].exposure",
                outside->reason};
            const bool known = std::any_of(uncovered.begin(), uncovered.end(), [&](const Uncovered& u) {
                return u.key == entry.key && u.reason == entry.reason;
            });
            if (!known) uncovered.push_back(std::move(entry));
        }
}

Criterion make_criterion(const Context& c, const LimitSet& set, const Arrival& arrival, Duration exposure,
                         const Evaluated& e) {
    const LimitRow& row = *e.limit.row;
    Criterion criterion;
    criterion.limit_set = set.edition().id;
    criterion.source = c.stated.id;
    criterion.wavelength = c.laser.wavelength;
    criterion.tissue = row.tissue;
    criterion.effect = row.effect;
    criterion.quantity = e.quantity;
    criterion.exposure = e.exposure;
    criterion.limit = e.compared_limit;
    criterion.ratio = e.ratio;
    criterion.rule = "single exposure";
    criterion.aperture = e.limit.aperture;
    criterion.subtense = e.limit.subtense;
    criterion.clause = row.clause;
    criterion.provenance = row.provenance;
    criterion.note = row.note;
    if (c.record) criterion.trail = trail_of_criterion(c.stated, arrival, c.laser, exposure, e, set);
    return criterion;
}

/// With one source the combined ratio of an effect is its largest criterion.
void combine(PositionAssessment& position) {
    for (const Criterion& criterion : position.criteria) {
        const auto same =
            std::find_if(position.combined.begin(), position.combined.end(), [&](const CombinedRatio& r) {
                return r.limit_set == criterion.limit_set && r.tissue == criterion.tissue &&
                       r.effect == criterion.effect;
            });
        if (same == position.combined.end())
            position.combined.push_back(
                {criterion.limit_set, criterion.tissue, criterion.effect, criterion.ratio});
        else
            same->ratio = std::max(same->ratio, criterion.ratio);
    }
    position.governing.ratio = -1.0;
    const std::string& first_set = position.criteria.front().limit_set;
    for (const CombinedRatio& r : position.combined)
        if (r.limit_set == first_set && r.ratio > position.governing.ratio) position.governing = r;
}

/// The density that brings the tissue below the limits of every set chosen.
std::optional<double> required_density(const PositionAssessment& position, Tissue tissue, double& largest) {
    largest = 0.0;
    for (const Criterion& criterion : position.criteria)
        if (criterion.tissue == tissue) largest = std::max(largest, criterion.ratio);
    if (largest == 0.0) return std::nullopt;
    return std::max(0.0, std::log10(largest));
}

void find_permitted_exposure(const Context& c, const PositionSetup& stated, const Arrival& arrival,
                             PositionAssessment& position) {
    const LimitSet& set = *c.sets.front();
    PermittedExposure shortest_of_all{seconds(set.edition().s_to), true};
    for (Tissue tissue : both_tissues) {
        if (!stated.has(tissue)) continue;
        const PermittedExposure p = longest_permitted(
            set.duration_edges(tissue, c.laser.wavelength, arrival.subtense()), [&](Duration t) {
                return largest_ratio(std::get<std::vector<Evaluated>>(evaluate(arrival, t, tissue, set)));
            });
        if (!shortest_of_all.duration) break;
        if (!p.duration || *p.duration < *shortest_of_all.duration) shortest_of_all = p;
    }
    position.permitted_exposure = shortest_of_all.duration;
    position.permitted_for_whole_range = shortest_of_all.whole_range;
    if (!c.record) return;
    std::vector<Evaluated> there;
    if (shortest_of_all.duration)
        for (Tissue tissue : both_tissues)
            if (stated.has(tissue)) {
                const auto more = std::get<std::vector<Evaluated>>(
                    evaluate(arrival, *shortest_of_all.duration, tissue, set));
                there.insert(there.end(), more.begin(), more.end());
            }
    position.permitted_exposure_trail = trail_of_permitted_exposure(shortest_of_all, there, set);
}

PositionAssessment assess_position(const Context& c, const PositionSetup& stated) {
    const Arrival arrival(c.laser, stated.at.value);
    const Duration exposure = stated.exposure.value;
    PositionAssessment position;
    position.id = stated.id;
    position.at = stated.at;
    position.exposure = stated.exposure;
    position.eye = stated.eye;
    position.skin = stated.skin;
    position.beam_diameter = arrival.beam_diameter();
    position.peak_irradiance = arrival.peak_irradiance();
    position.photons_per_area = photon_exposure(position.peak_irradiance * exposure, c.laser.wavelength);
    for (const LimitSet* set : c.sets)
        for (Tissue tissue : both_tissues) {
            if (!stated.has(tissue)) continue;
            const auto answer = evaluate(arrival, exposure, tissue, *set);
            for (const Evaluated& e : std::get<std::vector<Evaluated>>(answer))
                position.criteria.push_back(make_criterion(c, *set, arrival, exposure, e));
        }
    combine(position);
    find_permitted_exposure(c, stated, arrival, position);
    position.permitted_power_factor = 1.0 / position.governing.ratio;
    position.permitted_power = c.laser.power * position.permitted_power_factor;
    double largest_eye = 0.0;
    double largest_skin = 0.0;
    position.required_density_eye = required_density(position, Tissue::eye, largest_eye);
    position.required_density_skin = required_density(position, Tissue::skin, largest_skin);
    if (c.record) {
        position.photons_trail = trail_of_photons_per_area(c.stated, arrival, c.laser, exposure);
        position.permitted_power_trail = trail_of_permitted_power(c.laser, position.governing.ratio);
        if (position.required_density_eye)
            position.density_trail_eye = trail_of_density(Tissue::eye, largest_eye);
        if (position.required_density_skin)
            position.density_trail_skin = trail_of_density(Tissue::skin, largest_skin);
    }
    return position;
}

/// Whoever leaves a tissue out should know that it is in danger.
void add_unassessed_cautions(const Context& c, std::vector<std::string>& cautions) {
    for (const PositionSetup& p : c.setup.positions)
        for (Tissue tissue : both_tissues) {
            if (p.has(tissue)) continue;
            const Arrival arrival(c.laser, p.at.value);
            const double ratio = largest_ratio(std::get<std::vector<Evaluated>>(
                evaluate(arrival, p.exposure.value, tissue, *c.sets.front())));
            if (ratio > 1.0) cautions.insert(cautions.begin(), unassessed_caution(p, tissue, ratio));
        }
}

void find_hazard_distances(const Context& c, std::vector<HazardDistance>& distances) {
    std::vector<Stated<Duration>> exposures;
    for (const PositionSetup& p : c.setup.positions)
        if (std::none_of(exposures.begin(), exposures.end(),
                         [&](const Stated<Duration>& e) { return e.value == p.exposure.value; }))
            exposures.push_back(p.exposure);
    for (const LimitSet* set : c.sets)
        for (const Stated<Duration>& exposure : exposures)
            for (Tissue tissue : both_tissues) {
                const OuterEdge edge = outer_edge(nearest_search, farthest_search,
                                                  bends_along_beam(c.laser, *set, tissue, exposure.value),
                                                  ratio_along_beam(c.laser, *set, tissue, exposure.value));
                HazardDistance distance{c.stated.id,   set->edition().id, exposure, tissue,
                                        edge.distance, std::nullopt,      {}};
                if (!edge.distance) distance.beyond_search = farthest_search;
                if (c.record)
                    distance.trail = trail_of_distance(c.stated, c.laser, *set, tissue, exposure.value, edge);
                distances.push_back(std::move(distance));
            }
}

}  // namespace

const Criterion* PositionAssessment::governing_criterion() const {
    for (const Criterion& c : criteria)
        if (c.limit_set == governing.limit_set && c.tissue == governing.tissue &&
            c.effect == governing.effect && c.ratio == governing.ratio)
            return &c;
    return nullptr;
}

bool PositionAssessment::within_limits() const {
    return std::all_of(combined.begin(), combined.end(),
                       [](const CombinedRatio& r) { return r.ratio <= 1.0; });
}

bool Assessment::within_limits() const {
    return covered() && std::all_of(positions.begin(), positions.end(),
                                    [](const PositionAssessment& p) { return p.within_limits(); });
}

Assessment assess(const Setup& setup, const LimitLibrary& library, Trails trails) {
    Assessment result;
    const LaserSetup& stated = setup.sources.front();
    Context context{setup, {}, stated, make_laser(stated), trails == Trails::record};
    for (const std::string& id : setup.limits) context.sets.push_back(library.find(id));
    result.limit_sets = context.sets;
    result.cautions = cautions_for(setup, context.sets);
    result.assumptions = assumptions_for(setup);

    SourceAssessment source{stated.id,
                            photon_energy(context.laser.wavelength),
                            photon_rate(context.laser.power, context.laser.wavelength),
                            {},
                            {}};
    if (context.record) {
        source.photon_energy_trail = trail_of_photon_energy(context.laser);
        source.photon_rate_trail = trail_of_photon_rate(context.laser);
    }
    result.sources.push_back(std::move(source));

    find_uncovered(context, result.uncovered);
    if (!result.uncovered.empty()) return result;
    for (const PositionSetup& position : setup.positions)
        result.positions.push_back(assess_position(context, position));
    add_unassessed_cautions(context, result.cautions);
    find_hazard_distances(context, result.hazard_distances);
    return result;
}

}  // namespace dosimetry
