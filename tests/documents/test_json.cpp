// The JSON result: the keys of the file format, finite numbers, null for what does not exist.

#include <nlohmann/json.hpp>

#include "assessment/assessment.h"
#include "documents/result.h"
#include "limits/limit_library.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using Json = nlohmann::json;
using testing_support::green_setup;

Json result_of(const dosimetry::Setup& setup) {
    return Json::parse(result_json(setup, assess(setup, LimitLibrary::embedded(), Trails::off), "abc"));
}

std::set<std::string> keys(const Json& object) {
    std::set<std::string> names;
    for (const auto& [key, value] : object.items()) names.insert(key);
    return names;
}

using Keys = std::set<std::string>;

TEST(ResultJson, HasExactlyTheKeysOfTheFormat) {
    const Json json = result_of(green_setup());
    EXPECT_EQ(keys(json), (Keys{"format", "program", "title", "input_sha256", "limit_sets", "sources",
                                "positions", "hazard_distances", "cautions"}));
    EXPECT_EQ(keys(json["limit_sets"][0]), (Keys{"id", "title", "sha256"}));
    EXPECT_EQ(keys(json["sources"][0]),
              (Keys{"id", "photon_energy_eV", "photon_rate_per_s", "class", "risk_group"}));
    const Json& position = json["positions"][0];
    EXPECT_EQ(keys(position),
              (Keys{"id", "exposure_s", "criteria", "combined", "governing", "permitted_exposure_s",
                    "permitted_power_factor", "required_optical_density"}));
    EXPECT_EQ(
        keys(position["criteria"][0]),
        (Keys{"limit_set", "source", "wavelength_nm", "tissue", "effect", "quantity", "unit", "exposure",
              "limit", "ratio", "margin", "rule", "aperture_m", "alpha_rad", "clause", "provenance"}));
    EXPECT_EQ(keys(position["combined"][0]), (Keys{"limit_set", "tissue", "effect", "ratio"}));
    EXPECT_EQ(keys(position["governing"]), (Keys{"limit_set", "tissue", "effect", "ratio"}));
    EXPECT_EQ(keys(position["required_optical_density"]), (Keys{"eye", "skin"}));
    EXPECT_EQ(keys(json["hazard_distances"][0]), (Keys{"source", "limit_set", "exposure_s", "tissue",
                                                       "viewing", "kind", "distance_m", "beyond_search_m"}));
}

TEST(ResultJson, HoldsTheNumbersOfTheSample) {
    const Json json = result_of(green_setup());
    EXPECT_EQ(json["format"], 1);
    EXPECT_EQ(json["input_sha256"], "abc");
    const Json& eye = json["positions"][0]["criteria"][0];
    EXPECT_EQ(eye["wavelength_nm"], 532.0);
    EXPECT_EQ(eye["effect"], "retinal thermal");
    EXPECT_EQ(eye["unit"], "W/m2");
    EXPECT_NEAR(eye["exposure"].get<double>(), 129922.4, 0.05);
    EXPECT_NEAR(eye["limit"].get<double>(), 25.456, 5e-4);
    EXPECT_NEAR(eye["ratio"].get<double>(), 5103.8, 0.05);
    EXPECT_EQ(eye["aperture_m"], 0.007);
    EXPECT_EQ(eye["alpha_rad"], 0.0015);
    EXPECT_TRUE(json["positions"][0]["criteria"][1]["alpha_rad"].is_null());
    EXPECT_NEAR(json["hazard_distances"][0]["distance_m"].get<double>(), 707.2, 0.05);
    EXPECT_TRUE(json["hazard_distances"][0]["beyond_search_m"].is_null());
    EXPECT_TRUE(json["sources"][0]["class"].is_null());
}

TEST(ResultJson, NullWhereThereIsNoAnswer) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("1e9 W");
    setup.sources[0].beam.divergence = Stated<PlaneAngle>("1e-9 rad");
    setup.positions[0].skin = false;
    const Json json = result_of(setup);
    EXPECT_TRUE(json["positions"][0]["permitted_exposure_s"].is_null());
    EXPECT_TRUE(json["positions"][0]["required_optical_density"]["skin"].is_null());
    EXPECT_TRUE(json["hazard_distances"][0]["distance_m"].is_null());
    EXPECT_EQ(json["hazard_distances"][0]["beyond_search_m"], 1e6);
}

TEST(ResultJson, WavelengthsCarryNoBinaryNoise) {
    dosimetry::Setup setup = green_setup();
    for (const auto& [text, nm] :
         {std::pair{"1064 nm", 1064.0}, std::pair{"1.2 um", 1200.0}, std::pair{"10.6 um", 10600.0},
          std::pair{"0.2536517 um", 253.6517}, std::pair{"1 mm", 1e6}}) {
        setup.sources[0].wavelength = Stated<Length>(text);
        EXPECT_EQ(result_of(setup)["positions"][0]["criteria"][0]["wavelength_nm"], nm) << text;
    }
}

/// Every number of a document.
void visit_numbers(const Json& json, std::size_t& count) {
    if (json.is_structured())
        for (const Json& element : json) visit_numbers(element, count);
    if (json.is_number()) ++count;
}

// Json::dump writes null for a number that is not finite; so as many numbers must come out as the keys
// promise.
RC_GTEST_PROP(ResultJsonProperty, EveryNumberIsFinite, ()) {
    const dosimetry::Setup setup = *testing_support::any_setup();
    const Json json = result_of(setup);
    for (const Json& c : json["positions"][0]["criteria"]) {
        for (const char* key : {"wavelength_nm", "exposure", "limit", "ratio", "margin", "aperture_m"})
            RC_ASSERT(c[key].is_number());
    }
    for (const char* key : {"exposure_s", "permitted_power_factor"})
        RC_ASSERT(json["positions"][0][key].is_number());
    for (const Json& d : json["hazard_distances"])
        RC_ASSERT(d["distance_m"].is_null() != d["beyond_search_m"].is_null());
    std::size_t count = 0;
    visit_numbers(json, count);
    RC_ASSERT(count >= 10u);
}

TEST(ResultJson, AnyTitleIsWritten) {
    dosimetry::Setup setup = green_setup();
    setup.title = "\"quoted\"\n\t\x01 漢字 👩‍🔬 \\";
    EXPECT_EQ(result_of(setup)["title"], setup.title);
}

}  // namespace
}  // namespace dosimetry
