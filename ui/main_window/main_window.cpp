// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/main_window.h"

#include <QCloseEvent>
#include <QDragEnterEvent>
#include <QLabel>
#include <QMenuBar>
#include <QMessageBox>
#include <QScreen>
#include <QSettings>
#include <QStackedWidget>
#include <QVBoxLayout>

#include "ui/corners/corner_panel.h"
#include "ui/corners/damper_dialog.h"
#include "ui/corners/dropped_files.h"
#include "ui/corners/vehicle_view.h"
#include "ui/look/palette.h"
#include "ui/main_window/about.h"
#include "ui/main_window/actions.h"
#include "ui/main_window/choose_files.h"
#include "ui/main_window/columns_desk.h"
#include "ui/main_window/job_page.h"
#include "ui/main_window/rig_offers.h"
#include "ui/main_window/session_sheet.h"
#include "ui/main_window/theme.h"
#include "ui/main_window/top_bar.h"
#include "ui/plots/loop_plot.h"
#include "ui/plots/loops_view.h"
#include "ui/plots/run_plot.h"
#include "ui/rig_folder/offer_bar.h"
#include "ui/sheet/sheet_preview.h"
#include "ui/start/job_dialog.h"
#include "ui/start/safety_dialog.h"
#include "ui/start/start_page.h"
#include "ui/text/names.h"
#include "ui/text/sentences.h"
#include "ui/verdict/verdict_panel.h"

namespace dampwright {

namespace {

const QString geometryKey = QStringLiteral("window/geometry");
const QString safetyKey = QStringLiteral("window/cautionsRead");
const QString technicianKey = QStringLiteral("job/technician");

}  // namespace

MainWindow::MainWindow(Session& session, QWidget* parent)
    : QMainWindow(parent),
      session_(session),
      actions_(new Actions(this)),
      top_(new TopBar(session, *actions_)),
      trouble_(new QLabel),
      promise_(new QLabel(this)),
      pages_(new QStackedWidget),
      startPage_(new StartPage),
      jobPage_(new JobPage(session)),
      columns_(new ColumnsDesk(session, this)),
      offers_(new RigOffers(
          session, [this](const QStringList& files) { takeFiles(files, {}); }, this)) {
  build();
  connectActions();
  connectEditActions();
  connectSession();
  refresh();
  restoreGeometry(QSettings().value(geometryKey).toByteArray());
}

MainWindow::~MainWindow() = default;

void MainWindow::build() {
  actions_->fill(*menuBar());
  actions_->setColours(paletteFor(palette()));
  trouble_->setObjectName(QStringLiteral("trouble"));
  trouble_->setWordWrap(true);
  trouble_->hide();
  promise_->setObjectName(QStringLiteral("promise"));
  promise_->hide();
  pages_->addWidget(new QWidget);  // until the book is read nobody knows what stands here
  pages_->addWidget(startPage_);
  pages_->addWidget(jobPage_);
  auto* middle = new QWidget;
  auto* column = new QVBoxLayout(middle);
  column->setContentsMargins(0, 0, 0, 0);
  column->setSpacing(0);
  column->addWidget(top_);
  column->addWidget(trouble_);
  column->addWidget(offers_->bar());
  column->addWidget(pages_, 1);
  setCentralWidget(middle);
  setAcceptDrops(true);
  // As large as was drawn for, but never larger than the screen less a window's frame.
  const QSize frame(16, 40);
  resize(QSize(1440, 900).boundedTo(screen()->availableSize() - frame));
}

void MainWindow::on(ActionId id, const std::function<void()>& does) {
  connect((*actions_)[id], &QAction::triggered, this, does);
}

void MainWindow::connectActions() {
  const auto onJobPage = [this](ActionId id, const std::function<void()>& does) {
    on(id, [this, does] {
      showJobPage();
      does();
    });
  };
  on(ActionId::NewJob, [this] { startNewJob({}); });
  on(ActionId::StartPage, [this] { showStartPage(); });
  on(ActionId::Demonstration, [this] { session_.openDemonstration(); });
  on(ActionId::AddRuns, [this] { takeFiles(chooseRunFiles(this), {}); });
  on(ActionId::RigFolder, [this] { offers_->choose(this); });
  onJobPage(ActionId::Limits, [this] { jobPage_->verdict()->openLimits(); });
  on(ActionId::PrintSheet, [this] { showSheet(); });
  on(ActionId::Quit, [this] { close(); });
  on(ActionId::FitPlots, [this] { jobPage_->loops()->fit(); });
  onJobPage(ActionId::GoToCorners, [this] { jobPage_->corners()->vehicle()->takeFocus(); });
  onJobPage(ActionId::GoToLoops, [this] { jobPage_->loops()->forceVelocity()->setFocus(); });
  onJobPage(ActionId::GoToVerdict, [this] { jobPage_->verdict()->takeFocus(); });
  on(ActionId::Safety, [this] { SafetyDialog(this).exec(); });
  on(ActionId::About, [this] { showAbout(this); });
  QAction* dark = (*actions_)[ActionId::Dark];
  dark->setChecked(keptTheme() == Theme::Dark);
  connect(dark, &QAction::toggled, this, [](bool on) {
    const Theme theme = on ? Theme::Dark : Theme::Light;
    keepTheme(theme);
    applyTheme(theme);
  });
  connect(startPage_, &StartPage::newJobWanted, this, [this] { startNewJob({}); });
  connect(startPage_, &StartPage::demonstrationWanted, &session_, &Session::openDemonstration);
  connect(startPage_, &StartPage::openWanted, &session_, &Session::openJob);
}

void MainWindow::connectEditActions() {
  QUndoStack* undo = session_.undoStack();
  on(ActionId::Undo, [undo] { undo->undo(); });
  on(ActionId::Redo, [undo] { undo->redo(); });
  on(ActionId::JobDetails, [this] { editJob(); });
  on(ActionId::Damper, [this] { editDamper(session_.selected().corner); });
  on(ActionId::Columns, [this] { columns_->openSelected(); });
  connect(jobPage_, &JobPage::columnsWanted, columns_, &ColumnsDesk::open);
  on(ActionId::StrikeOut, [this] { jobPage_->loops()->run()->switchChosenCycle(); });
  connect(undo, &QUndoStack::indexChanged, this, &MainWindow::refresh);
  connect(jobPage_->loops()->run(), &RunPlot::chosenCycleChanged, this, &MainWindow::refresh);
  connect(jobPage_, &JobPage::addRunsWanted, this, [this](const QString& corner) {
    takeFiles(chooseRunFiles(this), corner);
  });
  connect(jobPage_, &JobPage::damperWanted, this, &MainWindow::editDamper);
  connect(jobPage_, &JobPage::limitsFileWanted, this, [this] {
    takeFiles(chooseLimitSheets(this), {});
  });
  connect(jobPage_, &JobPage::sheetWanted, this, &MainWindow::showSheet);
}

void MainWindow::connectSession() {
  connect(&session_, &Session::jobChanged, this, [this] {
    refresh();
    if (session_.hasJob()) showJobPage();
  });
  connect(&session_, &Session::selectionChanged, this, &MainWindow::refresh);
  connect(&session_, &Session::stateChanged, this, &MainWindow::refresh);
  connect(&session_, &Session::recentJobsChanged, this, &MainWindow::refresh);
  connect(&session_, &Session::bookRead, this, [this] {
    refresh();
    if (!session_.hasJob()) showStartPage();
  });
  connect(&session_, &Session::bookTrouble, this, [this](const QString& sentence) {
    trouble_->setText(sentence);
    trouble_->setVisible(!sentence.isEmpty());
  });
}

void MainWindow::refresh() {
  const bool hasJob = session_.hasJob();
  top_->setJob(hasJob ? &session_.job() : nullptr);
  startPage_->setRecentJobs(session_.recentJobs());
  const Actions& does = *actions_;
  for (const ActionId id :
       {ActionId::JobDetails, ActionId::GoToCorners, ActionId::GoToLoops, ActionId::GoToVerdict})
    does[id]->setEnabled(hasJob);
  does[ActionId::Limits]->setEnabled(hasJob);
  does[ActionId::Damper]->setEnabled(hasJob && !session_.selected().corner.isEmpty());
  does[ActionId::Columns]->setEnabled(columns_->canOpenSelected());
  does[ActionId::PrintSheet]->setEnabled(hasJob && isPrintable(session_.job()));
  does[ActionId::Undo]->setEnabled(session_.undoStack()->canUndo());
  does[ActionId::Redo]->setEnabled(session_.undoStack()->canRedo());
  const auto cycle = jobPage_->loops()->run()->chosenCycle();
  does[ActionId::StrikeOut]->setEnabled(hasJob && cycle.has_value());
  does[ActionId::StrikeOut]->setText(cycle && cycle->struckOut
                                         ? tr("&Put the chosen cycle back")
                                         : tr("&Strike the chosen cycle out"));
  const QString number = hasJob ? QString::fromStdString(session_.job().number) : QString();
  setWindowTitle(number.isEmpty() ? QStringLiteral("Dampwright")
                                  : tr("Job %1 – Dampwright").arg(number));
}

void MainWindow::showStartPage() {
  pages_->setCurrentWidget(startPage_);
  startPage_->takeFocus();
}

void MainWindow::showJobPage() {
  if (pages_->currentWidget() == jobPage_) return;
  pages_->setCurrentWidget(jobPage_);
  jobPage_->corners()->vehicle()->takeFocus();
}

void MainWindow::showSafetyOnce() {
  if (QSettings().value(safetyKey).toBool()) return;
  auto* dialog = new SafetyDialog(this);
  dialog->setAttribute(Qt::WA_DeleteOnClose);
  connect(dialog, &QDialog::accepted, dialog, [] { QSettings().setValue(safetyKey, true); });
  dialog->open();
}

void MainWindow::startNewJob(const QStringList& filesToAdd) {
  Job draft;
  draft.technician = QSettings().value(technicianKey).toString().toStdString();
  JobDialog dialog(JobDialog::Use::NewJob, draft, this);
  if (dialog.exec() != QDialog::Accepted) return;
  QSettings().setValue(technicianKey, QString::fromStdString(dialog.job().technician));
  session_.startJob(dialog.job());
  if (!filesToAdd.isEmpty()) session_.dropFiles(filesToAdd, {});
}

void MainWindow::openFiles(const QStringList& files) { takeFiles(files, {}); }

void MainWindow::takeFiles(const QStringList& files, const QString& corner) {
  if (files.isEmpty()) return;
  keepFolderOf(files.front());
  if (session_.hasJob()) {
    session_.dropFiles(files, corner);
    showJobPage();
  } else {
    startNewJob(files);
  }
}

void MainWindow::editJob() {
  if (!session_.hasJob()) return;
  JobDialog dialog(JobDialog::Use::Details, session_.job(), this);
  if (dialog.exec() == QDialog::Accepted) session_.setJobDetails(dialog.job());
}

void MainWindow::editDamper(const QString& corner) {
  if (!session_.hasJob() || corner.isEmpty()) return;
  DamperCard card;
  for (const JobItem& item : session_.job().items) {
    if (item.corner == corner.toStdString()) card = item.damper;
  }
  DamperDialog dialog(cornerName(corner.toStdString()), card, this);
  if (dialog.exec() == QDialog::Accepted) session_.setDamper(corner, dialog.card());
}

void MainWindow::showSheet() {
  if (!session_.hasJob()) return;
  const auto content = sheetOf(session_);
  if (content) {
    SheetPreview(content.value(), this).exec();
  } else {
    QMessageBox::warning(this, tr("No sheet"), sentenceText(content.error()));
  }
}

void MainWindow::changeEvent(QEvent* event) {
  QMainWindow::changeEvent(event);
  if (event->type() == QEvent::PaletteChange) actions_->setColours(paletteFor(palette()));
}

void MainWindow::closeEvent(QCloseEvent* event) {
  if (session_.hasUnwritten()) {
    const auto answer = QMessageBox::question(
        this,
        tr("The job book cannot be written"),
        tr("What was typed or dropped in since then is only in this window and will be lost. "
           "Close all the same?"),
        QMessageBox::Close | QMessageBox::Cancel,
        QMessageBox::Cancel);
    if (answer != QMessageBox::Close) return event->ignore();
  }
  QSettings().setValue(geometryKey, saveGeometry());
  QMainWindow::closeEvent(event);
}

void MainWindow::dragEnterEvent(QDragEnterEvent* event) {
  const QStringList files = droppedFiles(event->mimeData());
  if (files.isEmpty()) return;
  event->acceptProposedAction();
  promise_->setText(tr("%1. Names and metadata suggest the corner.").arg(dropPromise(files, {})));
  promise_->adjustSize();
  promise_->move((width() - promise_->width()) / 2, height() - promise_->height() - 32);
  promise_->raise();
  promise_->show();
}

void MainWindow::dragLeaveEvent(QDragLeaveEvent*) { promise_->hide(); }

void MainWindow::dropEvent(QDropEvent* event) {
  promise_->hide();
  const QStringList files = droppedFiles(event->mimeData());
  if (files.isEmpty()) return;
  event->acceptProposedAction();
  takeFiles(files, {});
}

}  // namespace dampwright
