// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/envelope.h"

#include <algorithm>
#include <cmath>
#include <limits>

#include "core/base/expects.h"

namespace dampwright {

namespace {

constexpr std::size_t binSize = 256;
constexpr double nothing = std::numeric_limits<double>::quiet_NaN();

}  // namespace

Envelope::Envelope(std::span<const double> samples, double start, double step)
    : samples_(samples), start_(start), step_(step) {
  expects(step > 0);
  bins_.reserve(samples.size() / binSize);
  // Built from the samples alone: bins_ is still empty of whole bins while extremes() fills it.
  for (std::size_t bin = 0; (bin + 1) * binSize <= samples.size(); ++bin) {
    Extremes found{nothing, nothing};
    for (const double sample : samples.subspan(bin * binSize, binSize)) {
      found.low = std::fmin(found.low, sample);  // fmin and fmax pass over NaN
      found.high = std::fmax(found.high, sample);
    }
    bins_.push_back(found);
  }
}

Envelope::Extremes Envelope::extremes(std::size_t from, std::size_t to) const {
  Extremes found{nothing, nothing};
  const auto take = [&found](double low, double high) {
    found.low = std::fmin(found.low, low);
    found.high = std::fmax(found.high, high);
  };
  while (from < to) {
    if (from % binSize == 0 && from + binSize <= to) {
      take(bins_[from / binSize].low, bins_[from / binSize].high);
      from += binSize;
    } else {
      take(samples_[from], samples_[from]);
      ++from;
    }
  }
  return found;
}

QVector<QPointF> Envelope::visible(double from, double to, int columns) const {
  QVector<QPointF> points;
  if (samples_.empty() || !(to > from) || columns < 1) return points;
  const double last = static_cast<double>(samples_.size()) - 1;
  const auto sampleAt = [&](double x) {
    return static_cast<std::size_t>(std::clamp((x - start_) / step_, 0.0, last));
  };
  const std::size_t first = sampleAt(from - step_);
  const std::size_t end = std::min(sampleAt(to + step_) + 2, samples_.size());
  if (end - first <= 4 * static_cast<std::size_t>(columns)) {
    for (std::size_t i = first; i < end; ++i) points.append({at(i), samples_[i]});
    return points;
  }
  points.reserve(4 * columns + 8);
  const double perColumn = static_cast<double>(end - first) / columns;
  for (int column = 0; column < columns; ++column) {
    const auto low = first + static_cast<std::size_t>(perColumn * column);
    const auto high =
        column + 1 == columns ? end : first + static_cast<std::size_t>(perColumn * (column + 1));
    const Extremes found = extremes(low, high);
    const double middle = 0.5 * (at(low) + at(high - 1));
    const double left = samples_[low], right = samples_[high - 1];
    points.append({at(low), left});
    // An extreme at either end is drawn already: a rising signal stays one straight line.
    if (found.low < std::fmin(left, right)) points.append({middle, found.low});
    if (found.high > std::fmax(left, right)) points.append({middle, found.high});
    points.append({at(high - 1), right});
  }
  return points;
}

}  // namespace dampwright
