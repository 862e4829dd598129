// SPDX-License-Identifier: GPL-3.0-or-later
// Files of others, as they came: origins, licences and what an independent reader found in them are
// in tests/reference/awkward_csv/README.md and tests/reference/real/README.md.
#include <gmock/gmock.h>

#include "core/intake/layout.h"
#include "core/intake/read_columns.h"
#include "core/intake/signs.h"
#include "tests/core/intake/made_text.h"

namespace dampwright {
namespace {

using testing::AnyOf;

struct AwkwardFile {
  const char* name;
  const char* encoding;
  const char* lineEnd;
  const char* delimiter;
  const char* decimal;
  std::int64_t firstDataRow, rows;
  std::size_t columns;
};

std::ostream& operator<<(std::ostream& out, const AwkwardFile& file) { return out << file.name; }

class Awkward : public testing::TestWithParam<AwkwardFile> {};

TEST_P(Awkward, IsUnderstoodAsTheIndexSays) {
  const AwkwardFile& file = GetParam();
  const auto reading = readMade(referenceFile(std::string("awkward_csv/") + file.name));
  ASSERT_TRUE(reading) << reading.error().code;
  const Source& source = reading.value().source;
  EXPECT_EQ(source.encoding, file.encoding);
  EXPECT_EQ(source.lineEnd, file.lineEnd);
  EXPECT_EQ(source.delimiter, file.delimiter);
  EXPECT_EQ(source.decimal, file.decimal);
  EXPECT_EQ(source.firstDataRow, file.firstDataRow);
  EXPECT_EQ(source.rows, file.rows);
  EXPECT_EQ(source.columns.size(), file.columns);
}

// Rows of E19: the index counts eleven rows of delimiters at the end, which hold nothing. B01 and
// B03 have one more column of comments than fields in the index, for its header names it.
INSTANTIATE_TEST_SUITE_P(
    Files,
    Awkward,
    testing::Values(
        AwkwardFile{"A10_headerless_semicolon.csv", "utf-8", "CRLF", ";", ".", 1, 1435, 3},
        AwkwardFile{"A12_matlab_ascii_fixed_width.txt", "utf-8", "CRLF", "blanks", ".", 1, 450, 4},
        AwkwardFile{"B01_lvm_decimal_comma_no_x.lvm", "utf-8", "LF", "tab", ",", 24, 10, 3},
        AwkwardFile{"B03_lvm_latin1_comments.lvm", "windows-1252", "LF", "tab", ".", 24, 9, 5},
        AwkwardFile{"C04_key_equals_value_preamble.txt", "utf-8", "LF", ",", ".", 19, 73, 5},
        AwkwardFile{"C05_tab_trailing_delimiter.txt", "utf-8", "LF", "tab", ".", 2, 812, 8},
        AwkwardFile{"C06_crcrlf.txt", "utf-8", "CRCRLF", "tab", ".", 2, 30, 3},
        AwkwardFile{
            "C08_scope_quoted_key_value_preamble.csv", "utf-8", "LF", ",", ".", 17, 8192, 3},
        AwkwardFile{"D04_plus_signs_unix_time.txt", "utf-8", "LF", ",", ".", 4, 49, 5},
        AwkwardFile{"E05_decimal_comma_semicolon.csv", "utf-8", "LF", ";", ",", 2, 5, 2},
        AwkwardFile{"E07_mixed_decimal_signs.csv", "utf-8", "LF", ";", ",", 2, 5, 2},
        AwkwardFile{"E11_comments_semicolon.csv", "utf-8", "LF", ";", ".", 5, 2, 2},
        AwkwardFile{"E13_mixed_newlines.csv", "utf-8", "mixed", ",", ".", 1, 3, 3},
        AwkwardFile{"E19_blank_rows.csv", "utf-8", "LF", ",", ".", 2, 2, 3}));

struct RefusedFile {
  const char* name;
  const char* code;
};

TEST(AwkwardRefused, WhatCannotBeARunIsSaidWhy) {
  for (const RefusedFile& file :
       std::initializer_list<RefusedFile>{{"C12_single_column.csv", "one-column"},
                                          {"E01_utf16le_bom_crlf.csv", "one-column"},
                                          {"E02_utf16be_bom.txt", "no-table"},
                                          {"E06_quoted_decimal_comma.csv", "too-few-rows"},
                                          {"E08_thousands_quoted.csv", "one-column"},
                                          {"E09_thousands_semicolon.csv", "one-column"},
                                          {"E10_thousands_broken.csv", "one-column"},
                                          {"E14_cr_only.csv", "one-column"},
                                          {"E16_row_longer_than_header.csv", "too-few-rows"},
                                          {"E18_nul_byte_in_field.csv", "no-table"},
                                          {"E20_short_and_long_rows.csv", "one-column"}}) {
    const std::string bytes = referenceFile(std::string("awkward_csv/") + file.name);
    ASSERT_FALSE(bytes.empty()) << file.name;
    const auto reading = readMade(bytes);
    ASSERT_FALSE(reading) << file.name;
    EXPECT_EQ(reading.error().code, file.code) << file.name;
  }
}

std::vector<double> numbersOf(const std::string& name, std::size_t column) {
  const std::string bytes = referenceFile("awkward_csv/" + name);
  const auto layout = findLayout(bytes, {}).value();
  return readColumns(layout.decoded.text(), layout.lineEnd.letter, layout.dialect, layout.table, {})
      .value()
      .values[column];
}

TEST(AwkwardNumbers, AreThoseOfTheFiles) {
  EXPECT_THAT(numbersOf("E05_decimal_comma_semicolon.csv", 0),
              testing::ElementsAre(1.1, 0.25, 15300, 15300, -15300));
  EXPECT_EQ(numbersOf("E05_decimal_comma_semicolon.csv", 1),
            numbersOf("E05_decimal_comma_semicolon.csv", 0));
  EXPECT_THAT(numbersOf("E07_mixed_decimal_signs.csv", 1),
              testing::ElementsAre(5.5, 5.5, 5, testing::IsNan(), 5.5));
  EXPECT_EQ(numbersOf("B01_lvm_decimal_comma_no_x.lvm", 1).size(), 10u);
  // time in thousandths of a millisecond, written with points between all groups: 143.696.000
  EXPECT_EQ(numbersOf("A10_headerless_semicolon.csv", 0).back(), 143696000);
  EXPECT_EQ(numbersOf("A10_headerless_semicolon.csv", 1).front(), 3.823);
  EXPECT_EQ(numbersOf("D04_plus_signs_unix_time.txt", 2).front(), 14.287);
}

TEST(AwkwardRoles, AHeaderlessDamperRunIsUnderstoodByItsShape) {
  const auto reading = readMade(referenceFile("awkward_csv/A12_matlab_ascii_fixed_width.txt"));
  const auto& columns = reading.value().source.columns;
  EXPECT_EQ(columns[0].role, Role::Time);
  EXPECT_EQ(columns[1].role, Role::Displacement);
  EXPECT_EQ(columns[2].role, Role::Velocity);
  EXPECT_EQ(columns[3].role, Role::Force);
  EXPECT_EQ(columns[1].unit, "mm");
  EXPECT_EQ(columns[2].unit, "mm/s");
  ASSERT_TRUE(reading.value().trace.has_value());
  EXPECT_NEAR(reading.value().trace->time.back(), 2.245, 1e-12);
}

TEST(RealRecordings, OpenWithNoQuestionThatStops) {
  struct Row {
    const char* name;
    double energy, cycles, span;
  };
  for (const Row& row : std::initializer_list<Row>{
           {"mr_damper_stroke_24.75mm_0.840Hz.csv", 5.166, 25.21, 0.02441},
           {"mr_damper_stroke_15.16mm_1.053Hz.csv", 2.673, 31.58, 0.01513}}) {
    const auto reading = readMade(referenceFile(std::string("real/") + row.name));
    ASSERT_TRUE(reading) << row.name;
    EXPECT_LE(reading.value().open.size(), 1u);
    EXPECT_TRUE(asks(reading.value(), "direction"));
    ASSERT_TRUE(reading.value().trace.has_value()) << row.name;
    const Trace& trace = *reading.value().trace;
    EXPECT_EQ(trace.time.size(), 3001u);
    EXPECT_EQ(trace.velocity.size(), 3001u);
    // Of the cycles that fit into 30 s those of the start-up are missing; published: the loop.
    const double cycles = absorbedEnergy(trace.displacement, trace.force) / row.energy;
    EXPECT_GT(cycles, row.cycles - 4) << row.name;
    EXPECT_LT(cycles, row.cycles + 1) << row.name;
    const auto [low, high] =
        std::minmax_element(trace.displacement.begin(), trace.displacement.end());
    EXPECT_NEAR(*high - *low, row.span, 0.1 * row.span) << row.name;  // spikes stay in
  }
}

}  // namespace
}  // namespace dampwright
