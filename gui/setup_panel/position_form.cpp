#include "setup_panel/position_form.h"

#include <QFormLayout>
#include <QHBoxLayout>
#include <QPushButton>

#include "fields/bindings.h"
#include "fields/calm_combo_box.h"
#include "fields/choice_field.h"
#include "session/session.h"

using namespace dosimetry;

namespace {

/// "door", "door 2", "door 3": the name without its number, and the next free one.
std::string unusedId(const Setup& setup, const std::string& like) {
    const auto end = like.find_last_not_of("0123456789");
    const bool numbered = end != std::string::npos && end > 0 && end + 1 < like.size() && like[end] == ' ';
    const std::string stem = numbered ? like.substr(0, end) : like;
    for (int n = 2;; ++n) {
        const std::string id = stem + " " + std::to_string(n);
        bool used = false;
        for (const PositionSetup& p : setup.positions) used = used || p.id == id;
        if (!used) return id;
    }
}

}  // namespace

PositionForm::PositionForm(Session& session, QWidget* parent)
    : QGroupBox(tr("Positions"), parent),
      session_(session),
      chosen_(new CalmComboBox),
      add_(new QPushButton(tr("Add"))),
      remove_(new QPushButton(tr("Remove"))) {
    auto* form = new QFormLayout(this);
    form->setFieldGrowthPolicy(QFormLayout::AllNonFixedFieldsGrow);
    add_->setObjectName("position.add");
    add_->setToolTip(tr("Adds a position with the values of the present one"));
    remove_->setObjectName("position.remove");
    chosen_->setObjectName("position.chosen");
    chosen_->setAccessibleName(tr("position shown"));
    chosen_->setMinimumContentsLength(6);
    chosen_->setSizeAdjustPolicy(QComboBox::AdjustToMinimumContentsLengthWithIcon);
    auto* buttons = new QHBoxLayout;
    buttons->addWidget(add_);
    buttons->addWidget(remove_);
    form->addRow(tr("Shown"), chosen_);
    form->addRow(QString(), buttons);

    const auto current = [this](const Setup& s) -> const PositionSetup& {
        return s.positions[static_cast<std::size_t>(session_.currentPosition())];
    };
    const auto currentIn = [this](Setup& s) -> PositionSetup& {
        return s.positions[static_cast<std::size_t>(session_.currentPosition())];
    };
    const auto addField = [&](const QString& label, FieldBinding binding) {
        auto* field = new SetupField(session, std::move(binding));
        connect(&session, &Session::currentPositionChanged, field, &SetupField::reload);
        form->addRow(label, field);
    };
    addField(tr("Name"),
             {"position.id",
              tr("name of the position"),
              [current](const Setup& s) { return current(s).id; },
              [currentIn](Setup& s, const std::string& text) { currentIn(s).id = nonEmpty(text); },
              FieldBinding::Content::text,
              {}});
    addField(tr("Distance from exit"),
             {"position.at", tr("distance of the position"),
              [current](const Setup& s) { return current(s).at.text; },
              [currentIn](Setup& s, const std::string& text) { currentIn(s).at = Stated<Length>(text); },
              FieldBinding::Content::quantity,
              tr("Along the beam, from the exit of the laser to the eye or skin")});
    addField(tr("Exposure to assume"), {"position.exposure", tr("exposure to assume"),
                                        [current](const Setup& s) { return current(s).exposure.text; },
                                        [currentIn](Setup& s, const std::string& text) {
                                            currentIn(s).exposure = Stated<Duration>(text);
                                        },
                                        FieldBinding::Content::quantity,
                                        tr("The longest exposure of one day. 0.25 s only for visible beams, "
                                           "and only if nobody looks on purpose; "
                                           "30000 s for a working day")});
    form->addRow(tr("Tissues"),
                 new ChoiceField(session, {tr("eye and skin"), tr("eye only"), tr("skin only")},
                                 {"position.tissues",
                                  tr("tissues assessed"),
                                  [current](const Setup& s) {
                                      const PositionSetup& p = current(s);
                                      return p.eye && p.skin ? 0 : p.eye ? 1 : 2;
                                  },
                                  [currentIn](Setup& s, int choice) {
                                      currentIn(s).eye = choice != 2;
                                      currentIn(s).skin = choice != 1;
                                  },
                                  {}}));

    connect(add_, &QPushButton::clicked, this, &PositionForm::addCopy);
    connect(remove_, &QPushButton::clicked, this, &PositionForm::removeCurrent);
    connect(chosen_, &QComboBox::activated, &session_, &Session::setCurrentPosition);
    connect(&session_, &Session::setupChanged, this, &PositionForm::showPositions);
    connect(&session_, &Session::currentPositionChanged, this, &PositionForm::showPositions);
    connect(&session_, &Session::validityChanged, this, &PositionForm::showValidity);
    showPositions();
}

void PositionForm::showPositions() {
    chosen_->clear();
    const auto& positions = session_.setup().positions;
    for (std::size_t i = 0; i < positions.size(); ++i) {
        const QString name = QString::fromStdString(positions[i].id);
        chosen_->addItem(positions.size() > 1 ? QString("%1. ").arg(i + 1) + name
                                              : name);  // numbers as in the drawing
    }
    chosen_->setCurrentIndex(session_.currentPosition());
    showValidity();
}

/// While a field of this position is not valid the position is not left: its text would be lost.
void PositionForm::showValidity() {
    const bool free = !session_.hasInvalidPositionField();
    chosen_->setEnabled(free);
    add_->setEnabled(free);
    remove_->setEnabled(free && session_.setup().positions.size() > 1);
}

void PositionForm::addCopy() {
    Setup next = session_.setup();
    PositionSetup copy = next.positions[static_cast<std::size_t>(session_.currentPosition())];
    copy.id = unusedId(next, copy.id);
    next.positions.push_back(copy);
    session_.edit(next, tr("new position"));
    session_.setCurrentPosition(static_cast<int>(next.positions.size()) - 1);
}

void PositionForm::removeCurrent() {
    Setup next = session_.setup();
    next.positions.erase(next.positions.begin() + session_.currentPosition());
    session_.edit(next, tr("removal of a position"));
}
