// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QStringList>

#include "ui/sheet/sheet_content.h"

namespace dampwright {

// What the sheet says about one test, in sentences; no figures of its own, all through ui/text.

/// Why each check that did not pass came out so: "Gas force: …"; alike reasons are said once.
QStringList reasonWords(const SheetPhase& phase);
/// Remarks of the files and of the measurement, warnings first, none twice.
QStringList remarkWords(const SheetPhase& phase);
/// What must be confirmed before the verdict stands, and what to do.
QStringList waitingWords(const SheetPhase& phase);
/// Why there is no measurement.
QStringList problemWords(const SheetPhase& phase);

}  // namespace dampwright
