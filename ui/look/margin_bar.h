// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>
#include <QRectF>
#include <optional>

#include "core/verdict/verdict.h"
#include "ui/look/palette.h"

namespace dampwright {

/// Where a figure stands between its limits, as shares of a bar's width; pure geometry.
struct MarginScale {
  double allowedFrom = 0, allowedTo = 1;  ///< the allowed stretch; one-sided limits reach the end
  std::optional<double> at;               ///< the figure, clamped to 0 … 1; nothing: not tested
  double from = 0, to = 0;                ///< figure ± U, clamped to 0 … 1
  bool beyond = false;                    ///< the figure lies outside the bar and was clamped
};

/// Two limits fill the middle half of the bar. One limit stands at three quarters (a largest value)
/// or one quarter (a smallest) with zero at the far end where the limit is positive.
MarginScale marginScale(const CheckVerdict& check);

/// Grey rail, allowed stretch with limit ticks, whiskers of ± U, and a dot (an arrow head where the
/// figure is beyond the bar). Not tested: the rail alone.
void paintMarginBar(QPainter& painter,
                    const QRectF& box,
                    const CheckVerdict& check,
                    const Palette& palette);

}  // namespace dampwright
