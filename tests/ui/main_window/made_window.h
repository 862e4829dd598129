// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <gtest/gtest.h>

#include <QLabel>
#include <QPushButton>
#include <QSettings>
#include <QSignalSpy>
#include <QTemporaryDir>
#include <QTest>
#include <memory>

#include "tests/ui/drag.h"
#include "ui/main_window/main_window.h"
#include "ui/main_window/theme.h"

namespace dampwright::made {

inline const QString sampleRuns = QStringLiteral(DAMPWRIGHT_SOURCE_DIR "/sample_runs");
inline QString sample(const char* name) {
  return sampleRuns + QLatin1Char('/') + QString::fromLatin1(name);
}

/// The whole window on a job book of its own.
class WindowTest : public testing::Test {
 protected:
  void SetUp() override {
    QSettings().clear();
    applyTheme(Theme::Light);
    open();
  }
  void open() {
    window.reset();
    session.reset();
    session = std::make_unique<Session>(folder.filePath("book.sqlite"), sampleRuns);
    window = std::make_unique<MainWindow>(*session);
    QSignalSpy read(session.get(), &Session::bookRead);
    window->resize(1440, 900);
    window->show();
    ASSERT_TRUE(read.count() > 0 || read.wait(20'000));
    ASSERT_TRUE(QTest::qWaitForWindowExposed(window.get()));
  }
  void waitForWork() {
    // Work may hand over to other work for an instant.
    for (int quiet = 0, waited = 0; quiet < 5 && waited < 6000; ++waited) {
      QTest::qWait(20);
      quiet = session->busy() ? 0 : quiet + 1;
    }
    ASSERT_FALSE(session->busy());
  }
  void startCar() {
    Job draft;
    draft.customer = "Saltmarsh Motor Club";
    draft.vehicle = "rally hatchback";
    session->startJob(draft);
    waitForWork();
  }
  QString everythingSaid() const {
    QString said;
    for (const QLabel* label : window->findChildren<QLabel*>()) {
      if (label->isVisible()) said += label->text() + QLatin1Char('\n');
    }
    return said;
  }
  void shoot(const char* name) const {
    if (qEnvironmentVariableIsSet("DAMPWRIGHT_SHOTS"))
      window->grab().save(qEnvironmentVariable("DAMPWRIGHT_SHOTS") + QLatin1Char('/') +
                          QString::fromLatin1(name) + QStringLiteral(".png"));
  }

  QTemporaryDir folder;
  std::unique_ptr<Session> session;
  std::unique_ptr<MainWindow> window;
};

}  // namespace dampwright::made
