// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>
#include <QStringList>
#include <optional>
#include <vector>

#include "core/job/job.h"
#include "core/verdict/verdict.h"
#include "ui/session/session.h"

namespace dampwright {

/// One measurement's worth of runs as the list below the plan view shows it.
struct PhaseView {
  QString title;      ///< "As found", "After work, rebound 8 clicks"
  QString detail;     ///< "7 speeds · 31 °C", or why there is no measurement
  QStringList files;  ///< names of its run files, in order
  std::optional<VerdictWord> verdict;
  bool busy = false, broken = false;
  bool selected = false;  ///< its loops and verdict are shown
};

/// One place on the vehicle.
struct CornerView {
  std::string corner;
  QString name, serial;                ///< "Front left", "DA-1107"
  std::optional<VerdictWord> verdict;  ///< of its newest phase; nothing while there is none
  bool busy = false, broken = false;   ///< broken: its runs could not be measured
  double progress = 0;                 ///< [1] of the work on it
  bool selected = false;
  std::vector<PhaseView> phases;
};

/// Everything that the corners part shows.
struct CornersView {
  VehicleKind kind = VehicleKind::Car;
  std::vector<CornerView> corners;  ///< in the order of cornersOf(kind)
  PhaseKey selected;

  const CornerView* find(const QString& corner) const;
};

/// The open job as the corners part shows it.
CornersView cornersView(const Session& session);

}  // namespace dampwright
