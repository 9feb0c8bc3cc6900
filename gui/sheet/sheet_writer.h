#pragma once

#include <QByteArray>
#include <QPageSize>
#include <QString>

#include "assessment/assessment.h"

class QPagedPaintDevice;

/// "A4" or "Letter", in any case of letters; anything else is A4.
QPageSize paperSize(const QString& name);

/// Paints all pages of the sheet onto a printer or PDF writer whose page size is set. The assessment must be
/// covered and its trails recorded.
void paintSheet(QPagedPaintDevice& device, const dosimetry::Setup& setup,
                const dosimetry::Assessment& assessment, const QByteArray& fileBytes);

/// Writes the sheet as PDF with the assessment file attached ("assessment.toml"). Throws InputError if the
/// file cannot be written; an old file is then left as it was.
void writeSheetPdf(const QString& path, const dosimetry::Setup& setup,
                   const dosimetry::Assessment& assessment, const QByteArray& fileBytes,
                   const QPageSize& paper);
