// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/read_run.h"

#include <gmock/gmock.h>

#include <algorithm>
#include <chrono>
#include <clocale>
#include <locale>
#include <sstream>

#include "core/base/sha256.h"
#include "tests/core/intake/made_text.h"

namespace dampwright {
namespace {

// The recording of madeRun, to the digits that its text has.
void expectMade(const RunReading& reading, double u = 1) {
  ASSERT_TRUE(reading.trace.has_value());
  const Trace& trace = *reading.trace;
  ASSERT_EQ(trace.time.size(), 400u);
  ASSERT_EQ(trace.displacement.size(), 400u);
  ASSERT_EQ(trace.force.size(), 400u);
  for (std::size_t i = 0; i < 400; ++i) {
    const double phase = 4 * pi * static_cast<double>(i) / madeRate;
    ASSERT_NEAR(trace.time[i], static_cast<double>(i) / madeRate, u * 5.1e-5) << i;
    ASSERT_NEAR(trace.displacement[i], madeStroke / 2 * std::sin(phase), u * 5.1e-7) << i;
    ASSERT_NEAR(trace.force[i], madeGas + madePeakForce * std::cos(phase), u * 5.1e-3) << i;
  }
}

TEST(ReadRun, EveryDialectGivesTheSameRecording) {
  const std::vector<MadeText> forms = {
      {},
      {.between = ", "},
      {.lineEnd = "\r\n"},
      {.head = "Time (s),Travel (mm),Load (N)\r", .lineEnd = "\r"},
      {.head = "Time (s),Travel (mm),Load (N)\r\r\n", .lineEnd = "\r\r\n"},
      {.head = "Zeit [s];Weg [mm];Kraft [N]\n", .between = ";", .decimal = ','},
      {.head = "Zeit;Weg;Kraft\ns;mm;N\n", .between = ";", .decimal = ','},
      {.head = "time_s\tposition_mm\tforce_N\n", .between = "\t"},
      {.head = "t / s\tx / mm\tF / N\n", .between = "\t", .decimal = ','},
      {.head = "Time, s|Travel, mm|Load, N\n", .between = "|"},
      {.head = "Time (s)  Travel (mm)  Load (N)\n", .between = "   "},
      {.head = "# bench 1\n# Time (s) Travel (mm) Load (N)\n", .between = " "},
      {.head = "\"Time (s)\",\"Travel, damper (mm)\",\"Load (N)\"\n"},
      {.head = "\xEF\xBB\xBFTime (s),Travel (mm),Load (N)\n"},
      {.head = "\xEF\xBB\xBF\"Time (s)\",\"Travel\n(mm)\",\"Load (N)\"\n"},
      {.head = "Bench: 1\nSerial = 12\n\nTime (s),Travel (mm),Load (N)\n",
       .foot = "\nEnd of run\n"},
      {.head = "Time (s),Travel (mm),Load (N),\n", .lineEnd = ",\n"},
      {.head = "Time (s),Travel (mm),Load (N),Note\n", .lineEnd = ",ok\n"},
  };
  for (const MadeText& form : forms) {
    SCOPED_TRACE(form.head + form.between);
    const auto reading = readMade(madeRun(form));
    ASSERT_TRUE(reading) << reading.error().code;
    expectMade(reading.value());
    EXPECT_TRUE(says(reading.value().remarks, "trailing-text") == !form.foot.empty());
  }
}

TEST(ReadRun, ItKnowsHowTheFileWasWritten) {
  const std::string bytes = madeRun({.head = "Serie;12\n\nZeit [s];Weg [mm];Kraft [N]\r\n",
                                     .between = ";",
                                     .lineEnd = "\r\n",
                                     .decimal = ','});
  const Source source = readMade(bytes).value().source;
  EXPECT_EQ(source.file.name, "run.csv");
  EXPECT_EQ(source.file.sha256, sha256Hex(bytes));
  EXPECT_EQ(source.file.bytes, bytes.size());
  EXPECT_EQ(source.rows, 400);
  EXPECT_EQ(source.lineEnd, "mixed");
  EXPECT_EQ(source.delimiter, ";");
  EXPECT_EQ(source.decimal, ",");
  EXPECT_EQ(source.headerRows, std::vector<std::int64_t>{3});
  EXPECT_EQ(source.firstDataRow, 4);
  EXPECT_EQ(source.signature, "zeit [s]|weg [mm]|kraft [N]");
  EXPECT_EQ(source.metadata[0].second, "12");
  ASSERT_EQ(source.columns.size(), 3u);
  EXPECT_EQ(source.columns[2].role, Role::Force);
  EXPECT_EQ(source.columns[2].why, "role-by-name");
  EXPECT_FALSE(source.columns[2].assumed);
}

TEST(ReadRun, Utf16AndWindows1252AreRead) {
  std::string wide = "\xFF\xFE";
  for (const char letter : madeRun()) (wide += letter) += '\0';
  expectMade(readMade(wide).value());
  const auto western =
      readMade(madeRun({.head = "D\xE4mpferweg (mm);Kraft (N);Zeit (s)\n0;0;0\n", .between = ";"})
                   .substr(0, 200));
  EXPECT_EQ(western.value().source.encoding, "windows-1252");
  EXPECT_EQ(western.value().source.columns[0].name, "Dämpferweg");
}

// Decimal comma and points between thousands, for every stream of the program.
class CommaMarks : public std::numpunct<char> {
 protected:
  char do_decimal_point() const override { return ','; }
  char do_thousands_sep() const override { return '.'; }
  std::string do_grouping() const override { return "\3"; }
};

TEST(ReadRun, TheLocaleDoesNoHarm) {
  const std::string bytes = madeRun();
  const std::locale before =
      std::locale::global(std::locale(std::locale::classic(), new CommaMarks));
  std::ostringstream stream;
  stream << 1234.5;
  EXPECT_EQ(stream.str(), "1.234,5");  // the locale is in force
  const char* set = nullptr;           // for the functions of C, where such a locale is installed
  for (const char* name : {"de_DE.UTF-8", "de_DE", "fr_FR.UTF-8"}) {
    if (set == nullptr) set = std::setlocale(LC_ALL, name);
  }
  expectMade(readMade(bytes).value());
  std::setlocale(LC_ALL, "C");
  std::locale::global(before);
}

TEST(ReadRun, UnitsOfEveryKindComeOutInSi) {
  struct Row {
    const char* head;
    double x, force;
  };
  for (const Row& row :
       std::initializer_list<Row>{{"Time (s),Travel (cm),Load (kN)\n", 10, 1000},
                                  {"Time (s),Travel (in),Load (lbf)\n", 25.4, 4.4482216152605},
                                  {"Time (s),Travel (m),Load (kgf)\n", 1000, 9.80665},
                                  {"Time (s),Travel (µm),Load (daN)\n", 1e-3, 10}}) {
    const auto reading = readMade(madeRun({.head = row.head}));
    ASSERT_TRUE(reading.value().trace.has_value()) << row.head;
    EXPECT_NEAR(reading.value().trace->displacement[25], 0.025 * row.x, 1e-12)
        << row.head;  // a quarter cycle
    EXPECT_NEAR(reading.value().trace->force[0], (madeGas + madePeakForce) * row.force, 1e-6)
        << row.head;
  }
}

TEST(ReadRun, WithoutUnitsTheyAreAssumedAndSaid) {
  const auto reading = readMade(madeRun({.head = "Time,Travel,Load\n"}));
  expectMade(reading.value());
  const auto& remarks = reading.value().remarks;
  EXPECT_EQ(
      std::count_if(
          remarks.begin(), remarks.end(), [](const Remark& r) { return r.code == "unit-assumed"; }),
      3);
  EXPECT_TRUE(reading.value().source.columns[1].assumed);
  EXPECT_EQ(reading.value().source.columns[1].unit, "mm");
  ReadOptions options;
  options.timeUnit = "s";
  options.displacementUnit = "mm";
  options.forceUnit = "N";
  EXPECT_FALSE(says(readMade(madeRun({.head = "Time,Travel,Load\n"}), options).value().remarks,
                    "unit-assumed"));
}

TEST(ReadRun, TheForceIsTurnedToAbsorbEnergy) {
  const auto reading = readMade(madeRun({.forceSign = -1}));
  expectMade(reading.value());
  EXPECT_FALSE(says(reading.value().remarks, "force-sign-reversed"));
}

TEST(ReadRun, AWrongClaimOfTheForceSignIsSaid) {
  ReadOptions options;
  options.forcePositive = Direction::Rebound;
  const auto reading = readMade(madeRun(), options);
  expectMade(reading.value());
  EXPECT_TRUE(says(reading.value().remarks, "force-sign-reversed"));
  EXPECT_FALSE(
      says(readMade(madeRun({.forceSign = -1}), options).value().remarks, "force-sign-reversed"));
}

TEST(ReadRun, AnUnknownDirectionIsAskedWithoutStopping) {
  const auto reading = readMade(madeRun());
  EXPECT_TRUE(asks(reading.value(), "direction"));
  EXPECT_FALSE(reading.value().trace->directionSettled);
  EXPECT_EQ(reading.value().open.size(), 1u);
}

TEST(ReadRun, AKnownDirectionTurnsDisplacementForceAndVelocity) {
  ReadOptions options;
  options.displacementPositive = Direction::Rebound;
  const auto reading = readMade(madeRun(), options);
  EXPECT_TRUE(reading.value().trace->directionSettled);
  EXPECT_TRUE(reading.value().open.empty());
  EXPECT_NEAR(reading.value().trace->displacement[25], -0.025, 1e-6);
  EXPECT_NEAR(
      reading.value().trace->force[0], -(madeGas + madePeakForce), 5.1e-3);  // still absorbs
  const auto named = readMade(madeRun({.head = "Time (s),Bump travel (mm),Load (N)\n"}));
  EXPECT_TRUE(named.value().trace->directionSettled);
  const auto said =
      readMade(madeRun({.head = "Sign: compression positive\nTime (s),Travel (mm),Load (N)\n"}));
  EXPECT_TRUE(said.value().trace->directionSettled);
}

std::string withoutTime(const std::string& preamble) {
  std::string text = preamble + "Travel (mm),Load (N)\n";
  const std::string run = madeRun({.head = ""});
  for (std::size_t at = 0; at < run.size();) {
    const std::size_t end = run.find('\n', at);
    text += run.substr(run.find(',', at) + 1, end - run.find(',', at));
    at = end + 1;
  }
  return text;
}

TEST(ReadRun, WithoutTimeTheRateIsTakenFromThePreambleOrAsked) {
  expectMade(readMade(withoutTime("Sample rate: 200 Hz\n")).value());
  expectMade(readMade(withoutTime("dt (ms),5\n")).value());
  const auto open = readMade(withoutTime(""));
  EXPECT_TRUE(asks(open.value(), "sample-rate"));
  EXPECT_FALSE(open.value().trace.has_value());
  ReadOptions options;
  options.sampleRate = madeRate;
  expectMade(readMade(withoutTime(""), options).value());
}

TEST(ReadRun, MillisecondsAreSeenByTheRateThatThePreambleGives) {
  std::string text = "Sample rate: 200 Hz\nTime,Travel (mm),Load (N)\n";
  const std::string run = withoutTime("");
  std::size_t at = run.find('\n') + 1;
  for (int i = 0; i < 400; ++i) {
    const std::size_t end = run.find('\n', at);
    text += std::to_string(5 * i) + "," + run.substr(at, end - at) + "\n";
    at = end + 1;
  }
  const auto reading = readMade(text);
  expectMade(reading.value());
  EXPECT_EQ(reading.value().source.columns[0].unit, "ms");
  EXPECT_FALSE(reading.value().source.columns[0].assumed);
}

TEST(ReadRun, OnlyAmbiguousCommasStopTheReadingUntilAnswered) {
  std::string text = "Time (ms);Travel (mm);Load (N)\n";
  for (int i = 1; i < 100; ++i) text += std::to_string(i) + ";1,234;2,500\n";
  const auto open = readMade(text);
  ASSERT_TRUE(open);
  EXPECT_FALSE(open.value().trace.has_value());
  ASSERT_EQ(open.value().open.size(), 1u);
  EXPECT_EQ(open.value().open[0].point, "decimal");
  EXPECT_EQ(open.value().open[0].option, "--decimal");
  ReadOptions options;
  options.decimal = ",";
  EXPECT_NEAR(readMade(text, options).value().trace->displacement[0], 1.234e-3, 1e-15);
  options.decimal = ".";
  EXPECT_NEAR(readMade(text, options).value().trace->displacement[0], 1.234, 1e-12);
}

TEST(ReadRun, OneNumberDeepInTheFileSettlesThem) {
  std::string text = "Time (ms);Travel (mm);Load (N)\n";
  for (int i = 1; i < 20000; ++i)
    text += std::to_string(i) + ";1,234;" + (i == 1777 ? "2,5" : "2,500") + "\n";
  const auto reading = readMade(text);
  ASSERT_TRUE(reading.value().trace.has_value());
  EXPECT_NEAR(reading.value().trace->displacement[0], 1.234e-3, 1e-15);
}

TEST(ReadRun, CommasThatTheSampleMissedAreAskedToo) {
  std::string text = "Time (ms);Travel (mm);Load (N)\n";
  for (int i = 1; i < 20000; ++i) {
    text += std::to_string(i) + ";1;" + (i == 1777 ? "2,500" : "2") + "\n";
  }
  EXPECT_TRUE(asks(readMade(text).value(), "decimal"));
}

TEST(ReadRun, DecimalsThatTheSampleMissedAreFound) {
  std::string text = "Time (ms);Travel (mm);Load (N)\n";
  for (int i = 1; i < 20000; ++i)
    text += std::to_string(i) + ";1;" + (i == 1777 ? "2,5" : "2") + "\n";
  const auto reading = readMade(text);
  ASSERT_TRUE(reading.value().trace.has_value());
  EXPECT_EQ(std::abs(reading.value().trace->force[1776]), 2.5);
  EXPECT_FALSE(says(reading.value().remarks, "unreadable-cells"));
}

// Profiles.

RigProfile bench() {
  RigProfile rig;
  rig.force = RigColumn{"Load", {}, "N", 2, 10};
  rig.displacementPositive = Direction::Compression;
  rig.forcePositive = Direction::Compression;
  rig.zeroState = ZeroState::NoSpecimen;
  return rig;
}

TEST(ReadRun, AProfileIsFoundBySignatureAndSettlesAll) {
  std::string asked;
  const FindProfile find = [&](std::string_view signature) {
    asked = signature;
    return std::optional(bench());
  };
  const auto reading = readMade(madeRun(), {}, find);
  EXPECT_EQ(asked, "time [s]|travel [mm]|load [N]");
  ASSERT_TRUE(reading.value().trace.has_value());
  EXPECT_TRUE(reading.value().open.empty());
  EXPECT_EQ(reading.value().trace->zeroState, ZeroState::NoSpecimen);
  EXPECT_NEAR(reading.value().trace->force[0],
              2 * (madeGas + madePeakForce) + 10,
              0.0102);  // 2 · half a digit
}

TEST(ReadRun, OptionsBeatTheProfile) {
  ReadOptions options;
  options.zeroState = ZeroState::DamperFitted;
  options.displacementPositive = Direction::Rebound;
  const auto reading =
      readMade(madeRun(), options, [](std::string_view) { return std::optional(bench()); });
  EXPECT_EQ(reading.value().trace->zeroState, ZeroState::DamperFitted);
  EXPECT_NEAR(reading.value().trace->displacement[25], -0.025, 1e-6);
}

TEST(ReadRun, AProfileSettlesTheDecimalMark) {
  std::string text = "Time (ms);Travel (mm);Load (N)\n";
  for (int i = 1; i < 100; ++i) text += std::to_string(i) + ";1,234;2,500\n";
  RigProfile rig;
  rig.decimal = ",";
  const auto reading = readMade(text, {}, [&](std::string_view) { return std::optional(rig); });
  EXPECT_TRUE(reading.value().trace.has_value());
}

// A profile of another text form cuts the file anew, and must still be found the next time.
TEST(ReadRun, TheSignatureIsTheOneByWhichTheProfileWasFound) {
  const std::string text = madeRun({.head = "Time (s);Travel (mm);Load (N)\n", .between = ";"});
  const std::string plain = readMade(text).value().source.signature;
  RigProfile rig;
  rig.delimiter = ";";
  rig.encoding = "windows-1252";
  std::string asked;
  const auto reading = readMade(text, {}, [&](std::string_view signature) {
    asked = signature;
    return std::optional(rig);
  });
  EXPECT_EQ(asked, plain);
  EXPECT_EQ(reading.value().source.signature, plain);
  EXPECT_EQ(reading.value().source.encoding, "windows-1252");
}

TEST(ReadRun, VoltsNeedAScaleFromTheProfile) {
  const std::string text = madeRun({.head = "Time (s),Travel (mm),Load (V)\n"});
  const auto open = readMade(text);
  EXPECT_TRUE(asks(open.value(), "unit"));
  EXPECT_FALSE(open.value().trace.has_value());
  EXPECT_TRUE(readMade(text, {}, [](std::string_view) { return std::optional(bench()); })
                  .value()
                  .trace.has_value());
}

TEST(ReadRun, RowsWithoutTimeTakeTheirOtherNumbersWithThem) {
  std::string text = madeRun();
  text.replace(text.find("0.0100"), 6, "");
  const auto reading = readMade(text);
  ASSERT_TRUE(reading.value().trace.has_value());
  const Trace& trace = *reading.value().trace;
  EXPECT_EQ(trace.time.size(), 399u);
  EXPECT_EQ(trace.force.size(), 399u);
  EXPECT_NEAR(trace.time[2], 0.015, 1e-12);
  EXPECT_NEAR(trace.displacement[2], 0.025 * std::sin(4 * pi * 0.015), 5.1e-7);
  EXPECT_EQ(remarkOf(trace.remarks, "rows-without-time")->firstRow, 4);
}

TEST(ReadRun, ThreeHundredThousandRowsAreReadInAFractionOfASecond) {
  const std::string text = madeRun({.rows = 300000});
  const std::clock_t start = std::clock();
  const auto reading = readMade(text);
  const double seconds = static_cast<double>(std::clock() - start) / CLOCKS_PER_SEC;
  ASSERT_TRUE(reading.value().trace.has_value());
  EXPECT_EQ(reading.value().source.rows, 300000);
  RecordProperty("cpu_ms", static_cast<int>(1000 * seconds));
  EXPECT_LT(seconds,
            5);  // a loose bound for machines under load and sanitizers; about 0.06 s alone
}

}  // namespace
}  // namespace dampwright
