// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/action_icon.h"

#include <gtest/gtest.h>

#include <set>

#include "tests/ui/look/drawing.h"

namespace dampwright {
namespace {

TEST(ActionIcons, EachIsDrawnAndUnlikeTheOthers) {
  needApplication();
  std::vector<QImage> seen;
  for (int i = 0; i <= static_cast<int>(ActionIcon::Handbook); ++i) {
    const QIcon icon = actionIcon(static_cast<ActionIcon>(i), lightPalette());
    const QImage image = icon.pixmap(24, 24).toImage();
    int drawnPixels = 0;
    for (int y = 0; y < 24; ++y) {
      for (int x = 0; x < 24; ++x) drawnPixels += qAlpha(image.pixel(x, y)) > 100 ? 1 : 0;
    }
    EXPECT_GT(drawnPixels, 25) << i;
    for (const QImage& other : seen) EXPECT_NE(image, other) << i;
    seen.push_back(image);
  }
}

}  // namespace
}  // namespace dampwright
