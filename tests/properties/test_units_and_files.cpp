// The same beam in other words is the same beam.

#include "assessment/assessment.h"
#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::any_setup;
using testing_support::relatively_near;
using testing_support::with_unit;

Assessment assessed(const dosimetry::Setup& setup) {
    return assess(setup, LimitLibrary::embedded(), Trails::off);
}

RC_GTEST_PROP(SameBeam, OtherUnitsGiveTheSameRatios, ()) {
    const dosimetry::Setup one = *any_setup();
    dosimetry::Setup other = one;
    LaserSetup& laser = other.sources[0];
    laser.wavelength = Stated<Length>(with_unit(laser.wavelength.value.in_si() * 1e6, "um"));
    laser.power = Stated<RadiantPower>(with_unit(laser.power.value.in_si() * 1e3, "mW"));
    laser.beam.waist = Stated<Length>(with_unit(laser.beam.waist->value.in_si() * 1e2, "cm"));
    laser.beam.divergence =
        Stated<PlaneAngle>(with_unit(laser.beam.divergence->value.in_si() * 180 / pi, "deg"));
    const Assessment a = assessed(one);
    const Assessment b = assessed(other);
    RC_ASSERT(a.positions[0].criteria.size() == b.positions[0].criteria.size());
    for (std::size_t i = 0; i < a.positions[0].criteria.size(); ++i)
        RC_ASSERT(relatively_near(a.positions[0].criteria[i].ratio, b.positions[0].criteria[i].ratio, 1e-11));
}

// A Gaussian stated by another definition of its width, converted by hand, is the same beam.
RC_GTEST_PROP(SameBeam, OtherWidthDefinitionsGiveTheSameRatios, ()) {
    dosimetry::Setup one = *any_setup();
    one.sources[0].beam.profile = Profile::gaussian;
    one.sources[0].beam.measured_at = WidthDefinition::one_over_e2;
    const auto [definition, factor] =
        *rc::gen::element(std::pair{WidthDefinition::one_over_e, std::sqrt(0.5)},
                          std::pair{WidthDefinition::enclosed_63, std::sqrt(0.5)},
                          std::pair{WidthDefinition::fwhm, std::sqrt(std::log(2.0) / 2)},
                          std::pair{WidthDefinition::d4sigma, 1.0});
    dosimetry::Setup other = one;
    BeamSetup& beam = other.sources[0].beam;
    beam.measured_at = definition;
    beam.waist = Stated<Length>(with_unit(beam.waist->value.in_si() * factor, "m"));
    beam.divergence = Stated<PlaneAngle>(with_unit(beam.divergence->value.in_si() * factor, "rad"));
    RC_ASSERT(relatively_near(assessed(one).positions[0].governing.ratio,
                              assessed(other).positions[0].governing.ratio, 1e-11));
}

RC_GTEST_PROP(SameBeam, AFileGivesTheSameAnswerAsTheSetup, ()) {
    const dosimetry::Setup setup = *any_setup();
    const dosimetry::Setup from_file =
        read_setup(write_setup(setup), "f.toml", LimitLibrary::embedded()).setup;
    const Assessment a = assessed(setup);
    const Assessment b = assessed(from_file);
    RC_ASSERT(a.positions[0].governing.ratio == b.positions[0].governing.ratio);
    RC_ASSERT(a.positions[0].permitted_exposure == b.positions[0].permitted_exposure);
    for (std::size_t i = 0; i < a.hazard_distances.size(); ++i)
        RC_ASSERT(a.hazard_distances[i].distance == b.hazard_distances[i].distance);
}

}  // namespace
}  // namespace dosimetry
