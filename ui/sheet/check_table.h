// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>

#include "core/verdict/verdict.h"
#include "ui/sheet/paper.h"

namespace dampwright {

enum class Finality { Final, Waiting };

/// The mark that a check shows: not tested while its direction waits for confirmation.
VerdictWord shownVerdict(const CheckVerdict& check, Finality finality);

/// Its word: the verdict's, or "waits".
QString shownVerdictName(const CheckVerdict& check, Finality finality);

/// The checks as a table: what is asked, target, limits, measured ± U, k, margin, bar, verdict.
/// A row a check, columns as wide as they need,
/// cells wrapped, never cut; the head is repeated on the next page. While
/// waiting, a check of one direction shows "waits" in place of its verdict.
SheetSection checkTable(const Verdict& verdict, Finality finality, double width);

}  // namespace dampwright
