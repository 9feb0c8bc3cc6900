#pragma once

#include <QFrame>

class QLabel;
class Session;

/// The verdict on the current position in one sentence, with a sign; says when it belongs to earlier values.
class VerdictBar : public QFrame {
    Q_OBJECT

  public:
    explicit VerdictBar(Session& session, QWidget* parent = nullptr);

  signals:
    void sheetWanted();

  private:
    void showState();
    Session& session_;
    QLabel* sign_;
    QLabel* sentence_;
};
