// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <vector>

#include "core/base/named_value.h"
#include "core/base/quantity.h"
#include "core/base/remark.h"
#include "core/uncertainty/budget.h"
#include "core/verdict/limits.h"

namespace dampwright {

enum class VerdictWord { Pass, Fail, TooCloseToCall, NotTested };

/// Why a check came out as it did: code of core/words with what its sentence needs.
struct Reason {
  std::string code;
  Values values;
};

/// One check, judged on unrounded values.
struct CheckVerdict {
  Check check;  ///< what was asked
  VerdictWord verdict = VerdictWord::NotTested;
  Quantity quantity = Quantity::Force;
  std::optional<double> measured;  ///< SI
  double standardUncertainty = 0;  ///< SI
  double dof = 0;                  ///< effective, Welch-Satterthwaite
  double coverageFactor = 0;       ///< the k used
  double expandedUncertainty = 0;  ///< SI, k·u
  std::optional<double> min, max;  ///< SI, the limits after target and tolerance were worked out
  std::optional<double> margin;  ///< SI, min(y − min, max − y), positive inside, U not taken off
  Reason reason;
  std::vector<Remark> remarks;  ///< how the figure was read, where that is worth knowing
  std::vector<BudgetLine> budget;
};

struct Verdict {
  int method = 1;
  VerdictWord word = VerdictWord::NotTested;
  std::vector<CheckVerdict> checks;
  std::string title, source, revision;  ///< of the limit sheet
  DecisionRule decisionRule = DecisionRule::Guarded;
  ForceBasis forceBasis = ForceBasis::AsMeasured;
  std::string
      measurementSha256;  ///< of the measurement document's bytes, empty where it was not written
  std::vector<Reason>
      waiting;  ///< what the technician must confirm before a verdict by direction stands
};

}  // namespace dampwright
