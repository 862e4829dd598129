// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cmath>
#include <cstdint>
#include <functional>
#include <random>
#include <vector>

#include "core/base/units.h"

// Recordings written down in closed form: displacement, velocity and force at every sample from a
// formula, so that a test knows the truth to the last digit. The bench simulator (bench_run.h) has
// states of its own; this one has none.
namespace dampwright::test {

enum class MadeShape { Sine, Crank, Triangle };

/// Cycles from the lower end on; `cycles` may be a fraction and `from` the phase to begin at.
struct MadeWave {
  double stroke = 0.05;  ///< m, peak to peak
  double frequency = 1;  ///< Hz, of the moving part
  double cycles = 5;     ///< [1]
  MadeShape shape = MadeShape::Sine;
  double mid = 0;         ///< m
  double from = 0;        ///< [1] phase at the start, 0 the lower end
  double dwell = 0;       ///< s of standstill at each end
  double rodRatio = 0.2;  ///< crank radius over rod length
  double rest = 0;        ///< s of standstill where the wave ends
};

struct MadeRun {
  double rate = 2000;  ///< Hz
  std::vector<double> time, displacement, velocity, force;
};

struct MadePlan {
  double rate = 2000;  ///< Hz
  double lead = 0;     ///< s of standstill before the first wave
  std::vector<MadeWave> waves;
  std::function<double(double x, double v)> force = [](double, double v) { return 1000 * v; };
  double displacementNoise = 0;  ///< m, standard deviation
  double forceNoise = 0;         ///< N
  std::uint64_t seed = 1;
};

struct MadePoint {
  double x = 0, v = 0;
};

/// Peak speed [m/s] of a sine of this stroke and frequency: π·S·f.
inline double sineSpeed(double stroke, double frequency) { return pi * stroke * frequency; }

inline double sineFrequency(double stroke, double speed) { return speed / (pi * stroke); }

/// The point of a wave at a phase [1] of its moving part.
inline MadePoint pointOf(const MadeWave& wave, double phase) {
  const double angle = 2 * pi * phase, omega = 2 * pi * wave.frequency, r = wave.stroke / 2;
  if (wave.shape == MadeShape::Sine)
    return {wave.mid - r * std::cos(angle), r * omega * std::sin(angle)};
  if (wave.shape == MadeShape::Crank) {
    const double rod = r / wave.rodRatio, s = r * std::sin(angle), c = r * std::cos(angle);
    const double reach = std::sqrt(rod * rod - s * s);
    return {wave.mid - c + rod - reach, omega * (s + s * c / reach)};
  }
  const double part = phase - std::floor(phase), speed = 2 * wave.stroke * wave.frequency;
  if (part < 0.5) return {wave.mid - r + 2 * wave.stroke * part, speed};
  return {wave.mid + r - 2 * wave.stroke * (part - 0.5), -speed};
}

/// The point at a time [s] after the wave's start, its dwells included (a dwell follows each end).
inline MadePoint pointAt(const MadeWave& wave, double time) {
  if (wave.dwell == 0) return pointOf(wave, wave.from + time * wave.frequency);
  const double half = 0.5 / wave.frequency + wave.dwell;
  const double halves = std::floor(time / half), inHalf = time - halves * half;
  const double moved = std::min(inHalf * wave.frequency, 0.5);
  MadePoint point = pointOf(wave, wave.from + halves / 2 + moved);
  if (moved >= 0.5) point.v = 0;
  return point;
}

inline double durationOf(const MadeWave& wave) {
  return wave.cycles * (1 / wave.frequency + 2 * wave.dwell);
}

/// Waves one after another; between two of them the place goes over in one second along a half
/// cosine where they do not meet.
inline MadeRun makeRun(const MadePlan& plan) {
  MadeRun run;
  run.rate = plan.rate;
  std::mt19937_64 random(plan.seed);
  std::normal_distribution<double> normal(0, 1);
  double clock = 0;
  const auto sample = [&](const MadePoint& point) {
    run.time.push_back(static_cast<double>(run.time.size()) / plan.rate);
    run.displacement.push_back(point.x + plan.displacementNoise * normal(random));
    run.velocity.push_back(point.v);
    run.force.push_back(plan.force(point.x, point.v) + plan.forceNoise * normal(random));
  };
  const auto play = [&](double duration, const std::function<MadePoint(double)>& at) {
    const double end = clock + duration;
    while (static_cast<double>(run.time.size()) / plan.rate < end - 1e-9)
      sample(at(static_cast<double>(run.time.size()) / plan.rate - clock));
    clock = end;
  };
  double place = pointAt(plan.waves.front(), 0).x;
  play(plan.lead, [&](double) { return MadePoint{place, 0}; });
  for (const MadeWave& wave : plan.waves) {
    const double from = place, to = pointAt(wave, 0).x;
    if (std::abs(to - from) > 1e-9)
      play(1, [&](double t) {
        return MadePoint{from + (to - from) * (1 - std::cos(pi * t)) / 2,
                         (to - from) * pi * std::sin(pi * t) / 2};
      });
    play(durationOf(wave), [&](double t) { return pointAt(wave, t); });
    place = pointAt(wave, durationOf(wave)).x;
    play(wave.rest, [&](double) { return MadePoint{place, 0}; });
  }
  return run;
}

}  // namespace dampwright::test
