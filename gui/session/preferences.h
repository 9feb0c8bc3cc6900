#pragma once

#include <QByteArray>
#include <QStringList>

/// What the program remembers about itself. Nothing that an assessment depends on is kept here; that belongs
/// to the assessment file.
namespace preferences {

QByteArray windowGeometry();
void setWindowGeometry(const QByteArray& geometry);
QByteArray splitterState(const QString& name);
void setSplitterState(const QString& name, const QByteArray& state);
/// Newest first, at most eight.
QStringList recentFiles();
void addRecentFile(const QString& path);
/// "A4" or "Letter"; the country's usual size until chosen.
QString paper();
void setPaper(const QString& name);

}  // namespace preferences
