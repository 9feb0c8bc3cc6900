// What must hold whatever the numbers: more power, more time, a narrower beam never make a place safer.

#include "assessment/exposure.h"
#include "limits/limit_library.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::any_setup;
using testing_support::log_uniform;

const LimitSet& icnirp() {
    return *LimitLibrary::embedded().find("icnirp_2013_laser");
}

double worst_ratio(const Laser& laser, Length at, Duration exposure, Tissue tissue) {
    return largest_ratio(
        std::get<std::vector<Evaluated>>(evaluate(Arrival(laser, at), exposure, tissue, icnirp())));
}

Tissue any_tissue() {
    return *rc::gen::element(Tissue::eye, Tissue::skin);
}

// Between two edges the ratio never falls as the exposure grows: what the search for the longest one relies
// on.
RC_GTEST_PROP(Monotonic, RatioGrowsWithTheExposureBetweenEdges, ()) {
    const dosimetry::Setup setup = *any_setup();
    const Laser laser = make_laser(setup.sources[0]);
    const Length at = setup.positions[0].at.value;
    const Tissue tissue = any_tissue();
    const auto edges = icnirp().duration_edges(tissue, laser.wavelength, Arrival(laser, at).subtense());
    for (std::size_t i = 0; i + 1 < edges.size(); ++i) {
        const double from = edges[i].in_si();
        const double to = std::nextafter(edges[i + 1].in_si(), 0.0);
        double before = 0;
        constexpr int steps = 40;
        for (int k = 0; k <= steps; ++k) {
            // the start of an interval belongs to the rows that end there too, and may be stricter
            if (k == 0) continue;
            const double t = std::min(from * std::pow(to / from, static_cast<double>(k) / steps), to);
            const double ratio = worst_ratio(laser, at, seconds(t), tissue);
            RC_ASSERT(ratio >= before * (1 - 1e-12));
            before = ratio;
        }
    }
}

RC_GTEST_PROP(Monotonic, SharePassingGrowsWithTheAperture, ()) {
    const Laser laser = make_laser((*any_setup()).sources[0]);
    const Length at = metres(*log_uniform(1e-3, 1e4));
    const double small_m = *log_uniform(1e-6, 1);
    const double large_m = small_m * *log_uniform(1, 1e3);
    const double small = laser.beam.fraction_through(metres(small_m), at);
    const double large = laser.beam.fraction_through(metres(large_m), at);
    RC_ASSERT(small <= large);
    RC_ASSERT(small > 0);
    RC_ASSERT(large <= 1);
}

// Averaged over a larger aperture the irradiance falls, and it is never above that on the axis.
RC_GTEST_PROP(Monotonic, AveragedIrradianceFallsWithTheAperture, ()) {
    const Laser laser = make_laser((*any_setup()).sources[0]);
    const Arrival arrival(laser, metres(*log_uniform(1e-3, 1e4)));
    const double small_m = *log_uniform(1e-5, 1);
    const double large_m = small_m * *log_uniform(1, 1e3);
    RC_ASSERT(arrival.averaged_over(metres(large_m)) <= arrival.averaged_over(metres(small_m)) * (1 + 1e-12));
    RC_ASSERT(arrival.averaged_over(metres(small_m)) <= arrival.peak_irradiance() * (1 + 1e-12));
}

// Beyond the waist a small source is never more dangerous farther away.
RC_GTEST_PROP(Monotonic, RatioOfASmallSourceFallsBeyondTheWaist, ()) {
    dosimetry::Setup setup = *any_setup();
    setup.sources[0].apparent_source.reset();
    setup.sources[0].wavelength = Stated<Length>(testing_support::with_unit(*log_uniform(180, 1390), "nm"));
    const Laser laser = make_laser(setup.sources[0]);
    const double near_m = std::max(laser.beam.waist_at().in_si(), 0.0) + *log_uniform(1e-3, 1e3);
    const double far_m = near_m * *log_uniform(1, 1e3);
    const Tissue tissue = any_tissue();
    const Duration exposure = setup.positions[0].exposure.value;
    RC_ASSERT(worst_ratio(laser, metres(far_m), exposure, tissue) <=
              worst_ratio(laser, metres(near_m), exposure, tissue) * (1 + 1e-12));
}

// A wider source never has a lower retinal thermal limit.
RC_GTEST_PROP(Monotonic, ThermalLimitGrowsWithTheSubtense, ()) {
    const double nm = *log_uniform(400, 1399);
    const Duration exposure = seconds(*log_uniform(1e-13, 3e4));
    const auto limit = [&](double mrad) {
        const auto answer =
            icnirp().limits_for({Tissue::eye, nanometres(nm), exposure, milliradians(mrad), Area{}});
        double smallest = std::numeric_limits<double>::infinity();
        for (const Limit& l : std::get<std::vector<Limit>>(answer)) {
            if (l.row->effect != Effect::retinal_thermal) continue;
            const double si = std::visit([](auto v) { return v.in_si(); }, l.value);
            smallest = std::min(
                smallest, l.row->quantity == LimitQuantity::radiant_exposure ? si / exposure.in_si() : si);
        }
        return smallest;
    };
    const double small_mrad = *log_uniform(0.1, 100);
    const double large_mrad = small_mrad * *log_uniform(1, 31);  // no source is wider than π
    RC_ASSERT(limit(large_mrad) >= limit(small_mrad) * (1 - 1e-12));
}

}  // namespace
}  // namespace dosimetry
