#pragma once

#include <QWidget>

#include "charts/chart_model.h"

class QChart;
class QLabel;
class QStackedWidget;
class QTableWidget;
class QToolButton;

/// Shows a ChartModel with Qt Charts, with a table of the same numbers behind a button. All knowledge of Qt
/// Charts is in this class: log10 values on linear axes with our own labels, since its logarithmic axes
/// misplace small values.
class ChartWidget : public QWidget {
    Q_OBJECT

  public:
    explicit ChartWidget(QWidget* parent = nullptr);
    void show(const ChartModel& model);
    /// Pixel of a value inside the chart's own scene; for tests.
    QPointF positionOf(const ChartPoint& point) const;

  protected:
    void changeEvent(QEvent* event) override;

  private:
    void rebuild();
    void fillSeries();
    void fillTable();
    ChartModel model_;
    QChart* chart_;
    QStackedWidget* pages_;
    QTableWidget* table_;
    QLabel* title_;
    QToolButton* asTable_;
};
