// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAbstractButton>
#include <QLabel>
#include <QStringList>
#include <QToolButton>
#include <QWidget>

#include "ui/look/elided.h"

namespace dampwright::made {

/// True for a text that is left out in part by design: all of it is in the tooltip then.
inline bool elidedByDesign(const QWidget* widget) {
  const auto* label = dynamic_cast<const ElidedLabel*>(widget);
  return label != nullptr &&
         (label->text() == label->whole() || label->toolTip() == label->whole());
}

/// Texts of visible labels and buttons below `root` that do not fit their widget.
inline QStringList clippedTexts(const QWidget* root) {
  QStringList clipped;
  for (const QWidget* widget : root->findChildren<QWidget*>()) {
    if (!widget->isVisible()) continue;
    QString text;
    if (const auto* label = qobject_cast<const QLabel*>(widget)) text = label->text();
    if (const auto* button = qobject_cast<const QAbstractButton*>(widget)) text = button->text();
    if (text.isEmpty() || elidedByDesign(widget)) continue;
    const auto* label = qobject_cast<const QLabel*>(widget);
    const bool wraps = label != nullptr && label->wordWrap();
    const QSize needed = widget->sizeHint();
    const int height = wraps ? label->heightForWidth(label->width()) : needed.height();
    const bool wide = !wraps && needed.width() > widget->width();
    if (wide || height > widget->height() + 1) clipped << text;
  }
  return clipped;
}

}  // namespace dampwright::made
