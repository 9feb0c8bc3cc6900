#pragma once

#include <QByteArray>
#include <QString>

#include "assessment/setup.h"

/// The bytes of an assessment file. Throws InputError.
QByteArray readSetupFile(const QString& path);

/// Reads and checks the bytes of an assessment file; `name` is for messages. Throws InputError.
dosimetry::Setup setupFrom(const QByteArray& bytes, const QString& name);

/// Writes by way of a temporary file in the same folder, so that the old content stays until the new one is
/// complete. Throws InputError with the reason; refuses devices and folders, which renaming would replace.
void writeFileInOnePiece(const QString& path, const QByteArray& bytes);
