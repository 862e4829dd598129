// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/labelled_grid.h"

#include <algorithm>

namespace dampwright {

namespace {

constexpr double columnGap = 5;  // mm

// One row of a grid: as many cells as columns, as high as its tallest.
SheetBlock gridRow(std::vector<std::pair<QString, QStringList>> cells,
                   double width,
                   int columns,
                   double labelWidth,
                   double points) {
  const TextStyle style = paperText(points);
  qsizetype lines = 1;
  for (const auto& cell : cells) lines = std::max(lines, cell.second.size());
  const double step = lineHeight(style);
  const auto paint = [=](QPainter& painter, const QRectF& box) {
    const double cellWidth = (width + columnGap) / columns;
    double x = box.left();
    for (const auto& [label, text] : cells) {
      drawText(painter, {x, box.top(), labelWidth, step}, label, paperQuiet(points));
      for (qsizetype i = 0; i < text.size(); ++i) {
        drawText(painter,
                 {x + labelWidth, box.top() + step * static_cast<double>(i), cellWidth, step},
                 text[i],
                 style);
      }
      x += cellWidth;
    }
  };
  return {step * static_cast<double>(lines) + 0.5, paint, false, {}, false};
}

}  // namespace

SheetSection labelledGrid(const std::vector<LabelledText>& entries,
                          double width,
                          int columns,
                          double labelWidth,
                          double points) {
  const double cellWidth = (width + columnGap) / columns;
  const double textRoom = cellWidth - columnGap - labelWidth;
  SheetSection section;
  std::vector<std::pair<QString, QStringList>> row;
  for (const auto& [label, text] : entries) {
    row.push_back({label, wrapped(text, textRoom, paperText(points))});
    if (static_cast<int>(row.size()) < columns) continue;
    section.push_back(gridRow(std::move(row), width, columns, labelWidth, points));
    row.clear();
  }
  if (!row.empty()) section.push_back(gridRow(std::move(row), width, columns, labelWidth, points));
  return section;
}

}  // namespace dampwright
