// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/metadata.h"

#include <gmock/gmock.h>

namespace dampwright {
namespace {

using testing::ElementsAre;
using testing::Pair;

Metadata read(const std::vector<std::string_view>& lines, char delimiter = ';') {
  std::vector<Line> rows;
  for (const std::string_view line : lines) {
    rows.push_back({line, static_cast<std::int64_t>(rows.size()) + 1, 1, true});
  }
  return readMetadata(rows, delimiter);
}

TEST(Metadata, EveryFormOfKeyAndValue) {
  EXPECT_THAT(read({"Serial: QD-4620", "rate = 2000", "Bench;bench 1", "Date,2031-03-12", "Op\tK"}),
              ElementsAre(Pair("Serial", "QD-4620"),
                          Pair("rate", "2000"),
                          Pair("Bench", "bench 1"),
                          Pair("Date", "2031-03-12"),
                          Pair("Op", "K")));
}

TEST(Metadata, QuotesCommentMarksAndSignsAreTakenOff) {
  EXPECT_THAT(
      read({"# serial: 12", "% temp = 20", "// note: a", "\"Pos (V) = \",0.2,-6", "\"Title: run\""},
           ','),
      ElementsAre(Pair("serial", "12"),
                  Pair("temp", "20"),
                  Pair("note", "a"),
                  Pair("Pos (V)", "0.2; -6"),
                  Pair("Title", "run")));
}

TEST(Metadata, AClockTimeIsNoKey) {
  EXPECT_THAT(read({"Start: 15:55:08", "at 15:55:08"}),
              ElementsAre(Pair("Start", "15:55:08"), Pair("line 2", "at 15:55:08")));
}

TEST(Metadata, OtherLinesKeepTheirNumberAndKeysAreNeverTheSame) {
  EXPECT_THAT(read({"FL damper", "", "Date: 1", "Date: 2", "Date: 3"}),
              ElementsAre(Pair("line 1", "FL damper"),
                          Pair("Date", "1"),
                          Pair("Date (2)", "2"),
                          Pair("Date (3)", "3")));
}

TEST(SampleRate, FromRateOrIntervalInAnyUnit) {
  EXPECT_EQ(sampleRateIn({{"Sample rate", "1000 Hz"}}), 1000.0);
  EXPECT_EQ(sampleRateIn({{"Abtastrate", "2 kHz"}}), 2000.0);
  EXPECT_EQ(sampleRateIn({{"Sampling Frequency (Hz)", "500"}}), 500.0);
  EXPECT_EQ(sampleRateIn({{"dt [ms]", "0,5"}}), 2000.0);
  EXPECT_EQ(sampleRateIn({{"Sample interval", "2 ms"}}), 500.0);
  EXPECT_NEAR(
      *sampleRateIn({{"Delta_X", "3,906250E-5; 3,906250E-5"}}), 25600, 1e-9);  // = 1/3.90625e-5
}

TEST(SampleRate, NothingIsMadeOfWhatIsNoRate) {
  EXPECT_EQ(sampleRateIn({{"Sample rate", "fast"}}), std::nullopt);
  EXPECT_EQ(sampleRateIn({{"Sample time", "12:00:00"}}), std::nullopt);
  EXPECT_EQ(sampleRateIn({{"Sample rate", "0"}}), std::nullopt);
  EXPECT_EQ(sampleRateIn({{"Sample rate", "1,000 Hz"}}), std::nullopt);  // a thousand, or one
  EXPECT_EQ(sampleRateIn({{"dt", "5 mm"}}), std::nullopt);
  EXPECT_EQ(sampleRateIn({{"Width", "5"}}), std::nullopt);
}

}  // namespace
}  // namespace dampwright
