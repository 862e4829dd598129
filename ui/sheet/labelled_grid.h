// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <utility>
#include <vector>

#include "ui/sheet/paper.h"

namespace dampwright {

using LabelledText = std::pair<QString, QString>;

/// Label and text pairs in columns side by side, filled row by row; texts wrap, nothing is cut.
SheetSection labelledGrid(const std::vector<LabelledText>& entries,
                          double width,
                          int columns,
                          double labelWidth,
                          double points);

}  // namespace dampwright
