#pragma once

#include <QWidget>
#include <functional>

#include "assessment/setup.h"

class CalmComboBox;
class ReasonLabel;
class Session;

/// A choice bound to one value of the setup; choosing is one undo step. A choice that is refused goes back,
/// with the reason under it until the setup changes.
class ChoiceField : public QWidget {
    Q_OBJECT

  public:
    struct Binding {
        QString key;
        QString what;
        std::function<int(const dosimetry::Setup&)> read;   ///< index of the choice
        std::function<void(dosimetry::Setup&, int)> write;  ///< may throw InputError
        QString hint;
    };

    ChoiceField(Session& session, const QStringList& choices, Binding binding, QWidget* parent = nullptr);

  private:
    void choose(int index);
    void showChoice();
    Session& session_;
    Binding binding_;
    CalmComboBox* box_;
    ReasonLabel* reason_;
};
