// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/theme.h"

#include <QApplication>
#include <QSettings>
#include <QStyle>

#include "ui/look/palette.h"
#include "ui/look/style_sheet.h"
#include "ui/look/type.h"

namespace dampwright {

namespace {

const QString key = QStringLiteral("look/theme");

}  // namespace

void applyTheme(Theme theme) {
  const Palette& palette = theme == Theme::Dark ? darkPalette() : lightPalette();
  QApplication::setStyle(QStringLiteral("Fusion"));
  QApplication::setFont(screenFont(TextSize::Text));
  QApplication::setPalette(asQPalette(palette));
  qApp->setStyleSheet(styleSheet(palette));
}

Theme keptTheme() {
  return QSettings().value(key).toString() == QLatin1String("dark") ? Theme::Dark : Theme::Light;
}

void keepTheme(Theme theme) {
  QSettings().setValue(key,
                       theme == Theme::Dark ? QStringLiteral("dark") : QStringLiteral("light"));
}

}  // namespace dampwright
