#include "fields/setup_field.h"

#include <QApplication>
#include <QKeyEvent>
#include <QLineEdit>
#include <QVBoxLayout>

#include "fields/decimal_input.h"
#include "fields/reason_label.h"
#include "quantities/input_error.h"
#include "session/session.h"
#include "window/colours.h"

using dosimetry::InputError;

SetupField::SetupField(Session& session, FieldBinding binding, QWidget* parent)
    : QWidget(parent),
      session_(session),
      binding_(std::move(binding)),
      edit_(new QLineEdit),
      reason_(new ReasonLabel) {
    auto* layout = new QVBoxLayout(this);
    layout->setContentsMargins(0, 0, 0, 0);
    layout->setSpacing(2);
    layout->addWidget(edit_);
    layout->addWidget(reason_);
    setFocusProxy(edit_);
    edit_->setObjectName(binding_.key);
    edit_->setAccessibleName(binding_.what);
    edit_->setToolTip(binding_.hint);
    edit_->installEventFilter(this);
    connect(edit_, &QLineEdit::textEdited, this, &SetupField::apply);
    connect(edit_, &QLineEdit::editingFinished, this, [this] {
        visiting_ = false;
        ++visits_;
    });
    connect(&session_, &Session::setupChanged, this, &SetupField::followSetup);
    connect(&session_, &Session::validityChanged, this, &SetupField::showValidity);
    reload();
}

/// Undo and redo are the window's, also while the cursor is in a field.
bool SetupField::eventFilter(QObject* watched, QEvent* event) {
    if (event->type() == QEvent::ShortcutOverride) {
        const auto* key = static_cast<QKeyEvent*>(event);
        if (key->matches(QKeySequence::Undo) || key->matches(QKeySequence::Redo)) {
            event->ignore();
            return true;
        }
    }
    return QWidget::eventFilter(watched, event);
}

std::string SetupField::typed() const {
    const bool quantity = binding_.content == FieldBinding::Content::quantity;
    return quantity ? fileText(edit_->text()) : edit_->text().trimmed().toStdString();
}

QString SetupField::mergeKey() const {
    return binding_.key + QString::number(visits_);
}

void SetupField::reload() {
    followed_ = binding_.read(session_.setup());
    visiting_ = false;
    const bool quantity = binding_.content == FieldBinding::Content::quantity;
    edit_->setText(quantity ? fieldText(followed_) : QString::fromStdString(followed_));
    edit_->setCursorPosition(0);
    session_.clearInvalidField(binding_.key);
}

/// The setup changed elsewhere (undo, another field, a drag, another file).
void SetupField::followSetup() {
    const std::string value = binding_.read(session_.setup());
    if (applying_) {
        followed_ = value;
        return;
    }
    const bool invalid = !session_.invalidReason(binding_.key).isEmpty();
    if (value == followed_ && invalid) return;  // nothing new here: what is being typed stays
    try {
        if (!invalid && typed() == value) {  // "1,5 mW" may stand for "1.5 mW"
            followed_ = value;
            return;
        }
    } catch (const InputError&) {
        // shown again below
    }
    reload();
}

void SetupField::apply() {
    if (!visiting_) {
        visiting_ = true;
        atStart_ = binding_.read(session_.setup());
    }
    applying_ = true;
    const auto write = [this](const std::string& text) {
        dosimetry::Setup next = session_.setup();
        binding_.write(next, text);
        session_.edit(next, tr("change of %1").arg(binding_.what), mergeKey());
    };
    try {
        write(typed());
        session_.clearInvalidField(binding_.key);
    } catch (const InputError& error) {
        write(atStart_);
        session_.setInvalidField(binding_.key, QString::fromStdString(error.sentence()));
    }
    applying_ = false;
}

void SetupField::showValidity() {
    const QString reason = session_.invalidReason(binding_.key);
    if (reason == reason_->reason()) return;
    reason_->showReason(reason);
    edit_->setAccessibleDescription(reason);
    QPalette palette = QApplication::palette(edit_);
    if (!reason.isEmpty()) palette.setColor(QPalette::Base, colours::invalidField(palette));
    edit_->setPalette(palette);
}
