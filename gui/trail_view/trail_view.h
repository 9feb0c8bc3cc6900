#pragma once

#include <QTextBrowser>

#include "assessment/trail.h"

/// How the chosen number came about, step by step.
class TrailView : public QTextBrowser {
    Q_OBJECT

  public:
    explicit TrailView(QWidget* parent = nullptr);
    void showTrail(const dosimetry::Trail& trail);
};

/// Formula text with powers raised and indices lowered: "t^0.75", "H_EL".
QString mathHtml(const std::string& formula);

/// The steps as tables in HTML that QTextDocument understands, for the sheet.
QString trailHtml(const dosimetry::Trail& trail);
