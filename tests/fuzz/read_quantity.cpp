// Any bytes as a value with a unit: read to a finite number, or refused.

#include <cmath>
#include <string_view>

#include "quantities/format.h"
#include "quantities/input_error.h"
#include "quantities/units.h"
#include "target.h"

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
    using namespace dosimetry;
    const void* bytes = data;
    const std::string_view text(static_cast<const char*>(bytes), size);
    for (DecimalMark mark : {DecimalMark::point, DecimalMark::point_or_comma}) {
        try {
            const ReadQuantity read = read_quantity(text, mark);
            require(std::isfinite(read.value_si));
            for (Rounding rounding : {Rounding::up, Rounding::down, Rounding::nearest})
                require(!format_quantity_si(read.value_si, read.dimension, 4, rounding).empty());
            require(!exact_quantity_si(read.value_si, read.dimension).empty());
            require(!name_of(read.dimension).empty());
        } catch (const InputError& error) {
            require(!error.sentence().empty());
        }
    }
    return 0;
}
