#include <gtest/gtest.h>

#include <QApplication>
#include <QComboBox>
#include <QLabel>
#include <QPushButton>
#include <QWheelEvent>

#include "session/session.h"
#include "setup_panel/beam_form.h"
#include "setup_panel/setup_panel.h"
#include "sources/laser_setup.h"
#include "support.h"

using namespace dosimetry;

namespace {

void choose(QWidget& panel, const QString& name, int index) {
    auto* box = panel.findChild<QComboBox*>(name);
    ASSERT_NE(box, nullptr);
    box->setCurrentIndex(index);
    emit box->activated(index);
}

}  // namespace

TEST(SetupPanel, EveryWayToStateTheSpreadKeepsTheFarField) {
    Session session;
    SetupPanel panel(session);
    const double divergence = make_laser(session.setup().sources.front()).beam.divergence().in_si();
    const double diameter = make_laser(session.setup().sources.front()).beam.diameter_at(metres(0)).in_si();
    for (int spread : {1, 0, 2, 3, 4, 0}) {
        choose(panel, "beam.spread", spread);
        const Laser laser = make_laser(session.setup().sources.front());
        EXPECT_EQ(static_cast<int>(spreadOf(session.setup().sources.front().beam)), spread);
        EXPECT_NEAR(laser.beam.divergence().in_si(), divergence, 1e-3 * divergence) << spread;
        if (spread <= 2) {
            EXPECT_NEAR(laser.beam.diameter_at(metres(0)).in_si(), diameter, 1e-3 * diameter) << spread;
        }
    }
}

TEST(SetupPanel, OnlyTheFieldsOfTheChosenSpreadAreShown) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    EXPECT_TRUE(panel.findChild<QLineEdit*>("beam.divergence")->isVisible());
    EXPECT_FALSE(panel.findChild<QLineEdit*>("beam.m2")->isVisible());
    choose(panel, "beam.spread", static_cast<int>(Spread::m2));
    EXPECT_FALSE(panel.findChild<QLineEdit*>("beam.divergence")->isVisible());
    EXPECT_TRUE(panel.findChild<QLineEdit*>("beam.m2")->isVisible());
}

TEST(SetupPanel, PositionsAreAddedAndRemoved) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    QTest::mouseClick(panel.findChild<QPushButton*>("position.add"), Qt::LeftButton);
    ASSERT_EQ(session.setup().positions.size(), 2U);
    EXPECT_EQ(session.currentPosition(), 1);
    EXPECT_EQ(panel.findChild<QLineEdit*>("position.id")->text(), "operator 2");
    type(panel, "position.at", "12 m");
    EXPECT_EQ(session.setup().positions[0].at.text, "0.8 m");
    EXPECT_EQ(session.setup().positions[1].at.text, "12 m");
    QTest::mouseClick(panel.findChild<QPushButton*>("position.remove"), Qt::LeftButton);
    ASSERT_EQ(session.setup().positions.size(), 1U);
    EXPECT_EQ(panel.findChild<QLineEdit*>("position.at")->text(), "0.8 m");
    EXPECT_FALSE(panel.findChild<QPushButton*>("position.remove")->isEnabled()) << "one position stays";
}

TEST(SetupPanel, TissuesBelongToTheChosenPosition) {
    Session session;
    SetupPanel panel(session);
    QTest::mouseClick(panel.findChild<QPushButton*>("position.add"), Qt::LeftButton);
    choose(panel, "position.tissues", 2);
    EXPECT_FALSE(session.setup().positions[1].eye);
    EXPECT_TRUE(session.setup().positions[0].eye);
    choose(panel, "position.chosen", 0);
    EXPECT_EQ(panel.findChild<QComboBox*>("position.tissues")->currentIndex(), 0);
}

TEST(SetupPanel, APositionWithAnInvalidTextIsNotLeft) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    QTest::mouseClick(panel.findChild<QPushButton*>("position.add"), Qt::LeftButton);
    type(panel, "position.at", "12 W");
    session.setCurrentPosition(0);
    EXPECT_EQ(session.currentPosition(), 1);
    EXPECT_FALSE(panel.findChild<QComboBox*>("position.chosen")->isEnabled());
    type(panel, "position.at", "12 m");
    session.setCurrentPosition(0);
    EXPECT_EQ(session.currentPosition(), 0);
}

TEST(SetupPanel, TheMouseWheelChangesNothing) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    const auto before = session.setup();
    for (QComboBox* box : panel.findChildren<QComboBox*>()) {
        QWheelEvent wheel(QPointF(5, 5), box->mapToGlobal(QPointF(5, 5)), {}, QPoint(0, -120), Qt::NoButton,
                          Qt::NoModifier, Qt::NoScrollPhase, false);
        QApplication::sendEvent(box, &wheel);
    }
    EXPECT_EQ(session.setup(), before);
}

TEST(SetupPanel, ARestatementThatWouldChangeTheBeamIsRefusedWithAReason) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "beam.divergence", "0.1 mrad");  // 2.2 mm at 532 nm cannot spread less than 0.308 mrad
    const auto before = session.setup();
    choose(panel, "beam.spread", static_cast<int>(Spread::m2));
    EXPECT_EQ(session.setup(), before);
    EXPECT_FALSE(session.hasInvalidField());
    bool shown = false;
    for (const QLabel* label : panel.findChildren<QLabel*>())
        shown = shown ||
                (label->isVisible() && QString(label->text()).remove(QChar(0x200B)).contains("diffraction"));
    EXPECT_TRUE(shown);
}

TEST(SetupPanel, AHiddenFieldHoldsNothingInvalid) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    type(panel, "beam.divergence", "5 W");
    EXPECT_TRUE(session.hasInvalidField());
    choose(panel, "beam.spread", static_cast<int>(Spread::m2));
    EXPECT_FALSE(session.hasInvalidField());
}

TEST(SetupPanel, UndoShowsThePositionThatItChanges) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    QTest::mouseClick(panel.findChild<QPushButton*>("position.add"), Qt::LeftButton);
    type(panel, "position.at", "12 m");
    session.setCurrentPosition(0);
    session.undoStack()->undo();
    EXPECT_EQ(session.currentPosition(), 1);
    EXPECT_EQ(panel.findChild<QLineEdit*>("position.at")->text(), "0.8 m");
}
