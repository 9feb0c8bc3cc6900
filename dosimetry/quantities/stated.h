#pragma once

#include <string>
#include <utility>

#include "quantities/units.h"

namespace dosimetry {

/// A quantity together with the text that stated it. The text is what files, fields and sheets show again;
/// two statements are equal only if their texts are too.
template <class Q>
struct Stated {
    std::string text;
    Q value;

    Stated() = default;
    /// Reads the text; throws InputError as `parse` does.
    explicit Stated(std::string given, DecimalMark mark = DecimalMark::point)
        : text(std::move(given)), value(parse<Q>(text, mark)) {}
    friend bool operator==(const Stated&, const Stated&) = default;
};

/// Throws InputError unless lowest ≤ value ≤ highest (SI; not-a-number fails too). The accepted range is
/// given to the reader in the two texts.
void require_between(double value_si, const std::string& text, double lowest_si, double highest_si,
                     const std::string& meaning, const std::string& range_text, const std::string& key);

template <class Q>
void require_between(const Stated<Q>& stated, const char* lowest, const char* highest,
                     const std::string& meaning, const std::string& key) {
    require_between(stated.value.in_si(), stated.text, parse<Q>(lowest).in_si(), parse<Q>(highest).in_si(),
                    meaning, std::string("from ") + lowest + " to " + highest, key);
}

}  // namespace dosimetry
