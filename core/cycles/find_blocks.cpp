// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/find_blocks.h"

#include <algorithm>
#include <cmath>

#include "core/base/units.h"
#include "core/cycles/average_loop.h"
#include "core/cycles/conditioning.h"
#include "core/cycles/find_cycles.h"
#include "core/cycles/group_cycles.h"
#include "core/cycles/hold_block.h"
#include "core/cycles/warmth.h"

namespace dampwright {
namespace {

// First sample behind `from` at which the displacement has risen through the level.
double risesThrough(const Motion& motion, std::size_t from, double level) {
  std::size_t i = from + 1;
  while (i + 1 < motion.size() && motion.displacement[i] < level) ++i;
  const double before = motion.displacement[i - 1], here = motion.displacement[i];
  const double share = here > before ? (level - before) / (here - before) : 1;
  return static_cast<double>(i) - 1 + std::clamp(share, 0.0, 1.0);
}

// Mean speed over the middle fifth of the way up: within 1 % of the peak of a sine.
double middleSpeed(const Motion& motion, const RawCycle& cycle) {
  const double low = motion.displacement[cycle.firstSample()];
  const double from = risesThrough(motion, cycle.firstSample(), low + 0.4 * cycle.stroke);
  const double to = risesThrough(motion, static_cast<std::size_t>(from), low + 0.6 * cycle.stroke);
  return to > from ? 0.2 * cycle.stroke / (to - from) * motion.rate : 0;
}

class BlockMaker {
 public:
  BlockMaker(const Motion& motion, const CycleOptions& options)
      : motion_(motion), options_(options), averager_(motion) {}

  Block make(const CycleGroup& group, bool firstFast) const;

 private:
  Cycle cycleOf(const RawCycle& raw) const;
  std::optional<double> temperatureOf(const std::vector<RawCycle>& cycles) const;

  const Motion& motion_;
  const CycleOptions& options_;
  LoopAverager averager_;
};

Cycle BlockMaker::cycleOf(const RawCycle& raw) const {
  const auto timeAt = [&](double sample) { return motion_.startTime + sample / motion_.rate; };
  Cycle cycle{timeAt(raw.start), timeAt(raw.top), timeAt(raw.end)};
  cycle.struckOut =
      std::any_of(options_.struckOut.begin(), options_.struckOut.end(), [&](const TimeSpan& span) {
        return span.start < cycle.end && span.end > cycle.start;
      });
  return cycle;
}

std::optional<double> BlockMaker::temperatureOf(const std::vector<RawCycle>& cycles) const {
  if (motion_.temperature.empty()) return std::nullopt;
  double sum = 0, count = 0;
  for (const RawCycle& cycle : cycles) {
    const auto to = std::min(static_cast<std::size_t>(cycle.end), motion_.size() - 1);
    for (std::size_t i = cycle.firstSample(); i <= to; ++i, count += 1)
      sum += motion_.temperature[i];
  }
  return sum / count;
}

Remark countRemark(const char* code, int leftOut, int wanted) {
  Remark remark{code, Severity::Note, {}, leftOut, 0};
  remark.values = {{"left_out", static_cast<double>(leftOut), Quantity::Count},
                   {"wanted", static_cast<double>(wanted), Quantity::Count}};
  return remark;
}

std::vector<Remark> remarksOf(const Block& block, const Conditioning& rule) {
  std::vector<Remark> remarks;
  if (block.kind != BlockKind::Sweep && rule.leftOut < rule.wanted)
    remarks.push_back(countRemark("few-conditioning-cycles", rule.leftOut, rule.wanted));
  if (block.kind != BlockKind::Sweep && block.cyclesUsed() == 1)
    remarks.push_back({"too-few-cycles", Severity::Note, {}, 1, 0});
  const auto struck = std::count_if(
      block.cycles.begin(), block.cycles.end(), [](const Cycle& cycle) { return cycle.struckOut; });
  if (struck > 0) remarks.push_back({"cycle-struck-out", Severity::Note, {}, struck, 0});
  if (const auto cold = notWarm(block)) remarks.push_back(*cold);
  return remarks;
}

Block BlockMaker::make(const CycleGroup& group, bool firstFast) const {
  const double speed = middleSpeed(motion_, group.cycles.back());
  const Conditioning rule = conditioningOf(group, {speed, firstFast}, options_);
  Block block;
  std::vector<RawCycle> used;
  for (const RawCycle& raw : group.cycles) {
    Cycle cycle = cycleOf(raw);
    cycle.conditioning = static_cast<int>(block.cycles.size()) < rule.leftOut;
    if (cycle.used()) used.push_back(raw);
    block.cycles.push_back(cycle);
  }
  block.start = block.cycles.front().start;
  block.end = block.cycles.back().end;
  AveragedLoop averaged = averager_.average(used.empty() ? group.cycles : used);
  block.kind = group.sweep ? BlockKind::Sweep : averaged.shape.kind;
  block.frequency = 1 / averaged.mean.period;
  block.stroke = averaged.shape.stroke;
  block.mid = averaged.shape.mid;
  if (!used.empty()) {
    block.temperature = temperatureOf(used);
    block.loop = std::move(averaged.mean);
    block.singles = std::move(averaged.singles);
  }
  block.remarks = remarksOf(block, rule);
  return block;
}

// Blocks of the groups in time order, the conditioning rule kept over the whole recording.
std::vector<Block> speedBlocks(const Motion& motion,
                               const CycleOptions& options,
                               const std::vector<CycleGroup>& groups,
                               const Progress& progress) {
  const BlockMaker maker(motion, options);
  std::vector<Block> blocks;
  bool fastSeen = false;
  double lastEnd = 0;
  for (const CycleGroup& group : groups) {
    if (progress.cancelled()) break;
    const double rest = (group.cycles.front().start - lastEnd) / motion.rate;
    if (rest > options.longStandstill) fastSeen = false;
    blocks.push_back(maker.make(group, !fastSeen));
    fastSeen = fastSeen || !isSlow(middleSpeed(motion, group.cycles.back()), options);
    lastEnd = group.cycles.back().end;
  }
  return blocks;
}

Error noFullCycle(const Motion& motion, const StrokeSummary& found) {
  return {"no-full-cycle",
          {{"turning_points", static_cast<double>(found.turningPoints), Quantity::Count},
           {"longest_stroke", found.longestStroke, Quantity::Length},
           {"duration", static_cast<double>(motion.size()) / motion.rate, Quantity::Time}},
          {}};
}

}  // namespace

Result<std::vector<Block>> findBlocks(const Motion& motion,
                                      const CycleOptions& options,
                                      const Progress& progress) {
  const StrokeSummary found =
      motion.size() < 8 ? StrokeSummary{} : findCycles(motion, options.reversal, options.holdTime);
  if (found.cycles.empty()) return noFullCycle(motion, found);
  if (progress.cancelled()) return Error{"stopped", {}, {}};
  std::vector<Block> blocks =
      speedBlocks(motion, options, groupCycles(found.cycles, options.alike), progress);
  if (progress.cancelled()) return Error{"stopped", {}, {}};
  for (const Standstill& hold : found.holds)
    if (auto block = holdBlock(motion, hold)) blocks.push_back(std::move(*block));
  std::sort(blocks.begin(), blocks.end(), [](const Block& a, const Block& b) {
    return a.start < b.start;
  });
  return blocks;
}

}  // namespace dampwright
