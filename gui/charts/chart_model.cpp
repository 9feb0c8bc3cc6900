#include "charts/chart_model.h"

#include <algorithm>
#include <array>
#include <cmath>

QString powerOfTen(int exponent) {
    static const QString superscripts = QStringLiteral("⁰¹²³⁴⁵⁶⁷⁸⁹");
    QString text = QStringLiteral("10");
    if (exponent < 0) text += QStringLiteral("⁻");
    for (QChar digit : QString::number(std::abs(exponent))) text += superscripts[digit.digitValue()];
    return text;
}

void fitToDecades(ChartModel& model) {
    double low = HUGE_VAL;
    double high = 0.0;
    for (const ChartSeries& series : model.series) {
        if (series.kind == ChartSeries::Kind::mark) continue;
        for (const ChartPoint& point : series.points) {
            low = std::min(low, point.y);
            high = std::max(high, point.y);
        }
    }
    if (!(high > 0.0)) {
        low = 1.0;
        high = 10.0;
    }
    model.y.from = std::pow(10.0, std::floor(std::log10(low)));
    model.y.to = std::pow(10.0, std::ceil(std::log10(high * 1.001)));
}

std::vector<ChartPoint> thinned(const std::vector<ChartPoint>& points) {
    constexpr double tolerance = 5e-4;  // of the value; a pixel is some percent of it on any chart
    if (points.size() < 3) return points;
    // From the last kept point on, the slopes of straight lines that pass all points since then within the
    // tolerance.
    std::vector<ChartPoint> kept{points.front()};
    double lowest = -HUGE_VAL;
    double highest = HUGE_VAL;
    for (std::size_t i = 1; i < points.size(); ++i) {
        const auto slopes = [&] {
            const double dx = std::log(points[i].x / kept.back().x);
            const double dy = std::log(points[i].y / kept.back().y);
            return std::array{(dy - tolerance) / dx, dy / dx, (dy + tolerance) / dx};
        };
        if (const double slope = slopes()[1]; slope < lowest || slope > highest) {
            kept.push_back(points[i - 1]);
            lowest = -HUGE_VAL;
            highest = HUGE_VAL;
        }
        const auto [low, exact, high] = slopes();
        lowest = std::max(lowest, low);
        highest = std::min(highest, high);
    }
    kept.push_back(points.back());
    return kept;
}
