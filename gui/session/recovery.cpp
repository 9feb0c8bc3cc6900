#include "session/recovery.h"

#include <QCoreApplication>
#include <QDir>
#include <QLockFile>
#include <QStandardPaths>
#include <QUuid>

#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "quantities/input_error.h"
#include "session/files.h"
#include "session/session.h"

namespace {

constexpr int delayMs = 1000;
const QByteArray pathMark = "# unsaved changes of: ";

}  // namespace

Recovery::Recovery(Session& session, const QString& folder, QObject* parent)
    : QObject(parent), session_(session), folder_(folder) {
    QDir().mkpath(folder);
    base_ = folder + "/" + QUuid::createUuid().toString(QUuid::WithoutBraces);
    lock_ = std::make_unique<QLockFile>(base_ + ".lock");
    lock_->setStaleLockTime(0);  // only the end of its process makes a lock stale
    lock_->tryLock(0);
    timer_.setSingleShot(true);
    timer_.setInterval(delayMs);
    connect(&timer_, &QTimer::timeout, this, &Recovery::update);
    connect(&session, &Session::setupChanged, this, [this] {
        if (!timer_.isActive()) timer_.start();
    });
    connect(&session, &Session::fileChanged, this, [this] {
        if (!timer_.isActive()) timer_.start();
    });
}

Recovery::~Recovery() {
    QFile::remove(copyPath());
}

void Recovery::update() {
    timer_.stop();
    if (!session_.isModified()) {
        QFile::remove(copyPath());
        return;
    }
    try {
        writeFileInOnePiece(copyPath(), pathMark + session_.path().toUtf8() + "\n" + session_.fileBytes());
    } catch (const dosimetry::InputError&) {
        // a full disk must not get in the way of the work itself
    }
}

std::optional<Recovery::Leftover> Recovery::takeLeftover() {
    for (const QFileInfo& info : QDir(folder_).entryInfoList({"*.toml"}, QDir::Files, QDir::Time)) {
        const QString path = info.filePath();
        const QString base = path.chopped(5);
        if (base == base_) continue;
        QLockFile lock(base + ".lock");
        lock.setStaleLockTime(0);
        if (!lock.tryLock(0)) continue;  // its program is still running
        try {
            const QByteArray bytes = readSetupFile(path);
            Leftover leftover;
            leftover.setup = dosimetry::read_setup({bytes.data(), static_cast<std::size_t>(bytes.size())},
                                                   path.toStdString(), dosimetry::LimitLibrary::embedded())
                                 .setup;
            if (bytes.startsWith(pathMark))
                leftover.path =
                    QString::fromUtf8(bytes.mid(pathMark.size(), bytes.indexOf('\n') - pathMark.size()));
            QFile::remove(path);
            return leftover;
        } catch (const dosimetry::InputError&) {
            QFile::rename(path, path + ".unreadable");
        }
    }
    return std::nullopt;
}

QString Recovery::usualFolder() {
    return QStandardPaths::writableLocation(QStandardPaths::AppLocalDataLocation) + "/recovery";
}
