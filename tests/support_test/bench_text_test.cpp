// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_text.h"

#include <gtest/gtest.h>

#include "core/base/units.h"

namespace dampwright::bench {
namespace {

Recording threeSamples() {
  Recording recording;
  recording.rate = 10;
  recording.time = {0, 0.1, 0.2};
  recording.displacement = {-0.0254, 0, 0.0127};
  recording.velocity = {0, 0.25, 0};
  recording.force = {-44.482216152605, 0.04, 1000};
  recording.temperature = {20, 20.06, 21};
  return recording;
}

TEST(BenchText, ColumnsCarryTheirNamesUnitsAndDecimals) {
  TextStyle style;
  style.preamble = {"bench,1"};
  style.columns = {{Channel::Time, "t (s)", "", 1, 1},
                   {Channel::Displacement, "x (in)", "", metresPerInch, 3},
                   {Channel::Force, "F (lbf)", "", newtonsPerPoundForce, 1}};
  EXPECT_EQ(writeText(threeSamples(), style),
            "bench,1\nt (s),x (in),F (lbf)\n0.0,-1.000,-10.0\n0.1,0.000,0.0\n0.2,0.500,224.8\n");
}

TEST(BenchText, DecimalCommaUnitRowLineEndAndSignAsAsked) {
  TextStyle style;
  style.columns = {{Channel::Time, "Zeit", "s", 1, 1},
                   {Channel::Force, "Kraft", "kN", -1000, 4},
                   {Channel::Temperature, "T", "\u00B0C", 1, 1}};
  style.delimiter = ';';
  style.decimalMark = ',';
  style.lineEnd = "\r\n";
  style.unitRow = UnitRow::Present;
  style.encoding = Encoding::Windows1252;
  EXPECT_EQ(writeText(threeSamples(), style),
            "Zeit;Kraft;T\r\ns;kN;\xB0"
            "C\r\n0,0;0,0445;20,0\r\n0,1;-0,0000;20,1\r\n"
            "0,2;-1,0000;21,0\r\n");
}

TEST(BenchText, EncodingsOfOneLetter) {
  EXPECT_EQ(encoded("\u00FC", Encoding::Utf8), "\xC3\xBC");
  EXPECT_EQ(encoded("\u00FC", Encoding::Utf8WithBom), "\xEF\xBB\xBF\xC3\xBC");
  EXPECT_EQ(encoded("\u00FC", Encoding::Windows1252), "\xFC");
  EXPECT_EQ(encoded("\u00FC\u30AB", Encoding::Utf16LeWithBom),
            std::string("\xFF\xFE\xFC\0\xAB\x30", 6));
}

TEST(BenchText, APartStartsItsClockAgain) {
  const Recording part = partOf(threeSamples(), 0.05, 0.25);
  ASSERT_EQ(part.size(), 2u);
  EXPECT_EQ(part.time.front(), 0);
  EXPECT_EQ(part.force.back(), 1000);
  EXPECT_EQ(partOf(threeSamples(), 0, 1, 2).size(), 2u);
  EXPECT_EQ(partOf(threeSamples(), 0, 1, 2).rate, 5);
}

}  // namespace
}  // namespace dampwright::bench
