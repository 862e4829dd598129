// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "core/base/result.h"
#include "ui/session/session.h"
#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// What the sheet of the open job says, as it stands now. There must be one. Errors: those of
/// sheetContent().
Result<SheetContent> sheetOf(const Session& session);

}  // namespace dampwright
