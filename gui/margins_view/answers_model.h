#pragma once

#include <QAbstractTableModel>
#include <vector>

#include "assessment/assessment.h"

class Session;

/// The answers of the current position besides the criteria, each with its trail.
class AnswersModel : public QAbstractTableModel {
    Q_OBJECT

  public:
    explicit AnswersModel(Session& session, QObject* parent = nullptr);

    int rowCount(const QModelIndex& parent = {}) const override;
    int columnCount(const QModelIndex& parent = {}) const override;
    QVariant data(const QModelIndex& index, int role = Qt::DisplayRole) const override;
    QString labelOf(int row) const { return answers_[static_cast<std::size_t>(row)].label; }
    const dosimetry::Trail& trailOf(int row) const { return *answers_[static_cast<std::size_t>(row)].trail; }

  private:
    struct Answer {
        QString label;
        QString value;
        const dosimetry::Trail* trail;
    };
    void reload();
    void add(const QString& label, const std::string& value, const dosimetry::Trail& trail);
    Session& session_;
    std::vector<Answer> answers_;
};
