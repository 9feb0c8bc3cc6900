#pragma once

#include "quantities/radiometry.h"

namespace dosimetry {

enum class Profile { gaussian, top_hat };

/// Where the diameter (and the divergence with it) of a beam is measured.
enum class WidthDefinition {
    one_over_e2,  ///< irradiance down to 1/e² of the peak
    one_over_e,   ///< irradiance down to 1/e of the peak
    fwhm,         ///< full width at half maximum
    d4sigma,      ///< second moments, ISO 11146-1:2021, clause 3 (from memory)
    enclosed_63,  ///< circle that holds 1 − 1/e = 63.2 % of the power
    enclosed_86,  ///< circle that holds 1 − 1/e² = 86.5 % of the power
};

/// The diameter that a profile is described by here: 1/e² for a Gaussian, the edge for a top-hat. Returns
/// that reference diameter divided by the diameter at the given definition. All six exist for both profiles.
/// Gaussian: E(r) = E0 exp(−8 r²/d²) with d at 1/e². Top-hat: the irradiance falls to zero at the edge, so
/// the diameters at 1/e², 1/e and half maximum are all the edge; 4σ of a uniform disc is its diameter.
double reference_over_measured(Profile profile, WidthDefinition definition);

/// A beam of circular cross-section in free space. All diameters here are reference diameters.
///
/// Hyperbolic propagation, d(z)² = d_w² + θ² (z − z_w)², with waist diameter d_w at z_w and full-angle
/// far-field divergence θ (ISO 11146-1:2021, clause 5; clause from memory). It is exact for second moments;
/// that a top-hat keeps its shape while it spreads is an approximation.
class CircularBeam {
  public:
    CircularBeam(Profile profile, Length waist, Length waist_at, PlaneAngle divergence);

    Profile profile() const { return profile_; }
    Length waist() const { return waist_; }
    Length waist_at() const { return waist_at_; }
    PlaneAngle divergence() const { return divergence_; }

    /// Reference diameter at distance z from the exit (z ≥ 0).
    Length diameter_at(Length z) const;

    /// Share of the power, 0 to 1, inside a centred round aperture. Gaussian: 1 − exp(−2 a²/d²) for aperture
    /// diameter a (common practice; integral of the profile above). Top-hat: min(1, a²/d²). Exact to
    /// rounding.
    double fraction_through(Length aperture, Length z) const;

    /// Largest irradiance on the axis: 8 P/(π d²) Gaussian, 4 P/(π d²) top-hat.
    Irradiance peak_irradiance(RadiantPower power, Length z) const;

  private:
    Profile profile_;
    Length waist_;
    Length waist_at_;
    PlaneAngle divergence_;
};

/// Full-angle divergence of a beam with beam propagation ratio M²: θ = 4 M² λ/(π d_w), for second-moment
/// (D4σ) diameters (ISO 11146-1:2021, clause 3; clause from memory). For both profiles the D4σ diameter is
/// the reference diameter.
PlaneAngle divergence_from_m2(double m2, Length wavelength, Length waist);

}  // namespace dosimetry
