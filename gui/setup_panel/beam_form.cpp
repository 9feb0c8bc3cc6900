#include "setup_panel/beam_form.h"

#include <QFormLayout>
#include <QLineEdit>
#include <algorithm>
#include <cmath>

#include "beams/names.h"
#include "fields/choice_field.h"
#include "fields/setup_field.h"
#include "quantities/format.h"
#include "quantities/input_error.h"
#include "session/session.h"

using namespace dosimetry;

namespace {

LaserSetup& source(Setup& setup) {
    return setup.sources.front();
}
const LaserSetup& source(const Setup& setup) {
    return setup.sources.front();
}

template <class Enum, std::size_t N>
QStringList shownNames(const std::array<ChoiceName<Enum>, N>& names) {
    QStringList list;
    for (const auto& name : names)
        list += QString::fromUtf8(name.shown.data(), static_cast<qsizetype>(name.shown.size()));
    return list;
}

template <class Enum, std::size_t N>
int indexOf(const std::array<ChoiceName<Enum>, N>& names, Enum value) {
    const auto found =
        std::find_if(names.begin(), names.end(), [&](const auto& name) { return name.value == value; });
    return static_cast<int>(found - names.begin());
}

template <class Q>
FieldBinding beamBinding(const QString& key, const QString& what, std::optional<Stated<Q>> BeamSetup::*member,
                         const QString& hint) {
    return {key,
            what,
            [member](const Setup& s) {
                const auto& value = source(s).beam.*member;
                return value ? value->text : std::string();
            },
            [member](Setup& s, const std::string& text) { source(s).beam.*member = Stated<Q>(text); },
            FieldBinding::Content::quantity,
            hint};
}

FieldBinding m2Binding() {
    return {
        "beam.m2",
        BeamForm::tr("beam propagation ratio M²"),
        [](const Setup& s) {
            const auto& m2 = source(s).beam.m2;
            return m2 ? shortest(*m2) : std::string();
        },
        [](Setup& s, const std::string& text) { source(s).beam.m2 = parse_number(text, DecimalMark::point); },
        FieldBinding::Content::quantity,
        BeamForm::tr("1 for a perfect Gaussian beam")};
}

FieldBinding apparentSourceBinding() {
    return {"source.apparent_source",
            BeamForm::tr("diameter of the apparent source, empty for a small source"),
            [](const Setup& s) {
                const auto& size = source(s).apparent_source;
                return size ? size->text : std::string();
            },
            [](Setup& s, const std::string& text) {
                if (text.empty())
                    source(s).apparent_source.reset();
                else
                    source(s).apparent_source = Stated<Length>(text);
            },
            FieldBinding::Content::quantity,
            BeamForm::tr("Leave empty unless the size of the apparent source is known: a small source is the "
                         "stricter case")};
}

/// Six digits are enough to repeat a statement and short enough to read.
template <class Q>
Stated<Q> restatedAs(Q value, const char* unit, double unit_si) {
    DecimalNumber number = round_decimal(value.in_si() / unit_si, 6, Rounding::nearest);
    while (number.digits.size() > 1 && number.digits.back() == '0') number.digits.pop_back();
    std::string digits = plain_digits(number);
    if (number.negative) digits.replace(0, std::string("−").size(), "-");
    return Stated<Q>(digits + " " + unit);
}

}  // namespace

Spread spreadOf(const BeamSetup& beam) {
    if (beam.diameter && beam.waist) return Spread::exitAndWaist;
    if (beam.waist) return beam.m2 ? Spread::waistAndM2 : Spread::waistAndDivergence;
    return beam.m2 ? Spread::m2 : Spread::divergence;
}

BeamSetup restated(const LaserSetup& laser, Spread spread) {
    const CircularBeam beam = make_laser(laser).beam;
    const double scale = reference_over_measured(laser.beam.profile, laser.beam.measured_at);
    const auto mm = [](Length l) { return restatedAs(l, "mm", 1e-3); };
    BeamSetup next;
    next.profile = laser.beam.profile;
    next.measured_at = laser.beam.measured_at;
    const auto divergence = restatedAs(beam.divergence() / scale, "mrad", 1e-3);
    const double exact_m2 = beam.divergence() / divergence_from_m2(1.0, laser.wavelength.value, beam.waist());
    const double m2 = std::round(exact_m2 * 1e4) / 1e4;
    if ((spread == Spread::m2 || spread == Spread::waistAndM2) && m2 < 1.0)
        throw InputError("the beam spreads less than diffraction allows, its M² would be " + shortest(m2),
                         "a larger divergence or waist first");
    const Length exit_diameter = beam.diameter_at(metres(0)) / scale;
    switch (spread) {
        case Spread::divergence:
        case Spread::m2:
            next.diameter = laser.beam.diameter ? *laser.beam.diameter : mm(exit_diameter);
            if (spread == Spread::divergence)
                next.divergence = divergence;
            else
                next.m2 = m2;
            return next;
        case Spread::exitAndWaist: {
            next.diameter = laser.beam.diameter ? *laser.beam.diameter : mm(exit_diameter);
            if (std::fabs(beam.waist_at().in_si()) > 0.0) {
                next.waist = laser.beam.waist ? *laser.beam.waist : mm(beam.waist() / scale);
                next.waist_at = *laser.beam.waist_at;
            } else {
                // A waist at the exit would say nothing about the divergence. Half the diameter, so far
                // inside the laser that diameter at the exit and divergence stay as they are.
                const Length exit_reference = next.diameter->value * scale;
                next.waist = mm(exit_reference * 0.5 / scale);
                next.waist_at = restatedAs(
                    metres(-std::sqrt(0.75) * exit_reference.in_si() / beam.divergence().in_si()), "m", 1.0);
            }
            return next;
        }
        case Spread::waistAndDivergence:
        case Spread::waistAndM2:
            break;
    }
    next.waist = laser.beam.waist ? *laser.beam.waist : mm(beam.waist() / scale);
    next.waist_at = laser.beam.waist_at ? *laser.beam.waist_at : Stated<Length>("0 m");
    if (spread == Spread::waistAndDivergence)
        next.divergence = divergence;
    else
        next.m2 = m2;
    return next;
}

BeamForm::BeamForm(Session& session, QWidget* parent)
    : QGroupBox(tr("Beam, circular"), parent), session_(session), form_(new QFormLayout(this)) {
    form_->setFieldGrowthPolicy(QFormLayout::AllNonFixedFieldsGrow);
    form_->addRow(
        tr("Profile"),
        new ChoiceField(session, shownNames(profile_names),
                        {"beam.profile",
                         tr("beam profile"),
                         [](const Setup& s) { return indexOf(profile_names, source(s).beam.profile); },
                         [](Setup& s, int i) {
                             source(s).beam.profile = profile_names[static_cast<std::size_t>(i)].value;
                         },
                         {}}));
    form_->addRow(
        tr("Widths measured at"),
        new ChoiceField(session, shownNames(width_names),
                        {"beam.measured_at", tr("definition of diameter and divergence"),
                         [](const Setup& s) { return indexOf(width_names, source(s).beam.measured_at); },
                         [](Setup& s, int i) {
                             source(s).beam.measured_at = width_names[static_cast<std::size_t>(i)].value;
                         },
                         tr("Holds for diameter, waist and divergence alike")}));
    const QStringList spreads{tr("divergence, waist at the exit"), tr("M², waist at the exit"),
                              tr("diameter at the exit and a waist"), tr("waist and divergence"),
                              tr("waist and M²")};
    form_->addRow(tr("Spread given by"),
                  new ChoiceField(
                      session, spreads,
                      {"beam.spread", tr("how the spread is stated"),
                       [](const Setup& s) { return static_cast<int>(spreadOf(source(s).beam)); },
                       [](Setup& s, int i) { source(s).beam = restated(source(s), static_cast<Spread>(i)); },
                       tr("What the data sheet states; changing it restates the same beam")}));
    const QString asChosen = tr("Measured as chosen at “Widths measured at”; data sheets often mean 1/e²");
    diameter_ = new SetupField(session, beamBinding("beam.diameter", tr("beam diameter at the exit"),
                                                    &BeamSetup::diameter, asChosen));
    divergence_ = new SetupField(
        session,
        beamBinding(
            "beam.divergence", tr("full-angle divergence"), &BeamSetup::divergence,
            tr("The full angle, twice the half angle that some data sheets give; measured as chosen at "
               "“Widths measured at”")));
    m2_ = new SetupField(session, m2Binding());
    waist_ =
        new SetupField(session, beamBinding("beam.waist", tr("waist diameter"), &BeamSetup::waist, asChosen));
    waistAt_ = new SetupField(
        session, beamBinding("beam.waist_at", tr("distance of the waist from the exit"), &BeamSetup::waist_at,
                             tr("Negative if the waist lies inside the laser")));
    form_->addRow(tr("Diameter at exit"), diameter_);
    form_->addRow(tr("Divergence, full angle"), divergence_);
    form_->addRow(tr("M²"), m2_);
    form_->addRow(tr("Waist diameter"), waist_);
    form_->addRow(tr("Waist, from exit"), waistAt_);
    auto* apparent = new SetupField(session, apparentSourceBinding());
    apparent->edit()->setPlaceholderText(tr("small source"));
    form_->addRow(tr("Apparent source"), apparent);
    connect(&session, &Session::setupChanged, this, &BeamForm::showRows);
    showRows();
}

void BeamForm::showRows() {
    const BeamSetup& beam = source(session_.setup()).beam;
    const auto show = [this](SetupField* field, bool shown) {
        form_->setRowVisible(field, shown);
        if (!shown) field->reload();  // nothing invalid may stay where nobody sees it
    };
    show(diameter_, beam.diameter.has_value());
    show(divergence_, beam.divergence.has_value());
    show(m2_, beam.m2.has_value());
    show(waist_, beam.waist.has_value());
    show(waistAt_, beam.waist_at.has_value());
}
