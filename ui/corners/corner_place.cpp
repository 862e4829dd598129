// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/corners/corner_place.h"

#include <QDragEnterEvent>
#include <QPainter>

#include "ui/corners/dropped_files.h"
#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/look/type.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

constexpr double corner = 6, padding = 8, stampHeight = 24;

}  // namespace

CornerPlace::CornerPlace(QWidget* parent) : QAbstractButton(parent) {
  setAcceptDrops(true);
  setCheckable(true);
  setAutoExclusive(true);
  setFocusPolicy(Qt::StrongFocus);
  setCursor(Qt::PointingHandCursor);
}

void CornerPlace::setView(const CornerView& view) {
  view_ = view;
  setChecked(view.selected);
  const QString verdict = view.busy             ? tr("being measured")
                          : view.broken         ? tr("not readable")
                          : view.verdict        ? verdictName(*view.verdict)
                          : view.phases.empty() ? tr("no run yet")
                                                : tr("no verdict yet");
  setText(view.name);
  setAccessibleName(QStringList{view.name, view.serial, verdict}.join(QStringLiteral(", ")));
  setAccessibleDescription(tr("Select to see its loops; drop run files here."));
  setToolTip(view.serial.isEmpty() ? view.name : view.name + QLatin1Char('\n') + view.serial);
  update();
}

void CornerPlace::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  paintFrame(painter);
  if (!promise_.isEmpty()) return paintPromise(painter);
  const Palette& colours = paletteFor(palette());
  const double width = this->width() - 2 * padding;
  const TextStyle name{13, true, colours.ink}, serial{11, false, colours.quiet};
  drawText(painter, {padding, 7, width, 18}, elided(view_.name, width, name), name);
  drawText(painter,
           {padding, 26, width, 15},
           elided(view_.serial, width, serial, Qt::ElideMiddle),
           serial);
  paintState(painter, {padding, height() - padding - stampHeight, width, stampHeight});
}

void CornerPlace::paintFrame(QPainter& painter) const {
  const Palette& colours = paletteFor(palette());
  const bool held = !promise_.isEmpty();
  const bool marked = isChecked() || held || hasFocus() || underMouse();
  painter.setBrush(isChecked() || held ? colours.selected : colours.card);
  QPen pen(marked ? colours.action : colours.hairline, isChecked() || held ? 2 : 1);
  if (held) pen.setStyle(Qt::DashLine);
  painter.setPen(pen);
  painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), corner, corner);
  if (!hasFocus()) return;
  painter.setBrush(Qt::NoBrush);
  painter.setPen(QPen(colours.action, 1, Qt::DotLine));
  painter.drawRoundedRect(QRectF(rect()).adjusted(4, 4, -4, -4), corner - 2, corner - 2);
}

void CornerPlace::paintState(QPainter& painter, const QRectF& box) const {
  const Palette& colours = paletteFor(palette());
  const TextStyle quiet{11, false, colours.quiet};
  if (view_.busy) {
    const QRectF rail(box.left(), box.bottom() - 6, box.width(), 4);
    painter.fillRect(rail, colours.hairline);
    painter.fillRect({rail.topLeft(), QSizeF(rail.width() * view_.progress, rail.height())},
                     colours.action);
    drawText(painter, box.adjusted(0, 0, 0, -8), tr("measuring…"), quiet);
  } else if (view_.phases.empty()) {
    drawText(painter, box, tr("no run yet"), quiet);
  } else if (view_.broken) {
    drawText(painter, box, tr("not readable"), {11, true, colours.evidence});
  } else if (view_.verdict) {
    paintStamp(painter, box, *view_.verdict, verdictName(*view_.verdict), colours);
  } else {
    drawText(painter, box, tr("no verdict yet"), quiet);
  }
}

void CornerPlace::paintPromise(QPainter& painter) const {
  const TextStyle style{11, true, paletteFor(palette()).action};
  const QStringList lines = wrapped(promise_, width() - 2 * padding, style);
  const double line = lineHeight(style);
  double y = 0.5 * (height() - line * static_cast<double>(lines.size()));
  for (const QString& text : lines) {
    drawText(
        painter, QRectF(padding, y, width() - 2 * padding, line), text, style, Qt::AlignCenter);
    y += line;
  }
}

void CornerPlace::setPromise(const QString& text) {
  promise_ = text;
  update();
}

void CornerPlace::dragEnterEvent(QDragEnterEvent* event) {
  const QStringList files = droppedFiles(event->mimeData());
  if (files.isEmpty()) return;
  event->acceptProposedAction();
  setPromise(dropPromise(files, view_.name));
}

void CornerPlace::dragLeaveEvent(QDragLeaveEvent*) { setPromise({}); }

void CornerPlace::dropEvent(QDropEvent* event) {
  setPromise({});
  const QStringList files = droppedFiles(event->mimeData());
  if (files.isEmpty()) return;
  event->acceptProposedAction();
  emit filesDropped(files);
}

}  // namespace dampwright
