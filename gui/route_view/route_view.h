#pragma once

#include <QWidget>

#include "route_view/route_model.h"

class Session;

/// The route of the beam: envelope to scale over a logarithmic distance axis, hatched zones above the limits,
/// people that can be dragged or moved with the arrow keys (Shift for larger steps, Up and Down choose the
/// person).
class RouteView : public QWidget {
    Q_OBJECT

  public:
    explicit RouteView(Session& session, QWidget* parent = nullptr);
    QSize sizeHint() const override;
    QSize minimumSizeHint() const override;
    const RouteModel& model() const { return model_; }

  protected:
    void paintEvent(QPaintEvent* event) override;
    void mousePressEvent(QMouseEvent* event) override;
    void mouseMoveEvent(QMouseEvent* event) override;
    void mouseReleaseEvent(QMouseEvent* event) override;
    void keyPressEvent(QKeyEvent* event) override;

  private:
    void rebuild();
    int personAt(const QPointF& point) const;
    void moveCurrentTo(dosimetry::Length distance, const QString& mergeKey);

    Session& session_;
    RouteModel model_;
    std::optional<RouteModel::Axis>
        heldAxis_;  ///< while dragging the axis must not run away from under the pointer
    QPointF pressedAt_;
    double grabOffset_ = 0.0;  ///< from the pointer to the person it took, in pixels
    bool pressed_ = false;
    int drags_ = 0;
};
