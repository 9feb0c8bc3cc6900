#pragma once

#include <QComboBox>
#include <functional>

#include "assessment/setup.h"

class Session;

/// A choice bound to one value of the setup; choosing is one undo step.
class ChoiceField : public QComboBox {
    Q_OBJECT

  public:
    struct Binding {
        QString key;
        QString what;
        std::function<int(const dosimetry::Setup&)> read;   ///< index of the choice
        std::function<void(dosimetry::Setup&, int)> write;  ///< may throw InputError
    };

    ChoiceField(Session& session, const QStringList& choices, Binding binding, QWidget* parent = nullptr);
};
