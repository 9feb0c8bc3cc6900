#include "route_view/route_model.h"

#include <algorithm>
#include <cmath>
#include <tuple>

#include "assessment/course.h"
#include "documents/result.h"
#include "limits/limit_library.h"
#include "quantities/format.h"

using namespace dosimetry;

namespace {

constexpr int samples = 361;

double reachOf(const HazardDistance& d) {
    return d.distance ? d.distance->in_si() : farthest_search.in_si();
}

/// The hazard distance that a tissue's zone is drawn for; null where nothing is covered.
const HazardDistance* hazardDistance(const Setup& setup, const Assessment& assessment, Tissue tissue,
                                     std::optional<int> position) {
    const HazardDistance* chosen = nullptr;
    for (const HazardDistance& d : assessment.hazard_distances) {
        if (d.tissue != tissue || d.limit_set != setup.limits.front()) continue;
        if (position &&
            d.exposure.value != setup.positions[static_cast<std::size_t>(*position)].exposure.value)
            continue;
        if (!chosen || reachOf(d) > reachOf(*chosen)) chosen = &d;
    }
    return chosen;
}

Length decadeBelow(Length l) {
    return metres(std::pow(10.0, std::floor(std::log10(l.in_si()) + 1e-9)));
}
Length decadeAbove(Length l) {
    return metres(std::pow(10.0, std::ceil(std::log10(l.in_si()) - 1e-9)));
}

std::string labelStart(const HazardDistance& edge) {
    return name_of(edge.tissue) + ", " + edge.exposure.text + ": ";
}

void addZones(RouteModel& model, const TissueCourse& course, const HazardDistance& edge) {
    const auto& z = model.distances;
    for (std::size_t i = 0; i < z.size();) {
        if (course.ratio[i] <= 1.0) {
            ++i;
            continue;
        }
        std::size_t end = i;
        while (end < z.size() && course.ratio[end] > 1.0) ++end;
        RouteZone zone;
        zone.tissue = course.tissue;
        zone.from = z[i == 0 ? 0 : i - 1];  // the true start lies between the samples
        zone.startsBeforeAxis = i == 0;
        zone.endsBehindAxis = end == z.size();
        zone.to = z[std::min(end, z.size() - 1)];
        // The last zone ends at the exact hazard distance, not at a sample.
        if (edge.distance && end < z.size() && *edge.distance <= z[end] && *edge.distance >= z[end - 1])
            zone.to = *edge.distance;
        zone.label = labelStart(edge) + "above the limit ";
        if (!zone.startsBeforeAxis) zone.label += "from " + format(zone.from, 3, Rounding::down) + " ";
        zone.label += zone.endsBehindAxis ? "beyond " + format_round(model.to)
                                          : "up to " + format(zone.to, 4, Rounding::up);
        model.zones.push_back(zone);
        i = end;
    }
}

/// What stands where a tissue has no zone on the axis. Whether a limit is exceeded anywhere is the hazard
/// distance's to say, not the samples'.
void addRemark(RouteModel& model, Tissue tissue, const HazardDistance* edge) {
    for (const RouteZone& zone : model.zones)
        if (zone.tissue == tissue) return;
    std::string text;
    if (!edge)
        text = name_of(tissue) + ": not covered";
    else if (edge->distance && *edge->distance <= metres(0))
        text = labelStart(*edge) + "within the limits along the whole beam";
    else
        text = labelStart(*edge) + "above the limit up to " + distance_text(*edge) + ", not drawn here";
    model.remarks.push_back({tissue, text});
}

RouteModel::Axis usualAxis(const Setup& setup, const std::vector<const HazardDistance*>& edges) {
    Length nearest = setup.positions.front().at.value;
    Length farthest = nearest;
    const auto hold = [&](Length l) {
        nearest = std::min(nearest, l);
        farthest = std::max(farthest, l);
    };
    for (const PositionSetup& p : setup.positions) hold(p.at.value);
    for (const HazardDistance* edge : edges) {
        if (!edge) continue;
        if (!edge->distance)
            hold(farthest_search);
        else if (*edge->distance > metres(0))
            hold(*edge->distance);
    }
    // some room beside the outermost marks, but not beyond what is searched
    const Length to = std::max(farthest, std::min(farthest * 1.3, farthest_search));
    return {decadeBelow(std::min(nearest * 0.5, millimetres(100))), decadeAbove(std::max(to, metres(1)))};
}

}  // namespace

RouteModel RouteModel::of(const Setup& setup, const Assessment& assessment,
                          std::optional<int> currentPosition, const std::optional<Axis>& axis) {
    RouteModel model;
    const HazardDistance* eye = hazardDistance(setup, assessment, Tissue::eye, currentPosition);
    const HazardDistance* skin = hazardDistance(setup, assessment, Tissue::skin, currentPosition);
    std::tie(model.from, model.to) = axis ? *axis : usualAxis(setup, {eye, skin});
    model.sourceId = setup.sources.front().id;

    const CircularBeam beam = make_laser(setup.sources.front()).beam;
    std::vector<Length> distances = logarithmic_distances(model.from, model.to, samples);
    if (beam.waist_at() > model.from &&
        beam.waist_at() < model.to)  // the narrowest place, easily between two samples
        distances.insert(std::upper_bound(distances.begin(), distances.end(), beam.waist_at()),
                         beam.waist_at());
    model.distances = distances;
    for (Length z : distances) model.diameters.push_back(beam.diameter_at(z));
    for (const HazardDistance* edge : {eye, skin}) {
        if (!edge) continue;
        const Course course =
            course_along_beam(setup, LimitLibrary::embedded(), edge->exposure.value, distances);
        for (const TissueCourse& line : course.tissues)
            if (line.tissue == edge->tissue) addZones(model, line, *edge);
    }
    addRemark(model, Tissue::eye, eye);
    addRemark(model, Tissue::skin, skin);

    for (std::size_t i = 0; i < setup.positions.size(); ++i) {
        const PositionSetup& p = setup.positions[i];
        RoutePerson person{p.id, p.at, currentPosition == static_cast<int>(i), false, 0.0};
        if (assessment.covered()) {
            person.assessed = true;
            for (const CombinedRatio& r : assessment.positions[i].combined)
                person.ratio = std::max(person.ratio, r.ratio);
        }
        model.people.push_back(person);
    }
    return model;
}

double RouteModel::fractionOf(Length distance) const {
    return std::log(distance / from) / std::log(to / from);
}

Length RouteModel::distanceAt(double fraction) const {
    return from * std::pow(to / from, fraction);
}

Stated<Length> roundedDistance(Length distance) {
    const bool small = distance < millimetres(10);
    DecimalNumber number = round_decimal(distance.in_si() * (small ? 1e3 : 1.0), 3, Rounding::nearest);
    while (number.digits.size() > 1 && number.digits.back() == '0') number.digits.pop_back();
    return Stated<Length>(plain_digits(number) + (small ? " mm" : " m"));
}

std::string decadeLabel(int exponent) {
    static constexpr const char* labels[] = {"1 µm", "10 µm", "100 µm", "1 mm",  "1 cm",   "10 cm",  "1 m",
                                             "10 m", "100 m", "1 km",   "10 km", "100 km", "1000 km"};
    const int index = exponent + 6;
    return index >= 0 && index < static_cast<int>(std::size(labels))
               ? labels[index]
               : "10^" + std::to_string(exponent) + " m";
}
