// The core: a limit query, a complete assessment, reading a file, the hazard distance of an extended source.

#include <benchmark/benchmark.h>

#include "assessment/assessment.h"
#include "assessment/search.h"
#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "support/setups.h"

namespace {

using namespace dosimetry;
using testing_support::green_setup;

const LimitLibrary& library() {
    return LimitLibrary::embedded();
}
const LimitSet& icnirp() {
    return *library().find("icnirp_2013_laser");
}

void limit_query(benchmark::State& state) {
    const LimitQuery query{Tissue::eye, nanometres(532), seconds(0.25), radians(0), Area{}};
    for (auto _ : state) benchmark::DoNotOptimize(icnirp().limits_for(query));
}

void limit_query_extended_source(benchmark::State& state) {
    const LimitQuery query{Tissue::eye, nanometres(450), seconds(100), milliradians(20), Area{}};
    for (auto _ : state) benchmark::DoNotOptimize(icnirp().limits_for(query));
}

/// One source, one position, eye and skin: ratios, permitted exposure, both hazard distances.
void assessment(benchmark::State& state, Trails trails) {
    const Setup setup = green_setup();
    for (auto _ : state) benchmark::DoNotOptimize(assess(setup, library(), trails));
}

void assessment_extended_source(benchmark::State& state) {
    Setup setup = green_setup();
    setup.sources[0].apparent_source = Stated<Length>("3 mm");
    for (auto _ : state) benchmark::DoNotOptimize(assess(setup, library(), Trails::off));
}

void read_file(benchmark::State& state) {
    const std::string text = write_setup(green_setup());
    for (auto _ : state) benchmark::DoNotOptimize(read_setup(text, "bench.toml", library()));
}

void hazard_distance_extended_source(benchmark::State& state) {
    LaserSetup stated = testing_support::green_laser();
    stated.apparent_source = Stated<Length>("3 mm");
    const Laser laser = make_laser(stated);
    for (auto _ : state)
        benchmark::DoNotOptimize(outer_edge(nearest_search, farthest_search,
                                            bends_along_beam(laser, icnirp(), Tissue::eye, seconds(0.25)),
                                            ratio_along_beam(laser, icnirp(), Tissue::eye, seconds(0.25))));
}

BENCHMARK(limit_query);
BENCHMARK(limit_query_extended_source);
BENCHMARK_CAPTURE(assessment, trails_off, Trails::off);
BENCHMARK_CAPTURE(assessment, trails_recorded, Trails::record);
BENCHMARK(assessment_extended_source);
BENCHMARK(read_file);
BENCHMARK(hazard_distance_extended_source);

}  // namespace
