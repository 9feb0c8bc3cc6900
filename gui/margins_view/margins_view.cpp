#include "margins_view/margins_view.h"

#include <QHeaderView>
#include <QLabel>
#include <QTableView>
#include <QVBoxLayout>
#include <algorithm>

#include "margins_view/answers_model.h"
#include "margins_view/margin_bar_delegate.h"
#include "margins_view/margins_model.h"
#include "session/session.h"

namespace {

QTableView* plainTable(QAbstractItemModel* model) {
    auto* table = new QTableView;
    table->setModel(model);
    table->verticalHeader()->hide();
    table->setSelectionBehavior(QAbstractItemView::SelectRows);
    table->setSelectionMode(QAbstractItemView::SingleSelection);
    table->setEditTriggers(QAbstractItemView::NoEditTriggers);
    table->setShowGrid(false);
    table->setTabKeyNavigation(false);
    table->setHorizontalScrollMode(QAbstractItemView::ScrollPerPixel);
    return table;
}

QString nameOf(const dosimetry::Criterion& c) {
    return QString::fromStdString(c.limit_set + ": " + dosimetry::name_of(c.tissue) + ", " +
                                  dosimetry::name_of(c.effect));
}

}  // namespace

MarginsView::MarginsView(Session& session, QWidget* parent)
    : QWidget(parent),
      session_(session),
      margins_(new MarginsModel(session, this)),
      answers_(new AnswersModel(session, this)),
      heading_(new QLabel),
      uncovered_(new QLabel),
      marginsTable_(plainTable(margins_)),
      answersTable_(plainTable(answers_)) {
    marginsTable_->setObjectName("margins");
    marginsTable_->setAccessibleName(tr("Margins: exposure against each limit"));
    marginsTable_->setItemDelegateForColumn(MarginsModel::BarColumn, new MarginBarDelegate(this));
    marginsTable_->verticalHeader()->setSectionResizeMode(QHeaderView::ResizeToContents);
    marginsTable_->horizontalHeader()->setSectionResizeMode(QHeaderView::ResizeToContents);
    marginsTable_->horizontalHeader()->setSectionResizeMode(MarginsModel::BarColumn, QHeaderView::Stretch);
    marginsTable_->horizontalHeader()->setMinimumSectionSize(fontMetrics().averageCharWidth() * 11);
    marginsTable_->horizontalHeader()->setHighlightSections(false);
    marginsTable_->setWordWrap(true);
    answersTable_->setObjectName("answers");
    answersTable_->setAccessibleName(tr("Answers"));
    answersTable_->horizontalHeader()->hide();
    answersTable_->horizontalHeader()->setSectionResizeMode(0, QHeaderView::ResizeToContents);
    answersTable_->horizontalHeader()->setSectionResizeMode(1, QHeaderView::Stretch);
    answersTable_->verticalHeader()->setSectionResizeMode(QHeaderView::ResizeToContents);
    uncovered_->setWordWrap(true);
    uncovered_->setTextFormat(Qt::PlainText);
    heading_->setTextFormat(Qt::PlainText);
    uncovered_->setObjectName("uncovered");
    QFont bold = heading_->font();
    bold.setBold(true);
    heading_->setFont(bold);

    auto* layout = new QVBoxLayout(this);
    layout->setContentsMargins(0, 0, 0, 0);
    layout->addWidget(heading_);
    layout->addWidget(uncovered_);
    layout->addWidget(marginsTable_, 2);
    layout->addWidget(answersTable_, 3);

    const auto choose = [this](QTableView* other, const QString& name, const dosimetry::Trail& trail) {
        chosen_ = name;
        other->clearSelection();
        other->setCurrentIndex({});
        emit trailChosen(trail);
    };
    connect(marginsTable_->selectionModel(), &QItemSelectionModel::currentRowChanged, this,
            [this, choose](const QModelIndex& row) {
                if (row.isValid())
                    choose(answersTable_, nameOf(margins_->criterionOf(row.row())),
                           margins_->trailOf(row.row()));
            });
    connect(answersTable_->selectionModel(), &QItemSelectionModel::currentRowChanged, this,
            [this, choose](const QModelIndex& row) {
                if (row.isValid())
                    choose(marginsTable_, answers_->labelOf(row.row()), answers_->trailOf(row.row()));
            });
    // The models were connected to the session first, so they hold the new rows by now.
    connect(&session, &Session::setupChanged, this, &MarginsView::showState);
    connect(&session, &Session::currentPositionChanged, this, &MarginsView::showState);
    connect(&session, &Session::validityChanged, this, [this] {
        const bool current = !session_.hasInvalidField();
        marginsTable_->setEnabled(current);
        answersTable_->setEnabled(current);
    });
    showState();
}

void MarginsView::showState() {
    const dosimetry::Assessment& assessment = session_.assessment();
    const auto& position = session_.setup().positions[static_cast<std::size_t>(session_.currentPosition())];
    heading_->setText(tr("Margins at “%1”").arg(QString::fromStdString(position.id)));
    QStringList reasons;
    for (const auto& u : assessment.uncovered)
        reasons += tr("Not covered: %1.").arg(QString::fromStdString(u.reason));
    uncovered_->setText(reasons.join('\n'));
    uncovered_->setVisible(!reasons.isEmpty());
    marginsTable_->setVisible(reasons.isEmpty());
    announceTrail();
}

/// The chosen number keeps its trail through an edit; where it no longer exists the governing criterion takes
/// its place.
void MarginsView::announceTrail() {
    const QString wanted = chosen_;
    marginsTable_->setCurrentIndex({});
    answersTable_->setCurrentIndex({});
    for (int row = 0; row < margins_->rowCount(); ++row)
        if (nameOf(margins_->criterionOf(row)) == wanted) return marginsTable_->selectRow(row);
    for (int row = 0; row < answers_->rowCount(); ++row)
        if (answers_->labelOf(row) == wanted) return answersTable_->selectRow(row);
    if (margins_->rowCount() > 0)
        marginsTable_->selectRow(0);
    else
        answersTable_->selectRow(0);
    if (!wanted.isEmpty()) chosen_ = wanted;  // it may come back with the next edit
}
