// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>
#include <QSizeF>
#include <memory>
#include <vector>

#include "ui/sheet/pagination.h"
#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// A sheet laid out on paper: the one painter of preview, printer and PDF. Every page has the same
/// head (workshop, job number, page n of N) and foot. Plots are as high as they can be on the
/// smallest number of pages: as a rule one for one damper, two for a car.
class SheetDocument {
 public:
  SheetDocument(SheetContent content, PaperSize paper);

  int pageCount() const { return static_cast<int>(pages_.size()); }
  PaperSize paper() const { return paper_; }
  const SheetContent& content() const { return *content_; }
  QString title() const;  ///< of the document: "Damper test sheet, job 2041"

  /// Paints page `page` (from 0) in millimetres from the paper's top left corner; the caller scales
  /// the painter. Always on white in the light palette, without transparency.
  void paintPage(QPainter& painter, int page) const;

 private:
  std::shared_ptr<const SheetContent> content_;
  PaperSize paper_;
  std::vector<SheetPage> pages_;
};

}  // namespace dampwright
