// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QIcon>

#include "ui/look/palette.h"

namespace dampwright {

enum class ActionIcon {
  NewJob,
  AddRuns,
  JobBook,
  Demonstration,
  Limits,
  Sheet,
  SavePdf,
  Undo,
  Redo,
  Remove,
  Theme,
  Handbook
};

/// One style: 1.7 wide lines with round ends on a grid of 24, sharp at any size and scale; grey
/// where the action is disabled.
QIcon actionIcon(ActionIcon icon, const Palette& palette);

}  // namespace dampwright
