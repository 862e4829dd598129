// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QObject>
#include <QTimer>

#include "app/gui_options.h"

namespace dampwright {

class MainWindow;
class Session;

/// Waits until files are read, measured and written, then writes the picture and the sheet that
/// were asked for and leaves the program: 0 done, 4 where a file cannot be written, 3 where there
/// is nothing to write.
class Unattended : public QObject {
 public:
  Unattended(Session& session, MainWindow& window, const GuiOptions& options);

 private:
  void look();
  int finish();

  Session& session_;
  MainWindow& window_;
  GuiOptions options_;
  QTimer clock_;
  int quietLooks_ = 0;
};

}  // namespace dampwright
