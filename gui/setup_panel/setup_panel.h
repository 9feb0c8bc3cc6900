#pragma once

#include <QScrollArea>

class Session;

/// The form on the left: what is assessed, the source, its beam, the positions.
class SetupPanel : public QScrollArea {
    Q_OBJECT

  public:
    explicit SetupPanel(Session& session, QWidget* parent = nullptr);

    /// Puts the cursor into the field of that name and scrolls to it.
    void focusField(const QString& key);
};
