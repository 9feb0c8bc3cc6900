#pragma once

#include <optional>
#include <string>

#include "beams/circular_beam.h"
#include "radiation/photon.h"

namespace dosimetry {

/// A continuous laser with one wavelength. Without an apparent source it is a small source (subtense at most
/// alpha-min), which is the most restrictive reading.
struct Laser {
    std::string id;
    Length wavelength;
    RadiantPower power;
    CircularBeam beam;
    std::optional<Length> apparent_source;  ///< diameter of a uniform round apparent source at the exit
};

}  // namespace dosimetry
