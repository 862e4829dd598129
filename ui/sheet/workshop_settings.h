// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// The workshop's name and address as kept in the user's settings; empty where never typed.
Workshop keptWorkshop();
void keepWorkshop(const Workshop& workshop);

}  // namespace dampwright
