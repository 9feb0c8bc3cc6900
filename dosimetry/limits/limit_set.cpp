#include "limits/limit_set.h"

#include <algorithm>
#include <cassert>
#include <cmath>
#include <limits>

#include "quantities/format.h"
#include "quantities/input_error.h"

namespace dosimetry {
namespace {

constexpr std::size_t variable_count = 4;
enum Variable : std::size_t { wavelength_nm = 0, t_s = 1, alpha_mrad = 2, area_m2 = 3 };

/// Also for values that are no finite numbers.
template <class Q>
std::string shown(Q quantity, const char* unit) {
    return std::isfinite(quantity.in_si()) ? format_round(quantity) : shortest(quantity.in_si()) + " " + unit;
}

bool within(double value, double from, double to, bool end_included) {
    return value >= from && (value < to || (end_included && value == to));
}

LimitValue as_quantity(LimitQuantity quantity, double value_si) {
    switch (quantity) {
        case LimitQuantity::irradiance:
            return Irradiance::from_si(value_si);
        case LimitQuantity::radiant_exposure:
            return RadiantExposure::from_si(value_si);
        case LimitQuantity::radiance:
            return Radiance::from_si(value_si);
        case LimitQuantity::radiance_dose:
            break;
    }
    return RadianceDose::from_si(value_si);
}

bool is_retinal(Effect effect) {
    return effect == Effect::retinal_thermal || effect == Effect::retinal_photochemical;
}

}  // namespace

std::string name_of(Tissue tissue) {
    return tissue == Tissue::eye ? "eye" : "skin";
}

std::string name_of(Effect effect) {
    switch (effect) {
        case Effect::retinal_thermal:
            return "retinal thermal";
        case Effect::retinal_photochemical:
            return "retinal photochemical";
        case Effect::anterior_thermal:
            return "anterior thermal";
        case Effect::ultraviolet_photochemical:
            return "ultraviolet photochemical";
        case Effect::ultraviolet_thermal:
            return "ultraviolet thermal";
        case Effect::skin_thermal:
            break;
    }
    return "skin thermal";
}

std::string name_of(Tissue tissue, Effect effect) {
    return name_of(tissue) + ", " + (effect == Effect::skin_thermal ? "thermal" : name_of(effect));
}

std::string unit_of(LimitQuantity quantity) {
    switch (quantity) {
        case LimitQuantity::irradiance:
            return si_unit(Irradiance::dimension);
        case LimitQuantity::radiant_exposure:
            return si_unit(RadiantExposure::dimension);
        case LimitQuantity::radiance:
            return si_unit(Radiance::dimension);
        case LimitQuantity::radiance_dose:
            break;
    }
    return si_unit(RadianceDose::dimension);
}

std::string name_of(LimitQuantity quantity) {
    switch (quantity) {
        case LimitQuantity::irradiance:
            return "irradiance";
        case LimitQuantity::radiant_exposure:
            return "radiant exposure";
        case LimitQuantity::radiance:
            return "radiance";
        case LimitQuantity::radiance_dose:
            break;
    }
    return "radiance dose";
}

std::vector<double> LimitSet::variables_for(double nm, double seconds_, double mrad, double m2) const {
    std::vector<double> values(names_.size(), std::numeric_limits<double>::quiet_NaN());
    values[wavelength_nm] = nm;
    values[t_s] = seconds_;
    values[alpha_mrad] = mrad;
    values[area_m2] = m2;
    return values;
}

const FactorPiece& LimitSet::piece_of(const Factor& factor, std::vector<double>& values) const {
    const double x = values[factor.variable];
    const bool last_included = factor.variable == alpha_mrad || factor.variable == area_m2;
    const FactorPiece* found = nullptr;  // a piece that ends exactly at x serves rows whose end is included
    for (const FactorPiece& piece : factor.pieces) {
        const double from = bound_value(piece.from, values);
        const double to = bound_value(piece.to, values);
        const bool inside = last_included ? x > from && x <= to : within(x, from, to, piece.end_included);
        if (inside || x == to) found = &piece;
        if (inside) break;
    }
    if (!found)
        throw InputError(
            "the factor " + factor.symbol + " has no value for " + factor.over + " = " + shortest(x),
            "pieces whose ends are numbers");
    return *found;
}

/// Computed when first asked for, NaN standing for "not yet". The reader has made sure that each factor a row
/// uses is defined over the whole row.
double LimitSet::factor_value(std::size_t index, std::vector<double>& values) const {
    double& slot = values[variable_count + index];
    if (!std::isnan(slot)) return slot;
    const FactorPiece& piece = piece_of(factors_[index], values);
    for (std::size_t used : piece.value.used())
        if (used >= variable_count) factor_value(used - variable_count, values);
    slot = piece.value.value(values);
    return slot;
}

double LimitSet::bound_value(const Bound& bound, std::vector<double>& values) const {
    return bound.factor ? factor_value(*bound.factor, values) : bound.number;
}

bool LimitSet::applies(const LimitRow& row, std::vector<double>& values) const {
    if (!within(values[wavelength_nm], row.nm_from, row.nm_to, row.nm_end_included)) return false;
    if (!(row.alpha_from_mrad == 0.0 || values[alpha_mrad] > row.alpha_from_mrad)) return false;
    if (values[alpha_mrad] > row.alpha_to_mrad) return false;
    return within(values[t_s], bound_value(row.s_from, values), bound_value(row.s_to, values),
                  row.s_end_included);
}

const AperturePiece& LimitSet::aperture_piece(const Aperture& aperture, double nm, double seconds_) const {
    const AperturePiece* found = nullptr;
    for (const AperturePiece& piece : aperture.pieces) {
        if (!within(nm, piece.nm_from, piece.nm_to, true) ||
            !within(seconds_, piece.s_from, piece.s_to, false))
            continue;
        found = &piece;
        if (nm < piece.nm_to) break;  // at a shared edge the piece that starts there goes first
    }
    assert(found);
    return *found;
}

double LimitSet::row_value(const LimitRow& row, std::vector<double>& values) const {
    double value_si = row.coefficient;
    if (row.t_power != 0.0) value_si *= std::pow(values[t_s], row.t_power);
    for (const FactorPower& f : row.factors) {
        const double factor = factor_value(f.factor, values);
        value_si *= f.power == 1.0 ? factor : std::pow(factor, f.power);
    }
    return value_si;
}

double LimitSet::aperture_mm(const LimitRow& row, const std::vector<double>& values) const {
    return aperture_piece(apertures_[row.aperture], values[wavelength_nm], values[t_s])
        .diameter_mm.value(values);
}

std::variant<std::vector<Limit>, NotCovered> LimitSet::limits_for(const LimitQuery& query) const {
    const double nm = in_nanometres(query.wavelength);
    const double t = query.exposure.in_si();
    if (!(nm >= edition_.nm_from && nm <= edition_.nm_to))
        return NotCovered{"wavelength", "the wavelength " + shown(query.wavelength, "m") +
                                            " is not covered by " + edition_.id + ", which goes from " +
                                            format_round(nanometres(edition_.nm_from)) + " to " +
                                            format_round(nanometres(edition_.nm_to))};
    if (!(t >= edition_.s_from && t <= edition_.s_to))
        return NotCovered{"exposure", "an exposure of " + shown(query.exposure, "s") + " is not covered by " +
                                          edition_.id + ", which goes from " +
                                          format_round(seconds(edition_.s_from)) + " to " +
                                          format_round(seconds(edition_.s_to))};

    std::vector<double> values =
        variables_for(nm, t, query.subtense.in_si() * 1e3, query.exposed_area.in_si());
    std::vector<Limit> limits;
    for (const LimitRow& row : rows_) {
        if (row.tissue != query.tissue || !applies(row, values)) continue;
        Limit limit;
        limit.row = &row;
        limit.value = as_quantity(row.quantity, row_value(row, values));
        limit.aperture = millimetres(aperture_mm(row, values));
        if (is_retinal(row.effect)) {
            limit.subtense = query.subtense;
            if (alpha_min_)
                limit.subtense = std::max(limit.subtense, milliradians(factor_value(*alpha_min_, values)));
        }
        if (row.acceptance) limit.acceptance = milliradians(factor_value(*row.acceptance, values));
        limits.push_back(limit);
    }
    assert(!limits.empty());  // the reader refuses tables with gaps
    return limits;
}

std::vector<FactorStep> LimitSet::derivation(const LimitRow& row, const LimitQuery& query) const {
    const double nm = in_nanometres(query.wavelength);
    const double t = query.exposure.in_si();
    std::vector<double> values =
        variables_for(nm, t, query.subtense.in_si() * 1e3, query.exposed_area.in_si());
    std::vector<FactorStep> steps;
    std::vector<std::size_t> done;

    // A factor comes after the factors its formula uses.
    const auto add = [&](const auto& self, std::size_t index) -> void {
        if (std::find(done.begin(), done.end(), index) != done.end()) return;
        done.push_back(index);
        const Factor& factor = factors_[index];
        const double value = factor_value(index, values);
        const FactorPiece& piece = piece_of(factor, values);
        for (std::size_t used : piece.value.used())
            if (used >= variable_count) self(self, used - variable_count);
        const std::string numbers = piece.value.with_numbers(names_, values);
        steps.push_back({factor.symbol, factor.meaning, pretty_formula(piece.value.text()), numbers, value,
                         "", factor.clause, factor.provenance});
    };
    for (const Bound& bound : {row.s_from, row.s_to})
        if (bound.factor) add(add, *bound.factor);
    for (const FactorPower& f : row.factors) add(add, f.factor);
    if (row.acceptance) add(add, *row.acceptance);

    const Aperture& aperture = apertures_[row.aperture];
    const AperturePiece& piece = aperture_piece(aperture, nm, t);
    steps.push_back({"a", "diameter of the limiting aperture", pretty_formula(piece.diameter_mm.text()),
                     piece.diameter_mm.with_numbers(names_, values), piece.diameter_mm.value(values), "mm",
                     aperture.clause, aperture.provenance});
    return steps;
}

std::vector<Duration> LimitSet::duration_edges(Tissue tissue, Length wavelength, PlaneAngle subtense) const {
    const double nm = in_nanometres(wavelength);
    std::vector<double> edges_s{edition_.s_from, edition_.s_to};
    const auto add = [&](double s) {
        if (s > edition_.s_from && s < edition_.s_to) edges_s.push_back(s);
    };
    for (const LimitRow& row : rows_) {
        if (row.tissue != tissue || !within(nm, row.nm_from, row.nm_to, row.nm_end_included)) continue;
        std::vector<double> values = variables_for(nm, edition_.s_from, subtense.in_si() * 1e3, 0.0);
        add(bound_value(row.s_from, values));
        add(bound_value(row.s_to, values));
        for (const AperturePiece& piece : apertures_[row.aperture].pieces) {
            add(piece.s_from);
            add(piece.s_to);
        }
    }
    for (const Factor& factor : factors_)
        if (factor.variable == t_s)
            for (const FactorPiece& piece : factor.pieces) {
                if (!piece.from.factor) add(piece.from.number);
                if (!piece.to.factor) add(piece.to.number);
            }
    std::sort(edges_s.begin(), edges_s.end());
    edges_s.erase(std::unique(edges_s.begin(), edges_s.end()), edges_s.end());
    std::vector<Duration> edges;
    for (double s : edges_s) edges.push_back(seconds(s));
    return edges;
}

std::vector<double> LimitSet::edges_over(std::size_t variable, Tissue tissue, Length wavelength,
                                         Duration exposure) const {
    const double nm = in_nanometres(wavelength);
    const double t = exposure.in_si();
    std::vector<double> edges;
    const auto add = [&edges](double edge) {
        if (edge > 0.0 && std::isfinite(edge)) edges.push_back(edge);
    };
    for (const LimitRow& row : rows_) {
        const double from = row.s_from.factor ? edition_.s_from : row.s_from.number;
        const double to = row.s_to.factor ? edition_.s_to : row.s_to.number;
        if (row.tissue != tissue || !within(nm, row.nm_from, row.nm_to, row.nm_end_included) ||
            !within(t, from, to, true))
            continue;
        std::vector<double> values = variables_for(nm, t, 0.0, 0.0);
        if (variable == alpha_mrad) {
            add(row.alpha_from_mrad);
            add(row.alpha_to_mrad);
            if (row.acceptance) add(factor_value(*row.acceptance, values));
        }
        for (const FactorPower& f : row.factors)
            if (factors_[f.factor].variable == variable)
                for (const FactorPiece& piece : factors_[f.factor].pieces) add(bound_value(piece.to, values));
    }
    std::sort(edges.begin(), edges.end());
    edges.erase(std::unique(edges.begin(), edges.end()), edges.end());
    return edges;
}

std::vector<PlaneAngle> LimitSet::subtense_edges(Tissue tissue, Length wavelength, Duration exposure) const {
    std::vector<PlaneAngle> edges;
    for (double mrad : edges_over(alpha_mrad, tissue, wavelength, exposure))
        edges.push_back(milliradians(mrad));
    return edges;
}

std::vector<Area> LimitSet::area_edges(Tissue tissue, Length wavelength, Duration exposure) const {
    std::vector<Area> edges;
    for (double m2 : edges_over(area_m2, tissue, wavelength, exposure)) edges.push_back(Area::from_si(m2));
    return edges;
}

}  // namespace dosimetry
