#pragma once

#include <QGroupBox>

class QComboBox;
class QPushButton;
class Session;

/// The places where people may be: one is chosen, its values stand below.
class PositionForm : public QGroupBox {
    Q_OBJECT

  public:
    explicit PositionForm(Session& session, QWidget* parent = nullptr);

  private:
    void showPositions();
    void addCopy();
    void removeCurrent();

    Session& session_;
    QComboBox* chosen_;
    QPushButton* remove_;
};
