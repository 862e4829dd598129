// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/measure/range_remarks.h"

#include <algorithm>
#include <cmath>
#include <cstdint>

namespace dampwright {
namespace {

constexpr double calibrationSpare = 1.01;
constexpr double longestStroke = 1.0;  // m
constexpr double fastestBench = 15.0;  // m/s

double strokeOf(std::span<const MeasuredBlock> blocks) {
  double stroke = 0;
  for (const MeasuredBlock& measured : blocks) stroke = std::max(stroke, measured.block.stroke);
  return stroke;
}

double speedOf(std::span<const MeasuredBlock> blocks) {
  double speed = 0;
  for (const MeasuredBlock& measured : blocks) {
    for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
      speed = std::max(speed, measured.reading(direction).peakVelocity);
    }
  }
  return speed;
}

std::optional<Remark> beyondDamper(double stroke, const std::optional<DamperCard>& card) {
  if (!card || !card->openLength || !card->closedLength) return std::nullopt;
  const double travel = *card->openLength - *card->closedLength;
  if (!(travel > 0) || stroke <= travel * calibrationSpare) return std::nullopt;
  return Remark{"stroke-beyond-damper",
                Severity::Warning,
                {{"stroke", stroke, Quantity::Length}, {"travel", travel, Quantity::Length}}};
}

std::optional<Remark> beyondCell(const Trace& trace, const LoadCell& cell) {
  if (!cell.capacity) return std::nullopt;
  double largest = 0;
  std::int64_t count = 0, first = 0;
  for (std::size_t i = 0; i < trace.force.size(); ++i) {
    if (!(std::abs(trace.force[i]) > *cell.capacity)) continue;
    largest = std::max(largest, std::abs(trace.force[i]));
    if (count++ == 0) first = trace.source.firstDataRow + static_cast<std::int64_t>(i);
  }
  if (count == 0) return std::nullopt;
  return Remark{
      "force-beyond-cell",
      Severity::Warning,
      {{"force", largest, Quantity::Force}, {"capacity", *cell.capacity, Quantity::Force}},
      count,
      first};
}

std::optional<Remark> implausible(double stroke, double speed) {
  if (stroke <= longestStroke && speed <= fastestBench) return std::nullopt;
  return Remark{"motion-implausible",
                Severity::Warning,
                {{"stroke", stroke, Quantity::Length}, {"speed", speed, Quantity::Velocity}}};
}

}  // namespace

std::vector<Remark> rangeRemarks(const Trace& trace,
                                 std::span<const MeasuredBlock> blocks,
                                 const LoadCell& cell,
                                 const std::optional<DamperCard>& card) {
  const double stroke = strokeOf(blocks);
  std::vector<Remark> remarks;
  if (auto remark = beyondDamper(stroke, card)) remarks.push_back(*remark);
  if (auto remark = beyondCell(trace, cell)) remarks.push_back(*remark);
  if (auto remark = implausible(stroke, speedOf(blocks))) remarks.push_back(*remark);
  return remarks;
}

}  // namespace dampwright
