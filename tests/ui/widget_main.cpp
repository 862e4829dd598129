// SPDX-License-Identifier: GPL-3.0-or-later
// Tests of widgets run without a screen and without touching anybody's settings.
#include <gmock/gmock.h>

#include <QApplication>
#include <QLocale>
#include <QSettings>
#include <QStandardPaths>
#include <QTemporaryDir>

#include "ui/look/palette.h"
#include "ui/look/style_sheet.h"
#include "ui/look/type.h"

int main(int count, char** arguments) {
  qputenv("QT_QPA_PLATFORM", "offscreen");
  QStandardPaths::setTestModeEnabled(true);
  const QTemporaryDir settings;  // of this process alone: tests run side by side
  QSettings::setPath(QSettings::NativeFormat, QSettings::UserScope, settings.path());
  QLocale::setDefault(QLocale::c());
  QApplication application(count, arguments);
  QApplication::setStyle(QStringLiteral("Fusion"));
  QApplication::setFont(dampwright::screenFont(dampwright::TextSize::Text));
  QApplication::setPalette(dampwright::asQPalette(dampwright::lightPalette()));
  application.setStyleSheet(dampwright::styleSheet(dampwright::lightPalette()));
  testing::InitGoogleMock(&count, arguments);
  return RUN_ALL_TESTS();
}
