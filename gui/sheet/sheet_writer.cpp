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

/// The short line that keeps pages of different sheets apart.
QString footer(const Setup& setup, const QString& sha256, int page, int pages) {
    return QObject::tr("%1 · %2 · assessment file SHA-256 %3… · page %4 of %5")
        .arg(QString::fromStdString(setup.title.empty() ? std::string("Laser assessment") : setup.title),
             QString::fromStdString(program_name()), sha256.left(16))
        .arg(page)
        .arg(pages);
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
    const double footerHeight = metrics.height() * 2.4 + 4 * dots;
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
        painter.drawText(
            QRectF(0, top + 2 * dots, page.width(), metrics.height()), Qt::AlignLeft,
            metrics.elidedText(footer(setup, sha256, i + 1, pages), Qt::ElideMiddle, page.width()));
        painter.drawText(
            QRectF(0, top + 2 * dots + metrics.height(), page.width(), metrics.height()), Qt::AlignLeft,
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
