#include "window/colours.h"

#include <QPalette>

namespace colours {
namespace {

QColor mixed(const QColor& a, const QColor& b, double shareOfA) {
    const auto mix = [shareOfA](int x, int y) {
        return static_cast<int>(x * shareOfA + y * (1.0 - shareOfA));
    };
    return {mix(a.red(), b.red()), mix(a.green(), b.green()), mix(a.blue(), b.blue())};
}

}  // namespace

bool isDark(const QPalette& palette) {
    return palette.color(QPalette::Window).lightness() < 128;
}

QColor danger() {
    return {155, 36, 35};
}
QColor warning() {
    return {249, 168, 0};
}
QColor safe() {
    return {35, 127, 82};
}
QColor beam(const QPalette& palette) {
    return isDark(palette) ? QColor(120, 200, 215) : QColor(20, 110, 130);
}
QColor eyeZone(const QPalette& palette) {
    return isDark(palette) ? QColor(240, 120, 110) : danger();
}
QColor skinZone(const QPalette& palette) {
    return isDark(palette) ? QColor(245, 190, 90) : QColor(150, 95, 0);
}
QColor faint(const QPalette& palette) {
    return mixed(palette.color(QPalette::Text), palette.color(QPalette::Base), 0.22);
}
QColor invalidField(const QPalette& palette) {
    return mixed(danger(), palette.color(QPalette::Base), 0.18);
}
QColor invalidText(const QPalette& palette) {
    return isDark(palette) ? QColor(255, 150, 140) : danger();
}

}  // namespace colours
