// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_run.h"

#include <algorithm>
#include <cmath>

#include "core/base/expects.h"
#include "tests/support/bench_random.h"

namespace dampwright::bench {
namespace {

/// The whole run on the fine grid of the integration.
struct Fine {
  double dt = 0;
  std::vector<double> force, gas, temperature;

  /// Cubic through the four points around `time` (Catmull and Rom); linear at the ends.
  double at(const std::vector<double>& channel, double time) const {
    const double place = std::clamp(time / dt, 0.0, static_cast<double>(channel.size() - 1));
    const auto i = std::min(static_cast<std::size_t>(place), channel.size() - 2);
    const double t = place - static_cast<double>(i);
    const double a = channel[i], b = channel[i + 1];
    if (i == 0 || i + 2 >= channel.size()) return a + t * (b - a);
    const double left = (b - channel[i - 1]) / 2, right = (channel[i + 2] - a) / 2;
    const double u = 1 - t;
    return a * u * u * (1 + 2 * t) + b * t * t * (1 + 2 * u) + t * u * (left * u - right * t);
  }
};

Fine integrate(const Damper& damper, const Drive& drive, double dt) {
  Fine fine{dt, {}, {}, {}};
  const auto steps = static_cast<std::size_t>(std::ceil(drive.duration() / dt));
  DamperState state(damper, drive.at(0).x, dt);
  for (auto* channel : {&fine.force, &fine.gas, &fine.temperature}) channel->reserve(steps + 1);
  for (std::size_t i = 0; i <= steps; ++i) {
    fine.force.push_back(state.step(drive.at(static_cast<double>(i) * dt).x));
    fine.gas.push_back(state.gasForce());
    fine.temperature.push_back(state.temperature());
  }
  return fine;
}

/// The instant of the largest |v| between two instants, by golden section around the largest of
/// 400.
double fastestInstant(const Drive& drive, double from, double to) {
  const auto speed = [&](double t) { return std::abs(drive.at(t).v); };
  const double width = (to - from) / 400;
  double best = from;
  for (int i = 0; i <= 400; ++i)
    if (speed(from + i * width) > speed(best)) best = from + i * width;
  double low = std::max(from, best - width), high = std::min(to, best + width);
  const double golden = (std::sqrt(5.0) - 1) / 2;
  for (int i = 0; i < 60; ++i) {
    const double a = high - golden * (high - low), b = low + golden * (high - low);
    (speed(a) < speed(b) ? low : high) = speed(a) < speed(b) ? a : b;
  }
  return (low + high) / 2;
}

HalfTruth halfTruth(const Drive& drive,
                    const Fine& fine,
                    const BlockPlan& plan,
                    Direction direction,
                    double from,
                    double to) {
  HalfTruth half;
  half.time = plan.wave == Wave::Triangle ? (from + to) / 2 : fastestInstant(drive, from, to);
  const DrivePoint point = drive.at(half.time);
  half.velocity = std::abs(point.v);
  half.displacement = point.x - plan.mid;
  half.force = signOf(direction) * fine.at(fine.force, half.time);
  half.gas = fine.at(fine.gas, half.time);
  return half;
}

/// The instant between two lower turning points where the crosshead turns back.
double upperTurning(const Drive& drive, double from, double to) {
  double low = from + (to - from) / 4, high = to - (to - from) / 4;
  for (int i = 0; i < 60; ++i) {
    const double middle = (low + high) / 2;
    (drive.at(middle).v > 0 ? low : high) = middle;
  }
  return (low + high) / 2;
}

CycleTruth cycleTruth(
    const Drive& drive, const Fine& fine, const BlockPlan& plan, double start, double end) {
  CycleTruth cycle{start, end, {}, {}, 0, 0};
  const double top = upperTurning(drive, start, end);
  cycle.compression = halfTruth(drive, fine, plan, Direction::Compression, start, top);
  cycle.rebound = halfTruth(drive, fine, plan, Direction::Rebound, top, end);
  // ∮F dx by the trapezoid rule on as many points as the fine grid has, which closes on itself
  const auto points =
      std::max<std::size_t>(2000, static_cast<std::size_t>((end - start) / fine.dt));
  const double step = (end - start) / static_cast<double>(points);
  for (std::size_t i = 0; i < points; ++i) {
    const double t = start + static_cast<double>(i) * step;
    cycle.energy += fine.at(fine.force, t) * drive.at(t).v * step;
    cycle.temperature += fine.at(fine.temperature, t) / static_cast<double>(points);
  }
  return cycle;
}

std::vector<BlockTruth> blockTruths(const Drive& drive, const Fine& fine) {
  std::vector<BlockTruth> truths;
  for (const DriveBlock& block : drive.blocks()) {
    BlockTruth truth{block.plan, block.start, block.end, {}};
    for (std::size_t i = 0; i + 1 < block.lowerTurnings.size(); ++i)
      truth.cycles.push_back(
          cycleTruth(drive, fine, block.plan, block.lowerTurnings[i], block.lowerTurnings[i + 1]));
    truths.push_back(std::move(truth));
  }
  return truths;
}

double inSteps(double value, double step) {
  return step > 0 ? step * std::round(value / step) : value;
}

/// One sample of the clean channels at a true instant.
void addSample(Recording& to, const Drive& drive, const Fine& fine, double stamp, double instant) {
  const DrivePoint point = drive.at(instant);
  to.time.push_back(stamp);
  to.displacement.push_back(point.x);
  to.velocity.push_back(point.v);
  to.force.push_back(fine.at(fine.force, instant));
  to.temperature.push_back(fine.at(fine.temperature, instant));
}

Recording cleanRecording(const Drive& drive, const Fine& fine, double rate) {
  Recording clean;
  clean.rate = rate;
  const auto samples = static_cast<std::size_t>(drive.duration() * rate);
  for (std::size_t i = 0; i < samples; ++i) {
    const double t = static_cast<double>(i) / rate;
    addSample(clean, drive, fine, t, t);
  }
  return clean;
}

Recording measuredRecording(const Drive& drive, const Fine& fine, const Instrument& bench) {
  Recording out;
  out.rate = bench.rate;
  NormalSource normal(bench.seed);
  const auto samples = static_cast<std::size_t>(drive.duration() * bench.rate);
  const double stretch = 1 + bench.clockErrorPercent / 100;
  for (std::size_t i = 0; i < samples; ++i) {
    const double stamp = static_cast<double>(i) / bench.rate;
    const double instant = stamp * stretch + bench.clockJitter * normal.next();
    addSample(out, drive, fine, stamp, instant);
    const double late = instant - bench.forceDelay;
    const double truth = fine.at(fine.force, late) + bench.movingMass * drive.at(late).a;
    const double read = bench.forceScale * truth + bench.forceZero + bench.forceDrift * instant +
                        bench.forceNoise * normal.next();
    out.force.back() = inSteps(std::clamp(read, -bench.clipAt, bench.clipAt), bench.forceStep);
    const double place = bench.displacementScale * out.displacement.back() +
                         bench.displacementOffset + bench.displacementNoise * normal.next();
    out.displacement.back() = inSteps(place, bench.displacementStep);
    out.temperature.back() += bench.temperatureNoise * normal.next();
  }
  return out;
}

}  // namespace

HalfTruth BlockTruth::mean(Direction direction, std::size_t first) const {
  expects(first < cycles.size());
  HalfTruth mean;
  const double share = 1.0 / static_cast<double>(cycles.size() - first);
  for (std::size_t i = first; i < cycles.size(); ++i) {
    const CycleTruth& cycle = cycles[i];
    const HalfTruth& half = direction == Direction::Compression ? cycle.compression : cycle.rebound;
    mean.time += share * half.time;
    mean.velocity += share * half.velocity;
    mean.displacement += share * half.displacement;
    mean.force += share * half.force;
    mean.gas += share * half.gas;
  }
  return mean;
}

double BlockTruth::meanEnergy(std::size_t first) const {
  expects(first < cycles.size());
  double sum = 0;
  for (std::size_t i = first; i < cycles.size(); ++i) sum += cycles[i].energy;
  return sum / static_cast<double>(cycles.size() - first);
}

BenchRun simulate(const Damper& damper,
                  const DrivePlan& plan,
                  const Instrument& instrument,
                  double finestStep) {
  const Drive drive(plan);
  const double perSample = std::ceil(1 / (instrument.rate * finestStep) - 1e-9);
  const Fine fine = integrate(damper, drive, 1 / (instrument.rate * perSample));
  BenchRun run;
  run.measured = measuredRecording(drive, fine, instrument);
  run.clean = cleanRecording(drive, fine, instrument.rate);
  run.blocks = blockTruths(drive, fine);
  run.temperatureAtEnd = fine.temperature.back();
  return run;
}

}  // namespace dampwright::bench
