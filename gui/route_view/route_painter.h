#pragma once

#include <QColor>
#include <QRectF>

#include "route_view/route_model.h"

class QPainter;
class QPalette;

/// Colours of the drawing; for paper everything is black on white and only the hatching tells the zones
/// apart.
struct RouteStyle {
    QColor paper, ink, faint, beam, eye, skin, highlight, warning;
    static RouteStyle forScreen(const QPalette& palette);
    static RouteStyle forPaper();
};

/// Where things are, in the coordinates of the rectangle that is painted into.
class RouteLayout {
  public:
    RouteLayout(const RouteModel& model, const QRectF& area, double lineHeight);
    double xOf(dosimetry::Length distance) const;
    dosimetry::Length distanceAt(double x) const;
    QRectF plot;        ///< from the first to the last decade
    double axisY;       ///< the beam's axis
    double halfHeight;  ///< of the widest envelope
    double bandHeight;  ///< of one zone band
    double bandTop(dosimetry::Tissue tissue) const;
    QRectF personRect(const RoutePerson& person) const;

  private:
    const RouteModel& model_;
    double lineHeight_;
};

/// Paints the route with the painter's font. Vector only, for screen, PDF and printer alike.
void paintRoute(QPainter& painter, const QRectF& area, const RouteModel& model, const RouteStyle& style);
