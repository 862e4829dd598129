// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/cycles/find_blocks.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <string>
#include <vector>

#include "tests/core/cycles/made_motion.h"

namespace dampwright {
namespace {

using test::MadePlan;
using test::MadeShape;
using test::MadeWave;
using test::motionOf;
using test::waveAt;

MadePlan planOf(std::vector<MadeWave> waves) {
  MadePlan plan;
  plan.waves = std::move(waves);
  return plan;
}

MadePlan noisy(MadePlan plan) {
  plan.displacementNoise = 1e-5;
  plan.forceNoise = 2;
  return plan;
}

std::vector<Block> blocksOf(const Motion& motion, const CycleOptions& options = {}) {
  auto blocks = findBlocks(motion, options);
  EXPECT_TRUE(blocks);
  return blocks ? std::move(blocks).value() : std::vector<Block>{};
}

std::vector<Block> blocksOf(const MadePlan& plan, const CycleOptions& options = {}) {
  return blocksOf(motionOf(test::makeRun(plan)), options);
}

std::vector<Block> moving(std::vector<Block> blocks) {
  std::erase_if(blocks, [](const Block& block) { return block.kind == BlockKind::Hold; });
  return blocks;
}

bool says(const Block& block, const std::string& code) {
  return std::any_of(block.remarks.begin(), block.remarks.end(), [&](const Remark& remark) {
    return remark.code == code;
  });
}

TEST(FindBlocks, EachSpeedIsABlockWithItsStrokeAndFrequency) {
  const auto blocks = moving(
      blocksOf(noisy(planOf({waveAt(0.1, 8), waveAt(0.25, 8), waveAt(0.5, 8), waveAt(1, 8)}))));
  ASSERT_EQ(blocks.size(), 4u);
  const double speeds[] = {0.1, 0.25, 0.5, 1};
  for (std::size_t i = 0; i < 4; ++i) {
    EXPECT_EQ(blocks[i].kind, BlockKind::Sine);
    EXPECT_NEAR(blocks[i].stroke, 0.05, 5e-6);  // 1e-4 of the stroke
    EXPECT_NEAR(blocks[i].mid, 0, 3e-6);
    const double frequency = test::sineFrequency(0.05, speeds[i]);
    EXPECT_NEAR(blocks[i].frequency, frequency, 1e-4 * frequency);
    EXPECT_GE(blocks[i].loop.size(), 720u);
    EXPECT_EQ(blocks[i].loop.cycles, blocks[i].cyclesUsed());
    EXPECT_EQ(blocks[i].singles.size(), static_cast<std::size_t>(blocks[i].cyclesUsed()));
  }
}

TEST(FindBlocks, FourCyclesOfTheFirstBlockAndOneOfEachLaterAreConditioning) {
  const auto blocks = moving(blocksOf(planOf({waveAt(0.1, 14), waveAt(0.25, 14)})));
  ASSERT_EQ(blocks.size(), 2u);
  // the run begins and ends at a turning point, so every cycle counts but those over the change
  EXPECT_EQ(blocks[0].cycles.size() - static_cast<std::size_t>(blocks[0].cyclesUsed()), 4u);
  EXPECT_EQ(blocks[1].cycles.size() - static_cast<std::size_t>(blocks[1].cyclesUsed()), 1u);
  for (std::size_t i = 0; i < blocks[0].cycles.size(); ++i)
    EXPECT_EQ(blocks[0].cycles[i].conditioning, i < 4);
}

TEST(FindBlocks, NeverMoreThanAThirdIsConditioning) {
  for (const int cycles : {2, 3, 5, 6, 9, 12, 13}) {
    const auto blocks = moving(blocksOf(planOf({waveAt(0.1, cycles)})));
    ASSERT_EQ(blocks.size(), 1u);
    const int found = static_cast<int>(blocks[0].cycles.size());
    EXPECT_EQ(found, cycles);
    EXPECT_EQ(found - blocks[0].cyclesUsed(), std::min(4, cycles / 3)) << cycles;
    EXPECT_EQ(says(blocks[0], "few-conditioning-cycles"), cycles / 3 < 4) << cycles;
  }
}

TEST(FindBlocks, ASlowBlockLosesNoWholeCycleAndIsNotTheFirst) {
  const auto blocks = moving(blocksOf(noisy(planOf({waveAt(0.005, 2), waveAt(0.1, 13)}))));
  ASSERT_EQ(blocks.size(), 2u);
  EXPECT_EQ(blocks[0].cyclesUsed(), 2);
  EXPECT_FALSE(says(blocks[0], "few-conditioning-cycles"));
  EXPECT_EQ(static_cast<int>(blocks[1].cycles.size()) - blocks[1].cyclesUsed(), 4);
}

TEST(FindBlocks, AfterAStandstillOfAMinuteFourCyclesAreConditioningAgain) {
  for (const double rest : {30.0, 70.0}) {
    MadeWave first = waveAt(0.25, 13);
    first.rest = rest;
    const auto blocks = moving(blocksOf(noisy(planOf({first, waveAt(0.5, 13)}))));
    ASSERT_EQ(blocks.size(), 2u);
    EXPECT_EQ(static_cast<int>(blocks[1].cycles.size()) - blocks[1].cyclesUsed(),
              rest > 60 ? 4 : 1);
  }
}

TEST(FindBlocks, TheNumbersOfConditioningCyclesAreAdjustable) {
  CycleOptions options;
  options.firstBlockConditioning = 2;
  options.laterBlockConditioning = 0;
  const auto blocks = moving(blocksOf(planOf({waveAt(0.1, 12), waveAt(0.25, 12)}), options));
  ASSERT_EQ(blocks.size(), 2u);
  EXPECT_EQ(static_cast<int>(blocks[0].cycles.size()) - blocks[0].cyclesUsed(), 2);
  EXPECT_EQ(static_cast<int>(blocks[1].cycles.size()) - blocks[1].cyclesUsed(), 0);
}

TEST(FindBlocks, AtFiveMillimetresASecondNoiseMakesNoExtraCycle) {
  for (const std::uint64_t seed : {1u, 2u, 3u}) {
    MadePlan plan = noisy(planOf({waveAt(0.005, 3)}));
    plan.seed = seed;
    plan.lead = 2;
    const auto blocks = moving(blocksOf(plan));
    ASSERT_EQ(blocks.size(), 1u);
    EXPECT_EQ(blocks[0].cycles.size(), 3u);
    EXPECT_EQ(blocks[0].kind, BlockKind::Sine);
    // 1e-4: the last turn ends the recording, so it is seen from one side only
    EXPECT_NEAR(blocks[0].frequency, test::sineFrequency(0.05, 0.005), 3e-6);
  }
}

TEST(FindBlocks, ADwellAtTheTurningPointsMakesNoExtraCycle) {
  MadeWave wave{.stroke = 0.05, .frequency = 0.5, .cycles = 6, .shape = MadeShape::Triangle};
  wave.dwell = 0.4;
  const auto blocks = moving(blocksOf(noisy(planOf({wave}))));
  ASSERT_EQ(blocks.size(), 1u);
  EXPECT_EQ(blocks[0].cycles.size(), 5u);  // before the first there was no dwell
  EXPECT_NEAR(blocks[0].frequency, 1 / 2.8, 1e-3);
  EXPECT_EQ(blocks[0].kind, BlockKind::Triangle);
}

TEST(FindBlocks, WaveformsAreToldApart) {
  for (const MadeShape shape : {MadeShape::Sine, MadeShape::Crank, MadeShape::Triangle}) {
    for (const double speed : {0.02, 0.25, 1.0}) {
      MadeWave wave = waveAt(speed, 6);
      wave.shape = shape;
      const auto blocks = moving(blocksOf(noisy(planOf({wave}))));
      ASSERT_EQ(blocks.size(), 1u);
      const BlockKind expected = shape == MadeShape::Sine    ? BlockKind::Sine
                                 : shape == MadeShape::Crank ? BlockKind::Crank
                                                             : BlockKind::Triangle;
      EXPECT_EQ(blocks[0].kind, expected) << speed;
    }
  }
}

TEST(FindBlocks, ASweepIsABlockForEachCycle) {
  std::vector<MadeWave> waves;
  for (int i = 0; i < 14; ++i) waves.push_back(waveAt(0.1 * std::pow(1.03, i), 1));
  const auto blocks = moving(blocksOf(noisy(planOf(waves))));
  EXPECT_GE(blocks.size(), 12u);
  for (const Block& block : blocks) {
    EXPECT_EQ(block.kind, BlockKind::Sweep);
    EXPECT_EQ(block.cyclesUsed(), 1);
  }
}

TEST(FindBlocks, ACycleOnTheRampBetweenTwoBlocksBelongsToNeither) {
  const auto blocks = moving(
      blocksOf(noisy(planOf({waveAt(0.1, 8), waveAt(0.13, 1), waveAt(0.17, 1), waveAt(0.25, 8)}))));
  ASSERT_EQ(blocks.size(), 2u);
  EXPECT_NEAR(blocks[0].frequency, test::sineFrequency(0.05, 0.1), 1e-3);
  EXPECT_NEAR(blocks[1].frequency, test::sineFrequency(0.05, 0.25), 1e-3);
}

TEST(FindBlocks, HalfCyclesAtTheEdgesAreLeftOut) {
  MadeWave wave = waveAt(0.25, 5.6);
  wave.from = 0.25;  // begins at mid-stroke on the way up
  const auto blocks = moving(blocksOf(noisy(planOf({wave}))));
  ASSERT_EQ(blocks.size(), 1u);
  EXPECT_EQ(blocks[0].cycles.size(), 4u);  // lower turns at 0.75, 1.75 … 5.75 less 0.25 cycles
  EXPECT_NEAR(blocks[0].cycles[0].start, 0.75 / wave.frequency, 1e-4);
  EXPECT_NEAR(blocks[0].cycles[0].top, 1.25 / wave.frequency, 1e-4);
}

TEST(FindBlocks, MidPositionAndStrokeBelongToTheBlock) {
  MadeWave far = waveAt(0.25, 7, 0.02);
  far.mid = 0.031;
  const auto blocks = moving(blocksOf(noisy(planOf({waveAt(0.25, 7), far}))));
  ASSERT_EQ(blocks.size(), 2u);
  EXPECT_NEAR(blocks[0].mid, 0, 3e-6);
  EXPECT_NEAR(blocks[1].mid, 0.031, 3e-6);
  EXPECT_NEAR(blocks[1].stroke, 0.02, 6e-6);
  const auto& x = blocks[1].loop.displacement;
  EXPECT_NEAR(*std::max_element(x.begin(), x.end()), 0.01, 2e-5);
}

TEST(FindBlocks, AStandstillIsAHoldWithItsForce) {
  MadePlan plan = noisy(planOf({waveAt(0.25, 6)}));
  plan.waves[0].rest = 4;
  plan.waves.push_back(waveAt(0.5, 6));
  plan.force = [](double x, double v) { return 150 + 1000 * x + 1000 * v; };
  const auto blocks = blocksOf(plan);
  ASSERT_EQ(blocks.size(), 3u);
  const Block& hold = blocks[1];
  EXPECT_EQ(hold.kind, BlockKind::Hold);
  EXPECT_NEAR(hold.mid, -0.025, 1e-6);
  EXPECT_NEAR(hold.holdForce, 125, 4 * hold.holdForceU);
  EXPECT_NEAR(hold.holdForceU, 2 / std::sqrt(4000), 0.02);  // half of 8,000 samples of 2 N
  EXPECT_TRUE(hold.cycles.empty());
  EXPECT_EQ(hold.loop.size(), 0u);
}

TEST(FindBlocks, AStruckOutCycleIsLeftOutAndSaid) {
  MadePlan plan = planOf({waveAt(0.25, 9)});
  CycleOptions options;
  const double period = 1 / plan.waves[0].frequency;
  options.struckOut = {{5.4 * period, 5.6 * period}};
  const auto blocks = moving(blocksOf(plan, options));
  ASSERT_EQ(blocks.size(), 1u);
  EXPECT_TRUE(blocks[0].cycles[5].struckOut);
  EXPECT_EQ(blocks[0].cyclesUsed(), 5);
  EXPECT_EQ(blocks[0].loop.cycles, 5);
  EXPECT_TRUE(says(blocks[0], "cycle-struck-out"));
}

TEST(FindBlocks, WithEveryCycleStruckOutTheBlockHasNoLoop) {
  CycleOptions options;
  options.struckOut = {{0, 1e6}};
  const auto blocks = moving(blocksOf(planOf({waveAt(0.25, 9)}), options));
  ASSERT_EQ(blocks.size(), 1u);
  EXPECT_EQ(blocks[0].cyclesUsed(), 0);
  EXPECT_EQ(blocks[0].loop.size(), 0u);
}

TEST(FindBlocks, OneCycleFromTurnToTurnIsEnough) {
  for (const MadeShape shape : {MadeShape::Sine, MadeShape::Triangle}) {
    MadeWave wave = waveAt(0.25, 1.002);
    wave.shape = shape;
    const auto blocks = moving(blocksOf(noisy(planOf({wave}))));
    ASSERT_EQ(blocks.size(), 1u);
    EXPECT_EQ(blocks[0].cyclesUsed(), 1);
    EXPECT_TRUE(says(blocks[0], "too-few-cycles"));
    // both ends are seen from one side only: a corner to two samples of 1257
    EXPECT_NEAR(blocks[0].frequency, wave.frequency, 0.0035 * wave.frequency);
  }
}

TEST(FindBlocks, LessThanACycleIsAnErrorThatSaysWhatWasFound) {
  const auto blocks = findBlocks(motionOf(test::makeRun(planOf({waveAt(0.25, 0.8)}))));
  ASSERT_FALSE(blocks);
  EXPECT_EQ(blocks.error().code, "no-full-cycle");
  EXPECT_NEAR(std::get<double>(blocks.error().values[1].value), 0.05, 1e-4);  // longest stroke
  EXPECT_FALSE(findBlocks(Motion{}));
  Motion still = motionOf(test::makeRun(planOf({waveAt(0.25, 1)})));
  std::fill(still.displacement.begin(), still.displacement.end(), 0.01);
  EXPECT_FALSE(findBlocks(still));
}

TEST(FindBlocks, StopsWhenAsked) {
  std::stop_source stop;
  stop.request_stop();
  const Motion motion = motionOf(test::makeRun(planOf({waveAt(0.25, 8)})));
  const auto blocks = findBlocks(motion, {}, {stop.get_token(), {}});
  ASSERT_FALSE(blocks);
  EXPECT_EQ(blocks.error().code, "stopped");
}

TEST(FindBlocks, DoubtfulSamplesEnterNoLoop) {
  MadePlan plan = planOf({waveAt(0.25, 9)});
  Motion motion = motionOf(test::makeRun(plan));
  const double period = 2000 / plan.waves[0].frequency;
  const auto wreck = [&](double fromCycle, double toCycle) {
    const auto to = static_cast<std::size_t>(toCycle * period);
    for (auto i = static_cast<std::size_t>(fromCycle * period); i < to; ++i) {
      motion.force[i] = 1e6;
      motion.doubtful[i] = ForceMissing;
    }
  };
  wreck(5.2, 5.3);  // one cycle: the others carry that phase
  const auto one = moving(blocksOf(motion));
  for (std::size_t i = 0; i < 720; ++i)
    EXPECT_NEAR(one[0].loop.force[i], 1000 * one[0].loop.velocity[i], 0.3);  // jitter of the grid
  for (int cycle = 0; cycle < 9; ++cycle) wreck(cycle + 0.2, cycle + 0.3);
  const auto all = moving(blocksOf(motion));
  EXPECT_TRUE(std::isnan(all[0].loop.force[180]));
  EXPECT_FALSE(std::isnan(all[0].loop.force[360]));
}

TEST(FindBlocks, ACycleWithALongStretchMissingIsNone) {
  MadePlan plan = planOf({waveAt(0.25, 9)});
  Motion motion = motionOf(test::makeRun(plan));
  const double period = 2000 / plan.waves[0].frequency;
  const auto to = static_cast<std::size_t>(4.6 * period);
  for (auto i = static_cast<std::size_t>(4.3 * period); i < to; ++i)
    motion.doubtful[i] = PlaceMissing | ForceMissing;
  for (const Block& block : moving(blocksOf(motion)))
    for (const Cycle& cycle : block.cycles)
      EXPECT_TRUE(cycle.end * 2000 < 4.31 * period || cycle.start * 2000 > 4.59 * period);
}

TEST(FindBlocks, AForceThatStillMovesIsNotWarm) {
  for (const double fade : {0.0, 0.01}) {  // share a cycle
    MadePlan plan = noisy(planOf({waveAt(0.25, 9)}));
    Motion motion = motionOf(test::makeRun(plan));
    for (std::size_t i = 0; i < motion.size(); ++i)
      motion.force[i] *= 1 - fade * plan.waves[0].frequency * motion.timeOf(i);
    const auto blocks = moving(blocksOf(motion));
    EXPECT_EQ(says(blocks[0], "not-warm"), fade > 0);
  }
}

TEST(FindBlocks, TemperatureIsTheMeanOverTheUsedCycles) {
  MadePlan plan = planOf({waveAt(0.25, 9)});
  Motion motion = motionOf(test::makeRun(plan));
  for (std::size_t i = 0; i < motion.size(); ++i)
    motion.temperature.push_back(20 + motion.timeOf(i) * plan.waves[0].frequency);
  const auto blocks = moving(blocksOf(motion));
  ASSERT_TRUE(blocks[0].temperature);
  EXPECT_NEAR(*blocks[0].temperature, 20 + (3 + 9) / 2.0, 0.01);  // cycles 3 to 9
}

TEST(FindBlocks, ShiftedInTimeTheBlocksAreTheSame) {
  Motion motion = motionOf(test::makeRun(noisy(planOf({waveAt(0.25, 7)}))));
  const auto now = moving(blocksOf(motion));
  motion.startTime = 1000;
  const auto later = moving(blocksOf(motion));
  EXPECT_NEAR(later[0].start - now[0].start, 1000, 1e-9);
  EXPECT_EQ(later[0].loop.force, now[0].loop.force);
}

TEST(FindBlocks, ForceTimesKGivesLoopTimesK) {
  Motion motion = motionOf(test::makeRun(noisy(planOf({waveAt(0.25, 7)}))));
  const auto one = moving(blocksOf(motion));
  for (double& force : motion.force) force *= 3;
  const auto three = moving(blocksOf(motion));
  for (std::size_t i = 0; i < 720; ++i)
    EXPECT_NEAR(three[0].loop.force[i], 3 * one[0].loop.force[i], 1e-7);  // prefix sums of 1e5 N
}

}  // namespace
}  // namespace dampwright
