// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAction>
#include <QMenuBar>
#include <QObject>
#include <map>

#include "ui/look/palette.h"

namespace dampwright {

enum class ActionId {
  NewJob,
  StartPage,
  Demonstration,
  AddRuns,
  RigFolder,
  JobDetails,
  Limits,
  PrintSheet,
  Quit,
  Undo,
  Redo,
  Damper,
  Columns,
  StrikeOut,
  FitPlots,
  Dark,
  GoToCorners,
  GoToLoops,
  GoToVerdict,
  Safety,
  About
};

/// Everything that the window can do, from one table: id, menu, text, shortcut, icon. The menu bar
/// is the table in order.
class Actions : public QObject {
  Q_OBJECT
 public:
  explicit Actions(QObject* parent = nullptr);

  /// Its iconText is the short form for a button: "Add runs" for "Open runs…".
  QAction* operator[](ActionId id) const { return actions_.at(id); }
  void fill(QMenuBar& bar) const;
  void setColours(const Palette& colours);  ///< the icons follow the theme

 private:
  std::map<ActionId, QAction*> actions_;
};

}  // namespace dampwright
