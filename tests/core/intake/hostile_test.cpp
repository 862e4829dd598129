// SPDX-License-Identifier: GPL-3.0-or-later
// Ordinary and hostile ways to write one recording, by hand: what loggers, spreadsheets and people
// do to a file. Each must come back with the same numbers, and say what was done to get them.
#include <gtest/gtest.h>

#include "tests/core/intake/made_encoding.h"
#include "tests/core/intake/made_sample.h"

namespace dampwright {
namespace {

std::string replacedAll(std::string text, const std::string& from, const std::string& to) {
  for (std::size_t at = text.find(from); at != text.npos; at = text.find(from, at + to.size())) {
    text.replace(at, from.size(), to);
  }
  return text;
}

using Writer = std::string (*)(const Sample& sample, int row);

// "1234.5" with marks for thousands: "1" + mark + "234" + decimal + "5".
std::string grouped(double value, int decimals, const std::string& mark, char decimal) {
  std::string text = inForm(std::abs(value), decimals, decimal);
  for (std::size_t at = text.find(decimal); at > 3; at -= 3) text.insert(at - 3, mark);
  return (value < 0 ? "-" : "") + text;
}

std::string plain(const Sample& s, const std::string& between = ";", char decimal = '.') {
  return inForm(s.time, 4, decimal) + between + inForm(s.displacement, 4, decimal) + between +
         inForm(s.force, 2, decimal);
}

// Force in thousandths of a newton, so that it needs marks for thousands.
std::string withMarks(const Sample& s,
                      const std::string& mark,
                      char decimal,
                      const std::string& quote = "") {
  return inForm(s.time, 4, decimal) + ";" + inForm(s.displacement, 4, decimal) + ";" + quote +
         grouped(s.force, 2, mark, decimal) + quote;
}

struct Hostile {
  const char* name;
  const char* head;
  Writer row;
  const char* foot = "";
  const char* remark = "";  ///< that must be there
  const char* lineEnd = "\n";
};

std::ostream& operator<<(std::ostream& out, const Hostile& file) { return out << file.name; }

std::string fileOf(const Hostile& file) {
  std::string text = file.head;
  for (int i = 0; i < madeRows; ++i) text += file.row(sampleAt(i), i) + file.lineEnd;
  return text + file.foot;
}

class HostileFiles : public testing::TestWithParam<Hostile> {};

TEST_P(HostileFiles, GiveTheSameRecording) {
  const auto reading = readMade(fileOf(GetParam()));
  EXPECT_EQ(faultOf(reading), "") << fileOf(GetParam()).substr(0, 300);
  if (!reading || GetParam().remark[0] == '\0') return;
  EXPECT_TRUE(says(reading.value().remarks, GetParam().remark)) << GetParam().remark;
}

constexpr const char* head = "Time (s);Travel (mm);Load (N)\n";

INSTANTIATE_TEST_SUITE_P(
    Numbers,
    HostileFiles,
    testing::Values(
        Hostile{
            "ThousandsComma", head, [](const Sample& s, int) { return withMarks(s, ",", '.'); }},
        Hostile{
            "ThousandsPoint", head, [](const Sample& s, int) { return withMarks(s, ".", ','); }},
        Hostile{
            "ThousandsBlank", head, [](const Sample& s, int) { return withMarks(s, " ", ','); }},
        Hostile{"ThousandsNoBreak",
                head,
                [](const Sample& s, int) { return withMarks(s, "\xC2\xA0", ','); }},
        Hostile{"ThousandsNarrow",
                head,
                [](const Sample& s, int) { return withMarks(s, "\xE2\x80\xAF", ','); }},
        Hostile{"ThousandsApostrophe",
                head,
                [](const Sample& s, int) { return withMarks(s, "'", '.'); }},
        Hostile{"ThousandsCurly",
                head,
                [](const Sample& s, int) { return withMarks(s, "\xE2\x80\x99", '.'); }},
        Hostile{"ThousandsQuoted",
                "Time (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return withMarks(s, ",", '.', "\""); }},
        Hostile{"ThousandsQuotedCommas",
                "Time (s),Travel (mm),Load (N)\n",
                [](const Sample& s, int) {
                  return inForm(s.time, 4, '.') + "," + inForm(s.displacement, 4, '.') + ",\"" +
                         grouped(s.force, 2, ",", '.') + "\"";
                }},
        Hostile{"QuotedDecimalCommas",
                "Time (s),Travel (mm),Load (N)\n",
                [](const Sample& s, int) { return "\"" + plain(s, "\",\"", ',') + "\""; }},
        Hostile{"PerColumnMarks",
                head,
                [](const Sample& s, int) {
                  return inForm(s.time, 4, ',') + ";" + inForm(s.displacement, 4, '.') + ";" +
                         inForm(s.force, 2, ',');
                }},
        Hostile{"PlusSigns",
                head,
                [](const Sample& s, int) {
                  return inForm(s.time, 4, '.') + ";" + (s.displacement < 0 ? "" : "+") +
                         inForm(s.displacement, 4, '.') + ";" + (s.force < 0 ? "" : "+") +
                         inForm(s.force, 2, '.');
                }},
        Hostile{"MinusSign2212",
                head,
                [](const Sample& s, int) {
                  return inForm(s.time, 4, '.') + ";" + (s.displacement < 0 ? "\xE2\x88\x92" : "") +
                         inForm(std::abs(s.displacement), 4, '.') + ";" + inForm(s.force, 2, '.');
                }},
        Hostile{"TrailingUnits",
                "Time;Travel;Load\n",
                [](const Sample& s, int) {
                  return inForm(s.time, 4, '.') + " s;" + inForm(s.displacement, 4, '.') + " mm;" +
                         inForm(s.force, 2, '.') + "N";
                }},
        Hostile{"TrailingUnitsCommas",
                "Zeit;Weg;Kraft\n",
                [](const Sample& s, int) {
                  return inForm(s.time, 4, ',') + "s;" + inForm(s.displacement, 4, ',') + "mm;" +
                         inForm(s.force / 1000, 5, ',') + " kN";
                }},
        Hostile{"Exponents",
                head,
                [](const Sample& s, int) {
                  char text[90];
                  std::snprintf(
                      text, sizeof text, "%.6e;%.6E;%.6e", s.time, s.displacement, s.force);
                  return std::string(text);
                }},
        Hostile{"ExponentsD",
                head,
                [](const Sample& s, int) {
                  char text[90];
                  std::snprintf(
                      text, sizeof text, "%.6E;%.6E;%.6E", s.time, s.displacement, s.force);
                  return replacedAll(text, "E", "D");
                }},
        Hostile{
            "LeadingZeros",
            head,
            [](const Sample& s, int) {
              char text[90];
              std::snprintf(
                  text, sizeof text, "%010.4f;%+010.4f;%010.2f", s.time, s.displacement, s.force);
              return std::string(text);
            }},
        Hostile{"BarePoints",
                head,
                [](const Sample& s, int) {
                  return replacedAll(";" + plain(s), ";0.", ";.").substr(1);
                }},
        Hostile{"UnitsInMetres",
                "Time (s);Travel (m);Load (kN)\n",
                [](const Sample& s, int) {
                  return inForm(s.time, 4, '.') + ";" + inForm(s.displacement / 1000, 7, '.') +
                         ";" + inForm(s.force / 1000, 5, '.');
                }}),
    [](const auto& file) { return std::string(file.param.name); });

INSTANTIATE_TEST_SUITE_P(
    Rows,
    HostileFiles,
    testing::Values(
        Hostile{"TrailingDelimiters",
                "Time (s);Travel (mm);Load (N);\n",
                [](const Sample& s, int) { return plain(s) + ";"; }},
        Hostile{"LeadingDelimiter",
                ";Time (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return ";" + plain(s); }},
        Hostile{"EmptyColumnBetween",
                "Time (s);;Travel (mm);Load (N)\n",
                [](const Sample& s, int) {
                  return inForm(s.time, 4, '.') + ";;" + inForm(s.displacement, 4, '.') + ";" +
                         inForm(s.force, 2, '.');
                }},
        Hostile{"SepLine",
                "sep=;\nTime (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return plain(s, ";", ','); }},
        Hostile{"AllQuoted",
                "\"Time (s)\";\"Travel (mm)\";\"Load (N)\"\n",
                [](const Sample& s, int) { return "\"" + plain(s, "\";\"") + "\""; }},
        Hostile{"DoubleSpaced", head, [](const Sample& s, int) { return plain(s) + "\n"; }},
        Hostile{"BlanksAndTabs",
                "Time (s) \t Travel (mm) \t Load (N)\n",
                [](const Sample& s, int) { return plain(s, " \t "); }},
        Hostile{"CommaAndBlanks",
                "Time (s),   Travel (mm),   Load (N)\n",
                [](const Sample& s, int) { return plain(s, ",   "); }},
        Hostile{"CommentColumn",
                "Time (s);Travel (mm);Load (N);Comment\n",
                [](const Sample& s, int i) {
                  return plain(s) + (i == 100 ? ";valve ok; 2 more" : ";");
                }},
        Hostile{"SectionLines",
                head,
                [](const Sample& s, int i) {
                  return (i % 80 == 79 ? "Step " + std::to_string(i / 80 + 2) + "\n" : "") +
                         plain(s);
                },
                "",
                "section-lines"},
        Hostile{"SectionCells",
                head,
                [](const Sample& s, int i) {
                  return (i % 80 == 79 ? "Speed;100;mm/s\n" : "") + plain(s);
                },
                "",
                "section-lines"},
        Hostile{"HeaderAgain",
                head,
                [](const Sample& s, int i) {
                  return (i % 80 == 79 ? std::string("\nTime (s);Travel (mm);Load (N)\n") : "") +
                         plain(s);
                },
                "",
                "section-lines"},
        Hostile{"CommentsInside",
                head,
                [](const Sample& s, int i) {
                  return (i % 80 == 79 ? std::string("# warm\n") : "") + plain(s);
                },
                "",
                "section-lines"},
        Hostile{"Footer",
                head,
                [](const Sample& s, int) { return plain(s); },
                "\nMax;24.99;1100\nEnd of file",
                "trailing-text"},
        Hostile{"ControlZ",
                head,
                [](const Sample& s, int) { return plain(s); },
                "\x1A",
                "trailing-text"},
        Hostile{"CutShort",
                head,
                [](const Sample& s, int) { return plain(s); },
                "1.2000;-3.1",
                "truncated-last-row"},
        Hostile{"CutShortInNumber",
                head,
                [](const Sample& s, int) { return plain(s); },
                "1.2000;-3.1234;12.",
                "truncated-last-row"},
        Hostile{"LinesEndInAll",
                head,
                [](const Sample& s, int i) { return plain(s) + (i % 2 == 0 ? "\r" : ""); }},
        Hostile{"ReturnsInTheHead",
                "Bench 3\rSerial: 12\rTime (s);Travel (mm);Load (N)\r",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"ReturnsThenOneLineEnd",
                "Time (s);Travel (mm);Load (N)\r",
                [](const Sample& s, int) { return plain(s); },
                "\n",
                "",
                "\r"}),
    [](const auto& file) { return std::string(file.param.name); });

INSTANTIATE_TEST_SUITE_P(
    Heads,
    HostileFiles,
    testing::Values(
        Hostile{"ForceFirst",
                "Load (N);Travel (mm);Time (s)\n",
                [](const Sample& s, int) {
                  return inForm(s.force, 2, '.') + ";" + inForm(s.displacement, 4, '.') + ";" +
                         inForm(s.time, 4, '.');
                }},
        Hostile{"MoreChannels",
                "Time (s);Pressure (bar);Travel (mm);Cell (V);Load (N);Gas temp (degC)\n",
                [](const Sample& s, int i) {
                  return inForm(s.time, 4, '.') + ";12." + std::to_string(i % 7) + ";" +
                         inForm(s.displacement, 4, '.') + ";0.5;" + inForm(s.force, 2, '.') +
                         ";25.0";
                }},
        Hostile{"CommandToo",
                "Time (s);Travel command (mm);Travel (mm);Load (N)\n",
                [](const Sample& s, int) {
                  return inForm(s.time, 4, '.') + ";" + inForm(1.1 * s.displacement, 4, '.') + ";" +
                         inForm(s.displacement, 4, '.') + ";" + inForm(s.force, 2, '.');
                }},
        Hostile{"ThreeHeaderRows",
                "Channel 1;Channel 2;Channel 3\nTime;Travel;Load\n[s];[mm];[N]\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"UnitsAboveNames",
                "s;mm;N\nTime;Travel;Load\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"UnitLine",
                "Bench;3\nUnit;s;mm;N\nTime;Travel;Load\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"GroupNames",
                ";Damper;\nTime (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"BlankLineBelowHeader",
                "Time (s);Travel (mm);Load (N)\n\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"UnderlinedHeader",
                "Time (s)  Travel (mm)  Load (N)\n--------  -----------  --------\n",
                [](const Sample& s, int) { return plain(s, "  "); }},
        Hostile{"LongPreamble",
                "Bench;3\nOperator;N. "
                "N.\nDate;04.03.2031;12:00:01\nCell;5000;N\nSpeeds;0.1;0.2;0.3\nRemark;first run; "
                "cold\n\nTime (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"KeyEqualsPreamble",
                "[Header]\nBench = 3\nRate = fast\n[Data]\nTime (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"NamesInQuotes",
                "\"Time, elapsed (s)\",\"Travel, \"\"damper\"\" (mm)\",\"Load (N)\"\n",
                [](const Sample& s, int) { return plain(s, ","); }},
        Hostile{"DottedNames",
                "Time.s.;Travel..mm.;Load.N\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"ShortHeader",
                "Time (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return plain(s) + ";"; }},
        Hostile{"TwoMarks",
                "\xEF\xBB\xBF\xEF\xBB\xBFTime (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return plain(s); }},
        Hostile{"DegreeTwiceEncoded",
                "Time (s);Travel (mm);Load (N);Oil (\xC3\x82\xC2\xB0"
                "C)\n",
                [](const Sample& s, int) { return plain(s) + ";25.0"; }},
        Hostile{"Percent",
                "% Time (s);Travel (mm);Load (N)\n",
                [](const Sample& s, int) { return plain(s); }}),
    [](const auto& file) { return std::string(file.param.name); });

TEST(HostileCells, WhatIsNoNumberIsCountedAndItsRowStaysInPlace) {
  for (const char* cell : {"NaN",
                           "inf",
                           "-inf",
                           "-",
                           "",
                           "n/a",
                           "N/A",
                           "1.#QNAN",
                           "#DIV/0!",
                           "ERR",
                           "over",
                           "1.2.3"}) {
    std::string text = head;
    for (int i = 0; i < madeRows; ++i) {
      const Sample s = sampleAt(i);
      text += inForm(s.time, 4, '.') + ";" + inForm(s.displacement, 4, '.') + ";" +
              (i == 99 ? cell : inForm(s.force, 2, '.')) + "\n";
    }
    const auto reading = readMade(text);
    ASSERT_TRUE(reading.value().trace.has_value()) << cell;
    EXPECT_TRUE(std::isnan(reading.value().trace->force[99])) << cell;
    EXPECT_EQ(reading.value().trace->force.size(), static_cast<std::size_t>(madeRows));
    const Remark* missing = remarkOf(reading.value().remarks, "missing-values");
    const Remark* unreadable = remarkOf(reading.value().remarks, "unreadable-cells");
    ASSERT_TRUE(missing != nullptr || unreadable != nullptr) << cell;
    EXPECT_EQ((missing != nullptr ? missing : unreadable)->firstRow, 101) << cell;
  }
}

TEST(HostileCells, NumbersOfAnotherUnitInAColumnAreNotRead) {
  std::string text = "Time;Travel;Load\n";
  for (int i = 0; i < madeRows; ++i) {
    const Sample s = sampleAt(i);
    text += inForm(s.time, 4, '.') + "s;" + inForm(s.displacement, 4, '.') +
            (i == 50 ? "cm;" : "mm;") + inForm(s.force, 2, '.') + "N\n";
  }
  const auto reading = readMade(text);
  ASSERT_TRUE(reading.value().trace.has_value());
  EXPECT_TRUE(std::isnan(reading.value().trace->displacement[50]));
  EXPECT_TRUE(says(reading.value().remarks, "unreadable-cells"));
}

}  // namespace
}  // namespace dampwright
