// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QFrame>
#include <vector>

#include "ui/corners/corner_view.h"

class QPushButton;
class QVBoxLayout;

namespace dampwright {

class ElidedLabel;
class PhaseCard;
class VehicleView;

/// The left part of the window: the plan view with one place for each damper, and the runs of the
/// selected one below. Files are dropped here.
class CornerPanel : public QFrame {
  Q_OBJECT
 public:
  explicit CornerPanel(QWidget* parent = nullptr);

  void setView(const CornersView& view);
  VehicleView* vehicle() const { return vehicle_; }
  QString selectedHeading() const;  ///< "Rear left · DA-1109"

 signals:
  void selectWanted(const dampwright::PhaseKey& key);
  void filesDropped(const QStringList& files, const QString& corner);
  void addRunsWanted(const QString& corner);
  void damperWanted(const QString& corner);
  void removeWanted(const dampwright::PhaseKey& key, int run);
  void moveWanted(const dampwright::PhaseKey& from, const QString& toCorner);

 private:
  void showPhases(const CornerView* corner);
  void addPhaseCard(int phase);

  CornersView view_;
  VehicleView* vehicle_;
  ElidedLabel* heading_;
  QPushButton *damper_, *add_;
  QVBoxLayout* list_;
  std::vector<PhaseCard*> cards_;
};

}  // namespace dampwright
