#include "sheet/sheet_html.h"

#include <QObject>

#include "beams/names.h"
#include "documents/result.h"
#include "quantities/format.h"
#include "trail_view/trail_view.h"

using namespace dosimetry;

namespace {

QString tr(const char* text) {
    return QObject::tr(text);
}
QString escaped(const std::string& text) {
    return QString::fromStdString(text).toHtmlEscaped();
}
QString escaped(std::string_view text) {
    return escaped(std::string(text));
}

QString head(const QString& text) {
    return "<h2>" + text + "</h2>";
}

/// Two columns: what and its value.
class Facts {
  public:
    void add(const QString& label, const QString& value) {
        if (!value.isEmpty()) rows_ += "<tr><td width='32%'>" + label + "</td><td>" + value + "</td></tr>";
    }
    QString html() const {
        return "<table width='100%' class='facts' cellpadding='3' cellspacing='0'>" + rows_ + "</table>";
    }

  private:
    QString rows_;
};

/// What a person should have stated and did not, to be written by hand.
QString orBlank(const std::string& text) {
    return text.empty() ? tr("not stated") : escaped(text);
}

QString titleOf(const Setup& setup) {
    return setup.title.empty() ? tr("Laser assessment") : escaped(setup.title);
}

QString identification(const Setup& setup) {
    Facts facts;
    facts.add(tr("Place"), orBlank(setup.place));
    facts.add(tr("Assessed by"), orBlank(setup.assessor));
    facts.add(tr("Date"), orBlank(setup.date));
    facts.add(tr("Note"), escaped(setup.note).replace('\n', "<br/>"));
    return "<h1>" + titleOf(setup) + "</h1>" + facts.html();
}

/// One line for all positions, which the signature page repeats.
QString overall(const Assessment& assessment) {
    int above = 0;
    for (const PositionAssessment& p : assessment.positions)
        if (!p.within_limits()) ++above;
    const auto all = static_cast<int>(assessment.positions.size());
    if (above == 0) return tr("Within the exposure limits at every position assessed (%1).").arg(all);
    return tr("ABOVE THE EXPOSURE LIMITS at %1 of %2 positions.").arg(above).arg(all);
}

/// "2. “door”", as in the drawing.
QString numbered(const Assessment& assessment, const PositionAssessment& p) {
    const auto number = &p - assessment.positions.data() + 1;
    const QString name = "“" + escaped(p.id) + "”";
    return assessment.positions.size() > 1 ? QString::number(number) + ". " + name : name;
}

QString verdicts(const Assessment& assessment) {
    QString html = "<p class='verdict'>" + overall(assessment) + "</p>";
    for (const PositionAssessment& p : assessment.positions) {
        const QString sign = p.within_limits() ? QString() : QStringLiteral("⚠ ");
        html += "<p>" + sign + "<b>" + tr("Position") + " " + numbered(assessment, p) + ":</b> " +
                escaped(verdict(p)) + "</p>";
    }
    return html;
}

QString sourcePart(const LaserSetup& source, const SourceAssessment& result) {
    const BeamSetup& beam = source.beam;
    const QString at = " (" + escaped(name_of_choice(width_names, beam.measured_at).shown) + ")";
    Facts facts;
    facts.add(tr("Source"), escaped(source.id) + ", " + tr("continuous laser"));
    facts.add(tr("Wavelength"), escaped(source.wavelength.text));
    facts.add(tr("Power"), escaped(source.power.text));
    facts.add(tr("Beam profile"),
              escaped(name_of_choice(profile_names, beam.profile).shown) + ", " + tr("circular"));
    if (beam.diameter) facts.add(tr("Diameter at the exit"), escaped(beam.diameter->text) + at);
    if (beam.divergence) facts.add(tr("Divergence, full angle"), escaped(beam.divergence->text) + at);
    if (beam.m2) facts.add(tr("Beam propagation ratio M²"), escaped(shortest(*beam.m2)));
    if (beam.waist)
        facts.add(tr("Waist"), escaped(beam.waist->text) + at + ", " + escaped(beam.waist_at->text) + " " +
                                   tr("from the exit"));
    facts.add(tr("Apparent source"),
              source.apparent_source ? escaped(source.apparent_source->text) : tr("small source"));
    facts.add(tr("Path"), tr("free, nothing between exit and position"));
    facts.add(tr("Photons"),
              escaped(format_number(in_electronvolts(result.photon_energy), 4, Rounding::nearest)) + " eV, " +
                  escaped(format(result.photon_rate, 4, Rounding::up)));
    return facts.html();
}

QString limitsPart(const Assessment& assessment) {
    Facts facts;
    for (const LimitSet* set : assessment.limit_sets) {
        const Edition& e = set->edition();
        facts.add(escaped(e.id), escaped(e.title) + ". " + escaped(e.issuer) + ", " +
                                     escaped(e.published_in) + ".<br/>" + tr("Table file SHA-256") + " " +
                                     escaped(e.sha256));
    }
    return facts.html();
}

QString marginsPart(const Assessment& assessment, const PositionAssessment& p) {
    QString html = "<h3>" + tr("Position") + " " + numbered(assessment, p) + ": " + escaped(p.at.text) + " " +
                   tr("from the exit") + ", " + tr("exposure") + " " + escaped(p.exposure.text) + "</h3>";
    html += "<table width='100%' class='grid' cellpadding='4' cellspacing='0'><thead><tr>";
    // widths that hold six digits with their unit in one line
    const auto column = [&html](const char* align, int percent, const QString& text) {
        html += QString("<th align='%1' width='%2%'>").arg(align).arg(percent) + text + "</th>";
    };
    column("left", 23, tr("Tissue, effect"));
    column("right", 16, tr("Exposure"));
    column("right", 15, tr("Limit"));
    column("right", 12, tr("Ratio"));
    column("right", 11, tr("Margin"));
    column("right", 12, tr("Averaged over"));
    column("left", 11, tr("Clause"));
    html += "</tr></thead>";
    const Criterion* governing = p.governing_criterion();
    for (const Criterion& c : p.criteria) {
        const bool governs = &c == governing;
        const QString open = governs ? "<b>" : "";
        const QString close = governs ? "</b>" : "";
        const auto cell = [&](const QString& align, const QString& text) {
            return "<td align='" + align + "'>" + open + text + close + "</td>";
        };
        html += "<tr>" +
                cell("left", escaped(name_of(c.tissue, c.effect)) +
                                 (governs ? " (" + tr("governs") + ")" : QString())) +
                cell("right", escaped(exposure_text(c))) + cell("right", escaped(limit_text(c))) +
                cell("right", escaped(format_number(c.ratio, 4, Rounding::up))) +
                cell("right", escaped(format_number(c.margin(), 3, Rounding::down))) +
                cell("right", "⌀ " + escaped(format(c.aperture, 3, Rounding::nearest))) +
                cell("left",
                     escaped(assessment.limit_sets.size() > 1 ? c.limit_set + ", " + c.clause : c.clause)) +
                "</tr>";
    }
    html += "</table>";
    Facts facts;
    facts.add(tr("Beam diameter there"), escaped(format(p.beam_diameter, 4, Rounding::nearest)));
    facts.add(tr("Irradiance on the axis"), escaped(format(p.peak_irradiance, 4, Rounding::up)));
    facts.add(tr("Photons per area, on the axis"), escaped(format(p.photons_per_area, 4, Rounding::up)));
    facts.add(tr("Longest permitted exposure"), escaped(permitted_exposure_text(p) + tissue_remark(p)));
    facts.add(tr("Highest permitted power"),
              escaped(format(p.permitted_power, 4, Rounding::down) + tissue_remark(p)));
    if (p.required_density_eye)
        facts.add(tr("Optical density needed, eye"), escaped(density_text(*p.required_density_eye)));
    if (p.required_density_skin)
        facts.add(tr("Optical density needed, skin"), escaped(density_text(*p.required_density_skin)));
    return html + facts.html();
}

QString distancesPart(const Assessment& assessment) {
    Facts facts;
    for (const HazardDistance& d : assessment.hazard_distances)
        facts.add((d.tissue == Tissue::eye ? tr("Eye (NOHD)") : tr("Skin")) + ", " + tr("exposure") + " " +
                      escaped(d.exposure.text) + ", " + escaped(d.limit_set),
                  escaped(distance_text(d)));
    return facts.html();
}

QString list(const std::vector<std::string>& texts) {
    QString html = "<ul>";
    for (const std::string& text : texts) html += "<li>" + escaped(text) + "</li>";
    return html + "</ul>";
}

QString signatures() {
    QString html =
        "<table width='100%' class='grid' cellpadding='7' cellspacing='0'><thead><tr><th align='left' "
        "width='34%'>" +
        tr("Role") + "</th><th align='left' width='24%'>" + tr("Name") +
        "</th><th align='left' width='27%'>" + tr("Signature") + "</th><th align='left' width='15%'>" +
        tr("Date") + "</th></tr></thead>";
    for (const QString& role : {tr("Assessed"), tr("Reviewed, laser or optical-radiation safety officer"),
                                tr("Accepted, person in charge")})
        html += "<tr><td>" + role + "<br/>&nbsp;</td><td></td><td></td><td></td></tr>";
    html += "</table><table width='100%' class='facts' cellpadding='7' cellspacing='0'><tr><td width='50%'>" +
            tr("Valid until:") + " ____________________</td><td>" + tr("Open points:") +
            " ____________________________</td></tr></table>";
    return html;
}

QString trails(const Assessment& assessment) {
    QString html;
    const auto add = [&html](const QString& title, const Trail& trail) {
        if (!trail.steps.empty()) html += "<h3>" + title + "</h3>" + trailHtml(trail);
    };
    for (const PositionAssessment& p : assessment.positions) {
        const QString where = tr("Position") + " “" + escaped(p.id) + "”: ";
        for (const Criterion& c : p.criteria)
            add(where + escaped(c.trail.subject) + ", " + escaped(c.limit_set), c.trail);
        add(where + escaped(p.permitted_exposure_trail.subject), p.permitted_exposure_trail);
        add(where + escaped(p.permitted_power_trail.subject), p.permitted_power_trail);
        add(where + escaped(p.density_trail_eye.subject), p.density_trail_eye);
        add(where + escaped(p.density_trail_skin.subject), p.density_trail_skin);
        add(where + escaped(p.photons_trail.subject), p.photons_trail);
    }
    for (const HazardDistance& d : assessment.hazard_distances)
        add(escaped(d.trail.subject) + ", " + tr("exposure") + " " + escaped(d.exposure.text) + ", " +
                escaped(d.limit_set),
            d.trail);
    for (const SourceAssessment& s : assessment.sources) {
        add(escaped(s.photon_energy_trail.subject), s.photon_energy_trail);
        add(escaped(s.photon_rate_trail.subject), s.photon_rate_trail);
    }
    return html;
}

}  // namespace

QString sheetHtml(const Setup& setup, const Assessment& assessment, const QString& fileSha256) {
    QString html = identification(setup) + head(tr("Verdict")) + verdicts(assessment);
    html += head(tr("What was assessed")) + sourcePart(setup.sources.front(), assessment.sources.front());
    html += "<p>" + QString::fromUtf16(routePlaceholder) + "</p>";
    html += head(tr("Exposure limits used")) + limitsPart(assessment);
    html += head(tr("Margins"));
    for (const PositionAssessment& position : assessment.positions) html += marginsPart(assessment, position);
    html += head(tr("Hazard distances along the direct beam, unaided")) + distancesPart(assessment);
    html += head(tr("Assumptions")) + list(assessment.assumptions);
    html += head(tr("Cautions")) + list(assessment.cautions);
    html += head(tr("Signatures")) + "<h3>" + titleOf(setup) + ". " + overall(assessment) + "</h3>" +
            signatures();
    html += "<div style='page-break-before:always'>" + head(tr("Appendix: how each number came about")) +
            "<p>" +
            tr("Values are in SI units with nine significant digits, so that each step can be repeated by "
               "hand. The assessment "
               "file that belongs to this sheet is attached to its PDF. SHA-256 of the attached file:") +
            " " + fileSha256 + ".</p></div>" + trails(assessment);
    return html;
}
