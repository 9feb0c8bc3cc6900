#pragma once

#include <QGroupBox>

class CalmComboBox;
class QPushButton;
class Session;

/// The places where people may be: one is chosen, its values stand below.
class PositionForm : public QGroupBox {
    Q_OBJECT

  public:
    explicit PositionForm(Session& session, QWidget* parent = nullptr);

  private:
    void showPositions();
    void showValidity();
    void addCopy();
    void removeCurrent();

    Session& session_;
    CalmComboBox* chosen_;
    QPushButton* add_;
    QPushButton* remove_;
};
