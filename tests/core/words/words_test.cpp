// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/words/words.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>

namespace dampwright {
namespace {

TEST(Words, NumbersWearTheWorkshopsUnitAndAPoint) {
  EXPECT_EQ(englishQuantity(0.0254, Quantity::Length), "25.4 mm");
  EXPECT_EQ(englishQuantity(-0.262, Quantity::Velocity), "-262 mm/s");
  EXPECT_EQ(englishQuantity(1234.56, Quantity::Force), "1234.6 N");
  EXPECT_EQ(englishQuantity(23, Quantity::Temperature), "23 °C");
  EXPECT_EQ(englishQuantity(1600, Quantity::Damping), "1600 N·s/m");
  EXPECT_EQ(englishQuantity(25000, Quantity::Stiffness), "25 N/mm");
  EXPECT_EQ(englishQuantity(0.000123456, Quantity::Time), "0.00012346 s");
  EXPECT_EQ(englishQuantity(3e7, Quantity::Count), "30000000");
  EXPECT_EQ(englishQuantity(-0.0, Quantity::None), "0");
  EXPECT_EQ(englishQuantity(3.141592653589793, Quantity::Angle), "180°");
}

TEST(Words, ANumberThatIsNoneIsSaidSo) {
  EXPECT_EQ(englishQuantity(std::nan(""), Quantity::Force), "not a number N");
  EXPECT_EQ(englishQuantity(std::numeric_limits<double>::infinity(), Quantity::Count),
            "not a number");
}

TEST(Words, AnErrorIsOneLineWithCodePlaceTextAndHint) {
  const Error error{"file-empty", {}, {"a.csv", 0, 0}};
  EXPECT_EQ(
      englishLine(error),
      "file-empty: a.csv: The file is empty. Record the run again, or pick the file that holds "
      "it.");
}

TEST(Words, ThePlaceNamesRowAndColumnWhereTheyAreKnown) {
  EXPECT_TRUE(englishLine({"stopped", {}, {"a.csv", 3, 2}})
                  .starts_with("stopped: a.csv, row 3, column 2: "));
  EXPECT_TRUE(englishLine({"stopped", {}, {}}).starts_with("stopped: The work"));
}

TEST(Words, NamedValuesAreFilledInAndLineBreaksInThemDoNoHarm) {
  const Error error{"run-file-missing", {{"sha256", "ab\ncd"}}, {}};
  EXPECT_NE(englishLine(error).find("checksum ab cd."), std::string::npos);
  EXPECT_NE(englishText("run-file-missing", {}).find("checksum ?."), std::string::npos);
}

TEST(Words, AnUnknownCodeIsShownAsItself) {
  EXPECT_EQ(findSentence("no-such-code"), nullptr);
  EXPECT_EQ(englishText("no-such-code", {}), "no-such-code");
}

}  // namespace
}  // namespace dampwright
