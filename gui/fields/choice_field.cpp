#include "fields/choice_field.h"

#include "quantities/input_error.h"
#include "session/session.h"

ChoiceField::ChoiceField(Session& session, const QStringList& choices, Binding binding, QWidget* parent)
    : QComboBox(parent) {
    addItems(choices);
    setSizeAdjustPolicy(QComboBox::AdjustToMinimumContentsLengthWithIcon);
    setMinimumContentsLength(10);
    setObjectName(binding.key);
    setAccessibleName(binding.what);
    setCurrentIndex(binding.read(session.setup()));
    setFocusPolicy(Qt::StrongFocus);
    connect(&session, &Session::setupChanged, this,
            [this, &session, read = binding.read] { setCurrentIndex(read(session.setup())); });
    connect(&session, &Session::currentPositionChanged, this,
            [this, &session, read = binding.read] { setCurrentIndex(read(session.setup())); });
    connect(this, &QComboBox::activated, this, [this, &session, binding](int index) {
        try {
            dosimetry::Setup next = session.setup();
            binding.write(next, index);
            session.clearInvalidField(binding.key);
            session.edit(next, tr("change of %1").arg(binding.what));
        } catch (const dosimetry::InputError& error) {
            setCurrentIndex(binding.read(session.setup()));
            session.setInvalidField(binding.key, QString::fromStdString(error.sentence()));
        }
    });
}
