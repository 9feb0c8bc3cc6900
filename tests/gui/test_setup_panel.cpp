#include <gtest/gtest.h>

#include <QComboBox>
#include <QLabel>
#include <QPushButton>

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

TEST(SetupPanel, AnInvalidTextDoesNotFollowToAnotherPosition) {
    Session session;
    SetupPanel panel(session);
    panel.show();
    QTest::mouseClick(panel.findChild<QPushButton*>("position.add"), Qt::LeftButton);
    type(panel, "position.at", "12 W");
    EXPECT_TRUE(session.hasInvalidField());
    choose(panel, "position.chosen", 0);
    EXPECT_FALSE(session.hasInvalidField());
    EXPECT_EQ(panel.findChild<QLineEdit*>("position.at")->text(), "0.8 m");
}
