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

/// The farthest hazard distance for the exposure of the current position, or the end of the search.
const HazardDistance* hazardDistance(const Assessment& assessment, Tissue tissue, Duration exposure) {
    for (const HazardDistance& d : assessment.hazard_distances)
        if (d.tissue == tissue && d.exposure.value == exposure &&
            d.limit_set == assessment.limit_sets.front()->edition().id)
            return &d;
    return nullptr;
}

Length decadeBelow(Length l) {
    return metres(std::pow(10.0, std::floor(std::log10(l.in_si()) + 1e-9)));
}
Length decadeAbove(Length l) {
    return metres(std::pow(10.0, std::ceil(std::log10(l.in_si()) - 1e-9)));
}

void addZones(RouteModel& model, const Assessment& assessment, const TissueCourse& course,
              Duration exposure) {
    const HazardDistance* edge = hazardDistance(assessment, course.tissue, exposure);
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
        if (edge && edge->distance && end < z.size() && *edge->distance <= z[end] &&
            *edge->distance >= z[end - 1])
            zone.to = *edge->distance;
        zone.label = name_of(zone.tissue) + ": above the limit ";
        if (!zone.startsBeforeAxis) zone.label += "from " + format(zone.from, 3, Rounding::down) + " ";
        zone.label += zone.endsBehindAxis ? "beyond " + format(model.to, 3, Rounding::nearest)
                                          : "up to " + format(zone.to, 4, Rounding::up);
        model.zones.push_back(zone);
        i = end;
    }
}

/// What stands where a tissue has no zone on the axis. Whether a limit is exceeded anywhere is the hazard
/// distance's to say, not the samples'.
void addRemark(RouteModel& model, const Assessment& assessment, Tissue tissue, Duration exposure) {
    for (const RouteZone& zone : model.zones)
        if (zone.tissue == tissue) return;
    std::string text = name_of(tissue) + ": ";
    const HazardDistance* edge = hazardDistance(assessment, tissue, exposure);
    if (!edge)
        text += "not covered";
    else if (edge->distance && *edge->distance <= metres(0))
        text += "within the limits along the whole beam";
    else
        text += "above the limit up to " + distance_text(*edge) + ", not drawn here";
    model.remarks.push_back({tissue, text});
}

RouteModel::Axis usualAxis(const Setup& setup, const Assessment& assessment, int currentPosition) {
    const PositionSetup& current = setup.positions[static_cast<std::size_t>(currentPosition)];
    Length nearest = current.at.value;
    Length farthest = current.at.value;
    for (const PositionSetup& p : setup.positions) {
        nearest = std::min(nearest, p.at.value);
        farthest = std::max(farthest, p.at.value);
    }
    for (Tissue tissue : {Tissue::eye, Tissue::skin})
        if (const HazardDistance* d = hazardDistance(assessment, tissue, current.exposure.value)) {
            if (!d->distance) {
                farthest = std::max(farthest, farthest_search);
            } else if (*d->distance > metres(0)) {
                farthest = std::max(farthest, *d->distance);
                nearest = std::min(nearest, *d->distance);
            }
        }
    return {decadeBelow(std::min(nearest * 0.5, millimetres(100))),
            decadeAbove(std::max(farthest * 1.3, metres(1)))};
}

}  // namespace

RouteModel RouteModel::of(const Setup& setup, const Assessment& assessment, int currentPosition,
                          const std::optional<Axis>& axis) {
    RouteModel model;
    const PositionSetup& current = setup.positions[static_cast<std::size_t>(currentPosition)];
    std::tie(model.from, model.to) = axis ? *axis : usualAxis(setup, assessment, currentPosition);
    model.sourceId = setup.sources.front().id;

    std::vector<Length> distances = logarithmic_distances(model.from, model.to, samples);
    const Length waist_at = make_laser(setup.sources.front()).beam.waist_at();
    if (waist_at > model.from && waist_at < model.to)  // the narrowest place, easily between two samples
        distances.insert(std::upper_bound(distances.begin(), distances.end(), waist_at), waist_at);
    Course course =
        course_along_beam(setup, LimitLibrary::embedded(), current.exposure.value, std::move(distances));
    model.distances = std::move(course.distances);
    model.diameters = std::move(course.diameters);
    for (const TissueCourse& line : course.tissues) addZones(model, assessment, line, current.exposure.value);
    for (Tissue tissue : {Tissue::eye, Tissue::skin})
        addRemark(model, assessment, tissue, current.exposure.value);

    const CircularBeam beam = make_laser(setup.sources.front()).beam;
    for (std::size_t i = 0; i < setup.positions.size(); ++i) {
        const PositionSetup& p = setup.positions[i];
        RoutePerson person{p.id,  p.at, beam.diameter_at(p.at.value), static_cast<int>(i) == currentPosition,
                           false, 0.0};
        if (assessment.covered()) {
            person.assessed = true;
            person.ratio = assessment.positions[i].governing.ratio;
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
