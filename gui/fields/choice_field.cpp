#include "fields/choice_field.h"

#include <QVBoxLayout>

#include "fields/calm_combo_box.h"
#include "fields/reason_label.h"
#include "quantities/input_error.h"
#include "session/session.h"

ChoiceField::ChoiceField(Session& session, const QStringList& choices, Binding binding, QWidget* parent)
    : QWidget(parent),
      session_(session),
      binding_(std::move(binding)),
      box_(new CalmComboBox),
      reason_(new ReasonLabel) {
    auto* layout = new QVBoxLayout(this);
    layout->setContentsMargins(0, 0, 0, 0);
    layout->setSpacing(2);
    layout->addWidget(box_);
    layout->addWidget(reason_);
    setFocusProxy(box_);
    box_->addItems(choices);
    box_->setSizeAdjustPolicy(QComboBox::AdjustToMinimumContentsLengthWithIcon);
    box_->setMinimumContentsLength(10);
    box_->setObjectName(binding_.key);
    box_->setAccessibleName(binding_.what);
    box_->setToolTip(binding_.hint);
    connect(&session, &Session::setupChanged, this, &ChoiceField::showChoice);
    connect(&session, &Session::currentPositionChanged, this, &ChoiceField::showChoice);
    connect(box_, &QComboBox::activated, this, &ChoiceField::choose);
    showChoice();
}

void ChoiceField::showChoice() {
    reason_->showReason({});
    box_->setCurrentIndex(binding_.read(session_.setup()));
}

void ChoiceField::choose(int index) {
    try {
        dosimetry::Setup next = session_.setup();
        binding_.write(next, index);
        session_.edit(next, tr("change of %1").arg(binding_.what));
        reason_->showReason({});
    } catch (const dosimetry::InputError& error) {
        showChoice();
        reason_->showReason(QString::fromStdString(error.sentence()));
    }
}
