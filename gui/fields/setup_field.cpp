#include "fields/setup_field.h"

#include <QApplication>
#include <QLabel>
#include <QLineEdit>
#include <QVBoxLayout>

#include "fields/decimal_input.h"
#include "quantities/input_error.h"
#include "session/session.h"
#include "window/colours.h"

SetupField::SetupField(Session& session, FieldBinding binding, QWidget* parent)
    : QWidget(parent),
      session_(session),
      binding_(std::move(binding)),
      edit_(new QLineEdit),
      reason_(new QLabel) {
    auto* layout = new QVBoxLayout(this);
    layout->setContentsMargins(0, 0, 0, 0);
    layout->setSpacing(2);
    layout->addWidget(edit_);
    layout->addWidget(reason_);
    setFocusProxy(edit_);
    edit_->setObjectName(binding_.key);
    edit_->setAccessibleName(binding_.what);
    reason_->setWordWrap(true);
    reason_->setVisible(false);
    reason_->setTextFormat(Qt::PlainText);
    connect(edit_, &QLineEdit::textEdited, this, &SetupField::apply);
    connect(edit_, &QLineEdit::editingFinished, this, [this] { ++editing_; });
    connect(&session_, &Session::setupChanged, this, [this] {
        // While typing, the text stays as typed even where the setup holds it normalised ("1,5 mW" as "1.5
        // mW").
        if (!edit_->hasFocus() || session_.invalidReason(binding_.key).isEmpty()) {
            std::string typed;
            try {
                typed = fileText(edit_->text());
            } catch (const dosimetry::InputError&) {
                typed.clear();
            }
            if (typed != binding_.read(session_.setup())) reload();
        }
    });
    connect(&session_, &Session::validityChanged, this,
            [this] { showReason(session_.invalidReason(binding_.key)); });
    reload();
}

void SetupField::reload() {
    edit_->setText(QString::fromStdString(binding_.read(session_.setup())));
    edit_->setCursorPosition(0);
    session_.clearInvalidField(binding_.key);
}

void SetupField::apply() {
    try {
        dosimetry::Setup next = session_.setup();
        binding_.write(next, fileText(edit_->text()));
        session_.edit(next, tr("change of %1").arg(binding_.what), binding_.key + QString::number(editing_));
        session_.clearInvalidField(binding_.key);
    } catch (const dosimetry::InputError& error) {
        session_.setInvalidField(binding_.key, QString::fromStdString(error.sentence()));
    }
}

void SetupField::showReason(const QString& reason) {
    if (reason == reason_->text()) return;
    reason_->setText(reason);
    reason_->setVisible(!reason.isEmpty());
    edit_->setAccessibleDescription(reason);
    QPalette palette = QApplication::palette(edit_);
    if (!reason.isEmpty()) {
        palette.setColor(QPalette::Base, colours::invalidField(palette));
        QPalette text = reason_->palette();
        text.setColor(QPalette::WindowText, colours::invalidText(palette));
        reason_->setPalette(text);
    }
    edit_->setPalette(palette);
}
