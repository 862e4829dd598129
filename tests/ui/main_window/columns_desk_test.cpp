// SPDX-License-Identifier: GPL-3.0-or-later
// The columns window and the rig folder in the whole window, as a technician meets them.
#include <QApplication>
#include <QComboBox>
#include <QFile>
#include <cmath>

#include "core/base/units.h"
#include "made_window.h"
#include "ui/columns/columns_window.h"
#include "ui/main_window/actions.h"
#include "ui/main_window/columns_desk.h"
#include "ui/main_window/rig_offers.h"
#include "ui/rig_folder/offer_bar.h"

namespace dampwright {
namespace {

constexpr int patience = 60'000;  // ms, only ever waited out by a failure

class ColumnsDesks : public made::WindowTest {
 protected:
  // A purely viscous damper with two force columns, `rows` long.
  QString twoForces(const QString& path, int rows) const {
    QByteArray text = "Time (s),Travel (mm),Load A (N),Load B (N)\n";
    for (int i = 0; i < rows; ++i) {
      const double time = i / 500.0;
      const double phase = 2 * pi * 1.6 * time;
      text += QByteArray::number(time, 'f', 4) + ',' +
              QByteArray::number(25 * std::sin(phase), 'f', 3) + ',' +
              QByteArray::number(500 * std::cos(phase), 'f', 1) + ',' +
              QByteArray::number(600 * std::cos(phase), 'f', 1) + '\n';
    }
    QFile file(path);
    EXPECT_TRUE(file.open(QIODevice::WriteOnly));
    file.write(text);
    return path;
  }
  ColumnsWindow* columns() {
    EXPECT_TRUE(QTest::qWaitFor(
        [&] { return window->columns().window() && !window->columns().window()->busy(); },
        patience));
    return window->columns().window();
  }
  static void choose(const ColumnsWindow* in, const QString& name, int row) {
    for (auto* box : in->findChildren<QComboBox*>()) {
      if (box->accessibleName() != name) continue;
      box->setCurrentIndex(row);
      emit box->activated(row);
    }
  }
  QPushButton* button(const QString& text) const {
    for (auto* one : window->findChildren<QPushButton*>()) {
      if (one->text() == text && one->isVisible()) return one;
    }
    return nullptr;
  }
};

TEST_F(ColumnsDesks, ANewLayoutIsAskedOnceTheRunIsMeasuredAndTheNextFileAsksNothing) {
  startCar();
  session->dropFiles({twoForces(folder.filePath("a.csv"), 4000)}, "front left");
  ColumnsWindow* asking = columns();
  ASSERT_NE(asking, nullptr);
  shoot("columns_asks");
  choose(asking, "Column of Force", 2);
  choose(asking, "Rising displacement is", 1);
  ASSERT_TRUE(QTest::qWaitFor([&] { return !asking->busy(); }, patience));
  QTest::keyClick(asking, Qt::Key_Return);
  waitForWork();
  EXPECT_TRUE(session->state({"front left", 0}).measured);
  session->dropFiles({twoForces(folder.filePath("b.csv"), 4500)}, "front right");
  waitForWork();
  QTest::qWait(100);
  EXPECT_EQ(window->columns().window(), nullptr);
  EXPECT_TRUE(session->state({"front right", 0}).measured);
}

TEST_F(ColumnsDesks, AClosedWindowLeavesTheRunListedWithItsQuestionAndAButton) {
  startCar();
  session->dropFiles({twoForces(folder.filePath("a.csv"), 4000)}, "front left");
  QTest::keyClick(columns(), Qt::Key_Escape);
  ASSERT_TRUE(QTest::qWaitFor([&] { return window->columns().window() == nullptr; }, patience));
  waitForWork();
  EXPECT_TRUE(everythingSaid().contains("Which column is the force?"))
      << everythingSaid().toStdString();
  ASSERT_NE(session->run({{"front left", 0}, 0}), nullptr);
  QPushButton* look = button(QString::fromUtf8("Look at the columns…"));
  ASSERT_NE(look, nullptr);
  QTest::mouseClick(look, Qt::LeftButton);
  ASSERT_NE(columns(), nullptr);
}

TEST_F(ColumnsDesks, TheMenuOpensTheColumnsOfAnyRun) {
  startCar();
  QAction* action = window->actions()[ActionId::Columns];
  EXPECT_FALSE(action->isEnabled());
  session->dropFiles({made::sample("rig_bench_1.json"), made::sample("car_front_left.csv")},
                     "front left");
  waitForWork();
  EXPECT_EQ(window->columns().window(), nullptr) << "a known rig asks nothing";
  ASSERT_TRUE(action->isEnabled());
  action->trigger();
  ColumnsWindow* open = columns();
  ASSERT_NE(open, nullptr);
  EXPECT_EQ(open->draft().base.name, "bench 1");
}

TEST_F(ColumnsDesks, AFileOfTheRigFolderIsOfferedAndTaken) {
  startCar();
  QDir(folder.path()).mkdir("rig");
  window->rigOffers().folder().watch(folder.filePath("rig"));
  ASSERT_TRUE(QTest::qWaitFor([] { return QSettings().contains("rigFolder/path"); }, patience));
  twoForces(folder.filePath("rig/front left.csv"), 4000);
  const OfferBar* bar = window->rigOffers().bar();
  ASSERT_TRUE(QTest::qWaitFor([&] { return bar->isVisible(); }, patience));
  QTest::mouseClick(button("Add to the job"), Qt::LeftButton);
  EXPECT_FALSE(bar->isVisible());
  ASSERT_NE(columns(), nullptr);
  ASSERT_NE(session->run({{"front left", 0}, 0}), nullptr);
  window->rigOffers().folder().watch({});
}

}  // namespace
}  // namespace dampwright
