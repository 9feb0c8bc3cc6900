#include "fields/reason_label.h"

#include <QRegularExpression>

#include "window/colours.h"

ReasonLabel::ReasonLabel(QWidget* parent) : QLabel(parent) {
    setWordWrap(true);
    setTextFormat(Qt::PlainText);
    setSizePolicy(QSizePolicy::Ignored, QSizePolicy::MinimumExpanding);
    setVisible(false);
}

void ReasonLabel::showReason(const QString& reason) {
    if (reason == shown_) return;
    shown_ = reason;
    // A quoted value may be one long word, which would widen the whole panel: it may break anywhere.
    static const QRegularExpression longWord(QStringLiteral("(\\S{16})(?=\\S)"));
    setText(QString(reason).replace(longWord, QStringLiteral("\\1\u200B")));
    QPalette colours_ = palette();
    colours_.setColor(QPalette::WindowText, colours::invalidText(colours_));
    setPalette(colours_);
    setVisible(!reason.isEmpty());
}
