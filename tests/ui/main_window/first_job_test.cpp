// SPDX-License-Identifier: GPL-3.0-or-later
// The morning at the bench as far as it goes: files dropped on corners, limits chosen, verdicts
// read, the program closed and opened again. The verdicts are those that sample_runs/README.md
// promises; the samples come from a simulator that shares nothing with the analysis.
#include "tests/ui/main_window/made_window.h"
#include "ui/corners/corner_panel.h"
#include "ui/corners/corner_place.h"
#include "ui/corners/vehicle_view.h"
#include "ui/main_window/job_page.h"
#include "ui/plots/loop_plot.h"
#include "ui/plots/loops_view.h"
#include "ui/plots/run_plot.h"

namespace dampwright {
namespace {

class FirstJobTest : public made::WindowTest {
 protected:
  CornerPlace* place(const char* corner) {
    return window->jobPage()->corners()->vehicle()->place(QString::fromLatin1(corner));
  }
  void dropOn(QWidget* target, const QStringList& files) {
    made::Drag drag(files);
    ASSERT_TRUE(drag.enter(target));
    ASSERT_TRUE(drag.drop(target));
    waitForWork();
  }
  void dropAllFour() {
    startCar();
    for (const char* rig :
         {"rig_bench_1.json", "rig_bench_2.json", "rig_bench_3.json", "rig_bench_4.json"})
      dropOn(window.get(), {made::sample(rig)});
    dropOn(place("front left"), {made::sample("car_front_left.csv")});
    dropOn(place("front right"), {made::sample("car_front_right.csv")});
    dropOn(place("rear left"), {made::sample("car_rear_left.csv")});
    dropOn(place("rear right"), {made::sample("car_rear_right.csv")});
    dropOn(window.get(), {made::sample("limits_car.json")});
  }
  QString spoken(const char* corner) { return place(corner)->accessibleName(); }
};

TEST_F(FirstJobTest, FourFilesOnFourCornersGetTheVerdictsThatTheSamplesPromise) {
  dropAllFour();
  EXPECT_TRUE(spoken("front left").endsWith("Pass")) << spoken("front left").toStdString();
  EXPECT_TRUE(spoken("front right").endsWith("Pass")) << spoken("front right").toStdString();
  EXPECT_TRUE(spoken("rear left").endsWith("Fail")) << spoken("rear left").toStdString();
  EXPECT_TRUE(spoken("rear right").endsWith("Fail")) << spoken("rear right").toStdString();
  QTest::mouseClick(place("rear left"), Qt::LeftButton);
  QTest::qWait(200);
  EXPECT_FALSE(window->jobPage()->loops()->forceVelocity()->figure().empty());
  EXPECT_FALSE(window->jobPage()->loops()->run()->figure().empty());
  EXPECT_TRUE(everythingSaid().contains("checks"));
  shoot("first_job");
}

TEST_F(FirstJobTest, WhatWasDroppedIsThereAfterARestart) {
  dropAllFour();
  open();
  waitForWork();
  ASSERT_TRUE(session->hasJob());
  EXPECT_EQ(session->job().customer, "Saltmarsh Motor Club");
  EXPECT_TRUE(spoken("rear right").endsWith("Fail")) << spoken("rear right").toStdString();
}

TEST_F(FirstJobTest, ADropIsUndoneAndDoneAgain) {
  startCar();
  dropOn(window.get(), {made::sample("rig_bench_1.json")});
  dropOn(place("front left"), {made::sample("car_front_left.csv")});
  ASSERT_FALSE(spoken("front left").contains("no run")) << spoken("front left").toStdString();
  QTest::keyClick(window.get(), Qt::Key_Z, Qt::ControlModifier);
  waitForWork();
  EXPECT_TRUE(spoken("front left").contains("no run")) << spoken("front left").toStdString();
  QTest::keyClick(window.get(), Qt::Key_Z, Qt::ControlModifier | Qt::ShiftModifier);
  waitForWork();
  EXPECT_FALSE(spoken("front left").contains("no run")) << spoken("front left").toStdString();
}

TEST_F(FirstJobTest, ACycleIsStruckOutAndPutBack) {
  startCar();
  dropOn(window.get(), {made::sample("rig_bench_1.json")});
  dropOn(place("front left"), {made::sample("car_front_left.csv")});
  RunPlot* run = window->jobPage()->loops()->run();
  ASSERT_FALSE(run->figure().cycles.empty());
  const std::size_t last = run->figure().cycles.size() - 1;
  ASSERT_FALSE(run->figure().cycles[last].struckOut);
  run->chooseCycle(last);
  QTest::keyClick(run->focusProxy(), Qt::Key_Delete);
  waitForWork();
  EXPECT_TRUE(run->figure().cycles[last].struckOut);
  QTest::keyClick(run->focusProxy(), Qt::Key_Delete);
  waitForWork();
  EXPECT_FALSE(run->figure().cycles[last].struckOut);
}

TEST_F(FirstJobTest, AWrongFileSaysWhyInPlaceAndNothingIsLost) {
  startCar();
  dropOn(window.get(), {made::sample("rig_bench_1.json")});
  dropOn(place("front left"), {made::sample("car_front_left.csv")});
  QFile picture(folder.filePath("holiday.png"));
  ASSERT_TRUE(picture.open(QIODevice::WriteOnly));
  picture.write("\x89PNG\r\n\x1a\n and so on");
  picture.close();
  dropOn(place("rear left"), {picture.fileName()});
  EXPECT_TRUE(everythingSaid().contains("holiday.png")) << everythingSaid().toStdString();
  EXPECT_FALSE(spoken("front left").contains("no run"));
  shoot("wrong_file");
}

}  // namespace
}  // namespace dampwright
