// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "ui/sheet/condition_words.h"
#include "ui/sheet/paper.h"
#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// How the tests are set on the page.
struct Arrangement {
  bool compact = false;    ///< checks beside the plots, not below them
  double plotHeight = 60;  ///< mm
};

/// A section for each test of a damper (as found, after work, each setting): who it is, stamp, both
/// plots on one force axis, checks, reasons, remarks, conditions that are not
/// common to all, visual check. A damper without
/// tests has one short section that says so.
std::vector<SheetSection> damperSections(const SheetItem& item,
                                         const Arrangement& arrangement,
                                         const CommonConditions& common,
                                         double width);

}  // namespace dampwright
