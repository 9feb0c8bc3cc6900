#pragma once

#include <gtest/gtest.h>

#include <stdexcept>

#include "limits/limit_library.h"

namespace testing_support {

using dosimetry::Effect;
using dosimetry::LimitQuantity;
using dosimetry::Tissue;

inline std::vector<dosimetry::Limit> icnirp_limits(Tissue tissue, double nm, double t_s,
                                                   double alpha_mrad = 0) {
    using namespace dosimetry;
    const LimitSet& set = *LimitLibrary::embedded().find("icnirp_2013_laser");
    return std::get<std::vector<Limit>>(
        set.limits_for({tissue, nanometres(nm), seconds(t_s), milliradians(alpha_mrad), Area{}}));
}

/// The ICNIRP 2013 limit of one effect in one quantity, in SI units.
inline double icnirp(Tissue tissue, Effect effect, LimitQuantity quantity, double nm, double t_s,
                     double alpha_mrad = 0) {
    for (const dosimetry::Limit& limit : icnirp_limits(tissue, nm, t_s, alpha_mrad))
        if (limit.row->effect == effect && limit.row->quantity == quantity)
            return std::visit([](auto value) { return value.in_si(); }, limit.value);
    throw std::runtime_error("no such limit");
}

/// The strictest limit of a tissue as an irradiance in W/m².
inline double strictest_W_per_m2(Tissue tissue, double nm, double t_s, double alpha_mrad = 0) {
    double smallest = std::numeric_limits<double>::infinity();
    for (const dosimetry::Limit& limit : icnirp_limits(tissue, nm, t_s, alpha_mrad)) {
        if (limit.row->alternative_form) continue;
        const double value = std::visit([](auto v) { return v.in_si(); }, limit.value);
        smallest =
            std::min(smallest, limit.row->quantity == LimitQuantity::radiant_exposure ? value / t_s : value);
    }
    return smallest;
}

/// What passes a round aperture at that irradiance, in mW.
inline double power_mW(double irradiance_W_per_m2, double aperture_mm) {
    using namespace dosimetry;
    return (watts_per_m2(irradiance_W_per_m2) * disc(millimetres(aperture_mm))).in_si() * 1e3;
}

}  // namespace testing_support
