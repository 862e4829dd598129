// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QApplication>
#include <QDragEnterEvent>
#include <QDragLeaveEvent>
#include <QDropEvent>
#include <QMimeData>
#include <QUrl>
#include <QWidget>
#include <memory>

namespace dampwright::made {

/// Files on their way from the file manager. A real QDrag cannot be simulated, so its events are
/// sent: enter first, a drop without it is ignored.
class Drag {
 public:
  explicit Drag(const QStringList& files) {
    QList<QUrl> urls;
    for (const QString& file : files) urls << QUrl::fromLocalFile(file);
    data_.setUrls(urls);
  }
  bool enter(QWidget* over) {
    const QPoint middle = over->rect().center();
    QDragEnterEvent event(middle, Qt::CopyAction, &data_, Qt::LeftButton, Qt::NoModifier);
    QApplication::sendEvent(over, &event);
    return event.isAccepted();
  }
  void leave(QWidget* over) {
    QDragLeaveEvent event;
    QApplication::sendEvent(over, &event);
  }
  bool drop(QWidget* on) {
    const QPointF middle = QRectF(on->rect()).center();
    QDropEvent event(middle, Qt::CopyAction, &data_, Qt::LeftButton, Qt::NoModifier);
    QApplication::sendEvent(on, &event);
    return event.isAccepted();
  }

 private:
  QMimeData data_;
};

}  // namespace dampwright::made
