#pragma once

#include <QDateTime>
#include <QObject>
#include <QStringList>
#include <QTimer>
#include <memory>
#include <optional>

#include "assessment/setup.h"

class QLockFile;
class Session;

/// Keeps a copy of unsaved work in a folder of the program's own, so that a crash or a power cut loses at
/// most the last second. The copy goes when the work is saved, replaced or given up.
class Recovery : public QObject {
    Q_OBJECT

  public:
    /// `folder` is made if it does not exist.
    Recovery(Session& session, const QString& folder, QObject* parent = nullptr);
    ~Recovery() override;

    struct Leftover {
        dosimetry::Setup setup;
        QString path;  ///< the file it belongs to, empty if it had none
        QString copy;
        QDateTime time;
    };
    /// Work that a program left behind which is no longer running, the newest first. It stays until it is
    /// discarded.
    std::optional<Leftover> findLeftover();
    /// Removes the copy of work that was taken up again or given up.
    void discard(const Leftover& leftover);
    /// Copies that could not be read were renamed by `findLeftover` and stay; their names.
    const QStringList& unreadable() const { return unreadable_; }

    /// Writes or removes the copy now instead of within a second.
    void update();

    static QString usualFolder();

  private:
    QString copyPath() const { return base_ + ".toml"; }
    Session& session_;
    QString folder_;
    QString base_;
    QStringList unreadable_;
    std::unique_ptr<QLockFile> lock_;
    QTimer timer_;
};
