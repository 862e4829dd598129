// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/spikes.h"

#include <algorithm>
#include <cmath>

#include "core/signal/robust.h"

namespace dampwright {
namespace {

constexpr std::size_t longest = 3;       // samples of one spike
constexpr std::size_t reach = 7;         // samples to each side that tell what is usual
constexpr double sensorSteps = 3;        // a coarse sensor toggles by one, at times by two
constexpr double smallestShare = 0.005;  // of the range

// The range without the outermost 0.2 % at each end, from at most about 20,000 samples.
double usualRange(std::span<const double> signal) {
  std::vector<double> some;
  for (std::size_t i = 0; i < signal.size(); i += 1 + signal.size() / 20000)
    some.push_back(signal[i]);
  const auto cut = static_cast<std::ptrdiff_t>(some.size() / 500);
  const auto high = some.end() - 1 - cut;
  std::nth_element(some.begin(), high, some.end());
  const double top = *high;
  std::nth_element(some.begin(), some.begin() + cut, some.end());
  return top - some[static_cast<std::size_t>(cut)];
}

// By how much all samples of the spike stand beyond their neighbours, the same way; 0 if they
// don't.
double standsOut(std::span<const double> x, const Spike& spike) {
  const std::size_t a = spike.first, b = spike.first + spike.count;
  const auto [low, high] = std::minmax({x[a - 2], x[a - 1], x[b], x[b + 1]});
  const auto [least, most] = std::minmax_element(x.begin() + static_cast<std::ptrdiff_t>(a),
                                                 x.begin() + static_cast<std::ptrdiff_t>(b));
  return std::max({*least - high, low - *most, 0.0});
}

// Robust spread of the samples about the spike, taken about their straight line.
double usualSpread(std::span<const double> x, const Spike& spike) {
  const std::size_t from = spike.first > reach ? spike.first - reach : 0;
  const std::size_t to = std::min(x.size(), spike.first + spike.count + reach);
  const auto inSpike = [&](std::size_t i) {
    return i >= spike.first && i < spike.first + spike.count;
  };
  double n = 0, t1 = 0, t2 = 0, y1 = 0, ty = 0;
  for (std::size_t i = from; i < to; ++i) {
    if (inSpike(i)) continue;
    const double t = static_cast<double>(i - from);
    n += 1;
    t1 += t;
    t2 += t * t;
    y1 += x[i];
    ty += t * x[i];
  }
  const double slope = (ty - t1 * y1 / n) / (t2 - t1 * t1 / n);
  std::vector<double> around;
  for (std::size_t i = from; i < to; ++i)
    if (!inSpike(i)) around.push_back(x[i] - slope * static_cast<double>(i - from));
  return robustSpread(around);
}

}  // namespace

std::vector<Spike> findSpikes(std::span<const double> x, double threshold) {
  std::vector<Spike> spikes;
  if (x.size() < 2 * reach) return spikes;
  const double floor = std::max(
      {smallestShare * usualRange(x), threshold * noiseLevel(x), sensorSteps * smallestStep(x)});
  for (std::size_t i = 2; i + longest + 1 < x.size(); ++i) {
    if (!(std::abs(x[i] - x[i - 1]) > floor)) continue;
    for (std::size_t count = 1; count <= longest; ++count) {
      const Spike spike{i, count};
      const double beyond = standsOut(x, spike);
      if (beyond <= floor || beyond <= threshold * usualSpread(x, spike)) continue;
      spikes.push_back(spike);
      i += count;
      break;
    }
  }
  return spikes;
}

std::vector<double> withoutSpikes(std::vector<double> signal, std::span<const Spike> spikes) {
  for (const Spike& spike : spikes) {
    const double before = signal[spike.first - 1], after = signal[spike.first + spike.count];
    for (std::size_t k = 0; k < spike.count; ++k)
      signal[spike.first + k] = before + (after - before) * static_cast<double>(k + 1) /
                                             static_cast<double>(spike.count + 1);
  }
  return signal;
}

}  // namespace dampwright
