// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/background/ordered_jobs.h"

#include <gmock/gmock.h>

#include <QTest>
#include <QThread>
#include <memory>
#include <set>
#include <vector>

namespace dampwright {
namespace {

constexpr int patience = 5000;  // ms, only ever waited out by a failure

TEST(OrderedJobs, EverythingIsDoneInOrderOnOneThread) {
  OrderedJobs jobs;
  std::vector<int> order;
  std::set<QThread*> threads;
  for (int i = 0; i < 50; ++i) {
    jobs.add([i](const Progress&) { return std::pair(i, QThread::currentThread()); },
             [&](std::pair<int, QThread*> done) {
               order.push_back(done.first);
               threads.insert(done.second);
             });
    if (i == 25) QTest::qWait(50);  // the thread must outlive idleness
  }
  ASSERT_TRUE(QTest::qWaitFor([&] { return order.size() == 50; }, patience));
  EXPECT_TRUE(std::ranges::is_sorted(order));
  EXPECT_EQ(threads.size(), 1u);
  EXPECT_FALSE(threads.contains(QThread::currentThread()));
}

TEST(OrderedJobs, TheDestructorWaitsForAllThatWasAdded) {
  auto done = std::make_shared<std::vector<int>>();  // touched by the one worker thread only
  {
    OrderedJobs jobs;
    for (int i = 0; i < 10; ++i) {
      jobs.add(
          [i, done](const Progress&) {
            QThread::msleep(2);
            done->push_back(i);
            return i;
          },
          [](int) { FAIL() << "nobody is at home any more"; });
    }
  }
  EXPECT_EQ(done->size(), 10u);
}

TEST(OrderedJobs, AfterStopOnlyWhatIsAddedLaterComesHome) {
  OrderedJobs jobs;
  std::vector<int> home;
  const auto deliver = [&](int value) { home.push_back(value); };
  jobs.add(
      [](const Progress& progress) {
        while (!progress.cancelled()) QThread::msleep(1);
        return 1;
      },
      deliver);
  jobs.stop();
  jobs.add([](const Progress&) { return 2; }, deliver);
  ASSERT_TRUE(QTest::qWaitFor([&] { return !home.empty(); }, patience));
  EXPECT_EQ(home, std::vector{2});
}

}  // namespace
}  // namespace dampwright
