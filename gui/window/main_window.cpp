#include "window/main_window.h"

#include <QAction>
#include <QActionGroup>
#include <QCloseEvent>
#include <QFileDialog>
#include <QFileInfo>
#include <QLocale>
#include <QMenuBar>
#include <QMessageBox>
#include <QMimeData>
#include <QPrintPreviewDialog>
#include <QPrinter>
#include <QPushButton>
#include <QScreen>
#include <QSplitter>
#include <QStatusBar>
#include <QVBoxLayout>

#include "charts/chart_widget.h"
#include "charts/distance_chart.h"
#include "documents/result.h"
#include "margins_view/margins_view.h"
#include "quantities/input_error.h"
#include "route_view/route_view.h"
#include "session/files.h"
#include "session/preferences.h"
#include "session/recovery.h"
#include "session/session.h"
#include "setup_panel/setup_panel.h"
#include "sheet/sheet_writer.h"
#include "trail_view/trail_view.h"
#include "window/cautions_bar.h"
#include "window/verdict_bar.h"

using dosimetry::InputError;

namespace {

QString assessmentFilter() {
    return MainWindow::tr("Assessments (*.toml);;All files (*)");
}

}  // namespace

MainWindow::MainWindow(Session& session, QWidget* parent)
    : QMainWindow(parent),
      session_(session),
      setupPanel_(new SetupPanel(session)),
      route_(new RouteView(session)),
      chart_(new ChartWidget),
      margins_(new MarginsView(session)),
      trail_(new TrailView),
      columns_(new QSplitter(Qt::Horizontal)),
      middle_(new QSplitter(Qt::Vertical)),
      right_(new QSplitter(Qt::Vertical)) {
    middle_->addWidget(route_);
    middle_->addWidget(chart_);
    middle_->setStretchFactor(0, 5);
    middle_->setStretchFactor(1, 4);
    right_->addWidget(margins_);
    right_->addWidget(trail_);
    right_->setStretchFactor(0, 5);
    right_->setStretchFactor(1, 4);
    columns_->addWidget(setupPanel_);
    columns_->addWidget(middle_);
    columns_->addWidget(right_);
    columns_->setStretchFactor(0, 0);
    columns_->setStretchFactor(1, 3);
    columns_->setStretchFactor(2, 2);
    for (QSplitter* splitter : {columns_, middle_, right_}) splitter->setChildrenCollapsible(false);

    auto* content = new QWidget;
    auto* layout = new QVBoxLayout(content);
    layout->setContentsMargins(6, 4, 6, 4);
    layout->setSpacing(4);
    auto* verdict = new VerdictBar(session);
    layout->addWidget(verdict);
    layout->addWidget(columns_, 1);
    layout->addWidget(new CautionsBar(session));
    setCentralWidget(content);
    setAcceptDrops(true);

    connect(margins_, &MarginsView::trailChosen, trail_, &TrailView::showTrail);
    connect(&session, &Session::setupChanged, this, &MainWindow::showChart);
    connect(&session, &Session::currentPositionChanged, this, &MainWindow::showChart);
    connect(&session, &Session::validityChanged, this,
            [this] { trail_->setEnabled(!session_.hasInvalidField()); });
    connect(&session, &Session::fileChanged, this, &MainWindow::showTitle);
    connect(&session, &Session::validityChanged, this, &MainWindow::showTitle);
    connect(verdict, &VerdictBar::sheetWanted, this, &MainWindow::exportSheet);
    makeActions();
    showTitle();
    showChart();
    margins_->announceTrail();

    const QSize usual(1320, 860);
    resize(screen() ? usual.boundedTo(screen()->availableSize() * 0.96) : usual);
    columns_->setSizes({320, 540, 460});
    right_->setSizes({400, 360});
    restoreGeometry(preferences::windowGeometry());
    columns_->restoreState(preferences::splitterState("columns"));
    middle_->restoreState(preferences::splitterState("middle"));
    right_->restoreState(preferences::splitterState("right"));
}

void MainWindow::makeActions() {
    const auto add = [this](QMenu* menu, const QString& text, const QKeySequence& keys, auto slot) {
        QAction* action = menu->addAction(text);
        action->setShortcut(keys);
        connect(action, &QAction::triggered, this, slot);
        return action;
    };
    QMenu* file = menuBar()->addMenu(tr("&File"));
    add(file, tr("&New from the example"), QKeySequence::New, [this] {
        if (mayReplace()) session_.startNew();
    });
    add(file, tr("&Open …"), QKeySequence::Open, [this] {
        const QString path =
            QFileDialog::getOpenFileName(this, tr("Open an assessment"), {}, assessmentFilter());
        if (!path.isEmpty()) openFile(path);
    });
    recent_ = file->addMenu(tr("Open &recent"));
    connect(recent_, &QMenu::aboutToShow, this, &MainWindow::showRecentFiles);
    file->addSeparator();
    add(file, tr("&Save"), QKeySequence::Save, [this] { save(); });
    add(file, tr("Save &as …"), QKeySequence(Qt::CTRL | Qt::SHIFT | Qt::Key_S), [this] { saveAs(); });
    file->addSeparator();
    add(file, tr("Sheet as &PDF …"), QKeySequence(Qt::CTRL | Qt::Key_E), [this] { exportSheet(); });
    add(file, tr("Prin&t the sheet …"), QKeySequence::Print, [this] { printSheet(); });
    QMenu* paper = file->addMenu(tr("Paper of the sheet"));
    auto* papers = new QActionGroup(this);
    for (const QString& name : {QStringLiteral("A4"), QStringLiteral("Letter")}) {
        QAction* action = paper->addAction(name);
        action->setCheckable(true);
        action->setChecked(preferences::paper() == name);
        papers->addAction(action);
        connect(action, &QAction::triggered, this, [name] { preferences::setPaper(name); });
    }
    file->addSeparator();
    add(file, tr("&Quit"), QKeySequence::Quit, [this] { close(); });

    QMenu* edit = menuBar()->addMenu(tr("&Edit"));
    QAction* undo = session_.undoStack()->createUndoAction(this, tr("Undo"));
    undo->setShortcut(QKeySequence::Undo);
    QAction* redo = session_.undoStack()->createRedoAction(this, tr("Redo"));
    redo->setShortcut(QKeySequence::Redo);
    edit->addAction(undo);
    edit->addAction(redo);

    QMenu* help = menuBar()->addMenu(tr("&Help"));
    add(help, tr("&About"), {}, [this] {
        QMessageBox::about(
            this, tr("Photon Margin"),
            tr("<b>%1</b><p>Laser and LED photon-dose safety calculator. It supports a competent person and "
               "does not replace one.</p><p>Free software under the GNU General Public License, version 3 or "
               "later, without any warranty.</p>")
                .arg(QString::fromStdString(dosimetry::program_name())));
    });
}

void MainWindow::showTitle() {
    const QString name = session_.path().isEmpty() ? tr("Example") : QFileInfo(session_.path()).fileName();
    setWindowTitle(name + "[*] – " + tr("Photon Margin"));
    setWindowModified(session_.isModified());
}

void MainWindow::showChart() {
    chart_->show(distanceChart(session_.setup(), session_.currentPosition(), route_->model()));
}

void MainWindow::showRecentFiles() {
    recent_->clear();
    for (const QString& path : preferences::recentFiles())
        connect(recent_->addAction(QString(path).replace("&", "&&")), &QAction::triggered, this,
                [this, path] { openFile(path); });
    if (recent_->isEmpty()) recent_->addAction(tr("none yet"))->setEnabled(false);
}

void MainWindow::openFile(const QString& path) {
    const QString full = QFileInfo(path).absoluteFilePath();
    try {
        const dosimetry::Setup setup = setupFrom(readSetupFile(full), full);
        if (!mayReplace()) return;
        session_.adopt(setup, full);
        preferences::addRecentFile(full);
    } catch (const InputError& error) {
        say(QString::fromUtf8(error.what()));
    }
}

void MainWindow::offerRecovery(Recovery& recovery) {
    while (const auto leftover = recovery.findLeftover()) {
        const QString what = leftover->path.isEmpty() ? tr("an assessment without a file") : leftover->path;
        QMessageBox box(QMessageBox::Question, tr("Unsaved work found"),
                        tr("The program ended on %1 without saving its changes of %2. Take them up again?")
                            .arg(QLocale().toString(leftover->time, QLocale::ShortFormat), what),
                        QMessageBox::NoButton, this);
        box.setTextFormat(Qt::PlainText);
        QPushButton* takeUp = box.addButton(tr("Take up again"), QMessageBox::AcceptRole);
        QPushButton* discard = box.addButton(tr("Discard"), QMessageBox::DestructiveRole);
        QPushButton* later = box.addButton(tr("Ask again later"), QMessageBox::RejectRole);
        box.setEscapeButton(later);
        box.setDefaultButton(takeUp);
        box.exec();
        if (box.clickedButton() == takeUp) {
            session_.recover(leftover->setup, leftover->path);
            recovery.update();  // the new copy stands before the old one goes
        }
        if (box.clickedButton() == takeUp || box.clickedButton() == discard) recovery.discard(*leftover);
        if (box.clickedButton() != discard) break;
    }
    for (const QString& copy : recovery.unreadable())
        say(tr("A copy of unsaved work cannot be read and was kept: %1").arg(copy));
}

bool MainWindow::mayReplace() {
    if (!session_.isModified()) return true;
    const auto answer = QMessageBox::question(
        this, tr("Unsaved changes"), tr("The assessment has changes that are not saved. Save them?"),
        QMessageBox::Save | QMessageBox::Discard | QMessageBox::Cancel, QMessageBox::Save);
    if (answer == QMessageBox::Save) return save();
    return answer == QMessageBox::Discard;
}

bool MainWindow::noInvalidField(const QString& what) {
    if (!session_.hasInvalidField()) return true;
    const QString key = session_.firstInvalidField();
    say(tr("%1: a field is not valid. %2").arg(what, session_.invalidReason(key)));
    setupPanel_->focusField(key);
    return false;
}

bool MainWindow::save() {
    return session_.path().isEmpty() ? saveAs() : saveTo(session_.path());
}

bool MainWindow::saveAs() {
    if (!noInvalidField(tr("Not saved"))) return false;
    const QString path = askSavePath(tr("Save the assessment"), assessmentFilter(), "toml", session_.path());
    return !path.isEmpty() && saveTo(path);
}

bool MainWindow::saveTo(const QString& path) {
    if (!noInvalidField(tr("Not saved"))) return false;
    try {
        session_.save(path);
        preferences::addRecentFile(QFileInfo(path).absoluteFilePath());
        return true;
    } catch (const InputError& error) {
        say(QString::fromUtf8(error.what()));
        return false;
    }
}

bool MainWindow::readyForSheet() {
    if (!noInvalidField(tr("No sheet"))) return false;
    if (session_.assessment().covered()) return true;
    say(tr("No sheet: %1.").arg(QString::fromStdString(session_.assessment().uncovered.front().reason)));
    return false;
}

void MainWindow::exportSheet() {
    if (!readyForSheet()) return;
    QString suggested = session_.path().isEmpty()
                            ? QString()
                            : QFileInfo(session_.path()).path() + "/" +
                                  QFileInfo(session_.path()).completeBaseName() + ".pdf";
    const QString path = askSavePath(tr("Sheet as PDF"), tr("PDF (*.pdf)"), "pdf", suggested);
    if (path.isEmpty()) return;
    if (QFileInfo(path) == QFileInfo(session_.path())) {
        say(tr("The sheet would replace the assessment file. Choose another name."));
        return;
    }
    try {
        writeSheetPdf(path, session_.setup(), session_.assessment(), session_.fileBytes(),
                      paperSize(preferences::paper()));
        statusBar()->showMessage(tr("Sheet written: %1").arg(path), 8000);
    } catch (const InputError& error) {
        say(QString::fromUtf8(error.what()));
    }
}

QString MainWindow::askSavePath(const QString& title, const QString& filter, const QString& suffix,
                                const QString& suggested) {
    QFileDialog dialog(this, title, suggested, filter);
    dialog.setAcceptMode(QFileDialog::AcceptSave);
    dialog.setDefaultSuffix(
        suffix);  // so that the question about an existing file is asked for the full name
    if (!suggested.isEmpty()) dialog.selectFile(suggested);
    if (dialog.exec() != QDialog::Accepted || dialog.selectedFiles().isEmpty()) return {};
    const QString path = dialog.selectedFiles().first();
    // the dialog takes "laser v1.5" for a name with a suffix
    if (QFileInfo(path).suffix().compare(suffix, Qt::CaseInsensitive) == 0) return path;
    const QString full = path + "." + suffix;
    if (!QFileInfo::exists(full)) return full;
    const auto answer = QMessageBox::question(this, title, tr("%1 exists already. Replace it?").arg(full));
    return answer == QMessageBox::Yes ? full : QString();
}

void MainWindow::printSheet() {
    if (!readyForSheet()) return;
    QPrinter printer(QPrinter::HighResolution);
    printer.setPageSize(paperSize(preferences::paper()));
    printer.setDocName(QString::fromStdString(session_.setup().title));
    QPrintPreviewDialog preview(&printer, this);
    connect(&preview, &QPrintPreviewDialog::paintRequested, this, [this](QPrinter* device) {
        paintSheet(*device, session_.setup(), session_.assessment(), session_.fileBytes());
    });
    preview.exec();
}

void MainWindow::say(const QString& text) {
    QMessageBox box(QMessageBox::Warning, tr("Photon Margin"), text, QMessageBox::Ok, this);
    box.setTextFormat(Qt::PlainText);
    box.setObjectName("message");
    box.exec();
}

void MainWindow::closeEvent(QCloseEvent* event) {
    if (!mayReplace()) {
        event->ignore();
        return;
    }
    preferences::setWindowGeometry(saveGeometry());
    preferences::setSplitterState("columns", columns_->saveState());
    preferences::setSplitterState("middle", middle_->saveState());
    preferences::setSplitterState("right", right_->saveState());
    event->accept();
}

void MainWindow::dragEnterEvent(QDragEnterEvent* event) {
    if (event->mimeData()->hasUrls()) event->acceptProposedAction();
}

void MainWindow::dropEvent(QDropEvent* event) {
    const QList<QUrl> urls = event->mimeData()->urls();
    if (!urls.isEmpty() && urls.first().isLocalFile()) openFile(urls.first().toLocalFile());
}
