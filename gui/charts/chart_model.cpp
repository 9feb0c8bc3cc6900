#include "charts/chart_model.h"

#include <algorithm>
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
    std::vector<ChartPoint> kept;
    for (std::size_t i = 0; i < points.size(); ++i) {
        const bool end = i == 0 || i + 1 == points.size();
        if (!end) {
            const ChartPoint& a = kept.back();
            const ChartPoint& c = points[i + 1];
            const double share = std::log(points[i].x / a.x) / std::log(c.x / a.x);
            const double straight = std::log(a.y) + share * std::log(c.y / a.y);
            if (std::fabs(straight - std::log(points[i].y)) < tolerance) continue;
        }
        kept.push_back(points[i]);
    }
    return kept;
}
