// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <string>
#include <string_view>
#include <vector>

#include "tests/support/bench_run.h"

// Recordings as the text files that benches write.
namespace dampwright::bench {

enum class Channel { Time, Displacement, Velocity, Force, Temperature };

struct TextColumn {
  Channel channel = Channel::Time;
  std::string name;      ///< header text, with its unit where the file writes it there
  std::string unit;      ///< for the unit row
  double siPerUnit = 1;  ///< a negative one turns the sign round
  int decimals = 3;
};

enum class Encoding { Utf8, Utf8WithBom, Windows1252, Utf16LeWithBom };
enum class UnitRow { Absent, Present };

struct TextStyle {
  std::vector<std::string> preamble;  ///< lines before the header, as they stand
  std::vector<TextColumn> columns;
  char delimiter = ',';
  char decimalMark = '.';
  std::string lineEnd = "\n";
  Encoding encoding = Encoding::Utf8;
  UnitRow unitRow = UnitRow::Absent;
};

/// Decimal text of fixed length behind the mark, the same everywhere whatever the locale.
std::string fixedText(double value, int decimals, char decimalMark = '.');

/// UTF-8 to the bytes of an encoding. Windows-1252: only what Latin-1 shares with it.
std::string encoded(std::string_view utf8, Encoding encoding);

std::string writeText(const Recording& recording, const TextStyle& style);

/// A part of a recording as a file of its own: [from, to) in s, every `keepEvery`-th sample, time
/// from 0 again.
Recording partOf(const Recording& recording, double from, double to, std::size_t keepEvery = 1);

}  // namespace dampwright::bench
