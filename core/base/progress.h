// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <functional>
#include <stop_token>

namespace dampwright {

/// Handed to long work: it asks `cancelled()` at least every 50 ms and may report its share done.
/// Work that was cancelled returns Error{"stopped"}; nobody shows it.
struct Progress {
  std::stop_token token;
  std::function<void(double)> report;  ///< share done, 0 to 1; may be empty

  bool cancelled() const { return token.stop_requested(); }
  void done(double share) const {
    if (report) report(share);
  }
};

}  // namespace dampwright
