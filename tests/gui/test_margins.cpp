#include <gtest/gtest.h>

#include <QAbstractItemModelTester>
#include <QSignalSpy>
#include <QTableView>

#include "margins_view/answers_model.h"
#include "margins_view/margins_model.h"
#include "margins_view/margins_view.h"
#include "session/session.h"
#include "support.h"

using namespace dosimetry;

TEST(Margins, ModelsKeepTheRulesOfQt) {
    Session session;
    MarginsModel margins(session);
    AnswersModel answers(session);
    const QAbstractItemModelTester first(&margins, QAbstractItemModelTester::FailureReportingMode::Fatal);
    const QAbstractItemModelTester second(&answers, QAbstractItemModelTester::FailureReportingMode::Fatal);
    dosimetry::Setup next = session.setup();
    next.sources.front().wavelength = Stated<Length>("150 nm");
    session.edit(next, "wavelength");
    EXPECT_EQ(margins.rowCount(), 0);
    session.undoStack()->undo();
    EXPECT_EQ(margins.rowCount(), 2);
}

TEST(Margins, TheMostRestrictiveComesFirstAndGoverns) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.sources.front().wavelength = Stated<Length>("450 nm");
    next.positions[0].exposure = Stated<Duration>("100 s");
    session.edit(next, "blue, long");
    const MarginsModel model(session);
    ASSERT_EQ(model.rowCount(), 3);
    double before = 1e300;
    for (int row = 0; row < model.rowCount(); ++row) {
        const double ratio = model.index(row, 0).data(MarginsModel::RatioRole).toDouble();
        EXPECT_LE(ratio, before);
        before = ratio;
    }
    EXPECT_TRUE(model.index(0, 0).data(MarginsModel::GoverningRole).toBool());
    EXPECT_TRUE(model.index(0, MarginsModel::EffectColumn)
                    .data()
                    .toString()
                    .startsWith("eye, retinal photochemical"));
}

TEST(Margins, ExposuresAreRoundedUpAndLimitsDown) {
    Session session;
    const MarginsModel model(session);
    // 51968.95 W/m² against 25.4558 W/m²
    EXPECT_EQ(model.index(0, MarginsModel::ValuesColumn).data().toString(), "51970 W/m²\nlimit 25.45 W/m²");
    EXPECT_EQ(model.index(0, MarginsModel::RatioColumn).data().toString(), "2042 ×");
}

TEST(Margins, TheBarSpeaksToScreenReaders) {
    Session session;
    const MarginsModel model(session);
    EXPECT_EQ(model.index(0, MarginsModel::BarColumn).data(Qt::AccessibleTextRole).toString(),
              "2042 times the limit");
}

TEST(Margins, ChoosingARowShowsItsTrailAndAnEditKeepsTheChoice) {
    Session session;
    MarginsView view(session);
    view.show();
    std::string subject;
    QObject::connect(&view, &MarginsView::trailChosen, [&](const Trail& trail) { subject = trail.subject; });
    view.findChild<QTableView*>("margins")->selectRow(1);
    EXPECT_TRUE(subject.starts_with("skin, skin thermal") || subject.starts_with("skin, thermal")) << subject;
    auto* answers = view.findChild<QTableView*>("answers");
    answers->selectRow(0);
    EXPECT_TRUE(subject.starts_with("Hazard distance, eye")) << subject;
    subject.clear();
    dosimetry::Setup next = session.setup();
    next.sources.front().power = Stated<RadiantPower>("3 W");
    session.edit(next, "power");
    EXPECT_TRUE(subject.starts_with("Hazard distance, eye")) << subject;
    EXPECT_EQ(answers->currentIndex().row(), 0);
}

TEST(Margins, AnAnswerCanBeChosenAgain) {
    Session session;
    MarginsView view(session);
    view.show();
    std::string subject;
    QObject::connect(&view, &MarginsView::trailChosen, [&](const Trail& trail) { subject = trail.subject; });
    auto* answers = view.findChild<QTableView*>("answers");
    answers->selectRow(2);
    const std::string first = subject;
    view.findChild<QTableView*>("margins")->selectRow(0);
    EXPECT_NE(subject, first);
    answers->selectRow(2);
    EXPECT_EQ(subject, first);
}

TEST(Margins, TheChosenEffectComesBackWhenItApplies) {
    Session session;
    dosimetry::Setup blue = session.setup();
    blue.sources.front().wavelength = Stated<Length>("450 nm");
    blue.positions[0].exposure = Stated<Duration>("100 s");
    session.edit(blue, "blue");
    MarginsView view(session);
    view.show();
    std::string subject;
    QObject::connect(&view, &MarginsView::trailChosen, [&](const Trail& trail) { subject = trail.subject; });
    view.announceTrail();
    view.findChild<QTableView*>("margins")->selectRow(0);
    EXPECT_TRUE(subject.starts_with("eye, retinal photochemical")) << subject;
    dosimetry::Setup brief = session.setup();
    brief.positions[0].exposure = Stated<Duration>("5 s");
    session.edit(brief, "5 s");
    EXPECT_TRUE(subject.starts_with("eye, retinal thermal")) << subject;
    session.undoStack()->undo();
    EXPECT_TRUE(subject.starts_with("eye, retinal photochemical")) << subject;
}

TEST(Margins, AnswersForOneTissueSaySo) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.positions[0].eye = false;
    session.edit(next, "skin only");
    const AnswersModel model(session);
    bool found = false;
    for (int row = 0; row < model.rowCount(); ++row)
        found = found || model.index(row, 1).data().toString().endsWith("(skin only)");
    EXPECT_TRUE(found);
    EXPECT_TRUE(session.assessment().cautions.front().find("the eye is not assessed, but it would receive") !=
                std::string::npos);
}

TEST(Margins, StaleAnswersAreGreyed) {
    Session session;
    MarginsView view(session);
    session.setInvalidField("source.power", "reason");
    EXPECT_FALSE(view.findChild<QTableView*>("margins")->isEnabled());
    session.clearInvalidField("source.power");
    EXPECT_TRUE(view.findChild<QTableView*>("margins")->isEnabled());
}
