#pragma once

#include <optional>
#include <string>
#include <vector>

#include "limits/formula.h"

/// The parts of an edition as its table file states them, with the file's own plain numbers: wavelengths in
/// nm, durations in s, subtenses in mrad, areas in m². See limits_tables/README.md for their meaning.
namespace dosimetry {

enum class Tissue { eye, skin };

enum class Effect {
    retinal_thermal,
    retinal_photochemical,
    anterior_thermal,
    ultraviolet_photochemical,
    ultraviolet_thermal,
    skin_thermal,
};

std::string name_of(Tissue tissue);
std::string name_of(Effect effect);
/// Both in one: "eye, retinal thermal", "skin, thermal".
std::string name_of(Tissue tissue, Effect effect);

enum class LimitQuantity { irradiance, radiant_exposure, radiance, radiance_dose };

/// An end of a range: a number, or the value of a factor (T2, alpha_max).
struct Bound {
    double number = 0.0;
    std::optional<std::size_t> factor;
};

struct FactorPiece {
    Bound from;
    Bound to;
    bool end_included = false;
    Formula value;
};

struct Factor {
    std::string symbol;
    std::string meaning;
    std::string over;  ///< wavelength_nm, t_s, alpha_mrad or area_m2
    std::size_t variable = 0;
    std::vector<FactorPiece> pieces;
    std::string clause;
    std::string provenance;
    std::string note;
};

struct AperturePiece {
    double nm_from = 0, nm_to = 0, s_from = 0, s_to = 0;
    Formula diameter_mm;
};

struct Aperture {
    std::string id;
    std::vector<AperturePiece> pieces;
    std::string clause;
    std::string provenance;
};

struct FactorPower {
    std::size_t factor = 0;
    double power = 1.0;
};

/// One row of the published table.
struct LimitRow {
    Tissue tissue{};
    Effect effect{};
    double nm_from = 0, nm_to = 0;
    bool nm_end_included = false;
    Bound s_from, s_to;
    bool s_end_included = false;
    double alpha_from_mrad = 0, alpha_to_mrad = 0;  ///< (from, to]; from 0 takes all
    LimitQuantity quantity{};
    double coefficient = 0;
    double t_power = 0;
    std::vector<FactorPower> factors;
    std::size_t aperture = 0;
    std::optional<std::size_t> acceptance;  ///< factor that gives the acceptance angle in mrad
    bool alternative_form = false;          ///< an equivalent form of other rows, not a further limit
    bool depends_on_subtense = false;       ///< so its value changes with the distance
    bool depends_on_area = false;
    std::string clause;
    std::string provenance;
    std::string note;
    int line = 0;  ///< where it stands in the table file
};

struct Edition {
    std::string id;
    std::string issuer;
    std::string title;
    std::string published_in;
    int year = 0;
    std::string status;
    bool text_read = false;
    std::string text_note;
    double nm_from = 0, nm_to = 0, s_from = 0, s_to = 0;
    std::string sha256;
};

}  // namespace dosimetry
