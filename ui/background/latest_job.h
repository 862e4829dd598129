// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/background/run_there.h"

namespace dampwright {

/// Work of which only the newest counts: a snapshot is taken on the GUI thread, a pure function
/// works on it elsewhere, and its result comes home only if nobody asked for a newer one and the
/// owner still lives.
class LatestJob : public QObject {
 public:
  using QObject::QObject;
  ~LatestJob() override { stop(); }

  /// Runs `compute(progress)` off the GUI thread; `deliver(outcome)` on it, unless a newer start()
  /// or stop() came first.
  template <class Compute, class Deliver>
  void start(Compute compute, Deliver deliver, Progressed progressed = {}) {
    stop();
    stop_ = std::make_shared<std::stop_source>();
    runThere(*QThreadPool::globalInstance(),
             *this,
             stop_,
             std::move(compute),
             std::move(deliver),
             std::move(progressed));
  }

  /// What runs is asked to end, and its result will not be delivered.
  void stop() { stop_->request_stop(); }

 private:
  Stop stop_ = std::make_shared<std::stop_source>();
};

}  // namespace dampwright
