// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/verdict/conditions.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <string>
#include <utility>

namespace dampwright {
namespace {

constexpr double sameStroke = 0.02;  // of the stroke asked, as core/curves/force_at.h

constexpr std::array<std::pair<BlockKind, std::string_view>, 6> waveforms{{
    {BlockKind::Sine, "sine"},
    {BlockKind::Crank, "crank"},
    {BlockKind::Triangle, "triangle"},
    {BlockKind::Sweep, "sweep"},
    {BlockKind::Hold, "hold"},
    {BlockKind::Other, "other"},
}};

std::string_view waveformOf(BlockKind kind) {
  return std::find_if(
             waveforms.begin(), waveforms.end(), [&](const auto& row) { return row.first == kind; })
      ->second;
}

std::optional<Reason> strokeProblem(const Measurement& measurement, double stroke) {
  for (const MeasuredBlock& measured : measurement.blocks) {
    const bool moves = measured.block.kind != BlockKind::Hold;
    if (moves && std::abs(measured.block.stroke - stroke) <= sameStroke * stroke)
      return std::nullopt;
  }
  return Reason{"stroke-not-tested", {{"stroke", stroke, Quantity::Length}}};
}

// The setting is what the run files say of themselves under "setting".
std::optional<Reason> settingProblem(const Measurement& measurement, const std::string& setting) {
  bool known = !measurement.runs.empty();
  for (const MeasuredRun& run : measurement.runs) {
    bool said = false;
    for (const auto& [key, value] : run.source.metadata) {
      if (key != "setting" && key != "Setting") continue;
      said = true;
      if (value != setting)
        return Reason{"setting-differs", {{"asked", setting}, {"found", value}}};
    }
    known = known && said;
  }
  if (!known) return Reason{"setting-not-known", {{"asked", setting}}};
  return std::nullopt;
}

std::optional<Reason> temperatureProblem(const LimitConditions& conditions,
                                         std::optional<double> temperature) {
  if (!conditions.temperatureFrom && !conditions.temperatureTo) return std::nullopt;
  const double from = conditions.temperatureFrom.value_or(-273.15);
  const double to = conditions.temperatureTo.value_or(1000);
  Values window{{"from", from, Quantity::Temperature}, {"to", to, Quantity::Temperature}};
  if (!temperature) return Reason{"temperature-not-known", window};
  if (*temperature >= from && *temperature <= to) return std::nullopt;
  window.push_back({"temperature", *temperature, Quantity::Temperature});
  return Reason{"temperature-outside-window", window};
}

}  // namespace

std::optional<Reason> conditionProblem(const Measurement& measurement,
                                       const LimitConditions& conditions,
                                       const Figure& figure) {
  if (conditions.stroke) {
    if (auto problem = strokeProblem(measurement, *conditions.stroke)) return problem;
  }
  if (!conditions.setting.empty()) {
    if (auto problem = settingProblem(measurement, conditions.setting)) return problem;
  }
  if (auto problem = temperatureProblem(conditions, figure.temperature)) return problem;
  if (!conditions.waveform.empty() && figure.waveform) {
    const std::string_view found = waveformOf(*figure.waveform);
    if (found != conditions.waveform) {
      return Reason{"waveform-differs",
                    {{"asked", conditions.waveform}, {"found", std::string(found)}}};
    }
  }
  return std::nullopt;
}

}  // namespace dampwright
