#include "session/preferences.h"

#include <QLocale>
#include <QSettings>

namespace preferences {
namespace {

constexpr int mostRecentFiles = 8;

}  // namespace

QByteArray windowGeometry() {
    return QSettings().value("window/geometry").toByteArray();
}
void setWindowGeometry(const QByteArray& geometry) {
    QSettings().setValue("window/geometry", geometry);
}

QByteArray splitterState(const QString& name) {
    return QSettings().value("splitters/" + name).toByteArray();
}
void setSplitterState(const QString& name, const QByteArray& state) {
    QSettings().setValue("splitters/" + name, state);
}

QStringList recentFiles() {
    return QSettings().value("files/recent").toStringList();
}

void addRecentFile(const QString& path) {
    QStringList files = recentFiles();
    files.removeAll(path);
    files.prepend(path);
    while (files.size() > mostRecentFiles) files.removeLast();
    QSettings().setValue("files/recent", files);
}

QString paper() {
    const QString usual =
        QLocale::system().measurementSystem() == QLocale::ImperialUSSystem ? "Letter" : "A4";
    return QSettings().value("sheet/paper", usual).toString();
}
void setPaper(const QString& name) {
    QSettings().setValue("sheet/paper", name);
}

}  // namespace preferences
