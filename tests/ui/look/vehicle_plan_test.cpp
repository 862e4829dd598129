// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/vehicle_plan.h"

#include <gtest/gtest.h>

#include "tests/ui/look/drawing.h"

namespace dampwright {
namespace {

const QRectF area(16, 40, 236, 270);
const QSizeF card(104, 96);

class EachVehicle : public testing::TestWithParam<VehicleKind> {};

TEST_P(EachVehicle, HasAPlaceForEveryCornerInsideTheArea) {
  for (const QSizeF size : {card, QSizeF(500, 500), QSizeF(40, 20)}) {
    const auto places = vehiclePlaces(GetParam(), area, size);
    ASSERT_EQ(places.size(), cornersOf(GetParam()).size());
    for (std::size_t i = 0; i < places.size(); ++i) {
      EXPECT_EQ(places[i].corner, cornersOf(GetParam())[i]);
      EXPECT_TRUE(area.contains(places[i].card)) << places[i].corner;
      for (std::size_t j = i + 1; j < places.size(); ++j) {
        EXPECT_FALSE(places[i].card.intersects(places[j].card)) << places[j].corner;
      }
    }
  }
}

TEST_P(EachVehicle, IsDrawnInsideTheArea) {
  const QImage image = drawn({270, 330}, [](QPainter& painter) {
    paintVehicle(painter, GetParam(), area, card, printPalette());
  });
  EXPECT_TRUE(area.toAlignedRect().adjusted(-1, -1, 1, 1).contains(inkBounds(image)));
  EXPECT_GT(inkBounds(image).height(), 100);
}

INSTANTIATE_TEST_SUITE_P(OfAllKinds,
                         EachVehicle,
                         testing::Values(VehicleKind::Car,
                                         VehicleKind::Motorcycle,
                                         VehicleKind::SingleDamper));

TEST(VehiclePlan, FrontIsAboveRearAndLeftIsLeft) {
  const auto places = vehiclePlaces(VehicleKind::Car, area, card);
  EXPECT_LT(places[0].card.right(), places[1].card.left());
  EXPECT_LT(places[0].card.bottom(), places[2].card.top());
}

}  // namespace
}  // namespace dampwright
