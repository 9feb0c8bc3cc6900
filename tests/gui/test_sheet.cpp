#include <gtest/gtest.h>

#include <QProcess>
#include <QRegularExpression>
#include <QTemporaryDir>

#include "documents/result.h"
#include "limits/limit_library.h"
#include "session/session.h"
#include "sheet/sheet_writer.h"
#include "support.h"

using namespace dosimetry;

namespace {

QString run(const QString& program, const QStringList& arguments) {
    QProcess process;
    process.start(program, arguments);
    EXPECT_TRUE(process.waitForFinished()) << program.toStdString();
    EXPECT_EQ(process.exitCode(), 0) << program.toStdString() << process.readAllStandardError().toStdString();
    return QString::fromUtf8(process.readAllStandardOutput());
}

/// Without spaces, line ends and ligatures, so that wrapping does not matter.
QString squeezed(QString text) {
    text.replace("ﬁ", "fi").replace("ﬂ", "fl").replace("ﬀ", "ff").replace("ﬃ", "ffi").replace("ﬄ", "ffl");
    return text.remove(QRegularExpression("\\s"));
}

/// A sheet written for a session and read back with poppler's tools.
class WrittenSheet {
  public:
    explicit WrittenSheet(const Session& session, const QString& paper = "A4")
        : path_(folder_.filePath("sheet.pdf")) {
        writeSheetPdf(path_, session.setup(), session.assessment(), session.fileBytes(), paperSize(paper));
    }
    QString text() const { return squeezed(run("pdftotext", {"-raw", path_, "-"})); }
    QString info() const { return run("pdfinfo", {path_}); }
    QString path() const { return path_; }
    QString folder() const { return folder_.path(); }

  private:
    QTemporaryDir folder_;
    QString path_;
};

}  // namespace

TEST(Sheet, HoldsEveryCautionAssumptionAndAnswer) {
    const Session session;
    const WrittenSheet sheet(session);
    const QString text = sheet.text();
    const Assessment& a = session.assessment();
    ASSERT_GE(a.cautions.size(), 5U);
    for (const std::string& caution : a.cautions)
        EXPECT_TRUE(text.contains(squeezed(QString::fromStdString(caution)))) << caution;
    for (const std::string& assumption : a.assumptions)
        EXPECT_TRUE(text.contains(squeezed(QString::fromStdString(assumption)))) << assumption;
    for (const HazardDistance& d : a.hazard_distances)
        EXPECT_TRUE(text.contains(squeezed(QString::fromStdString(distance_text(d)))));
    EXPECT_TRUE(text.contains(squeezed(QString::fromStdString(verdict(a.positions[0])))));
    EXPECT_TRUE(text.contains(QString::fromStdString(a.limit_sets[0]->edition().sha256)));
    EXPECT_FALSE(text.contains(QChar(0xE000))) << "the drawing's placeholder is replaced";
    for (const char* part : {"Verdict", "Signatures", "Signature", "Validuntil:", "Assessed", "Table5",
                             "Table7", "notstated", "2042", "3.31", "ABOVETHEEXPOSURELIMITSat1of1positions.",
                             "Hazarddistancesalongthedirectbeam", "Appendix", "6.36396103"})
        EXPECT_TRUE(text.contains(part)) << part;
}

TEST(Sheet, EveryCriterionHasItsTrailInTheAppendix) {
    const Session session;
    const QString text = WrittenSheet(session).text();
    for (const Criterion& c : session.assessment().positions[0].criteria) {
        ASSERT_FALSE(c.trail.steps.empty());
        for (const TrailStep& step : c.trail.steps)
            EXPECT_TRUE(text.contains(squeezed(QString::fromStdString(step.result)))) << step.result;
    }
}

TEST(Sheet, CarriesTheAssessmentFile) {
    const Session session;
    const WrittenSheet sheet(session);
    const QString target = sheet.folder() + "/out.toml";
    run("pdfdetach", {"-save", "1", "-o", target, sheet.path()});
    EXPECT_EQ(bytesOf(target), session.fileBytes());
}

TEST(Sheet, PapersHaveTheirSizes) {
    const Session session;
    EXPECT_TRUE(WrittenSheet(session, "A4").info().contains("595 x 842 pts (A4)"));
    EXPECT_TRUE(WrittenSheet(session, "letter").info().contains("612 x 792 pts (letter)"));
}

TEST(Sheet, FontsAreEmbeddedAndNothingIsAPicture) {
    const Session session;
    const WrittenSheet sheet(session);
    const QStringList fonts = run("pdffonts", {sheet.path()}).trimmed().split('\n').mid(2);
    ASSERT_FALSE(fonts.isEmpty());
    for (const QString& font : fonts)
        EXPECT_TRUE(font.contains(QRegularExpression("Identity-H +yes"))) << font.toStdString();
    EXPECT_EQ(run("pdfimages", {"-list", sheet.path()}).trimmed().split('\n').size(), 2) << "head lines only";
}

TEST(Sheet, EveryPageIsNumberedAndNamesItsFile) {
    const Session session;
    const WrittenSheet sheet(session);
    const int pages = QRegularExpression("Pages: +(\\d+)").match(sheet.info()).captured(1).toInt();
    ASSERT_GE(pages, 3);
    const QString text = sheet.text();
    for (int page = 1; page <= pages; ++page)
        EXPECT_TRUE(text.contains(QString("page%1of%2").arg(page).arg(pages)));
}

TEST(Sheet, MarkupInTextsIsPrintedNotObeyed) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.title = "<b>Ring</b> & co";
    next.sources.front().id = "<table>";
    session.edit(next, "title");
    const QString text = WrittenSheet(session).text();
    EXPECT_TRUE(text.contains("<b>Ring</b>&co"));
    EXPECT_TRUE(text.contains("<table>"));
}

TEST(Sheet, EveryPositionIsThere) {
    Session session;
    dosimetry::Setup next = session.setup();
    for (int i = 0; i < 6; ++i) {
        PositionSetup p = next.positions[0];
        p.id = "place " + std::to_string(i);
        p.at = Stated<Length>(std::to_string(i + 2) + " m");
        next.positions.push_back(p);
    }
    session.edit(next, "positions");
    const QString text = WrittenSheet(session).text();
    for (const PositionAssessment& p : session.assessment().positions)
        EXPECT_TRUE(text.contains(squeezed(QString::fromStdString(verdict(p))))) << p.id;
}
