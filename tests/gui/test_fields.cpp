#include <gtest/gtest.h>

#include <QApplication>
#include <QKeyEvent>
#include <QLabel>
#include <QLocale>

#include "fields/bindings.h"
#include "fields/decimal_input.h"
#include "fields/setup_field.h"
#include "quantities/input_error.h"
#include "session/session.h"
#include "setup_panel/setup_panel.h"
#include "support.h"

using namespace dosimetry;

namespace {

/// Sets the language for one test.
class Language {
  public:
    explicit Language(const QLocale& locale) { QLocale::setDefault(locale); }
    ~Language() { QLocale::setDefault(QLocale::c()); }
};

}  // namespace

TEST(Fields, TypingAnswersAtOnce) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "source.power", "5 mW");
    EXPECT_DOUBLE_EQ(session.setup().sources.front().power.value.in_si(), 0.005);
    EXPECT_FALSE(session.hasInvalidField());
    EXPECT_EQ(session.undoStack()->count(), 1) << "typing in one field is one step";
}

TEST(Fields, AWrongValueIsNamedAtTheFieldAndTheLastValidOneStays) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "source.power", "5 nm");
    EXPECT_EQ(session.setup().sources.front().power.text, "2 W");
    EXPECT_TRUE(session.hasInvalidField());
    EXPECT_TRUE(session.invalidReason("source.power").contains("power expected, \"5 nm\" is a length"));
    bool shown = false;
    for (const QLabel* label : panel.findChildren<QLabel*>())
        shown = shown || (label->isVisible() && QString(label->text()).remove(QChar(0x200B)) ==
                                                    session.invalidReason("source.power"));
    EXPECT_TRUE(shown);
    type(panel, "source.power", "6 W");
    EXPECT_FALSE(session.hasInvalidField());
}

TEST(Fields, NonsenseNeverChangesTheSetup) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    const dosimetry::Setup before = session.setup();
    for (const char* text :
         {"", " ", "0 W", "-3 W", "nan W", "inf W", "1e400 W", "1e40 W", "5", "W", "5 5 W", "0x10 W", "%"}) {
        type(panel, "source.power", text);
        auto* edit = panel.findChild<QLineEdit*>("source.power");
        if (QString(text).isEmpty()) QTest::keyClick(edit, Qt::Key_Delete);
        EXPECT_EQ(session.setup().sources, before.sources) << text;
        EXPECT_TRUE(session.hasInvalidField()) << text;
    }
}

TEST(Fields, UndoShowsTheOldTextAgain) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "beam.diameter", "3 mm");
    session.undoStack()->undo();
    EXPECT_EQ(panel.findChild<QLineEdit*>("beam.diameter")->text(), "2.2 mm");
}

TEST(Fields, EachVisitToAFieldIsItsOwnUndoStep) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "source.power", "3 W");
    QTest::keyClick(panel.findChild<QLineEdit*>("source.power"), Qt::Key_Return);
    type(panel, "source.power", "4 W");
    session.undoStack()->undo();
    EXPECT_EQ(session.setup().sources.front().power.text, "3 W");
}

TEST(Fields, ADecimalCommaIsTakenWhereTheLanguageHasOneAndStoredAsAPoint) {
    const Language german(QLocale(QLocale::German));
    Session session;
    SetupPanel panel(session);
    panel.show();
    EXPECT_EQ(panel.findChild<QLineEdit*>("beam.diameter")->text(), "2,2 mm");
    type(panel, "source.power", "1,5 mW");
    EXPECT_EQ(session.setup().sources.front().power.text, "1.5 mW");
    EXPECT_EQ(panel.findChild<QLineEdit*>("source.power")->text(), "1,5 mW")
        << "the field keeps what was typed";
    type(panel, "source.power", "2.5 mW");
    EXPECT_DOUBLE_EQ(session.setup().sources.front().power.value.in_si(), 2.5e-3)
        << "a point is still a decimal point";
}

TEST(Fields, ANumberThatCouldBeReadInTwoWaysIsRefused) {
    const Language german(QLocale(QLocale::German));
    EXPECT_THROW(fileText("1.000,5 W"), InputError);
    EXPECT_THROW(fileText("1,000,5 W"), InputError);
    EXPECT_THROW(fileText("1.064 um"), InputError);
    EXPECT_EQ(fileText("1,064 um"), "1.064 um");
    EXPECT_EQ(fileText("0.064 um"), "0.064 um");
    EXPECT_EQ(fileText("1.06 um"), "1.06 um");
}

TEST(Fields, TextsAreNotReadAsNumbers) {
    const Language german(QLocale(QLocale::German));
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "title", "1,5 W laser, bay 2");
    EXPECT_EQ(session.setup().title, "1,5 W laser, bay 2");
    type(panel, "note", "1.234,5 h in use");
    EXPECT_EQ(session.setup().note, "1.234,5 h in use");
    EXPECT_FALSE(session.hasInvalidField());
}

// "350 mn" passes through "350 m" while it is typed.
TEST(Fields, ATypingErrorLeavesTheValueFromBefore) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "position.at", "350 mn");
    EXPECT_EQ(session.setup().positions[0].at.text, "0.8 m");
    EXPECT_TRUE(session.hasInvalidField());
    EXPECT_EQ(session.undoStack()->count(), 0) << "nothing happened in the end";
}

TEST(Fields, UndoWorksWithTheCursorInAField) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    QKeyEvent undo(QEvent::ShortcutOverride, Qt::Key_Z, Qt::ControlModifier);
    undo.ignore();
    QApplication::sendEvent(panel.findChild<QLineEdit*>("source.power"), &undo);
    EXPECT_FALSE(undo.isAccepted()) << "the key is left to the window";
}

TEST(Fields, AnInvalidTextStaysWhileAnotherFieldIsEdited) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "source.power", "5 nm");
    type(panel, "beam.diameter", "3 mm");
    EXPECT_EQ(panel.findChild<QLineEdit*>("source.power")->text(), "5 nm");
    EXPECT_TRUE(session.hasInvalidField());
    session.startNew();
    EXPECT_EQ(panel.findChild<QLineEdit*>("source.power")->text(), "2 W");
    EXPECT_FALSE(session.hasInvalidField());
}

TEST(Fields, ACommaIsRefusedWhereTheLanguageHasNone) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "source.power", "1,5 mW");
    EXPECT_TRUE(session.hasInvalidField());
}

TEST(Fields, DatesAreChecked) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "date", "2026-13-01");
    EXPECT_TRUE(session.invalidReason("date").contains("2026-13-01"));
    type(panel, "date", "2027-01-31");
    EXPECT_EQ(session.setup().date, "2027-01-31");
}
