#include "radiation/photon.h"

#include "radiation/constants.h"

namespace dosimetry {

PhotonEnergy photon_energy(Length wavelength) {
    return PhotonEnergy::from_si(constants::planck_J_s * constants::speed_of_light_m_per_s /
                                 wavelength.in_si());
}

double in_electronvolts(PhotonEnergy energy) {
    return energy.in_si() / constants::electronvolt_J;
}

PhotonRate photon_rate(RadiantPower power, Length wavelength) {
    return power / photon_energy(wavelength);
}

PhotonExposure photon_exposure(RadiantExposure exposure, Length wavelength) {
    return exposure / photon_energy(wavelength);
}

}  // namespace dosimetry
