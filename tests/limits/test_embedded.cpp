// The tables inside the program are the files beside it, byte for byte.

#include <filesystem>
#include <fstream>
#include <sstream>

#include "limits/embedded_tables.h"
#include "limits/icnirp.h"
#include "limits/sha256.h"

namespace dosimetry {
namespace {

TEST(EmbeddedTables, AreTheFilesOfLimitsTables) {
    std::size_t files = 0;
    for (const auto& entry : std::filesystem::directory_iterator(TABLES))
        if (entry.path().extension() == ".toml") ++files;
    EXPECT_EQ(embedded_tables().size(), files);
    for (const EmbeddedTable& table : embedded_tables()) {
        std::ifstream stream(std::filesystem::path(TABLES) / table.file_name, std::ios::binary);
        std::ostringstream bytes;
        bytes << stream.rdbuf();
        EXPECT_EQ(bytes.str(), table.bytes) << table.file_name;
    }
}

TEST(EmbeddedTables, EveryEditionSaysWhereItsNumbersComeFrom) {
    for (const LimitSet& set : LimitLibrary::embedded().sets()) {
        EXPECT_FALSE(set.edition().title.empty());
        EXPECT_EQ(set.edition().sha256.size(), 64u);
        for (const LimitRow& row : set.rows()) {
            EXPECT_FALSE(row.clause.empty()) << row.line;
            EXPECT_FALSE(row.provenance.empty()) << row.line;
        }
        for (const Factor& factor : set.factors()) {
            EXPECT_FALSE(factor.clause.empty());
            EXPECT_FALSE(factor.provenance.empty());
        }
    }
}

TEST(LimitLibrary, FindsByIdOnly) {
    EXPECT_NE(LimitLibrary::embedded().find("icnirp_2013_laser"), nullptr);
    EXPECT_EQ(LimitLibrary::embedded().find("icnirp_2013"), nullptr);
    EXPECT_NE(LimitLibrary::embedded().ids().find("icnirp_2013_laser"), std::string::npos);
}

TEST(Icnirp2013Edition, IsMarkedAsNotReadInItsText) {
    const Edition& edition = testing_support::icnirp().edition();
    EXPECT_EQ(edition.year, 2013);
    EXPECT_EQ(edition.published_in, "Health Physics 105(3):271-295, 2013");
    EXPECT_FALSE(edition.text_read);
    EXPECT_FALSE(edition.text_note.empty());
}

// NIST, example values for FIPS 180-4: SHA-256 of "abc" and of the two-block message.
TEST(Sha256, Fips180ExampleValues) {
    EXPECT_EQ(sha256_hex("abc"), "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
    EXPECT_EQ(sha256_hex("abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq"),
              "248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1");
}

}  // namespace
}  // namespace dosimetry
