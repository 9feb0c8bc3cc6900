#include "sheet/sheet_writer.h"

#include <QAbstractTextDocumentLayout>
#include <QBuffer>
#include <QObject>
#include <QPainter>
#include <QPdfWriter>
#include <QTextDocument>

#include "documents/result.h"
#include "limits/sha256.h"
#include "session/files.h"
#include "sheet/sheet_document.h"

using namespace dosimetry;

namespace {

constexpr double marginMm = 16.0;
constexpr int dotsPerInch = 600;

/// Which sheet and page this is; keeps pages of different sheets apart.
QString footer(const Assessment& assessment, const QString& sha256, int page, int pages) {
    QStringList editions;
    for (const LimitSet* set : assessment.limit_sets)
        editions += QString::fromStdString(set->edition().id + " (table " +
                                           set->edition().sha256.substr(0, 8) + "…)");
    return QString::fromStdString(program_name()) + " · " + editions.join(", ") + " · " +
           QObject::tr("assessment file") + " " + sha256.left(16) + "… · " +
           QObject::tr("page %1 of %2").arg(page).arg(pages);
}

}  // namespace

QPageSize paperSize(const QString& name) {
    return QPageSize(name.compare("letter", Qt::CaseInsensitive) == 0 ? QPageSize::Letter : QPageSize::A4);
}

void paintSheet(QPagedPaintDevice& device, const Setup& setup, const Assessment& assessment,
                const QByteArray& fileBytes) {
    device.setPageMargins(QMarginsF(marginMm, marginMm, marginMm, marginMm), QPageLayout::Millimeter);
    QPainter painter(&device);
    const double dots = device.logicalDpiY() / 72.0;
    QFont small(QStringLiteral("DejaVu Sans"));
    small.setPointSizeF(7.0);
    const QFontMetricsF metrics(small, &device);
    const QRectF paintArea(0, 0, device.width(), device.height());
    const double footerHeight = metrics.height() * 3.4 + 4 * dots;
    const QSizeF page(paintArea.width(), paintArea.height() - footerHeight);

    const QString sha256 =
        QString::fromStdString(sha256_hex({fileBytes.data(), static_cast<std::size_t>(fileBytes.size())}));
    QTextDocument document;
    fillSheetDocument(document, setup, assessment, sha256, device, page);
    const int pages = document.pageCount();
    for (int i = 0; i < pages; ++i) {
        if (i > 0) device.newPage();
        painter.save();
        painter.translate(0, -i * page.height());
        QAbstractTextDocumentLayout::PaintContext context;
        context.clip = QRectF(0, i * page.height(), page.width(), page.height());
        context.palette.setColor(QPalette::Text, Qt::black);
        painter.setClipRect(context.clip);
        document.documentLayout()->draw(&painter, context);
        painter.restore();

        painter.setFont(small);
        painter.setPen(QPen(Qt::black, 0.5 * dots));
        const double top = page.height() + 3 * dots;
        painter.drawLine(QPointF(0, top), QPointF(page.width(), top));
        const auto line = [&](int row, const QString& text) {
            painter.drawText(
                QRectF(0, top + 2 * dots + row * metrics.height(), page.width(), metrics.height()),
                Qt::AlignLeft, metrics.elidedText(text, Qt::ElideMiddle, page.width()));
        };
        line(0, QString::fromStdString((setup.title.empty() ? std::string() : setup.title + " · ") +
                                       setup.date));
        line(1, footer(assessment, sha256, i + 1, pages));
        line(2,
             QObject::tr(
                 "Supports a competent person, does not replace one. The appointed safety officer decides."));
    }
}

void writeSheetPdf(const QString& path, const Setup& setup, const Assessment& assessment,
                   const QByteArray& fileBytes, const QPageSize& paper) {
    QByteArray pdf;
    {
        QBuffer buffer(&pdf);
        buffer.open(QIODevice::WriteOnly);
        QPdfWriter writer(&buffer);
        writer.setResolution(dotsPerInch);
        writer.setPageSize(paper);
        writer.setTitle(QString::fromStdString(setup.title));
        writer.setCreator(QString::fromStdString(program_name()));
        writer.addFileAttachment(QStringLiteral("assessment.toml"), fileBytes,
                                 QStringLiteral("application/toml"));
        paintSheet(writer, setup, assessment, fileBytes);
    }
    writeFileInOnePiece(path, pdf);
}
