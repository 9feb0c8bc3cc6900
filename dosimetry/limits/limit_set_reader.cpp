#include <algorithm>
#include <array>
#include <cmath>
#include <map>

#include "limits/limit_set.h"
#include "limits/sha256.h"
#include "limits/table_checks.h"
#include "quantities/decimal.h"
#include "quantities/format.h"
#include "toml/strict_table.h"

namespace dosimetry {
namespace {

constexpr std::size_t most_bytes = 4'000'000;
const std::array<std::string, variable_count> variable_names{"wavelength_nm", "t_s", "alpha_mrad", "area_m2"};
constexpr std::size_t most_factors = 100;

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
        const TableChecks checks(set_, file_);
        for (const TableSection& section : sections_) checks.check_tiling(section);
        checks.check_edition_covered(sections_);
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
        TableSection section;
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
            TableChecks(set_, file_).check_definitions(row, r);
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
        for (std::size_t index : factors_of(row, set_.factors_)) {
            const Factor& factor = set_.factors_[index];
            row.depends_on_subtense = row.depends_on_subtense || changes_with(factor, alpha_variable);
            row.depends_on_area = row.depends_on_area || changes_with(factor, area_variable);
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

    std::string file_;
    toml::table document_;
    StrictTable root_;
    std::map<std::string, std::string> provenances_;
    std::vector<TableSection> sections_;
    LimitSet set_;
};

LimitSet LimitSet::read(std::string_view toml, const std::string& file_name) {
    return LimitSetReader(toml, file_name).read();
}

}  // namespace dosimetry
