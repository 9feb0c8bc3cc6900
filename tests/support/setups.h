#pragma once

#include <string>

#include "assessment/setup.h"

namespace testing_support {

/// The laser most tests start from: 532 nm, 5 W, Gaussian, 2 mm at 1/e², 1 mrad.
inline dosimetry::LaserSetup green_laser() {
    using namespace dosimetry;
    LaserSetup laser;
    laser.id = "green";
    laser.wavelength = Stated<Length>("532 nm");
    laser.power = Stated<RadiantPower>("5 W");
    laser.beam.diameter = Stated<Length>("2 mm");
    laser.beam.divergence = Stated<PlaneAngle>("1 mrad");
    return laser;
}

inline dosimetry::PositionSetup position(const std::string& id, const std::string& at,
                                         const std::string& exposure) {
    using namespace dosimetry;
    return {id, Stated<Length>(at), Stated<Duration>(exposure), true, true};
}

/// That laser, one position at 0.5 m for 0.25 s, ICNIRP 2013.
inline dosimetry::Setup green_setup() {
    dosimetry::Setup setup;
    setup.limits = {"icnirp_2013_laser"};
    setup.sources = {green_laser()};
    setup.positions = {position("operator", "0.5 m", "0.25 s")};
    return setup;
}

}  // namespace testing_support
