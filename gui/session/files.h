#pragma once

#include <QByteArray>
#include <QString>

/// The bytes of an assessment file. Throws InputError.
QByteArray readSetupFile(const QString& path);

/// Writes by way of a temporary file in the same folder, so that the old content stays until the new one is
/// complete. Throws InputError with the reason.
void writeFileInOnePiece(const QString& path, const QByteArray& bytes);
