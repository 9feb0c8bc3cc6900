// Mixes of quantities that must not compile. Each case has two forms: with FORBIDDEN the mix itself, without
// it the nearest thing that is right and must compile, so that the mix fails for the reason meant.

#include "quantities/radiometry.h"

using namespace dosimetry;

struct BlueLight;
struct ActinicUltraviolet;

#ifdef FORBIDDEN
#define MIX(right, wrong) wrong
#else
#define MIX(right, wrong) right
#endif

[[maybe_unused]] constexpr Radiance radiance = Radiance::from_si(1);
[[maybe_unused]] constexpr RadianceDose radiance_dose = RadianceDose::from_si(1);
[[maybe_unused]] constexpr Irradiance irradiance = watts_per_m2(1);
[[maybe_unused]] constexpr RadiantExposure radiant_exposure = joules_per_m2(1);
[[maybe_unused]] constexpr RadiantPower power = watts(1);
[[maybe_unused]] constexpr RadiantEnergy energy = joules(1);
[[maybe_unused]] constexpr Length length = metres(1);
[[maybe_unused]] constexpr Frequency frequency = Frequency::from_si(1);
[[maybe_unused]] constexpr PhotonRate photon_rate = PhotonRate::from_si(1);
[[maybe_unused]] constexpr PlaneAngle angle = radians(1);
[[maybe_unused]] constexpr SolidAngle solid_angle = SolidAngle::from_si(1);
using BlueIrradiance = Quantity<Irradiance::dimension, BlueLight>;
using ActinicIrradiance = Quantity<Irradiance::dimension, ActinicUltraviolet>;
[[maybe_unused]] constexpr BlueIrradiance blue = BlueIrradiance::from_si(1);
[[maybe_unused]] constexpr ActinicIrradiance actinic = ActinicIrradiance::from_si(1);

[[maybe_unused]] static auto mix() {
#if defined(RADIANCE_PLUS_IRRADIANCE)
    return radiance + MIX(radiance, irradiance);
#elif defined(IRRADIANCE_FROM_RADIANT_EXPOSURE)
    Irradiance result = MIX(irradiance, radiant_exposure);
    return result;
#elif defined(RADIANT_EXPOSURE_FROM_RADIANCE_DOSE)
    RadiantExposure result = MIX(radiance_dose * solid_angle, radiance_dose);
    return result;
#elif defined(NUMBER_FROM_LENGTH)
    double result = MIX(length.in_si(), length);
    return result;
#elif defined(LENGTH_FROM_NUMBER)
    Length result = MIX(metres(5.0), 5.0);
    return result;
#elif defined(LENGTH_PLUS_NUMBER)
    return length + MIX(metres(1), 1.0);
#elif defined(WEIGHTED_PLUS_UNWEIGHTED)
    return blue + MIX(blue, irradiance);
#elif defined(WEIGHTED_FROM_UNWEIGHTED)
    BlueIrradiance result = MIX(blue, irradiance);
    return result;
#elif defined(TWO_WEIGHTINGS_ADDED)
    return blue + MIX(blue, actinic);
#elif defined(TWO_WEIGHTINGS_COMPARED)
    return blue < MIX(blue, actinic);
#elif defined(TWO_WEIGHTINGS_MULTIPLIED)
    return blue * MIX(seconds(1), actinic);
#elif defined(WEIGHTED_DIVIDED_BY_UNWEIGHTED)
    return blue / MIX(blue, irradiance);
#elif defined(POWER_COMPARED_WITH_ENERGY)
    return power < MIX(power, energy);
#elif defined(PHOTON_RATE_PLUS_FREQUENCY)
    return photon_rate + MIX(photon_rate, frequency);
#elif defined(ANGLE_FROM_SOLID_ANGLE)
    PlaneAngle result = MIX(angle, solid_angle);
    return result;
#elif defined(EXPOSURE_OVER_IRRADIANCE_AS_NUMBER)
    double result = MIX(radiant_exposure, irradiance) / radiant_exposure;
    return result;
#else
#error "no case chosen"
#endif
}
