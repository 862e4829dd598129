// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/bench/accuracy/tally.h"

#include <algorithm>
#include <cmath>
#include <cstdio>

namespace dampwright::accuracy {
namespace {

constexpr double mostOverBound = 1.2;
constexpr double leastCovered = 93, mostCovered = 97;

struct Summary {
  double bias = 0, spread = 0, within = 0, overBound = 0, biasOverBound = 0, covered = -1;
  std::size_t count = 0;
};

double percentile95(std::vector<double> values) {
  const auto place = static_cast<std::ptrdiff_t>(0.95 * static_cast<double>(values.size() - 1));
  std::nth_element(values.begin(), values.begin() + place, values.end());
  return values[static_cast<std::size_t>(place)];
}

Summary summaryOf(const std::vector<Error>& errors) {
  Summary out;
  out.count = errors.size();
  const auto n = static_cast<double>(errors.size());
  std::vector<double> shares;
  double squares = 0, bounded = 0, z = 0, z2 = 0, inside = 0, stated = 0;
  for (const Error& error : errors) {
    out.bias += error.error / n;
    squares += error.error * error.error / n;
    shares.push_back(std::abs(error.error) / error.allowed);
    if (error.bound > 0) {
      bounded += 1;
      z += error.error / error.bound;
      z2 += std::pow(error.error / error.bound, 2);
    }
    if (error.interval < 0) continue;
    stated += 1;
    inside += std::abs(error.error) <= error.interval ? 1 : 0;
  }
  out.spread = std::sqrt(std::max(0.0, squares - out.bias * out.bias));
  out.within = percentile95(shares);
  if (bounded > 0) {
    out.biasOverBound = z / bounded;
    out.overBound = std::sqrt(std::max(0.0, z2 / bounded - out.biasOverBound * out.biasOverBound));
  }
  if (stated > 0) out.covered = 100 * inside / stated;
  return out;
}

/// What 95 % of the figures must keep, and three standard deviations of the count for coverage.
bool meets(const Summary& s, Judged judged) {
  const double doubt = 3 * std::sqrt(0.05 * 0.95 / static_cast<double>(s.count)) * 100;
  const bool covered = s.covered < 0 || (s.covered >= leastCovered - std::min(doubt, 2.0) &&
                                         s.covered <= mostCovered + std::min(doubt, 3.0));
  return covered &&
         (judged == Judged::CoverageOnly || (s.within <= 1 && s.overBound <= mostOverBound));
}

}  // namespace

void Tally::merge(const Tally& other) {
  for (const auto& [name, errors] : other.errors_)
    errors_[name].insert(errors_[name].end(), errors.begin(), errors.end());
  for (const auto& [name, count] : other.missing_) missing_[name] += count;
}

void Tally::print(Judged judged) const {
  std::printf(
      "| quantity | figures | bias | spread | 95 %% over target | spread over bound | "
      "covered %% | not given | |\n|---|---|---|---|---|---|---|---|---|\n");
  for (const auto& [name, errors] : errors_) {
    const Summary s = summaryOf(errors);
    const auto lost = missing_.find(name);
    std::printf(
        "| %s | %zu | %.4g | %.4g | %.2f |", name.c_str(), s.count, s.bias, s.spread, s.within);
    s.overBound > 0 ? std::printf(" %.2f |", s.overBound) : std::printf(" |");
    s.covered >= 0 ? std::printf(" %.1f |", s.covered) : std::printf(" |");
    std::printf(" %d | %s |\n",
                lost == missing_.end() ? 0 : lost->second,
                meets(s, judged) ? "ok" : "miss");
  }
}

}  // namespace dampwright::accuracy
