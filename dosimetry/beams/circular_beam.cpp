#include "beams/circular_beam.h"

#include <algorithm>
#include <cmath>

namespace dosimetry {

double reference_over_measured(Profile profile, WidthDefinition definition) {
    const double one_minus_1_over_e = 1.0 - std::exp(-1.0);
    const double one_minus_1_over_e2 = 1.0 - std::exp(-2.0);
    if (profile == Profile::gaussian) {
        switch (definition) {
            case WidthDefinition::one_over_e2:
            case WidthDefinition::d4sigma:
            case WidthDefinition::enclosed_86:
                return 1.0;
            case WidthDefinition::one_over_e:
            case WidthDefinition::enclosed_63:
                return std::sqrt(2.0);
            case WidthDefinition::fwhm:
                return std::sqrt(2.0 / std::log(2.0));
        }
    }
    switch (definition) {
        case WidthDefinition::enclosed_63:
            return 1.0 / std::sqrt(one_minus_1_over_e);
        case WidthDefinition::enclosed_86:
            return 1.0 / std::sqrt(one_minus_1_over_e2);
        default:
            return 1.0;
    }
}

CircularBeam::CircularBeam(Profile profile, Length waist, Length waist_at, PlaneAngle divergence)
    : profile_(profile), waist_(waist), waist_at_(waist_at), divergence_(divergence) {}

Length CircularBeam::diameter_at(Length z) const {
    return Length::from_si(std::hypot(waist_.in_si(), arc(divergence_, z - waist_at_).in_si()));
}

double CircularBeam::fraction_through(Length aperture, Length z) const {
    const double ratio = aperture / diameter_at(z);
    return profile_ == Profile::gaussian ? -std::expm1(-2.0 * ratio * ratio) : std::min(1.0, ratio * ratio);
}

Irradiance CircularBeam::peak_irradiance(RadiantPower power, Length z) const {
    const Irradiance mean = power / disc(diameter_at(z));
    return profile_ == Profile::gaussian ? 2.0 * mean : mean;
}

PlaneAngle divergence_from_m2(double m2, Length wavelength, Length waist) {
    return radians(4.0 * m2 / pi * (wavelength / waist));
}

}  // namespace dosimetry
