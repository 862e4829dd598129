// SPDX-License-Identifier: GPL-3.0-or-later
// Tests of what works without a window: an event loop is all they need.
#include <gmock/gmock.h>

#include <QCoreApplication>
#include <QStandardPaths>

int main(int count, char** arguments) {
  QStandardPaths::setTestModeEnabled(true);
  QCoreApplication application(count, arguments);
  testing::InitGoogleMock(&count, arguments);
  return RUN_ALL_TESTS();
}
