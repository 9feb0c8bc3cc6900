#pragma once

#include <QFrame>

class QLabel;
class Session;

/// The cautions, always in view: there is no way to close or hide this.
class CautionsBar : public QFrame {
    Q_OBJECT

  public:
    explicit CautionsBar(Session& session, QWidget* parent = nullptr);

  private:
    void showCautions();
    Session& session_;
    QLabel* text_;
};
