#pragma once

#include <ostream>
#include <string>

#include "quantities/decimal.h"
#include "support/property.h"
#include "support/setups.h"

namespace dosimetry {

/// How a failing property shows its setup.
inline void showValue(const Setup& setup, std::ostream& out) {
    const LaserSetup& laser = setup.sources.front();
    const PositionSetup& position = setup.positions.front();
    out << laser.wavelength.text << ", " << laser.power.text << ", waist " << laser.beam.waist->text << " at "
        << laser.beam.waist_at->text << ", " << laser.beam.divergence->text << ", profile "
        << static_cast<int>(laser.beam.profile) << ", width " << static_cast<int>(laser.beam.measured_at)
        << ", source " << (laser.apparent_source ? laser.apparent_source->text : "small") << "; at "
        << position.at.text << " for " << position.exposure.text;
}

}  // namespace dosimetry

namespace testing_support {

inline std::string with_unit(double value, const char* unit) {
    return dosimetry::shortest(value) + " " + unit;
}

/// Edges of the tables more often than chance; otherwise whole picometres, which nine digits show in full.
inline rc::Gen<double> any_wavelength_nm() {
    const auto whole_picometres = [](double nm) { return std::round(nm * 1e3) / 1e3; };
    return rc::gen::oneOf(
        rc::gen::map(log_uniform(180, 1e6), whole_picometres),
        rc::gen::map(log_uniform(400, 1400), whole_picometres),
        rc::gen::element(180.0, 302.0, 308.0, 315.0, 400.0, 450.0, 532.0, 600.0, 700.0, 905.0, 1050.0, 1064.0,
                         1200.0, 1310.0, 1400.0, 1500.0, 1800.0, 2600.0, 1e4, 1e5, 1e6));
}

/// A covered setup with one position: beams from pointers to high powers, some with an extended source.
inline rc::Gen<dosimetry::Setup> any_setup() {
    using namespace dosimetry;
    return rc::gen::exec([] {
        Setup setup = green_setup();
        LaserSetup& laser = setup.sources.front();
        laser.wavelength = Stated<Length>(with_unit(*any_wavelength_nm(), "nm"));
        laser.power = Stated<RadiantPower>(with_unit(*log_uniform(1e-7, 1e5), "W"));
        laser.beam.profile = *rc::gen::element(Profile::gaussian, Profile::top_hat);
        laser.beam.measured_at = *rc::gen::element(
            WidthDefinition::one_over_e2, WidthDefinition::one_over_e, WidthDefinition::fwhm,
            WidthDefinition::d4sigma, WidthDefinition::enclosed_63, WidthDefinition::enclosed_86);
        const double waist_m = *log_uniform(1e-5, 1e-1);
        laser.beam.diameter.reset();
        laser.beam.divergence = Stated<PlaneAngle>(with_unit(*log_uniform(1e-5, 1), "rad"));
        laser.beam.waist = Stated<Length>(with_unit(waist_m, "m"));
        laser.beam.waist_at = Stated<Length>(with_unit(*rc::gen::element(0.0, 0.0, 0.3, -0.2, 20.0), "m"));
        if (*rc::gen::inRange(0, 3) == 0)
            laser.apparent_source = Stated<Length>(with_unit(*log_uniform(1e-5, 0.3), "m"));
        setup.positions = {position("there", with_unit(*log_uniform(1e-2, 1e3), "m"),
                                    with_unit(*log_uniform(1e-13, 3e4), "s"))};
        return setup;
    });
}

}  // namespace testing_support
