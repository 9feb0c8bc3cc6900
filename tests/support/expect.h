#pragma once

#include <gtest/gtest.h>

#include <cmath>
#include <sstream>
#include <string>

#include "quantities/input_error.h"

namespace testing_support {

/// Equal up to a relative error; zero equals zero only.
inline ::testing::AssertionResult relatively_near(double actual, double expected, double relative) {
    if (actual == expected || std::fabs(actual - expected) <= relative * std::fabs(expected))
        return ::testing::AssertionSuccess();
    std::ostringstream text;
    text.precision(17);
    text << actual << " is not within " << relative << " (relative) of " << expected;
    return ::testing::AssertionFailure() << text.str();
}

/// A printed value, which may be off by half a unit of its last digit: 25.4 is `printed(25.4, 1)`.
struct Printed {
    double value;
    double half_unit;
};
inline Printed printed(double value, int decimals) {
    // The printed value itself is not exact in binary, hence the last factor.
    return {value, 0.5 * std::pow(10.0, -decimals) * (1 + 1e-9)};
}
inline ::testing::AssertionResult agrees(double actual, Printed expected) {
    if (std::fabs(actual - expected.value) <= expected.half_unit) return ::testing::AssertionSuccess();
    std::ostringstream text;
    text.precision(12);
    text << actual << " does not round to the printed " << expected.value;
    return ::testing::AssertionFailure() << text.str();
}

/// What an InputError says, place included; "no error" if nothing was thrown.
template <class Action>
std::string message_of(Action action) {
    try {
        action();
    } catch (const dosimetry::InputError& error) {
        return error.what();
    }
    return "no error";
}

}  // namespace testing_support
