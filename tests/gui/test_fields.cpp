#include <gtest/gtest.h>

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
        shown = shown || (label->isVisible() && label->text() == session.invalidReason("source.power"));
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
    type(panel, "source.power", "1,5 mW");
    EXPECT_EQ(session.setup().sources.front().power.text, "1.5 mW");
    EXPECT_EQ(panel.findChild<QLineEdit*>("source.power")->text(), "1,5 mW")
        << "the field keeps what was typed";
    type(panel, "source.wavelength", "1.064 um");
    EXPECT_DOUBLE_EQ(session.setup().sources.front().wavelength.value.in_si(), 1.064e-6)
        << "a point is still a decimal point";
}

TEST(Fields, ANumberThatCouldBeReadInTwoWaysIsRefused) {
    const Language german(QLocale(QLocale::German));
    EXPECT_THROW(fileText("1.000,5 W"), InputError);
    EXPECT_THROW(fileText("1,000,5 W"), InputError);
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
