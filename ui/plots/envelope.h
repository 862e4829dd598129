// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPointF>
#include <QVector>
#include <cstddef>
#include <span>
#include <vector>

namespace dampwright {

/// A channel on an even clock, ready to be drawn at any zoom: where several samples fall on one
/// pixel column its first and last are drawn, and its smallest and largest between them, so that no
/// extreme and no pixel is lost. Keeps a table of the extremes of every 256 samples beside the
/// samples, which must live as long as this does.
class Envelope {
 public:
  Envelope() = default;
  /// Sample i stands at x = start + i · step, step > 0.
  Envelope(std::span<const double> samples, double start, double step);

  /// What to draw of [from, to] in `columns` (>= 1) pixel columns, by rising x, with one sample
  /// more on either side so that the line runs out of the view. At most 4 points a column.
  /// A NaN sample makes no extreme; where there is nothing else the point is NaN (a gap).
  QVector<QPointF> visible(double from, double to, int columns) const;

  double smallest() const { return extremes(0, samples_.size()).low; }
  double largest() const { return extremes(0, samples_.size()).high; }
  double end() const { return start_ + step_ * static_cast<double>(samples_.size()); }

 private:
  struct Extremes {
    double low, high;  // NaN where there is no number
  };
  Extremes extremes(std::size_t from, std::size_t to) const;
  double at(std::size_t sample) const { return start_ + step_ * static_cast<double>(sample); }

  std::span<const double> samples_;
  std::vector<Extremes> bins_;
  double start_ = 0, step_ = 1;
};

}  // namespace dampwright
