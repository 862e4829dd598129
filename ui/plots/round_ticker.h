// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <qcustomplot.h>

#include "ui/plots/axis_scale.h"

namespace dampwright {

/// Round ticks with true minus signs, as on paper. Internal to ui/plots.
class RoundTicker : public QCPAxisTicker {
 public:
  explicit RoundTicker(int mostIntervals) : mostIntervals_(mostIntervals) {}

 protected:
  QString getTickLabel(double tick, const QLocale&, QChar, int) override {
    return tickText(tick, step_);
  }
  double getTickStep(const QCPRange& range) override {
    step_ = niceScale(range.lower, range.upper, mostIntervals_).step;
    return step_;
  }

 private:
  int mostIntervals_;
  double step_ = 1;
};

}  // namespace dampwright
