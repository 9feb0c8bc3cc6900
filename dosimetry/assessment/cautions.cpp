#include "assessment/cautions.h"

#include <utility>

#include "quantities/format.h"

namespace dosimetry {
namespace {

constexpr double visible_from_nm = 400.0;
constexpr double visible_to_nm = 700.0;
constexpr Duration aversion = seconds(0.25);

bool visible(Length wavelength) {
    const double nm = in_nanometres(wavelength);
    return nm >= visible_from_nm && nm <= visible_to_nm;
}

/// What an exposure of at most 0.25 s rests on. The aversion response may be presumed for 400-700 nm only.
std::string short_exposure_caution(const PositionSetup& position, Length wavelength) {
    if (position.exposure.value > aversion) return {};
    const std::string start =
        "Position \"" + position.id + "\": an exposure of only " + position.exposure.text;
    if (!visible(wavelength))
        return start + " cannot rest on the aversion response, since nobody sees " +
               exact_number(in_nanometres(wavelength)) + " nm. Something else must be certain to end it.";
    if (position.exposure.value < aversion)
        return start + " is shorter than the aversion response. Something else must be certain to end it.";
    return {};
}

}  // namespace

std::vector<std::string> cautions_for(const Setup& setup, const std::vector<const LimitSet*>& sets) {
    std::vector<std::string> cautions;
    for (const LimitSet* set : sets)
        if (!set->edition().text_read)
            cautions.push_back(set->edition().id + ": " + set->edition().text_note);
    for (const LaserSetup& source : setup.sources) {
        const Length wavelength = source.wavelength.value;
        for (const PositionSetup& position : setup.positions)
            if (std::string caution = short_exposure_caution(position, wavelength); !caution.empty())
                cautions.push_back(std::move(caution));
        const Laser laser = make_laser(source);
        const PlaneAngle smallest = divergence_from_m2(1.0, wavelength, laser.beam.waist());
        if (laser.beam.profile() == Profile::gaussian && laser.beam.divergence() < smallest * (1 - 1e-9))
            cautions.push_back("Source \"" + source.id + "\": the divergence of " +
                               format(laser.beam.divergence(), 3, Rounding::nearest) +
                               " is less than diffraction allows for this waist (" +
                               format(smallest, 3, Rounding::down) +
                               "). Check diameter, divergence and where they are measured; as given, "
                               "distances come out too long.");
    }
    const std::vector<std::string> general{
        "This calculation supports a competent person and does not replace one. Local law and site rules "
        "come first; "
        "the appointed laser or optical-radiation safety officer decides.",
        "Exposure limits protect healthy adults. They do not protect patients under treatment, infants, "
        "people without "
        "a natural lens, or people whom a medicine has made sensitive to light.",
        "Never look into a beam. Measure wherever a value or the model is uncertain.",
        "Hazards other than the beam (electrical, chemical, fire, noise) are not calculated here.",
    };
    cautions.insert(cautions.end(), general.begin(), general.end());
    return cautions;
}

std::string unassessed_caution(const PositionSetup& position, Tissue tissue, double ratio) {
    return "Position \"" + position.id + "\": the " + name_of(tissue) +
           " is not assessed, but it would receive " + format_number(ratio, 3, Rounding::up) +
           " times its limit there.";
}

std::vector<std::string> assumptions_for(const Setup& setup) {
    std::vector<std::string> assumptions;
    for (const LaserSetup& source : setup.sources) {
        assumptions.push_back("The beam is continuous and its power constant.");
        assumptions.push_back(
            source.beam.profile == Profile::gaussian
                ? "The beam is circular and Gaussian."
                : "The beam is circular with a flat top, and keeps that shape while it spreads.");
        if (!source.beam.waist)
            assumptions.push_back("The waist of the beam is at the exit: d(z)² = d₀² + (θ z)².");
        assumptions.push_back(
            "The beam meets nothing between the exit and the position; air takes nothing away.");
        assumptions.push_back("Pupil and skin are centred on the beam axis, the most exposed place.");
        assumptions.push_back(
            source.apparent_source
                ? "The apparent source is round, uniform and at the exit; nearer than 100 mm it is judged as "
                  "seen from 100 mm, since the eye cannot focus nearer."
                : "The source is judged as a small source (angular subtense at most alpha-min), the most "
                  "restrictive case for the retina.");
        for (const PositionSetup& position : setup.positions)
            if (position.exposure.value == aversion && visible(source.wavelength.value))
                assumptions.push_back(
                    "Position \"" + position.id +
                    "\": 0.25 s presumes the aversion response (blinking and turning away) and that "
                    "nobody suppresses it; it does not hold for deliberate viewing or with viewing aids.");
    }
    assumptions.push_back(
        "Nobody uses binoculars, a loupe or another viewing aid, and nobody wears protective eyewear.");
    assumptions.push_back("The stated exposure is the only one of the day.");
    assumptions.push_back(
        "An optical density named here is what the limits ask for; whether eyewear or windows withstand the "
        "beam is another question.");
    return assumptions;
}

}  // namespace dosimetry
