#pragma once

#include "quantities/quantity.h"

/// The radiometric quantities (names of ISO 80000-7:2019) and constructors from the units in daily use.
namespace dosimetry {

namespace dimensions {
inline constexpr Dimension length{.length = 1};
inline constexpr Dimension area{.length = 2};
inline constexpr Dimension time{.time = 1};
inline constexpr Dimension energy{.energy = 1};
inline constexpr Dimension power{.time = -1, .energy = 1};
inline constexpr Dimension angle{.angle = 1};
inline constexpr Dimension solid_angle{.solid_angle = 1};
inline constexpr Dimension photons{.photons = 1};
}  // namespace dimensions

using Length = Quantity<dimensions::length>;
using Area = Quantity<dimensions::area>;
using Duration = Quantity<dimensions::time>;
using Frequency = Quantity<dimensions::time.times(-1)>;
using RadiantEnergy = Quantity<dimensions::energy>;
using RadiantPower = Quantity<dimensions::power>;
using PlaneAngle = Quantity<dimensions::angle>;
using SolidAngle = Quantity<dimensions::solid_angle>;
using Irradiance = Quantity<dimensions::power - dimensions::area>;
using RadiantExposure = Quantity<dimensions::energy - dimensions::area>;
using RadiantIntensity = Quantity<dimensions::power - dimensions::solid_angle>;
using Radiance = Quantity<dimensions::power - dimensions::area - dimensions::solid_angle>;
using RadianceDose = Quantity<dimensions::energy - dimensions::area - dimensions::solid_angle>;
using PhotonCount = Quantity<dimensions::photons>;
using PhotonRate = Quantity<dimensions::photons - dimensions::time>;
using PhotonExposure = Quantity<dimensions::photons - dimensions::area>;
using PhotonEnergy = Quantity<dimensions::energy - dimensions::photons>;

inline constexpr double pi = 3.14159265358979323846;

constexpr Length metres(double v) {
    return Length::from_si(v);
}
constexpr Length millimetres(double v) {
    return Length::from_si(v * 1e-3);
}
constexpr Length nanometres(double v) {
    return Length::from_si(v * 1e-9);
}
/// Wavelength as a plain number of nanometres, rounded to 1e-9 nm: 1200e-9 m times 1e9 is 1200.0000000000002,
/// and a wavelength stated on the edge of a limit row must stay on it.
double in_nanometres(Length wavelength);
constexpr Duration seconds(double v) {
    return Duration::from_si(v);
}
constexpr RadiantEnergy joules(double v) {
    return RadiantEnergy::from_si(v);
}
constexpr RadiantPower watts(double v) {
    return RadiantPower::from_si(v);
}
constexpr PlaneAngle radians(double v) {
    return PlaneAngle::from_si(v);
}
constexpr PlaneAngle milliradians(double v) {
    return PlaneAngle::from_si(v * 1e-3);
}
constexpr Irradiance watts_per_m2(double v) {
    return Irradiance::from_si(v);
}
constexpr RadiantExposure joules_per_m2(double v) {
    return RadiantExposure::from_si(v);
}

/// Area of the disc of that diameter.
constexpr Area disc(Length diameter) {
    return pi / 4 * (diameter * diameter);
}

/// Length of the arc that an angle spans at a distance; the small-angle reading of "divergence times
/// distance".
constexpr Length arc(PlaneAngle angle, Length distance) {
    return Length::from_si(angle.in_si() * distance.in_si());
}

}  // namespace dosimetry
