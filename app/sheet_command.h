// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// True where the arguments ask for a sheet: `dampwright sheet FILE… --limits L.json --pdf
/// OUT.pdf`.
bool asksForSheet(int argc, const char* const* argv);

/// Reads, measures and judges the files as `dampwright-batch judge` does and writes the customer's
/// sheet of one damper as a PDF with the recordings inside. Needs no display and no job book; makes
/// its own offscreen application, so call it before there is one. Prints the path (to --out where
/// given), messages to standard error. Returns the exit status of app/batch_request.h; the PDF is
/// written whole or not at all.
int runSheetCommand(int argc, char** argv);

}  // namespace dampwright
