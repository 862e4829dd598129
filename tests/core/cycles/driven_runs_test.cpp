// SPDX-License-Identifier: GPL-3.0-or-later
// Motions as a bench really drives them, in closed form: ramps, drifts, rests, slow and fast
// loggers. Noise 0.01 mm unless said, mt19937_64.
#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <random>

#include "core/base/units.h"
#include "core/cycles/find_blocks.h"
#include "tests/support/bench_drive.h"

namespace dampwright {
namespace {

struct Driven {
  bench::Drive drive;
  std::vector<Block> blocks;  ///< without holds
};

Driven driven(const bench::DrivePlan& plan, double rate = 2000, double noise = 1e-5) {
  Driven out{bench::Drive(plan), {}};
  std::mt19937_64 random(4);
  std::normal_distribution<double> scatter(0, 1);
  Motion motion;
  motion.rate = rate;
  for (std::size_t i = 0; static_cast<double>(i) / rate < out.drive.duration(); ++i) {
    const bench::DrivePoint point = out.drive.at(static_cast<double>(i) / rate);
    motion.displacement.push_back(point.x + noise * scatter(random));
    motion.velocity.push_back(point.v);
    motion.force.push_back(1500 * point.v);
  }
  motion.doubtful.resize(motion.size());
  auto blocks = findBlocks(motion);
  EXPECT_TRUE(blocks);
  if (blocks) out.blocks = std::move(blocks).value();
  std::erase_if(out.blocks, [](const Block& block) { return block.kind == BlockKind::Hold; });
  return out;
}

double fastest(const Block& block) {
  return *std::max_element(block.loop.velocity.begin(), block.loop.velocity.end());
}

/// Each planned block is found once, with stroke, mid-stroke, peak speed and most of its cycles.
void expectAsPlanned(const Driven& run, double speedShare, double place) {
  ASSERT_EQ(run.blocks.size(), run.drive.blocks().size());
  for (std::size_t i = 0; i < run.blocks.size(); ++i) {
    const Block& block = run.blocks[i];
    const bench::BlockPlan& plan = run.drive.blocks()[i].plan;
    EXPECT_NEAR(block.stroke, plan.stroke, place) << i;
    EXPECT_NEAR(block.mid, plan.mid, place) << i;
    EXPECT_NEAR(fastest(block), plan.speed, speedShare * plan.speed) << i;
    EXPECT_GE(static_cast<int>(block.cycles.size()), plan.turns - 3) << i;
  }
}

bench::DrivePlan threeSpeeds(const bench::BlockPlan& like) {
  bench::DrivePlan plan;
  for (const double speed : {0.1, 0.3, 0.8}) {
    bench::BlockPlan block = like;
    block.speed = speed;
    block.turns = speed > 0.5 ? 14 : 9;
    plan.steps.emplace_back(block);
  }
  return plan;
}

TEST(DrivenRuns, RampsAtBothEndsOfEachBlockBelongToNone) {
  expectAsPlanned(driven(threeSpeeds({.ramp = 0.4})), 1e-3, 2e-5);
}

TEST(DrivenRuns, CranksAreFoundAndNamed) {
  const Driven run = driven(threeSpeeds({.wave = bench::Wave::Crank}));
  expectAsPlanned(run, 1e-3, 2e-5);
  for (const Block& block : run.blocks) EXPECT_EQ(block.kind, BlockKind::Crank);
}

TEST(DrivenRuns, TrianglesAreFoundAndNamed) {
  const Driven run = driven(threeSpeeds({.wave = bench::Wave::Triangle}));
  ASSERT_EQ(run.blocks.size(), 3u);
  for (const Block& block : run.blocks) EXPECT_EQ(block.kind, BlockKind::Triangle);
}

TEST(DrivenRuns, AShiftedMidStrokeIsTheBlocksOwn) {
  bench::DrivePlan plan = threeSpeeds({});
  double mid = -0.012;
  for (auto& step : plan.steps) {
    std::get<bench::BlockPlan>(step).mid = mid;
    mid += 0.011;
  }
  expectAsPlanned(driven(plan), 1e-3, 2e-5);
}

TEST(DrivenRuns, ADriftingStrokeStaysOneBlockOfItsMeanStroke) {
  const Driven run = driven(threeSpeeds({.strokeDrift = 0.02}));
  ASSERT_EQ(run.blocks.size(), 3u);
  for (const Block& block : run.blocks) {
    EXPECT_GT(block.stroke, 0.05);
    EXPECT_LT(block.stroke, 0.051 + 2e-5);
  }
}

TEST(DrivenRuns, ADriftingMidStrokeStaysOneBlock) {
  const Driven run = driven(threeSpeeds({.midDrift = 0.001}));
  ASSERT_EQ(run.blocks.size(), 3u);
  for (const Block& block : run.blocks) {
    EXPECT_GT(block.mid, 0);
    EXPECT_LT(block.mid, 0.001);
    EXPECT_NEAR(block.stroke, 0.05, 1e-4);
  }
}

TEST(DrivenRuns, RestsOfTwoSecondsBetweenTheBlocksAreHolds) {
  bench::DrivePlan plan = threeSpeeds({});
  plan.dwell = 2;
  expectAsPlanned(driven(plan), 1e-3, 2e-5);
}

TEST(DrivenRuns, LoggersOf100HzTo50kHzSeeTheSameBlocks) {
  for (const double rate : {200.0, 1000.0, 10000.0, 50000.0})
    expectAsPlanned(driven(threeSpeeds({}), rate), 2e-3, 3e-5);
  // 100 Hz: at 0.8 m/s a cycle has 20 samples, and a spline loses (2π/20)⁴/384 of it
  expectAsPlanned(driven(threeSpeeds({}), 100), 5e-3, 1e-4);
}

TEST(DrivenRuns, ASweepIsABlockForEachCycleByRisingSpeed) {
  bench::DrivePlan plan;
  plan.steps = {bench::BlockPlan{.speed = 0.1, .turns = 14, .endSpeed = 0.8}};
  const Driven run = driven(plan);
  ASSERT_GE(run.blocks.size(), 8u);
  const auto isSweep = [](const Block& block) { return block.kind == BlockKind::Sweep; };
  const auto sweeps = std::count_if(run.blocks.begin(), run.blocks.end(), isSweep);
  // the cycle that the ramp cuts short at the end may stand by itself
  EXPECT_GE(sweeps + 1, static_cast<std::ptrdiff_t>(run.blocks.size()));
  for (std::size_t i = 1; i < run.blocks.size(); ++i) {
    EXPECT_GT(fastest(run.blocks[i]), fastest(run.blocks[i - 1]));
  }
}

}  // namespace
}  // namespace dampwright
