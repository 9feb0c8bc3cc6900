#pragma once

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>
#include <cstdint>

namespace testing_support {

/// Numbers between two positive ones, spread evenly over the decades.
inline rc::Gen<double> log_uniform(double from, double to) {
    constexpr int steps = 1'000'000;
    return rc::gen::map(rc::gen::inRange(0, steps + 1),
                        [=](int i) { return from * std::pow(to / from, static_cast<double>(i) / steps); });
}

}  // namespace testing_support
