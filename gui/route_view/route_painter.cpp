#include "route_view/route_painter.h"

#include <QPainter>
#include <QPalette>
#include <algorithm>
#include <cmath>
#include <optional>
#include <vector>

#include "quantities/format.h"
#include "window/colours.h"

using namespace dosimetry;

namespace {

QString text(const std::string& s) {
    return QString::fromStdString(s);
}

/// Hatching as lines: pattern brushes turn into pictures on paper.
void hatch(QPainter& painter, const QRectF& rect, const QColor& colour, bool rising, double spacing) {
    painter.save();
    painter.setClipRect(rect);
    painter.setPen(QPen(colour, spacing / 6.0));
    const double h = rect.height();
    for (double x = rect.left() - h - std::fmod(rect.left() - h, spacing); x < rect.right() + h;
         x += spacing) {
        if (rising)
            painter.drawLine(QPointF(x, rect.bottom()), QPointF(x + h, rect.top()));
        else
            painter.drawLine(QPointF(x, rect.top()), QPointF(x + h, rect.bottom()));
    }
    painter.restore();
}

void paintAxis(QPainter& painter, const RouteModel& model, const RouteLayout& layout,
               const RouteStyle& style) {
    const QFontMetricsF metrics(painter.font(), painter.device());
    const double pen = metrics.height() / 14.0;  // a pixel on screen, no hairline on paper
    const int first = static_cast<int>(std::lround(std::log10(model.from.in_si())));
    const int last = static_cast<int>(std::lround(std::log10(model.to.in_si())));
    const double y = layout.plot.bottom();
    painter.setPen(QPen(style.ink, pen));
    painter.drawLine(QPointF(layout.plot.left(), y), QPointF(layout.plot.right(), y));
    double lastLabelEnd = -1e9;
    for (int decade = first; decade <= last; ++decade) {
        const double x = layout.xOf(metres(std::pow(10.0, decade)));
        painter.setPen(QPen(style.faint, pen));
        painter.drawLine(QPointF(x, layout.plot.top()), QPointF(x, y));
        painter.setPen(QPen(style.ink, pen));
        painter.drawLine(QPointF(x, y), QPointF(x, y + metrics.height() * 0.3));
        const QString label = text(decadeLabel(decade));
        const double labelLeft = x - metrics.horizontalAdvance(label) / 2.0;
        if (labelLeft > lastLabelEnd) {
            painter.drawText(QPointF(labelLeft, y + metrics.height() * 1.15), label);
            lastLabelEnd = labelLeft + metrics.horizontalAdvance(label) + metrics.averageCharWidth();
        }
        if (decade == last) break;
        for (int k = 2; k < 10; ++k) {
            const double minor = layout.xOf(metres(k * std::pow(10.0, decade)));
            painter.drawLine(QPointF(minor, y), QPointF(minor, y + metrics.height() * 0.15));
        }
    }
}

void paintZones(QPainter& painter, const RouteModel& model, const RouteLayout& layout,
                const RouteStyle& style) {
    const QFontMetricsF metrics(painter.font(), painter.device());
    const double pen = metrics.height() / 14.0;  // a pixel on screen, no hairline on paper
    for (Tissue tissue : {Tissue::eye, Tissue::skin}) {
        const bool eye = tissue == Tissue::eye;
        const double top = layout.bandTop(tissue);
        const QColor colour = eye ? style.eye : style.skin;
        bool any = false;
        for (const RouteZone& zone : model.zones) {
            if (zone.tissue != tissue) continue;
            const double left = zone.startsBeforeAxis ? layout.plot.left() : layout.xOf(zone.from);
            const double right = zone.endsBehindAxis ? layout.plot.right() : layout.xOf(zone.to);
            const QRectF band(left, top, right - left, layout.bandHeight);
            hatch(painter, band, colour, eye, layout.bandHeight * 0.45);
            painter.setPen(QPen(colour, pen * 1.5));
            painter.setBrush(Qt::NoBrush);
            painter.drawRect(band);
            // the end of the zone goes down to the axis, so that it can be read off
            QPen down(colour, pen * 1.2, Qt::DashLine);
            painter.setPen(down);
            if (!zone.endsBehindAxis)
                painter.drawLine(QPointF(right, band.bottom()), QPointF(right, layout.plot.bottom()));
            const QString label = text(zone.label);
            const double width = metrics.horizontalAdvance(label) + metrics.averageCharWidth() * 2;
            double x = any ? right + metrics.averageCharWidth() : left + metrics.averageCharWidth() * 2;
            x = std::min(x, layout.plot.right() - width);
            const QRectF box(x, top + layout.bandHeight * 0.12, width, layout.bandHeight * 0.76);
            painter.fillRect(box, style.paper);
            painter.setPen(style.ink);
            painter.drawText(box, Qt::AlignCenter, label);
            any = true;
        }
        for (const RouteRemark& remark : model.remarks) {
            if (remark.tissue != tissue) continue;
            painter.setPen(style.ink);
            const QRectF box(layout.plot.left(), top, layout.plot.width(), layout.bandHeight);
            painter.drawText(box, Qt::AlignVCenter | Qt::AlignLeft, text(remark.text));
        }
    }
}

void paintBeam(QPainter& painter, const RouteModel& model, const RouteLayout& layout, const RouteStyle& style,
               double sourceLeft) {
    const QFontMetricsF metrics(painter.font(), painter.device());
    const double pen = metrics.height() / 14.0;  // a pixel on screen, no hairline on paper
    double widest = 0.0;
    for (Length d : model.diameters) widest = std::max(widest, d.in_si());
    QPolygonF upper;
    QPolygonF lower;
    for (std::size_t i = 0; i < model.distances.size(); ++i) {
        const double x = layout.xOf(model.distances[i]);
        const double half = layout.halfHeight * model.diameters[i].in_si() / widest;
        upper << QPointF(x, layout.axisY - half);
        lower.prepend(QPointF(x, layout.axisY + half));
    }
    QColor fill = style.beam;
    fill.setAlphaF(0.25F);
    painter.setPen(Qt::NoPen);
    painter.setBrush(fill);
    painter.drawPolygon(upper + lower);
    painter.setBrush(Qt::NoBrush);
    painter.setPen(QPen(style.beam, pen * 1.6));
    painter.drawPolyline(upper);
    painter.drawPolyline(lower);
    const double boxHeight = metrics.height() * 1.6;
    const QRectF box(sourceLeft, layout.axisY - boxHeight / 2,
                     layout.plot.left() - sourceLeft - metrics.averageCharWidth(), boxHeight);
    painter.drawLine(QPointF(box.right(), layout.axisY), QPointF(layout.plot.left(), layout.axisY));
    painter.setPen(QPen(style.ink, pen * 1.2));
    painter.setBrush(style.paper);
    painter.drawRect(box);
    painter.drawText(box, Qt::AlignCenter,
                     metrics.elidedText(text(model.sourceId), Qt::ElideRight, box.width() - 4));
    const QString wide = QStringLiteral("⌀ ") + text(format(model.diameters.back(), 3, Rounding::up));
    const double width = metrics.horizontalAdvance(wide) + metrics.averageCharWidth();
    const QRectF label(layout.plot.right() - width, layout.axisY - layout.halfHeight - metrics.height() * 0.5,
                       width, metrics.height());
    painter.fillRect(label, style.paper);
    painter.setPen(style.ink);
    painter.drawText(label, Qt::AlignCenter, wide);
}

/// A warning triangle over the head of whoever is above a limit, so that it does not depend on the zones
/// alone.
void paintTriangle(QPainter& painter, const QPointF& top, double size, const RouteStyle& style) {
    const QPolygonF triangle({top, top + QPointF(size * 0.58, size), top + QPointF(-size * 0.58, size)});
    painter.setPen(QPen(style.ink, size * 0.09, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin));
    painter.setBrush(style.warning);
    painter.drawPolygon(triangle);
    painter.drawLine(top + QPointF(0, size * 0.38), top + QPointF(0, size * 0.64));
    painter.drawPoint(top + QPointF(0, size * 0.83));
}

void paintPerson(QPainter& painter, const RoutePerson& person, int number, bool numbered,
                 const RouteLayout& layout, const RouteStyle& style) {
    const QFontMetricsF metrics(painter.font(), painter.device());
    const double pen = metrics.height() / 14.0;
    const QRectF r = layout.personRect(person);
    const double x = r.center().x();
    const double head = r.height() * 0.13;
    const QColor colour = person.current ? style.highlight : style.ink;
    painter.setPen(QPen(style.faint, pen, Qt::DashLine));
    painter.drawLine(QPointF(x, r.bottom()), QPointF(x, layout.plot.bottom()));
    painter.setPen(QPen(colour, pen * (person.current ? 2.2 : 1.5), Qt::SolidLine, Qt::RoundCap));
    painter.setBrush(style.paper);
    // the eye is on the beam's axis
    painter.drawEllipse(QPointF(x, layout.axisY), head, head);
    const double neck = layout.axisY + head;
    const double hip = neck + (r.bottom() - neck) * 0.5;
    painter.drawLine(QPointF(x, neck), QPointF(x, hip));
    painter.drawLine(QPointF(x, neck + head * 0.6), QPointF(x - head * 1.2, neck + (hip - neck) * 0.8));
    painter.drawLine(QPointF(x, neck + head * 0.6), QPointF(x + head * 1.2, neck + (hip - neck) * 0.8));
    painter.drawLine(QPointF(x, hip), QPointF(x - head * 0.9, r.bottom()));
    painter.drawLine(QPointF(x, hip), QPointF(x + head * 0.9, r.bottom()));
    if (numbered) {
        painter.setPen(style.ink);
        const QRectF box(x - metrics.height(), layout.axisY - metrics.height() / 2, metrics.height() * 2,
                         metrics.height());
        painter.drawText(box, Qt::AlignCenter, QString::number(number));
    }
    if (person.assessed && person.ratio > 1.0)
        paintTriangle(painter, QPointF(x, layout.axisY - head * 1.3 - metrics.height() * 0.95),
                      metrics.height() * 0.9, style);
}

/// Beside the feet, on the other side or lower down, wherever no other label or figure stands; a person whose
/// label finds no room keeps only the number.
void paintLabel(QPainter& painter, const RoutePerson& person, int number, bool numbered,
                const RouteLayout& layout, const RouteStyle& style, std::vector<QRectF>& taken) {
    QFont bold = painter.font();
    bold.setBold(person.current);
    const QFontMetricsF metrics(painter.font(), painter.device());
    const QFontMetricsF boldMetrics(bold, painter.device());
    const double gap = metrics.averageCharWidth();
    const double widest = metrics.averageCharWidth() * 30;
    const QString name = boldMetrics.elidedText(
        (numbered ? QString::number(number) + ". " : QString()) + text(person.id), Qt::ElideRight, widest);
    QString value = text(person.at.text);
    if (person.assessed)
        value += QStringLiteral(": ") + text(format_number(person.ratio, 4, Rounding::up)) +
                 QStringLiteral(" × limit");
    const double width =
        std::max(boldMetrics.horizontalAdvance(name), metrics.horizontalAdvance(value)) + gap;
    const double height = metrics.height() * 2.0;
    const QRectF figure = layout.personRect(person);
    const double right = figure.center().x() + figure.width() * 0.6;
    const double left = figure.center().x() - figure.width() * 0.6 - width;
    const std::optional<QRectF> box = [&]() -> std::optional<QRectF> {
        for (double top = figure.bottom() - height; top + height < layout.plot.bottom(); top += height * 1.1)
            for (double x : {right, left}) {
                const QRectF candidate(x, top, width, height);
                if (x < layout.plot.left() || x + width > layout.plot.right()) continue;
                if (std::none_of(taken.begin(), taken.end(),
                                 [&](const QRectF& t) { return t.intersects(candidate); }))
                    return candidate;
            }
        return std::nullopt;
    }();
    if (!box) return;
    taken.push_back(*box);
    QColor back = style.paper;
    back.setAlphaF(0.85F);
    painter.fillRect(*box, back);
    painter.setPen(style.ink);
    const QRectF inner = box->adjusted(gap / 2, 0, 0, 0);
    painter.save();
    painter.setFont(bold);
    painter.drawText(inner.adjusted(0, 0, 0, -height / 2), Qt::AlignLeft | Qt::AlignVCenter, name);
    painter.restore();
    painter.drawText(inner.adjusted(0, height / 2, 0, 0), Qt::AlignLeft | Qt::AlignVCenter, value);
}

}  // namespace

RouteStyle RouteStyle::forScreen(const QPalette& p) {
    return {p.color(QPalette::Base),
            p.color(QPalette::Text),
            colours::faint(p),
            colours::beam(p),
            colours::eyeZone(p),
            colours::skinZone(p),
            p.color(QPalette::Highlight),
            colours::warning()};
}

RouteStyle RouteStyle::forPaper() {
    return {Qt::white, Qt::black, QColor(205, 205, 205), QColor(70, 70, 70), Qt::black, QColor(90, 90, 90),
            Qt::black, Qt::white};
}

RouteLayout::RouteLayout(const RouteModel& model, const QRectF& area, double lineHeight)
    : axisY(0), halfHeight(0), bandHeight(lineHeight * 1.5), model_(model), lineHeight_(lineHeight) {
    const double sourceWidth = std::min(lineHeight * 7.0, area.width() * 0.22);
    plot = area.adjusted(sourceWidth, lineHeight * 0.4, -lineHeight * 2.2, -lineHeight * 1.6);
    const double top = bandTop(Tissue::skin) + bandHeight + lineHeight * 0.5;
    axisY = top + (plot.bottom() - top) * 0.45;
    halfHeight = (plot.bottom() - top) * 0.42;
}

double RouteLayout::xOf(Length distance) const {
    return plot.left() + plot.width() * model_.fractionOf(distance);
}

Length RouteLayout::distanceAt(double x) const {
    return model_.distanceAt((x - plot.left()) / plot.width());
}

double RouteLayout::bandTop(Tissue tissue) const {
    return plot.top() + (tissue == Tissue::eye ? 0.0 : bandHeight + lineHeight_ * 0.3);
}

QRectF RouteLayout::personRect(const RoutePerson& person) const {
    const double below = std::min(plot.bottom() - axisY - lineHeight_ * 0.4, lineHeight_ * 5.0);
    const double head = below * 0.15;
    return {xOf(person.at.value) - below * 0.25, axisY - head, below * 0.5, below + head};
}

void paintRoute(QPainter& painter, const QRectF& area, const RouteModel& model, const RouteStyle& style) {
    painter.save();
    painter.setRenderHint(QPainter::Antialiasing);
    const QFontMetricsF metrics(painter.font(), painter.device());
    const RouteLayout layout(model, area, metrics.height());
    painter.fillRect(area, style.paper);
    paintAxis(painter, model, layout, style);
    paintZones(painter, model, layout, style);
    paintBeam(painter, model, layout, style, area.left() + metrics.averageCharWidth());
    // The current person lies on top and its label has the best place.
    std::vector<std::size_t> order;
    for (std::size_t i = 0; i < model.people.size(); ++i) order.push_back(i);
    std::stable_partition(order.begin(), order.end(), [&](std::size_t i) { return model.people[i].current; });
    const bool numbered = order.size() > 1;
    std::vector<QRectF> taken;
    for (const RoutePerson& person : model.people) taken.push_back(layout.personRect(person));
    for (auto i = order.rbegin(); i != order.rend(); ++i)
        paintPerson(painter, model.people[*i], static_cast<int>(*i) + 1, numbered, layout, style);
    for (std::size_t i : order)
        paintLabel(painter, model.people[i], static_cast<int>(i) + 1, numbered, layout, style, taken);
    painter.restore();
}
