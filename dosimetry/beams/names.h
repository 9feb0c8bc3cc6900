#pragma once

#include <array>
#include <string_view>

#include "beams/circular_beam.h"

namespace dosimetry {

/// A choice as files write it and as people read it.
template <class Enum>
struct ChoiceName {
    Enum value;
    std::string_view in_files;
    std::string_view shown;
};

inline constexpr std::array profile_names{
    ChoiceName<Profile>{Profile::gaussian, "gaussian", "Gaussian"},
    ChoiceName<Profile>{Profile::top_hat, "top-hat", "top-hat"},
};

inline constexpr std::array width_names{
    ChoiceName<WidthDefinition>{WidthDefinition::one_over_e2, "1/e2", "1/e²"},
    ChoiceName<WidthDefinition>{WidthDefinition::one_over_e, "1/e", "1/e"},
    ChoiceName<WidthDefinition>{WidthDefinition::fwhm, "FWHM", "FWHM"},
    ChoiceName<WidthDefinition>{WidthDefinition::d4sigma, "D4sigma", "D4σ"},
    ChoiceName<WidthDefinition>{WidthDefinition::enclosed_63, "63%", "63 %"},
    ChoiceName<WidthDefinition>{WidthDefinition::enclosed_86, "86.5%", "86.5 %"},
};

template <class Enum, std::size_t N>
constexpr const ChoiceName<Enum>& name_of_choice(const std::array<ChoiceName<Enum>, N>& names, Enum value) {
    for (const auto& name : names)
        if (name.value == value) return name;
    return names.front();
}

/// The diameter a profile is described by: 1/e² for a Gaussian, the edge for a top-hat.
constexpr std::string_view reference_diameter_name(Profile profile) {
    return profile == Profile::gaussian ? "1/e² diameter" : "edge diameter";
}

}  // namespace dosimetry
