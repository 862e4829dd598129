// SPDX-License-Identifier: GPL-3.0-or-later
// Simulated runs with known truth, from Trace to Measurement; bias and spread over 20 seeds are
// printed. The truth of a force is the same reading on the noise-free run.
#include <gtest/gtest.h>

#include <cmath>
#include <cstdio>

#include "core/measure/measure_runs.h"
#include "core/uncertainty/student_t.h"
#include "tests/core/measure/made_traces.h"

namespace dampwright {
namespace {

constexpr unsigned seeds = 20;

/// Mean and standard deviation of errors, and how many stayed inside their stated interval.
struct Errors {
  double sum = 0, square = 0, worst = 0;
  int count = 0, inside = 0;

  void add(double error, double u, double dof) {
    sum += error;
    square += error * error;
    worst = std::max(worst, std::abs(error));
    ++count;
    inside += std::abs(error) <= coverageFactor(0.95, dof) * u ? 1 : 0;
  }
  double bias() const { return sum / count; }
  double spread() const { return std::sqrt(square / count - bias() * bias()); }
  void print(const char* what, double truth) const {
    std::printf("  %-26s truth %9.3f  bias %8.4f  spread %7.4f  worst %7.4f  inside %3.0f %%\n",
                what,
                truth,
                bias(),
                spread(),
                worst,
                100.0 * inside / count);
  }
};

Measurement measured(const Trace& trace) {
  const auto result = measureRuns(std::span(&trace, 1), {}, {});
  EXPECT_TRUE(result) << result.error().code;
  return result ? result.value().measurement : Measurement{};
}

/// The curve point of the block with this nominal peak speed.
const CurvePoint* pointOf(const Curve& curve, double speed) {
  for (const CurvePoint& point : curve.points) {
    if (std::abs(point.reading.peakVelocity - speed) < 0.02 * speed) return &point;
  }
  return nullptr;
}

struct RunErrors {
  std::vector<Errors> compression, rebound, velocity;
  Errors gas, dry;
};

RunErrors errorsOf(const bench::Damper& damper) {
  const bench::BenchRun run = bench::simulate(damper, test::programme());
  RunErrors errors;
  errors.compression.resize(run.blocks.size());
  errors.rebound.resize(run.blocks.size());
  errors.velocity.resize(run.blocks.size());
  const double gasTruth = run.blocks[0].mean(Direction::Compression).gas;
  for (unsigned seed = 1; seed <= seeds; ++seed) {
    const Measurement m = measured(test::noisyTrace(run.clean, {.seed = seed}));
    for (std::size_t i = 0; i < run.blocks.size(); ++i) {
      for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
        const bench::HalfTruth truth = run.blocks[i].mean(direction);
        const CurvePoint* point = pointOf(m.curve(direction), truth.velocity);
        EXPECT_NE(point, nullptr) << "speed " << truth.velocity << " not found";
        if (point == nullptr) continue;
        auto& forces = direction == Direction::Compression ? errors.compression : errors.rebound;
        // core/uncertainty has no rig here: what is left is the scatter from cycle to cycle
        const Reading& reading = point->reading;
        forces[i].add(reading.force - truth.force, reading.forceU, reading.forceDof);
        errors.velocity[i].add(reading.peakVelocity / truth.velocity - 1, 1, 1e9);
        EXPECT_NEAR(reading.force, truth.force, std::max(2.0, 0.005 * std::abs(truth.force)));
      }
    }
    if (!m.gas.force || !m.friction.dry) {
      ADD_FAILURE() << "gas or friction not determined: " << m.gas.reason;
      continue;
    }
    errors.gas.add(*m.gas.force - gasTruth, m.gas.totalU, m.gas.totalDof);
    errors.dry.add(
        *m.friction.dry - damper.friction.dry, m.friction.dryTotalU, m.friction.dryTotalDof);
  }
  for (std::size_t i = 0; i < run.blocks.size(); ++i) {
    char name[64];
    std::snprintf(name, sizeof name, "compression %4.0f mm/s", 1000 * run.blocks[i].plan.speed);
    errors.compression[i].print(name, run.blocks[i].mean(Direction::Compression).force);
    std::snprintf(name, sizeof name, "rebound     %4.0f mm/s", 1000 * run.blocks[i].plan.speed);
    errors.rebound[i].print(name, run.blocks[i].mean(Direction::Rebound).force);
    std::printf("  %-26s worst relative error %.2e\n", "peak velocity", errors.velocity[i].worst);
  }
  errors.gas.print("gas", gasTruth);
  errors.dry.print("dry friction", damper.friction.dry);
  return errors;
}

TEST(MeasureMadeRuns, OfKnownFormsMeetTheTargets) {
  const RunErrors errors = errorsOf(test::knownDamper());
  EXPECT_LT(errors.gas.worst, 0.5);
  EXPECT_LT(errors.dry.worst, 1);
  for (const auto& direction : {errors.compression, errors.rebound}) {
    for (const Errors& speed : direction) {
      // 0.3 standard errors of one run, and what 20 runs leave open: 2/√20 of their spread
      EXPECT_LT(std::abs(speed.bias()), (0.3 + 2 / std::sqrt(20.0)) * speed.spread() + 0.02);
    }
  }
}

TEST(MeasureMadeRuns, OfUnknownFormsStayInsideTheirUncertainty) {
  const RunErrors errors = errorsOf(test::unknownDamper());
  EXPECT_LT(errors.gas.worst, 0.5);
  EXPECT_GE(errors.dry.inside, static_cast<int>(0.85 * seeds));
}

}  // namespace
}  // namespace dampwright
