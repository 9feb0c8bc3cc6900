// Any bytes as an assessment file: read or refused, never a crash; what is read can be written, read again
// and assessed.

#include <cmath>
#include <string_view>

#include "assessment/assessment.h"
#include "documents/result.h"
#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "target.h"

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
    using namespace dosimetry;
    const void* bytes = data;
    const LimitLibrary& library = LimitLibrary::embedded();
    SetupDocument document;
    try {
        document = read_setup({static_cast<const char*>(bytes), size}, "fuzz.toml", library);
    } catch (const InputError& error) {
        require(error.where().line > 0);
        require(error.what()[0] != '\0');
        return 0;
    }
    require(read_setup(write_setup(document.setup), "again.toml", library).setup == document.setup);
    const Assessment assessment = assess(document.setup, library, Trails::record);
    for (const PositionAssessment& position : assessment.positions)
        for (const Criterion& criterion : position.criteria)
            require(std::isfinite(criterion.ratio) && criterion.ratio >= 0);
    if (assessment.covered()) {
        require(!result_json(document.setup, assessment, document.sha256).empty());
        require(!report(document.setup, assessment).empty());
    }
    return 0;
}
