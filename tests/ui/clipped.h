// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAbstractButton>
#include <QLabel>
#include <QStringList>
#include <QToolButton>
#include <QWidget>

namespace dampwright::made {

/// Texts of visible labels and buttons below `root` that do not fit their widget. A label that
/// elides by itself (…) shows all of its text in the tooltip and is not counted.
inline QStringList clippedTexts(const QWidget* root) {
  QStringList clipped;
  for (const QWidget* widget : root->findChildren<QWidget*>()) {
    if (!widget->isVisible()) continue;
    QString text;
    if (const auto* label = qobject_cast<const QLabel*>(widget)) text = label->text();
    if (const auto* button = qobject_cast<const QAbstractButton*>(widget)) text = button->text();
    if (text.isEmpty() || text.contains(QChar(0x2026))) continue;
    const auto* label = qobject_cast<const QLabel*>(widget);
    const bool wraps = label != nullptr && label->wordWrap();
    const QSize needed = widget->sizeHint();
    const int height = wraps ? label->heightForWidth(label->width()) : needed.height();
    const bool wide = !wraps && widget->sizePolicy().horizontalPolicy() != QSizePolicy::Ignored &&
                      needed.width() > widget->width();
    if (wide || height > widget->height() + 1) clipped << text;
  }
  return clipped;
}

}  // namespace dampwright::made
