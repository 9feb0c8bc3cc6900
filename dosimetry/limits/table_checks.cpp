#include "limits/table_checks.h"

#include <algorithm>
#include <cmath>
#include <utility>

#include "quantities/format.h"
#include "toml/strict_table.h"

namespace dosimetry {
namespace {

double middle(double a, double b) {
    return std::sqrt(a * b);
}

std::vector<double> sorted_unique(std::vector<double> v) {
    std::sort(v.begin(), v.end());
    v.erase(std::unique(v.begin(), v.end()), v.end());
    return v;
}

/// The edges and a value between each two of them.
std::vector<double> with_middles(const std::vector<double>& edges) {
    std::vector<double> values = sorted_unique(edges);
    for (std::size_t i = 0, n = values.size(); i + 1 < n; ++i)
        values.push_back(middle(values[i], values[i + 1]));
    return values;
}

/// A factor is made from earlier ones only, so one pass from the last to the first finds them all.
std::vector<std::size_t> with_their_own(std::vector<bool> needed, const std::vector<Factor>& factors) {
    std::vector<std::size_t> indices;
    for (std::size_t i = needed.size(); i-- > 0;) {
        if (!needed[i]) continue;
        indices.push_back(i);
        for (const FactorPiece& piece : factors[i].pieces) {
            for (std::size_t used : piece.value.used())
                if (used >= variable_count) needed[used - variable_count] = true;
            for (const auto& index : {piece.from.factor, piece.to.factor})
                if (index) needed[*index] = true;
        }
    }
    return indices;
}

/// Pieces follow one another, so the first and the last end decide.
bool defined_over(const Factor& factor, const TableRectangle& whole) {
    const Bound& first = factor.pieces.front().from;
    const Bound& last = factor.pieces.back().to;
    if (first.factor || last.factor) return false;
    if (factor.variable == wavelength_variable)
        return first.number <= whole.nm_from && last.number >= whole.nm_to;
    if (factor.variable == duration_variable)
        return first.number <= whole.s_from && last.number >= whole.s_to;
    return first.number == -unbounded && last.number == unbounded;
}

bool aperture_covers(const Aperture& aperture, const TableRectangle& whole) {
    std::vector<double> nm_edges{whole.nm_from, whole.nm_to};
    std::vector<double> s_edges{whole.s_from, whole.s_to};
    for (const AperturePiece& p : aperture.pieces) {
        for (double nm : {p.nm_from, p.nm_to})
            if (nm > whole.nm_from && nm < whole.nm_to) nm_edges.push_back(nm);
        for (double s : {p.s_from, p.s_to})
            if (s > whole.s_from && s < whole.s_to) s_edges.push_back(s);
    }
    for (double nm : with_middles(nm_edges))
        for (double s : with_middles(s_edges))
            if (std::none_of(aperture.pieces.begin(), aperture.pieces.end(), [&](const AperturePiece& p) {
                    return nm >= p.nm_from && nm <= p.nm_to && s >= p.s_from && s < p.s_to;
                }))
                return false;
    return true;
}

bool inside(const std::vector<TableRectangle>& rectangles, double nm, double s) {
    return std::any_of(rectangles.begin(), rectangles.end(), [&](const TableRectangle& r) {
        return nm > r.nm_from && nm < r.nm_to && s > r.s_from && s < r.s_to;
    });
}

std::string place(double nm, double s, double alpha) {
    return " at " + exact_number(nm) + " nm, " + exact_number(s) + " s, " + exact_number(alpha) + " mrad";
}

}  // namespace

bool changes_with(const Factor& factor, std::size_t variable) {
    if (factor.variable == variable && factor.pieces.size() > 1) return true;
    return std::any_of(factor.pieces.begin(), factor.pieces.end(), [&](const FactorPiece& piece) {
        const std::vector<std::size_t> used = piece.value.used();
        return std::find(used.begin(), used.end(), variable) != used.end();
    });
}

std::vector<std::size_t> factors_of(const LimitRow& row, const std::vector<Factor>& factors) {
    std::vector<bool> needed(factors.size());
    for (const FactorPower& f : row.factors) needed[f.factor] = true;
    for (const auto& index : {row.acceptance, row.s_from.factor, row.s_to.factor})
        if (index) needed[*index] = true;
    return with_their_own(std::move(needed), factors);
}

void TableChecks::check_definitions(const LimitRow& row, const StrictTable& r) const {
    const Edition& e = set_.edition_;
    const TableRectangle whole{row.nm_from, row.nm_to, row.s_from.factor ? e.s_from : row.s_from.number,
                               row.s_to.factor ? e.s_to : row.s_to.number};
    for (const auto& index : {row.s_from.factor, row.s_to.factor})
        if (index) check_end(*index, r);
    std::vector<std::size_t> factors = factors_of(row, set_.factors_);
    const bool retinal = row.effect == Effect::retinal_thermal || row.effect == Effect::retinal_photochemical;
    if (retinal && set_.alpha_min_) {  // the subtense is never judged below it
        std::vector<bool> needed(set_.factors_.size());
        needed[*set_.alpha_min_] = true;
        const std::vector<std::size_t> more = with_their_own(std::move(needed), set_.factors_);
        factors.insert(factors.end(), more.begin(), more.end());
    }
    for (std::size_t index : factors)
        if (!defined_over(set_.factors_[index], whole))
            throw r.error("factors",
                          "the factor " + set_.factors_[index].symbol + " is not defined over the whole row",
                          "a factor whose pieces cover the row");
    if (!aperture_covers(set_.apertures_[row.aperture], whole))
        throw r.error("",
                      "the aperture " + quoted(set_.apertures_[row.aperture].id) + " does not cover this row",
                      "an aperture for its wavelengths and durations");
}

/// Rows tile rectangles of wavelength and duration for each subtense, so an end may follow the subtense
/// only.
void TableChecks::check_end(std::size_t index, const StrictTable& r) const {
    std::vector<bool> needed(set_.factors_.size());
    needed[index] = true;
    for (std::size_t i : with_their_own(std::move(needed), set_.factors_))
        for (std::size_t variable = 0; variable < variable_count; ++variable)
            if (variable != alpha_variable && changes_with(set_.factors_[i], variable))
                throw r.error("s",
                              "the factor " + set_.factors_[index].symbol + " depends on " +
                                  set_.names_[variable] + " and cannot be an end of a row",
                              "a number, or a factor of alpha_mrad");
}

/// Subtenses between which nothing changes but the values of formulas, one for each such range.
std::vector<double> TableChecks::subtense_samples_mrad() const {
    std::vector<double> edges{1e-3, 1e4};
    for (const LimitRow& row : set_.rows_)
        for (double mrad : {row.alpha_from_mrad, row.alpha_to_mrad})
            if (mrad > 0 && mrad < 1e4) edges.push_back(mrad);
    for (const Factor& factor : set_.factors_)
        if (factor.variable == alpha_variable)
            for (const FactorPiece& piece : factor.pieces)
                if (std::isfinite(piece.to.number) && piece.to.number > 0) edges.push_back(piece.to.number);
    edges = sorted_unique(edges);
    std::vector<double> samples;
    for (std::size_t i = 0; i + 1 < edges.size(); ++i) samples.push_back(middle(edges[i], edges[i + 1]));
    return samples;
}

/// A limit that is not a positive number would compare as "not exceeded".
void TableChecks::check_value(const LimitRow& row, std::vector<double>& values) const {
    const double value = set_.row_value(row, values);
    const double diameter_mm = set_.aperture_mm(row, values);
    for (const auto& [what, number] : {std::pair{"limit", value}, std::pair{"aperture", diameter_mm}})
        if (!(number > 0 && number < unbounded))
            throw InputError(
                std::string("the ") + what + " of this row is not a positive number" +
                    place(values[wavelength_variable], values[duration_variable], values[alpha_variable]),
                "a finite number above zero", "", {file_, row.line, 1});
}

template <class Visit>
void TableChecks::for_each_cell(std::size_t first_row, std::size_t end_row,
                                const std::vector<TableRectangle>& rectangles, Visit visit) const {
    for (double alpha : subtense_samples_mrad()) {
        std::vector<double> nm_edges, s_edges;
        for (const TableRectangle& r : rectangles) {
            nm_edges.insert(nm_edges.end(), {r.nm_from, r.nm_to});
            s_edges.insert(s_edges.end(), {r.s_from, r.s_to});
        }
        std::vector<double> values =
            set_.variables_for(set_.edition_.nm_from, set_.edition_.s_from, alpha, 1e-4);
        for (std::size_t i = first_row; i < end_row; ++i) {
            const LimitRow& row = set_.rows_[i];
            nm_edges.insert(nm_edges.end(), {row.nm_from, row.nm_to});
            s_edges.insert(s_edges.end(),
                           {set_.bound_value(row.s_from, values), set_.bound_value(row.s_to, values)});
        }
        nm_edges = sorted_unique(nm_edges);
        s_edges = sorted_unique(s_edges);
        for (std::size_t i = 0; i + 1 < nm_edges.size(); ++i)
            for (std::size_t j = 0; j + 1 < s_edges.size(); ++j) {
                const double nm = middle(nm_edges[i], nm_edges[i + 1]);
                const double s = middle(s_edges[j], s_edges[j + 1]);
                std::vector<double> at = set_.variables_for(nm, s, alpha, 1e-4);
                std::size_t count = 0;
                for (std::size_t row = first_row; row < end_row; ++row)
                    if (set_.applies(set_.rows_[row], at)) {
                        ++count;
                        check_value(set_.rows_[row], at);
                    }
                visit(nm, s, alpha, count);
            }
    }
}

void TableChecks::check_tiling(const TableSection& section) const {
    for_each_cell(section.first_row, section.end_row, section.covers,
                  [&](double nm, double s, double alpha, std::size_t count) {
                      const bool covered = inside(section.covers, nm, s);
                      const std::string in = " in " + quoted(section.title) + place(nm, s, alpha);
                      if (covered && count == 0)
                          throw InputError("the rows leave a gap" + in,
                                           "rows that tile what the section covers", "", section.where);
                      if (count > 1)
                          throw InputError("the rows overlap" + in, "rows that tile what the section covers",
                                           "", section.where);
                      if (!covered && count > 0)
                          throw InputError("a row reaches outside what is covered" + in,
                                           "rows that tile what the section covers", "", section.where);
                  });
}

void TableChecks::check_edition_covered(const std::vector<TableSection>& sections) const {
    const Edition& e = set_.edition_;
    for (Tissue tissue : {Tissue::eye, Tissue::skin}) {
        std::vector<TableRectangle> all;
        for (const TableSection& section : sections)
            if (section.tissue == tissue && !section.alternative_form)
                all.insert(all.end(), section.covers.begin(), section.covers.end());
        std::vector<TableRectangle> whole{{e.nm_from, e.nm_to, e.s_from, e.s_to}};
        whole.insert(whole.end(), all.begin(), all.end());
        for_each_cell(0, 0, whole, [&](double nm, double s, double alpha, std::size_t) {
            const bool in_edition = nm > e.nm_from && nm < e.nm_to && s > e.s_from && s < e.s_to;
            if (in_edition && !inside(all, nm, s))
                throw InputError("no limit for the " + name_of(tissue) + place(nm, s, alpha),
                                 "sections that cover the edition's whole range", "", {file_, 1, 1});
        });
    }
}

}  // namespace dosimetry
