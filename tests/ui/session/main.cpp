// SPDX-License-Identifier: GPL-3.0-or-later
#include <gmock/gmock.h>

#include <QCoreApplication>
#include <QDir>
#include <QStandardPaths>
#include <QTest>
#include <cstdio>
#include <cstring>

#include "made_session.h"

namespace {

// The part of a program that is killed: drops run after run, and prints how many are in the book.
int dropInto(const QString& book) {
  dampwright::Session session(book, dampwright::sampleRuns());
  session.startJob({});
  int dropped = 0;
  for (const QString& name : QDir(dampwright::sampleRuns()).entryList({"*.csv"})) {
    session.dropFiles({dampwright::sample(name)}, "front left");
    if (!QTest::qWaitFor([&] { return !session.busy(); }, dampwright::patience)) return 1;
    std::printf("%d\n", ++dropped);
    std::fflush(stdout);
  }
  return 0;
}

}  // namespace

int main(int count, char** arguments) {
  QStandardPaths::setTestModeEnabled(true);
  QCoreApplication application(count, arguments);
  if (count == 3 && std::strcmp(arguments[1], "--drop-into") == 0) {
    return dropInto(QString::fromUtf8(arguments[2]));
  }
  testing::InitGoogleMock(&count, arguments);
  return RUN_ALL_TESTS();
}
