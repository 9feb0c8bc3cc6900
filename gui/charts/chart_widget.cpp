#include "charts/chart_widget.h"

#include <QApplication>
#include <QCategoryAxis>
#include <QChart>
#include <QChartView>
#include <QEvent>
#include <QGraphicsLayout>
#include <QHBoxLayout>
#include <QHeaderView>
#include <QLabel>
#include <QLegend>
#include <QLegendMarker>
#include <QLineSeries>
#include <QStackedWidget>
#include <QTableWidget>
#include <QToolButton>
#include <QVBoxLayout>
#include <algorithm>
#include <cmath>

#include "quantities/format.h"
#include "window/colours.h"

namespace {

constexpr int mostLabels = 8;

QPen penOf(ChartSeries::Kind kind, const QPalette& palette) {
    switch (kind) {
        case ChartSeries::Kind::eyeExposure:
            return QPen(colours::eyeZone(palette),
                        5.0);  // wide, so that it shows under the skin's where both coincide
        case ChartSeries::Kind::eyeLimit:
            return QPen(colours::eyeZone(palette), 1.6, Qt::DashLine);
        case ChartSeries::Kind::skinExposure:
            return QPen(colours::skinZone(palette), 1.6);
        case ChartSeries::Kind::skinLimit:
            return QPen(colours::skinZone(palette), 1.6, Qt::DashDotLine);
        case ChartSeries::Kind::mark:
            break;
    }
    return QPen(palette.color(QPalette::Text), 1.4, Qt::DotLine);
}

QCategoryAxis* decadeAxis(const ChartAxis& axis, const QPalette& palette) {
    auto* result = new QCategoryAxis;
    const int first = static_cast<int>(std::lround(std::log10(axis.from)));
    const int last = static_cast<int>(std::lround(std::log10(axis.to)));
    const int step = 1 + (last - first) / mostLabels;
    result->setLabelsPosition(QCategoryAxis::AxisLabelsPositionOnValue);
    result->setStartValue(first);
    for (int decade = first; decade <= last; decade += step) result->append(powerOfTen(decade), decade);
    result->setRange(first, last);
    result->setTitleText(axis.title);
    result->setTitleFont(QApplication::font());
    result->setLabelsFont(QApplication::font());
    result->setLabelsColor(palette.color(QPalette::Text));
    result->setTitleBrush(palette.color(QPalette::Text));
    result->setMinorGridLineVisible(false);
    result->setGridLineColor(colours::faint(palette));
    result->setLinePenColor(palette.color(QPalette::Text));
    return result;
}

bool sameAxis(const ChartAxis& a, const ChartAxis& b) {
    return a.title == b.title && a.from == b.from && a.to == b.to;
}

bool sameAxesAndKinds(const ChartModel& a, const ChartModel& b) {
    return sameAxis(a.x, b.x) && sameAxis(a.y, b.y) &&
           std::equal(a.series.begin(), a.series.end(), b.series.begin(), b.series.end(),
                      [](const ChartSeries& s, const ChartSeries& t) {
                          return s.kind == t.kind && s.name == t.name;
                      });
}

}  // namespace

ChartWidget::ChartWidget(QWidget* parent)
    : QWidget(parent),
      chart_(new QChart),
      pages_(new QStackedWidget),
      table_(new QTableWidget),
      title_(new QLabel),
      asTable_(new QToolButton(this)) {
    auto* view = new QChartView(chart_);
    view->setRenderHint(QPainter::Antialiasing);
    view->setFrameShape(QFrame::NoFrame);
    view->setFocusPolicy(Qt::NoFocus);
    // Small update regions make every line item rasterize against a ragged clip: tens of milliseconds a
    // frame.
    view->setViewportUpdateMode(QGraphicsView::FullViewportUpdate);
    view->setMinimumHeight(fontMetrics().height() * 9);
    chart_->setAnimationOptions(QChart::NoAnimation);
    chart_->setMargins({4, 0, fontMetrics().averageCharWidth() * 3, 0});
    chart_->layout()->setContentsMargins(0, 0, 0, 0);
    chart_->legend()->setAlignment(Qt::AlignTop);
    chart_->legend()->setMarkerShape(QLegend::MarkerShapeFromSeries);
    table_->setEditTriggers(QAbstractItemView::NoEditTriggers);
    table_->setTabKeyNavigation(false);
    table_->setAccessibleName(tr("Numbers of the chart"));
    table_->verticalHeader()->hide();
    pages_->addWidget(view);
    pages_->addWidget(table_);
    asTable_->setText(tr("Table"));
    asTable_->setCheckable(true);
    asTable_->setObjectName("chart.table");
    asTable_->setToolTip(tr("Shows the numbers of the chart as a table"));
    connect(asTable_, &QToolButton::toggled, this, [this](bool on) {
        if (on) fillTable();
        pages_->setCurrentIndex(on ? 1 : 0);
    });
    auto* layout = new QVBoxLayout(this);
    layout->setContentsMargins(0, 0, 0, 0);
    layout->setSpacing(2);
    QFont bold = title_->font();
    bold.setBold(true);
    title_->setFont(bold);
    auto* top = new QHBoxLayout;
    top->addWidget(title_, 1);
    top->addWidget(asTable_);
    layout->addLayout(top);
    layout->addWidget(pages_, 1);
}

void ChartWidget::show(const ChartModel& model) {
    const bool sameFrame = sameAxesAndKinds(model, model_);
    model_ = model;
    title_->setText(model.title);
    setAccessibleName(model.title);
    setAccessibleDescription(model.summary);
    if (!sameFrame) rebuild();
    fillSeries();
    if (asTable_->isChecked()) fillTable();
}

/// New axes and series; costs tens of milliseconds, so it is done only when they change.
void ChartWidget::rebuild() {
    chart_->removeAllSeries();
    for (QAbstractAxis* axis : chart_->axes()) {
        chart_->removeAxis(axis);
        delete axis;
    }
    if (model_.series.empty()) return;
    chart_->setBackgroundBrush(palette().color(QPalette::Base));
    chart_->legend()->setLabelColor(palette().color(QPalette::Text));
    QAbstractAxis* x = decadeAxis(model_.x, palette());
    QAbstractAxis* y = decadeAxis(model_.y, palette());
    chart_->addAxis(x, Qt::AlignBottom);
    chart_->addAxis(y, Qt::AlignLeft);
    for (const ChartSeries& series : model_.series) {
        auto* line = new QLineSeries;
        line->setName(series.name);
        line->setPen(penOf(series.kind, palette()));
        chart_->addSeries(line);
        line->attachAxis(x);
        line->attachAxis(y);
    }
}

void ChartWidget::fillSeries() {
    const QList<QAbstractSeries*> lines = chart_->series();
    for (qsizetype i = 0; i < lines.size(); ++i) {
        QList<QPointF> points;
        for (const ChartPoint& point : model_.series[static_cast<std::size_t>(i)].points)
            points.append({std::log10(point.x), std::log10(point.y)});
        auto* line = qobject_cast<QLineSeries*>(lines[i]);
        if (line->points() != points) line->replace(points);
    }
}

void ChartWidget::fillTable() {
    // The curves share their distances only before thinning, so the table lists each series on its own.
    table_->clear();
    table_->setColumnCount(3);
    table_->setHorizontalHeaderLabels({tr("Series"), model_.x.title, model_.y.title});
    table_->setRowCount(0);
    for (const ChartSeries& series : model_.series) {
        if (series.kind == ChartSeries::Kind::mark) continue;
        const bool limit =
            series.kind == ChartSeries::Kind::eyeLimit || series.kind == ChartSeries::Kind::skinLimit;
        for (const ChartPoint& point : series.points) {
            const int row = table_->rowCount();
            table_->insertRow(row);
            const auto number = [](double v, dosimetry::Rounding rounding) {
                return new QTableWidgetItem(QString::fromStdString(dosimetry::format_number(v, 4, rounding)));
            };
            table_->setItem(row, 0, new QTableWidgetItem(series.name));
            table_->setItem(row, 1, number(point.x, dosimetry::Rounding::nearest));
            table_->setItem(row, 2,
                            number(point.y, limit ? dosimetry::Rounding::down : dosimetry::Rounding::up));
        }
    }
    table_->resizeColumnsToContents();
}

QPointF ChartWidget::positionOf(const ChartPoint& point) const {
    if (chart_->series().isEmpty()) return {};
    return chart_->mapToPosition({std::log10(point.x), std::log10(point.y)}, chart_->series().first());
}

void ChartWidget::changeEvent(QEvent* event) {
    if (event->type() == QEvent::PaletteChange) {
        rebuild();
        fillSeries();
    }
    QWidget::changeEvent(event);
}
