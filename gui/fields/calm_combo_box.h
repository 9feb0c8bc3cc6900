#pragma once

#include <QComboBox>
#include <QWheelEvent>

/// A combo box that the mouse wheel does not change: it stands in a panel that people scroll, and a beam
/// profile must not change in passing.
class CalmComboBox : public QComboBox {
    Q_OBJECT

  public:
    using QComboBox::QComboBox;

  protected:
    void wheelEvent(QWheelEvent* event) override { event->ignore(); }
};
