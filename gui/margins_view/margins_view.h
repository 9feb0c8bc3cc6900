#pragma once

#include <QWidget>

#include "assessment/trail.h"

class AnswersModel;
class MarginsModel;
class QLabel;
class QTableView;
class Session;

/// Margins of the current position: a bar for each criterion, the other answers below. Choosing a row shows
/// its trail.
class MarginsView : public QWidget {
    Q_OBJECT

  public:
    explicit MarginsView(Session& session, QWidget* parent = nullptr);
    /// Emits the trail of the chosen number again.
    void announceTrail();

  signals:
    /// The trail of the chosen number; valid until the setup changes.
    void trailChosen(const dosimetry::Trail& trail);

  private:
    void showState();
    Session& session_;
    MarginsModel* margins_;
    AnswersModel* answers_;
    QLabel* heading_;
    QLabel* uncovered_;
    QTableView* marginsTable_;
    QTableView* answersTable_;
    QString chosen_;  ///< which number, by name, so that an edit does not change it; empty: the governing
                      ///< criterion
};
