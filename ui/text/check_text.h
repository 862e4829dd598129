// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>

#include "core/verdict/verdict.h"

namespace dampwright {

/// A judged check as people read it; every text may be empty but `title` and `verdict`.
struct CheckText {
  QString title;        ///< "Rebound at 300 mm/s"
  QString target;       ///< "1150 N ± 10 %", empty where limits were given as such
  QString limits;       ///< "870–1120 N", "≤ 45 N"
  QString measured;     ///< "964.0 ± 9.1 N"; "not tested" where there is no figure
  QString uncertainty;  ///< "U = 9.1 N, k = 2.06"
  QString coverage;     ///< "k = 2.06"
  QString margin;       ///< "+94.0 N" inside, "−12.3 N" outside
  QString verdict;      ///< "Pass"
  QString reason;       ///< one sentence
};

/// Title of a check before or after it was judged.
QString checkTitle(const Check& check);

/// The limits of a check before it was judged: target and tolerances worked out by the verdict.
QString targetText(const Check& check, Quantity quantity);

/// Rounded as by GUM 7.2.6, with further digits where rounding would move the figure across a
/// limit: nobody reads "10.0 against 10.0: fail".
CheckText checkText(const CheckVerdict& verdict);

/// "1 of 9 checks fails", "All 9 checks pass", in one sentence.
QString verdictSummary(const Verdict& verdict);

}  // namespace dampwright
