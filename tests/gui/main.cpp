// Runs the window's tests without a display, in the C locale and with settings in a folder of their own.

#include <gtest/gtest.h>

#include <QApplication>
#include <QLocale>
#include <QSettings>
#include <QTemporaryDir>

int main(int argc, char** argv) {
    qputenv("QT_QPA_PLATFORM", "offscreen");
    QTemporaryDir home;
    qputenv("HOME", home.path().toLocal8Bit());
    qputenv("XDG_CONFIG_HOME", home.path().toLocal8Bit());
    qputenv("XDG_RUNTIME_DIR", home.path().toLocal8Bit());
    testing::InitGoogleTest(&argc, argv);
    QApplication application(argc, argv);
    QApplication::setOrganizationName("photon-margin-tests");
    QSettings::setPath(QSettings::NativeFormat, QSettings::UserScope, home.path());
    QLocale::setDefault(QLocale::c());
    return RUN_ALL_TESTS();
}
