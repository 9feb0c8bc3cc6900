#pragma once

#include <optional>
#include <string>
#include <string_view>
#include <variant>
#include <vector>

#include "limits/limit_row.h"
#include "quantities/radiometry.h"

namespace dosimetry {

/// What a limit is asked for.
struct LimitQuery {
    Tissue tissue{};
    Length wavelength;
    Duration exposure;    ///< one exposure of this duration
    PlaneAngle subtense;  ///< of the apparent source; zero for a small source
    Area exposed_area;    ///< matters for large areas of skin only
};

using LimitValue = std::variant<Irradiance, RadiantExposure, Radiance, RadianceDose>;

/// One row evaluated for a query.
struct Limit {
    const LimitRow* row = nullptr;
    LimitValue value;
    Length aperture;        ///< diameter of the disc over which the exposure is averaged
    PlaneAngle subtense;    ///< as judged: at least alpha-min
    PlaneAngle acceptance;  ///< acceptance angle; zero where the row has none
};

/// The question lies outside the published range. `what` is "wavelength" or "exposure".
struct NotCovered {
    std::string what;
    std::string reason;
};

/// How a factor or aperture came about, for the trail.
struct FactorStep {
    std::string symbol;
    std::string meaning;
    std::string formula;
    std::string with_numbers;
    double value = 0.0;
    std::string unit;
    std::string clause;
    std::string provenance;
};

/// One edition of published limits, compiled from its table. Immutable; safe to share between threads.
class LimitSet {
  public:
    /// Reads a table. Throws InputError with file, line and column for anything not in order: unknown keys,
    /// effects, factors or apertures, a row without clause or provenance, gaps and overlaps.
    static LimitSet read(std::string_view toml, const std::string& file_name);

    const Edition& edition() const { return edition_; }
    const std::vector<LimitRow>& rows() const { return rows_; }
    const std::vector<Factor>& factors() const { return factors_; }
    const std::vector<Aperture>& apertures() const { return apertures_; }

    /// All rows that apply at once, alternative forms included and marked by their row; never empty.
    /// Outside the edition's range the answer is NotCovered, never an extrapolation.
    std::variant<std::vector<Limit>, NotCovered> limits_for(const LimitQuery& query) const;

    /// The factors and the aperture of a limit, in the order they are needed.
    std::vector<FactorStep> derivation(const LimitRow& row, const LimitQuery& query) const;

    /// Durations at which rows, factors or apertures change for that tissue, wavelength and subtense,
    /// ascending, from the first to the last duration of the edition.
    std::vector<Duration> duration_edges(Tissue tissue, Length wavelength, PlaneAngle subtense) const;

    /// Subtenses and exposed areas at which rows or factors change for that tissue, wavelength and exposure,
    /// or at which the source fills the acceptance angle; ascending.
    std::vector<PlaneAngle> subtense_edges(Tissue tissue, Length wavelength, Duration exposure) const;
    std::vector<Area> area_edges(Tissue tissue, Length wavelength, Duration exposure) const;

  private:
    friend class LimitSetReader;
    friend class TableChecks;
    LimitSet() = default;

    /// Variables and then factors, by index, as formulas use them.
    std::vector<double> variables_for(double wavelength_nm, double t_s, double alpha_mrad,
                                      double area_m2) const;
    const FactorPiece& piece_of(const Factor& factor, std::vector<double>& values) const;
    double factor_value(std::size_t factor, std::vector<double>& values) const;
    double bound_value(const Bound& bound, std::vector<double>& values) const;
    bool applies(const LimitRow& row, std::vector<double>& values) const;
    double row_value(const LimitRow& row, std::vector<double>& values) const;  ///< SI
    double aperture_mm(const LimitRow& row, const std::vector<double>& values) const;
    std::vector<double> edges_over(std::size_t variable, Tissue tissue, Length wavelength,
                                   Duration exposure) const;
    const AperturePiece& aperture_piece(const Aperture& aperture, double wavelength_nm, double t_s) const;

    Edition edition_;
    std::vector<std::string> names_;  ///< variables, then factor symbols
    std::vector<Factor> factors_;
    std::vector<Aperture> apertures_;
    std::vector<LimitRow> rows_;
    std::optional<std::size_t> alpha_min_;  ///< the factor of that symbol, below which no subtense is judged
};

/// Unit of a limit and its name, "W/m²" and "irradiance".
std::string unit_of(LimitQuantity quantity);
std::string name_of(LimitQuantity quantity);

}  // namespace dosimetry
