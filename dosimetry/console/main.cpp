// The `photon-dose` command. Exit status: 0 assessed and within limits, 1 assessed and some limit exceeded,
// 2 not assessed (bad file, not covered, wrong call).

#include <CLI/CLI.hpp>
#include <cstdio>
#include <exception>
#include <stdexcept>
#include <string>

#include "documents/files.h"
#include "documents/result.h"
#include "documents/setup_document.h"
#include "limits/limit_library.h"

namespace {

constexpr int within = 0;
constexpr int exceeded = 1;
constexpr int not_assessed = 2;

void print(std::FILE* stream, const std::string& text) {
    std::fwrite(text.data(), 1, text.size(), stream);
}

/// A result that did not arrive whole (a full disk) must not pass for one.
void print_result(const std::string& text) {
    print(stdout, text);
    if (std::fflush(stdout) != 0 || std::ferror(stdout) != 0)
        throw std::runtime_error("the result cannot be written to standard output");
}

void complain(const dosimetry::TextPosition& where, const std::string& sentence) {
    print(stderr, dosimetry::InputError(sentence, "", "", where).what() + std::string("\n"));
}

int assess_file(const std::string& name, bool json) {
    using namespace dosimetry;
    const LimitLibrary& library = LimitLibrary::embedded();
    const std::string shown_name = name == "-" ? "standard input" : name;
    const SetupDocument document = read_setup(read_file(name), shown_name, library);
    const Assessment assessment = assess(document.setup, library, Trails::off);
    for (const Uncovered& u : assessment.uncovered)
        complain(document.place_of(u.key, shown_name), "not covered: " + u.reason);
    if (!assessment.covered()) return not_assessed;
    print_result(json ? result_json(document.setup, assessment, document.sha256)
                      : report(document.setup, assessment));
    return assessment.within_limits() ? within : exceeded;
}

}  // namespace

int main(int argc, char** argv) {
    CLI::App app("Laser photon-dose safety assessment. Supports a competent person, does not replace one.",
                 "photon-dose");
    app.set_version_flag("--version", dosimetry::program_name());
    app.require_subcommand(1);
    std::string file;
    bool json = false;
    CLI::App* assess = app.add_subcommand("assess", "Assess a file and print the report");
    assess->add_option("FILE", file, "assessment file (TOML), - for standard input")->required();
    assess->add_flag("--json", json, "print the result as JSON instead");
    try {
        app.parse(argc, argv);
        return assess_file(file, json);
    } catch (const CLI::ParseError& error) {
        return app.exit(error) == 0 ? 0 : not_assessed;
    } catch (const dosimetry::InputError& error) {
        print(stderr, error.what() + std::string("\n"));
    } catch (const std::exception& error) {
        print(stderr, "photon-dose: " + std::string(error.what()) + "\n");
    }
    return not_assessed;
}
