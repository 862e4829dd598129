// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/verdict/judge.h"

#include <algorithm>
#include <cmath>

#include "core/verdict/check_kinds.h"
#include "core/verdict/conditions.h"
#include "core/verdict/decision.h"

namespace dampwright {
namespace {

bool directionSettled(const Measurement& measurement) {
  return std::all_of(measurement.runs.begin(), measurement.runs.end(), [](const MeasuredRun& run) {
    return run.directionSettled;
  });
}

// Where nothing is known of the rig, the uncertainty is only what the cycles show.
void remarkUnknownRig(CheckVerdict& verdict, const RigAccuracy& rig) {
  if (!rig.loadCell.readingPercent && !rig.loadCell.capacityPercent)
    verdict.remarks.push_back(Remark{"rig-accuracy-not-known", Severity::Warning, {}});
}

// Measured value, uncertainty and decision of a figure that there is.
void decideOn(CheckVerdict& verdict, const Figure& figure, const Limits& limits) {
  const Combined combined = combine(figure.budget);
  verdict.measured = figure.value;
  verdict.budget = figure.budget;
  verdict.standardUncertainty = combined.u;
  verdict.dof = combined.dof;
  verdict.coverageFactor = coverageOf(limits.coverageFactor, combined.dof);
  verdict.expandedUncertainty = verdict.coverageFactor * combined.u;
  const Judged judged{*figure.value, verdict.expandedUncertainty, verdict.quantity};
  const Decision decision = decide(judged, {verdict.min, verdict.max}, limits.decisionRule);
  verdict.verdict = decision.word;
  verdict.margin = decision.margin;
  verdict.reason = decision.reason;
}

CheckVerdict notTested(CheckVerdict verdict, Reason reason) {
  verdict.verdict = VerdictWord::NotTested;
  verdict.reason = std::move(reason);
  return verdict;
}

CheckVerdict judgeCheck(const Measurement& measurement, const Limits& limits, const Check& check) {
  CheckVerdict verdict;
  verdict.check = check;
  if (auto problem = problemOf(check)) return notTested(verdict, *problem);
  const CheckKind& kind = *findCheckKind(check.check);
  const LimitRange range = rangeOf(check);
  verdict.quantity = kind.quantity;
  verdict.min = range.min;
  verdict.max = range.max;
  if (kind.direction == NeedsDirection::Yes && !directionSettled(measurement))
    return notTested(verdict, {"direction-not-confirmed", {}});
  const Figure figure = kind.evaluate(measurement, limits, check);
  verdict.remarks = figure.remarks;
  if (!figure.value) return notTested(verdict, figure.reason);
  if (!std::isfinite(*figure.value)) return notTested(verdict, {"figure-hidden", {}});
  decideOn(verdict, figure, limits);
  remarkUnknownRig(verdict, measurement.rig);
  if (auto problem = conditionProblem(measurement, limits.conditions, figure))
    return notTested(verdict, *problem);
  return verdict;
}

}  // namespace

Verdict judge(const Measurement& measurement, const Limits& limits) {
  Verdict verdict;
  verdict.method = measurement.method;
  verdict.title = limits.title;
  verdict.source = limits.source;
  verdict.revision = limits.revision;
  verdict.decisionRule = limits.decisionRule;
  verdict.forceBasis = limits.forceBasis;
  for (const Check& check : limits.checks)
    verdict.checks.push_back(judgeCheck(measurement, limits, check));
  verdict.word = overall(verdict.checks);
  for (const CheckVerdict& check : verdict.checks) {
    if (check.reason.code == "direction-not-confirmed" && verdict.waiting.empty())
      verdict.waiting.push_back(check.reason);
  }
  return verdict;
}

}  // namespace dampwright
