// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <QStringList>

namespace dampwright {

/// What the command line of `dampwright` asks for.
struct GuiOptions {
  bool demonstration = false;
  QString book;        ///< file of the job book
  QString sampleRuns;  ///< folder of the demonstration's files
  QString picture;     ///< PNG to write, then leave; empty: none
  QString sheet;       ///< PDF to write, then leave; empty: none
  QStringList files;   ///< to be dropped in

  bool unattended() const { return !picture.isEmpty() || !sheet.isEmpty(); }
};

/// The options, or what to print and the exit status to leave with (0 help and version, 64 wrong
/// usage).
struct ParsedOptions {
  GuiOptions options;
  bool leave = false;
  int status = 0;
  QString output;
};

/// Needs names of application and organisation (default paths), but no display.
ParsedOptions parseOptions(const QStringList& arguments);

}  // namespace dampwright
