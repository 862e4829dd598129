// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/sheet/condition_words.h"
#include "ui/sheet/paper.h"
#include "ui/sheet/test_blocks.h"

namespace dampwright {

/// Where the checks of a test stand: in a table below its plots, or in a list beside them.
enum class Checks { Below, Beside };

/// The section of one test of a damper (as found, after work, each setting) on the whole width: who
/// it is, stamp, both plots on one force axis, `plotHeight` mm high, checks, reasons, remarks,
/// conditions that are not common to all, visual check. A damper without tests has a short section
/// that says so.
SheetSection testSection(const SheetTest& test,
                         Checks checks,
                         double plotHeight,
                         const CommonConditions& common,
                         double width);

}  // namespace dampwright
