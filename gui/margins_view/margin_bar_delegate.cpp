#include "margins_view/margin_bar_delegate.h"

#include <QPainter>
#include <algorithm>
#include <cmath>

#include "margins_view/margins_model.h"
#include "window/colours.h"

namespace {

constexpr double decadesEachSide = 6.0;

}  // namespace

void MarginBarDelegate::paint(QPainter* painter, const QStyleOptionViewItem& option,
                              const QModelIndex& index) const {
    QStyledItemDelegate::paint(painter, option, index);
    const double ratio = index.data(MarginsModel::RatioRole).toDouble();
    const QRectF area = QRectF(option.rect).adjusted(6, 5, -6, -5);
    const double centre = area.center().x();
    const auto xOf = [&](double decades) {
        return centre + std::clamp(decades / decadesEachSide, -1.0, 1.0) * area.width() / 2.0;
    };
    painter->save();
    painter->setRenderHint(QPainter::Antialiasing);
    painter->setPen(QPen(colours::faint(option.palette), 1));
    for (int decade = -6; decade <= 6; decade += 2)
        painter->drawLine(QPointF(xOf(decade), area.top()), QPointF(xOf(decade), area.bottom()));

    const double end = xOf(std::log10(std::max(ratio, 1e-300)));
    const QRectF bar(std::min(centre, end), area.top() + 3, std::max(1.0, std::fabs(end - centre)),
                     area.height() - 6);
    if (ratio > 1.0) {
        painter->setPen(QPen(colours::danger(), 1.2));
        painter->setBrush(colours::danger());
        painter->drawRect(bar);
        painter->setClipRect(bar);
        painter->setPen(QPen(colours::warning(), 2));
        for (double x = bar.left() - bar.height(); x < bar.right(); x += 8)
            painter->drawLine(QPointF(x, bar.bottom()), QPointF(x + bar.height(), bar.top()));
        painter->setClipping(false);
    } else {
        painter->setPen(QPen(colours::safe(), 1.2));
        painter->setBrush(colours::safe());
        painter->drawRect(bar);
    }
    painter->setPen(QPen(option.palette.color(QPalette::Text), 2));
    painter->drawLine(QPointF(centre, area.top() - 3), QPointF(centre, area.bottom() + 3));
    painter->restore();
}

QSize MarginBarDelegate::sizeHint(const QStyleOptionViewItem& option, const QModelIndex&) const {
    return {option.fontMetrics.averageCharWidth() * 12, option.fontMetrics.height() * 2};
}
