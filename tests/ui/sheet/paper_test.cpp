// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/paper.h"

#include <gtest/gtest.h>

#include <QPageSize>

namespace dampwright {
namespace {

TEST(Paper, FormatsAreThoseOfTheStandards) {
  for (const PaperSize size : {PaperSize::A4, PaperSize::Letter}) {
    const QSizeF known = QPageSize::size(pageSizeId(size), QPageSize::Millimeter);
    EXPECT_NEAR(paperFormat(size).size.width(), known.width(), 0.01);  // Qt rounds to 0.01 mm
    EXPECT_NEAR(paperFormat(size).size.height(), known.height(), 0.01);
  }
}

TEST(Paper, HeadBodyAndFootDoNotTouchAndStayOnThePaper) {
  for (const PaperSize size : {PaperSize::A4, PaperSize::Letter}) {
    const PaperFormat format = paperFormat(size);
    const QRectF sheet(QPointF(0, 0), format.size);
    // Printers leave up to 6.4 mm white.
    for (const QRectF& part : {format.head, format.body, format.foot}) {
      EXPECT_TRUE(sheet.adjusted(6.4, 6.4, -6.4, -6.4).contains(part));
    }
    EXPECT_LE(format.head.bottom(), format.body.top());
    EXPECT_LE(format.body.bottom(), format.foot.top());
  }
}

}  // namespace
}  // namespace dampwright
