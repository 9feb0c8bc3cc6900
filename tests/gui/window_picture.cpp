// Draws the window into a PNG, for README and for looking at it: window_picture OUT.png [light|dark]
// [FILE.toml]

#include <QApplication>
#include <QPalette>
#include <QStyleFactory>
#include <QTemporaryDir>
#include <QTimer>
#include <cstdio>

#include "session/session.h"
#include "window/main_window.h"

namespace {

QPalette darkPalette() {
    QPalette palette(QColor(50, 52, 56), QColor(43, 45, 48));
    palette.setColor(QPalette::Base, QColor(30, 31, 34));
    palette.setColor(QPalette::Text, QColor(225, 225, 225));
    palette.setColor(QPalette::WindowText, QColor(225, 225, 225));
    palette.setColor(QPalette::ButtonText, QColor(225, 225, 225));
    palette.setColor(QPalette::Highlight, QColor(60, 110, 170));
    return palette;
}

}  // namespace

int main(int argc, char** argv) {
    qputenv("QT_QPA_PLATFORM", "offscreen");
    const QTemporaryDir settings;
    qputenv("XDG_CONFIG_HOME", settings.path().toLocal8Bit());
    QApplication application(argc, argv);
    const QStringList arguments = QApplication::arguments();
    if (arguments.size() < 2) {
        std::fprintf(stderr, "window_picture OUT.png [light|dark] [FILE.toml]\n");
        return 2;
    }
    QApplication::setStyle(QStyleFactory::create("Fusion"));
    if (arguments.value(2) == "dark") QApplication::setPalette(darkPalette());
    Session session;
    if (arguments.size() > 3) session.open(arguments[3]);
    MainWindow window(session);
    window.resize(1320, 860);
    window.show();
    QTimer::singleShot(200, [&] {
        const bool written = window.grab().save(arguments[1]);
        QApplication::exit(written ? 0 : 2);
    });
    return QApplication::exec();
}
