#pragma once

#include <optional>
#include <string>

#include "quantities/stated.h"
#include "sources/laser.h"

namespace dosimetry {

/// The beam as the user states it. Accepted combinations:
///   diameter + divergence, diameter + m2 (the waist is at the exit), diameter + waist + waist_at (the
///   divergence follows), waist + waist_at + divergence, waist + waist_at + m2.
/// Diameter, waist and divergence all follow the definition `measured_at`; the divergence is the full angle.
struct BeamSetup {
    Profile profile = Profile::gaussian;
    WidthDefinition measured_at = WidthDefinition::one_over_e2;
    std::optional<Stated<Length>> diameter;
    std::optional<Stated<PlaneAngle>> divergence;
    std::optional<double> m2;
    std::optional<Stated<Length>> waist;
    std::optional<Stated<Length>> waist_at;  ///< from the exit, negative inside the laser
    friend bool operator==(const BeamSetup&, const BeamSetup&) = default;
};

/// A continuous laser as the user states it.
struct LaserSetup {
    std::string id;
    Stated<Length> wavelength;
    Stated<RadiantPower> power;
    BeamSetup beam;
    std::optional<Stated<Length>> apparent_source;
    friend bool operator==(const LaserSetup&, const LaserSetup&) = default;
};

/// Checks ranges and the combination of the beam's values. Throws InputError whose key starts with `key`
/// ("source[0]"). A wavelength outside the limit tables is no error: the assessment answers "not covered".
void check(const LaserSetup& setup, const std::string& key);

/// The laser that a checked setup describes, all diameters turned into reference diameters.
Laser make_laser(const LaserSetup& setup);

}  // namespace dosimetry
