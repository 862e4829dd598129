// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/bench/accuracy/made_case.h"

#include "tests/support/bench_random.h"

#include <cmath>
#include <random>

namespace dampwright::accuracy {
namespace {

using Random = std::mt19937_64;

double between(Random& random, double low, double high) {
  return low + (high - low) * static_cast<double>(random() >> 11) * 0x1p-53;
}

std::size_t oneOf(Random& random, std::size_t count) { return random() % count; }

struct DrawnLaw {
  bench::Law law;
  std::string form;
  std::vector<double> truth;
};

/// A law of core/laws; `size` scales its force.
DrawnLaw knownLaw(Random& random, double size) {
  const double low = size * between(random, 1500, 3500), high = low * between(random, 0.2, 0.5);
  const double knee = between(random, 0.08, 0.25);
  switch (oneOf(random, 5)) {
    case 0:
      return {bench::linearLaw(high), "linear", {high}};
    case 1: {
      const double exponent = between(random, 0.85, 1.6);
      return {bench::powerLaw(low / 2, exponent), "power", {low / 2, exponent}};
    }
    case 2:
      return {bench::twoSlopeLaw(low, high, knee), "two-slope", {low, high, knee}};
    case 3:
      return {bench::smoothLaw(low, high, knee), "smooth", {low, high, knee}};
    default: {
      const double opening = low * knee, bleed = knee / std::sqrt(opening);
      return {bench::bleedAndBlowOffLaw(bleed, opening, high),
              "bleed and blow-off",
              {bleed, opening, high}};
    }
  }
}

/// A law that core/laws does not have.
bench::Law strangeLaw(Random& random, double size) {
  switch (oneOf(random, 4)) {
    case 0:
      return bench::leakAndOrificeLaw(size * between(random, 4000, 8000),
                                      between(random, 0.015, 0.03));
    case 1:
      return bench::arctanShoulderLaw(
          size * between(random, 300, 700), between(random, 0.05, 0.12), size * 700);
    case 2:
      return bench::leakingLaw(
          bench::bleedAndBlowOffLaw(0.008, size * between(random, 250, 450), size * 900),
          size * between(random, 9000, 20000));
    default: {
      const double step = size * between(random, 150, 250);
      return bench::throughPointsLaw({{0.05, 0.6 * step},
                                      {0.12, 1.8 * step},
                                      {0.3, 2.7 * step},
                                      {0.6, 3.6 * step},
                                      {1.2, 6.5 * step}});
    }
  }
}

void drawFriction(MadeCase& made, Random& random) {
  bench::DryFriction& friction = made.damper.friction;
  friction.dry = made.dry = between(random, 5, 40);
  friction.roundness = between(random, 0.0002, 0.0006);
  if (made.knownForms) return;
  if (oneOf(random, 2) == 0) {
    friction.form = bench::FrictionForm::Bristle;
    friction.breakaway = friction.dry;
  } else {
    friction.form = bench::FrictionForm::Stribeck;
    friction.breakaway = made.dry = friction.dry * between(random, 1, 1.3);
    friction.fadeSpeed = 0.01;
  }
}

void drawBench(MadeCase& made, Random& random) {
  made.rig.loadCell.capacity = 5000;
  made.rig.loadCell.readingPercent = 0.3;
  made.rig.loadCell.capacityPercent = 0.02;
  made.rig.loadCell.zeroDrift = 1;
  made.rig.displacementAccuracy = 2e-5;
  made.rig.clockAccuracyPercent = 0.01;
  made.rig.remountPercent = 0.3;
  if (made.standardBench) return;
  constexpr double rates[] = {1000, 2000, 5000};
  made.rate = rates[oneOf(random, 3)];
  made.forceNoise = between(random, 0.5, 5);
  made.displacementNoise = between(random, 2e-6, 2e-5);
}

void drawPlans(MadeCase& made, Random& random) {
  const std::vector<double> speeds = {0.05, 0.1, 0.15, 0.2, 0.3, 0.4, 0.6, 0.8, 1.0};
  made.plan = bench::speedsPlan(0.05, 0.005, 2, speeds, 10);
  made.between = bench::speedsPlan(0.05, 0.25, 5, {0.5, 0.7, 0.9}, 5);
  constexpr bench::Wave waves[] = {bench::Wave::Sine, bench::Wave::Crank, bench::Wave::Triangle};
  const bench::Wave wave = waves[oneOf(random, made.standardBench ? 2 : 3)];
  for (bench::DrivePlan* plan : {&made.plan, &made.between}) {
    for (auto& step : plan->steps) {
      auto* block = std::get_if<bench::BlockPlan>(&step);
      if (block != nullptr && block->speed > 0.01) block->wave = wave;
    }
  }
}

double& at(Trace& trace, std::vector<double> Trace::*channel, std::size_t i) {
  return (trace.*channel)[i];
}

}  // namespace

MadeCase drawCase(std::uint64_t seed, std::uint64_t number) {
  Random random(seed * 1000003 + number);
  MadeCase made;
  made.knownForms = number % 3 != 2;
  made.standardBench = number % 2 == 0;
  if (made.knownForms) {
    const DrawnLaw in = knownLaw(random, 0.5), out = knownLaw(random, 1);
    made.compression = in.law;
    made.compressionForm = in.form;
    made.compressionTruth = in.truth;
    made.rebound = out.law;
    made.reboundForm = out.form;
    made.reboundTruth = out.truth;
  } else {
    made.compression = strangeLaw(random, 0.5);
    made.rebound = strangeLaw(random, 1);
    made.damper.oilStiffness = between(random, 1e6, 5e6);
  }
  made.damper.compression = made.compression;
  made.damper.rebound = made.rebound;
  made.damper.gas.force = between(random, 60, 400);
  made.damper.gas.length = between(random, 0.3, 1);
  drawFriction(made, random);
  drawBench(made, random);
  drawPlans(made, random);
  return made;
}

Trace noisyTrace(const MadeCase& made, const bench::Recording& clean, std::uint64_t seed) {
  Trace trace;
  trace.source.file.name = "made.csv";
  trace.source.rows = static_cast<std::int64_t>(clean.size());
  trace.time = clean.time;
  trace.displacement = clean.displacement;
  trace.force = clean.force;
  trace.zeroState = ZeroState::NoSpecimen;
  trace.directionSettled = true;
  bench::NormalSource normal(seed);
  for (std::size_t i = 0; i < trace.time.size(); ++i) {
    at(trace, &Trace::force, i) += made.forceNoise * normal.next();
    at(trace, &Trace::displacement, i) += made.displacementNoise * normal.next();
  }
  return trace;
}

Trace rigTrace(const MadeCase& made, const bench::Recording& clean, std::uint64_t seed) {
  Random random(seed ^ 0x5bd1e995u);
  bench::NormalSource normal(seed + 17);
  const auto limit = [&](double value) { return value * between(random, -1, 1); };
  const RigProfile& rig = made.rig;
  const double reading = limit(*rig.loadCell.readingPercent / 100);
  const double mounting = *rig.remountPercent / 100 * normal.next();
  const double zero = limit(*rig.loadCell.capacityPercent / 100 * *rig.loadCell.capacity) +
                      limit(*rig.loadCell.zeroDrift);
  const double travel = limit(*rig.displacementAccuracy) / 0.025;  // of the amplitude
  const double clock = limit(*rig.clockAccuracyPercent / 100);
  bench::Recording wrong = clean;
  for (std::size_t i = 0; i < clean.size(); ++i) {
    wrong.time[i] *= 1 + clock;
    wrong.displacement[i] *= 1 + travel;
    wrong.force[i] = wrong.force[i] * (1 + reading) * (1 + mounting) + zero;
  }
  return noisyTrace(made, wrong, seed);
}

}  // namespace dampwright::accuracy
