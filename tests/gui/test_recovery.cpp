#include <gtest/gtest.h>

#include <QDir>
#include <QTemporaryDir>

#include "session/recovery.h"
#include "session/session.h"
#include "support.h"

using namespace dosimetry;

namespace {

void changePower(Session& session) {
    dosimetry::Setup next = session.setup();
    next.sources.front().power = Stated<RadiantPower>("3 W");
    session.edit(next, "power");
}

QStringList copies(const QTemporaryDir& folder) {
    return QDir(folder.path()).entryList({"*.toml"});
}

/// What a killed program leaves behind: the copy, and the lock of a process that is gone.
void leaveBehind(const QTemporaryDir& folder, const QByteArray& bytes) {
    writeBytes(folder.filePath("gone.toml"), bytes);
    writeBytes(folder.filePath("gone.lock"), "2147483646\nphoton-margin\n\n");
}

}  // namespace

TEST(Recovery, ACopyStandsOnlyWhileThereIsUnsavedWork) {
    const QTemporaryDir folder;
    Session session;
    Recovery recovery(session, folder.path());
    recovery.update();
    EXPECT_TRUE(copies(folder).isEmpty());
    changePower(session);
    recovery.update();
    EXPECT_EQ(copies(folder).size(), 1);
    session.save(folder.filePath("saved"));
    recovery.update();
    EXPECT_TRUE(copies(folder).isEmpty());
}

TEST(Recovery, TheCopyComesByItself) {
    const QTemporaryDir folder;
    Session session;
    const Recovery recovery(session, folder.path());
    changePower(session);
    EXPECT_TRUE(QTest::qWaitFor([&] { return copies(folder).size() == 1; }, 5000));
}

TEST(Recovery, WorkOfAKilledProgramIsFoundWithItsFileName) {
    const QTemporaryDir folder;
    Session session;
    changePower(session);
    leaveBehind(folder, "# unsaved changes of: /home/somebody/ring laser.toml\n" + session.fileBytes());
    Session next;
    Recovery recovery(next, folder.path());
    const auto leftover = recovery.findLeftover();
    ASSERT_TRUE(leftover.has_value());
    EXPECT_EQ(leftover->setup, session.setup());
    EXPECT_EQ(leftover->path, "/home/somebody/ring laser.toml");
    EXPECT_TRUE(recovery.findLeftover().has_value()) << "it stays until it is discarded";
    next.recover(leftover->setup, leftover->path);
    EXPECT_TRUE(next.isModified());
    recovery.update();
    recovery.discard(*leftover);
    EXPECT_EQ(copies(folder).size(), 1) << "the recovered work is guarded again";
    EXPECT_FALSE(recovery.findLeftover().has_value());
}

TEST(Recovery, WorkOfARunningProgramIsLeftAlone) {
    const QTemporaryDir folder;
    Session session;
    Recovery running(session, folder.path());
    changePower(session);
    running.update();
    Session other;
    Recovery recovery(other, folder.path());
    EXPECT_FALSE(recovery.findLeftover().has_value());
    EXPECT_EQ(copies(folder).size(), 1);
}

TEST(Recovery, AnUnreadableCopyIsKeptAside) {
    const QTemporaryDir folder;
    leaveBehind(folder, "format = 1\nhalf a li");
    Session session;
    Recovery recovery(session, folder.path());
    EXPECT_FALSE(recovery.findLeftover().has_value());
    EXPECT_EQ(bytesOf(folder.filePath("gone.toml.unreadable")), "format = 1\nhalf a li");
    EXPECT_EQ(recovery.unreadable(), QStringList(folder.filePath("gone.toml.unreadable")));
}
