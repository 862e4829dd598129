// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/bench/accuracy/compare.h"

#include <cmath>
#include <cstdio>

#include "core/base/units.h"
#include "core/curves/force_at.h"
#include "core/measure/measure_runs.h"
#include "core/uncertainty/student_t.h"

namespace dampwright::accuracy {
namespace {

constexpr double finestStep = 5e-5;  // s, of the simulation
constexpr double slowSpeed = 0.00525;

double interval(double u, double dof) { return coverageFactor(0.95, dof) * u; }

const CurvePoint* pointNear(const Curve& curve, double speed) {
  for (const CurvePoint& point : curve.points)
    if (std::abs(point.reading.peakVelocity - speed) < 0.02 * speed) return &point;
  return nullptr;
}

/// Least standard error of a force read off the mean loop with its shape free over ±35° (a
/// polynomial of degree 4: variance 225/64 over the samples in the window).
double forceBound(const MadeCase& made, const Block& block) {
  const double samples = 70.0 / 360 * block.loop.samples * block.loop.cycles;
  return made.forceNoise * std::sqrt(225.0 / 64 / samples);
}

/// Least standard error of the energy of the mean loop, [J]: white noise of the force alone through
/// sum F dx, dx of a sine.
double energyBound(const MadeCase& made, const Block& block) {
  const double dx2 = std::pow(pi * block.stroke, 2) / (2 * block.loop.samples);
  return made.forceNoise * std::sqrt(dx2 / block.loop.cycles);
}

struct Truth {
  const MadeCase& made;
  bench::BenchRun run, between;
};

void compareBlocks(const Measurement& m, const Truth& truth, Tally& tally) {
  for (const bench::BlockTruth& block : truth.run.blocks) {
    for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
      const bench::HalfTruth half = block.mean(direction);
      const CurvePoint* point = pointNear(m.curve(direction), half.velocity);
      if (point == nullptr) {
        tally.missing("force, tested speed [N]");
        continue;
      }
      const Reading& reading = point->reading;
      const bool straight = block.plan.wave == bench::Wave::Triangle;
      tally.add("force, tested speed [N]",
                {reading.force - half.force,
                 std::max(1.0, 0.003 * std::abs(half.force)),
                 straight ? 0 : forceBound(truth.made, m.blocks[point->block].block),
                 interval(reading.cyclesU, reading.cyclesDof)});
      tally.add(straight ? "peak velocity, triangle [%]" : "peak velocity [%]",
                {100 * (reading.peakVelocity / half.velocity - 1), straight ? 0.1 : 0.01});
      if (direction == Direction::Rebound) continue;
      const double energy = block.meanEnergy(), read = m.blocks[point->block].energy;
      const double bound = 100 * energyBound(truth.made, m.blocks[point->block].block) / energy;
      tally.add("energy [%]", {100 * (read / energy - 1), std::max(0.03, 2 * bound), bound});
    }
  }
}

void compareBetween(const Measurement& m, const Truth& truth, Tally& tally) {
  for (const bench::BlockTruth& block : truth.between.blocks) {
    for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
      const bench::HalfTruth half = block.mean(direction);
      ForceQuery query;
      query.speed = half.velocity;
      const FittedLaw* law = chosenLaw(m.laws(direction));
      if (law != nullptr && m.friction.dry && m.gas.force) {
        const double added = *m.friction.dry + signOf(direction) * *m.gas.force;
        query.law = [law, added](double v) { return law->at(v) + added; };
      }
      const ForceAtSpeed found = forceAt(m.curve(direction), query);
      if (!found) {
        tally.missing("force, between speeds [N]");
        continue;
      }
      const Reading& near = m.curve(direction).points[found.nearest].reading;
      const double u = std::hypot(near.cyclesU, found.uInterpolation);
      tally.add("force, between speeds [N]",
                {found.force - half.force, std::max(1.0, 0.01 * std::abs(half.force)), 0, 2 * u});
    }
  }
}

void compareGas(const Measurement& m, const Truth& truth, Tally& tally, double friction) {
  if (!m.gas.force || !m.friction.dry) {
    tally.missing("gas [N]");
    return;
  }
  const bench::Damper& damper = truth.made.damper;
  tally.add("gas [N]",
            {*m.gas.force - damper.gas.force, 0.5, 0, interval(m.gas.totalU, m.gas.totalDof)});
  const double u = interval(m.friction.dryTotalU, m.friction.dryTotalDof);
  tally.add("dry friction [N]", {*m.friction.dry - truth.made.dry, std::max(friction, u), 0, u});
}

void compareLaw(const Measurement& m, const Truth& truth, Direction direction, Tally& tally) {
  const MadeCase& made = truth.made;
  const bool in = direction == Direction::Compression;
  const std::string& form = in ? made.compressionForm : made.reboundForm;
  const std::vector<double>& parameters = in ? made.compressionTruth : made.reboundTruth;
  const bench::Law& valve = in ? made.compression : made.rebound;
  const FittedLaw* chosen = chosenLaw(m.laws(direction));
  if (chosen == nullptr) {
    tally.missing("chosen law, worst of curve [N]");
    return;
  }
  double worst = 0, allowed = 3;
  for (double v = 0.05; v < 1.0; v += 0.01) {
    const double error = std::abs(chosen->at(v) - valve.force(v));
    const double limit = std::max(3.0, 0.01 * valve.force(v));
    if (error / limit > worst / allowed) worst = error, allowed = limit;
  }
  tally.add("chosen law, worst of curve [N]", {worst, allowed});
  for (const FittedLaw& law : m.laws(direction)) {
    if (law.law != form || law.parameters.size() != parameters.size()) continue;
    for (std::size_t j = 0; j < parameters.size(); ++j) {
      const FittedParameter& found = law.parameters[j];
      const double percent = 100 / parameters[j];
      tally.add("law known: " + form + " " + found.name + " [%]",
                {percent * (found.value - parameters[j]),
                 std::max(0.5, 2 * percent * found.u),
                 percent * found.u,
                 2 * percent * found.u});
    }
  }
}

void compareTotals(const Measurement& m, const Truth& truth, Tally& tally) {
  for (const bench::BlockTruth& block : truth.run.blocks) {
    for (const Direction direction : {Direction::Compression, Direction::Rebound}) {
      const bench::HalfTruth half = block.mean(direction);
      const CurvePoint* point = pointNear(m.curve(direction), half.velocity);
      if (point == nullptr || half.velocity < slowSpeed) continue;
      ForceQuery query;
      query.speed = half.velocity;
      const ForceAtSpeed at = forceAt(m.curve(direction), query);
      const double u = interval(point->reading.forceTotalU, point->reading.forceTotalDof);
      tally.add("with rig errors: force [N]", {at.force - half.force, 1e9, 0, u});
      if (!point->reading.dampingForce) continue;
      query.figure = CurveFigure::DampingForce;
      const double damping = half.force - signOf(direction) * half.gas;
      tally.add("with rig errors: damping force [N]",
                {forceAt(m.curve(direction), query).force - damping,
                 1e9,
                 0,
                 interval(point->reading.dampingForceTotalU, point->reading.dampingForceTotalDof)});
    }
  }
  if (!m.gas.force || !m.friction.dry) return;
  tally.add(
      "with rig errors: gas [N]",
      {*m.gas.force - truth.made.damper.gas.force, 1e9, 0, interval(m.gas.totalU, m.gas.totalDof)});
  tally.add("with rig errors: dry friction [N]",
            {*m.friction.dry - truth.made.dry,
             1e9,
             0,
             interval(m.friction.dryTotalU, m.friction.dryTotalDof)});
}

}  // namespace

Tally compare(const MadeCase& made, std::uint64_t seed) {
  bench::Instrument clean;
  clean.rate = made.rate;
  const Truth truth{made,
                    bench::simulate(made.damper, made.plan, clean, finestStep),
                    bench::simulate(made.damper, made.between, clean, finestStep)};
  Tally tally;
  const Trace noisy = noisyTrace(made, truth.run.clean, seed);
  const auto alone = measureRuns(std::span(&noisy, 1), {}, {});
  MeasureOptions options;
  options.rig = made.rig;
  const Trace wrong = rigTrace(made, truth.run.clean, seed + 1);
  const auto withRig = measureRuns(std::span(&wrong, 1), options, {});
  if (!alone || !withRig) {
    tally.missing("force, tested speed [N]");
    return tally;
  }
  const Measurement& m = alone.value().measurement;
  compareBlocks(m, truth, tally);
  compareBetween(m, truth, tally);
  compareGas(m, truth, tally, made.knownForms ? 1 : 0);
  for (const Direction direction : {Direction::Compression, Direction::Rebound})
    compareLaw(m, truth, direction, tally);
  compareTotals(withRig.value().measurement, truth, tally);
  return tally;
}

}  // namespace dampwright::accuracy
