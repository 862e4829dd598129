// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>

#include "ui/session/session.h"

namespace dampwright {

class CornerPanel;
class LoopsView;
class VerdictPanel;
enum class NoticeAction;

/// The open job: corners left, loops in the middle, verdict right. Shows what the session says and
/// hands edits to it; what needs a dialog it asks the window for.
class JobPage : public QWidget {
  Q_OBJECT
 public:
  explicit JobPage(Session& session, QWidget* parent = nullptr);

  CornerPanel* corners() const { return corners_; }
  LoopsView* loops() const { return loops_; }
  VerdictPanel* verdict() const { return verdict_; }

 signals:
  void addRunsWanted(const QString& corner);
  void damperWanted(const QString& corner);
  void limitsFileWanted();
  void sheetWanted();
  void columnsWanted(const dampwright::RunPlace& place);

 private:
  void connectParts();
  void mend(NoticeAction action, int run);
  void followSession();
  void refreshSides();
  void refreshCorners();
  void refreshVerdict();
  void refreshLoops();

  Session& session_;
  CornerPanel* corners_;
  LoopsView* loops_;
  VerdictPanel* verdict_;
};

}  // namespace dampwright
