#pragma once

#include <optional>
#include <string>
#include <utility>
#include <vector>

#include "assessment/assessment.h"

/// The stretch of the beam where a tissue's limit is exceeded.
struct RouteZone {
    dosimetry::Tissue tissue{};
    dosimetry::Length from;
    dosimetry::Length to;
    bool startsBeforeAxis = false;
    bool endsBehindAxis = false;
    std::string label;  ///< "eye, 0.25 s: above the limit up to 298.2 m"
};

/// One line on a tissue where no zone can be drawn.
struct RouteRemark {
    dosimetry::Tissue tissue{};
    std::string text;  ///< "eye: within the limits along the whole beam", "eye: not covered"
};

struct RoutePerson {
    std::string id;
    dosimetry::Stated<dosimetry::Length> at;
    bool current = false;
    bool assessed = false;
    double ratio = 0.0;
};

/// What the route view draws, without pixels. The axis is logarithmic from whole decade to whole decade.
struct RouteModel {
    dosimetry::Length from;
    dosimetry::Length to;
    std::string sourceId;
    std::vector<dosimetry::Length> distances;
    std::vector<dosimetry::Length> diameters;
    std::vector<RouteZone> zones;
    std::vector<RouteRemark> remarks;
    std::vector<RoutePerson> people;

    using Axis = std::pair<dosimetry::Length, dosimetry::Length>;
    /// For the current position; without one, for the sheet, each tissue's zone is that of the exposure with
    /// the largest hazard distance, so that nobody who is above a limit stands outside. The axis holds all
    /// positions and the hazard distances of the current one, unless it is given.
    static RouteModel of(const dosimetry::Setup& setup, const dosimetry::Assessment& assessment,
                         std::optional<int> currentPosition, const std::optional<Axis>& axis = std::nullopt);

    /// Place on the axis, 0 at `from` and 1 at `to`; not clipped.
    double fractionOf(dosimetry::Length distance) const;
    dosimetry::Length distanceAt(double fraction) const;
};

/// A dragged distance as one would type it: three digits, in mm below 1 cm and in m above.
dosimetry::Stated<dosimetry::Length> roundedDistance(dosimetry::Length distance);

/// "10 cm", "1 m", "100 km" for a decade of the axis.
std::string decadeLabel(int exponent);
