// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>
#include <vector>

#include "ui/corners/corner_view.h"

namespace dampwright {

class CornerPlace;

/// The plan view: the vehicle from above with the card of each place on it.
class VehicleView : public QWidget {
  Q_OBJECT
 public:
  explicit VehicleView(QWidget* parent = nullptr);

  void setView(const CornersView& view);
  CornerPlace* place(const QString& corner) const;  ///< null where the vehicle has no such place
  void takeFocus();  ///< to the place that is selected, else the first
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

 signals:
  void cornerPicked(const QString& corner);
  void filesDropped(const QStringList& files, const QString& corner);

 protected:
  void paintEvent(QPaintEvent* event) override;
  void resizeEvent(QResizeEvent* event) override;

 private:
  void rebuild();
  void layOut();

  CornersView view_;
  std::vector<CornerPlace*> places_;
};

}  // namespace dampwright
