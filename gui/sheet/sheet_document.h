#pragma once

#include <QTextDocument>
#include <QTextObjectInterface>

#include "assessment/assessment.h"
#include "route_view/route_model.h"

/// Draws the route of the beam inside a text document, as vectors.
class RouteObject : public QObject, public QTextObjectInterface {
    Q_OBJECT
    Q_INTERFACES(QTextObjectInterface)

  public:
    static constexpr int type = QTextFormat::UserObject + 1;
    RouteObject(RouteModel model, QObject* parent) : QObject(parent), model_(std::move(model)) {}
    QSizeF intrinsicSize(QTextDocument* document, int position, const QTextFormat& format) override;
    void drawObject(QPainter* painter, const QRectF& rect, QTextDocument* document, int position,
                    const QTextFormat& format) override;

  private:
    RouteModel model_;
};

/// Fills a document with the sheet, laid out for pages of that size with lengths in the device's dots.
void fillSheetDocument(QTextDocument& document, const dosimetry::Setup& setup,
                       const dosimetry::Assessment& assessment, const QString& fileSha256,
                       QPaintDevice& device, const QSizeF& page);
