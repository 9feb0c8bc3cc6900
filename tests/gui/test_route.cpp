#include <gtest/gtest.h>

#include <QFontMetricsF>

#include "route_view/route_model.h"
#include "route_view/route_painter.h"
#include "route_view/route_view.h"
#include "session/session.h"
#include "support.h"

using namespace dosimetry;

namespace {

RouteModel modelOf(const Session& session) {
    return RouteModel::of(session.setup(), session.assessment(), session.currentPosition());
}

const RouteZone* zoneOf(const RouteModel& model, Tissue tissue) {
    for (const RouteZone& zone : model.zones)
        if (zone.tissue == tissue) return &zone;
    return nullptr;
}

}  // namespace

TEST(Route, ZonesEndAtTheHazardDistances) {
    const Session session;
    const RouteModel model = modelOf(session);
    for (const HazardDistance& d : session.assessment().hazard_distances) {
        const RouteZone* zone = zoneOf(model, d.tissue);
        ASSERT_NE(zone, nullptr);
        EXPECT_EQ(zone->to, *d.distance);
        EXPECT_TRUE(zone->startsBeforeAxis);
    }
    EXPECT_TRUE(model.remarks.empty());
}

TEST(Route, TheAxisIsLogarithmicAndHoldsPositionAndHazardDistance) {
    const Session session;
    const RouteModel model = modelOf(session);
    EXPECT_DOUBLE_EQ(model.fractionOf(model.from), 0.0);
    EXPECT_DOUBLE_EQ(model.fractionOf(model.to), 1.0);
    EXPECT_NEAR(model.distanceAt(model.fractionOf(metres(3))).in_si(), 3.0, 1e-12);
    EXPECT_GT(model.to, metres(298));
    EXPECT_LT(model.from, metres(0.8));
}

TEST(Route, SaysNotCoveredInsteadOfWithinLimits) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.sources.front().wavelength = Stated<Length>("150 nm");
    session.edit(next, "wavelength");
    const RouteModel model = modelOf(session);
    ASSERT_EQ(model.remarks.size(), 2U);
    for (const RouteRemark& remark : model.remarks)
        EXPECT_TRUE(remark.text.ends_with("not covered")) << remark.text;
    EXPECT_FALSE(model.people.front().assessed);
}

TEST(Route, AZoneNearTheExitIsNotLost) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.sources.front().power = Stated<RadiantPower>("500 mW");
    next.sources.front().beam.diameter = Stated<Length>("1 mm");
    next.sources.front().beam.divergence = Stated<PlaneAngle>("500 mrad");
    session.edit(next, "strongly divergent");
    const RouteModel model = modelOf(session);
    const RouteZone* skin = zoneOf(model, Tissue::skin);
    ASSERT_NE(skin, nullptr);
    EXPECT_LT(skin->to, millimetres(20));
    EXPECT_LT(model.from, skin->to);
}

TEST(Route, AWeakBeamIsWithinTheLimits) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.sources.front().power = Stated<RadiantPower>("10 uW");
    session.edit(next, "power");
    const RouteModel model = modelOf(session);
    EXPECT_TRUE(model.zones.empty());
    ASSERT_EQ(model.remarks.size(), 2U);
    EXPECT_EQ(model.remarks.front().text, "eye, 0.25 s: within the limits along the whole beam");
}

TEST(Route, ArrowKeysMoveThePersonAsOneUndoStep) {
    Session session;
    RouteView view(session);
    view.show();
    QTest::keyClick(&view, Qt::Key_Right);
    QTest::keyClick(&view, Qt::Key_Right);
    const Length moved = session.setup().positions[0].at.value;
    EXPECT_GT(moved, metres(0.85));
    EXPECT_LT(moved, metres(0.90));
    QTest::keyClick(&view, Qt::Key_Left, Qt::ShiftModifier);
    EXPECT_LT(session.setup().positions[0].at.value, metres(0.72));
    session.undoStack()->undo();
    EXPECT_EQ(session.setup().positions[0].at.text, "0.8 m");
}

TEST(Route, DraggingPutsThePersonWhereThePointerIs) {
    Session session;
    RouteView view(session);
    view.resize(800, 400);
    view.show();
    const RouteModel model = view.model();
    const RouteLayout layout(model, view.rect(), QFontMetricsF(view.font()).height());
    const QPoint start = layout.personRect(model.people[0]).center().toPoint() + QPoint(4, 0);
    const QPoint end(static_cast<int>(layout.xOf(metres(50))) + 4, start.y());
    QTest::mousePress(&view, Qt::LeftButton, {}, start);
    QTest::mouseMove(&view, (start + end) / 2);
    QTest::mouseMove(&view, end);
    QTest::mouseRelease(&view, Qt::LeftButton, {}, end);
    EXPECT_NEAR(session.setup().positions[0].at.value.in_si(), 50.0, 2.0);
    EXPECT_EQ(session.undoStack()->count(), 1);
}

TEST(Route, DraggedDistancesReadAsTyped) {
    EXPECT_EQ(roundedDistance(metres(12.3456)).text, "12.3 m");
    EXPECT_EQ(roundedDistance(metres(0.004567)).text, "4.57 mm");
    EXPECT_EQ(roundedDistance(metres(2)).text, "2 m");
}

TEST(Route, DescribesItselfToScreenReaders) {
    Session session;
    const RouteView view(session);
    EXPECT_TRUE(view.accessibleDescription().contains("eye, 0.25 s: above the limit up to 298.2 m"));
    EXPECT_TRUE(view.accessibleDescription().contains("2042 times the limit"));
}

TEST(Route, AClickMovesNobody) {
    Session session;
    RouteView view(session);
    view.resize(800, 400);
    view.show();
    const RouteLayout layout(view.model(), view.rect(), QFontMetricsF(view.font()).height());
    const QPoint at = layout.personRect(view.model().people[0]).center().toPoint() + QPoint(6, 3);
    QTest::mousePress(&view, Qt::LeftButton, {}, at);
    QTest::mouseMove(&view, at + QPoint(0, 1));
    QTest::mouseRelease(&view, Qt::LeftButton, {}, at + QPoint(0, 1));
    EXPECT_EQ(session.setup().positions[0].at.text, "0.8 m");
}

// One position has 0.25 s, the other 100 s: on the sheet the zone must reach as far as anybody is in danger.
TEST(Route, OnTheSheetNobodyAboveALimitStandsOutsideTheZone) {
    Session session;
    dosimetry::Setup next = session.setup();
    PositionSetup corridor = next.positions[0];
    corridor.id = "corridor";
    corridor.at = Stated<Length>("350 m");
    corridor.exposure = Stated<Duration>("100 s");
    next.positions.push_back(corridor);
    session.edit(next, "corridor");
    const RouteModel model = RouteModel::of(session.setup(), session.assessment(), std::nullopt);
    const RouteZone* eye = zoneOf(model, Tissue::eye);
    ASSERT_NE(eye, nullptr);
    for (const RoutePerson& person : model.people) {
        if (person.ratio > 1.0) {
            EXPECT_LT(person.at.value, eye->to) << person.id;
        }
    }
    EXPECT_TRUE(eye->label.starts_with("eye, 100 s: ")) << eye->label;
}

TEST(Route, TheAxisEndsWithTheSearch) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.sources.front().power = Stated<RadiantPower>("1e14 W");
    session.edit(next, "power");
    const RouteModel model = modelOf(session);
    EXPECT_EQ(model.to, farthest_search);
    EXPECT_TRUE(zoneOf(model, Tissue::eye)->label.ends_with("beyond 1000 km"))
        << zoneOf(model, Tissue::eye)->label;
}
