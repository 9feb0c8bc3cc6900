#include "session/files.h"

#include <QFile>
#include <QSaveFile>

#include "documents/files.h"
#include "quantities/input_error.h"

QByteArray readSetupFile(const QString& path) {
    return QByteArray::fromStdString(dosimetry::read_file(QFile::encodeName(path).toStdString()));
}

void writeFileInOnePiece(const QString& path, const QByteArray& bytes) {
    QSaveFile file(path);
    if (!file.open(QIODevice::WriteOnly) || file.write(bytes) != bytes.size() || !file.commit())
        throw dosimetry::InputError("the file cannot be written: " + file.errorString().toStdString(),
                                    "a folder that can be written to", "", {path.toStdString(), 0, 0});
}
