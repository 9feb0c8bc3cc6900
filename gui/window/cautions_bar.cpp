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
    // what this set-up calls for stands first: it is news, the general cautions are known after a while
    const auto& cautions = session_.assessment().cautions;
    constexpr std::size_t general = 4;
    const auto add = [&](std::size_t i) {
        html += "&nbsp;• " + QString::fromStdString(cautions[i]).toHtmlEscaped() + " ";
    };
    for (std::size_t i = general; i < cautions.size(); ++i) add(i);
    for (std::size_t i = 0; i < general; ++i) add(i);
    text_->setText(html);
}
