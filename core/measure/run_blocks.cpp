// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/measure/run_blocks.h"

#include <algorithm>
#include <iterator>

#include "core/condition/condition.h"
#include "core/curves/read_block.h"
#include "core/cycles/find_blocks.h"
#include "core/measure/range_remarks.h"

namespace dampwright {
namespace {

Error inFile(Error error, const Trace& trace) {
  if (error.place.file.empty()) error.place.file = trace.source.file.name;
  return error;
}

/// Adds a block's remark: the first of its code says where, the others are counted.
void addCounted(std::vector<Remark>& remarks, const Remark& remark, double blockStart) {
  for (Remark& known : remarks) {
    if (known.code != remark.code) continue;
    known.count += std::max<std::int64_t>(remark.count, 1);
    return;
  }
  Remark first = remark;
  first.count = std::max<std::int64_t>(remark.count, 1);
  first.values.push_back({"start", blockStart, Quantity::Time});
  remarks.push_back(std::move(first));
}

MeasuredBlock readOne(Block block, std::size_t index) {
  MeasuredBlock measured;
  const BlockReading reading = readBlock(block);
  measured.run = index;
  measured.block = std::move(block);
  measured.energy = reading.energy;
  measured.meanPower = reading.meanPower;
  measured.equivalentDamping = reading.equivalentDamping;
  measured.phaseLag = reading.phaseLag;
  measured.endForces = reading.endForces;
  measured.compression = reading.compression;
  measured.rebound = reading.rebound;
  return measured;
}

std::vector<Remark> remarksOf(const Trace& trace,
                              const Motion& motion,
                              const std::vector<MeasuredBlock>& blocks) {
  std::vector<Remark> remarks = trace.remarks;
  remarks.insert(remarks.end(), motion.remarks.begin(), motion.remarks.end());
  std::vector<Remark> ofBlocks;
  for (const MeasuredBlock& measured : blocks) {
    for (const Remark& remark : measured.block.remarks) {
      addCounted(ofBlocks, remark, measured.block.start);
    }
    if (measured.energy <= 0 && measured.block.kind != BlockKind::Hold) {
      const Remark gives{"block-absorbs-no-energy", Severity::Warning, {}};
      addCounted(ofBlocks, gives, measured.block.start);
    }
  }
  remarks.insert(remarks.end(), ofBlocks.begin(), ofBlocks.end());
  return remarks;
}

}  // namespace

Result<ReadRun> readRunBlocks(const Trace& trace,
                              std::size_t index,
                              const MeasureOptions& options,
                              const Progress& progress) {
  Result<Motion> motion = condition(trace, conditionOptions(options.rig), progress);
  if (!motion) return inFile(motion.error(), trace);
  CycleOptions cycleOptions;
  cycleOptions.firstBlockConditioning = options.firstBlockConditioning;
  cycleOptions.laterBlockConditioning = options.laterBlockConditioning;
  if (index < options.struckOut.size()) cycleOptions.struckOut = options.struckOut[index];
  Result<std::vector<Block>> blocks = findBlocks(motion.value(), cycleOptions, progress);
  if (!blocks) return inFile(blocks.error(), trace);

  ReadRun read;
  for (Block& block : blocks.value()) {
    if (progress.cancelled()) return Error{"stopped", {}, {}};
    read.blocks.push_back(readOne(std::move(block), index));
  }
  read.run.source = trace.source;
  read.run.sampleRate = motion.value().rate;
  read.run.zeroState = trace.zeroState;
  read.run.directionSettled = trace.directionSettled;
  read.run.struckOut = cycleOptions.struckOut;
  read.run.remarks = remarksOf(trace, motion.value(), read.blocks);
  std::ranges::move(rangeRemarks(trace, read.blocks, options.rig.loadCell, options.card),
                    std::back_inserter(read.run.remarks));
  read.motion = std::move(motion).value();
  return read;
}

}  // namespace dampwright
