#include "sources/laser_setup.h"

#include <cmath>

#include "quantities/input_error.h"

namespace dosimetry {
namespace {

constexpr const char* spread_choices =
    "diameter with one of divergence, m2, or waist and waist_at; or waist and waist_at with divergence or m2";

void check_combination(const BeamSetup& beam, const std::string& key) {
    const bool waist = beam.waist.has_value();
    if (waist != beam.waist_at.has_value())
        throw InputError(waist ? "waist is given without waist_at" : "waist_at is given without waist",
                         spread_choices, key + (waist ? ".waist" : ".waist_at"));
    if (!beam.diameter && !waist) throw InputError("the size of the beam is missing", spread_choices, key);
    const int spreads =
        int{beam.divergence.has_value()} + int{beam.m2.has_value()} + int{beam.diameter && waist};
    if (spreads == 0) throw InputError("the divergence of the beam is missing", spread_choices, key);
    if (spreads > 1)
        throw InputError("the divergence of the beam is stated more than once", spread_choices,
                         key + (beam.m2 ? ".m2" : ".divergence"));
}

}  // namespace

void check(const LaserSetup& setup, const std::string& key) {
    require_between(setup.wavelength, "1 nm", "10 mm", "the wavelength", key + ".wavelength");
    require_between(setup.power, "1 fW", "1e15 W", "the power", key + ".emission.power");
    const BeamSetup& beam = setup.beam;
    const std::string beam_key = key + ".beam";
    if (beam.diameter)
        require_between(*beam.diameter, "100 nm", "1 km", "the beam diameter", beam_key + ".diameter");
    if (beam.divergence)
        require_between(*beam.divergence, "1e-9 rad", "3.1 rad", "the full-angle divergence",
                        beam_key + ".divergence");
    if (beam.m2)
        require_between(*beam.m2, shortest(*beam.m2), 1.0, 1e6, "the beam propagation ratio m2",
                        "from 1 (a perfect Gaussian beam) to 1e6", beam_key + ".m2");
    if (beam.waist) require_between(*beam.waist, "100 nm", "1 km", "the waist diameter", beam_key + ".waist");
    check_combination(beam, beam_key);
    if (beam.waist_at) {
        constexpr double farthest_m = 1e6;
        const double at_m = beam.waist_at->value.in_si();
        if (!(std::fabs(at_m) <= farthest_m))
            throw InputError(
                "the waist position " + quoted(beam.waist_at->text) + " is outside what can be calculated",
                "from -1000 km to 1000 km", beam_key + ".waist_at");
        if (beam.diameter && at_m == 0.0)
            throw InputError(
                "waist_at is zero, so diameter and waist state the same thing and no divergence follows",
                "a waist away from the exit, or divergence or m2 instead of waist", beam_key + ".waist_at");
        if (beam.diameter && !(beam.diameter->value > beam.waist->value))
            throw InputError("the waist " + quoted(beam.waist->text) + " is not smaller than the diameter " +
                                 quoted(beam.diameter->text) + " at the exit",
                             "a waist smaller than the diameter", beam_key + ".waist");
    }
    if (setup.apparent_source)
        require_between(*setup.apparent_source, "1 nm", "1 km", "the apparent source",
                        key + ".apparent_source");
}

Laser make_laser(const LaserSetup& setup) {
    const BeamSetup& stated = setup.beam;
    const double scale = reference_over_measured(stated.profile, stated.measured_at);
    const Length waist = (stated.waist ? stated.waist->value : stated.diameter->value) * scale;
    const Length waist_at = stated.waist_at ? stated.waist_at->value : metres(0);
    PlaneAngle divergence;
    if (stated.divergence) {
        divergence = stated.divergence->value * scale;
    } else if (stated.m2) {
        divergence = divergence_from_m2(*stated.m2, setup.wavelength.value, waist);
    } else {  // d(0)² = d_w² + θ² z_w², solved for θ
        const double d = (stated.diameter->value * scale).in_si();
        const double w = waist.in_si();
        divergence = radians(std::sqrt((d - w) * (d + w)) / std::fabs(waist_at.in_si()));
    }
    Laser laser{setup.id, setup.wavelength.value, setup.power.value,
                CircularBeam(stated.profile, waist, waist_at, divergence), std::nullopt};
    if (setup.apparent_source) laser.apparent_source = setup.apparent_source->value;
    return laser;
}

}  // namespace dosimetry
