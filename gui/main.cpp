// The window, and without a display the sheet: photon-margin [FILE], photon-margin --sheet OUT.pdf FILE.
// Exit status with --sheet: 0 the sheet was written, 2 it was not.

#include <CLI/CLI.hpp>
#include <QApplication>
#include <QFile>
#include <QFileInfo>
#include <cstdio>

#include "documents/files.h"
#include "documents/result.h"
#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "session/recovery.h"
#include "session/session.h"
#include "sheet/sheet_writer.h"
#include "window/main_window.h"

namespace {

constexpr int notWritten = 2;

int writeSheet(const std::string& output, const std::string& input, const std::string& paper) {
    using namespace dosimetry;
    try {
        if (QFileInfo(QFile::decodeName(output.c_str())) == QFileInfo(QFile::decodeName(input.c_str())))
            throw InputError("the sheet would replace the assessment file", "another name for the sheet", "",
                             {output, 0, 0});
        const LimitLibrary& library = LimitLibrary::embedded();
        const std::string bytes = read_file(input);
        const SetupDocument document = read_setup(bytes, input, library);
        const Assessment assessment = assess(document.setup, library, Trails::record);
        for (const Uncovered& u : assessment.uncovered)
            std::fprintf(
                stderr, "%s\n",
                InputError("not covered: " + u.reason, "", "", document.place_of(u.key, input)).what());
        if (!assessment.covered()) return notWritten;
        writeSheetPdf(QFile::decodeName(output.c_str()), document.setup, assessment,
                      QByteArray::fromStdString(bytes), paperSize(QString::fromStdString(paper)));
        return 0;
    } catch (const InputError& error) {
        std::fprintf(stderr, "%s\n", error.what());
        return notWritten;
    }
}

}  // namespace

int main(int argc, char** argv) {
    CLI::App options("Laser photon-dose safety assessment with a sheet to sign.", "photon-margin");
    options.set_version_flag("--version", dosimetry::program_name());
    std::string sheet;
    std::string file;
    std::string paper = "A4";
    auto* sheetOption = options.add_option(
        "--sheet", sheet, "write the assessment sheet of FILE to this PDF and end; needs no display");
    options.add_option("--paper", paper, "paper of the sheet, A4 or Letter")
        ->check(CLI::IsMember({"A4", "Letter"}, CLI::ignore_case))
        ->needs(sheetOption);
    options.add_option("FILE", file, "assessment file (TOML)");
    try {
        options.parse(argc, argv);
    } catch (const CLI::ParseError& error) {
        return options.exit(error) == 0 ? 0 : notWritten;
    }
    if (!sheet.empty() && file.empty()) {
        std::fprintf(stderr, "--sheet needs the assessment file: photon-margin --sheet OUT.pdf FILE.toml\n");
        return notWritten;
    }
    if (!sheet.empty()) qputenv("QT_QPA_PLATFORM", "offscreen");
    QGuiApplication::setHighDpiScaleFactorRoundingPolicy(Qt::HighDpiScaleFactorRoundingPolicy::PassThrough);
    QApplication application(argc, argv);
    QApplication::setOrganizationName("photon-margin");
    QApplication::setApplicationName("photon-margin");
    if (!sheet.empty()) return writeSheet(sheet, file, paper);

    Session session;
    Recovery recovery(session, Recovery::usualFolder());
    MainWindow window(session);
    window.show();
    window.offerRecovery(recovery);
    if (!file.empty()) window.openFile(QFile::decodeName(file.c_str()));
    return QApplication::exec();
}
