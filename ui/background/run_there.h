// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QFutureWatcher>
#include <QObject>
#include <QPromise>
#include <QThreadPool>
#include <QtConcurrent>
#include <functional>
#include <memory>
#include <stop_token>
#include <type_traits>
#include <utility>

#include "core/base/progress.h"

namespace dampwright {

/// Told of the share done, 0 to 1, on the owner's thread; Qt leaves out reports that come faster
/// than the screen.
using Progressed = std::function<void(double)>;

/// By which work is asked to end. Shared, as GCC 12 takes copied stop tokens for a use after free.
using Stop = std::shared_ptr<std::stop_source>;

/// Runs `compute(progress)` on a thread of `pool` and `deliver(outcome)` on the thread of `owner`,
/// unless `stop` was asked for or the owner is gone by then. `compute` owns values only: it may
/// outlive everybody.
template <class Compute, class Deliver>
void runThere(QThreadPool& pool,
              QObject& owner,
              const Stop& stop,
              Compute compute,
              Deliver deliver,
              Progressed progressed) {
  using Outcome = std::invoke_result_t<Compute&, const Progress&>;
  constexpr int steps = 1000;  // finer than any progress bar
  auto* watcher = new QFutureWatcher<Outcome>(&owner);
  QObject::connect(watcher,
                   &QFutureWatcherBase::finished,
                   &owner,
                   [watcher, stop, deliver = std::move(deliver)]() mutable {
                     watcher->deleteLater();
                     if (!stop->stop_requested()) deliver(watcher->future().takeResult());
                   });
  if (progressed) {
    QObject::connect(watcher,
                     &QFutureWatcherBase::progressValueChanged,
                     &owner,
                     [stop, progressed = std::move(progressed)](int step) {
                       if (!stop->stop_requested()) progressed(static_cast<double>(step) / steps);
                     });
  }
  watcher->setFuture(QtConcurrent::run(
      &pool, [stop, compute = std::move(compute)](QPromise<Outcome>& promise) mutable {
        promise.setProgressRange(0, steps);
        const auto report = [&promise](double share) {
          promise.setProgressValue(static_cast<int>(share * steps));
        };
        promise.addResult(compute(Progress{stop->get_token(), report}));
      }));
}

}  // namespace dampwright
