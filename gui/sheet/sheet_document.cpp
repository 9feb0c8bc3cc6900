#include "sheet/sheet_document.h"

#include <QAbstractTextDocumentLayout>
#include <QPainter>
#include <QTextBlock>
#include <QTextCursor>
#include <QTextTable>
#include <cmath>

#include "route_view/route_painter.h"
#include "sheet/sheet_html.h"

namespace {

constexpr double bodyPoints = 9.0;

QString styleSheet() {
    return QStringLiteral(
        "h1 { font-size: 17pt; margin-bottom: 4px; }"
        "h2 { font-size: 11.5pt; margin-top: 12px; margin-bottom: 4px; }"
        "h3 { font-size: 9.5pt; margin-top: 8px; margin-bottom: 3px; }"
        "p { margin-top: 2px; margin-bottom: 4px; }"
        "p.verdict { font-size: 12pt; font-weight: bold; }"
        "ul { margin-top: 2px; margin-bottom: 4px; }"
        "li { margin-bottom: 2px; }"
        "table.facts td { border-bottom: 0.5px solid #b0b0b0; }"
        "table.grid { border-collapse: collapse; border: 0.5px solid #606060; }"
        "table.grid td, table.grid th { border: 0.5px solid #606060; }");
}

/// A wide table (margins, signatures) together with the table that follows it directly and belongs to it;
/// facts and the steps of a trail, of two and three columns, alone.
QRectF groupRect(const QTextDocument& document, QTextFrame* first) {
    QRectF rect = document.documentLayout()->frameBoundingRect(first);
    const auto* table = qobject_cast<QTextTable*>(first);
    if (!table || table->columns() <= 3) return rect;
    const QList<QTextFrame*> frames = document.rootFrame()->childFrames();
    for (qsizetype i = frames.indexOf(first) + 1; i < frames.size(); ++i) {
        const bool directly = document.findBlock(frames[i]->firstPosition() - 1).text().isEmpty() &&
                              frames[i]->firstPosition() - frames[i - 1]->lastPosition() <= 3;
        if (!directly) break;
        rect |= document.documentLayout()->frameBoundingRect(frames[i]);
    }
    return rect;
}

/// True if the group starts on one page and ends on another, although it would fit on one.
bool isTorn(const QTextDocument& document, QTextFrame* frame) {
    const QRectF rect = groupRect(document, frame);
    const double height = document.pageSize().height();
    return rect.height() < height &&
           std::floor(rect.top() / height) != std::floor((rect.bottom() - 1.0) / height);
}

int pageOf(const QTextDocument& document, const QTextBlock& block) {
    return static_cast<int>(document.documentLayout()->blockBoundingRect(block).top() /
                            document.pageSize().height());
}

void startPageAt(QTextBlock block) {
    while (block.previous().isValid() && block.previous().blockFormat().headingLevel() > 0)
        block = block.previous();
    QTextCursor cursor(block);
    QTextBlockFormat format;
    format.setPageBreakPolicy(QTextFormat::PageBreak_AlwaysBefore);
    cursor.mergeBlockFormat(format);
}

/// Moves the first thing, in reading order, that would be torn to the next page: a table with the headings
/// before it, or a heading without a line of what it heads. Each move changes what follows, so one is made at
/// a time.
bool moveFirstTorn(QTextDocument& document) {
    QTextFrame* root = document.rootFrame();
    for (auto it = root->begin(); !it.atEnd(); ++it) {
        if (auto* table = qobject_cast<QTextTable*>(it.currentFrame())) {
            if (!isTorn(document, table)) continue;
            const QTextBlock before = document.findBlock(table->firstPosition() - 1);
            if (before.isValid() && before.blockFormat().headingLevel() > 0) {
                startPageAt(before);
            } else {
                QTextTableFormat format = table->format();
                format.setPageBreakPolicy(QTextFormat::PageBreak_AlwaysBefore);
                table->setFormat(format);
            }
            return true;
        }
        const QTextBlock block = it.currentBlock();
        if (block.isValid() && block.blockFormat().headingLevel() > 0 && block.next().isValid() &&
            pageOf(document, block) != pageOf(document, block.next())) {
            startPageAt(block);
            return true;
        }
    }
    return false;
}

void keepTogether(QTextDocument& document) {
    constexpr int mostMoves = 200;  // a bound, should a move ever bring another one about without end
    for (int i = 0; i < mostMoves && moveFirstTorn(document); ++i) {
    }
}

}  // namespace

QSizeF RouteObject::intrinsicSize(QTextDocument* document, int, const QTextFormat&) {
    const double width = document->pageSize().width() - 2.0 * document->documentMargin();
    const double people = static_cast<double>(model_.people.size());
    return {width, width * std::min(0.36 + 0.03 * std::max(0.0, people - 2.0), 0.7)};
}

void RouteObject::drawObject(QPainter* painter, const QRectF& rect, QTextDocument* document, int,
                             const QTextFormat&) {
    painter->save();
    QFont font = document->defaultFont();
    font.setPointSizeF(bodyPoints * 0.9);
    painter->setFont(font);
    paintRoute(*painter, rect, model_, RouteStyle::forPaper());
    painter->restore();
}

void fillSheetDocument(QTextDocument& document, const dosimetry::Setup& setup,
                       const dosimetry::Assessment& assessment, const QString& fileSha256,
                       QPaintDevice& device, const QSizeF& page) {
    QFont font(QStringLiteral("DejaVu Sans"));
    font.setPointSizeF(bodyPoints);
    document.setDefaultFont(font);
    document.documentLayout()->setPaintDevice(&device);
    document.documentLayout()->registerHandler(
        RouteObject::type, new RouteObject(RouteModel::of(setup, assessment, std::nullopt), &document));
    document.setDocumentMargin(0);
    document.setDefaultStyleSheet(styleSheet());
    document.setHtml(sheetHtml(setup, assessment, fileSha256));

    QTextCursor cursor = document.find(QString::fromUtf16(routePlaceholder));
    QTextCharFormat drawing;
    drawing.setObjectType(RouteObject::type);
    cursor.insertText(QString(QChar::ObjectReplacementCharacter), drawing);
    document.setPageSize(page);  // after the drawing went in, so that everything is laid out once and afresh
    keepTogether(document);
}
