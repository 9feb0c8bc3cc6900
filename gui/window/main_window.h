#pragma once

#include <QMainWindow>

class ChartWidget;
class MarginsView;
class QMenu;
class QSplitter;
class Recovery;
class RouteView;
class Session;
class SetupPanel;
class TrailView;

/// The one window: set-up on the left, route and chart in the middle, margins and trail on the right, verdict
/// above and cautions below.
class MainWindow : public QMainWindow {
    Q_OBJECT

  public:
    explicit MainWindow(Session& session, QWidget* parent = nullptr);
    /// Opens a file if the present work may be replaced, or says in a message why it cannot be opened.
    void openFile(const QString& path);
    /// Asks whether work that an earlier run left unsaved should be taken up again.
    void offerRecovery(Recovery& recovery);

  protected:
    void closeEvent(QCloseEvent* event) override;
    void dragEnterEvent(QDragEnterEvent* event) override;
    void dropEvent(QDropEvent* event) override;

  private:
    void makeActions();
    void showTitle();
    void showChart();
    void showRecentFiles();
    /// True if the present work may be replaced: it is saved, or the user chose to save or to drop it.
    bool mayReplace();
    bool save();
    bool saveAs();
    bool saveTo(const QString& path);
    void exportSheet();
    void printSheet();
    /// False, with a message and the cursor in the field, while a field is not valid or the set-up is not
    /// covered.
    bool readyForSheet();
    bool noInvalidField(const QString& what);
    /// The name chosen for a file to write, with its suffix; empty if none was. Asks before an existing file
    /// is replaced.
    QString askSavePath(const QString& title, const QString& filter, const QString& suffix,
                        const QString& suggested);
    void say(const QString& text);

    Session& session_;
    SetupPanel* setupPanel_;
    RouteView* route_;
    ChartWidget* chart_;
    MarginsView* margins_;
    TrailView* trail_;
    QSplitter* columns_;
    QSplitter* middle_;
    QSplitter* right_;
    QMenu* recent_ = nullptr;
};
