#include "setup_panel/setup_panel.h"

#include <QFormLayout>
#include <QGroupBox>
#include <QLineEdit>
#include <QScrollBar>
#include <QVBoxLayout>

#include "fields/bindings.h"
#include "fields/setup_field.h"
#include "session/session.h"
#include "setup_panel/beam_form.h"
#include "setup_panel/position_form.h"

using dosimetry::Setup;

namespace {

/// A free text of the heading.
FieldBinding textBinding(const QString& key, const QString& what, std::string Setup::*member) {
    return {key,
            what,
            [member](const Setup& s) { return s.*member; },
            [member](Setup& s, const std::string& text) { s.*member = text; },
            FieldBinding::Content::text,
            {}};
}

QGroupBox* headingGroup(Session& session) {
    auto* group = new QGroupBox(SetupPanel::tr("Assessment"));
    auto* form = new QFormLayout(group);
    form->setRowWrapPolicy(QFormLayout::DontWrapRows);
    form->setFieldGrowthPolicy(QFormLayout::AllNonFixedFieldsGrow);
    const auto add = [&](const QString& label, const QString& key, std::string Setup::*member) {
        form->addRow(label, new SetupField(session, textBinding(key, label, member)));
    };
    add(SetupPanel::tr("Title"), "title", &Setup::title);
    add(SetupPanel::tr("Place"), "place", &Setup::place);
    add(SetupPanel::tr("Assessor"), "assessor", &Setup::assessor);
    form->addRow(SetupPanel::tr("Date"), new SetupField(session, dateBinding()));
    add(SetupPanel::tr("Note"), "note", &Setup::note);
    return group;
}

QGroupBox* sourceGroup(Session& session) {
    auto* group = new QGroupBox(SetupPanel::tr("Source: continuous laser"));
    auto* form = new QFormLayout(group);
    form->setFieldGrowthPolicy(QFormLayout::AllNonFixedFieldsGrow);
    form->addRow(SetupPanel::tr("Name"),
                 new SetupField(session, {"source.id",
                                          SetupPanel::tr("name of the source"),
                                          [](const Setup& s) { return s.sources.front().id; },
                                          [](Setup& s, const std::string& text) {
                                              s.sources.front().id = nonEmpty(text);
                                          },
                                          FieldBinding::Content::text,
                                          {}}));
    form->addRow(SetupPanel::tr("Wavelength"),
                 new SetupField(session, {"source.wavelength", SetupPanel::tr("wavelength"),
                                          [](const Setup& s) { return s.sources.front().wavelength.text; },
                                          [](Setup& s, const std::string& text) {
                                              s.sources.front().wavelength =
                                                  dosimetry::Stated<dosimetry::Length>(text);
                                          },
                                          FieldBinding::Content::quantity,
                                          SetupPanel::tr("With a unit, such as 532 nm or 10.6 um")}));
    form->addRow(SetupPanel::tr("Power"),
                 new SetupField(
                     session, {"source.power", SetupPanel::tr("power"),
                               [](const Setup& s) { return s.sources.front().power.text; },
                               [](Setup& s, const std::string& text) {
                                   s.sources.front().power = dosimetry::Stated<dosimetry::RadiantPower>(text);
                               },
                               FieldBinding::Content::quantity,
                               SetupPanel::tr("The largest power that can leave the exit, such as 5 mW")}));
    return group;
}

}  // namespace

SetupPanel::SetupPanel(Session& session, QWidget* parent) : QScrollArea(parent) {
    auto* content = new QWidget;
    auto* layout = new QVBoxLayout(content);
    layout->addWidget(headingGroup(session));
    layout->addWidget(sourceGroup(session));
    layout->addWidget(new BeamForm(session));
    layout->addWidget(new PositionForm(session));
    layout->addStretch();
    setWidget(content);
    setWidgetResizable(true);
    setFrameShape(QFrame::NoFrame);
    setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
    setMinimumWidth(content->minimumSizeHint().width() + verticalScrollBar()->sizeHint().width());
    setAccessibleName(tr("Set-up"));
}

void SetupPanel::focusField(const QString& key) {
    if (auto* field = findChild<QWidget*>(key)) {
        ensureWidgetVisible(field);
        field->setFocus(Qt::OtherFocusReason);
    }
}
