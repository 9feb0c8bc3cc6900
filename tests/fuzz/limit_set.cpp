// Any bytes as a limit table: read or refused; what is read answers every question inside its range with
// finite numbers.

#include "limits/limit_set.h"

#include <cmath>
#include <string_view>

#include "quantities/input_error.h"
#include "target.h"

namespace {

using namespace dosimetry;

void query_everywhere(const LimitSet& set) {
    const Edition& e = set.edition();
    constexpr int steps = 7;
    for (Tissue tissue : {Tissue::eye, Tissue::skin})
        for (int i = 0; i <= steps; ++i)
            for (int j = 0; j <= steps; ++j)
                for (double mrad : {0.0, 1.5, 20.0, 3000.0})
                    for (double m2 : {0.0, 0.05}) {
                        const double nm =
                            e.nm_from * std::pow(e.nm_to / e.nm_from, static_cast<double>(i) / steps);
                        const double s =
                            e.s_from * std::pow(e.s_to / e.s_from, static_cast<double>(j) / steps);
                        const LimitQuery query{tissue, nanometres(nm), seconds(s), milliradians(mrad),
                                               Area::from_si(m2)};
                        const auto answer = set.limits_for(query);
                        if (const auto* limits = std::get_if<std::vector<Limit>>(&answer))
                            for (const Limit& limit : *limits)
                                require(!set.derivation(*limit.row, query).empty());
                        require(set.duration_edges(tissue, query.wavelength, query.subtense).size() >= 2);
                    }
}

}  // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
    const void* bytes = data;
    try {
        query_everywhere(LimitSet::read({static_cast<const char*>(bytes), size}, "fuzz.toml"));
    } catch (const InputError&) {
    }
    return 0;
}
