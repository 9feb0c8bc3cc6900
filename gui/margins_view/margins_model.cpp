#include "margins_view/margins_model.h"

#include <QFont>
#include <algorithm>

#include "documents/result.h"
#include "quantities/format.h"
#include "session/session.h"

using namespace dosimetry;

MarginsModel::MarginsModel(Session& session, QObject* parent)
    : QAbstractTableModel(parent), session_(session) {
    connect(&session, &Session::setupChanged, this, &MarginsModel::reload);
    connect(&session, &Session::currentPositionChanged, this, &MarginsModel::reload);
    reload();
}

void MarginsModel::reload() {
    beginResetModel();
    criteria_.clear();
    governing_ = nullptr;
    if (session_.assessment().covered()) {
        const PositionAssessment& position =
            session_.assessment().positions[static_cast<std::size_t>(session_.currentPosition())];
        for (const Criterion& criterion : position.criteria) criteria_.push_back(&criterion);
        std::stable_sort(criteria_.begin(), criteria_.end(),
                         [](const Criterion* a, const Criterion* b) { return a->ratio > b->ratio; });
        governing_ = position.governing_criterion();
    }
    endResetModel();
}

int MarginsModel::rowCount(const QModelIndex& parent) const {
    return parent.isValid() ? 0 : static_cast<int>(criteria_.size());
}

int MarginsModel::columnCount(const QModelIndex& parent) const {
    return parent.isValid() ? 0 : ColumnCount;
}

QVariant MarginsModel::data(const QModelIndex& index, int role) const {
    if (!index.isValid()) return {};
    const Criterion& c = *criteria_[static_cast<std::size_t>(index.row())];
    const bool governs = &c == governing_;
    const QString ratio = QString::fromStdString(format_number(c.ratio, 4, Rounding::up));
    switch (role) {
        case RatioRole:
            return c.ratio;
        case GoverningRole:
            return governs;
        case Qt::FontRole: {
            QFont font;
            font.setBold(governs);
            return font;
        }
        case Qt::TextAlignmentRole: {
            const bool number = index.column() == RatioColumn || index.column() == ValuesColumn;
            return QVariant(Qt::AlignVCenter | (number ? Qt::AlignRight : Qt::AlignLeft));
        }
        case Qt::ToolTipRole:
            return tr("%1\nProvenance: %2%3")
                .arg(QString::fromStdString(c.limit_set + ", " + c.clause),
                     QString::fromStdString(c.provenance),
                     c.note.empty() ? QString() : "\n" + QString::fromStdString(c.note));
        case Qt::AccessibleTextRole:
        case Qt::DisplayRole:
            break;
        default:
            return {};
    }
    switch (index.column()) {
        case EffectColumn: {
            QString second = QString::fromStdString(c.clause);
            if (session_.setup().limits.size() > 1)
                second.prepend(QString::fromStdString(c.limit_set) + ", ");
            if (governs) second += tr(", governs");
            return QString::fromStdString(name_of(c.tissue, c.effect)) + "\n" + second;
        }
        case BarColumn:
            if (role == Qt::DisplayRole) return {};  // drawn; the words are for screen readers
            return c.ratio > 1.0 ? tr("%1 times the limit").arg(ratio) : tr("%1 of the limit").arg(ratio);
        case RatioColumn:
            return ratio + QStringLiteral(" ×");
        case ValuesColumn:
            return tr("%1\nlimit %2")
                .arg(QString::fromStdString(exposure_text(c)), QString::fromStdString(limit_text(c)));
        default:
            return {};
    }
}

QVariant MarginsModel::headerData(int section, Qt::Orientation orientation, int role) const {
    if (orientation != Qt::Horizontal) return {};
    if (role == Qt::TextAlignmentRole) {
        const bool number = section == RatioColumn || section == ValuesColumn;
        return QVariant(Qt::AlignVCenter | (number                 ? Qt::AlignRight
                                            : section == BarColumn ? Qt::AlignHCenter
                                                                   : Qt::AlignLeft));
    }
    if (role != Qt::DisplayRole) return {};
    switch (section) {
        case EffectColumn:
            return tr("Tissue, effect, clause");
        case RatioColumn:
            return tr("Ratio");
        case BarColumn:
            return tr("1× limit");
        case ValuesColumn:
            return tr("Exposure");
        default:
            return {};
    }
}
