// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/unattended.h"

#include <QCoreApplication>
#include <QImage>
#include <QSize>
#include <cstdio>

#include "core/words/words.h"
#include "ui/main_window/main_window.h"
#include "ui/main_window/session_sheet.h"
#include "ui/sheet/sheet_output.h"

namespace dampwright {

namespace {

constexpr int lookEveryMs = 50;
// Work may hand over to other work for an instant, and plots draw a frame later.
constexpr int quietEnough = 8;
constexpr QSize pictureSize{1440, 900};  // whatever the screen is
constexpr int inputUnusable = 3, outputUnwritable = 4;

int complain(int status, const std::string& line) {
  std::fprintf(stderr, "dampwright: %s\n", line.c_str());
  return status;
}

}  // namespace

Unattended::Unattended(Session& session, MainWindow& window, const GuiOptions& options)
    : session_(session), window_(window), options_(options) {
  if (!options_.picture.isEmpty()) window_.resize(pictureSize);
  connect(&clock_, &QTimer::timeout, this, &Unattended::look);
  clock_.start(lookEveryMs);
}

void Unattended::look() {
  quietLooks_ = session_.busy() ? 0 : quietLooks_ + 1;
  if (quietLooks_ < quietEnough) return;
  clock_.stop();
  QCoreApplication::exit(finish());
}

int Unattended::finish() {
  if (!options_.picture.isEmpty() && !window_.grab().save(options_.picture))
    return complain(outputUnwritable, options_.picture.toStdString() + " cannot be written.");
  if (options_.sheet.isEmpty()) return 0;
  if (!session_.hasJob()) return complain(inputUnusable, "there is no job to print.");
  const auto content = sheetOf(session_);
  if (!content) return complain(inputUnusable, englishLine(content.error()));
  const SheetDocument document(content.value(), usualPaperSize());
  const auto written = writeSheetPdf(options_.sheet, document);
  return written ? 0 : complain(outputUnwritable, englishLine(written.error()));
}

}  // namespace dampwright
