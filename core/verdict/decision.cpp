// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/verdict/decision.h"

#include <algorithm>
#include <cmath>
#include <limits>

#include "core/uncertainty/student_t.h"

namespace dampwright {
namespace {

constexpr double infinity = std::numeric_limits<double>::infinity();
constexpr double confidence = 0.95;

// The limit that the figure is nearest to passing, or farthest past.
double limitAt(const Judged& judged, const LimitRange& range) {
  const double toMin = range.min ? judged.value - *range.min : infinity;
  const double toMax = range.max ? *range.max - judged.value : infinity;
  return toMin <= toMax ? *range.min : *range.max;
}

// Reasons give distances, not two figures to compare: a small difference is not rounded away.
// Three digits of a distance are what a reader takes in.
NamedValue distance(const char* name, double value, Quantity quantity) {
  if (value == 0 || !std::isfinite(value)) return {name, value, quantity};
  const double perStep = std::pow(10.0, 2 - std::floor(std::log10(std::abs(value))));
  return {name, std::round(value * perStep) / perStep, quantity};
}

Reason simpleReason(const Judged& judged, double margin, double limit) {
  const Quantity quantity = judged.quantity;
  if (margin >= 0) return Reason{"inside-limits", {distance("margin", margin, quantity)}};
  return Reason{"outside-limits",
                {distance("beyond", -margin, quantity), {"limit", limit, quantity}}};
}

Reason passReason(const Judged& judged, double margin) {
  return Reason{"inside-limits-surely",
                {distance("spare", margin - judged.expandedUncertainty, judged.quantity),
                 distance("uncertainty", judged.expandedUncertainty, judged.quantity)}};
}

Reason failReason(const Judged& judged, double margin, double limit) {
  return Reason{"outside-limits-surely",
                {distance("beyond", -margin, judged.quantity),
                 {"limit", limit, judged.quantity},
                 distance("excess", -margin - judged.expandedUncertainty, judged.quantity),
                 distance("uncertainty", judged.expandedUncertainty, judged.quantity)}};
}

Reason openReason(const Judged& judged, const LimitRange& range, double margin, double limit) {
  const double uncertainty = judged.expandedUncertainty;
  const Quantity quantity = judged.quantity;
  if (range.min && range.max && *range.max - *range.min < 2 * uncertainty) {
    const double width = *range.max - *range.min;
    return Reason{"limits-narrower-than-uncertainty",
                  {distance("width", width, quantity),
                   distance("missing", 2 * uncertainty - width, quantity),
                   distance("uncertainty", uncertainty, quantity)}};
  }
  if (margin >= 0) {
    return Reason{"close-inside-limit",
                  {distance("margin", margin, quantity),
                   {"limit", limit, quantity},
                   distance("overlap", uncertainty - margin, quantity)}};
  }
  return Reason{"close-outside-limit",
                {distance("beyond", -margin, quantity),
                 {"limit", limit, quantity},
                 distance("overlap", uncertainty + margin, quantity)}};
}

}  // namespace

LimitRange rangeOf(const Check& check) {
  if (!check.target) return {check.min, check.max};
  const double tolerance =
      std::abs(*check.target) * check.tolerancePercent / 100 + check.toleranceAbsolute;
  return {*check.target - tolerance, *check.target + tolerance};
}

Decision decide(const Judged& judged, const LimitRange& range, DecisionRule rule) {
  if (!range.min && !range.max)
    return {VerdictWord::NotTested, std::nullopt, {"check-without-limit", {}}};
  const double y = judged.value;
  const double limit = limitAt(judged, range);
  const double min = range.min.value_or(-infinity);
  const double max = range.max.value_or(infinity);
  const double margin = std::min(y - min, max - y);
  if (rule == DecisionRule::Simple) {
    const bool inside = y >= min && y <= max;
    return {inside ? VerdictWord::Pass : VerdictWord::Fail,
            margin,
            simpleReason(judged, margin, limit)};
  }
  const double u = judged.expandedUncertainty;
  if (y >= min + u && y <= max - u) return {VerdictWord::Pass, margin, passReason(judged, margin)};
  if (y < min - u || y > max + u)
    return {VerdictWord::Fail, margin, failReason(judged, margin, limit)};
  return {VerdictWord::TooCloseToCall, margin, openReason(judged, range, margin, limit)};
}

double coverageOf(double limitSheetFactor, double dof) {
  return std::max(limitSheetFactor, coverageFactor(confidence, dof));
}

VerdictWord overall(const std::vector<CheckVerdict>& checks) {
  const auto any = [&](VerdictWord word) {
    return std::any_of(
        checks.begin(), checks.end(), [&](const CheckVerdict& c) { return c.verdict == word; });
  };
  if (any(VerdictWord::Fail)) return VerdictWord::Fail;
  if (any(VerdictWord::TooCloseToCall)) return VerdictWord::TooCloseToCall;
  if (checks.empty() || any(VerdictWord::NotTested)) return VerdictWord::NotTested;
  return VerdictWord::Pass;
}

}  // namespace dampwright
