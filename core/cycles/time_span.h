// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// A stretch of a recording, kept as times so that it survives any change of method.
struct TimeSpan {
  double start = 0, end = 0;  ///< s, clock of the file
  bool operator==(const TimeSpan&) const = default;
};

}  // namespace dampwright
