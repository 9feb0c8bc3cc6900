#pragma once

#include <QWidget>
#include <functional>
#include <string>

#include "assessment/setup.h"

class QLineEdit;
class ReasonLabel;
class Session;

/// What a field shows of a setup and how it changes one. `write` may throw InputError.
struct FieldBinding {
    enum class Content { quantity, text };
    QString key;   ///< object name and name of the undo step's merging
    QString what;  ///< name for the undo menu and for screen readers: "beam diameter"
    std::function<std::string(const dosimetry::Setup&)> read;
    std::function<void(dosimetry::Setup&, const std::string&)> write;
    Content content = Content::quantity;  ///< in a quantity the language's decimal mark is understood
    QString hint;                         ///< what beginners get wrong, as tool tip
};

/// A line of text bound to one value of the setup. Each keystroke that makes a valid setup is applied at
/// once. While the text is not valid the reason stands under the field and the setup holds the value from
/// before this visit to the field: "350 mn" must not leave the 350 m behind that stood there on the way.
class SetupField : public QWidget {
    Q_OBJECT

  public:
    SetupField(Session& session, FieldBinding binding, QWidget* parent = nullptr);

    QLineEdit* edit() const { return edit_; }
    QString key() const { return binding_.key; }
    /// Shows the setup's value again, dropping text that is not valid.
    void reload();

  protected:
    bool eventFilter(QObject* watched, QEvent* event) override;

  private:
    void apply();
    void followSetup();
    void showValidity();
    std::string typed() const;
    QString mergeKey() const;

    Session& session_;
    FieldBinding binding_;
    QLineEdit* edit_;
    ReasonLabel* reason_;
    std::string followed_;   ///< the setup's value that the text was last in step with
    std::string atStart_;    ///< the setup's value when this visit began
    bool visiting_ = false;  ///< something was typed since the field was entered
    bool applying_ = false;
    int visits_ = 0;  ///< so that each visit is its own undo step
};
