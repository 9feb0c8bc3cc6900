#include <gtest/gtest.h>

#include <QTableWidget>
#include <QToolButton>
#include <cmath>

#include "charts/chart_widget.h"
#include "charts/distance_chart.h"
#include "session/session.h"
#include "support.h"

namespace {

ChartModel line(double x0, double y0, double x1, double y1) {
    ChartModel model;
    model.title = "line";
    model.x = {"x in m", x0, x1};
    model.y = {"y in W/m²", y0, y1};
    model.series.push_back({"series", ChartSeries::Kind::eyeExposure, {{x0, y0}, {x1, y1}}});
    return model;
}

}  // namespace

// Logarithmic axes are the place where charts go wrong silently, at small values above all.
TEST(Chart, ValuesStandWhereTheyBelongOnEveryRangeOfDecades) {
    for (const auto& [low, high] : {std::pair{1e-15, 1e-12}, std::pair{1e-14, 1e-13}, std::pair{1e-9, 1e4},
                                    std::pair{1e-1, 1e3}, std::pair{1e-3, 1e6}}) {
        ChartWidget widget;
        widget.resize(700, 400);
        widget.show(line(1e-1, 1e0, 1e3, 1e6));  // another range first: the old one must not stick
        widget.show(line(low, low, high, high));
        widget.QWidget::show();
        QTest::qWait(1);
        const QPointF first = widget.positionOf({low, low});
        const QPointF last = widget.positionOf({high, high});
        const double middle = std::sqrt(low * high);
        const QPointF between = widget.positionOf({middle, middle});
        EXPECT_GT(last.x() - first.x(), 300) << low;
        EXPECT_GT(first.y() - last.y(), 100) << low;
        EXPECT_NEAR(between.x(), (first.x() + last.x()) / 2, 0.5) << low;
        EXPECT_NEAR(between.y(), (first.y() + last.y()) / 2, 0.5) << low;
    }
}

TEST(Chart, ThinningKeepsTheCurveAndTheEnds) {
    std::vector<ChartPoint> points;
    for (int i = 0; i <= 100; ++i)
        points.push_back({std::pow(10.0, i / 50.0), i < 50 ? 1.0 : std::pow(10.0, (50 - i) / 25.0)});
    const auto kept = thinned(points);
    EXPECT_LE(kept.size(), 4U);
    EXPECT_EQ(kept.front().x, points.front().x);
    EXPECT_EQ(kept.back().y, points.back().y);
}

TEST(Chart, ThinnedCurvesStayWithinATenthOfAPercent) {
    Session session;
    for (const char* power : {"2 W", "30 uW", "1 kW"}) {
        dosimetry::Setup next = session.setup();
        next.sources.front().power = dosimetry::Stated<dosimetry::RadiantPower>(power);
        next.sources.front().beam.profile =
            power[0] == '3' ? dosimetry::Profile::top_hat : dosimetry::Profile::gaussian;
        session.edit(next, "power");
        std::vector<ChartPoint> points;
        const auto laser = dosimetry::make_laser(session.setup().sources.front());
        for (int i = 0; i <= 360; ++i) {
            const double z = std::pow(10.0, -2 + i / 60.0);
            points.push_back(
                {z, laser.beam.fraction_through(dosimetry::millimetres(7), dosimetry::metres(z))});
        }
        const auto kept = thinned(points);
        EXPECT_LT(kept.size(), points.size() / 2);
        std::size_t k = 0;
        for (const ChartPoint& p : points) {
            while (kept[k + 1].x < p.x) ++k;
            const double share = std::log(p.x / kept[k].x) / std::log(kept[k + 1].x / kept[k].x);
            const double shown = kept[k].y * std::pow(kept[k + 1].y / kept[k].y, share);
            EXPECT_NEAR(shown / p.y, 1.0, 1e-3) << p.x;
        }
    }
}

TEST(Chart, EveryPointOfTheDistanceChartIsPositiveAndOnTheAxes) {
    const Session session;
    const RouteModel route = RouteModel::of(session.setup(), session.assessment(), 0);
    const ChartModel chart = distanceChart(session.setup(), 0, route);
    ASSERT_EQ(chart.series.size(), 5U);
    for (const ChartSeries& series : chart.series)
        for (const ChartPoint& point : series.points) {
            EXPECT_GE(point.x, chart.x.from * (1 - 1e-9));
            EXPECT_LE(point.x, chart.x.to * (1 + 1e-9));
            EXPECT_GE(point.y, chart.y.from * (1 - 1e-9));
            EXPECT_LE(point.y, chart.y.to * (1 + 1e-9));
        }
    EXPECT_FALSE(chart.summary.isEmpty());
}

TEST(Chart, ExposureCrossesTheLimitAtTheHazardDistance) {
    const Session session;
    const RouteModel route = RouteModel::of(session.setup(), session.assessment(), 0);
    const ChartModel chart = distanceChart(session.setup(), 0, route);
    const auto valueAt = [](const ChartSeries& series, double x) {
        for (std::size_t i = 0; i + 1 < series.points.size(); ++i) {
            const ChartPoint& a = series.points[i];
            const ChartPoint& b = series.points[i + 1];
            if (x < a.x || x > b.x) continue;
            return a.y * std::pow(b.y / a.y, std::log(x / a.x) / std::log(b.x / a.x));
        }
        return 0.0;
    };
    const double nohd = session.assessment().hazard_distances[0].distance->in_si();
    EXPECT_NEAR(valueAt(chart.series[0], nohd) / valueAt(chart.series[1], nohd), 1.0, 1e-3);
}

TEST(Chart, HasATableTwin) {
    ChartWidget widget;
    widget.show(line(1, 1, 10, 100));
    widget.findChild<QToolButton*>("chart.table")->setChecked(true);
    auto* table = widget.findChild<QTableWidget*>();
    ASSERT_EQ(table->rowCount(), 2);
    EXPECT_EQ(table->item(1, 1)->text(), "10.00");
    EXPECT_EQ(table->item(1, 2)->text(), "100.0");
}

TEST(Chart, IsEmptyWhereNothingIsCovered) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.sources.front().wavelength = dosimetry::Stated<dosimetry::Length>("150 nm");
    session.edit(next, "wavelength");
    const RouteModel route = RouteModel::of(session.setup(), session.assessment(), 0);
    ChartWidget widget;
    widget.show(distanceChart(session.setup(), 0, route));
    EXPECT_EQ(widget.positionOf({1, 1}), QPointF());
}
