// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/signal/low_pass.h"

#include <algorithm>
#include <cmath>

#include "core/base/expects.h"
#include "core/base/units.h"

namespace dampwright {
namespace {

double designFrequency(const CfcClass& cfc) {
  return cfc.number * (cfc.rule == CfcRule::SaeJ211 ? 2.0775 : 25.0 / 12.0);
}

Biquad twoPoles(double wa) {
  const double d = 1 + std::sqrt(2.0) * wa + wa * wa;
  const double a0 = wa * wa / d;
  return {a0, 2 * a0, a0, -2 * (wa * wa - 1) / d, (-1 + std::sqrt(2.0) * wa - wa * wa) / d};
}

// Filters in place from a state that would be at rest if the first sample had stood for ever.
void filterSettled(const Biquad& f, std::vector<double>& signal) {
  double z1 = (1 - f.a0) * signal.front();
  double z2 = (f.a2 + f.b2) * signal.front();
  for (double& sample : signal) {
    const double y = f.a0 * sample + z1;
    z1 = f.a1 * sample + f.b1 * y + z2;
    z2 = f.a2 * sample + f.b2 * y;
    sample = y;
  }
}

// The signal with `padding` samples before and after, turned half round about its end points.
std::vector<double> padded(std::span<const double> signal, std::size_t padding) {
  std::vector<double> wide;
  wide.reserve(signal.size() + 2 * padding);
  const double first = signal.front(), last = signal.back();
  for (std::size_t i = padding; i > 0; --i) wide.push_back(2 * first - signal[i]);
  wide.insert(wide.end(), signal.begin(), signal.end());
  for (std::size_t i = 1; i <= padding; ++i)
    wide.push_back(2 * last - signal[signal.size() - 1 - i]);
  return wide;
}

}  // namespace

double cutoffOf(const LowPass& filter) {
  if (const auto* cfc = std::get_if<CfcClass>(&filter)) return cfc->number * 5.0 / 3.0;
  return std::get<Butterworth>(filter).cutoff;
}

Biquad cfcBiquad(const CfcClass& cfc, double rate) {
  return twoPoles(std::tan(pi * designFrequency(cfc) / rate));
}

Biquad butterworthBiquad(const Butterworth& filter, double rate) {
  // |H|² = 1/(1 + (tan(πf/rate)/wa)⁴) of one pass is 1/√2 at the cutoff
  return twoPoles(std::tan(pi * filter.cutoff / rate) / std::pow(std::sqrt(2.0) - 1, 0.25));
}

std::vector<double> filterForward(const Biquad& f, std::span<const double> signal) {
  std::vector<double> out(signal.size());
  double z1 = 0, z2 = 0;
  for (std::size_t i = 0; i < signal.size(); ++i) {
    out[i] = f.a0 * signal[i] + z1;
    z1 = f.a1 * signal[i] + f.b1 * out[i] + z2;
    z2 = f.a2 * signal[i] + f.b2 * out[i];
  }
  return out;
}

std::vector<double> zeroPhase(const Biquad& filter,
                              std::span<const double> signal,
                              std::size_t padding) {
  if (signal.size() < 2) return {signal.begin(), signal.end()};
  expects(padding < signal.size());
  std::vector<double> wide = padded(signal, padding);
  filterSettled(filter, wide);
  std::reverse(wide.begin(), wide.end());
  filterSettled(filter, wide);
  std::reverse(wide.begin(), wide.end());
  const auto first = wide.begin() + static_cast<std::ptrdiff_t>(padding);
  return {first, first + static_cast<std::ptrdiff_t>(signal.size())};
}

std::vector<double> lowPass(const LowPass& filter, double rate, std::span<const double> signal) {
  if (signal.size() < 2) return {signal.begin(), signal.end()};
  const double period = rate / cutoffOf(filter);
  const auto wanted = static_cast<std::size_t>(std::ceil(3 * period)) + 9;
  const auto* cfc = std::get_if<CfcClass>(&filter);
  const Biquad biquad = cfc != nullptr ? cfcBiquad(*cfc, rate)
                                       : butterworthBiquad(std::get<Butterworth>(filter), rate);
  return zeroPhase(biquad, signal, std::min(wanted, signal.size() - 1));
}

}  // namespace dampwright
