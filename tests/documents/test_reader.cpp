// What a good file gives, and where its values stand.

#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "limits/sha256.h"
#include "support/expect.h"
#include "support/files.h"
#include "support/setups.h"

namespace dosimetry {
namespace {

using testing_support::green_file;
using testing_support::green_file_with;

SetupDocument read(const std::string& text) {
    return read_setup(text, "f.toml", LimitLibrary::embedded());
}

TEST(ReadSetup, EveryKeyArrives) {
    const SetupDocument document = read(green_file);
    const dosimetry::Setup& setup = document.setup;
    EXPECT_EQ(setup.title, "Alignment");
    EXPECT_EQ(setup.date, "2026-12-01");
    EXPECT_EQ(setup.limits, std::vector<std::string>{"icnirp_2013_laser"});
    dosimetry::Setup expected = testing_support::green_setup();
    expected.title = "Alignment";
    expected.date = "2026-12-01";
    EXPECT_EQ(setup, expected);
    EXPECT_EQ(document.sha256, sha256_hex(green_file));
}

TEST(ReadSetup, PlacesPointAtTheValues) {
    const SetupDocument document = read(green_file);
    const auto place = [&](const std::string& key) {
        const TextPosition p = document.place_of(key, "f.toml");
        return p.file + ":" + std::to_string(p.line) + ":" + std::to_string(p.column);
    };
    EXPECT_EQ(place("source[0].wavelength"), "f.toml:11:14");
    EXPECT_EQ(place("source[0].emission.power"), "f.toml:14:9");
    EXPECT_EQ(place("position[0].exposure"), "f.toml:24:12");
    // a key that is not there: the nearest around it; none at all: the start of the file
    EXPECT_EQ(place("source[0].beam.m2"), "f.toml:15:1");
    EXPECT_EQ(place("position[7].exposure"), "f.toml:21:1");
    EXPECT_EQ(place("nothing"), "f.toml:1:1");
}

TEST(ReadSetup, OptionalKeysMayBeLeftOut) {
    const dosimetry::Setup setup =
        read(green_file_with("title = \"Alignment\"\ndate = 2026-12-01\n", "")).setup;
    EXPECT_EQ(setup.title, "");
    EXPECT_EQ(setup.date, "");
    const dosimetry::Setup both = read(green_file_with("tissues = [\"eye\", \"skin\"]\n", "")).setup;
    EXPECT_TRUE(both.positions[0].eye);
    EXPECT_TRUE(both.positions[0].skin);
    EXPECT_EQ(
        read(green_file_with("tissues = [\"eye\", \"skin\"]", "tissues = [\"skin\"]\nviewing = \"unaided\""))
            .setup.positions[0]
            .eye,
        false);
}

TEST(ReadSetup, EveryProfileAndWidthByItsName) {
    EXPECT_EQ(read(green_file_with("\"gaussian\"", "\"top-hat\"")).setup.sources[0].beam.profile,
              Profile::top_hat);
    for (const auto& [name, width] :
         {std::pair{"1/e2", WidthDefinition::one_over_e2}, std::pair{"1/e", WidthDefinition::one_over_e},
          std::pair{"FWHM", WidthDefinition::fwhm}, std::pair{"D4sigma", WidthDefinition::d4sigma},
          std::pair{"63%", WidthDefinition::enclosed_63}, std::pair{"86.5%", WidthDefinition::enclosed_86}})
        EXPECT_EQ(read(green_file_with("\"1/e2\"", std::string("\"") + name + "\""))
                      .setup.sources[0]
                      .beam.measured_at,
                  width);
}

TEST(ReadSetup, OldDatesKeepFourDigits) {
    EXPECT_EQ(read(green_file_with("2026-12-01", "0987-01-02")).setup.date, "0987-01-02");
}

TEST(ReadSetup, TheExampleFilesAreRead) {
    int files = 0;
    for (const auto& entry : std::filesystem::directory_iterator(EXAMPLES)) {
        if (entry.path().extension() != ".toml") continue;
        ++files;
        EXPECT_NO_THROW(read(testing_support::bytes_of(entry.path()))) << entry.path();
    }
    EXPECT_GE(files, 1);
}

}  // namespace
}  // namespace dosimetry
