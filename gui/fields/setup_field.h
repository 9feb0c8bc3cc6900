#pragma once

#include <QWidget>
#include <functional>
#include <string>

#include "assessment/setup.h"

class QLabel;
class QLineEdit;
class Session;

/// What a field shows of a setup and how it changes one. `write` may throw InputError.
struct FieldBinding {
    QString key;   ///< object name and name of the undo step's merging
    QString what;  ///< name for the undo menu and for screen readers: "beam diameter"
    std::function<std::string(const dosimetry::Setup&)> read;
    std::function<void(dosimetry::Setup&, const std::string&)> write;
};

/// A line of text bound to one value of the setup. Each keystroke that makes a valid setup is applied at
/// once; while the text is not valid the reason stands under the field and the setup keeps its last valid
/// value.
class SetupField : public QWidget {
    Q_OBJECT

  public:
    SetupField(Session& session, FieldBinding binding, QWidget* parent = nullptr);

    QLineEdit* edit() const { return edit_; }
    QString key() const { return binding_.key; }
    /// Shows the setup's value again, dropping text that is not valid.
    void reload();

  private:
    void apply();
    void showReason(const QString& reason);

    Session& session_;
    FieldBinding binding_;
    QLineEdit* edit_;
    QLabel* reason_;
    int editing_ = 0;  ///< counts the visits to the field, so that each is its own undo step
};
