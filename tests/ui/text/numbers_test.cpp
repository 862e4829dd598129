// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/numbers.h"

#include <gtest/gtest.h>

#include <QLocale>
#include <cmath>
#include <limits>
#include <string>
#include <vector>

namespace dampwright {
namespace {

std::string plain(QString text) {
  return text.replace(QChar(0x00A0), QLatin1Char('_')).toStdString();  // "_" is the unbroken space
}

class Numbers : public testing::Test {
 protected:
  void SetUp() override { QLocale::setDefault(QLocale::c()); }
  void TearDown() override { QLocale::setDefault(QLocale::c()); }
};

struct Row {
  double si;
  Quantity quantity;
  const char* expected;
};

TEST_F(Numbers, AQuantityHasTheDigitsThatAWorkshopReads) {
  const std::vector<Row> rows = {
      {964.27, Quantity::Force, "964.3_N"},
      {1448.3, Quantity::Force, "1448_N"},
      {12345.6, Quantity::Force, "12346_N"},
      {0.04, Quantity::Force, "0_N"},
      {-12.34, Quantity::Force, "−12.3_N"},
      {0.3, Quantity::Velocity, "300_mm/s"},
      {1.0472, Quantity::Velocity, "1047_mm/s"},
      {0.05236, Quantity::Velocity, "52.4_mm/s"},
      {0.05, Quantity::Length, "50_mm"},
      {0.00184, Quantity::Length, "1.84_mm"},
      {31.4, Quantity::Temperature, "31_°C"},
      {123.370, Quantity::Energy, "123.4_J"},
      {2000.4, Quantity::Damping, "2000_N·s/m"},
      {1.5e6, Quantity::Stiffness, "1500_N/mm"},
      {0.10433, Quantity::Angle, "6°"},
      {2.0, Quantity::Percent, "2_%"},
      {7, Quantity::Count, "7"},
      {0.5, Quantity::None, "0.5"},
  };
  for (const Row& row : rows) EXPECT_EQ(plain(quantityText(row.si, row.quantity)), row.expected);
}

TEST_F(Numbers, WhatIsNoNumberReadsAsADash) {
  EXPECT_EQ(quantityText(std::nan(""), Quantity::Force), QStringLiteral("–"));
  EXPECT_EQ(exactText(std::numeric_limits<double>::infinity(), Quantity::Force),
            QStringLiteral("–"));
  EXPECT_EQ(numberText(-std::numeric_limits<double>::infinity(), 2), QStringLiteral("–"));
}

TEST_F(Numbers, ARoundedNegativeZeroHasNoSign) {
  EXPECT_EQ(numberText(-0.04, 1), QStringLiteral("0.0"));
  EXPECT_EQ(numberText(-0.06, 1), QStringLiteral("−0.1"));
}

TEST_F(Numbers, TheScreenFollowsItsLocale) {
  QLocale::setDefault(QLocale(QLocale::German, QLocale::Germany));
  EXPECT_EQ(plain(measuredText(1964.04, 9.13, Quantity::Force)), "1964,0_±_9,1_N");
  EXPECT_EQ(plain(quantityText(0.00184, Quantity::Length)), "1,84_mm");
  EXPECT_EQ(plain(exactText(0.3, Quantity::Velocity)), "300_mm/s");
}

// JCGM 100:2008 (GUM) 7.2.6: two significant digits of the uncertainty at most, the value to the
// same place.
TEST_F(Numbers, UncertaintyHasTwoDigitsAndTheValueEndsWithIt) {
  const auto force = [](double y, double u) { return plain(measuredText(y, u, Quantity::Force)); };
  EXPECT_EQ(force(964.04, 9.13), "964.0_±_9.1_N");
  EXPECT_EQ(force(1448.26, 12.4), "1448_±_12_N");
  EXPECT_EQ(force(1448.26, 9.96), "1448_±_10_N");  // rounds up to two digits, not "10.0"
  EXPECT_EQ(force(150.261, 0.0347), "150.261_±_0.035_N");
  EXPECT_EQ(force(1448.26, 124), "1448_±_124_N");  // no zeros in place of known digits
  EXPECT_EQ(force(1448.26, 0), "1448.3_N");
  // GUM 7.2.2, example of reporting: 100.02147 g with U = 0.79 mg (k = 2.26).
  EXPECT_EQ(plain(measuredText(100.02147e-3, 0.00079e-3, Quantity::Length)),
            "100.02147_±_0.00079_mm");
}

TEST_F(Numbers, LimitsReadAsTheyWereTyped) {
  EXPECT_EQ(plain(rangeText(870, 1120, Quantity::Force)), "870–1120_N");
  EXPECT_EQ(plain(rangeText(164.5, 305.5, Quantity::Force)), "164.5–305.5_N");
  EXPECT_EQ(plain(rangeText(1150 * 0.9, 1150 * 1.1, Quantity::Force)), "1035–1265_N");
  EXPECT_EQ(plain(rangeText({}, 45, Quantity::Force)), "≤_45_N");
  EXPECT_EQ(plain(rangeText(120, {}, Quantity::Force)), "≥_120_N");
  EXPECT_EQ(plain(rangeText({}, {}, Quantity::Force)), "");
  EXPECT_EQ(plain(rangeText(-5, 5, Quantity::Force)), "−5–5_N");
}

TEST_F(Numbers, NumberAndUnitNeverBreakApart) {
  for (const QString& text : {measuredText(964, 9.1, Quantity::Force),
                              quantityText(0.3, Quantity::Velocity),
                              rangeText({}, 45, Quantity::Force)}) {
    EXPECT_FALSE(text.contains(QLatin1Char(' '))) << text.toStdString();
  }
}

TEST_F(Numbers, ShownUnitsGoBackToSi) {
  for (const Quantity quantity : {Quantity::Length,
                                  Quantity::Velocity,
                                  Quantity::Force,
                                  Quantity::Stiffness,
                                  Quantity::Angle}) {
    // one multiplication and one division: within two units in the last place
    EXPECT_NEAR(siFromShown(shownFromSi(0.262, quantity), quantity), 0.262, 2 * 5.6e-17);
  }
}

}  // namespace
}  // namespace dampwright
