// SPDX-License-Identifier: GPL-3.0-or-later
#include <gmock/gmock.h>

#include <QCoreApplication>

#include "children.h"

int main(int argc, char** argv) {
  QCoreApplication application(argc, argv);  // Qt SQL finds its drivers through it
  if (const int status = dampwright::playPart(argc, argv); status >= 0) return status;
  testing::InitGoogleMock(&argc, argv);
  return RUN_ALL_TESTS();
}
