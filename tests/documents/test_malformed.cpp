// The collection of malformed files: each is refused with exactly the message that malformed/expected.txt
// holds.

#include <map>
#include <set>

#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "support/expect.h"
#include "support/files.h"

namespace dosimetry {
namespace {

std::map<std::string, std::string> expected_messages() {
    std::map<std::string, std::string> messages;
    std::ifstream stream(std::filesystem::path(MALFORMED) / "expected.txt");
    for (std::string line; std::getline(stream, line);) messages[line.substr(0, line.find(':'))] = line;
    return messages;
}

std::set<std::string> files() {
    std::set<std::string> names;
    for (const auto& entry : std::filesystem::directory_iterator(MALFORMED))
        if (entry.path().extension() == ".toml") names.insert(entry.path().filename().string());
    return names;
}

class MalformedFile : public ::testing::TestWithParam<std::string> {};

TEST_P(MalformedFile, IsRefusedWithItsMessage) {
    const std::string bytes = testing_support::bytes_of(std::filesystem::path(MALFORMED) / GetParam());
    ASSERT_FALSE(bytes.empty());
    const auto read = [&] { read_setup(bytes, GetParam(), LimitLibrary::embedded()); };
    EXPECT_EQ(testing_support::message_of(read), expected_messages()[GetParam()]);
}

INSTANTIATE_TEST_SUITE_P(Collection, MalformedFile, ::testing::ValuesIn(files()),
                         [](const auto& name) { return name.param.substr(0, name.param.find('.')); });

TEST(MalformedFiles, EachHasAMessageAndEachMessageAFile) {
    std::set<std::string> named;
    for (const auto& [name, message] : expected_messages()) named.insert(name);
    EXPECT_EQ(named, files());
    EXPECT_GE(named.size(), 45u);
}

// Every message has a place, says what is wrong and what would be accepted.
TEST(MalformedFiles, MessagesHaveAPlaceAProblemAndARemedy) {
    for (const auto& [name, message] : expected_messages()) {
        const std::string place = message.substr(name.size(), message.find(' ') - name.size());
        EXPECT_EQ(std::count(place.begin(), place.end(), ':'), 3) << message;
        EXPECT_NE(message.find("; accepted: "), std::string::npos) << message;
        EXPECT_EQ(message.find(":0:"), std::string::npos) << message;
    }
}

}  // namespace
}  // namespace dosimetry
