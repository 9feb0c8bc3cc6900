#pragma once

#include <functional>
#include <optional>
#include <vector>

#include "limits/limit_set.h"
#include "paths/arrival.h"

namespace dosimetry {

/// The longest exposure up to which the ratio stays at or below 1, scanning from the first edge upwards.
struct PermittedExposure {
    std::optional<Duration> duration;  ///< empty: above the limit from the shortest duration on
    bool whole_range = false;
};

/// `edges` are the durations between which each ratio is a smooth function of the duration that does not
/// fall: for a continuous beam the dose grows as t, no limit faster than t, and a growing aperture (t^0.375)
/// lowers the averaged irradiance by no more than t^-0.75. So the ends of each interval bracket the first
/// crossing. Relative error of the result at most 1e-12, always on the permitted side.
PermittedExposure longest_permitted(const std::vector<Duration>& edges,
                                    const std::function<double(Duration)>& ratio);

struct OuterEdge {
    std::optional<Length>
        distance;  ///< zero if the ratio is nowhere above 1; empty if beyond the search range
};

/// The farthest distance at which the ratio passes 1, scanning inwards from `farthest` in steps of 1/32
/// decade with `extra` distances added (waist, bends of the ratio), then by TOMS 748 (Alefeld, Potra, Shi,
/// ACM TOMS 21:327, 1995). Maxima of the scan just below 1 are refined, so that a summit between two steps is
/// not overlooked. Relative error at most 1e-9, always on the far, permitted side.
OuterEdge outer_edge(Length nearest, Length farthest, const std::vector<Length>& extra,
                     const std::function<double(Length)>& ratio);

/// Distances at which the ratio along the beam may bend or step: the waist, and where subtense or exposed
/// area pass an edge of the limits.
std::vector<Length> bends_along_beam(const Laser& laser, const LimitSet& set, Tissue tissue,
                                     Duration exposure);

/// The ratio to the limits of a tissue along the beam for a fixed exposure; limits that do not change with
/// the distance are looked up once.
std::function<double(Length)> ratio_along_beam(const Laser& laser, const LimitSet& set, Tissue tissue,
                                               Duration exposure);

}  // namespace dosimetry
