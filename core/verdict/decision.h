// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>

#include "core/base/quantity.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// The limits of a check after target and tolerance are worked out, SI. Either may be missing.
struct LimitRange {
  std::optional<double> min, max;
};

/// min and max as they stand, or target ∓ (percent of |target| + absolute tolerance, added).
LimitRange rangeOf(const Check& check);

/// A figure that is to be decided on, SI.
struct Judged {
  double value = 0;
  double expandedUncertainty = 0;  ///< U = k·u, >= 0
  Quantity quantity = Quantity::Force;
};

struct Decision {
  VerdictWord word = VerdictWord::NotTested;
  std::optional<double> margin;  ///< SI, min(y − min, max − y), positive inside, U not taken off
  Reason reason;
};

/// Guarded, two limits: pass if min + U <= y <= max − U, fail if y < min − U or y > max + U, else
/// too close to call. One limit: the same with that limit alone. Simple: min <= y <= max passes.
/// On unrounded values; the limit itself belongs to the better side. Without any limit: not tested.
/// Source: JCGM 106:2012, 8.3.2 (guarded acceptance, w = U) and 8.2 (simple acceptance);
/// rejection guarded too, as ISO 14253-1 does for the party that rejects.
Decision decide(const Judged& judged, const LimitRange& range, DecisionRule rule);

/// k = max(coverage factor of the limit sheet, two-sided 95 % of Student's t at these degrees of
/// freedom).
double coverageOf(double limitSheetFactor, double dof);

/// Fail if one check fails, else too close to call, else not tested, else pass; nothing to check is
/// not tested.
VerdictWord overall(const std::vector<CheckVerdict>& checks);

}  // namespace dampwright
