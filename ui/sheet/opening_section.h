// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/sheet/condition_words.h"
#include "ui/sheet/paper.h"
#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// Title, then whose vehicle, whose work, when, by which limits, and the conditions common to all
/// tests.
SheetSection openingSection(const SheetContent& content,
                            const CommonConditions& common,
                            double width);

}  // namespace dampwright
