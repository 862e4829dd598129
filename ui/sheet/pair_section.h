// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/sheet/condition_words.h"
#include "ui/sheet/test_blocks.h"

namespace dampwright {

/// True where two tests belong beside each other: of one damper or one axle, both measured, and
/// both judged by the same checks and limits or not at all.
bool belongTogether(const SheetTest& left, const SheetTest& right);

/// One section for both: each has half of the width for its heading, its plots (one above the
/// other, `plotHeight` mm high each, on one force axis for all four), its own conditions and visual
/// check; table of checks, reasons and remarks hold both.
SheetSection pairSection(const SheetTest& left,
                         const SheetTest& right,
                         double plotHeight,
                         const CommonConditions& common,
                         double width);

}  // namespace dampwright
