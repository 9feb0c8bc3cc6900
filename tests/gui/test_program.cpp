// The built program as it is called without a display.

#include <gtest/gtest.h>

#include <QProcess>
#include <QTemporaryDir>

#include "support.h"

namespace {

struct Call {
    int exitCode;
    QString errors;
};

Call call(const QStringList& arguments, const QStringList& environment = {}) {
    QProcess process;
    QProcessEnvironment variables = QProcessEnvironment::systemEnvironment();
    variables.remove("DISPLAY");
    variables.remove("QT_QPA_PLATFORM");
    for (const QString& entry : environment)
        variables.insert(entry.section('=', 0, 0), entry.section('=', 1));
    process.setProcessEnvironment(variables);
    process.start(PHOTON_MARGIN_PROGRAM, arguments);
    EXPECT_TRUE(process.waitForFinished());
    return {process.exitCode(), QString::fromUtf8(process.readAllStandardError())};
}

}  // namespace

TEST(Program, WritesTheSheetWithoutADisplay) {
    const QTemporaryDir folder;
    const QString out = folder.filePath("s.pdf");
    EXPECT_EQ(call({"--sheet", out, EXAMPLE_FILE}).exitCode, 0);
    EXPECT_TRUE(bytesOf(out).startsWith("%PDF-"));
}

TEST(Program, ABadFileIsNamedAndAnOldSheetStays) {
    const QTemporaryDir folder;
    const QString out = folder.filePath("s.pdf");
    const QString bad = folder.filePath("bad.toml");
    writeBytes(out, "old");
    writeBytes(bad, "format = 2\n");
    const Call result = call({"--sheet", out, bad});
    EXPECT_EQ(result.exitCode, 2);
    EXPECT_TRUE(result.errors.contains("bad.toml:1:10:")) << result.errors.toStdString();
    EXPECT_EQ(bytesOf(out), "old");
}

TEST(Program, NotCoveredIsSaidWithItsPlace) {
    const QTemporaryDir folder;
    const QString file = folder.filePath("deep.toml");
    writeBytes(file, bytesOf(EXAMPLE_FILE).replace("532 nm", "150 nm"));
    const Call result = call({"--sheet", folder.filePath("s.pdf"), file});
    EXPECT_EQ(result.exitCode, 2);
    EXPECT_TRUE(result.errors.contains("deep.toml:14:14: not covered: the wavelength 150 nm"))
        << result.errors.toStdString();
    EXPECT_FALSE(QFile::exists(folder.filePath("s.pdf")));
}

TEST(Program, AnOutputThatCannotBeWrittenIsNamed) {
    const Call result = call({"--sheet", "/nowhere/at/all/s.pdf", EXAMPLE_FILE});
    EXPECT_EQ(result.exitCode, 2);
    EXPECT_TRUE(result.errors.contains("/nowhere/at/all/s.pdf: the file cannot be written"))
        << result.errors.toStdString();
}

TEST(Program, TheSheetNeverReplacesItsOwnAssessment) {
    const QTemporaryDir folder;
    const QString file = folder.filePath("a.toml");
    const QByteArray bytes = bytesOf(EXAMPLE_FILE);
    writeBytes(file, bytes);
    EXPECT_EQ(call({"--sheet", file, file}).exitCode, 2);
    EXPECT_EQ(call({"--sheet", folder.path() + "/./a.toml", file}).exitCode, 2);
    EXPECT_EQ(bytesOf(file), bytes);
}

TEST(Program, ADeviceIsNotReplaced) {
    const Call result = call({"--sheet", "/dev/null", EXAMPLE_FILE});
    EXPECT_EQ(result.exitCode, 2);
    EXPECT_TRUE(result.errors.contains("no ordinary file"));
}

TEST(Program, WrongCallsAreRefused) {
    const QTemporaryDir folder;
    EXPECT_EQ(call({"--sheet", folder.filePath("s.pdf")}).exitCode, 2);
    EXPECT_EQ(call({"--paper", "A4", EXAMPLE_FILE}).exitCode, 2);
    EXPECT_EQ(call({"--sheet", folder.filePath("s.pdf"), "--paper", "A9", EXAMPLE_FILE}).exitCode, 2);
    EXPECT_EQ(call({"--nonsense"}).exitCode, 2);
}

TEST(Program, ACommaLanguageChangesNothing) {
    const QTemporaryDir folder;
    const QString out = folder.filePath("s.pdf");
    EXPECT_EQ(call({"--sheet", out, EXAMPLE_FILE}, {"LC_ALL=de_DE.UTF-8", "LANG=de_DE.UTF-8"}).exitCode, 0);
    QProcess text;
    text.start("pdftotext", {out, "-"});
    ASSERT_TRUE(text.waitForFinished());
    EXPECT_TRUE(text.readAllStandardOutput().contains("298.2 m"));
}
