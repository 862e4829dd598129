// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_output.h"

#include <QBuffer>
#include <QCoreApplication>
#include <QFileInfo>
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

// In memory first: QPdfWriter does not notice that its device takes no more. Empty: it failed.
QByteArray pdfBytes(const SheetDocument& document) {
  QBuffer buffer;
  buffer.open(QIODevice::WriteOnly);
  QPdfWriter writer(&buffer);
  writer.setPdfVersion(QPdfWriter::PdfVersion_1_6);
  writer.setResolution(dotsPerInch);
  writer.setPageLayout(layoutOf(document.paper()));
  writer.setTitle(document.title());
  writer.setCreator(QStringLiteral("Dampwright " DAMPWRIGHT_VERSION));
  for (const NamedAttachment& file : namedAttachments(document.content())) {
    writer.addFileAttachment(file.name, file.bytes, file.mimeType);
  }
  return paintAll(writer, document) ? buffer.data() : QByteArray();
}

}  // namespace

Result<Done> writeSheetPdf(const QString& path, const SheetDocument& document) {
  // A device or a pipe of that name would be replaced by the file, not written to.
  const QFileInfo there(path);
  if (there.exists() && !there.isFile()) return notWritten(path, Sheet::tr("it is not a file"));
  QSaveFile file(path);
  if (!file.open(QIODevice::WriteOnly)) return notWritten(path, file.errorString());
  const QByteArray bytes = pdfBytes(document);
  if (bytes.isEmpty()) return notWritten(path, Sheet::tr("its pages could not be drawn"));
  if (file.write(bytes) != bytes.size() || !file.flush()) {
    return notWritten(path, file.errorString());
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
