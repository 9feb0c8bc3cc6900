#include "route_view/route_view.h"

#include <QApplication>
#include <QMouseEvent>
#include <QPainter>
#include <algorithm>
#include <cmath>

#include "documents/result.h"
#include "quantities/input_error.h"
#include "route_view/route_painter.h"
#include "session/session.h"

using namespace dosimetry;

RouteView::RouteView(Session& session, QWidget* parent) : QWidget(parent), session_(session) {
    setObjectName("route");
    setFocusPolicy(Qt::StrongFocus);
    setMouseTracking(true);
    setAccessibleName(tr("Route of the beam"));
    connect(&session, &Session::setupChanged, this, &RouteView::rebuild);
    connect(&session, &Session::currentPositionChanged, this, &RouteView::rebuild);
    connect(&session, &Session::validityChanged, this, qOverload<>(&RouteView::update));
    rebuild();
}

QSize RouteView::sizeHint() const {
    return {fontMetrics().height() * 40, fontMetrics().height() * 18};
}
QSize RouteView::minimumSizeHint() const {
    return {fontMetrics().height() * 20, fontMetrics().height() * 12};
}

void RouteView::rebuild() {
    model_ = RouteModel::of(session_.setup(), session_.assessment(), session_.currentPosition(), heldAxis_);
    QString description;
    for (const RouteZone& zone : model_.zones) description += QString::fromStdString(zone.label) + ". ";
    for (const RouteRemark& remark : model_.remarks)
        description += QString::fromStdString(remark.text) + ". ";
    if (session_.assessment().covered())
        description += QString::fromStdString(
            verdict(session_.assessment().positions[static_cast<std::size_t>(session_.currentPosition())]));
    setAccessibleDescription(description);
    update();
}

void RouteView::paintEvent(QPaintEvent*) {
    QPainter painter(this);
    if (session_.hasInvalidField()) painter.setOpacity(0.45);
    paintRoute(painter, rect(), model_, RouteStyle::forScreen(palette()));
    if (hasFocus()) {
        painter.setOpacity(1.0);
        painter.setPen(QPen(palette().color(QPalette::Highlight), 2));
        painter.drawRect(QRectF(rect()).adjusted(1, 1, -1, -1));
    }
}

int RouteView::personAt(const QPointF& point) const {
    const RouteLayout layout(model_, rect(), QFontMetricsF(font()).height());
    const double reach = QFontMetricsF(font()).height();
    for (std::size_t i = model_.people.size(); i-- > 0;)
        if (layout.personRect(model_.people[i]).adjusted(-reach, -reach, reach, reach).contains(point))
            return static_cast<int>(i);
    return -1;
}

void RouteView::mousePressEvent(QMouseEvent* event) {
    const int person = personAt(event->position());
    if (event->button() != Qt::LeftButton || person < 0) return;
    session_.setCurrentPosition(person);
    if (session_.currentPosition() != person) return;
    const RouteLayout layout(model_, rect(), QFontMetricsF(font()).height());
    pressed_ = true;
    pressedAt_ = event->position();
    grabOffset_ = layout.xOf(model_.people[static_cast<std::size_t>(person)].at.value) - pressedAt_.x();
}

void RouteView::mouseMoveEvent(QMouseEvent* event) {
    if (!pressed_) {
        setCursor(personAt(event->position()) >= 0 ? Qt::SizeHorCursor : Qt::ArrowCursor);
        return;
    }
    if (!heldAxis_) {  // a click alone moves nobody
        if (std::fabs(event->position().x() - pressedAt_.x()) < QApplication::startDragDistance()) return;
        heldAxis_ = {model_.from, model_.to};
        ++drags_;
        setCursor(Qt::SizeHorCursor);
    }
    const RouteLayout layout(model_, rect(), QFontMetricsF(font()).height());
    const double x = std::clamp(event->position().x() + grabOffset_, layout.plot.left(), layout.plot.right());
    moveCurrentTo(layout.distanceAt(x), QString("drag%1").arg(drags_));
}

void RouteView::mouseReleaseEvent(QMouseEvent* event) {
    if (event->button() != Qt::LeftButton) return;
    pressed_ = false;
    if (!heldAxis_) return;
    heldAxis_.reset();
    rebuild();
}

void RouteView::keyPressEvent(QKeyEvent* event) {
    const int current = session_.currentPosition();
    const double step = event->modifiers() & Qt::ShiftModifier ? 0.1 : 0.02;  // decades
    const Length at = session_.setup().positions[static_cast<std::size_t>(current)].at.value;
    switch (event->key()) {
        case Qt::Key_Left:
            moveCurrentTo(at * std::pow(10.0, -step), "arrows");
            return;
        case Qt::Key_Right:
            moveCurrentTo(at * std::pow(10.0, step), "arrows");
            return;
        case Qt::Key_Up:
            session_.setCurrentPosition(current - 1);
            return;
        case Qt::Key_Down:
            session_.setCurrentPosition(current + 1);
            return;
        default:
            QWidget::keyPressEvent(event);
    }
}

void RouteView::moveCurrentTo(Length distance, const QString& mergeKey) {
    Setup next = session_.setup();
    next.positions[static_cast<std::size_t>(session_.currentPosition())].at = roundedDistance(distance);
    try {
        session_.edit(next, tr("move of a position"), mergeKey + QString::number(session_.currentPosition()));
    } catch (const InputError&) {
        // outside what can be calculated: the person stays where it is
    }
}
