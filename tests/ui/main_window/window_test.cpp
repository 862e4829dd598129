// SPDX-License-Identifier: GPL-3.0-or-later
#include <QAction>

#include "tests/ui/clipped.h"
#include "tests/ui/main_window/made_window.h"
#include "ui/corners/corner_panel.h"
#include "ui/corners/vehicle_view.h"
#include "ui/main_window/actions.h"
#include "ui/main_window/job_page.h"
#include "ui/main_window/work_status.h"
#include "ui/plots/loop_plot.h"
#include "ui/plots/loops_view.h"
#include "ui/plots/run_plot.h"
#include "ui/start/start_page.h"
#include "ui/verdict/checks_table.h"
#include "ui/verdict/verdict_panel.h"

namespace dampwright {
namespace {

using made::WindowTest;

class MainWindowTest : public WindowTest {
 protected:
  void openDemonstration() {
    session->openDemonstration();
    waitForWork();
    QTest::qWait(200);
  }
};

TEST_F(MainWindowTest, WithoutAJobTheStartPageIsShown) {
  EXPECT_TRUE(window->startPage()->isVisible());
  EXPECT_TRUE(window->startPage()->isAncestorOf(QApplication::focusWidget()));
  EXPECT_FALSE(window->actions()[ActionId::PrintSheet]->isEnabled());
  EXPECT_EQ(made::clippedTexts(window.get()), QStringList());
  shoot("start_first");
}

TEST_F(MainWindowTest, TheDemonstrationIsMarkedAsInvented) {
  openDemonstration();
  ASSERT_TRUE(session->hasJob());
  EXPECT_TRUE(window->jobPage()->isVisible());
  EXPECT_TRUE(everythingSaid().contains("invented"));
  EXPECT_TRUE(window->actions()[ActionId::PrintSheet]->isEnabled());
  shoot("demonstration");
}

TEST_F(MainWindowTest, NothingIsClippedAtAnySizeInBothThemes) {
  openDemonstration();
  for (const QSize size : {QSize(1366, 768), QSize(1440, 900), QSize(1920, 1080)}) {
    window->resize(size);
    QTest::qWait(100);
    EXPECT_EQ(window->size(), size);  // nothing forces it larger
    EXPECT_EQ(made::clippedTexts(window.get()), QStringList()) << size.width();
    window->jobPage()->loops()->showInstant(Instant{2, 0.25, std::nullopt});
    EXPECT_EQ(made::clippedTexts(window.get()), QStringList()) << size.width();
  }
  window->actions()[ActionId::Dark]->trigger();
  QTest::qWait(100);
  EXPECT_EQ(made::clippedTexts(window.get()), QStringList());
  shoot("demonstration_dark");
}

TEST_F(MainWindowTest, StampChecksAndSheetAreInViewOnASmallScreen) {
  openDemonstration();
  window->resize(1366, 768);
  QTest::qWait(100);
  shoot("demonstration_1366");
  const QRect view = window->rect();
  const auto inView = [&](const QWidget* part) {
    return part->isVisible() &&
           view.contains(QRect(part->mapTo(window.get(), QPoint()), part->size()));
  };
  EXPECT_TRUE(inView(window->jobPage()->verdict()->findChild<ChecksTable*>()));
  for (const QPushButton* button : window->findChildren<QPushButton*>()) {
    if (!button->text().startsWith("Print")) continue;
    EXPECT_TRUE(inView(button));
  }
}

TEST_F(MainWindowTest, FilesHeldOverTheWindowSayWhatWillHappen) {
  openDemonstration();
  made::Drag drag({"/rig/a.csv", "/rig/b.csv"});
  ASSERT_TRUE(drag.enter(window.get()));
  EXPECT_TRUE(everythingSaid().contains("Add 2 files"));
  drag.leave(window.get());
  EXPECT_FALSE(everythingSaid().contains("Add 2 files"));
}

TEST_F(MainWindowTest, TheKeyboardReachesEveryPart) {
  openDemonstration();
  QTest::keyClick(window.get(), Qt::Key_1, Qt::AltModifier);
  EXPECT_TRUE(window->jobPage()->corners()->isAncestorOf(QApplication::focusWidget()));
  QTest::keyClick(window.get(), Qt::Key_2, Qt::AltModifier);
  EXPECT_TRUE(window->jobPage()->loops()->isAncestorOf(QApplication::focusWidget()));
  QTest::keyClick(window.get(), Qt::Key_3, Qt::AltModifier);
  EXPECT_TRUE(window->jobPage()->verdict()->isAncestorOf(QApplication::focusWidget()));
}

TEST_F(MainWindowTest, FromTheRecentJobsOneGoesBackToTheJob) {
  openDemonstration();
  QTest::keyClick(window.get(), Qt::Key_J, Qt::ControlModifier);
  EXPECT_TRUE(window->startPage()->isVisible());
  QTest::keyClick(window.get(), Qt::Key_1, Qt::AltModifier);
  EXPECT_TRUE(window->jobPage()->isVisible());
}

TEST_F(MainWindowTest, TabWalksThroughEveryControlAndComesBack) {
  openDemonstration();
  window->jobPage()->corners()->vehicle()->takeFocus();
  QSet<QWidget*> reached;
  for (int i = 0; i < 60; ++i) {
    reached.insert(QApplication::focusWidget());
    QTest::keyClick(QApplication::focusWidget(), Qt::Key_Tab);
  }
  QStringList missed;
  for (QPushButton* button : window->findChildren<QPushButton*>()) {
    if (button->isVisible() && button->isEnabled() && !reached.contains(button))
      missed << button->text();
  }
  EXPECT_EQ(missed, QStringList());
  EXPECT_TRUE(reached.contains(window->jobPage()->loops()->forceVelocity()->focusProxy()));
}

TEST_F(MainWindowTest, EveryControlHasANameForScreenReaders) {
  openDemonstration();
  for (const QWidget* widget : window->findChildren<QWidget*>()) {
    if (!widget->isVisible() || widget->focusPolicy() == Qt::NoFocus) continue;
    if (widget->inherits("QScrollBar") || widget->inherits("QMenuBar")) continue;
    if (widget->inherits("QLabel")) continue;  // its text is its name
    QString name = widget->accessibleName();
    if (const auto* button = qobject_cast<const QAbstractButton*>(widget)) name += button->text();
    EXPECT_FALSE(name.isEmpty()) << widget->metaObject()->className() << ' '
                                 << widget->objectName().toStdString();
  }
}

TEST_F(MainWindowTest, LongNamesAreElidedAndStandWholeInTheTooltip) {
  openDemonstration();
  Job details = session->job();
  details.customer = std::string(300, 'x');
  session->setJobDetails(details);
  QTest::qWait(100);
  window->resize(1366, 768);
  QTest::qWait(100);
  EXPECT_EQ(window->width(), 1366);
  bool whole = false;
  for (const QLabel* label : window->findChildren<QLabel*>())
    whole = whole || label->toolTip().contains(QString(300, 'x'));
  EXPECT_TRUE(whole);
}

// While a damper is measured again, somebody may be reading its checks.
TEST_F(MainWindowTest, ProgressLeavesTheChecksAlone) {
  openDemonstration();
  auto* checks = window->jobPage()->verdict()->findChild<ChecksTable*>();
  checks->selectRow(5);
  QSignalSpy reset(checks->model(), &QAbstractItemModel::modelReset);
  QSignalSpy changed(checks->model(), &QAbstractItemModel::dataChanged);
  QSignalSpy stated(session.get(), &Session::stateChanged);
  emit session->progressChanged(session->selected());
  EXPECT_EQ(changed.count(), 0);
  const RunCycle last = window->jobPage()->loops()->run()->figure().cycles.back();
  session->strikeOut(session->selected(), static_cast<int>(last.run), last.span);
  waitForWork();
  EXPECT_GE(stated.count(), 2);
  EXPECT_EQ(reset.count(), 0);
  ASSERT_EQ(checks->selectionModel()->selectedRows().size(), 1);
  EXPECT_EQ(checks->selectionModel()->selectedRows()[0].row(), 5);
}

TEST_F(MainWindowTest, SeveralWrongFilesStayUntilDismissed) {
  openDemonstration();
  for (const char* name : {"one.csv", "two.csv"}) {
    QFile file(folder.filePath(name));
    ASSERT_TRUE(file.open(QIODevice::WriteOnly));
    file.close();
    session->dropFiles({file.fileName()}, "front left");
    waitForWork();
  }
  EXPECT_TRUE(everythingSaid().contains("one.csv"));
  EXPECT_TRUE(everythingSaid().contains("two.csv"));
  shoot("wrong_files");
  EXPECT_EQ(made::clippedTexts(window.get()), QStringList());
  for (QPushButton* button : window->findChildren<QPushButton*>()) {
    if (button->text() == "Dismiss all") QTest::mouseClick(button, Qt::LeftButton);
  }
  EXPECT_FALSE(everythingSaid().contains("one.csv"));
  EXPECT_FALSE(everythingSaid().contains("two.csv"));
}

TEST_F(MainWindowTest, WorkThatTakesLongerSaysSoAndIsStopped) {
  WorkStatus* status = window->findChild<WorkStatus*>();
  ASSERT_NE(status, nullptr);
  EXPECT_FALSE(status->isVisible());
  session->openDemonstration();
  for (int waited = 0; waited < 500 && session->busy() && !status->isVisible(); ++waited)
    QTest::qWait(10);
  if (status->isVisible()) {  // a fast machine is done before anybody's patience
    QPushButton* stop = status->findChild<QPushButton*>();
    EXPECT_EQ(stop->text(), "Stop");
    QTest::mouseClick(stop, Qt::LeftButton);
  }
  waitForWork();
  QTest::qWait(50);
  EXPECT_FALSE(status->isVisible());
}

TEST_F(MainWindowTest, TheThemeIsKept) {
  window->actions()[ActionId::Dark]->trigger();
  EXPECT_EQ(keptTheme(), Theme::Dark);
  QSettings().setValue("look/theme", "nonsense");
  EXPECT_EQ(keptTheme(), Theme::Light);
}

}  // namespace
}  // namespace dampwright
