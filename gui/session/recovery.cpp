#include "session/recovery.h"

#include <QCoreApplication>
#include <QDir>
#include <QLockFile>
#include <QStandardPaths>
#include <QUuid>

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

std::optional<Recovery::Leftover> Recovery::findLeftover() {
    for (const QFileInfo& info : QDir(folder_).entryInfoList({"*.toml"}, QDir::Files, QDir::Time)) {
        const QString copy = info.filePath();
        const QString base = copy.chopped(5);
        if (base == base_) continue;
        QLockFile lock(base + ".lock");
        lock.setStaleLockTime(0);
        if (!lock.tryLock(0)) continue;  // its program is still running
        try {
            const QByteArray bytes = readSetupFile(copy);
            QString path;
            if (bytes.startsWith(pathMark))
                path = QString::fromUtf8(bytes.mid(pathMark.size(), bytes.indexOf('\n') - pathMark.size()));
            return Leftover{setupFrom(bytes, copy), path, copy, info.lastModified()};
        } catch (const dosimetry::InputError&) {
            QFile::rename(copy, copy + ".unreadable");
            unreadable_ += copy + ".unreadable";
        }
    }
    return std::nullopt;
}

void Recovery::discard(const Leftover& leftover) {
    QFile::remove(leftover.copy);
}

QString Recovery::usualFolder() {
    return QStandardPaths::writableLocation(QStandardPaths::AppLocalDataLocation) + "/recovery";
}
