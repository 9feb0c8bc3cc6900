#include <gtest/gtest.h>

#include <QAbstractButton>
#include <QAbstractItemView>
#include <QCloseEvent>
#include <QComboBox>
#include <QLabel>
#include <QMessageBox>
#include <QTemporaryDir>
#include <QTimer>

#include "session/session.h"
#include "support.h"
#include "window/main_window.h"

using namespace dosimetry;

namespace {

/// Presses a button of the next message box and keeps its text.
class Answer {
  public:
    explicit Answer(QMessageBox::StandardButton button) {
        timer_.setInterval(10);
        QObject::connect(&timer_, &QTimer::timeout, [this, button] {
            auto* box = qobject_cast<QMessageBox*>(QApplication::activeModalWidget());
            if (!box) return;
            text = box->text();
            timer_.stop();
            box->button(button)->click();
        });
        timer_.start();
    }
    QString text;

  private:
    QTimer timer_;
};

void changePower(Session& session) {
    dosimetry::Setup next = session.setup();
    next.sources.front().power = Stated<RadiantPower>("3 W");
    session.edit(next, "power");
}

}  // namespace

TEST(Window, ShowsVerdictAndAllCautionsEvenWhenSmall) {
    Session session;
    MainWindow window(session);
    window.resize(window.minimumSizeHint());
    window.show();
    QTest::qWait(10);
    EXPECT_TRUE(window.findChild<QLabel*>("verdict")->text().contains("2042 times the limit"));
    auto* cautions = window.findChild<QLabel*>("cautions");
    ASSERT_NE(cautions, nullptr);
    EXPECT_TRUE(cautions->isVisible());
    EXPECT_GE(cautions->height(), cautions->heightForWidth(cautions->width())) << "nothing is cut off";
    EXPECT_TRUE(window.rect().contains(QRect(cautions->mapTo(&window, QPoint(0, 0)), cautions->size())));
    for (const std::string& caution : session.assessment().cautions)
        EXPECT_TRUE(cautions->text().contains(QString::fromStdString(caution).toHtmlEscaped())) << caution;
}

TEST(Window, SaysWhenTheAnswersBelongToEarlierValues) {
    Session session;
    MainWindow window(session);
    window.show();
    type(window, "source.power", "5 nm");
    EXPECT_TRUE(window.findChild<QLabel*>("verdict")->text().startsWith("A field is not valid"));
    EXPECT_TRUE(window.isWindowModified());
}

TEST(Window, SaysNotAssessedOutsideTheTables) {
    Session session;
    MainWindow window(session);
    window.show();
    type(window, "position.exposure", "31000 s");
    EXPECT_TRUE(window.findChild<QLabel*>("verdict")->text().startsWith(
        "Not assessed: an exposure of 31000 s is not covered"));
    EXPECT_TRUE(window.findChild<QLabel*>("uncovered")->isVisible());
    EXPECT_FALSE(window.findChild<QAbstractItemView*>("margins")->isVisible());
}

TEST(Window, UnsavedChangesAreGuarded) {
    Session session;
    MainWindow window(session);
    window.show();
    changePower(session);
    {
        const Answer answer(QMessageBox::Cancel);
        EXPECT_FALSE(window.close());
        EXPECT_TRUE(answer.text.contains("not saved"));
        EXPECT_TRUE(window.isVisible());
    }
    {
        const Answer answer(QMessageBox::Discard);
        EXPECT_TRUE(window.close());
    }
}

TEST(Window, ClosesWithoutAskingWhenNothingChanged) {
    Session session;
    MainWindow window(session);
    window.show();
    EXPECT_TRUE(window.close());
}

TEST(Window, AFileThatCannotBeReadIsNamedAndNothingIsLost) {
    const QTemporaryDir folder;
    const QString path = folder.filePath("bad.toml");
    writeBytes(path, "format = 1\n[assessment]\nlimits = [\"icnirp_2013_laser\"]\ncolour = 3\n");
    Session session;
    MainWindow window(session);
    window.show();
    changePower(session);
    const Answer answer(QMessageBox::Ok);
    window.openFile(path);
    EXPECT_TRUE(answer.text.contains("bad.toml:4:1: unknown key \"colour\"")) << answer.text.toStdString();
    EXPECT_EQ(session.setup().sources.front().power.text, "3 W");
}

TEST(Window, TheTitleNamesFileAndState) {
    const QTemporaryDir folder;
    Session session;
    MainWindow window(session);
    window.show();
    EXPECT_TRUE(window.windowTitle().startsWith("Example"));
    EXPECT_FALSE(window.isWindowModified());
    changePower(session);
    EXPECT_TRUE(window.isWindowModified());
    session.save(folder.filePath("mine.toml"));
    EXPECT_TRUE(window.windowTitle().startsWith("mine.toml"));
    EXPECT_FALSE(window.isWindowModified());
}

TEST(Window, EveryControlThatTakesTheKeyboardHasAName) {
    Session session;
    MainWindow window(session);
    window.show();
    for (QWidget* widget : window.findChildren<QWidget*>()) {
        if (!(widget->focusPolicy() & Qt::TabFocus) || !widget->isVisible() || widget->focusProxy()) continue;
        const auto* button = qobject_cast<QAbstractButton*>(widget);
        const bool named = !widget->accessibleName().isEmpty() || (button && !button->text().isEmpty());
        EXPECT_TRUE(named) << widget->metaObject()->className() << " " << widget->objectName().toStdString();
    }
}

TEST(Window, TabWalksThroughTheFieldsInReadingOrder) {
    Session session;
    MainWindow window(session);
    window.show();
    ASSERT_TRUE(QTest::qWaitForWindowActive(&window));
    window.findChild<QLineEdit*>("source.id")->setFocus();
    QStringList walked;
    for (int i = 0; i < 12 && QApplication::focusWidget(); ++i) {
        walked += QApplication::focusWidget()->objectName();
        QTest::keyClick(QApplication::focusWidget(), Qt::Key_Tab);
    }
    const QStringList expected{"source.id",       "source.wavelength", "source.power",
                               "beam.profile",    "beam.measured_at",  "beam.spread",
                               "beam.diameter",   "beam.divergence",   "source.apparent_source",
                               "position.chosen", "position.add",      "position.id"};
    EXPECT_EQ(walked.join(", ").toStdString(), expected.join(", ").toStdString());
}
