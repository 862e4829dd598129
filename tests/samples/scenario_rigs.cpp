// SPDX-License-Identifier: GPL-3.0-or-later
#include <algorithm>

#include "core/base/units.h"
#include "tests/samples/scenario.h"

namespace dampwright::samples {

using bench::Channel;

SampleRig bench1() {
  SampleRig rig;
  rig.name = "bench 1";
  rig.channels = {{Channel::Time, "Time", "s", 1, 3},
                  {Channel::Displacement, "Position", "mm", 1e-3, 3},
                  {Channel::Force, "Load", "N", 1, 1},
                  {Channel::Temperature, "Body", "°C", 1, 1}};
  return rig;
}

SampleRig bench2() {
  SampleRig rig;
  rig.name = "bench 2";
  rig.channels = {{Channel::Time, "Zeit", "s", 1, 3},
                  {Channel::Displacement, "Weg", "mm", 1e-3, 2},
                  {Channel::Force, "Kraft", "N", 1, 1},
                  {Channel::Temperature, "Temperatur", "°C", 1, 1}};
  rig.nameForm = NameForm::UnitInSquare;
  rig.style.delimiter = ';';
  rig.style.decimalMark = ',';
  rig.style.lineEnd = "\r\n";
  rig.style.encoding = bench::Encoding::Windows1252;
  rig.positive = Direction::Rebound;
  rig.readingPercent = 0.25;
  return rig;
}

SampleRig bench3() {
  SampleRig rig;
  rig.name = "bench 3";
  rig.channels = {{Channel::Time, "Time", "s", 1, 3},
                  {Channel::Displacement, "Crosshead", "mm", 1e-3, 2},
                  {Channel::Force, "Cell", "kN", 1e3, 4}};
  rig.nameForm = NameForm::UnitInRow;
  rig.style.delimiter = '\t';
  rig.style.lineEnd = "\r\n";
  rig.style.encoding = bench::Encoding::Utf8WithBom;
  rig.style.unitRow = bench::UnitRow::Present;
  rig.forceDelayMs = 0.4;
  return rig;
}

SampleRig bench4() {
  SampleRig rig;
  rig.name = "bench 4";
  rig.channels = {{Channel::Time, "Time", "s", 1, 4},
                  {Channel::Displacement, "Travel", "in", metresPerInch, 4},
                  {Channel::Force, "Force", "lbf", newtonsPerPoundForce, 2}};
  rig.nameForm = NameForm::UnitInSquare;
  rig.capacityN = 5000;
  rig.movingMassKg = 1.2;
  return rig;
}

bench::DrivePlan samplePlan(double stroke,
                            double warmUp,
                            const std::vector<std::pair<double, int>>& speedsAndTurns) {
  bench::DrivePlan plan;
  plan.steps.push_back(bench::BlockPlan{.speed = 0.005, .stroke = stroke, .turns = 2});
  plan.steps.push_back(bench::BlockPlan{.speed = warmUp, .stroke = stroke, .turns = 14});
  for (const auto& [speed, turns] : speedsAndTurns)
    plan.steps.push_back(bench::BlockPlan{.speed = speed, .stroke = stroke, .turns = turns});
  return plan;
}

std::string signatureOf(const SampleRig& rig) {
  std::string line;
  for (const RigChannel& channel : rig.channels) {
    std::string name = channel.name;
    std::transform(name.begin(), name.end(), name.begin(), [](char c) {
      return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c;
    });
    line += (line.empty() ? "" : "|") + name + " [" + channel.unit + "]";
  }
  return line;
}

bench::TextStyle styleOf(const SampleRig& rig) {
  bench::TextStyle style = rig.style;
  for (const RigChannel& channel : rig.channels) {
    std::string name = channel.name;
    if (rig.nameForm == NameForm::UnitInRound) name += " (" + channel.unit + ")";
    if (rig.nameForm == NameForm::UnitInSquare) name += " [" + channel.unit + "]";
    const bool turns = channel.channel == Channel::Displacement ||
                       channel.channel == Channel::Velocity || channel.channel == Channel::Force;
    const double sign = turns ? signOf(rig.positive) : 1.0;
    style.columns.push_back(
        {channel.channel, name, channel.unit, sign * channel.siPerUnit, channel.decimals});
  }
  return style;
}

}  // namespace dampwright::samples
