#include "session/session.h"

#include <QDate>
#include <QFile>
#include <algorithm>

#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "session/files.h"

using namespace dosimetry;

/// Holds the two setups by value; a setup is small, and undo must not depend on widgets.
class SetupCommand : public QUndoCommand {
  public:
    SetupCommand(Session& session, Setup before, Setup after, int position, const QString& what,
                 const QString& mergeKey)
        : QUndoCommand(what),
          session_(session),
          before_(std::move(before)),
          after_(std::move(after)),
          position_(position),
          mergeKey_(mergeKey) {}

    void undo() override { session_.show(before_, position_); }
    void redo() override { session_.show(after_, position_); }
    int id() const override { return mergeKey_.isEmpty() ? -1 : 1; }

    bool mergeWith(const QUndoCommand* other) override {
        const auto* next = static_cast<const SetupCommand*>(other);
        if (next->mergeKey_ != mergeKey_) return false;
        after_ = next->after_;
        setObsolete(after_ == before_);
        return true;
    }

  private:
    Session& session_;
    Setup before_;
    Setup after_;
    int position_;  ///< that was shown when the edit was made, and is shown again with its undo
    QString mergeKey_;
};

Session::Session(QObject* parent) : QObject(parent) {
    startNew();
    connect(&undoStack_, &QUndoStack::cleanChanged, this, &Session::fileChanged);
}

void Session::setCurrentPosition(int index) {
    if (index == currentPosition_ || index < 0 || index >= static_cast<int>(setup_.positions.size())) return;
    if (hasInvalidPositionField()) return;
    currentPosition_ = index;
    emit currentPositionChanged();
}

void Session::edit(const Setup& next, const QString& what, const QString& mergeKey) {
    if (next == setup_) return;
    check(next, LimitLibrary::embedded());
    undoStack_.push(new SetupCommand(*this, setup_, next, currentPosition_, what, mergeKey));
}

void Session::show(const Setup& setup, int position) {
    setup_ = setup;
    // The models point into the old answers until they have heard of the new ones.
    const std::unique_ptr<const Assessment> old = std::move(assessment_);
    assessment_ =
        std::make_unique<const Assessment>(assess(setup_, LimitLibrary::embedded(), Trails::record));
    const int before = currentPosition_;
    currentPosition_ = std::clamp(position, 0, static_cast<int>(setup_.positions.size()) - 1);
    emit setupChanged();
    if (currentPosition_ != before) emit currentPositionChanged();
}

bool Session::hasInvalidPositionField() const {
    for (auto it = invalidFields_.begin(); it != invalidFields_.end(); ++it)
        if (it.key().startsWith("position.")) return true;
    return false;
}

void Session::setInvalidField(const QString& key, const QString& reason) {
    invalidFields_[key] = reason;
    emit validityChanged();
}

void Session::clearInvalidField(const QString& key) {
    if (invalidFields_.remove(key) > 0) emit validityChanged();
}

void Session::adopt(const Setup& setup, const QString& path) {
    path_ = path;
    invalidFields_.clear();
    currentPosition_ = 0;
    undoStack_.clear();
    undoStack_.setClean();
    show(setup, 0);
    emit validityChanged();
    emit fileChanged();
}

void Session::startNew() {
    QFile example(QStringLiteral(":/examples/spray_chamber.toml"));
    (void)example.open(QIODevice::ReadOnly);
    Setup setup = setupFrom(example.readAll(), "example");
    // an example must not be signed by mistake
    setup.title += tr(" (example)").toStdString();
    setup.place.clear();
    setup.assessor.clear();
    setup.date = QDate::currentDate().toString(Qt::ISODate).toStdString();
    adopt(setup, {});
}

void Session::open(const QString& path) {
    adopt(setupFrom(readSetupFile(path), path), path);
}

void Session::recover(const Setup& setup, const QString& path) {
    adopt(setup, path);
    undoStack_.resetClean();
}

void Session::save(const QString& path) {
    writeFileInOnePiece(path, fileBytes());
    path_ = path;
    undoStack_.setClean();
    emit fileChanged();
}

QByteArray Session::fileBytes() const {
    return QByteArray::fromStdString(write_setup(setup_));
}
