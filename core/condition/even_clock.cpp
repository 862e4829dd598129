// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/even_clock.h"

#include <algorithm>
#include <cmath>

#include "core/signal/robust.h"

namespace dampwright {
namespace {

constexpr double gapSteps = 2.5;        // a longer step is a gap
constexpr double evenShare = 0.02;      // of a step, residual that still counts as even
constexpr double roundingShare = 0.75;  // of the stamps' last decimal place

struct Line {
  double start = 0, step = 0, worst = 0;
};

// Least squares of time on row number.
Line lineThrough(std::span<const double> times) {
  const auto n = static_cast<double>(times.size());
  double meanTime = 0, product = 0;
  for (const double time : times) meanTime += (time - times[0]) / n;
  const double meanRow = (n - 1) / 2;
  for (std::size_t i = 0; i < times.size(); ++i)
    product += (static_cast<double>(i) - meanRow) * (times[i] - times[0] - meanTime);
  Line line;
  line.step = product / (n * (n * n - 1) / 12);
  line.start = times[0] + meanTime - line.step * meanRow;
  for (std::size_t i = 0; i < times.size(); ++i)
    line.worst =
        std::max(line.worst, std::abs(times[i] - line.start - line.step * static_cast<double>(i)));
  return line;
}

// The largest power of ten that all stamps are whole multiples of, apart from the first; 0 for
// none.
double lastPlace(std::span<const double> times) {
  for (int decimals = 0; decimals <= 6; ++decimals) {
    const double place = std::pow(10.0, -decimals);
    const auto whole = [&](double time) {
      const double multiple = (time - times[0]) / place;
      return std::abs(multiple - std::round(multiple)) < 1e-3;
    };
    if (std::all_of(times.begin(), times.end(), whole)) return place;
  }
  return 0;
}

double usualStep(std::span<const double> times) {
  std::vector<double> steps;
  for (std::size_t i = 1; i < times.size(); ++i)
    if (times[i] > times[i - 1]) steps.push_back(times[i] - times[i - 1]);
  return median(std::move(steps));
}

}  // namespace

ClockFinding lookAtClock(std::span<const double> times) {
  const Line line = lineThrough(times);
  const double place = lastPlace(times);
  ClockFinding finding;
  if (line.worst <= std::max(evenShare * line.step, roundingShare * place)) {
    finding.clock = {line.start, 1 / line.step, times.size()};
    return finding;
  }
  finding.even = false;
  const double usual = usualStep(times);
  double moving = 0, steps = 0;
  for (std::size_t i = 1; i < times.size(); ++i) {
    const double step = times[i] - times[i - 1];
    if (step > gapSteps * usual + place) {
      finding.gapsBehind.push_back(i - 1);
      continue;
    }
    finding.worstStep = std::max(finding.worstStep, std::abs(step - usual));
    moving += step;
    steps += 1;
  }
  finding.uneven = finding.worstStep > std::max(0.05 * usual, 1.5 * place);
  const double rate = moving > 0 ? steps / moving : 1 / usual;
  const double span = times.back() - times.front();
  finding.clock = {times.front(), rate, static_cast<std::size_t>(span * rate + 1e-6) + 1};
  return finding;
}

}  // namespace dampwright
