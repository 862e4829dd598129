// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/verdict/verdict.h"
#include "ui/sheet/check_table.h"
#include "ui/sheet/paper.h"

namespace dampwright {

/// The same facts as checkTable in a narrow column beside the plots: two or more lines a check,
/// title above, "measured ± U of limits (target)" below, bar over margin and mark over k at the
/// right. One block: it is never parted.
SheetBlock checkList(const Verdict& verdict, Finality finality, double width);

}  // namespace dampwright
