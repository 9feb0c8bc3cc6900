// Files that are not text, or far too much of it.

#include "documents/files.h"
#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "support/expect.h"
#include "support/files.h"

namespace dosimetry {
namespace {

using testing_support::green_file;
using testing_support::green_file_with;
using testing_support::message_of;

std::string refusal(const std::string& bytes) {
    return message_of([&] { read_setup(bytes, "f.toml", LimitLibrary::embedded()); });
}

std::string in_utf16(const std::string& ascii, bool big_endian) {
    std::string bytes = big_endian ? "\xFE\xFF" : "\xFF\xFE";
    for (char c : ascii) {
        if (big_endian) bytes += '\0';
        bytes += c;
        if (!big_endian) bytes += '\0';
    }
    return bytes;
}

TEST(Bytes, Empty) {
    EXPECT_EQ(refusal(""), "f.toml:1:1: the file is empty; accepted: a TOML text file");
    EXPECT_EQ(refusal(" \n\t\r\n"), "f.toml:1:1: the file is empty; accepted: a TOML text file");
}

TEST(Bytes, CommentsOnly) {
    EXPECT_EQ(refusal("# nothing yet\n"), "f.toml:1:1: the key \"format\" is missing; accepted: format = 1");
}

TEST(Bytes, ZeroByte) {
    EXPECT_EQ(refusal(green_file_with("Alignment", std::string("Align\0ment", 10))),
              "f.toml:4:15: the file is not a text file, it holds a zero byte; accepted: a TOML text file in "
              "UTF-8");
}

TEST(Bytes, ABinaryFile) {
    const std::string png("\x89PNG\r\n\x1A\n\0\0\0\rIHDR", 16);
    EXPECT_EQ(refusal(png),
              "f.toml:1:1: the file is not encoded in UTF-8; accepted: a TOML text file in UTF-8");
    const std::string elf(
        "\x7F"
        "ELF\x02\x01\x01\0\0\0",
        10);
    EXPECT_EQ(
        refusal(elf),
        "f.toml:1:8: the file is not a text file, it holds a zero byte; accepted: a TOML text file in UTF-8");
}

TEST(Bytes, Utf16) {
    for (bool big_endian : {false, true})
        EXPECT_EQ(refusal(in_utf16(green_file, big_endian)),
                  "f.toml:1:1: the file is not encoded in UTF-8; accepted: a TOML text file in UTF-8");
}

TEST(Bytes, Latin1) {
    EXPECT_EQ(refusal(green_file_with("Alignment",
                                      "Pr\xFC"
                                      "fstand")),
              "f.toml:4:12: the file is not encoded in UTF-8; accepted: a TOML text file in UTF-8");
    EXPECT_EQ(refusal(green_file_with("\"5 W\"", "\"5 \xB5W\"")),
              "f.toml:14:12: the file is not encoded in UTF-8; accepted: a TOML text file in UTF-8");
}

// Overlong forms, surrogates and values above U+10FFFF are not UTF-8 (Unicode 15, table 3-7).
TEST(Bytes, SequencesThatOnlyLookLikeUtf8) {
    for (const char* bad : {"\xC0\xAF", "\xE0\x80\x80", "\xED\xA0\x80", "\xF0\x80\x80\x80",
                            "\xF4\x90\x80\x80", "\xF5\x80\x80\x80", "\x80", "\xE2\x82", "\xF0\x9F\x98"})
        EXPECT_EQ(refusal(green_file_with("Alignment", bad)),
                  "f.toml:4:10: the file is not encoded in UTF-8; accepted: a TOML text file in UTF-8");
    for (const char* good :
         {"\xC2\x80", "\xE0\xA0\x80", "\xED\x9F\xBF", "\xEE\x80\x80", "\xF0\x90\x80\x80", "\xF4\x8F\xBF\xBF"})
        EXPECT_EQ(refusal(green_file_with("Alignment", good)), "no error");
}

TEST(Bytes, ColumnsCountCharactersNotBytes) {
    EXPECT_EQ(refusal(green_file_with("\"Alignment\"", "\"Größe\" # \xFF")).substr(0, 12), "f.toml:4:19:");
    EXPECT_EQ(refusal(green_file_with("[\"eye\", \"skin\"]", "[\"äöü\", 5]")).substr(0, 13), "f.toml:25:19:");
    EXPECT_EQ(refusal(green_file_with("\"Alignment\"", "\"Größe")),
              "f.toml:4:15: a text has no closing quotation mark on its line; accepted: TOML 1.0, such as "
              "power = \"5 mW\"");
}

TEST(Bytes, ByteOrderMarkAndWindowsLinesAreRead) {
    EXPECT_EQ(refusal("\xEF\xBB\xBF" + green_file), "no error");
    std::string windows;
    for (char c : green_file) windows += c == '\n' ? std::string("\r\n") : std::string(1, c);
    EXPECT_EQ(refusal(windows), "no error");
}

TEST(Bytes, AHundredMegabytesAreRefusedWithoutBeingRead) {
    const testing_support::TemporaryFolder folder;
    const auto path = folder.write("huge.toml", green_file);
    std::filesystem::resize_file(path, 100'000'000);
    const std::string bytes = read_file(path.string());
    EXPECT_EQ(bytes.size(), most_setup_bytes + 1);
    EXPECT_EQ(refusal(bytes),
              "f.toml:1:1: the file is longer than 1 MB; accepted: a TOML text file of a few kB");
}

TEST(Bytes, DeepNestingIsRefusedNotFollowed) {
    EXPECT_NE(refusal("a = " + std::string(100'000, '[')), "no error");
    EXPECT_NE(refusal("a = " + std::string(100'000, '{')), "no error");
    EXPECT_EQ(refusal("a.a.a.a.a.a.a.a.a.a.a.a.a.a.a.a.a.a = 1"),
              "f.toml:1:34: a key has more than 16 dots; accepted: keys such as source.beam");
    std::string dotted = "\"a\"";
    for (int i = 0; i < 100'000; ++i) dotted += ".a";
    EXPECT_NE(refusal(dotted + " = 1"), "no error");
    EXPECT_NE(refusal("[" + dotted + "]"), "no error");
}

TEST(Bytes, DotsInTextsAndCommentsAreNoKeys) {
    const std::string dots(100, '.');
    EXPECT_EQ(refusal("# " + dots + "\n" + green_file_with("\"Alignment\"", "\"" + dots + "\" # " + dots)),
              "no error");
    EXPECT_EQ(refusal(green_file_with("\"Alignment\"", "\"\"\"\n" + dots + "\\\"" + dots + "\n\"\"\"")),
              "no error");
    EXPECT_EQ(refusal(green_file_with("\"Alignment\"", "'a\\" + dots + "'")), "no error");
}

TEST(Bytes, NumbersThatADoubleCannotHold) {
    EXPECT_NE(refusal(green_file_with("\"5 W\"", "1e400")), "no error");
    EXPECT_EQ(refusal(green_file_with("\"0.5 m\"", "\"1e-400 m\"")),
              "f.toml:23:6: length expected, the number \"1e-400\" is too large or too small to calculate "
              "with; accepted: "
              "magnitudes from 1e-300 to 1e300 (for example 532 nm)");
}

TEST(Bytes, ALongValueIsShortenedInTheMessage) {
    const std::string message = refusal(green_file_with("\"5 W\"", "\"" + std::string(900'000, 'x') + "\""));
    EXPECT_LT(message.size(), 300u);
    EXPECT_NE(message.find("xxx…"), std::string::npos);
}

}  // namespace
}  // namespace dosimetry
