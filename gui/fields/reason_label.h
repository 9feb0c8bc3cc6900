#pragma once

#include <QLabel>

/// The reason why a field's content is not accepted, under the field; hidden while there is none.
class ReasonLabel : public QLabel {
    Q_OBJECT

  public:
    explicit ReasonLabel(QWidget* parent = nullptr);
    void showReason(const QString& reason);
    const QString& reason() const { return shown_; }

  private:
    QString shown_;
};
