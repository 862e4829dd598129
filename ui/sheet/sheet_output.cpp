// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_output.h"

#include <QCoreApplication>
#include <QMarginsF>
#include <QPageLayout>
#include <QPdfWriter>
#include <QPrinter>
#include <QSaveFile>
#include <algorithm>

#include "ui/sheet/attachments.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

constexpr int dotsPerInch = 1200;

QPageLayout layoutOf(PaperSize paper) {
  return {QPageSize(pageSizeId(paper)), QPageLayout::Portrait, QMarginsF(0, 0, 0, 0)};
}

Error notWritten(const QString& path, const QString& reason) {
  return {"sheet-not-written",
          {{"file", path.toStdString(), Quantity::None},
           {"reason", reason.toStdString(), Quantity::None}},
          {}};
}

void paintScaled(QPainter& painter, const SheetDocument& document, int page, int resolution) {
  painter.save();
  painter.scale(resolution / 25.4, resolution / 25.4);
  document.paintPage(painter, page);
  painter.restore();
}

bool paintAll(QPdfWriter& writer, const SheetDocument& document) {
  QPainter painter;
  if (!painter.begin(&writer)) return false;
  for (int page = 0; page < document.pageCount(); ++page) {
    if (page > 0 && !writer.newPage()) return false;
    paintScaled(painter, document, page, writer.resolution());
  }
  return painter.end();
}

bool writePdf(QIODevice& device, const SheetDocument& document) {
  QPdfWriter writer(&device);
  writer.setPdfVersion(QPdfWriter::PdfVersion_1_6);
  writer.setResolution(dotsPerInch);
  writer.setPageLayout(layoutOf(document.paper()));
  writer.setTitle(document.title());
  writer.setCreator(QStringLiteral("Dampwright " DAMPWRIGHT_VERSION));
  for (const NamedAttachment& file : namedAttachments(document.content())) {
    writer.addFileAttachment(file.name, file.bytes, file.mimeType);
  }
  return paintAll(writer, document);
}

}  // namespace

Result<Done> writeSheetPdf(const QString& path, const SheetDocument& document) {
  QSaveFile file(path);
  if (!file.open(QIODevice::WriteOnly)) return notWritten(path, file.errorString());
  if (!writePdf(file, document) || file.error() != QFileDevice::NoError) {
    const QString reason = file.errorString();
    file.cancelWriting();
    return notWritten(path, reason);
  }
  if (!file.commit()) return notWritten(path, file.errorString());
  return Done{};
}

Result<Done> printSheet(QPrinter& printer, const SheetDocument& document) {
  const Error failed{
      "printer-failed", {{"printer", printer.printerName().toStdString(), Quantity::None}}, {}};
  printer.setFullPage(true);
  printer.setPageLayout(layoutOf(document.paper()));
  printer.setDocName(document.title());
  const int from = printer.fromPage() > 0 ? printer.fromPage() - 1 : 0;
  const int to = printer.toPage() > 0 ? std::min(printer.toPage(), document.pageCount())
                                      : document.pageCount();
  QPainter painter;
  if (!painter.begin(&printer)) return failed;
  for (int page = from; page < to; ++page) {
    if (page > from && !printer.newPage()) return failed;
    paintScaled(painter, document, page, printer.resolution());
  }
  if (!painter.end()) return failed;
  return Done{};
}

QString suggestedFileName(const Job& job) {
  const QString number = QString::fromStdString(job.number);
  const QString customer = QString::fromStdString(job.customer);
  QString name = number.isEmpty() ? Sheet::tr("Sheet") : Sheet::tr("Sheet %1").arg(number);
  if (!customer.isEmpty()) name += QStringLiteral(", ") + customer;
  for (QChar& letter : name) {
    if (!letter.isPrint() || QStringLiteral("/\\:*?\"<>|").contains(letter)) {
      letter = QLatin1Char('_');
    }
  }
  return name.left(120) + QStringLiteral(".pdf");
}

}  // namespace dampwright
