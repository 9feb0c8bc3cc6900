#pragma once

#include <QMap>
#include <QObject>
#include <QString>
#include <QUndoStack>
#include <memory>

#include "assessment/assessment.h"

/// The open assessment: its setup, the answers to it, its undo history and its file. Widgets show it and call
/// `edit`; nothing else changes it. The setup held is always a checked one, so there are always answers (or
/// "not covered").
class Session : public QObject {
    Q_OBJECT

  public:
    explicit Session(QObject* parent = nullptr);

    const dosimetry::Setup& setup() const { return setup_; }
    const dosimetry::Assessment& assessment() const { return *assessment_; }
    /// Index of the position that margins, chart and route are shown for.
    int currentPosition() const { return currentPosition_; }
    void setCurrentPosition(int index);

    /// Makes `next` the setup, as one undoable step. Throws InputError, and changes nothing, if it cannot be
    /// assessed. Consecutive edits with the same non-empty `mergeKey` become one step (typing in one field,
    /// one drag).
    void edit(const dosimetry::Setup& next, const QString& what, const QString& mergeKey = {});
    QUndoStack* undoStack() { return &undoStack_; }

    /// A field whose text is not valid (yet). While there is one the answers belong to the last valid values.
    void setInvalidField(const QString& key, const QString& reason);
    void clearInvalidField(const QString& key);
    bool hasInvalidField() const { return !invalidFields_.isEmpty(); }
    /// While a field of the current position is not valid, another position cannot be chosen.
    bool hasInvalidPositionField() const;
    QString firstInvalidField() const {
        return invalidFields_.isEmpty() ? QString() : invalidFields_.firstKey();
    }
    QString invalidReason(const QString& key) const { return invalidFields_.value(key); }

    /// Replaces everything by the built-in example, unsaved and without a name.
    void startNew();
    /// Opens a file. Throws InputError and keeps the present setup if that fails.
    void open(const QString& path);
    /// Shows a setup that was read from `path`, with a new undo history.
    void adopt(const dosimetry::Setup& setup, const QString& path);
    /// Takes over recovered work: unsaved changes that belong to `path`.
    void recover(const dosimetry::Setup& setup, const QString& path);
    /// Writes the file in one piece (QSaveFile). Throws InputError if that fails; the old file is then
    /// untouched.
    void save(const QString& path);
    QString path() const { return path_; }
    bool isModified() const { return !undoStack_.isClean() || hasInvalidField(); }

    /// The assessment file as it would be saved now.
    QByteArray fileBytes() const;

  signals:
    void setupChanged();
    void currentPositionChanged();
    void validityChanged();
    void fileChanged();

  private:
    friend class SetupCommand;
    void show(const dosimetry::Setup& setup, int position);

    dosimetry::Setup setup_;
    std::unique_ptr<const dosimetry::Assessment> assessment_;
    int currentPosition_ = 0;
    QUndoStack undoStack_;
    QMap<QString, QString> invalidFields_;
    QString path_;
};
