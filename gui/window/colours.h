#pragma once

#include <QColor>

class QPalette;

/// Colours with a meaning. Safety colours follow ISO 3864-4 (values of the sRGB approximation are from
/// memory) and never stand alone: text or hatching says the same.
namespace colours {

QColor danger();   ///< signal red
QColor warning();  ///< signal yellow
QColor safe();     ///< signal green
QColor beam(const QPalette& palette);
QColor eyeZone(const QPalette& palette);
QColor skinZone(const QPalette& palette);
QColor faint(const QPalette& palette);  ///< grid lines, secondary marks
QColor invalidField(const QPalette& palette);
QColor invalidText(const QPalette& palette);
bool isDark(const QPalette& palette);

}  // namespace colours
