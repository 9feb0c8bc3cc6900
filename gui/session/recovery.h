#pragma once

#include <QObject>
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
    };
    /// Work that a program left behind which is no longer running; taken out of the folder. A copy that
    /// cannot be read is renamed and stays.
    std::optional<Leftover> takeLeftover();

    /// Writes or removes the copy now instead of within a second.
    void update();

    static QString usualFolder();

  private:
    QString copyPath() const { return base_ + ".toml"; }
    Session& session_;
    QString folder_;
    QString base_;
    std::unique_ptr<QLockFile> lock_;
    QTimer timer_;
};
