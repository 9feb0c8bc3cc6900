#include "window/verdict_bar.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QPainter>
#include <QPainterPath>
#include <QPushButton>

#include "documents/result.h"
#include "session/session.h"
#include "window/colours.h"

using namespace dosimetry;

namespace {

enum class Sign { above, within, open };

/// A triangle with a stroke, a tick in a disc, or a question mark: told apart by shape as well as by colour.
QPixmap drawn(Sign sign, int size, double ratio) {
    QPixmap pixmap(QSize(size, size) * ratio);
    pixmap.setDevicePixelRatio(ratio);
    pixmap.fill(Qt::transparent);
    QPainter p(&pixmap);
    p.setRenderHint(QPainter::Antialiasing);
    const double s = size;
    if (sign == Sign::above) {
        QPainterPath triangle;
        triangle.moveTo(s * 0.5, s * 0.08);
        triangle.lineTo(s * 0.95, s * 0.9);
        triangle.lineTo(s * 0.05, s * 0.9);
        triangle.closeSubpath();
        p.setPen(QPen(Qt::black, s * 0.06, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin));
        p.setBrush(colours::warning());
        p.drawPath(triangle);
        p.setPen(QPen(Qt::black, s * 0.1, Qt::SolidLine, Qt::RoundCap));
        p.drawLine(QPointF(s * 0.5, s * 0.36), QPointF(s * 0.5, s * 0.6));
        p.drawPoint(QPointF(s * 0.5, s * 0.76));
        return pixmap;
    }
    p.setPen(Qt::NoPen);
    p.setBrush(sign == Sign::within ? colours::safe() : QColor(90, 90, 90));
    p.drawEllipse(QRectF(s * 0.06, s * 0.06, s * 0.88, s * 0.88));
    p.setPen(QPen(Qt::white, s * 0.11, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin));
    if (sign == Sign::within) {
        p.drawPolyline(QPolygonF({{s * 0.28, s * 0.52}, {s * 0.44, s * 0.68}, {s * 0.74, s * 0.34}}));
    } else {
        QFont font = p.font();
        font.setPixelSize(static_cast<int>(s * 0.6));
        font.setBold(true);
        p.setFont(font);
        p.drawText(QRectF(0, 0, s, s), Qt::AlignCenter, "?");
    }
    return pixmap;
}

}  // namespace

VerdictBar::VerdictBar(Session& session, QWidget* parent)
    : QFrame(parent), session_(session), sign_(new QLabel), sentence_(new QLabel) {
    setFrameShape(QFrame::StyledPanel);
    auto* layout = new QHBoxLayout(this);
    layout->setContentsMargins(10, 4, 10, 4);
    layout->addWidget(sign_);
    layout->addWidget(sentence_, 1);
    auto* sheet = new QPushButton(tr("Sheet as PDF …"));
    sheet->setObjectName("verdict.sheet");
    sheet->setToolTip(tr("Writes the sheet to sign"));
    connect(sheet, &QPushButton::clicked, this, &VerdictBar::sheetWanted);
    layout->addWidget(sheet);
    QFont font = sentence_->font();
    font.setPointSizeF(font.pointSizeF() * 1.25);
    font.setBold(true);
    sentence_->setFont(font);
    sentence_->setWordWrap(true);
    sentence_->setObjectName("verdict");
    sentence_->setTextFormat(Qt::PlainText);
    sentence_->setMinimumHeight(QFontMetrics(font).height() * 3 / 2);
    connect(&session, &Session::setupChanged, this, &VerdictBar::showState);
    connect(&session, &Session::currentPositionChanged, this, &VerdictBar::showState);
    connect(&session, &Session::validityChanged, this, &VerdictBar::showState);
    showState();
}

void VerdictBar::showState() {
    const Assessment& assessment = session_.assessment();
    const int size = QFontMetrics(sentence_->font()).height() * 3 / 2;
    Sign sign = Sign::open;
    QString text;
    if (!assessment.covered()) {
        text = tr("Not assessed: %1.").arg(QString::fromStdString(assessment.uncovered.front().reason));
    } else {
        const PositionAssessment& position =
            assessment.positions[static_cast<std::size_t>(session_.currentPosition())];
        sign = assessment.within_limits() ? Sign::within : Sign::above;
        text = QString::fromStdString(verdict(position));
        QStringList others;
        for (const PositionAssessment& p : assessment.positions)
            if (&p != &position && !p.within_limits()) others += QString::fromStdString("“" + p.id + "”");
        if (!others.isEmpty())
            text += " " + tr("Other positions above the limit: %1.").arg(others.join(", "));
    }
    if (session_.hasInvalidField()) {
        sign = Sign::open;
        text = tr("A field is not valid; these are still the answers for its last valid value. ") + text;
    }
    sign_->setPixmap(drawn(sign, size, devicePixelRatioF()));
    sign_->setAccessibleName(sign == Sign::above    ? tr("above the limit")
                             : sign == Sign::within ? tr("within the limits")
                                                    : tr("open"));
    sentence_->setText(text);
    sentence_->setEnabled(!session_.hasInvalidField());
}
