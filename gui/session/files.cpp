#include "session/files.h"

#include <QFile>
#include <QFileInfo>
#include <QSaveFile>

#include "documents/files.h"
#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "quantities/input_error.h"

QByteArray readSetupFile(const QString& path) {
    return QByteArray::fromStdString(dosimetry::read_file(QFile::encodeName(path).toStdString()));
}

dosimetry::Setup setupFrom(const QByteArray& bytes, const QString& name) {
    return dosimetry::read_setup({bytes.data(), static_cast<std::size_t>(bytes.size())}, name.toStdString(),
                                 dosimetry::LimitLibrary::embedded())
        .setup;
}

void writeFileInOnePiece(const QString& path, const QByteArray& bytes) {
    const dosimetry::TextPosition where{path.toStdString(), 0, 0};
    const QFileInfo target(path);
    if (target.exists() && !target.isFile())
        throw dosimetry::InputError("this is no ordinary file and is not replaced", "the name of a file", "",
                                    where);
    QSaveFile file(path);
    if (!file.open(QIODevice::WriteOnly))
        throw dosimetry::InputError("the file cannot be written: " + file.errorString().toStdString(),
                                    "a folder that can be written to", "", where);
    if (file.write(bytes) != bytes.size() || !file.commit())
        throw dosimetry::InputError(
            "the file cannot be written completely, the disk may be full; an old file is unchanged",
            "enough free space", "", where);
}
