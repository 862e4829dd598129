// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>
#include <optional>

#include "ui/sheet/sheet_document.h"

namespace dampwright {

/// The pages of a document below each other, as wide as the widget; painted afresh at any scale by
/// the same painter as paper.
class SheetPages : public QWidget {
  Q_OBJECT
 public:
  explicit SheetPages(QWidget* parent = nullptr);

  void show(const SheetDocument& document);

  bool hasHeightForWidth() const override { return true; }
  int heightForWidth(int width) const override;
  QSize sizeHint() const override;

 protected:
  void paintEvent(QPaintEvent* event) override;

 private:
  QRectF pageBox(int page, int width) const;

  std::optional<SheetDocument> document_;
};

}  // namespace dampwright
