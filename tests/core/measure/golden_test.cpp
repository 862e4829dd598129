// SPDX-License-Identifier: GPL-3.0-or-later
// Figures of one sample run, kept with the method number that made them. When an algorithm changes
// a figure, raise `measurementMethod` and write the file anew:
//   DAMPWRIGHT_WRITE_GOLDEN=1 build/dev/bin/test_measure --gtest_filter='Golden.*'
#include <gtest/gtest.h>

#include <cmath>
#include <cstdlib>
#include <fstream>
#include <iomanip>
#include <map>
#include <sstream>

#include "core/intake/read_run.h"
#include "core/measure/measure_runs.h"

namespace dampwright {
namespace {

const char* const goldenFile = DAMPWRIGHT_SOURCE_DIR "/tests/reference/golden/car_front_left.txt";
constexpr double rounding = 1e-6;  // [1] compilers and processors round sums their own way

using Figures = std::map<std::string, double>;

void addReading(Figures& figures, const std::string& name, const Reading& reading) {
  figures[name + " peak velocity"] = reading.peakVelocity;
  figures[name + " force"] = reading.force;
  figures[name + " force u"] = reading.forceTotalU;
  figures[name + " damping force"] = reading.dampingForce.value_or(NAN);
  figures[name + " damping force u"] = reading.dampingForceTotalU;
  figures[name + " largest force"] = reading.largestForce;
  figures[name + " energy"] = reading.energy;
}

void addLaws(Figures& figures, const std::string& name, const std::vector<FittedLaw>& laws) {
  for (const FittedLaw& law : laws) {
    figures[name + " " + law.law + " rms"] = law.rms;
    for (const FittedParameter& parameter : law.parameters) {
      figures[name + " " + law.law + " " + parameter.name] = parameter.value;
      figures[name + " " + law.law + " " + parameter.name + " u"] = parameter.u;
    }
  }
}

Figures figuresOf(const Measurement& m) {
  Figures figures;
  for (std::size_t i = 0; i < m.blocks.size(); ++i) {
    const std::string name = "block " + std::to_string(i);
    const MeasuredBlock& block = m.blocks[i];
    figures[name + " mid"] = block.block.mid;
    if (block.block.kind == BlockKind::Hold) continue;
    figures[name + " stroke"] = block.block.stroke;
    figures[name + " frequency"] = block.block.frequency;
    figures[name + " cycles used"] = block.block.cyclesUsed();
    figures[name + " energy"] = block.energy;
    figures[name + " equivalent damping"] = block.equivalentDamping;
    addReading(figures, name + " compression", block.compression);
    addReading(figures, name + " rebound", block.rebound);
  }
  figures["gas force"] = m.gas.force.value_or(NAN);
  figures["gas force u"] = m.gas.totalU;
  figures["gas rate"] = m.gas.rate.value_or(NAN);
  figures["dry friction"] = m.friction.dry.value_or(NAN);
  figures["dry friction u"] = m.friction.dryTotalU;
  figures["half difference"] = m.friction.halfDifference.value_or(NAN);
  figures["half difference u"] = m.friction.halfDifferenceTotalU;
  figures["scatter percent"] = m.typeAPercent;
  addLaws(figures, "compression", m.compressionLaws);
  addLaws(figures, "rebound", m.reboundLaws);
  return figures;
}

Figures measuredFigures() {
  std::ifstream file(DAMPWRIGHT_SOURCE_DIR "/sample_runs/car_front_left.csv", std::ios::binary);
  std::stringstream bytes;
  bytes << file.rdbuf();
  const auto reading = readRun(bytes.str(), "car_front_left.csv", {}, {}, {});
  if (!reading || !reading.value().trace) return {};
  const auto measured = measureRuns(std::span(&*reading.value().trace, 1), {}, {});
  return measured ? figuresOf(measured.value().measurement) : Figures{};
}

struct Golden {
  int method = 0;
  Figures figures;
};

/// "method 1", then a line "value name" for each figure.
Golden readGolden() {
  Golden golden;
  std::ifstream file(goldenFile);
  std::string word;
  file >> word >> golden.method;
  for (double value = 0; file >> value;) {
    std::string name;
    std::getline(file >> std::ws, name);
    golden.figures[name] = value;
  }
  return golden;
}

void writeGolden(const Figures& figures) {
  std::ofstream file(goldenFile);
  file << "method " << measurementMethod << "\n" << std::setprecision(12);
  for (const auto& [name, value] : figures) file << value << " " << name << "\n";
}

std::vector<std::string> differences(const Figures& expected, const Figures& found) {
  std::vector<std::string> moved;
  for (const auto& [name, value] : expected) {
    const auto match = found.find(name);
    const bool same = match != found.end() &&
                      std::abs(match->second - value) <= rounding * std::abs(value) + 1e-9;
    if (!same) moved.push_back(name);
  }
  for (const auto& [name, value] : found) {
    if (!expected.contains(name)) moved.push_back(name);
  }
  return moved;
}

TEST(Golden, FiguresMoveOnlyWithTheMethodNumber) {
  const Figures found = measuredFigures();
  ASSERT_GT(found.size(), 100u);
  const Golden golden = readGolden();
  const auto moved = differences(golden.figures, found);
  if (std::getenv("DAMPWRIGHT_WRITE_GOLDEN") != nullptr && golden.method < measurementMethod) {
    writeGolden(found);
    GTEST_SKIP() << "written for method " << measurementMethod;
  }
  EXPECT_EQ(golden.method, measurementMethod) << "write the figures of the new method, see above";
  for (const std::string& name : moved) {
    ADD_FAILURE() << name << " moved: raise measurementMethod and write the figures anew";
  }
}

TEST(Golden, AMovedFigureIsNoticed) {
  const Figures kept = {{"a", 1.0}, {"b", 2.0}};
  EXPECT_TRUE(differences(kept, {{"a", 1.0 + 1e-9}, {"b", 2.0}}).empty());
  EXPECT_EQ(differences(kept, {{"a", 1.001}, {"b", 2.0}}), std::vector<std::string>{"a"});
  EXPECT_EQ(differences(kept, {{"a", 1.0}}), std::vector<std::string>{"b"});
  EXPECT_EQ(differences(kept, {{"a", 1.0}, {"b", 2.0}, {"c", 3.0}}), std::vector<std::string>{"c"});
}

}  // namespace
}  // namespace dampwright
