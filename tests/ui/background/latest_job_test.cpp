// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/background/latest_job.h"

#include <gmock/gmock.h>

#include <QTest>
#include <QThread>
#include <atomic>
#include <memory>
#include <vector>

namespace dampwright {
namespace {

using testing::ElementsAre;

constexpr int patience = 5000;  // ms, only ever waited out by a failure

TEST(LatestJob, TheResultComesHomeToTheThreadThatAsked) {
  LatestJob job;
  QThread* worker = nullptr;
  QThread* home = nullptr;
  job.start([](const Progress&) { return QThread::currentThread(); },
            [&](QThread* there) {
              worker = there;
              home = QThread::currentThread();
            });
  ASSERT_TRUE(QTest::qWaitFor([&] { return home != nullptr; }, patience));
  EXPECT_EQ(home, QThread::currentThread());
  EXPECT_NE(worker, home);
}

TEST(LatestJob, ANewerStartStopsTheOlderAndOnlyTheNewerIsDelivered) {
  LatestJob job;
  auto stopped = std::make_shared<std::atomic<bool>>(false);
  std::vector<int> delivered;
  const auto deliver = [&](int value) { delivered.push_back(value); };
  job.start(
      [stopped](const Progress& progress) {
        while (!progress.cancelled()) QThread::msleep(1);
        *stopped = true;
        return 1;
      },
      deliver);
  job.start([](const Progress&) { return 2; }, deliver);
  ASSERT_TRUE(QTest::qWaitFor([&] { return *stopped && !delivered.empty(); }, patience));
  QTest::qWait(20);
  EXPECT_THAT(delivered, ElementsAre(2));
}

TEST(LatestJob, AResultThatWasDoneAlreadyIsNotDeliveredAfterStop) {
  LatestJob job;
  bool delivered = false;
  auto done = std::make_shared<std::atomic<bool>>(false);
  job.start(
      [done](const Progress&) {
        *done = true;
        return 1;
      },
      [&](int) { delivered = true; });
  while (!*done) QThread::msleep(1);
  job.stop();
  QTest::qWait(30);
  EXPECT_FALSE(delivered);
}

TEST(LatestJob, AnOwnerDeletedMidwayStopsTheWorkAndHearsNothing) {
  auto owner = std::make_unique<LatestJob>();
  auto started = std::make_shared<std::atomic<bool>>(false);
  auto stopped = std::make_shared<std::atomic<bool>>(false);
  bool heard = false;
  owner->start(
      [started, stopped](const Progress& progress) {
        *started = true;
        for (int i = 0; !progress.cancelled(); ++i) progress.done((i % 1000) / 1000.0);
        progress.done(1);
        *stopped = true;
        return std::vector<double>(1000);
      },
      [&](const std::vector<double>&) { heard = true; },
      [&](double) {});
  while (!*started) QThread::msleep(1);
  owner.reset();
  ASSERT_TRUE(QTest::qWaitFor([&] { return stopped->load(); }, patience));
  QTest::qWait(20);
  EXPECT_FALSE(heard);
}

TEST(LatestJob, ProgressIsToldAtHomeAndNeverFalls) {
  LatestJob job;
  std::vector<double> shares;
  bool done = false;
  job.start(
      [](const Progress& progress) {
        for (int i = 0; i <= 10; ++i) {
          progress.done(i / 10.0);
          QThread::msleep(10);
        }
        return 0;
      },
      [&](int) { done = true; },
      [&](double share) {
        EXPECT_EQ(QThread::currentThread(), job.thread());
        shares.push_back(share);
      });
  ASSERT_TRUE(QTest::qWaitFor([&] { return done; }, patience));
  ASSERT_FALSE(shares.empty());
  EXPECT_TRUE(std::ranges::is_sorted(shares));
  EXPECT_LE(shares.back(), 1.0);
}

TEST(LatestJob, AHundredStartsInARowDeliverTheLast) {
  LatestJob job;
  std::vector<int> delivered;
  for (int i = 0; i < 100; ++i) {
    job.start([i](const Progress&) { return i; }, [&](int value) { delivered.push_back(value); });
  }
  ASSERT_TRUE(QTest::qWaitFor([&] { return !delivered.empty(); }, patience));
  QTest::qWait(20);
  EXPECT_THAT(delivered, ElementsAre(99));
}

}  // namespace
}  // namespace dampwright
