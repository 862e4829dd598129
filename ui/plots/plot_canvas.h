// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <qcustomplot.h>

#include <QPointF>
#include <QString>

#include "ui/look/palette.h"

namespace dampwright {

/// A QCustomPlot with the manners that all our plots share: zoom by wheel, pan by drag, fit, keys,
/// focus ring, a text where there is nothing to draw yet, and an overlay layer that is painted
/// again without the rest. Internal to ui/plots.
///
/// Keys: left and right step along the loop, up and down from block to block, plus and minus zoom,
/// Ctrl with an arrow pans, Home or 0 fits, Esc lets go.
class PlotCanvas : public QCustomPlot {
  Q_OBJECT
 public:
  explicit PlotCanvas(QWidget* parent = nullptr);

  const Palette& colours() const { return colours_; }
  void setEmptyText(const QString& text);  ///< empty: there is something to draw
  /// A pen for data: one pixel on a coarse screen (wider ones are drawn far slower there), as wide
  /// as the grid at least on a fine one.
  QPen dataPen(const QColor& colour) const;
  QCPLayer* overlay() const { return overlay_; }

  /// Axis rectangles of ours look and behave alike: call for each one added.
  void adopt(QCPAxisRect* rect);
  QSize minimumSizeHint() const override { return {160, 110}; }

 signals:
  void coloursChanged();               ///< the theme: everything drawn must be drawn again
  void pointed(const QPointF& pixel);  ///< the mouse is over the canvas, at most 60 times a second
  void clicked(const QPointF& pixel);  ///< pressed and released in one place
  void let();                          ///< the mouse has left, or Esc
  void stepped(int along, int blocks);
  void fitWanted();
  void zoomWanted(double factor);  ///< about the middle, by key
  void panWanted(int right, int up);

 protected:
  void changeEvent(QEvent* event) override;
  void mouseMoveEvent(QMouseEvent* event) override;
  void mousePressEvent(QMouseEvent* event) override;
  void mouseReleaseEvent(QMouseEvent* event) override;
  void mouseDoubleClickEvent(QMouseEvent* event) override;
  void leaveEvent(QEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;
  void paintEvent(QPaintEvent* event) override;
  void focusInEvent(QFocusEvent* event) override;
  void focusOutEvent(QFocusEvent* event) override;

 private:
  void applyColours();
  bool arrow(QKeyEvent* event);

  Palette colours_;
  QString emptyText_;
  QCPLayer* overlay_;
  QTimer hover_;
  QPointF hoverAt_, pressedAt_;
};

}  // namespace dampwright
