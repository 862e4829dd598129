// SPDX-License-Identifier: GPL-3.0-or-later
// What is no run is refused with a reason that helps: as long a block as the files that open.
#include <gmock/gmock.h>

#include <sys/mman.h>
#include <chrono>
#include <cstdlib>
#include <random>

#include "core/intake/read_run.h"
#include "tests/core/intake/made_text.h"

namespace dampwright {
namespace {

using std::string_view_literals::operator""sv;

Error errorOf(std::string_view bytes, const ReadOptions& options = {}) {
  const auto reading = readMade(bytes, options);
  return reading ? Error{"none", {}, {}} : reading.error();
}

std::string codeOf(std::string_view bytes, const ReadOptions& options = {}) {
  return errorOf(bytes, options).code;
}

TEST(BadFiles, EmptyOrBlank) {
  EXPECT_EQ(codeOf(""), "file-empty");
  EXPECT_EQ(codeOf("\xEF\xBB\xBF"), "no-table");
  EXPECT_EQ(codeOf("\n\n  \n\t\n"), "no-table");
  EXPECT_EQ(codeOf("\r\r\r"), "no-table");
}

TEST(BadFiles, EveryErrorNamesItsFile) { EXPECT_EQ(errorOf("").place.file, "run.csv"); }

TEST(BadFiles, PicturesAndArchives) {
  EXPECT_EQ(codeOf("\x89PNG\r\n\x1a\n\0\0\0\rIHDR"sv), "file-is-picture");
  EXPECT_EQ(codeOf("PK\x03\x04\x14\0\x06\0"sv), "file-is-archive");
  EXPECT_EQ(codeOf("%PDF-1.4\n1 0 obj"), "file-is-document");
}

TEST(BadFiles, RandomBytesAreRefusedOrReadButNeverHarm) {
  std::mt19937 random(5);
  for (int run = 0; run < 200; ++run) {
    std::string bytes(500, '\0');
    for (char& byte : bytes)
      byte =
          static_cast<char>(run % 2 == 0 ? random() % 256 : " 0123456789.,;\n\"-e#"[random() % 18]);
    EXPECT_NE(codeOf(bytes), "");
  }
}

TEST(BadFiles, EveryPrefixOfAFileIsHarmless) {
  const std::string text = madeRun({.head = "Serial;1\n\n\"Zeit [s]\";Weg [mm];Kraft [N]\r\n",
                                    .between = ";",
                                    .lineEnd = "\r\n",
                                    .decimal = ',',
                                    .rows = 30});
  for (std::size_t length = 0; length <= text.size(); ++length) {
    const auto reading = readMade(std::string_view(text).substr(0, length));
    EXPECT_TRUE(reading || length < 300) << length;
  }
}

TEST(BadFiles, TwoGigabytesOfZerosAreRefusedAtOnceAndUntouched) {
  const std::size_t size = std::size_t{2} << 30;
  void* zeros =
      ::mmap(nullptr, size, PROT_READ, MAP_PRIVATE | MAP_ANONYMOUS | MAP_NORESERVE, -1, 0);
  ASSERT_NE(zeros, MAP_FAILED);
  const auto start = std::chrono::steady_clock::now();
  EXPECT_EQ(codeOf({static_cast<const char*>(zeros), size}), "file-is-binary");
  EXPECT_LT(std::chrono::steady_clock::now() - start, std::chrono::milliseconds(200));
  ::munmap(zeros, size);
}

TEST(BadFiles, Prose) {
  const Error error =
      errorOf("Dear customer,\nyour damper, number 4711, was tested on 5 May 2031.\nIt passed.\n");
  EXPECT_EQ(error.code, "no-table");
  EXPECT_EQ(std::get<std::string>(error.values[0].value), "Dear customer,");
  EXPECT_EQ(codeOf("<html><body>1</body></html>\n"), "no-table");
  EXPECT_EQ(codeOf("{\"document\": \"dampwright rig\", \"version\": 1}\n"), "no-table");
}

TEST(BadFiles, OneColumn) {
  EXPECT_EQ(codeOf("Force\n1.5\n2.5\n3.5\n"), "one-column");
  EXPECT_EQ(codeOf("1.5\r\n2.5\r\n3.5\r\n"), "one-column");
}

TEST(BadFiles, NamesWithoutNumbers) {
  EXPECT_EQ(codeOf("Time,Travel,Load\n"), "no-table");
  EXPECT_EQ(codeOf("Time,Travel,Load\na,b,c\n"), "no-table");
}

TEST(BadFiles, TooFewRows) {
  const Error error = errorOf("Time,Travel,Load\n0,1,2\n");
  EXPECT_EQ(error.code, "too-few-rows");
  EXPECT_EQ(error.place.row, 2);
}

TEST(BadFiles, LinesTooLongAndColumnsTooMany) {
  const Error line = errorOf("Time,Travel,Load\n0,1,2\n" + std::string(1100000, '7'));
  EXPECT_EQ(line.code, "line-too-long");
  EXPECT_EQ(line.place.row, 3);
  std::string row = "1";
  for (int i = 0; i < 1200; ++i) row += ";1";
  EXPECT_EQ(codeOf(row + "\n" + row + "\n"), "too-many-columns");
}

TEST(BadFiles, OptionsThatCannotBe) {
  ReadOptions options;
  options.force = "Druck";
  const Error column = errorOf(madeRun(), options);
  EXPECT_EQ(column.code, "column-not-found");
  EXPECT_EQ(std::get<std::string>(column.values[2].value), "Time, Travel, Load");
  for (auto member : {&ReadOptions::encoding,
                      &ReadOptions::delimiter,
                      &ReadOptions::decimal,
                      &ReadOptions::forceUnit,
                      &ReadOptions::timeUnit}) {
    ReadOptions wrong;
    wrong.*member = "furlong";
    EXPECT_EQ(codeOf(madeRun(), wrong), "option-not-understood");
  }
  ReadOptions row;
  row.headerRow = 5000;
  EXPECT_EQ(codeOf(madeRun(), row), "header-row-not-found");
}

TEST(BadFiles, AWrongDelimiterIsNoTable) {
  ReadOptions options;
  options.delimiter = "|";
  EXPECT_EQ(codeOf(madeRun(), options), "no-table");
}

TEST(BadFiles, BrokenThousandsAreNeverGluedTogether) {
  std::string text = "Time (ms);Travel (mm);Load (N)\n";
  for (int i = 0; i < 60; ++i)
    text += std::to_string(i) + ";1.5;" + (i == 7 ? "300,0,00.40" : "100,000.00") + "\n";
  const auto reading = readMade(text);
  ASSERT_TRUE(reading.value().trace.has_value());
  EXPECT_TRUE(std::isnan(reading.value().trace->force[7]));
  EXPECT_TRUE(says(reading.value().remarks, "unreadable-cells"));
}

TEST(BadFiles, StoppedWorkIsStopped) {
  std::stop_source stop;
  stop.request_stop();
  const auto reading =
      readRun(madeRun({.rows = 100000}), "run.csv", {}, {}, Progress{stop.get_token(), {}});
  ASSERT_FALSE(reading);
  EXPECT_EQ(reading.error().code, "stopped");
}

TEST(BadFiles, AnEmptyProfileFinderIsNoTrap) {
  EXPECT_TRUE(
      readMade(madeRun(), {}, [](std::string_view) { return std::optional<RigProfile>(); }));
}

}  // namespace
}  // namespace dampwright
