#include <gtest/gtest.h>

#include <QDir>
#include <QSignalSpy>
#include <QTemporaryDir>

#include "quantities/input_error.h"
#include "session/session.h"
#include "support.h"

using namespace dosimetry;

namespace {

dosimetry::Setup withPower(const Session& session, const char* power) {
    dosimetry::Setup next = session.setup();
    next.sources.front().power = Stated<RadiantPower>(power);
    return next;
}

}  // namespace

TEST(Session, StartsWithAnAssessedExampleThatIsNotModified) {
    Session session;
    EXPECT_TRUE(session.assessment().covered());
    EXPECT_FALSE(session.isModified());
    EXPECT_TRUE(session.path().isEmpty());
}

TEST(Session, AnEditAnswersAtOnceAndUndoRestoresIt) {
    Session session;
    const double before = session.assessment().positions[0].governing.ratio;
    const QSignalSpy changed(&session, &Session::setupChanged);
    session.edit(withPower(session, "4 W"), "power");
    EXPECT_EQ(changed.count(), 1);
    EXPECT_DOUBLE_EQ(session.assessment().positions[0].governing.ratio, 2 * before);
    EXPECT_TRUE(session.isModified());
    session.undoStack()->undo();
    EXPECT_DOUBLE_EQ(session.assessment().positions[0].governing.ratio, before);
    EXPECT_FALSE(session.isModified());
    session.undoStack()->redo();
    EXPECT_EQ(session.setup().sources.front().power.text, "4 W");
}

TEST(Session, EditsWithOneKeyMergeIntoOneStep) {
    Session session;
    session.edit(withPower(session, "3 W"), "power", "power1");
    session.edit(withPower(session, "30 W"), "power", "power1");
    session.edit(withPower(session, "31 W"), "power", "power2");
    EXPECT_EQ(session.undoStack()->count(), 2);
    session.undoStack()->undo();
    EXPECT_EQ(session.setup().sources.front().power.text, "30 W");
}

TEST(Session, MergedEditsThatEndWhereTheyBeganLeaveNoStep) {
    Session session;
    const dosimetry::Setup start = session.setup();
    session.edit(withPower(session, "3 W"), "power", "power1");
    session.edit(start, "power", "power1");
    EXPECT_EQ(session.undoStack()->count(), 0);
    EXPECT_FALSE(session.isModified());
}

TEST(Session, ARefusedEditChangesNothing) {
    Session session;
    const dosimetry::Setup before = session.setup();
    EXPECT_THROW(session.edit(withPower(session, "-1 W"), "power"), InputError);
    EXPECT_EQ(session.setup(), before);
    EXPECT_EQ(session.undoStack()->count(), 0);
}

TEST(Session, SavesAndOpensTheSameSetup) {
    const QTemporaryDir folder;
    const QString path = folder.filePath("a.toml");
    Session session;
    session.edit(withPower(session, "4.5 W"), "power");
    session.save(path);
    EXPECT_FALSE(session.isModified());
    Session other;
    other.open(path);
    EXPECT_EQ(other.setup(), session.setup());
    EXPECT_EQ(other.path(), path);
}

TEST(Session, AFailedOpenKeepsThePresentWork) {
    const QTemporaryDir folder;
    const QString path = folder.filePath("bad.toml");
    writeBytes(path, "format = 1\npower = 3\n");
    Session session;
    session.edit(withPower(session, "4.5 W"), "power");
    const dosimetry::Setup before = session.setup();
    EXPECT_THROW(session.open(path), InputError);
    EXPECT_THROW(session.open(folder.filePath("missing.toml")), InputError);
    EXPECT_EQ(session.setup(), before);
    EXPECT_TRUE(session.isModified());
    EXPECT_TRUE(session.path().isEmpty());
}

TEST(Session, AFailedSaveLeavesTheOldFileAndTheChanges) {
    Session session;
    session.edit(withPower(session, "4.5 W"), "power");
    EXPECT_THROW(session.save("/nowhere/at/all/a.toml"), InputError);
    EXPECT_TRUE(session.isModified());
}

TEST(Session, NotCoveredIsAnAnswer) {
    Session session;
    dosimetry::Setup next = session.setup();
    next.sources.front().wavelength = Stated<Length>("150 nm");
    session.edit(next, "wavelength");
    EXPECT_FALSE(session.assessment().covered());
    EXPECT_TRUE(session.assessment().positions.empty());
}
