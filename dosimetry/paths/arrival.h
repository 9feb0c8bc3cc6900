#pragma once

#include "sources/laser.h"

namespace dosimetry {

/// What reaches a position from one source line through free space.
class Arrival {
  public:
    /// The eye cannot focus nearer (common practice; measuring distance of 100 mm in BGI 832 and BGV B2).
    static constexpr Length nearest_viewing = millimetres(100);

    Arrival(const Laser& laser, Length distance) : laser_(&laser), distance_(distance) {}

    Length wavelength() const { return laser_->wavelength; }
    RadiantPower power() const { return laser_->power; }
    Length distance() const { return distance_; }
    Length beam_diameter() const { return laser_->beam.diameter_at(distance_); }
    Profile profile() const { return laser_->beam.profile(); }
    bool small_source() const { return !laser_->apparent_source; }

    /// Distance the subtense is taken at: the eye cannot focus nearer than 100 mm, so nearer positions are
    /// judged with the subtense at 100 mm (common practice; measuring distance of 100 mm in BGI 832 and BGV
    /// B2).
    Length viewing_distance() const;
    /// Full angle of the apparent source, 2 atan(s / 2r); zero for a small source.
    PlaneAngle subtense() const;

    double fraction_through(Length aperture) const {
        return laser_->beam.fraction_through(aperture, distance_);
    }
    Irradiance peak_irradiance() const { return laser_->beam.peak_irradiance(laser_->power, distance_); }
    /// Irradiance averaged over a centred round aperture: P η(a) / (π a²/4), also where the beam is smaller
    /// than it.
    Irradiance averaged_over(Length aperture) const;
    /// Area that counts as exposed in large-area rules: the disc of the 1/e² (Gaussian) or edge diameter. A
    /// wide definition is the restrictive one, since the limits fall with the area.
    Area exposed_area() const { return disc(beam_diameter()); }

  private:
    const Laser* laser_;
    Length distance_;
};

}  // namespace dosimetry
