#include "session/session.h"

#include <QFile>
#include <algorithm>

#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "session/files.h"

using namespace dosimetry;

/// Holds the two setups by value; a setup is small, and undo must not depend on widgets.
class SetupCommand : public QUndoCommand {
  public:
    SetupCommand(Session& session, Setup before, Setup after, const QString& what, const QString& mergeKey)
        : QUndoCommand(what),
          session_(session),
          before_(std::move(before)),
          after_(std::move(after)),
          mergeKey_(mergeKey) {}

    void undo() override { session_.show(before_); }
    void redo() override { session_.show(after_); }
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
    QString mergeKey_;
};

Session::Session(QObject* parent) : QObject(parent) {
    startNew();
    connect(&undoStack_, &QUndoStack::cleanChanged, this, &Session::fileChanged);
}

void Session::setCurrentPosition(int index) {
    if (index == currentPosition_ || index < 0 || index >= static_cast<int>(setup_.positions.size())) return;
    currentPosition_ = index;
    emit currentPositionChanged();
}

void Session::edit(const Setup& next, const QString& what, const QString& mergeKey) {
    if (next == setup_) return;
    check(next, LimitLibrary::embedded());
    undoStack_.push(new SetupCommand(*this, setup_, next, what, mergeKey));
}

void Session::show(const Setup& setup) {
    setup_ = setup;
    assessment_ =
        std::make_unique<const Assessment>(assess(setup_, LimitLibrary::embedded(), Trails::record));
    currentPosition_ = std::min(currentPosition_, static_cast<int>(setup_.positions.size()) - 1);
    emit setupChanged();
}

void Session::setInvalidField(const QString& key, const QString& reason) {
    invalidFields_[key] = reason;
    emit validityChanged();
}

void Session::clearInvalidField(const QString& key) {
    if (invalidFields_.remove(key) > 0) emit validityChanged();
}

void Session::replace(const Setup& setup, const QString& path) {
    path_ = path;
    invalidFields_.clear();
    currentPosition_ = 0;
    undoStack_.clear();
    undoStack_.setClean();
    show(setup);
    emit validityChanged();
    emit fileChanged();
}

void Session::startNew() {
    QFile example(QStringLiteral(":/examples/spray_chamber.toml"));
    (void)example.open(QIODevice::ReadOnly);
    const QByteArray bytes = example.readAll();
    replace(read_setup({bytes.data(), static_cast<std::size_t>(bytes.size())}, "example",
                       LimitLibrary::embedded())
                .setup,
            {});
}

void Session::open(const QString& path) {
    const QByteArray bytes = readSetupFile(path);
    replace(read_setup({bytes.data(), static_cast<std::size_t>(bytes.size())}, path.toStdString(),
                       LimitLibrary::embedded())
                .setup,
            path);
}

void Session::recover(const Setup& setup, const QString& path) {
    replace(setup, path);
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
