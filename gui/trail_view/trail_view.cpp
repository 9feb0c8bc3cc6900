#include "trail_view/trail_view.h"

using dosimetry::Trail;
using dosimetry::TrailStep;

namespace {

QString escaped(const std::string& text) {
    return QString::fromStdString(text).toHtmlEscaped();
}

/// Formula, numbers and result, a line each; a line that says the same as the one before is left out.
QString calculationHtml(const TrailStep& step) {
    QStringList lines;
    if (!step.formula.empty()) lines += "= " + mathHtml(step.formula);
    if (!step.with_numbers.empty() && step.with_numbers != step.formula)
        lines += "= " + mathHtml(step.with_numbers);
    if (step.result != step.with_numbers) lines += "<b>= " + escaped(step.result) + "</b>";
    return lines.join("<br/>");
}

}  // namespace

TrailView::TrailView(QWidget* parent) : QTextBrowser(parent) {
    setObjectName("trail");
    setAccessibleName(tr("Trail: how the chosen number came about"));
    setOpenLinks(false);
    setTabChangesFocus(true);
}

/// Paragraphs, not the sheet's tables: the view is narrow, and they are laid out in half the time on every
/// edit.
void TrailView::showTrail(const Trail& trail) {
    QString html = "<p><b>" + escaped(trail.subject) + "</b></p>";
    for (const TrailStep& step : trail.steps)
        html += "<p style='margin-top:5px; margin-bottom:5px'><b>" + mathHtml(step.symbol) + "</b>&nbsp; " +
                escaped(step.meaning) + "<br/>" + calculationHtml(step) + "<br/><i>" + escaped(step.source) +
                "</i></p>";
    setHtml(html);
}

QString mathHtml(const std::string& formula) {
    const QString text = QString::fromStdString(formula);
    QString html;
    for (int i = 0; i < text.size(); ++i) {
        const QChar c = text[i];
        const auto ends = [&](auto belongs) {
            int end = i + 1;
            while (end < text.size() && belongs(text[end], end)) ++end;
            return end;
        };
        if (c == '^' && i + 1 < text.size()) {
            int end = i + 1;
            if (text[end] == '(') {
                int depth = 0;
                do {
                    if (text[end] == '(') ++depth;
                    if (text[end] == ')') --depth;
                    ++end;
                } while (end < text.size() && depth > 0);
            } else {
                end = ends([&](QChar d, int at) {
                    return d.isDigit() || d == '.' || (at == i + 1 && (d == '-' || d == QChar(0x2212)));
                });
            }
            html += "<sup>" + text.mid(i + 1, end - i - 1).toHtmlEscaped() + "</sup>";
            i = end - 1;
        } else if (c == '_') {
            const int end = ends([](QChar d, int) { return d.unicode() < 128 && d.isLetterOrNumber(); });
            html += "<sub>" + text.mid(i + 1, end - i - 1).toHtmlEscaped() + "</sub>";
            i = end - 1;
        } else {
            html += QString(c).toHtmlEscaped();
        }
    }
    return html;
}

QString trailHtml(const Trail& trail) {
    // One table a step: the sheet moves a step that does not fit to the next page as a whole.
    QString html;
    for (const TrailStep& step : trail.steps)
        html += "<table width='100%' cellpadding='2' cellspacing='0'><tr><td width='11%' valign='top'><b>" +
                mathHtml(step.symbol) + "</b></td><td width='43%' valign='top'>" + calculationHtml(step) +
                "</td><td width='46%' valign='top'>" + escaped(step.meaning) + "<br/><i>" +
                escaped(step.source) + "</i></td></tr></table>";
    return html;
}
