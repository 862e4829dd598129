// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/corner_panel.h"

#include <gtest/gtest.h>

#include <QLabel>
#include <QPushButton>
#include <QSignalSpy>
#include <QTest>

#include "tests/ui/clipped.h"
#include "tests/ui/drag.h"
#include "ui/corners/corner_place.h"
#include "ui/corners/phase_card.h"
#include "ui/corners/vehicle_view.h"
#include "ui/text/names.h"

namespace dampwright {
namespace {

CornersView madeView(VehicleKind kind) {
  CornersView view;
  view.kind = kind;
  int serial = 1107;
  for (const std::string& corner : cornersOf(kind)) {
    CornerView place;
    place.corner = corner;
    place.name = cornerName(corner);
    place.serial = QStringLiteral("DA-%1").arg(serial++);
    place.verdict = VerdictWord::Pass;
    place.phases.push_back(
        {"As found", "7 speeds · 31 °C", {"run_a.csv"}, VerdictWord::Pass, false, false, false});
    view.corners.push_back(place);
  }
  view.corners.front().selected = view.corners.front().phases.front().selected = true;
  view.selected = {QString::fromStdString(view.corners.front().corner), 0};
  return view;
}

class CornerPanelTest : public testing::Test {
 protected:
  void SetUp() override {
    view = madeView(VehicleKind::Car);
    panel.setView(view);
    panel.resize(268, 780);
    panel.show();
    ASSERT_TRUE(QTest::qWaitForWindowExposed(&panel));
  }
  CornersView view;
  CornerPanel panel;
};

TEST_F(CornerPanelTest, EveryCornerOfTheVehicleHasItsPlace) {
  for (const VehicleKind kind :
       {VehicleKind::Car, VehicleKind::Motorcycle, VehicleKind::SingleDamper}) {
    panel.setView(madeView(kind));
    for (const std::string& corner : cornersOf(kind)) {
      CornerPlace* place = panel.vehicle()->place(QString::fromStdString(corner));
      ASSERT_NE(place, nullptr) << corner;
      EXPECT_TRUE(place->isVisible());
      EXPECT_TRUE(panel.vehicle()->rect().contains(place->geometry())) << corner;
      EXPECT_TRUE(place->accessibleName().contains("DA-11"));
      EXPECT_TRUE(place->accessibleName().contains("Pass"));
    }
  }
}

TEST_F(CornerPanelTest, FilesLightUpTheirCornerAndSayWhatWillHappen) {
  QSignalSpy dropped(&panel, &CornerPanel::filesDropped);
  CornerPlace* rearLeft = panel.vehicle()->place("rear left");
  made::Drag drag({"/rig/a.csv", "/rig/b.csv"});
  EXPECT_TRUE(drag.enter(rearLeft));
  EXPECT_EQ(rearLeft->promise(), "Add 2 files to Rear left");
  const QImage lit = rearLeft->grab().toImage();
  drag.leave(rearLeft);
  EXPECT_TRUE(rearLeft->promise().isEmpty());
  EXPECT_NE(rearLeft->grab().toImage(), lit);
  drag.enter(rearLeft);
  EXPECT_TRUE(drag.drop(rearLeft));
  ASSERT_EQ(dropped.count(), 1);
  EXPECT_EQ(dropped[0][0].toStringList(), (QStringList{"/rig/a.csv", "/rig/b.csv"}));
  EXPECT_EQ(dropped[0][1].toString(), "rear left");
  EXPECT_TRUE(rearLeft->promise().isEmpty());
}

TEST_F(CornerPanelTest, TextDraggedInIsNotAFile) {
  QMimeData data;
  data.setText("front left");
  QDragEnterEvent event({5, 5}, Qt::CopyAction, &data, Qt::LeftButton, Qt::NoModifier);
  QApplication::sendEvent(panel.vehicle()->place("rear left"), &event);
  EXPECT_FALSE(event.isAccepted());
}

TEST_F(CornerPanelTest, AClickOrTheKeyboardSelectsACorner) {
  QSignalSpy picked(&panel, &CornerPanel::selectWanted);
  QTest::mouseClick(panel.vehicle()->place("front right"), Qt::LeftButton);
  ASSERT_EQ(picked.count(), 1);
  EXPECT_EQ(picked[0][0].value<PhaseKey>(), (PhaseKey{"front right", 0}));
  CornerPlace* rearLeft = panel.vehicle()->place("rear left");
  rearLeft->setFocus();
  QTest::keyClick(rearLeft, Qt::Key_Space);
  ASSERT_EQ(picked.count(), 2);
  EXPECT_EQ(picked[1][0].value<PhaseKey>(), (PhaseKey{"rear left", 0}));
}

TEST_F(CornerPanelTest, TheSelectedCornerIsTheOnlyOneMarked) {
  const auto marked = [&] {
    QStringList names;
    for (const CornerView& corner : view.corners) {
      const QString key = QString::fromStdString(corner.corner);
      if (panel.vehicle()->place(key)->isChecked()) names << key;
    }
    return names;
  };
  EXPECT_EQ(marked(), QStringList("front left"));
  view.corners[0].selected = false;
  view.corners[2].selected = true;
  panel.setView(view);
  EXPECT_EQ(marked(), QStringList("rear left"));
}

TEST_F(CornerPanelTest, TheSelectedDampersPhasesAreListed) {
  view.corners[0].phases.push_back({"After work, rebound 8 clicks",
                                    "7 speeds · 33 °C",
                                    {"run_b.csv", "run_c.csv"},
                                    VerdictWord::Fail,
                                    false,
                                    false,
                                    false});
  panel.setView(view);
  QList<PhaseCard*> cards = panel.findChildren<PhaseCard*>();
  ASSERT_EQ(cards.size(), 2);
  EXPECT_TRUE(cards[0]->isChecked());
  EXPECT_FALSE(cards[1]->isChecked());
  EXPECT_TRUE(cards[1]->accessibleName().contains("Fail"));
  QSignalSpy picked(&panel, &CornerPanel::selectWanted);
  QTest::mouseClick(cards[1], Qt::LeftButton, {}, {40, 24});
  ASSERT_EQ(picked.count(), 1);
  EXPECT_EQ(picked[0][0].value<PhaseKey>().phase, 1);
}

TEST_F(CornerPanelTest, LongNamesAreElidedAndStandWholeInTheTooltip) {
  const QString serial = "A very long serial number of a remote reservoir damper 000123456789";
  view.corners[0].serial = serial;
  panel.setView(view);
  EXPECT_TRUE(panel.vehicle()->place("front left")->toolTip().contains(serial));
  EXPECT_TRUE(panel.selectedHeading().contains(serial));
  EXPECT_EQ(made::clippedTexts(&panel), QStringList());
}

TEST_F(CornerPanelTest, NothingIsClipped) {
  EXPECT_EQ(made::clippedTexts(&panel), QStringList());
  view.corners[1].phases.clear();
  view.corners[1].verdict.reset();
  view.corners[2].busy = true;
  view.corners[3].broken = true;
  panel.setView(view);
  EXPECT_EQ(made::clippedTexts(&panel), QStringList());
}

}  // namespace
}  // namespace dampwright
