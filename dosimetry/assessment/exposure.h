#pragma once

#include <variant>
#include <vector>

#include "limits/limit_set.h"
#include "paths/arrival.h"

namespace dosimetry {

/// An arrival held against one limit.
struct Evaluated {
    Limit limit;
    LimitValue exposure;
    double acceptance_share = 1.0;  ///< part of the exposure within the acceptance angle
    double ratio = 0.0;
};

/// The query that an arrival makes to a limit set.
LimitQuery query_for(const Arrival& arrival, Duration exposure, Tissue tissue);

/// All limits that apply at once, equivalent alternative forms left out.
std::variant<std::vector<Evaluated>, NotCovered> evaluate(const Arrival& arrival, Duration exposure,
                                                          Tissue tissue, const LimitSet& set);

/// One limit; the exposure is averaged over its aperture. With a source larger than the acceptance angle γ
/// only the part inside it counts, (γ/α)² of a uniform round source (ICNIRP 2013, retinal photochemical
/// limits).
Evaluated hold_against(const Limit& limit, const Arrival& arrival, Duration exposure);

double largest_ratio(const std::vector<Evaluated>& evaluated);

}  // namespace dosimetry
