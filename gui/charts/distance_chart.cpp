#include "charts/distance_chart.h"

#include <QObject>

#include "assessment/course.h"
#include "limits/limit_library.h"

using namespace dosimetry;

ChartModel distanceChart(const Setup& setup, int currentPosition, const RouteModel& route) {
    const PositionSetup& position = setup.positions[static_cast<std::size_t>(currentPosition)];
    ChartModel chart;
    chart.title = QObject::tr("Exposure and limits over distance, %1")
                      .arg(QString::fromStdString(position.exposure.text));
    chart.x = {QObject::tr("Distance from the exit in m"), route.from.in_si(), route.to.in_si()};
    chart.y.title = QObject::tr("Irradiance in W/m²");
    const Course course =
        course_along_beam(setup, LimitLibrary::embedded(), position.exposure.value, route.distances);
    for (const TissueCourse& line : course.tissues) {
        const bool eye = line.tissue == Tissue::eye;
        ChartSeries exposure{eye ? QObject::tr("eye") : QObject::tr("skin"),
                             eye ? ChartSeries::Kind::eyeExposure : ChartSeries::Kind::skinExposure,
                             {}};
        ChartSeries limit{eye ? QObject::tr("eye limit") : QObject::tr("skin limit"),
                          eye ? ChartSeries::Kind::eyeLimit : ChartSeries::Kind::skinLimit,
                          {}};
        for (std::size_t i = 0; i < line.ratio.size(); ++i) {
            const double z = course.distances[i].in_si();
            exposure.points.push_back({z, line.exposure[i].in_si()});
            limit.points.push_back({z, line.limit[i].in_si()});
        }
        exposure.points = thinned(exposure.points);
        limit.points = thinned(limit.points);
        chart.series.push_back(std::move(exposure));
        chart.series.push_back(std::move(limit));
    }
    fitToDecades(chart);
    if (chart.series.empty()) {
        chart.title += QObject::tr(": not covered");
        return chart;
    }
    const double at = position.at.value.in_si();
    chart.series.push_back({QString::fromStdString(position.id),
                            ChartSeries::Kind::mark,
                            {{at, chart.y.from}, {at, chart.y.to}}});
    for (const RouteZone& zone : route.zones) chart.summary += QString::fromStdString(zone.label) + ". ";
    return chart;
}
