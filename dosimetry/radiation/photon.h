#pragma once

#include "quantities/radiometry.h"

namespace dosimetry {

/// Energy of one photon, h c / λ, for a vacuum wavelength (Planck relation; ISO 80000-10:2019, item 10-1.1
/// for h).
PhotonEnergy photon_energy(Length wavelength);

/// The same in electronvolts, as a plain number for display.
double in_electronvolts(PhotonEnergy energy);

/// Photons per second in a monochromatic beam of that power, P λ / (h c).
PhotonRate photon_rate(RadiantPower power, Length wavelength);

/// Photons per area that deliver a radiant exposure, H λ / (h c) (photon exposure, ISO 80000-7:2019).
PhotonExposure photon_exposure(RadiantExposure exposure, Length wavelength);

}  // namespace dosimetry
