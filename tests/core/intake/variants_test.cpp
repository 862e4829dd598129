// SPDX-License-Identifier: GPL-3.0-or-later
// One recording in many dialects: delimiters, decimal marks, encodings, line ends, headers and
// clocks crossed with each other. Each must come back with the same numbers.
#include <gtest/gtest.h>

#include <functional>

#include "tests/core/intake/made_encoding.h"
#include "tests/core/intake/made_sample.h"
#include "tests/core/intake/made_text.h"

namespace dampwright {
namespace {

struct Named {
  const char* name;
  std::string value;
};

struct Clock {
  const char* name;
  const char* column;  ///< its name and unit, empty: no column
  const char* unit;
  std::function<std::string(double seconds, int row, char decimal)> text;
};

std::string timeOfDay(double seconds, char decimal) {
  char text[40];
  const double all = 36000 + seconds;
  const int whole = static_cast<int>(all);
  std::snprintf(text,
                sizeof text,
                "%02d:%02d:%02d%c%03d",
                whole / 3600,
                whole / 60 % 60,
                whole % 60,
                decimal,
                static_cast<int>(std::lround(1000 * (all - whole))));
  return text;
}

const std::vector<Clock> clocks = {
    {"s", "Time", "s", [](double t, int, char d) { return inForm(t, 4, d); }},
    {"ms", "Time", "ms", [](double t, int, char d) { return inForm(1000 * t, 1, d); }},
    {"min", "Time", "min", [](double t, int, char d) { return inForm(t / 60, 8, d); }},
    {"hms", "Time", "", [](double t, int, char d) { return timeOfDay(t, d); }},
    {"date", "Time", "", [](double t, int, char d) { return "2031-03-04T" + timeOfDay(t, d); }},
    {"restart",
     "Time",
     "s",
     [](double t, int i, char d) {
       return inForm(i < madeRows / 2 ? t : t - madeRows / 2 / madeRate, 4, d);
     }},
    {"rate", "", "", [](double, int, char) { return std::string(); }},
    {"counter", "Sample", "", [](double, int i, char) { return std::to_string(i + 1); }},
};

const std::vector<Named> delimiters = {{"comma", ","},
                                       {"semicolon", ";"},
                                       {"tab", "\t"},
                                       {"bar", "|"},
                                       {"blanks", "  "},
                                       {"widths", "%"}};
const std::vector<Named> lineEnds = {
    {"LF", "\n"}, {"CRLF", "\r\n"}, {"CR", "\r"}, {"CRCRLF", "\r\r\n"}};
const std::vector<Named> encodings = {{"utf8", "UTF-8"},
                                      {"bom", "BOM"},
                                      {"utf16le", "UTF-16LE"},
                                      {"utf16be", "UTF-16BE"},
                                      {"western", "WINDOWS-1252"}};
const std::vector<Named> headers = {{"brackets", "b"},
                                    {"unitrow", "u"},
                                    {"comment", "c"},
                                    {"none", "n"},
                                    {"preamble", "p"},
                                    {"quoted", "q"},
                                    {"spaced", "s"}};

struct Variant {
  const Clock& clock;
  std::string delimiter, lineEnd, encoding, header;
  char decimal;

  bool possible() const {
    if (delimiter == "," && decimal == ',') return false;
    if (header == "n" && clock.column == std::string("Sample")) return true;
    return true;
  }
};

std::string joined(const std::vector<std::string>& cells, const Variant& v) {
  std::string text;
  for (std::size_t i = 0; i < cells.size(); ++i) {
    if (v.delimiter == "%") {
      const std::size_t letters = encoded(cells[i], "UTF-32LE").size() / 4;
      text += std::string(letters < 24 ? 24 - letters : 1, ' ') + cells[i];
    } else {
      text += (i > 0 ? v.delimiter : "") + cells[i];
    }
  }
  return text + v.lineEnd;
}

std::string headOf(const Variant& v) {
  const bool timed = v.clock.column[0] != '\0';
  const bool needsRate = !timed || v.clock.column == std::string("Sample");
  std::vector<std::string> names, units, both;
  const auto add = [&](const std::string& name, const std::string& unit) {
    names.push_back(name);
    units.push_back(unit.empty() ? "-" : unit);
    both.push_back(unit.empty() ? name : name + " [" + unit + "]");
  };
  if (timed) add(v.clock.column, v.clock.unit);
  add("Dämpferweg", "mm");
  add("Force", "N");
  std::string text;
  const std::string rate = "Sample rate: 200 Hz" + v.lineEnd;
  if (v.header == "p") text += "Prüfstand: 3" + v.lineEnd + "Serial = A-12" + v.lineEnd + v.lineEnd;
  if (needsRate) text += (v.header == "c" ? "# " : "") + rate;
  if (v.header == "u") return text + joined(names, v) + joined(units, v);
  if (v.header == "c") return text + "# " + joined(both, v);
  if (v.header == "n") return text;
  if (v.header == "q") {
    for (std::string& name : both) name = "\"" + name + "\"";
  }
  return text + joined(both, v);
}

std::string fileOf(const Variant& v) {
  std::string text = headOf(v);
  for (int i = 0; i < madeRows; ++i) {
    const Sample sample = sampleAt(i);
    std::vector<std::string> cells;
    if (v.clock.column[0] != '\0') cells.push_back(v.clock.text(sample.time, i, v.decimal));
    cells.push_back(inForm(sample.displacement, 4, v.decimal));
    cells.push_back(inForm(sample.force, 2, v.decimal));
    if (v.header == "s") {
      for (std::string& cell : cells) cell = " " + cell + " ";
    }
    text += joined(cells, v);
  }
  if (v.encoding == "BOM") return "\xEF\xBB\xBF" + text;
  return encoded(text, v.encoding.c_str());
}

TEST(Variants, EveryCrossOfDialectsGivesTheSameRecording) {
  int tried = 0, n = 0;
  for (const Clock& clock : clocks)
    for (const Named& delimiter : delimiters)
      for (const Named& header : headers)
        for (const char decimal : {'.', ','})
          for (const Named& encoding : encodings)
            for (const Named& lineEnd : lineEnds) {
              const Variant variant{
                  clock, delimiter.value, lineEnd.value, encoding.value, header.value, decimal};
              // Every eleventh of them: 11 divides none of the numbers of kinds, so that all pairs
              // come up.
              if (++n % 11 != 0 || !variant.possible()) continue;
              ++tried;
              EXPECT_EQ(faultOf(readMade(fileOf(variant))), "")
                  << clock.name << ", " << delimiter.name << ", " << header.name << ", decimal "
                  << decimal << ", " << encoding.name << ", " << lineEnd.name;
            }
  EXPECT_GT(tried, 900);
}

}  // namespace
}  // namespace dampwright
