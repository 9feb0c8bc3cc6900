// What an input error says and carries.

#include "quantities/input_error.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

TEST(InputErrorText, PlaceProblemAndWhatWouldBeAccepted) {
    const InputError bare("the power is \"x\"", "5 mW");
    EXPECT_STREQ(bare.what(), "the power is \"x\"; accepted: 5 mW");
    EXPECT_EQ(bare.sentence(), "the power is \"x\"; accepted: 5 mW");
    const InputError placed = bare.with_key("source[0].power").at({"a.toml", 7, 9});
    EXPECT_STREQ(placed.what(), "a.toml:7:9: the power is \"x\"; accepted: 5 mW");
    EXPECT_EQ(placed.key(), "source[0].power");
    EXPECT_EQ(placed.where().line, 7);
    EXPECT_STREQ(InputError("no such file", "", "", {"a.toml", 0, 0}).what(), "a.toml: no such file");
}

TEST(Quoted, ShortensAndHidesControlCharacters) {
    EXPECT_EQ(quoted("5 mW"), "\"5 mW\"");
    EXPECT_EQ(quoted("a\nb\x7F"), "\"a?b?\"");
    EXPECT_EQ(quoted(std::string(60, 'a')), "\"" + std::string(60, 'a') + "\"");
    EXPECT_EQ(quoted(std::string(61, 'a')), "\"" + std::string(60, 'a') + "…\"");
    // A character of two bytes is never cut in half.
    EXPECT_EQ(quoted(std::string(59, 'a') + "µm and more"), "\"" + std::string(59, 'a') + "µ…\"");
}

}  // namespace
}  // namespace dosimetry
