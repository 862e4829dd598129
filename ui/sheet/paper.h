// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPageSize>
#include <QPainter>
#include <QRectF>
#include <QSizeF>
#include <QString>
#include <functional>
#include <memory>
#include <vector>

#include "ui/look/type.h"

namespace dampwright {

// The sheet is laid out and painted in millimetres, whatever the device.

enum class PaperSize { A4, Letter };

struct PaperFormat {
  QSizeF size;  ///< mm
  QRectF body;  ///< mm, between the page's head and foot
  QRectF head;  ///< mm
  QRectF foot;  ///< mm
};

PaperFormat paperFormat(PaperSize size);
QPageSize::PageSizeId pageSizeId(PaperSize size);
/// Letter where the locale's country uses it, else A4.
PaperSize usualPaperSize();

inline constexpr double hairlineMm = 0.2;
inline constexpr double smallestPoints = 7.5;  ///< no text on a sheet is smaller

TextStyle paperText(double points);
TextStyle paperBold(double points);
TextStyle paperQuiet(double points);

/// A line of a sheet: as high as it needs, as wide as the body.
struct SheetBlock {
  double height = 0;                                    ///< mm
  std::function<void(QPainter&, const QRectF&)> paint;  ///< may be empty: space
  bool keepWithNext = false;
  std::shared_ptr<const SheetBlock> repeat;  ///< painted above where the block begins a page
  bool separates = false;                    ///< left out where it would begin a page
};

/// Blocks that stand on one page if they fit on one at all.
using SheetSection = std::vector<SheetBlock>;

double heightOf(const SheetSection& section);
SheetBlock space(double height);
SheetBlock hairline(double above, double below);
/// Wrapped text; a block for every line, the first two and the last two never parted.
SheetSection paragraph(const QString& text, double width, const TextStyle& style);
/// Two stacks beside each other, each halfOf(width) wide. One block: never parted.
SheetBlock beside(const SheetSection& left, const SheetSection& right);
double halfOf(double width);
void append(SheetSection& section, SheetSection more);

}  // namespace dampwright
