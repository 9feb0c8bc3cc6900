// Opening files: what cannot be opened is an input error with the file's name.

#include "documents/files.h"

#include "support/expect.h"
#include "support/files.h"

namespace dosimetry {
namespace {

using testing_support::message_of;

TEST(ReadFile, GivesTheBytes) {
    const testing_support::TemporaryFolder folder;
    const std::string bytes = "a\r\n\xFF" + std::string(1, '\0') + "b";
    EXPECT_EQ(read_file(folder.write("x", bytes).string()), bytes);
}

TEST(ReadFile, RefusesWhatIsNoFile) {
    const testing_support::TemporaryFolder folder;
    const std::string missing = (folder.path() / "missing.toml").string();
    EXPECT_EQ(message_of([&] { read_file(missing); }),
              missing + ": the file cannot be opened: No such file or directory; accepted: a readable file");
    const std::string name = folder.path().string();
    EXPECT_EQ(message_of([&] { read_file(name); }),
              name + ": this is a folder; accepted: an assessment file");
    EXPECT_NE(message_of([] { read_file(""); }), "no error");
}

}  // namespace
}  // namespace dosimetry
