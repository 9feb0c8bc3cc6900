#include "assessment/setup.h"

#include <algorithm>
#include <set>

#include "limits/limit_library.h"
#include "quantities/input_error.h"

namespace dosimetry {
namespace {

void check_limits(const Setup& setup, const LimitLibrary& library) {
    const std::string key = "assessment.limits";
    if (setup.limits.empty()) throw InputError("no edition of exposure limits is chosen", library.ids(), key);
    std::set<std::string> seen;
    for (const std::string& id : setup.limits) {
        if (!library.find(id))
            throw InputError("the limit set " + quoted(id) + " is not part of this version", library.ids(),
                             key);
        if (!seen.insert(id).second)
            throw InputError("the limit set " + quoted(id) + " is named twice", library.ids(), key);
    }
}

}  // namespace

void check(const Setup& setup, const LimitLibrary& library) {
    check_limits(setup, library);
    if (setup.sources.empty()) throw InputError("there is no source", "one [[source]]", "source");
    if (setup.sources.size() > 1)
        throw InputError("there are " + std::to_string(setup.sources.size()) +
                             " sources; adding up several is not part of this version",
                         "one [[source]]", "source[1]");
    for (std::size_t i = 0; i < setup.sources.size(); ++i)
        check(setup.sources[i], "source[" + std::to_string(i) + "]");

    if (setup.positions.empty())
        throw InputError("there is no position", "at least one [[position]]", "position");
    std::set<std::string> ids;
    for (std::size_t i = 0; i < setup.positions.size(); ++i) {
        const PositionSetup& p = setup.positions[i];
        const std::string key = "position[" + std::to_string(i) + "]";
        if (!ids.insert(p.id).second)
            throw InputError("two positions are called " + quoted(p.id), "a different id for each position",
                             key + ".id");
        require_between(p.at, "1 um", "1000 km", "the distance of a position", key + ".at");
        require_between(p.exposure, "1e-18 s", "1e12 s", "the exposure", key + ".exposure");
        if (!p.eye && !p.skin)
            throw InputError("no tissue is named", "\"eye\", \"skin\" or both", key + ".tissues");
    }
}

}  // namespace dosimetry
