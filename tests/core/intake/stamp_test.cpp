// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/stamp.h"

#include <gtest/gtest.h>

#include <cmath>

#include "tests/core/intake/made_text.h"

namespace dampwright {
namespace {

// The seconds between two stamps of one column.
double between(std::string_view first, std::string_view second) {
  StampVotes votes;
  votes.add(first);
  votes.add(second);
  EXPECT_EQ(votes.stamps(), 2) << first << " " << second;
  const auto a = readStamp(first, votes.form()), b = readStamp(second, votes.form());
  return a && b ? *b - *a : -1;
}

TEST(Stamp, EveryWayToWriteATimeOfDay) {
  struct Row {
    const char *first, *second;
    double seconds;
  };
  for (const Row& row : std::initializer_list<Row>{
           {"12:00:01.250", "12:00:02.500", 1.25},
           {"12:00:01,250", "12:00:02,500", 1.25},
           {"12:00:01:250", "12:00:02:500", 1.25},
           {"59:59.5", "60:01.0", 1.5},
           {"09:59:59 AM", "10:00:00 AM", 1},
           {"12:59:59 PM", "1:00:00 PM", 1},
           {"11:59:59.5 am", "12:00:00.5 pm", 1},
           {"2031-03-04 12:00:01.25", "2031-03-04 12:00:01.5", 0.25},
           {"2031-03-04T12:00:01.25Z", "2031-03-04T12:00:01.5Z", 0.25},
           {"2031-03-04T12:00:01.25+01:00", "2031-03-04T12:00:01.5+01:00", 0.25},
           {"2031-03-04T12:00:00+01:00", "2031-03-04T12:00:00Z", 3600},
           {"2031/3/4 23:59:59", "2031/3/5 0:00:00", 1},
           {"04.03.2031 23:59:59,5", "05.03.2031 00:00:00,5", 1},
           {"4/3/2031 23:59:59", "5/3/2031 00:00:00", 1},  // the first number is the day
           {"3/4/2031 23:59:59", "3/5/2031 00:00:00", 1},  // the second one is
           {"31/1/2031 23:59:59", "1/2/2031 00:00:00", 1},
           {"1/31/2031 23:59:59", "2/1/2031 00:00:00", 1},
           {"28-Feb-2032 23:59:59", "29-Feb-2032 00:00:00", 1},  // 2032 has 366 days
           {"2031年3月4日 12時00分01秒", "2031年3月4日 12時00分03秒", 2},
           {"12/31/31 11:59:59 PM", "1/1/32 12:00:00 AM", 1},
       }) {
    EXPECT_NEAR(between(row.first, row.second), row.seconds, 1e-9)
        << row.first;  // rounding of 1e5 s
  }
}

TEST(Stamp, NumbersAndTextAreNoStamps) {
  for (const char* cell : {"",
                           "1",
                           "12",
                           "1.5",
                           "1.002.000",
                           "12.5.8",
                           "a:b",
                           "12:",
                           ":12",
                           "12:61:00",
                           "12:00:01 Step",
                           "1/2",
                           "Speed 1:2",
                           "2031-13-45 12:00",
                           "1:2:3:4:5"}) {
    StampVotes votes;
    votes.add(cell);
    EXPECT_FALSE(votes.stamps() > 0 && readStamp(cell, votes.form())) << cell;
  }
}

// Whole files: the recording of madeRun with another time column.
std::string withStamps(std::string (*stamp)(double seconds),
                       const char* head = "Time;Travel (mm);Load (N)\n") {
  std::string text = head;
  for (int i = 0; i < 400; ++i) {
    const double t = i / madeRate, phase = 4 * pi * t;
    text += stamp(t) + ";" + inForm(25 * std::sin(phase), 3, '.') + ";" +
            inForm(madeGas + madePeakForce * std::cos(phase), 2, '.') + "\n";
  }
  return text;
}

std::string clockFrom(double seconds, double start, const char* form) {
  const double all = start + seconds;
  const int hours = static_cast<int>(all / 3600) % 24, minutes = static_cast<int>(all / 60) % 60;
  char text[80];
  std::snprintf(text, sizeof text, form, hours, minutes, all - 60 * std::floor(all / 60));
  return text;
}

void expectClock(const std::string& text, double tolerance) {
  const auto reading = readMade(text);
  ASSERT_TRUE(reading) << reading.error().code;
  ASSERT_TRUE(reading.value().trace.has_value()) << text.substr(0, 200);
  const Trace& trace = *reading.value().trace;
  ASSERT_EQ(trace.time.size(), 400u);
  for (std::size_t i = 0; i < 400; ++i) {
    ASSERT_NEAR(trace.time[i] - trace.time[0], static_cast<double>(i) / madeRate, tolerance) << i;
  }
  EXPECT_EQ(reading.value().source.columns[0].role, Role::Time);
}

TEST(StampFiles, ClockTimesAndDateTimesAreSeconds) {
  const double milliseconds = 5.1e-4;  // half a digit
  expectClock(withStamps([](double t) { return clockFrom(t, 36000, "%02d:%02d:%06.3f"); }),
              milliseconds);
  expectClock(withStamps([](double t) { return clockFrom(t, 86399, "%02d:%02d:%06.3f"); }),
              milliseconds);
  expectClock(withStamps([](double t) { return clockFrom(t, 300, "%.0d%02d:%06.3f"); }),
              milliseconds);
  expectClock(
      withStamps([](double t) { return clockFrom(t, 36000, "2031-03-04 %02d:%02d:%06.3f"); }),
      milliseconds);
  expectClock(
      withStamps([](double t) { return clockFrom(t, 36000, "\"3/4/2031 %d:%02d:%06.3f\""); }),
      milliseconds);
  expectClock(withStamps([](double t) { return clockFrom(t, 36000, "%02d:%02d:%06.3f"); },
                         "A;Travel (mm);Load (N)\n"),
              milliseconds);
  EXPECT_TRUE(
      says(readMade(withStamps([](double t) { return clockFrom(t, 36000, "%02d:%02d:%06.3f"); }))
               .value()
               .remarks,
           "clock-times"));
}

TEST(StampFiles, UnixAndSpreadsheetDaysAreCountedFromTheFirstRow) {
  expectClock(withStamps([](double t) { return inForm(1.9e9 + t, 3, '.'); }), 5.1e-4);
  expectClock(withStamps([](double t) { return inForm(1.9e12 + 1000 * t, 0, '.'); }), 5.1e-4);
  expectClock(withStamps([](double t) { return inForm(1.9e15 + 1e6 * t, 0, '.'); }), 1e-6);
  expectClock(withStamps([](double t) { return inForm(47911.5 + t / 86400, 9, '.'); }),
              5.1e-5);  // 0.5e-9 d
  EXPECT_TRUE(
      says(readMade(withStamps([](double t) { return inForm(47911.5 + t / 86400, 9, '.'); }))
               .value()
               .remarks,
           "unit-assumed"));
}

TEST(StampFiles, StampsOfWholeSecondsAreSpreadByTheUsualRate) {
  const auto reading = readMade(withStamps(
      [](double t) { return clockFrom(std::floor(t + 0.3), 36000, "%02d:%02d:%02.0f"); }));
  ASSERT_TRUE(reading.value().trace.has_value());
  const Trace& trace = *reading.value().trace;
  for (std::size_t i = 1; i < 400; ++i) {
    ASSERT_NEAR(trace.time[i] - trace.time[i - 1], 1 / madeRate, 1e-9) << i;
  }
  EXPECT_TRUE(says(reading.value().remarks, "repeated-stamps"));
}

TEST(StampFiles, DateAndTimeMayStandInTwoColumns) {
  std::string text = "Date;Time;Travel (mm);Load (N)\n";
  for (int i = 0; i < 400; ++i) {
    const double t = i / madeRate;
    text += "04.03.2031;" + clockFrom(t, 36000, "%02d:%02d:%06.3f") + ";" +
            inForm(25 * std::sin(4 * pi * t), 3, '.') + ";" +
            inForm(800 * std::cos(4 * pi * t), 2, '.') + "\n";
  }
  const auto reading = readMade(text);
  ASSERT_TRUE(reading.value().trace.has_value());
  EXPECT_EQ(reading.value().source.columns[1].role, Role::Time);
  EXPECT_NEAR(reading.value().trace->time[200] - reading.value().trace->time[0], 1, 1e-6);
}

TEST(StampFiles, ACounterIsNoClock) {
  std::string rows, head = "Travel (mm);Load (N)\n";
  for (int i = 0; i < 400; ++i) {
    const double t = i / madeRate;
    rows += std::to_string(i) + ";" + inForm(25 * std::sin(4 * pi * t), 3, '.') + ";" +
            inForm(800 * std::cos(4 * pi * t), 2, '.') + "\n";
  }
  EXPECT_TRUE(asks(readMade(rows).value(), "sample-rate"));
  EXPECT_TRUE(asks(readMade("Sample;Travel (mm);Load (N)\n" + rows).value(), "sample-rate"));
  for (const char* name : {"Sample", "Nr.", "N°", "番号", "Time", ""}) {
    const auto reading =
        readMade("Sample rate: 200 Hz\n" + std::string(name) + ";Travel (mm);Load (N)\n" + rows);
    ASSERT_TRUE(reading.value().trace.has_value()) << name;
    EXPECT_NEAR(reading.value().trace->time[200], 1, 1e-9) << name;
    EXPECT_EQ(says(reading.value().remarks, "rate-instead-of-time"), std::string(name) == "Time");
  }
}

}  // namespace
}  // namespace dampwright
