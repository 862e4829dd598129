// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QDialog>
#include <optional>

#include "ui/sheet/sheet_document.h"

class QComboBox;
class QLabel;
class QLineEdit;
class QScrollArea;

namespace dampwright {

class SheetPages;

/// The sheet as it will be printed, page below page, with paper size, workshop, Save PDF and Print.
/// Works without any printer; what can't be done is said in a line below the pages, never in a
/// window on top.
class SheetPreview : public QDialog {
  Q_OBJECT
 public:
  explicit SheetPreview(SheetContent content, QWidget* parent = nullptr);

  const SheetDocument& document() const { return *document_; }

 public slots:
  void savePdf();  ///< asks where
  void savePdfAs(const QString& path);
  void print();

 private:
  QWidget* makeBar();
  void layOut();
  void changeWorkshop();
  void say(const QString& sentence);

  SheetContent content_;
  std::optional<SheetDocument> document_;
  SheetPages* pages_ = nullptr;
  QScrollArea* scroll_ = nullptr;
  QComboBox* paper_ = nullptr;
  QLineEdit* workshop_ = nullptr;
  QLineEdit* address_ = nullptr;
  QLabel* message_ = nullptr;
};

}  // namespace dampwright
