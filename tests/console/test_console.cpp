// The photon-dose command as a script sees it: exit status, standard output, standard error.

#include <sys/wait.h>

#include <cstdlib>
#include <nlohmann/json.hpp>

#include "limits/sha256.h"
#include "support/expect.h"
#include "support/files.h"

namespace dosimetry {
namespace {

using testing_support::bytes_of;
using testing_support::green_file;
using testing_support::green_file_with;

struct Outcome {
    int status = -1;
    std::string out;
    std::string err;
};

class Console : public ::testing::Test {
  protected:
    /// Runs the command with arguments as the shell takes them, `before` standing in front of it.
    Outcome run(const std::string& arguments, const std::string& before = "") const {
        const std::string out = (folder_.path() / "out").string();
        const std::string err = (folder_.path() / "err").string();
        const std::string command = before + " '" PHOTON_DOSE "' >'" + out + "' 2>'" + err + "' " + arguments;
        const int code = std::system(("cd '" + folder_.path().string() + "' && " + command).c_str());
        return {WIFEXITED(code) ? WEXITSTATUS(code) : -1, bytes_of(out), bytes_of(err)};
    }
    void write(const std::string& name, const std::string& bytes) const { folder_.write(name, bytes); }

  private:
    testing_support::TemporaryFolder folder_;
};

const std::string harmless = green_file_with("5 W", "0.5 mW");

TEST_F(Console, WithinLimitsIsZero) {
    write("a.toml", harmless);
    const Outcome outcome = run("assess a.toml");
    EXPECT_EQ(outcome.status, 0) << outcome.err;
    EXPECT_EQ(outcome.err, "");
    EXPECT_NE(outcome.out.find("at most 0.511 of the limit"), std::string::npos);
}

TEST_F(Console, AboveALimitIsOne) {
    write("a.toml", green_file);
    const Outcome outcome = run("assess a.toml");
    EXPECT_EQ(outcome.status, 1);
    EXPECT_EQ(outcome.err, "");
    EXPECT_NE(outcome.out.find("5104 times the limit"), std::string::npos);
    EXPECT_NE(outcome.out.find("does not replace one"), std::string::npos);
}

TEST_F(Console, ABadFileIsTwoWithThePlaceOfTheValue) {
    write("a.toml", green_file_with("\"5 W\"", "\"5 nm\""));
    const Outcome outcome = run("assess a.toml");
    EXPECT_EQ(outcome.status, 2);
    EXPECT_EQ(outcome.out, "");
    EXPECT_EQ(outcome.err,
              "a.toml:14:9: power expected, \"5 nm\" is a length; accepted: a value such as 5 mW\n");
}

TEST_F(Console, NotCoveredIsTwoWithThePlaceOfEachValue) {
    write("a.toml", green_file_with("0.25 s", "35 fs"));
    const Outcome outcome = run("assess a.toml --json");
    EXPECT_EQ(outcome.status, 2);
    EXPECT_EQ(outcome.out, "");
    EXPECT_EQ(outcome.err.substr(0, 26), "a.toml:24:12: not covered:") << outcome.err;
    EXPECT_NE(outcome.err.find("35 fs"), std::string::npos);
    write("b.toml", green_file_with("532 nm", "100 nm"));
    EXPECT_EQ(run("assess b.toml").err.substr(0, 26), "b.toml:11:14: not covered:");
    EXPECT_EQ(run("assess b.toml").status, 2);
}

TEST_F(Console, AMissingFileAndAFolderAreTwo) {
    EXPECT_EQ(run("assess nothing.toml").status, 2);
    EXPECT_EQ(
        run("assess nothing.toml").err,
        "nothing.toml: the file cannot be opened: No such file or directory; accepted: a readable file\n");
    EXPECT_EQ(run("assess .").status, 2);
    EXPECT_EQ(run("assess .").err, ".: this is a folder; accepted: an assessment file\n");
    EXPECT_EQ(run("assess .").out, "");
}

TEST_F(Console, JsonIsAllThatStandsOnStandardOutput) {
    write("a.toml", green_file);
    for (const char* arguments : {"assess a.toml --json", "assess --json a.toml"}) {
        const Outcome outcome = run(arguments);
        EXPECT_EQ(outcome.status, 1);
        EXPECT_EQ(outcome.err, "");
        const auto json = nlohmann::json::parse(outcome.out);
        EXPECT_EQ(json.size(), 9u);
        for (const char* key : {"format", "program", "title", "input_sha256", "limit_sets", "sources",
                                "positions", "hazard_distances", "cautions"})
            EXPECT_TRUE(json.contains(key)) << key;
        EXPECT_EQ(json["title"], "Alignment");
        EXPECT_EQ(json["input_sha256"], sha256_hex(green_file));
        EXPECT_NEAR(json["positions"][0]["governing"]["ratio"].get<double>(), 5103.8, 0.05);
    }
}

TEST_F(Console, ADashReadsStandardInput) {
    write("a.toml", green_file);
    const Outcome piped = run("assess - --json <a.toml");
    EXPECT_EQ(piped.status, 1);
    EXPECT_EQ(piped.out, run("assess a.toml --json").out);
    write("b.toml", green_file_with("\"5 W\"", "5"));
    const Outcome bad = run("assess - <b.toml");
    EXPECT_EQ(bad.status, 2);
    EXPECT_EQ(bad.err,
              "standard input:14:9: power is the number 5 without a unit; accepted: power = \"5 mW\"\n");
    EXPECT_EQ(run("assess - </dev/null").err,
              "standard input:1:1: the file is empty; accepted: a TOML text file\n");
}

TEST_F(Console, TheLocaleChangesNothing) {
    write("a.toml", green_file);
    const Outcome plain = run("assess a.toml");
    const Outcome json = run("assess a.toml --json");
    for (const char* locale : {"de_DE.UTF-8", "fr_FR.UTF-8", "C", "POSIX", "not-a-locale"}) {
        const std::string before =
            std::string("LC_ALL=") + locale + " LANG=" + locale + " LC_NUMERIC=" + locale;
        EXPECT_EQ(run("assess a.toml", before).out, plain.out) << locale;
        EXPECT_EQ(run("assess a.toml --json", before).out, json.out) << locale;
    }
}

TEST_F(Console, FileNamesMayHoldSpacesAndOtherScripts) {
    write("die grüne Bank.toml", green_file_with("\"5 W\"", "\"\""));
    EXPECT_EQ(run("assess 'die grüne Bank.toml'").err.substr(0, 28), "die grüne Bank.toml:14:9: p");
}

TEST_F(Console, AWrongCallIsTwo) {
    for (const char* arguments :
         {"", "assess", "asses a.toml", "assess a.toml b.toml", "assess a.toml --jsn", "--nonsense"}) {
        const Outcome outcome = run(arguments);
        EXPECT_EQ(outcome.status, 2) << arguments;
        EXPECT_EQ(outcome.out, "") << arguments;
        EXPECT_NE(outcome.err, "") << arguments;
    }
}

TEST_F(Console, HelpAndVersionAreZero) {
    EXPECT_EQ(run("--help").status, 0);
    EXPECT_EQ(run("assess --help").status, 0);
    const Outcome version = run("--version");
    EXPECT_EQ(version.status, 0);
    EXPECT_EQ(version.out.substr(0, 14), "photon-margin ");
}

// A result that did not arrive must not look like one.
TEST_F(Console, AFullDiskIsTwo) {
    write("a.toml", harmless);
    for (const char* arguments : {"assess a.toml", "assess a.toml --json"}) {
        const Outcome outcome = run(std::string(arguments) + " >/dev/full");
        EXPECT_EQ(outcome.status, 2);
        EXPECT_EQ(outcome.err, "photon-dose: the result cannot be written to standard output\n");
    }
}

}  // namespace
}  // namespace dosimetry
