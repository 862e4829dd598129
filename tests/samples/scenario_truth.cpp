// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/samples/scenario_truth.h"

#include <algorithm>
#include <cmath>
#include <limits>

#include "core/base/expects.h"

namespace dampwright::samples {
namespace {

constexpr double slowest = 0.005;  // m/s, a block up to here is a slow one

/// Cycles that the conditioning rule leaves out: 4 of a recording's first block above 5 mm/s, 1 of
/// each later one, never more than a third of a block; none of a slow block.
std::size_t conditioning(const SampleTruth& truth, std::size_t index) {
  const bench::BlockTruth& block = truth.blocks[index];
  if (block.plan.speed <= slowest) return 0;
  const bool first =
      truth.damper.layout == FileLayout::FilePerSpeed ||
      std::none_of(truth.blocks.begin(),
                   truth.blocks.begin() + static_cast<std::ptrdiff_t>(index),
                   [](const bench::BlockTruth& b) { return b.plan.speed > slowest; });
  return std::min<std::size_t>(first ? 4 : 1, block.cycles.size() / 3);
}

void readBlocks(SampleTruth& truth) {
  for (std::size_t i = 0; i < truth.blocks.size(); ++i) {
    const bench::BlockTruth& block = truth.blocks[i];
    const std::size_t first = conditioning(truth, i);
    truth.compression.push_back(block.mean(Direction::Compression, first));
    truth.rebound.push_back(block.mean(Direction::Rebound, first));
    truth.energy.push_back(block.meanEnergy(first));
  }
  expects(truth.blocks.front().plan.speed <= slowest);
  truth.gasN = truth.damper.damper.gas.at(truth.blocks.front().plan.mid, 1);
  const bench::DryFriction& friction = truth.damper.damper.friction;
  truth.dryFrictionN =
      friction.form == bench::FrictionForm::Tanh ? friction.dry : friction.breakaway;
  truth.halfDifferenceN = (truth.compression.front().force + truth.rebound.front().force) / 2;
}

double truthOfCheck(const SampleTruth& truth, const SampleCheck& check) {
  if (check.check == "gas force") return truth.gasN;
  if (check.check == "friction") return truth.halfDifferenceN;
  const bool pushed = check.direction == Direction::Compression;
  for (const bench::HalfTruth& half : pushed ? truth.compression : truth.rebound) {
    if (std::abs(half.velocity * 1e3 - check.velocityMmS) > 0.001 * check.velocityMmS) continue;
    return half.force - (pushed ? 1 : -1) * half.gas;
  }
  expects(false);
  return 0;
}

/// The expanded uncertainty (k = 2) that the bench's own certificate and mounting make.
double expectedU(const SampleRig& rig, double force) {
  const double rectangular = std::sqrt(3.0);
  const double reading = rig.readingPercent / 100 * force / rectangular;
  const double capacity = rig.capacityPercent / 100 * rig.capacityN / rectangular;
  const double zero = rig.zeroDriftN / rectangular;
  const double mounting = rig.remountPercent / 100 * force;
  return 2 * std::sqrt(reading * reading + capacity * capacity + zero * zero + mounting * mounting);
}

std::string wordFor(double margin, double uncertainty) {
  if (margin > 1.5 * uncertainty) return "pass";
  if (margin < -1.5 * uncertainty) return "fail";
  expects(std::abs(margin) < 0.35 * uncertainty);  // else nobody could promise anything
  return "too close to call";
}

PromisedCheck promise(const SampleTruth& truth, const SampleCheck& check) {
  PromisedCheck promised{check, truthOfCheck(truth, check), 0, {}};
  promised.expectedU = expectedU(truth.damper.rig, promised.truthN);
  const double infinity = std::numeric_limits<double>::infinity();
  double low = check.minN.value_or(-infinity), high = check.maxN.value_or(infinity);
  if (check.targetN) {
    low = *check.targetN * (1 - check.tolerancePercent / 100);
    high = *check.targetN * (1 + check.tolerancePercent / 100);
  }
  const double margin = std::min(promised.truthN - low, high - promised.truthN);
  promised.verdict = wordFor(margin, promised.expectedU);
  return promised;
}

std::string wholeWord(const std::vector<PromisedCheck>& checks) {
  for (const char* word : {"fail", "too close to call"})
    for (const PromisedCheck& check : checks)
      if (check.verdict == word) return word;
  return "pass";
}

std::vector<SampleFile> filesOf(const SampleDamper& damper, const bench::BenchRun& run) {
  bench::TextStyle style = styleOf(damper.rig);
  style.preamble = damper.preamble;
  if (damper.layout == FileLayout::OneFile)
    return {{damper.file + ".csv", bench::writeText(run.measured, style)}};
  std::vector<SampleFile> files;
  for (const bench::BlockTruth& block : run.blocks) {
    const double aside = block.plan.ramp + damper.plan.dwell / 2;
    const std::size_t keep = block.plan.speed < 0.1 ? 2 : 1;  // slow blocks at half the rate
    std::string speed = std::to_string(std::lround(block.plan.speed * 1e3));
    speed.insert(0, 4 - speed.size(), '0');
    files.push_back(
        {damper.file + "_" + speed + "_mm_s.csv",
         bench::writeText(bench::partOf(run.measured, block.start - aside, block.end + aside, keep),
                          style)});
  }
  return files;
}

}  // namespace

SampleTruth truthOf(const SampleDamper& damper, const SampleVehicle& vehicle) {
  const bench::BenchRun run = bench::simulate(damper.damper, damper.plan, damper.instrument, 1e-4);
  SampleTruth truth;
  truth.damper = damper;
  truth.blocks = run.blocks;
  truth.startC = damper.damper.warmth.start;
  truth.endC = run.temperatureAtEnd;
  readBlocks(truth);
  for (const SampleCheck& check : vehicle.checks) truth.checks.push_back(promise(truth, check));
  truth.verdict = wholeWord(truth.checks);
  truth.files = filesOf(damper, run);
  return truth;
}

}  // namespace dampwright::samples
