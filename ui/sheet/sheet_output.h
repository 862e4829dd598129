// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>

#include "core/base/result.h"
#include "ui/sheet/sheet_document.h"

class QPrinter;

namespace dampwright {

/// Writes the sheet as a PDF with its attachments, whole or not at all: a file of this name is only
/// replaced when the new one is complete. Needs a QGuiApplication (also offscreen) for its fonts.
/// Errors: sheet-not-written (file, reason).
Result<Done> writeSheetPdf(const QString& path, const SheetDocument& document);

/// Sends the sheet to a printer on the document's paper; pages as the printer was told.
/// Errors: printer-failed (printer).
Result<Done> printSheet(QPrinter& printer, const SheetDocument& document);

/// A file name for a job's sheet, without folder: "Sheet 2041, Saltmarsh Motor Club.pdf".
QString suggestedFileName(const Job& job);

}  // namespace dampwright
