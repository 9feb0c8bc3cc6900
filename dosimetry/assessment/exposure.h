#pragma once

#include <variant>
#include <vector>

#include "limits/limit_set.h"
#include "paths/arrival.h"

namespace dosimetry {

/// An arrival held against one limit.
struct Evaluated {
    Limit limit;
    LimitQuantity quantity{};  ///< in which exposure and limit are compared
    LimitValue exposure;
    LimitValue compared_limit;
    double acceptance_share = 1.0;  ///< part of the exposure within the acceptance angle
    double ratio = 0.0;
};

/// The query that an arrival makes to a limit set.
LimitQuery query_for(const Arrival& arrival, Duration exposure, Tissue tissue);

/// All limits that apply at once, equivalent alternative forms left out.
std::variant<std::vector<Evaluated>, NotCovered> evaluate(const Arrival& arrival, Duration exposure,
                                                          Tissue tissue, const LimitSet& set);

/// One limit. A continuous beam is compared with thermal limits as irradiance, also where the row states a
/// radiant exposure (which is divided by the duration: the ratio is the same); photochemical rows keep the
/// dose they state. The exposure is averaged over its aperture. With a source larger than the acceptance
/// angle γ only the part inside it counts, (γ/α)² of a uniform round source (ICNIRP 2013, retinal
/// photochemical limits).
Evaluated hold_against(const Limit& limit, const Arrival& arrival, Duration exposure);

double largest_ratio(const std::vector<Evaluated>& evaluated);

}  // namespace dosimetry
