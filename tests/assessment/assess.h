#pragma once

#include <gtest/gtest.h>

#include <algorithm>

#include "assessment/assessment.h"
#include "assessment/exposure.h"
#include "limits/limit_library.h"

namespace testing_support {

inline const dosimetry::LimitLibrary& library() {
    return dosimetry::LimitLibrary::embedded();
}

/// Checked as a reader or the window would, then assessed.
inline dosimetry::Assessment assessed(const dosimetry::Setup& setup,
                                      dosimetry::Trails trails = dosimetry::Trails::off) {
    dosimetry::check(setup, library());
    return dosimetry::assess(setup, library(), trails);
}

inline const dosimetry::Criterion& criterion(const dosimetry::PositionAssessment& position,
                                             dosimetry::Tissue tissue, dosimetry::Effect effect) {
    for (const dosimetry::Criterion& c : position.criteria)
        if (c.tissue == tissue && c.effect == effect) return c;
    throw std::runtime_error("no such criterion");
}

inline double si(const dosimetry::LimitValue& value) {
    return std::visit([](auto quantity) { return quantity.in_si(); }, value);
}

/// The largest ratio of a tissue at a place, straight from the limits, without any search.
inline double ratio_at(const dosimetry::Setup& setup, dosimetry::Length at, dosimetry::Duration exposure,
                       dosimetry::Tissue tissue) {
    using namespace dosimetry;
    const Laser laser = make_laser(setup.sources.front());
    const auto answer = evaluate(Arrival(laser, at), exposure, tissue, *library().find(setup.limits.front()));
    return largest_ratio(std::get<std::vector<Evaluated>>(answer));
}

}  // namespace testing_support
