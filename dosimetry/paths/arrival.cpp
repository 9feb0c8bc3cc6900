#include "paths/arrival.h"

#include <algorithm>
#include <cmath>

namespace dosimetry {

Length Arrival::viewing_distance() const {
    return std::max(distance_, nearest_viewing);
}

PlaneAngle Arrival::subtense() const {
    if (!laser_->apparent_source) return radians(0);
    return radians(2.0 * std::atan(*laser_->apparent_source / viewing_distance() / 2.0));
}

Irradiance Arrival::averaged_over(Length aperture) const {
    return laser_->power * fraction_through(aperture) / disc(aperture);
}

}  // namespace dosimetry
