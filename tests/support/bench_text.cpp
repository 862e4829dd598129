// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_text.h"

#include <algorithm>
#include <array>
#include <charconv>

#include "core/base/expects.h"

namespace dampwright::bench {
namespace {

const std::vector<double>& channelOf(const Recording& recording, Channel channel) {
  switch (channel) {
    case Channel::Time:
      return recording.time;
    case Channel::Displacement:
      return recording.displacement;
    case Channel::Velocity:
      return recording.velocity;
    case Channel::Force:
      return recording.force;
    case Channel::Temperature:
      break;
  }
  return recording.temperature;
}

/// The code points of valid UTF-8 up to U+FFFF.
std::vector<unsigned> codePoints(std::string_view utf8) {
  std::vector<unsigned> points;
  for (std::size_t i = 0; i < utf8.size();) {
    const auto lead = static_cast<unsigned char>(utf8[i]);
    const std::size_t length = lead < 0x80 ? 1 : lead < 0xE0 ? 2 : 3;
    expects(lead < 0xF0 && i + length <= utf8.size());
    unsigned point = length == 1 ? lead : lead & (length == 2 ? 0x1Fu : 0x0Fu);
    for (std::size_t k = 1; k < length; ++k)
      point = point << 6 | (static_cast<unsigned char>(utf8[i + k]) & 0x3Fu);
    points.push_back(point);
    i += length;
  }
  return points;
}

void joinLine(std::string& text, const std::vector<std::string>& cells, const TextStyle& style) {
  for (std::size_t i = 0; i < cells.size(); ++i) {
    if (i > 0) text += style.delimiter;
    text += cells[i];
  }
  text += style.lineEnd;
}

}  // namespace

std::string fixedText(double value, int decimals, char decimalMark) {
  std::array<char, 64> buffer{};
  const auto [end, error] = std::to_chars(
      buffer.data(), buffer.data() + buffer.size(), value, std::chars_format::fixed, decimals);
  expects(error == std::errc());
  std::string text(buffer.data(), end);
  std::replace(text.begin(), text.end(), '.', decimalMark);
  return text;
}

std::string encoded(std::string_view utf8, Encoding encoding) {
  if (encoding == Encoding::Utf8) return std::string(utf8);
  if (encoding == Encoding::Utf8WithBom) return "\xEF\xBB\xBF" + std::string(utf8);
  std::string bytes = encoding == Encoding::Utf16LeWithBom ? "\xFF\xFE" : "";
  for (const unsigned point : codePoints(utf8)) {
    bytes += static_cast<char>(point & 0xFF);
    if (encoding == Encoding::Utf16LeWithBom) bytes += static_cast<char>(point >> 8);
    expects(encoding == Encoding::Utf16LeWithBom || point < 0x80 ||
            (point >= 0xA0 && point <= 0xFF));
  }
  return bytes;
}

std::string writeText(const Recording& recording, const TextStyle& style) {
  std::string text;
  for (const std::string& line : style.preamble) text += line + style.lineEnd;
  std::vector<std::string> names, units;
  for (const TextColumn& column : style.columns) {
    names.push_back(column.name);
    units.push_back(column.unit);
  }
  joinLine(text, names, style);
  if (style.unitRow == UnitRow::Present) joinLine(text, units, style);
  for (std::size_t row = 0; row < recording.size(); ++row) {
    std::vector<std::string> cells;
    for (const TextColumn& column : style.columns) {
      const double value = channelOf(recording, column.channel)[row] / column.siPerUnit;
      cells.push_back(fixedText(value, column.decimals, style.decimalMark));
    }
    joinLine(text, cells, style);
  }
  return encoded(text, style.encoding);
}

Recording partOf(const Recording& recording, double from, double to, std::size_t keepEvery) {
  Recording part;
  part.rate = recording.rate / static_cast<double>(keepEvery);
  const auto begin = std::lower_bound(recording.time.begin(), recording.time.end(), from);
  const auto first = static_cast<std::size_t>(begin - recording.time.begin());
  for (std::size_t i = first; i < recording.size() && recording.time[i] < to; i += keepEvery) {
    part.time.push_back(recording.time[i] - recording.time[first]);
    part.displacement.push_back(recording.displacement[i]);
    part.velocity.push_back(recording.velocity[i]);
    part.force.push_back(recording.force[i]);
    part.temperature.push_back(recording.temperature[i]);
  }
  return part;
}

}  // namespace dampwright::bench
