// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>

#include "ui/sheet/sheet_content.h"

namespace dampwright {

/// Workshop (or a line to write it on), mark of the demonstration, job number, page n of N.
void paintPageHead(
    QPainter& painter, const QRectF& box, const SheetContent& content, int page, int pages);

/// What the results relate to, the program that made them, and the end of the sheet on its last
/// page.
void paintPageFoot(
    QPainter& painter, const QRectF& box, const SheetContent& content, int page, int pages);

/// "Job 2041", or "No job number" where runs were put on a sheet from the command line.
QString jobName(const Job& job);

}  // namespace dampwright
