// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/pagination.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

const QRectF body(10, 20, 100, 100);

SheetBlock block(double height) {
  return {height, [](QPainter&, const QRectF&) {}, false, {}, false};
}

SheetSection rows(int count, double height) {
  return SheetSection(static_cast<std::size_t>(count), block(height));
}

TEST(Pagination, ASectionThatFitsAPageIsNotParted) {
  const auto pages = paginate({rows(6, 10), rows(5, 10)}, body);
  ASSERT_EQ(pages.size(), 2u);
  EXPECT_EQ(pages[0].size(), 6u);
  EXPECT_EQ(pages[1].size(), 5u);
  EXPECT_DOUBLE_EQ(pages[1][0].box.top(), 20);
}

TEST(Pagination, ALongSectionIsPartedAndNothingIsLost) {
  const auto pages = paginate({rows(3, 10), rows(25, 10)}, body);
  std::size_t placed = 0;
  for (const SheetPage& page : pages) {
    for (const PlacedBlock& one : page) {
      EXPECT_LE(one.box.bottom(), body.bottom());
      ++placed;
    }
  }
  EXPECT_EQ(placed, 28u);
  EXPECT_EQ(pages.size(), 3u);
}

TEST(Pagination, TheHeadOfATableIsRepeatedOnItsNextPage) {
  SheetSection table = rows(25, 10);
  const auto head = std::make_shared<const SheetBlock>(block(7));
  for (SheetBlock& row : table) row.repeat = head;
  const auto pages = paginate({table}, body);
  ASSERT_EQ(pages.size(), 3u);
  EXPECT_DOUBLE_EQ(pages[1][0].box.height(), 7);
  EXPECT_DOUBLE_EQ(pages[1][1].box.height(), 10);
}

TEST(Pagination, WhatKeepsWithItsNextIsNeverTheLastOfAPage) {
  SheetSection section = rows(24, 10);
  section[9].keepWithNext = true;
  const auto pages = paginate({section}, body);
  EXPECT_EQ(pages[0].size(), 9u);
}

TEST(Pagination, SpaceAndSeparatorsAreDroppedAtTheTopOfAPage) {
  SheetBlock line = block(2);
  line.separates = true;
  SheetSection second = {line, space(5)};
  append(second, rows(5, 10));
  const auto pages = paginate({rows(9, 10), second}, body);
  ASSERT_EQ(pages.size(), 2u);
  EXPECT_EQ(pages[1].size(), 5u);
  EXPECT_DOUBLE_EQ(pages[1][0].box.top(), 20);
}

TEST(Pagination, ABlockHigherThanThePageStillEnds) {
  EXPECT_EQ(paginate({rows(2, 150)}, body).size(), 2u);
  EXPECT_EQ(paginate({}, body).size(), 1u);
}

}  // namespace
}  // namespace dampwright
