// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/background/run_there.h"

namespace dampwright {

/// Work that must all be done, one after another, on one thread that stays the same (a database
/// connection belongs to its thread). The destructor waits until everything that was added is
/// done; what comes home after that is dropped.
class OrderedJobs : public QObject {
 public:
  explicit OrderedJobs(QObject* parent = nullptr) : QObject(parent) {
    pool_.setMaxThreadCount(1);
    pool_.setExpiryTimeout(-1);  // never: the same thread to the end
  }
  ~OrderedJobs() override { pool_.waitForDone(); }

  /// Runs `compute(progress)` after everything added before; `deliver(outcome)` on the owner's
  /// thread, unless stop() came first.
  template <class Compute, class Deliver>
  void add(Compute compute, Deliver deliver, Progressed progressed = {}) {
    runThere(pool_, *this, stop_, std::move(compute), std::move(deliver), std::move(progressed));
  }

  /// Everything added so far is asked to end, and will not be delivered; what is added later runs.
  void stop() {
    stop_->request_stop();
    stop_ = std::make_shared<std::stop_source>();
  }

 private:
  Stop stop_ = std::make_shared<std::stop_source>();
  QThreadPool pool_;
};

}  // namespace dampwright
