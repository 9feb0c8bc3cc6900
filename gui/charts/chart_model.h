#pragma once

#include <QString>
#include <vector>

/// A chart on logarithmic axes, in SI values and without widgets: what Qt Charts shows, what the table twin
/// lists and what tests look at.
struct ChartPoint {
    double x = 0.0;
    double y = 0.0;
};

struct ChartSeries {
    enum class Kind { eyeExposure, eyeLimit, skinExposure, skinLimit, mark };
    QString name;
    Kind kind{};
    std::vector<ChartPoint> points;  ///< all values finite and greater than zero
};

struct ChartAxis {
    QString title;  ///< with unit
    double from = 0.0;
    double to = 0.0;
};

struct ChartModel {
    QString title;
    ChartAxis x;
    ChartAxis y;
    std::vector<ChartSeries> series;
    QString summary;  ///< one sentence for screen readers
};

/// "10⁵"
QString powerOfTen(int exponent);

/// Widens an axis to whole decades that hold all of the series' y values.
void fitToDecades(ChartModel& model);

/// The points a curve needs: those within 0.05 % of the straight line between their neighbours (in
/// logarithms) go.
std::vector<ChartPoint> thinned(const std::vector<ChartPoint>& points);
