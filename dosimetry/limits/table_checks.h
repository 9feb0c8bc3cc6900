#pragma once

#include <cstddef>
#include <limits>
#include <string>
#include <utility>
#include <vector>

#include "limits/limit_set.h"
#include "quantities/input_error.h"

/// What a table of limits must be beyond the form of its entries, so that every question inside its edition
/// has exactly one answer.
namespace dosimetry {

class StrictTable;

constexpr double unbounded = std::numeric_limits<double>::infinity();

/// The variables of formulas, by index; the factors follow them.
constexpr std::size_t variable_count = 4;
constexpr std::size_t wavelength_variable = 0;
constexpr std::size_t duration_variable = 1;
constexpr std::size_t alpha_variable = 2;
constexpr std::size_t area_variable = 3;

struct TableRectangle {
    double nm_from, nm_to, s_from, s_to;
};

/// One [[limits]] of the table: what it says it covers, and its rows among those of the set.
struct TableSection {
    std::string title;
    Tissue tissue{};
    bool alternative_form = false;
    std::vector<TableRectangle> covers;
    std::size_t first_row = 0, end_row = 0;
    TextPosition where;
};

/// Whether the factor itself, without those it is made from, changes with the variable.
bool changes_with(const Factor& factor, std::size_t variable);

/// The factors of a row, acceptance and ends of its durations included, and those they are made from.
std::vector<std::size_t> factors_of(const LimitRow& row, const std::vector<Factor>& factors);

/// Refuses a set that is not in order, by an InputError with the place in the file. Looks at the set it was
/// made for and must not outlive it.
class TableChecks {
  public:
    TableChecks(const LimitSet& set, std::string file_name) : set_(set), file_(std::move(file_name)) {}

    /// Each factor and the aperture must be defined over the whole row, which stands in `r`.
    void check_definitions(const LimitRow& row, const StrictTable& r) const;
    /// The rows of a section tile what it covers: one row everywhere inside, none outside; their values are
    /// positive and finite.
    void check_tiling(const TableSection& section) const;
    /// For each tissue the sections cover the whole range of the edition.
    void check_edition_covered(const std::vector<TableSection>& sections) const;

  private:
    void check_end(std::size_t index, const StrictTable& r) const;
    void check_value(const LimitRow& row, std::vector<double>& values) const;
    std::vector<double> subtense_samples_mrad() const;
    template <class Visit>
    void for_each_cell(std::size_t first_row, std::size_t end_row,
                       const std::vector<TableRectangle>& rectangles, Visit visit) const;

    const LimitSet& set_;
    std::string file_;
};

}  // namespace dosimetry
