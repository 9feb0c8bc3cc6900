#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <map>
#include <set>

#include "limits/limit_set.h"
#include "limits/sha256.h"
#include "quantities/decimal.h"
#include "quantities/format.h"
#include "toml/strict_table.h"

namespace dosimetry {
namespace {

constexpr double unbounded = std::numeric_limits<double>::infinity();
constexpr std::size_t most_bytes = 4'000'000;
constexpr std::size_t variable_count = 4;
const std::array<std::string, variable_count> variable_names{"wavelength_nm", "t_s", "alpha_mrad", "area_m2"};
constexpr std::size_t alpha_variable = 2;
constexpr std::size_t area_variable = 3;
constexpr std::size_t most_factors = 100;

struct Rectangle {
    double nm_from, nm_to, s_from, s_to;
};

struct Section {
    std::string title;
    Tissue tissue{};
    bool alternative_form = false;
    std::vector<Rectangle> covers;
    std::size_t first_row = 0, end_row = 0;
    TextPosition where;
};

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

}  // namespace

/// Builds a LimitSet from its table and refuses whatever is not in order.
class LimitSetReader {
  public:
    LimitSetReader(std::string_view toml, const std::string& file_name)
        : file_(file_name),
          document_(parse_toml(toml, file_name, most_bytes)),
          root_(document_, file_name, "",
                {"format", "edition", "provenance", "factor", "aperture", "limits"}) {
        set_.names_.assign(variable_names.begin(), variable_names.end());
        set_.edition_.sha256 = sha256_hex(toml);
    }

    LimitSet read() {
        if (root_.number("format", "1") != 1.0)
            throw root_.error("format", "the format of the table is " + described(root_.node("format")),
                              "format = 1");
        read_edition();
        read_provenances();
        for (const StrictTable& t :
             root_.tables("factor", {"symbol", "meaning", "over", "clause", "provenance", "note", "pieces"}))
            read_factor(t);
        for (const StrictTable& t : root_.tables("aperture", {"id", "clause", "provenance", "pieces"}))
            read_aperture(t);
        for (const StrictTable& t : root_.tables("limits", {"title", "tissue", "effect", "aperture", "clause",
                                                            "alternative_form", "note", "covers", "rows"}))
            read_section(t);
        if (sections_.empty()) throw root_.error("limits", "the table has no limits", "[[limits]]");
        for (const Section& section : sections_) check_tiling(section);
        check_edition_covered();
        return std::move(set_);
    }

  private:
    void read_edition() {
        const StrictTable t = root_.table("edition", {"id", "issuer", "title", "published_in", "year",
                                                      "status", "nm", "s", "text_read", "text_note"});
        Edition& e = set_.edition_;
        e.id = t.text("id");
        e.issuer = t.text("issuer");
        e.title = t.text("title");
        e.published_in = t.text("published_in");
        const double year = t.number("year");
        if (!(year >= 1900 && year <= 2200))
            throw t.error("year", "the year is " + described(t.node("year")), "year = 2013");
        e.year = static_cast<int>(year);
        e.status = t.text("status");
        e.text_read = t.flag("text_read", false);
        e.text_note = t.maybe_text("text_note").value_or("");
        std::tie(e.nm_from, e.nm_to) = range(t, "nm");
        std::tie(e.s_from, e.s_to) = range(t, "s");
        const auto bounded = [&t](const char* key, double from, double to) {
            if (!(from > 0 && to < unbounded))
                throw t.error(key, std::string("the range ") + key + " of the edition is not bounded",
                              std::string(key) + " = [from, to], both finite and above zero");
        };
        bounded("nm", e.nm_from, e.nm_to);
        bounded("s", e.s_from, e.s_to);
    }

    void read_provenances() {
        const toml::node& node = root_.node("provenance");
        const toml::table* table = node.as_table();
        if (!table) throw root_.error("provenance", "provenance must be a table", "[provenance]");
        for (const auto& [key, value] : *table) {
            const auto* text = value.as_string();
            if (!text || text->get().empty())
                throw InputError("provenance " + quoted(std::string(key.str())) + " has no text", "a text",
                                 "", position_of(value, file_));
            provenances_[std::string(key.str())] = text->get();
        }
    }

    std::string provenance(const StrictTable& t) const {
        const std::string code = t.text("provenance");
        const auto found = provenances_.find(code);
        if (found == provenances_.end()) {
            std::string known;
            for (const auto& [name, text] : provenances_) known += (known.empty() ? "" : ", ") + name;
            throw t.error("provenance", "unknown provenance " + quoted(code), known);
        }
        return found->second;
    }

    std::string clause(const StrictTable& t) const {
        const std::string text = t.text("clause");
        if (text.empty())
            throw t.error("clause", "the clause is empty", "the table or clause of the document");
        return text;
    }

    double finite(const toml::node& node, const std::string& what) const {
        const auto value = node.is_number() ? node.value<double>() : std::nullopt;
        if (!value || !std::isfinite(*value))
            throw InputError(what + " must be a number, " + described(node) + " is not", "a finite number",
                             "", position_of(node, file_));
        return *value;
    }

    Bound bound(const toml::node& node, const std::string& what, bool open_ends) const {
        if (const auto* text = node.as_string()) {
            if (open_ends && text->get() == "min") return {-unbounded, std::nullopt};
            if (open_ends && text->get() == "max") return {unbounded, std::nullopt};
            for (std::size_t i = 0; i < set_.factors_.size(); ++i)
                if (set_.factors_[i].symbol == text->get()) return {0.0, i};
            throw InputError("unknown factor " + quoted(text->get()) + " in " + what,
                             "a number or a factor given before", "", position_of(node, file_));
        }
        return {finite(node, what), std::nullopt};
    }

    const toml::array& pair(const StrictTable& t, const std::string& key) const {
        const toml::array& list = t.array(key);
        if (list.size() != 2) throw t.error(key, key + " must have two ends", key + " = [from, to]");
        return list;
    }

    std::pair<double, double> range(const StrictTable& t, const std::string& key) const {
        const toml::array& ends = pair(t, key);
        const double from = finite(*ends.get(0), key);
        const auto* open = ends.get(1)->as_string();
        const double to = open && open->get() == "max" ? unbounded : finite(*ends.get(1), key);
        if (!(from < to && from >= 0))
            throw t.error(key, "the range " + key + " does not ascend", key + " = [from, to]");
        return {from, to};
    }

    Formula formula(const StrictTable& t, const std::string& key, std::span<const std::string> names) const {
        const std::string text = t.text(key);
        try {
            return {text, names};
        } catch (const InputError& error) {
            throw error.at(t.where(key));
        }
    }

    void read_factor(const StrictTable& t) {
        Factor factor;
        if (set_.factors_.size() == most_factors)
            throw t.error("symbol", "there are too many factors", "at most " + std::to_string(most_factors));
        factor.symbol = t.text("symbol");
        if (std::find(set_.names_.begin(), set_.names_.end(), factor.symbol) != set_.names_.end())
            throw t.error("symbol", "the factor " + quoted(factor.symbol) + " is given twice",
                          "a new symbol");
        factor.meaning = t.text("meaning");
        factor.over = t.text("over");
        factor.clause = clause(t);
        factor.provenance = provenance(t);
        factor.note = t.maybe_text("note").value_or("");
        const auto found = std::find(variable_names.begin(), variable_names.end(), factor.over);
        if (found == variable_names.end())
            throw t.error("over", "unknown variable " + quoted(factor.over),
                          "wavelength_nm, t_s, alpha_mrad, area_m2");
        factor.variable = static_cast<std::size_t>(found - variable_names.begin());
        t.array("pieces");
        for (const StrictTable& p : t.tables("pieces", {"from", "to", "end", "value"})) {
            FactorPiece piece;
            piece.from = bound(p.node("from"), "from", true);
            piece.to = bound(p.node("to"), "to", true);
            if (!piece.from.factor && !piece.to.factor && !(piece.from.number < piece.to.number))
                throw p.error("to", "the piece of " + factor.symbol + " does not ascend",
                              "from less than to");
            piece.end_included = included(p, "end");
            piece.value = formula(p, "value", set_.names_);
            if (!factor.pieces.empty()) {
                const Bound& before = factor.pieces.back().to;
                if (before.factor != piece.from.factor || before.number != piece.from.number)
                    throw p.error("from", "the pieces of " + factor.symbol + " leave a gap or overlap here",
                                  "a piece that starts where the one before ends");
            }
            factor.pieces.push_back(std::move(piece));
        }
        if (factor.pieces.empty())
            throw t.error("pieces", factor.symbol + " has no pieces", "pieces = [ … ]");
        if (factor.symbol == "alpha_min") set_.alpha_min_ = set_.factors_.size();
        set_.names_.push_back(factor.symbol);
        set_.factors_.push_back(std::move(factor));
    }

    bool included(const StrictTable& t, const std::string& key) const {
        const auto text = t.maybe_text(key);
        if (text && *text != "included")
            throw t.error(key, key + " is " + quoted(*text), "\"included\", or leave the key out");
        return text.has_value();
    }

    void read_aperture(const StrictTable& t) {
        Aperture aperture;
        aperture.id = t.text("id");
        for (const Aperture& other : set_.apertures_)
            if (other.id == aperture.id)
                throw t.error("id", "the aperture " + quoted(aperture.id) + " is given twice", "a new id");
        aperture.clause = clause(t);
        aperture.provenance = provenance(t);
        for (const StrictTable& p : t.tables("pieces", {"nm", "s", "diameter_mm"})) {
            AperturePiece piece;
            std::tie(piece.nm_from, piece.nm_to) = range(p, "nm");
            std::tie(piece.s_from, piece.s_to) = range(p, "s");
            piece.diameter_mm = formula(p, "diameter_mm", variable_names);
            aperture.pieces.push_back(std::move(piece));
        }
        if (aperture.pieces.empty())
            throw t.error("pieces", aperture.id + " has no pieces", "pieces = [ … ]");
        set_.apertures_.push_back(std::move(aperture));
    }

    void read_section(const StrictTable& t) {
        Section section;
        section.title = t.text("title");
        section.where = t.where();
        section.alternative_form = t.flag("alternative_form", false);
        section.tissue = one_of<Tissue>(t, "tissue", {Tissue::eye, Tissue::skin});
        const Effect effect = one_of<Effect>(
            t, "effect",
            {Effect::retinal_thermal, Effect::retinal_photochemical, Effect::anterior_thermal,
             Effect::ultraviolet_photochemical, Effect::ultraviolet_thermal, Effect::skin_thermal});
        const std::string aperture_id = t.text("aperture");
        const auto aperture = std::find_if(set_.apertures_.begin(), set_.apertures_.end(),
                                           [&](const Aperture& a) { return a.id == aperture_id; });
        if (aperture == set_.apertures_.end())
            throw t.error("aperture", "unknown aperture " + quoted(aperture_id), "an aperture given before");
        for (const StrictTable& c : t.tables("covers", {"nm", "s"})) {
            const auto [nm_from, nm_to] = range(c, "nm");
            const auto [s_from, s_to] = range(c, "s");
            section.covers.push_back({nm_from, nm_to, s_from, s_to});
        }
        if (section.covers.empty())
            throw t.error("covers", "the section does not say what it covers", "covers = [ … ]");
        section.first_row = set_.rows_.size();
        for (const StrictTable& r :
             t.tables("rows", {"nm", "s", "H", "E", "D", "L", "t_power", "factors", "alpha_mrad",
                               "acceptance", "nm_end", "s_end", "clause", "provenance", "note"})) {
            LimitRow row = read_row(r);
            row.tissue = section.tissue;
            row.effect = effect;
            row.aperture = static_cast<std::size_t>(aperture - set_.apertures_.begin());
            row.alternative_form = section.alternative_form;
            const bool radiance_form =
                row.quantity == LimitQuantity::radiance || row.quantity == LimitQuantity::radiance_dose;
            if (radiance_form && !row.alternative_form)
                throw r.error("", "a row in D or L stands alone",
                              "alternative_form = true, beside rows in H or E");
            row.clause = r.has("clause") ? clause(r) : clause(t);
            check_definitions(row, r);
            set_.rows_.push_back(std::move(row));
        }
        section.end_row = set_.rows_.size();
        if (section.first_row == section.end_row)
            throw t.error("rows", "the section has no rows", "rows = [ … ]");
        sections_.push_back(std::move(section));
    }

    template <class Enum>
    Enum one_of(const StrictTable& t, const std::string& key, std::initializer_list<Enum> values) const {
        const std::string text = t.text(key);
        std::string known;
        for (Enum value : values) {
            if (name_of(value) == text) return value;
            known += (known.empty() ? "" : ", ") + name_of(value);
        }
        throw t.error(key, "unknown " + key + " " + quoted(text), known);
    }

    LimitRow read_row(const StrictTable& r) {
        LimitRow row;
        row.line = r.where().line;
        row.provenance = provenance(r);
        row.note = r.maybe_text("note").value_or("");
        std::tie(row.nm_from, row.nm_to) = range(r, "nm");
        const toml::array& s = pair(r, "s");
        row.s_from = bound(*s.get(0), "s", false);
        row.s_to = bound(*s.get(1), "s", false);
        row.nm_end_included = included(r, "nm_end") || row.nm_to == set_.edition_.nm_to;
        row.s_end_included =
            included(r, "s_end") || (!row.s_to.factor && row.s_to.number == set_.edition_.s_to);
        row.alpha_to_mrad = unbounded;
        if (r.has("alpha_mrad")) std::tie(row.alpha_from_mrad, row.alpha_to_mrad) = range(r, "alpha_mrad");
        read_value(r, row);
        row.t_power = r.maybe_number("t_power").value_or(0.0);
        // The search for the permitted exposure relies on no limit growing faster than the exposure itself.
        if (!(row.t_power >= 0.0 && row.t_power <= 1.0))
            throw r.error("t_power", "the power of t is " + shortest(row.t_power), "from 0 to 1");
        if (r.has("factors"))
            for (const std::string& text : r.texts("factors")) row.factors.push_back(factor_power(r, text));
        if (const auto symbol = r.maybe_text("acceptance")) row.acceptance = factor_power(r, *symbol).factor;
        row.depends_on_subtense =
            row.alpha_from_mrad > 0 || row.alpha_to_mrad < unbounded || row.acceptance.has_value();
        for (std::size_t index : factors_of(row)) {
            row.depends_on_subtense = row.depends_on_subtense || uses(index, alpha_variable);
            row.depends_on_area = row.depends_on_area || uses(index, area_variable);
        }
        return row;
    }

    void read_value(const StrictTable& r, LimitRow& row) const {
        int given = 0;
        for (const auto& [key, quantity] :
             {std::pair{"H", LimitQuantity::radiant_exposure}, std::pair{"E", LimitQuantity::irradiance},
              std::pair{"D", LimitQuantity::radiance_dose}, std::pair{"L", LimitQuantity::radiance}}) {
            if (!r.has(key)) continue;
            ++given;
            row.quantity = quantity;
            row.coefficient = r.number(key);
            if (!(row.coefficient > 0))
                throw r.error(key, "the limit is not greater than zero", "a positive number");
        }
        if (given != 1) throw r.error("", "a row needs exactly one of H, E, D, L", "H = …");
    }

    FactorPower factor_power(const StrictTable& r, const std::string& text) const {
        const auto hat = text.find('^');
        const std::string symbol = text.substr(0, hat);
        for (std::size_t i = 0; i < set_.factors_.size(); ++i)
            if (set_.factors_[i].symbol == symbol) {
                try {
                    return {i, hat == std::string::npos
                                   ? 1.0
                                   : parse_number(text.substr(hat + 1), DecimalMark::point)};
                } catch (const InputError& error) {
                    throw error.at(r.where("factors"));
                }
            }
        std::string known;
        for (const Factor& f : set_.factors_) known += (known.empty() ? "" : ", ") + f.symbol;
        throw r.error("factors", "unknown factor " + quoted(symbol), known);
    }

    /// Whether the factor itself, without those it is made from, changes with the variable.
    bool uses(std::size_t index, std::size_t variable) const {
        const Factor& factor = set_.factors_[index];
        if (factor.variable == variable && factor.pieces.size() > 1) return true;
        return std::any_of(factor.pieces.begin(), factor.pieces.end(), [&](const FactorPiece& piece) {
            const std::vector<std::size_t> used = piece.value.used();
            return std::find(used.begin(), used.end(), variable) != used.end();
        });
    }

    /// The factors of a row, acceptance and ends of its durations included, and those they are made from.
    std::vector<std::size_t> factors_of(const LimitRow& row) const {
        std::vector<bool> needed(set_.factors_.size());
        for (const FactorPower& f : row.factors) needed[f.factor] = true;
        for (const auto& index : {row.acceptance, row.s_from.factor, row.s_to.factor})
            if (index) needed[*index] = true;
        return with_their_own(std::move(needed));
    }

    /// A factor is made from earlier ones only, so one pass from the last to the first finds them all.
    std::vector<std::size_t> with_their_own(std::vector<bool> needed) const {
        std::vector<std::size_t> indices;
        for (std::size_t i = needed.size(); i-- > 0;) {
            if (!needed[i]) continue;
            indices.push_back(i);
            for (const FactorPiece& piece : set_.factors_[i].pieces) {
                for (std::size_t used : piece.value.used())
                    if (used >= variable_count) needed[used - variable_count] = true;
                for (const auto& index : {piece.from.factor, piece.to.factor})
                    if (index) needed[*index] = true;
            }
        }
        return indices;
    }

    /// Each factor and the aperture must be defined over the whole row.
    void check_definitions(const LimitRow& row, const StrictTable& r) const {
        const Edition& e = set_.edition_;
        const Rectangle whole{row.nm_from, row.nm_to, row.s_from.factor ? e.s_from : row.s_from.number,
                              row.s_to.factor ? e.s_to : row.s_to.number};
        for (const auto& index : {row.s_from.factor, row.s_to.factor})
            if (index) check_end(*index, r);
        std::vector<std::size_t> factors = factors_of(row);
        const bool retinal =
            row.effect == Effect::retinal_thermal || row.effect == Effect::retinal_photochemical;
        if (retinal && set_.alpha_min_) {  // the subtense is never judged below it
            std::vector<bool> needed(set_.factors_.size());
            needed[*set_.alpha_min_] = true;
            const std::vector<std::size_t> more = with_their_own(std::move(needed));
            factors.insert(factors.end(), more.begin(), more.end());
        }
        for (std::size_t index : factors)
            if (!defined_over(set_.factors_[index], whole))
                throw r.error(
                    "factors",
                    "the factor " + set_.factors_[index].symbol + " is not defined over the whole row",
                    "a factor whose pieces cover the row");
        if (!aperture_covers(set_.apertures_[row.aperture], whole))
            throw r.error(
                "", "the aperture " + quoted(set_.apertures_[row.aperture].id) + " does not cover this row",
                "an aperture for its wavelengths and durations");
    }

    /// Pieces follow one another, so the first and the last end decide.
    static bool defined_over(const Factor& factor, const Rectangle& whole) {
        const Bound& first = factor.pieces.front().from;
        const Bound& last = factor.pieces.back().to;
        if (first.factor || last.factor) return false;
        if (factor.variable == 0) return first.number <= whole.nm_from && last.number >= whole.nm_to;
        if (factor.variable == 1) return first.number <= whole.s_from && last.number >= whole.s_to;
        return first.number == -unbounded && last.number == unbounded;
    }

    /// Rows tile rectangles of wavelength and duration for each subtense, so an end may follow the subtense
    /// only.
    void check_end(std::size_t index, const StrictTable& r) const {
        std::vector<bool> needed(set_.factors_.size());
        needed[index] = true;
        for (std::size_t i : with_their_own(std::move(needed)))
            for (std::size_t variable = 0; variable < variable_count; ++variable)
                if (variable != alpha_variable && uses(i, variable))
                    throw r.error("s",
                                  "the factor " + set_.factors_[index].symbol + " depends on " +
                                      variable_names[variable] + " and cannot be an end of a row",
                                  "a number, or a factor of alpha_mrad");
    }

    static bool aperture_covers(const Aperture& aperture, const Rectangle& whole) {
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

    /// Subtenses between which nothing changes but the values of formulas, one for each such range.
    std::vector<double> subtense_samples_mrad() const {
        std::vector<double> edges{1e-3, 1e4};
        for (const LimitRow& row : set_.rows_)
            for (double mrad : {row.alpha_from_mrad, row.alpha_to_mrad})
                if (mrad > 0 && mrad < 1e4) edges.push_back(mrad);
        for (const Factor& factor : set_.factors_)
            if (factor.variable == alpha_variable)
                for (const FactorPiece& piece : factor.pieces)
                    if (std::isfinite(piece.to.number) && piece.to.number > 0)
                        edges.push_back(piece.to.number);
        edges = sorted_unique(edges);
        std::vector<double> samples;
        for (std::size_t i = 0; i + 1 < edges.size(); ++i) samples.push_back(middle(edges[i], edges[i + 1]));
        return samples;
    }

    template <class Visit>
    void for_each_cell(std::size_t first_row, std::size_t end_row, const std::vector<Rectangle>& rectangles,
                       Visit visit) {
        for (double alpha : subtense_samples_mrad()) {
            std::vector<double> nm_edges, s_edges;
            for (const Rectangle& r : rectangles) {
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

    /// A limit that is not a positive number would compare as "not exceeded".
    void check_value(const LimitRow& row, std::vector<double>& values) const {
        const double value = set_.row_value(row, values);
        const double diameter_mm = set_.aperture_mm(row, values);
        for (const auto& [what, number] : {std::pair{"limit", value}, std::pair{"aperture", diameter_mm}})
            if (!(number > 0 && number < unbounded))
                throw InputError(std::string("the ") + what + " of this row is not a positive number" +
                                     place(values[0], values[1], values[alpha_variable]),
                                 "a finite number above zero", "", {file_, row.line, 1});
    }

    static bool inside(const std::vector<Rectangle>& rectangles, double nm, double s) {
        return std::any_of(rectangles.begin(), rectangles.end(), [&](const Rectangle& r) {
            return nm > r.nm_from && nm < r.nm_to && s > r.s_from && s < r.s_to;
        });
    }

    static std::string place(double nm, double s, double alpha) {
        return " at " + exact_number(nm) + " nm, " + exact_number(s) + " s, " + exact_number(alpha) + " mrad";
    }

    /// The rows of a section tile what it covers: one row everywhere inside, none outside.
    void check_tiling(const Section& section) {
        for_each_cell(section.first_row, section.end_row, section.covers,
                      [&](double nm, double s, double alpha, std::size_t count) {
                          const bool covered = inside(section.covers, nm, s);
                          const std::string in = " in " + quoted(section.title) + place(nm, s, alpha);
                          if (covered && count == 0)
                              throw InputError("the rows leave a gap" + in,
                                               "rows that tile what the section covers", "", section.where);
                          if (count > 1)
                              throw InputError("the rows overlap" + in,
                                               "rows that tile what the section covers", "", section.where);
                          if (!covered && count > 0)
                              throw InputError("a row reaches outside what is covered" + in,
                                               "rows that tile what the section covers", "", section.where);
                      });
    }

    void check_edition_covered() {
        const Edition& e = set_.edition_;
        for (Tissue tissue : {Tissue::eye, Tissue::skin}) {
            std::vector<Rectangle> all;
            for (const Section& section : sections_)
                if (section.tissue == tissue && !section.alternative_form)
                    all.insert(all.end(), section.covers.begin(), section.covers.end());
            std::vector<Rectangle> whole{{e.nm_from, e.nm_to, e.s_from, e.s_to}};
            whole.insert(whole.end(), all.begin(), all.end());
            for_each_cell(0, 0, whole, [&](double nm, double s, double alpha, std::size_t) {
                const bool in_edition = nm > e.nm_from && nm < e.nm_to && s > e.s_from && s < e.s_to;
                if (in_edition && !inside(all, nm, s))
                    throw InputError("no limit for the " + name_of(tissue) + place(nm, s, alpha),
                                     "sections that cover the edition's whole range", "", {file_, 1, 1});
            });
        }
    }

    std::string file_;
    toml::table document_;
    StrictTable root_;
    std::map<std::string, std::string> provenances_;
    std::vector<Section> sections_;
    LimitSet set_;
};

LimitSet LimitSet::read(std::string_view toml, const std::string& file_name) {
    return LimitSetReader(toml, file_name).read();
}

}  // namespace dosimetry
