// A table that is not in order is refused, with line and reason. Each case changes one thing in the real
// table.

#include <algorithm>

#include "limits/embedded_tables.h"
#include "limits/limit_set.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::message_of;

std::string real_table() {
    for (const EmbeddedTable& table : embedded_tables())
        if (table.file_name == "icnirp_2013_laser.toml") return std::string(table.bytes);
    return "";
}

struct Change {
    const char* name;
    const char* from;  ///< must occur; its first occurrence is changed
    const char* to;
    const char* line_holding;  ///< the message must point at the line that holds this text after the change;
                               ///< after "^" at the line before it, where the table's own header stands
    const char* sentence;      ///< the message after the place
};

int line_of(const std::string& text, const std::string& part) {
    const auto at = text.find(part);
    return at == std::string::npos
               ? -1
               : 1 + static_cast<int>(
                         std::count(text.begin(), text.begin() + static_cast<std::ptrdiff_t>(at), '\n'));
}

class Refusals : public ::testing::TestWithParam<Change> {};

TEST_P(Refusals, NameTheLineAndTheReason) {
    const Change& change = GetParam();
    std::string table = real_table();
    const auto at = table.find(change.from);
    ASSERT_NE(at, std::string::npos) << change.from;
    table.replace(at, std::string(change.from).size(), change.to);
    const std::string message = message_of([&] { LimitSet::read(table, "t.toml"); });
    const std::string holding = change.line_holding;
    const int line = holding[0] == '^' ? line_of(table, holding.substr(1)) - 1 : line_of(table, holding);
    ASSERT_GT(line, 0);
    const std::string place = "t.toml:" + std::to_string(line) + ":";
    EXPECT_EQ(message.substr(0, place.size()), place) << message;
    EXPECT_NE(message.find(std::string(": ") + change.sentence), std::string::npos) << message;
}

constexpr const char* green_row =
    "{ nm = [400, 700],      s = [5e-6, 10],       H = 18,       t_power = 0.75, factors = [\"CE\"], "
    "provenance = \"P2\" }";

const Change changes[]{
    {"format", "format = 1", "format = 2", "format = 2",
     "the format of the table is the number 2; accepted: format = 1"},
    {"unknown_key_at_top", "format = 1", "format = 1\nfromat = 1", "fromat",
     "unknown key \"fromat\"; accepted: format, edition, provenance, factor, aperture, limits"},
    {"unknown_key_in_edition", "status       = \"current\"", "state = \"current\"",
     "state =", "unknown key \"state\" in edition; accepted: id, issuer"},
    {"unknown_key_in_row", "H = 18,       t_power", "H = 18, power_of_t = 0, t_power", "power_of_t",
     "unknown key \"power_of_t\" in limits[2].rows[2]"},
    {"missing_edition_title", "title        = \"ICNIRP", "text_note_ = \"ICNIRP", "text_note_",
     "unknown key \"text_note_\" in edition"},
    {"no_id", "id           = \"icnirp_2013_laser\"\n", "", "[edition]",
     "the key \"id\" is missing in edition; accepted: id = \"…\""},
    {"year", "year         = 2013", "year = 1e300", "year = 1e300",
     "the year is the number 1e+300; accepted: year = 2013"},
    {"edition_without_end", "s            = [1e-13, 3e4]", "s = [1e-13, \"max\"]", "s = [1e-13, \"max\"]",
     "the range s of the edition is not bounded; accepted: s = [from, to], both finite and above zero"},
    {"unknown_factor", "factors = [\"CE\"], s_end", "factors = [\"CX\"], s_end", "\"CX\"",
     "unknown factor \"CX\"; accepted: CA, CB, CC, alpha_min, alpha_max, CE, T1, T2, gamma_ph, skin_area"},
    {"factor_power_not_a_number", "\"T2^-0.25\"", "\"T2^half\"", "T2^half", "\"half\" is not a number"},
    {"factor_before_it_is_given", "value = \"alpha_mrad/alpha_min\"", "value = \"alpha_mrad/T2\"",
     "alpha_mrad/T2", "the formula \"alpha_mrad/T2\" is not understood at \"T2\""},
    {"factor_twice", "symbol = \"CB\"", "symbol = \"CA\"",
     "symbol = \"CA\"\nmeaning = \"correction for the wavelength of the retinal",
     "the factor \"CA\" is given twice"},
    {"factor_named_like_a_variable", "symbol = \"CB\"", "symbol = \"t_s\"", "symbol = \"t_s\"",
     "the factor \"t_s\" is given twice"},
    {"unknown_variable", "over = \"t_s\"", "over = \"time\"", "over = \"time\"",
     "unknown variable \"time\"; accepted: wavelength_nm, t_s, alpha_mrad, area_m2"},
    {"unknown_provenance", "nm_end = \"included\", provenance = \"M\" }",
     "nm_end = \"included\", provenance = \"Q\" }", "provenance = \"Q\"",
     "unknown provenance \"Q\"; accepted: A1, A2"},
    {"row_without_provenance", "factors = [\"CE\"], s_end = \"included\", provenance = \"M\" }",
     "factors = [\"CE\"], s_end = \"included\" }", "factors = [\"CE\"], s_end = \"included\" }",
     "the key \"provenance\" is missing in limits[2].rows[0]"},
    {"factor_without_provenance", "provenance = \"F1\"\npieces", "pieces", "^symbol = \"CA\"",
     "the key \"provenance\" is missing in factor[0]"},
    {"empty_provenance", "M  = \"from memory\"", "M  = \"\"", "M  = \"\"", "provenance \"M\" has no text"},
    {"provenance_not_a_table", "[provenance]\n", "[provenance]\nM3 = 5\n", "M3 = 5",
     "provenance \"M3\" has no text"},
    {"section_without_clause", "aperture = \"eye-ultraviolet\"\nclause = \"Table 5\"",
     "aperture = \"eye-ultraviolet\"", "^title = \"Eye, ultraviolet, photochemical\"",
     "the key \"clause\" is missing in limits[0]"},
    {"factor_without_clause", "over = \"wavelength_nm\"\nclause = \"table of correction factors\"",
     "over = \"wavelength_nm\"", "^symbol = \"CA\"", "the key \"clause\" is missing in factor[0]"},
    {"empty_clause", "aperture = \"eye-ultraviolet\"\nclause = \"Table 5\"",
     "aperture = \"eye-ultraviolet\"\nclause = \"\"", "clause = \"\"",
     "the clause is empty; accepted: the table or clause of the document"},
    {"unknown_effect", "effect = \"skin thermal\"", "effect = \"skin burn\"", "skin burn",
     "unknown effect \"skin burn\"; accepted: retinal thermal, retinal photochemical"},
    {"unknown_tissue", "tissue = \"skin\"\neffect = \"skin thermal\"",
     "tissue = \"hair\"\neffect = \"skin thermal\"", "tissue = \"hair\"",
     "unknown tissue \"hair\"; accepted: eye, skin"},
    {"unknown_aperture", "aperture = \"eye-anterior\"", "aperture = \"eye-antenna\"", "eye-antenna",
     "unknown aperture \"eye-antenna\"; accepted: an aperture given before"},
    {"gap", "s = [1e-9, 1e-3],     H = 1000", "s = [1e-8, 1e-3],     H = 1000",
     "^title = \"Eye, cornea, infrared\"", "the rows leave a gap in \"Eye, cornea, infrared\" at "},
    {"overlap", "s = [1e-9, 1e-3],     H = 1000", "s = [1e-10, 1e-3],     H = 1000",
     "^title = \"Eye, cornea, infrared\"", "the rows overlap in \"Eye, cornea, infrared\" at "},
    {"gap_in_subtense", "alpha_mrad = [0, 1.5], provenance = \"P2\"",
     "alpha_mrad = [0, 1.4], provenance = \"P2\"", "^title = \"Eye, retina, thermal\"",
     "the rows leave a gap in \"Eye, retina, thermal\" at "},
    {"row_outside_cover", "nm = [400, 700],      s = [1e-13, 1e-9],    E = 2e11",
     "nm = [380, 700],      s = [1e-13, 1e-9],    E = 2e11",
     "^title = \"Skin, visible and infrared, thermal\"",
     "a row reaches outside what is covered in \"Skin, visible and infrared, thermal\" at "},
    {"edition_not_covered", "nm           = [180, 1e6]", "nm           = [180, 2e6]", "# ICNIRP 2013, limits",
     "no limit for the eye at "},
    {"limit_is_text", green_row, "{ nm = [400, 700], s = [5e-6, 10], H = \"18\", provenance = \"P2\" }",
     "H = \"18\"", "H must be a finite number without a unit, the text \"18\" is not"},
    {"limit_is_nan", "H = 18,", "H = nan,", "H = nan",
     "H must be a finite number without a unit, the number nan is not"},
    {"limit_is_infinite", "H = 18,", "H = inf,", "H = inf",
     "H must be a finite number without a unit, the number inf is not"},
    {"limit_is_zero", "H = 18,", "H = 0,", "H = 0,", "the limit is not greater than zero"},
    {"limit_is_negative", "H = 18,", "H = -18,", "H = -18", "the limit is not greater than zero"},
    {"power_of_t_is_text", "t_power = 0.25, provenance", "t_power = \"1/4\", provenance", "\"1/4\"",
     "t_power must be a finite number without a unit, the text \"1/4\" is not"},
    {"two_quantities", "E = 3e10,", "E = 3e10, H = 30,", "H = 30,     nm_end",
     "a row needs exactly one of H, E, D, L"},
    {"no_quantity", "E = 3e10,", "", "s = [1e-13, 1e-9],         nm_end",
     "a row needs exactly one of H, E, D, L"},
    {"bad_formula", "value = \"200*t_s^0.5\"", "value = \"200*t_s^\"", "200*t_s^\"",
     "the formula \"200*t_s^\" is not understood at \"\""},
    {"unknown_name_in_formula", "value = \"200*t_s^0.5\"", "value = \"200*t^0.5\"", "200*t^0.5",
     "the formula \"200*t^0.5\" is not understood at \"t^0.5\""},
    {"formula_is_a_number", "value = \"200*t_s^0.5\"", "value = 200", "value = 200",
     "value must be a text in quotation marks, the number 200 is not"},
    {"formula_gives_zero", "value = \"200*t_s^0.5\"", "value = \"0*t_s\"", "s = [5e-6, 10],       H = 18",
     "the limit of this row is not a positive number at "},
    {"formula_gives_no_number", "value = \"10^(0.02*(wavelength_nm - 450))\"",
     "value = \"(400 - wavelength_nm)^0.5\"", "s = [10, 100],        H = 100",
     "the limit of this row is not a positive number at "},
    {"factor_with_a_gap", "{ from = 1050, to = 1400, value = \"5\" }",
     "{ from = 1060, to = 1400, value = \"5\" }", "from = 1060",
     "the pieces of CA leave a gap or overlap here"},
    {"factor_without_pieces", "pieces = [ { from = \"min\", to = \"max\", value = \"1.5\" } ]", "pieces = []",
     "pieces = []", "alpha_min has no pieces"},
    {"factor_not_defined_over_the_row", "{ from = 1050, to = 1400, value = \"5\" }",
     "{ from = 1050, to = 1300, value = \"5\" }", "nm = [700, 1400],     s = [10, 3e4],        E = 10",
     "the factor CA is not defined over the whole row"},
    {"factor_of_subtense_without_its_ends", "{ from = \"min\",       to = \"alpha_min\", value = \"1\" }",
     "{ from = 0.1,       to = \"alpha_min\", value = \"1\" }", "s = [1e-13, 1e-11],   H = 1e-3",
     "the factor CE is not defined over the whole row"},
    {"factor_of_a_factor_not_defined", "{ from = \"min\",    to = 0.000625, value = \"5\" }",
     "{ from = 1e-6,    to = 0.000625, value = \"5\" }", "s = [1e-13, 1e-11],   H = 1e-3",
     "the factor alpha_max is not defined over the whole row"},
    {"end_that_follows_the_wavelength", "s = [10, \"T2\"]", "s = [10, \"T1\"]", "s = [10, \"T1\"]",
     "the factor T1 depends on wavelength_nm and cannot be an end of a row"},
    {"unknown_end", "s = [10, \"T2\"]", "s = [10, \"T9\"]", "s = [10, \"T9\"]",
     "unknown factor \"T9\" in s; accepted: a number or a factor given before"},
    {"descending_range", "nm = [400, 600],      s = [10, 100]", "nm = [600, 400],      s = [10, 100]",
     "[600, 400]", "the range nm does not ascend"},
    {"range_with_three_ends", "nm = [400, 600],      s = [10, 100]",
     "nm = [400, 500, 600],      s = [10, 100]", "[400, 500, 600]",
     "nm must have two ends; accepted: nm = [from, to]"},
    {"range_not_a_list", "nm = [400, 600],      s = [10, 100]", "nm = 400,      s = [10, 100]", "nm = 400, ",
     "nm must be a list, the number 400 is not"},
    {"end_is_nan", "nm = [400, 600],      s = [10, 100]", "nm = [400, 600],      s = [10, nan]",
     "s = [10, nan]", "s must be a number, the number nan is not"},
    {"included_misspelt", "s_end = \"included\"", "s_end = \"yes\"", "s_end = \"yes\"",
     "s_end is \"yes\"; accepted: \"included\", or leave the key out"},
    {"aperture_not_a_formula", "diameter_mm = \"7\"", "diameter_mm = \"7 mm\"", "7 mm",
     "the formula \"7 mm\" is not understood at \"mm\""},
    {"aperture_uses_a_factor", "diameter_mm = \"7\"", "diameter_mm = \"7*CE\"", "7*CE",
     "the formula \"7*CE\" is not understood at \"CE\""},
    {"aperture_is_zero", "diameter_mm = \"7\"", "diameter_mm = \"0\"", "s = [1e-13, 1e-11],   H = 1e-3",
     "the aperture of this row is not a positive number at "},
    {"aperture_does_not_reach", "{ nm = [400, 1400], s = [0, \"max\"], diameter_mm = \"7\" }",
     "{ nm = [400, 1300], s = [0, \"max\"], diameter_mm = \"7\" }",
     "nm = [1050, 1400],    s = [1e-13, 1e-11]", "the aperture \"eye-retina\" does not cover this row"},
    {"aperture_with_a_gap_inside", "s = [0.35, 10],    diameter_mm", "s = [0.5, 10],    diameter_mm",
     "nm = [1400, 1500],    s = [1e-3, 10]", "the aperture \"eye-infrared\" does not cover this row"},
    {"aperture_twice", "id = \"eye-ultraviolet\"", "id = \"eye-retina\"",
     "id = \"eye-retina\"\nclause = \"table of limiting apertures\"\nprovenance = \"A4\"",
     "the aperture \"eye-retina\" is given twice"},
    {"power_of_t_above_one", "t_power = 0.75, factors = [\"CE\"], provenance",
     "t_power = 1.5, factors = [\"CE\"], provenance", "t_power = 1.5",
     "the power of t is 1.5; accepted: from 0 to 1"},
    {"radiance_row_that_stands_alone", "alternative_form = true\n", "", "D = 1e6",
     "a row in D or L stands alone"},
    {"factor_piece_that_descends", "{ from = 700,  to = 1050,", "{ from = 700,  to = 600,", "to = 600",
     "the piece of CA does not ascend"},
    {"flag_is_text", "alternative_form = true", "alternative_form = \"yes\"", "alternative_form = \"yes\"",
     "alternative_form must be true or false, the text \"yes\" is not"},
    {"power_of_t_negative", "t_power = 0.75", "t_power = -0.25", "t_power = -0.25",
     "the power of t is -0.25; accepted: from 0 to 1"},
    {"alpha_min_not_defined_over_the_retina",
     "over = \"alpha_mrad\"\nclause = \"table of correction factors\"\nprovenance = \"F1\"\npieces = [ { "
     "from = \"min\", to = \"max\", value = \"1.5\" } ]",
     "over = \"wavelength_nm\"\nclause = \"table of correction factors\"\nprovenance = \"F1\"\npieces = [ { "
     "from = 400, to = 700, value = \"1.5\" } ]",
     "nm = [700, 1050],     s = [1e-13, 1e-11]", "the factor alpha_min is not defined over the whole row"},
    {"no_rows", "note = \"An equivalent form", "rows_ = \"An equivalent form", "rows_",
     "unknown key \"rows_\" in limits[4]"},
    {"no_covers", "covers = [{ nm = [1200, 1400], s = [1e-13, 3e4] }]", "covers = []", "covers = []",
     "the section does not say what it covers"},
};

INSTANTIATE_TEST_SUITE_P(OneChange, Refusals, ::testing::ValuesIn(changes),
                         [](const auto& change) { return change.param.name; });

TEST(RefusedTables, NotTomlAtAll) {
    EXPECT_NE(message_of([] { LimitSet::read("[edition\n", "t.toml"); }).find("t.toml:1:"),
              std::string::npos);
    EXPECT_EQ(message_of([] { LimitSet::read("", "t.toml"); }),
              "t.toml:1:1: the file is empty; accepted: a TOML text file");
    EXPECT_EQ(message_of([] { LimitSet::read("format = 1\n", "t.toml"); }),
              "t.toml:1:1: the table \"edition\" is missing; accepted: [edition]");
}

TEST(RefusedTables, NoLimits) {
    std::string table = real_table();
    table.resize(table.find("[[limits]]"));
    EXPECT_EQ(message_of([&] { LimitSet::read(table, "t.toml"); }),
              "t.toml:1:1: the table has no limits; accepted: [[limits]]");
}

TEST(RefusedTables, FarTooManyFactors) {
    std::string table = real_table();
    std::string more;
    for (int i = 0; i < 200; ++i)
        more += "[[factor]]\nsymbol = \"F" + std::to_string(i) +
                "\"\nmeaning = \"m\"\nover = \"t_s\"\nclause = \"c\"\nprovenance = \"M\"\n"
                "pieces = [ { from = \"min\", to = \"max\", value = \"1\" } ]\n";
    table.insert(table.find("[[factor]]"), more);
    EXPECT_NE(message_of([&] {
                  LimitSet::read(table, "t.toml");
              }).find("there are too many factors; accepted: at most 100"),
              std::string::npos);
}

TEST(AcceptedTable, IsTheRealOne) {
    EXPECT_EQ(message_of([] { LimitSet::read(real_table(), "t.toml"); }), "no error");
}

}  // namespace
}  // namespace dosimetry
