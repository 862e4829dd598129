// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/sheet/test_blocks.h"

namespace dampwright {

/// True where both verdicts judge by the same checks and limits, so that one table holds both.
bool sameChecks(const Verdict& left, const Verdict& right);

/// "Front left"; for two tests of one damper which of them it is.
QString sideName(const SheetTest& test, const SheetTest& other);

/// The same facts as checkTable, for two tests that are judged by the same checks: what is asked,
/// target and limits once, then for each test measured ± U, k, margin and verdict. Where k is the
/// same throughout, it is said once in the head. The marks stand without words where these have no
/// room; a line below the table says then what they mean.
SheetSection pairTable(const SheetTest& left, const SheetTest& right, double width);

}  // namespace dampwright
