// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_preview.h"

#include <QComboBox>
#include <QFileDialog>
#include <QFileInfo>
#include <QHBoxLayout>
#include <QLabel>
#include <QLineEdit>
#include <QPrintDialog>
#include <QPrinter>
#include <QPrinterInfo>
#include <QPushButton>
#include <QScrollArea>
#include <QSettings>
#include <QVBoxLayout>

#include "ui/look/elided.h"
#include "ui/sheet/sheet_output.h"
#include "ui/sheet/sheet_pages.h"
#include "ui/sheet/workshop_settings.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

constexpr int controlHeight = 32;  // px
const QString paperKey = QStringLiteral("sheet/paper");
const QString folderKey = QStringLiteral("sheet/folder");

PaperSize keptPaper() {
  const QString kept = QSettings().value(paperKey).toString();
  if (kept == QStringLiteral("A4")) return PaperSize::A4;
  if (kept == QStringLiteral("Letter")) return PaperSize::Letter;
  return usualPaperSize();
}

QPushButton* button(const QString& text, const QString& tip) {
  auto* made = new QPushButton(text);
  made->setToolTip(tip);
  made->setMinimumHeight(controlHeight);
  made->setAutoDefault(false);
  return made;
}

}  // namespace

SheetPreview::SheetPreview(SheetContent content, QWidget* parent)
    : QDialog(parent), content_(std::move(content)) {
  setWindowTitle(tr("Sheet"));
  resize(860, 900);
  pages_ = new SheetPages;
  scroll_ = new QScrollArea;
  scroll_->setWidget(pages_);
  scroll_->setWidgetResizable(true);
  scroll_->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  scroll_->setAccessibleName(tr("Pages of the sheet"));
  message_ = new QLabel;
  message_->setWordWrap(true);
  message_->setTextInteractionFlags(Qt::TextSelectableByMouse);
  message_->hide();
  auto* column = new QVBoxLayout(this);
  column->addWidget(makeBar());
  column->addWidget(scroll_, 1);
  column->addWidget(message_);
  layOut();
  scroll_->setFocus();
}

QWidget* SheetPreview::makeBar() {
  paper_ = new ElidedComboBox;
  paper_->addItem(tr("A4"), static_cast<int>(PaperSize::A4));
  paper_->addItem(tr("Letter"), static_cast<int>(PaperSize::Letter));
  paper_->setCurrentIndex(paper_->findData(static_cast<int>(keptPaper())));
  paper_->setAccessibleName(tr("Paper size"));
  workshop_ = new QLineEdit(content_.workshop.name);
  workshop_->setPlaceholderText(tr("Workshop"));
  workshop_->setAccessibleName(tr("Name of the workshop"));
  address_ = new QLineEdit(content_.workshop.address);
  address_->setPlaceholderText(tr("Address"));
  address_->setAccessibleName(tr("Address of the workshop"));
  for (QWidget* field : {static_cast<QWidget*>(paper_),
                         static_cast<QWidget*>(workshop_),
                         static_cast<QWidget*>(address_)}) {
    field->setMinimumHeight(controlHeight);
  }
  auto* save = button(tr("&Save PDF…"), tr("Save the sheet with its recordings inside"));
  auto* printButton = button(tr("&Print…"), tr("Print the sheet"));
  connect(paper_, &QComboBox::activated, this, [this] {
    QSettings().setValue(
        paperKey, paper_->currentIndex() == 0 ? QStringLiteral("A4") : QStringLiteral("Letter"));
    layOut();
  });
  connect(workshop_, &QLineEdit::editingFinished, this, &SheetPreview::changeWorkshop);
  connect(address_, &QLineEdit::editingFinished, this, &SheetPreview::changeWorkshop);
  connect(save, &QPushButton::clicked, this, &SheetPreview::savePdf);
  connect(printButton, &QPushButton::clicked, this, &SheetPreview::print);
  auto* bar = new QWidget;
  auto* row = new QHBoxLayout(bar);
  row->setContentsMargins(0, 0, 0, 0);
  row->addWidget(workshop_, 1);
  row->addWidget(address_, 2);
  row->addWidget(paper_);
  row->addWidget(save);
  row->addWidget(printButton);
  return bar;
}

void SheetPreview::layOut() {
  document_.emplace(content_, static_cast<PaperSize>(paper_->currentData().toInt()));
  pages_->show(*document_);
}

void SheetPreview::changeWorkshop() {
  const Workshop typed{workshop_->text().trimmed(), address_->text().trimmed()};
  if (typed == content_.workshop) return;
  content_.workshop = typed;
  keepWorkshop(typed);
  layOut();
}

void SheetPreview::savePdf() {
  changeWorkshop();
  QFileDialog dialog(
      this, tr("Save PDF"), QSettings().value(folderKey).toString(), tr("PDF documents (*.pdf)"));
  dialog.setAcceptMode(QFileDialog::AcceptSave);
  dialog.setDefaultSuffix(QStringLiteral("pdf"));
  dialog.selectFile(suggestedFileName(content_.job));
  if (dialog.exec() != QDialog::Accepted) return;
  savePdfAs(dialog.selectedFiles().constFirst());
}

void SheetPreview::savePdfAs(const QString& path) {
  const Result<Done> written = writeSheetPdf(path, *document_);
  if (written) QSettings().setValue(folderKey, QFileInfo(path).absolutePath());
  say(written ? tr("Saved: %1").arg(path) : sentenceText(written.error()));
}

void SheetPreview::print() {
  changeWorkshop();
  if (QPrinterInfo::availablePrinterNames().isEmpty()) {
    say(tr("No printer was found. Save the sheet as a PDF, or set up a printer and print again."));
    return;
  }
  QPrinter printer(QPrinter::HighResolution);
  printer.setPageSize(QPageSize(pageSizeId(document_->paper())));
  QPrintDialog dialog(&printer, this);
  dialog.setMinMax(1, document_->pageCount());
  if (dialog.exec() != QDialog::Accepted) return;
  const Result<Done> printed = printSheet(printer, *document_);
  say(printed ? tr("Sent to %1.").arg(printer.printerName()) : sentenceText(printed.error()));
}

void SheetPreview::say(const QString& sentence) {
  message_->setText(sentence);
  message_->show();
}

}  // namespace dampwright
