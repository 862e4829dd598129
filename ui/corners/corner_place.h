// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAbstractButton>
#include <QStringList>

#include "ui/corners/corner_view.h"

namespace dampwright {

/// The card of one place on the vehicle: name, serial, verdict stamp. Pressed to select it; files
/// dragged over it light it up, and it says what letting go will do.
class CornerPlace : public QAbstractButton {
  Q_OBJECT
 public:
  explicit CornerPlace(QWidget* parent = nullptr);

  void setView(const CornerView& view);
  QString promise() const { return promise_; }  ///< what a drop now will do, empty: nothing held
  QSize sizeHint() const override { return {104, 88}; }

 signals:
  void filesDropped(const QStringList& files);

 protected:
  void paintEvent(QPaintEvent* event) override;
  void dragEnterEvent(QDragEnterEvent* event) override;
  void dragLeaveEvent(QDragLeaveEvent* event) override;
  void dropEvent(QDropEvent* event) override;

 private:
  void paintFrame(QPainter& painter) const;
  void paintState(QPainter& painter, const QRectF& box) const;
  void paintPromise(QPainter& painter) const;
  void setPromise(const QString& text);

  CornerView view_;
  QString promise_;
};

}  // namespace dampwright
