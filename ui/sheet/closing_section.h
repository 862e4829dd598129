// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/sheet/paper.h"
#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// The workshop's notes, what the sheet is and is not, how its
/// figures are to be read, cautions in a ruled box, and lines to sign.
SheetSection closingSection(const SheetContent& content, double width);

}  // namespace dampwright
