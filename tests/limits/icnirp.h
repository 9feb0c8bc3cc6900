#pragma once

#include <gtest/gtest.h>

#include <vector>

#include "limits/limit_library.h"

namespace testing_support {

inline const dosimetry::LimitSet& icnirp() {
    return *dosimetry::LimitLibrary::embedded().find("icnirp_2013_laser");
}

inline double si(const dosimetry::LimitValue& value) {
    return std::visit([](auto quantity) { return quantity.in_si(); }, value);
}

/// The limits of a query; a failure if it is not covered.
inline std::vector<dosimetry::Limit> limits_of(const dosimetry::LimitQuery& query) {
    auto answer = icnirp().limits_for(query);
    if (const auto* outside = std::get_if<dosimetry::NotCovered>(&answer)) {
        ADD_FAILURE() << outside->reason;
        return {};
    }
    return std::get<std::vector<dosimetry::Limit>>(std::move(answer));
}

/// The smallest limit as a radiant exposure; equivalent radiance forms left out.
inline double strictest_J_per_m2(const dosimetry::LimitQuery& query) {
    double smallest = std::numeric_limits<double>::infinity();
    for (const dosimetry::Limit& limit : limits_of(query)) {
        if (limit.row->alternative_form) continue;
        const bool dose = limit.row->quantity == dosimetry::LimitQuantity::radiant_exposure;
        smallest = std::min(smallest, dose ? si(limit.value) : si(limit.value) * query.exposure.in_si());
    }
    return smallest;
}

}  // namespace testing_support
