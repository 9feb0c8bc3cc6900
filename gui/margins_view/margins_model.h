#pragma once

#include <QAbstractTableModel>
#include <vector>

#include "assessment/assessment.h"

class Session;

/// The criteria of the current position, the most restrictive first.
class MarginsModel : public QAbstractTableModel {
    Q_OBJECT

  public:
    enum Column { EffectColumn, RatioColumn, BarColumn, ValuesColumn, ColumnCount };
    enum Role { RatioRole = Qt::UserRole, GoverningRole };

    explicit MarginsModel(Session& session, QObject* parent = nullptr);

    int rowCount(const QModelIndex& parent = {}) const override;
    int columnCount(const QModelIndex& parent = {}) const override;
    QVariant data(const QModelIndex& index, int role = Qt::DisplayRole) const override;
    QVariant headerData(int section, Qt::Orientation orientation, int role = Qt::DisplayRole) const override;
    const dosimetry::Criterion& criterionOf(int row) const {
        return *criteria_[static_cast<std::size_t>(row)];
    }
    const dosimetry::Trail& trailOf(int row) const { return criteria_[static_cast<std::size_t>(row)]->trail; }

  private:
    void reload();
    Session& session_;
    std::vector<const dosimetry::Criterion*> criteria_;
    const dosimetry::Criterion* governing_ = nullptr;
};
