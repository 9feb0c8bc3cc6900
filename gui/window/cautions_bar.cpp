#include "window/cautions_bar.h"

#include <QHBoxLayout>
#include <QLabel>

#include "session/session.h"
#include "window/colours.h"

CautionsBar::CautionsBar(Session& session, QWidget* parent)
    : QFrame(parent), session_(session), text_(new QLabel) {
    setFrameShape(QFrame::StyledPanel);
    auto* stripe = new QFrame;
    stripe->setFixedWidth(6);
    stripe->setAutoFillBackground(true);
    QPalette palette = stripe->palette();
    palette.setColor(QPalette::Window, colours::warning());
    stripe->setPalette(palette);
    text_->setWordWrap(true);
    text_->setObjectName("cautions");
    text_->setAccessibleName(tr("Cautions"));
    text_->setTextInteractionFlags(Qt::TextSelectableByMouse | Qt::TextSelectableByKeyboard);
    QFont font = text_->font();
    font.setPointSizeF(font.pointSizeF() * 0.88);
    text_->setFont(font);
    auto* layout = new QHBoxLayout(this);
    layout->setContentsMargins(0, 0, 8, 0);
    layout->addWidget(stripe);
    layout->addWidget(text_, 1);
    connect(&session, &Session::setupChanged, this, &CautionsBar::showCautions);
    showCautions();
}

void CautionsBar::showCautions() {
    QString html = "<b>" + tr("Cautions") + "</b> ";
    for (const std::string& caution : session_.assessment().cautions)
        html += "&nbsp;• " + QString::fromStdString(caution).toHtmlEscaped() + " ";
    text_->setText(html);
}
