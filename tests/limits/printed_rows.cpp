#include "limits/printed_rows.h"

#include <cmath>
#include <limits>
#include <sstream>

namespace printed_rows {
namespace {

using dosimetry::Effect;
using dosimetry::LimitQuantity;
using dosimetry::Tissue;

enum ApertureRule { eye_ultraviolet, retina, anterior, eye_infrared, skin_rule };
enum Subtense { any, small, extended };

constexpr Tissue eye = Tissue::eye;
constexpr Tissue skin = Tissue::skin;
constexpr LimitQuantity H = LimitQuantity::radiant_exposure;  // J/m²
constexpr LimitQuantity E = LimitQuantity::irradiance;        // W/m²
constexpr LimitQuantity D = LimitQuantity::radiance_dose;     // J/(m² sr)
constexpr LimitQuantity L = LimitQuantity::radiance;          // W/(m² sr)
constexpr double T2 = -2;                                     // stands for the factor

struct Row {
    Tissue tissue;
    Effect effect;
    double nm_from, nm_to, s_from, s_to;
    Subtense subtense;
    LimitQuantity quantity;
    double coefficient, t_power;
    const char* factors;
    ApertureRule aperture;
};

// Where each number comes from:
//   M   from memory              M2  from memory, less certain
//   P1  from memory; the same number was read in the French Labour Code, Annexe II (transposes 2006/25/EC)
//   P2  from memory; the same formula was read in a reprint of the table of IEC TR 60825-14
//   P3  as P1, borrowed for the eye; the rule was read in the abstract of a corneal-threshold study (2019)
//   P4  from memory; the value at 10 s was read in the Spanish INSHT guide (2015), Table 8
//   P5  from memory; the rule for large areas applies with it
//
// Three readings differ from the notes on purpose:
//   - the borrowed anterior rows start at 1200 nm, not 1250 nm: the stricter of two publications;
//   - the eye is averaged over 1 mm in the ultraviolet for every duration: stricter than 3.5 mm from 10 s on;
//   - CC at exactly 1200 nm takes the lower of its two formulas.
// On an edge that two printed ranges share, either or both may hold; which, the program's table says and the
// tests of the boundaries check. NOLINTBEGIN
// clang-format off
const std::vector<Row> rows{
    // eye, ultraviolet thermal
    {eye, Effect::ultraviolet_thermal, 180, 400, 1e-13, 1e-9, any, E, 3e10, 0, "", eye_ultraviolet},  // P1
    // eye, ultraviolet photochemical
    {eye, Effect::ultraviolet_photochemical, 180, 303, 1e-9, 3e4, any, H, 30, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 303, 304, 1e-9, 3e4, any, H, 40, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 304, 305, 1e-9, 3e4, any, H, 60, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 305, 306, 1e-9, 3e4, any, H, 100, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 306, 307, 1e-9, 3e4, any, H, 160, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 307, 308, 1e-9, 3e4, any, H, 250, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 308, 309, 1e-9, 3e4, any, H, 400, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 309, 310, 1e-9, 3e4, any, H, 630, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 310, 311, 1e-9, 3e4, any, H, 1000, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 311, 312, 1e-9, 3e4, any, H, 1600, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 312, 313, 1e-9, 3e4, any, H, 2500, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 313, 314, 1e-9, 3e4, any, H, 4000, 0, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_photochemical, 314, 315, 1e-9, 3e4, any, H, 6300, 0, "", eye_ultraviolet},  // P1
    // eye, ultraviolet thermal
    {eye, Effect::ultraviolet_thermal, 302, 315, 1e-9, 10, any, H, 5600, 0.25, "", eye_ultraviolet},  // P1
    {eye, Effect::ultraviolet_thermal, 315, 400, 1e-9, 10, any, H, 5600, 0.25, "", eye_ultraviolet},  // P1
    // eye, ultraviolet photochemical
    {eye, Effect::ultraviolet_photochemical, 315, 400, 10, 3e4, any, H, 1e4, 0, "", eye_ultraviolet},  // M
    // skin, ultraviolet thermal
    {skin, Effect::ultraviolet_thermal, 180, 400, 1e-13, 1e-9, any, E, 3e10, 0, "", skin_rule},  // P1
    // skin, ultraviolet photochemical
    {skin, Effect::ultraviolet_photochemical, 180, 303, 1e-9, 3e4, any, H, 30, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 303, 304, 1e-9, 3e4, any, H, 40, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 304, 305, 1e-9, 3e4, any, H, 60, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 305, 306, 1e-9, 3e4, any, H, 100, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 306, 307, 1e-9, 3e4, any, H, 160, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 307, 308, 1e-9, 3e4, any, H, 250, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 308, 309, 1e-9, 3e4, any, H, 400, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 309, 310, 1e-9, 3e4, any, H, 630, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 310, 311, 1e-9, 3e4, any, H, 1000, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 311, 312, 1e-9, 3e4, any, H, 1600, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 312, 313, 1e-9, 3e4, any, H, 2500, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 313, 314, 1e-9, 3e4, any, H, 4000, 0, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_photochemical, 314, 315, 1e-9, 3e4, any, H, 6300, 0, "", skin_rule},  // P1
    // skin, ultraviolet thermal
    {skin, Effect::ultraviolet_thermal, 302, 315, 1e-9, 10, any, H, 5600, 0.25, "", skin_rule},  // P1
    {skin, Effect::ultraviolet_thermal, 315, 400, 1e-9, 10, any, H, 5600, 0.25, "", skin_rule},  // P1
    // skin, ultraviolet photochemical
    {skin, Effect::ultraviolet_photochemical, 315, 400, 10, 3e4, any, H, 1e4, 0, "", skin_rule},  // M
    // eye, retinal thermal
    {eye, Effect::retinal_thermal, 400, 700, 1e-13, 1e-11, any, H, 1e-3, 0, "CE", retina},  // M
    {eye, Effect::retinal_thermal, 400, 700, 1e-11, 5e-6, any, H, 2e-3, 0, "CE", retina},  // M
    {eye, Effect::retinal_thermal, 400, 700, 5e-6, 10, any, H, 18, 0.75, "CE", retina},  // P2
    {eye, Effect::retinal_thermal, 700, 1050, 1e-13, 1e-11, any, H, 1e-3, 0, "CE", retina},  // M2
    {eye, Effect::retinal_thermal, 700, 1050, 1e-11, 5e-6, any, H, 2e-3, 0, "CA CE", retina},  // M
    {eye, Effect::retinal_thermal, 700, 1050, 5e-6, 10, any, H, 18, 0.75, "CA CE", retina},  // P2
    {eye, Effect::retinal_thermal, 1050, 1400, 1e-13, 1e-11, any, H, 1e-3, 0, "CC CE", retina},  // M2
    {eye, Effect::retinal_thermal, 1050, 1400, 1e-11, 1.3e-5, any, H, 2e-2, 0, "CC CE", retina},  // M
    {eye, Effect::retinal_thermal, 1050, 1400, 1.3e-5, 10, any, H, 90, 0.75, "CC CE", retina},  // P2
    {eye, Effect::retinal_thermal, 400, 700, 10, 3e4, small, E, 10, 0, "", retina},  // P2
    {eye, Effect::retinal_thermal, 400, 700, 10, T2, extended, H, 18, 0.75, "CE", retina},  // P2
    {eye, Effect::retinal_thermal, 400, 700, T2, 3e4, extended, E, 18, 0, "CE T2^-0.25", retina},  // P2
    {eye, Effect::retinal_thermal, 700, 1400, 10, 3e4, small, E, 10, 0, "CA CC", retina},  // M
    {eye, Effect::retinal_thermal, 700, 1400, 10, T2, extended, H, 18, 0.75, "CA CC CE", retina},  // M
    {eye, Effect::retinal_thermal, 700, 1400, T2, 3e4, extended, E, 18, 0, "CA CC CE T2^-0.25", retina},  // M
    // eye, retinal photochemical
    {eye, Effect::retinal_photochemical, 400, 600, 10, 100, any, H, 100, 0, "CB", retina},  // P2
    {eye, Effect::retinal_photochemical, 400, 600, 100, 1e4, any, E, 1, 0, "CB", retina},  // P2
    {eye, Effect::retinal_photochemical, 400, 600, 1e4, 3e4, any, E, 1, 0, "CB", retina},  // P2
    {eye, Effect::retinal_photochemical, 400, 600, 10, 1e4, any, D, 1e6, 0, "CB", retina},  // M
    {eye, Effect::retinal_photochemical, 400, 600, 1e4, 3e4, any, L, 100, 0, "CB", retina},  // M
    // eye, anterior thermal
    {eye, Effect::anterior_thermal, 1200, 1400, 1e-9, 1e-7, any, H, 200, 0, "CA", anterior},  // P3
    {eye, Effect::anterior_thermal, 1200, 1400, 1e-7, 10, any, H, 11000, 0.25, "CA", anterior},  // P3
    {eye, Effect::anterior_thermal, 1200, 1400, 10, 3e4, any, E, 2000, 0, "CA", anterior},  // P3
    {eye, Effect::anterior_thermal, 1200, 1400, 1e-13, 1e-9, any, E, 2e11, 0, "CA", anterior},  // P3
    // eye, corneal thermal
    {eye, Effect::anterior_thermal, 1400, 1500, 1e-13, 1e-9, any, E, 1e12, 0, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 1400, 1500, 1e-9, 1e-3, any, H, 1000, 0, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 1400, 1500, 1e-3, 10, any, H, 5600, 0.25, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 1400, 1500, 10, 3e4, any, E, 1000, 0, "", eye_infrared},  // P4
    {eye, Effect::anterior_thermal, 1500, 1800, 1e-13, 1e-9, any, E, 1e13, 0, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 1500, 1800, 1e-9, 10, any, H, 1e4, 0, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 1500, 1800, 10, 3e4, any, E, 1000, 0, "", eye_infrared},  // P4
    {eye, Effect::anterior_thermal, 1800, 2600, 1e-13, 1e-9, any, E, 1e12, 0, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 1800, 2600, 1e-9, 1e-3, any, H, 1000, 0, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 1800, 2600, 1e-3, 10, any, H, 5600, 0.25, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 1800, 2600, 10, 3e4, any, E, 1000, 0, "", eye_infrared},  // P4
    {eye, Effect::anterior_thermal, 2600, 1e6, 1e-13, 1e-9, any, E, 1e11, 0, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 2600, 1e6, 1e-9, 1e-7, any, H, 100, 0, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 2600, 1e6, 1e-7, 10, any, H, 5600, 0.25, "", eye_infrared},  // P1
    {eye, Effect::anterior_thermal, 2600, 1e6, 10, 3e4, any, E, 1000, 0, "", eye_infrared},  // P4
    // skin, skin thermal
    {skin, Effect::skin_thermal, 400, 700, 1e-13, 1e-9, any, E, 2e11, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 700, 1400, 1e-13, 1e-9, any, E, 2e11, 0, "CA", skin_rule},  // P1
    {skin, Effect::skin_thermal, 400, 1400, 1e-9, 1e-7, any, H, 200, 0, "CA", skin_rule},  // P1
    {skin, Effect::skin_thermal, 400, 1400, 1e-7, 10, any, H, 11000, 0.25, "CA", skin_rule},  // P1
    {skin, Effect::skin_thermal, 400, 1400, 10, 3e4, any, E, 2000, 0, "CA", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1400, 1500, 1e-13, 1e-9, any, E, 1e12, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1400, 1500, 1e-9, 1e-3, any, H, 1000, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1400, 1500, 1e-3, 10, any, H, 5600, 0.25, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1400, 1500, 10, 3e4, any, E, 1000, 0, "", skin_rule},  // P5
    {skin, Effect::skin_thermal, 1500, 1800, 1e-13, 1e-9, any, E, 1e13, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1500, 1800, 1e-9, 10, any, H, 1e4, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1500, 1800, 10, 3e4, any, E, 1000, 0, "", skin_rule},  // P5
    {skin, Effect::skin_thermal, 1800, 2600, 1e-13, 1e-9, any, E, 1e12, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1800, 2600, 1e-9, 1e-3, any, H, 1000, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1800, 2600, 1e-3, 10, any, H, 5600, 0.25, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 1800, 2600, 10, 3e4, any, E, 1000, 0, "", skin_rule},  // P5
    {skin, Effect::skin_thermal, 2600, 1e6, 1e-13, 1e-9, any, E, 1e11, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 2600, 1e6, 1e-9, 1e-7, any, H, 100, 0, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 2600, 1e6, 1e-7, 10, any, H, 5600, 0.25, "", skin_rule},  // P1
    {skin, Effect::skin_thermal, 2600, 1e6, 10, 3e4, any, E, 1000, 0, "", skin_rule},  // P5
};
// clang-format on
// NOLINTEND

constexpr double edition_nm_to = 1e6;
constexpr double edition_s_to = 3e4;

bool within(double x, double from, double to, bool end_included) {
    return x >= from && (x < to || (end_included && x == to));
}

double end_s(double s, double alpha_mrad) {
    return s == T2 ? factor("T2", 0, 0, alpha_mrad) : s;
}

bool holds(const Row& row, double nm, double t_s, double alpha_mrad, Ends ends) {
    if (row.subtense == small && alpha_mrad > 1.5) return false;
    if (row.subtense == extended && !(alpha_mrad > 1.5)) return false;
    const bool both = ends == Ends::both;
    return within(nm, row.nm_from, row.nm_to, both || row.nm_to == edition_nm_to) &&
           within(t_s, end_s(row.s_from, alpha_mrad), end_s(row.s_to, alpha_mrad),
                  both || row.s_to == edition_s_to);
}

double aperture_mm(ApertureRule rule, double nm, double t_s) {
    switch (rule) {
        case eye_ultraviolet:
            return 1;
        case retina:
            return 7;
        case anterior:
            return 3.5;
        case skin_rule:
            return nm < 1e5 ? 3.5 : 11;
        case eye_infrared:
            break;
    }
    if (nm >= 1e5) return 11;
    if (t_s < 0.35) return 1;
    return t_s < 10 ? 1.5 * std::pow(t_s, 0.375) : 3.5;
}

/// 1000 W/m² up to 0.01 m² of skin, 10/A W/m² beyond, 100 W/m² from 0.1 m²: above 1400 nm, from 10 s.
double large_area(const Row& row, double area_m2) {
    if (row.tissue != skin || row.nm_from < 1400 || row.s_from != 10 || area_m2 <= 0.01) return 1;
    return area_m2 < 0.1 ? 0.01 / area_m2 : 0.1;
}

Value value_of(const Row& row, double nm, double t_s, double alpha_mrad, double area_m2) {
    double si = row.coefficient * std::pow(t_s, row.t_power) * large_area(row, area_m2);
    std::istringstream symbols(row.factors);
    for (std::string symbol; symbols >> symbol;)
        si *= symbol == "T2^-0.25" ? std::pow(factor("T2", nm, t_s, alpha_mrad), -0.25)
                                   : factor(symbol, nm, t_s, alpha_mrad);
    return {row.effect, row.quantity, si, aperture_mm(row.aperture, nm, t_s)};
}

}  // namespace

double factor(const std::string& symbol, double nm, double t_s, double alpha_mrad) {
    if (symbol == "CA") return nm < 700 ? 1 : nm < 1050 ? std::pow(10, (nm - 700) / 500) : 5;
    if (symbol == "CB") return nm < 450 ? 1 : std::pow(10, (nm - 450) / 50);
    if (symbol == "CC") {
        if (nm < 1150) return 1;
        return nm <= 1200 ? std::pow(10, 0.018 * (nm - 1150)) : 8 + std::pow(10, 0.04 * (nm - 1250));
    }
    if (symbol == "T2")
        return alpha_mrad <= 1.5 ? 10 : alpha_mrad < 100 ? 10 * std::pow(10, (alpha_mrad - 1.5) / 98.5) : 100;
    if (symbol == "alpha_max") return t_s < 625e-6 ? 5 : t_s < 0.25 ? 200 * std::sqrt(t_s) : 100;
    if (symbol == "CE") {
        const double largest = factor("alpha_max", nm, t_s, alpha_mrad);
        if (alpha_mrad <= 1.5) return 1;
        return alpha_mrad <= largest ? alpha_mrad / 1.5 : alpha_mrad * alpha_mrad / (1.5 * largest);
    }
    if (symbol == "gamma_ph") return t_s < 100 ? 11 : t_s < 1e4 ? 1.1 * std::sqrt(t_s) : 110;
    return std::numeric_limits<double>::quiet_NaN();
}

std::vector<Value> limits_at(Tissue tissue, double nm, double t_s, double alpha_mrad, double area_m2,
                             Ends ends) {
    std::vector<Value> values;
    for (const Row& row : rows)
        if (row.tissue == tissue && holds(row, nm, t_s, alpha_mrad, ends))
            values.push_back(value_of(row, nm, t_s, alpha_mrad, area_m2));
    return values;
}

std::vector<Inside> one_point_in_each_row() {
    std::vector<Inside> points;
    for (std::size_t i = 0; i < rows.size(); ++i) {
        const Row& row = rows[i];
        const double alpha_mrad = row.subtense == extended ? 20 : 1;
        Inside p{static_cast<int>(i),
                 row.tissue,
                 std::round(std::sqrt(row.nm_from * row.nm_to)),
                 std::sqrt(end_s(row.s_from, alpha_mrad) * end_s(row.s_to, alpha_mrad)),
                 alpha_mrad,
                 {}};
        p.value = value_of(row, p.nm, p.t_s, p.alpha_mrad, 1e-6);
        points.push_back(p);
    }
    return points;
}

const std::vector<double> wavelength_breaks_nm{180,  302,  303,  304,  305,  306,  307, 308, 309, 310,
                                               311,  312,  313,  314,  315,  400,  450, 600, 700, 1050,
                                               1150, 1200, 1400, 1500, 1800, 2600, 1e5, 1e6};
const std::vector<double> duration_breaks_s{1e-13, 1e-11, 1e-9, 1e-7, 5e-6, 13e-6, 625e-6,
                                            1e-3,  0.25,  0.35, 10,   100,  1e4,   3e4};
const std::vector<double> subtense_breaks_mrad{1.5, 5, 100};
const std::vector<double> area_breaks_m2{0.01, 0.1};

}  // namespace printed_rows
