#include "assessment/exposure.h"

#include <algorithm>
#include <cassert>

namespace dosimetry {
namespace {

bool is_photochemical(Effect effect) {
    return effect == Effect::retinal_photochemical || effect == Effect::ultraviolet_photochemical;
}

}  // namespace

LimitQuery query_for(const Arrival& arrival, Duration exposure, Tissue tissue) {
    return {tissue, arrival.wavelength(), exposure, arrival.subtense(), arrival.exposed_area()};
}

Evaluated hold_against(const Limit& limit, const Arrival& arrival, Duration exposure) {
    Evaluated result;
    result.limit = limit;
    if (limit.acceptance > radians(0) && arrival.subtense() > limit.acceptance) {
        const double inside = limit.acceptance / arrival.subtense();
        result.acceptance_share = inside * inside;
    }
    const Irradiance irradiance = arrival.averaged_over(limit.aperture) * result.acceptance_share;
    const bool dose_row = limit.row->quantity == LimitQuantity::radiant_exposure;
    assert(dose_row || limit.row->quantity == LimitQuantity::irradiance);
    if (dose_row && is_photochemical(limit.row->effect)) {
        const RadiantExposure dose = irradiance * exposure;
        result.quantity = LimitQuantity::radiant_exposure;
        result.exposure = dose;
        result.compared_limit = limit.value;
        result.ratio = dose / std::get<RadiantExposure>(limit.value);
    } else {
        const Irradiance permitted =
            dose_row ? std::get<RadiantExposure>(limit.value) / exposure : std::get<Irradiance>(limit.value);
        result.quantity = LimitQuantity::irradiance;
        result.exposure = irradiance;
        result.compared_limit = permitted;
        result.ratio = irradiance / permitted;
    }
    return result;
}

std::variant<std::vector<Evaluated>, NotCovered> evaluate(const Arrival& arrival, Duration exposure,
                                                          Tissue tissue, const LimitSet& set) {
    const auto answer = set.limits_for(query_for(arrival, exposure, tissue));
    if (const auto* outside = std::get_if<NotCovered>(&answer)) return *outside;
    std::vector<Evaluated> result;
    for (const Limit& limit : std::get<std::vector<Limit>>(answer))
        if (!limit.row->alternative_form) result.push_back(hold_against(limit, arrival, exposure));
    return result;
}

double largest_ratio(const std::vector<Evaluated>& evaluated) {
    double largest = 0.0;
    for (const Evaluated& e : evaluated) largest = std::max(largest, e.ratio);
    return largest;
}

}  // namespace dosimetry
