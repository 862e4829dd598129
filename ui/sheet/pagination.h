// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>
#include <vector>

#include "ui/sheet/paper.h"

namespace dampwright {

/// A block where it stands on its page.
struct PlacedBlock {
  QRectF box;  ///< mm, from the paper's top left corner
  SheetBlock block;
};

using SheetPage = std::vector<PlacedBlock>;

/// Lays sections one below the other. A section goes to the next page if it doesn't fit what is
/// left of this one but fits a whole page; a longer one is parted between blocks, where none keeps
/// with its next. Space and what separates is dropped at the top of a page. Never an empty list.
std::vector<SheetPage> paginate(const std::vector<SheetSection>& sections, const QRectF& body);

void paintBlocks(QPainter& painter, const SheetPage& page);

}  // namespace dampwright
