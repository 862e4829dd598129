// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cmath>
#include <cstdio>
#include <fstream>
#include <iterator>
#include <string>
#include <string_view>
#include <vector>

#include "core/base/units.h"
#include "core/intake/read_run.h"

namespace dampwright {

/// How a made run is written down.
struct MadeText {
  std::string head = "Time (s),Travel (mm),Load (N)\n";
  std::string between = ",";
  std::string lineEnd = "\n";
  char decimal = '.';
  std::string foot = "";
  double forceSign = 1;
  int rows = 400;
};

inline constexpr double madeRate = 200;                     // Hz
inline constexpr double madeStroke = 0.05;                  // m peak to peak
inline constexpr double madePeakForce = 800, madeGas = 60;  // N

inline std::string inForm(double value, int decimals, char decimal) {
  char text[64];
  std::snprintf(
      text, sizeof text, "%.*f", decimals, value);  // the C locale's point: tests that set
  std::string number = text;                        // another write their file first
  for (char& letter : number) {
    if (letter == '.') letter = decimal;
  }
  return number;
}

/// Two cycles a second of x = 25 mm · sin(ωt), F = 60 N + 800 N · cos(ωt): a viscous damper with
/// gas.
inline std::string madeRun(const MadeText& form = {}) {
  std::string text = form.head;
  for (int i = 0; i < form.rows; ++i) {
    const double t = i / madeRate, phase = 2 * pi * 2 * t;
    text += inForm(t, 4, form.decimal) + form.between;
    text += inForm(500 * madeStroke * std::sin(phase), 3, form.decimal) + form.between;
    text += inForm(form.forceSign * (madeGas + madePeakForce * std::cos(phase)), 2, form.decimal);
    text += form.lineEnd;
  }
  return text + form.foot;
}

inline Result<RunReading> readMade(std::string_view bytes,
                                   const ReadOptions& options = {},
                                   const FindProfile& findProfile = {}) {
  return readRun(bytes, "run.csv", options, findProfile, {});
}

inline std::string referenceFile(const std::string& path) {
  std::ifstream stream(std::string(DAMPWRIGHT_SOURCE_DIR) + "/tests/reference/" + path,
                       std::ios::binary);
  return {std::istreambuf_iterator<char>(stream), {}};
}

inline bool says(const std::vector<Remark>& remarks, std::string_view code) {
  for (const Remark& remark : remarks) {
    if (remark.code == code) return true;
  }
  return false;
}

inline const Remark* remarkOf(const std::vector<Remark>& remarks, std::string_view code) {
  for (const Remark& remark : remarks) {
    if (remark.code == code) return &remark;
  }
  return nullptr;
}

inline bool asks(const RunReading& reading, std::string_view point) {
  for (const OpenPoint& open : reading.open) {
    if (open.point == point) return true;
  }
  return false;
}

}  // namespace dampwright
