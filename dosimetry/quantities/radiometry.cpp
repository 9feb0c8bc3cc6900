#include "quantities/radiometry.h"

#include <cmath>

namespace dosimetry {

double in_nanometres(Length wavelength) {
    return std::round(wavelength.in_si() * 1e18) / 1e9;
}

}  // namespace dosimetry
