#pragma once

#include <QStyledItemDelegate>

/// Draws a ratio as a bar on a logarithmic scale around the 1× line: to the right and hatched above the
/// limit, to the left and plain below it.
class MarginBarDelegate : public QStyledItemDelegate {
    Q_OBJECT

  public:
    using QStyledItemDelegate::QStyledItemDelegate;
    void paint(QPainter* painter, const QStyleOptionViewItem& option,
               const QModelIndex& index) const override;
    QSize sizeHint(const QStyleOptionViewItem& option, const QModelIndex& index) const override;
};
