// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/clock.h"

#include <algorithm>
#include <cmath>
#include <utility>

#include "core/intake/column_shape.h"

namespace dampwright {
namespace {

constexpr double gapSteps = 3;
constexpr double evenWithin = 0.05;

struct Count {
  std::int64_t count = 0, first = 0;

  void add(std::size_t row) {
    if (count++ == 0) first = static_cast<std::int64_t>(row);
  }
};

class ClockMaker {
 public:
  explicit ClockMaker(std::vector<double> stamps) : time_(std::move(stamps)) {}

  Clock make() {
    dropRowsWithoutStamp();
    mendFalls();
    spreadRepeats();
    lookForGaps();
    clock_.time = std::move(time_);
    return std::move(clock_);
  }

 private:
  std::size_t rowOf(std::size_t i) const { return clock_.kept.empty() ? i : clock_.kept[i]; }

  void put(const Count& count, Remark remark) {
    if (count.count == 0) return;
    remark.count = count.count;
    remark.firstRow = count.first;
    clock_.remarks.push_back(std::move(remark));
  }

  void dropRowsWithoutStamp() {
    Count dropped;
    for (std::size_t i = 0; i < time_.size(); ++i) {
      if (!std::isfinite(time_[i])) dropped.add(i);
    }
    if (dropped.count == 0) return;
    for (std::size_t i = 0; i < time_.size(); ++i) {
      if (std::isfinite(time_[i])) clock_.kept.push_back(i);
    }
    std::erase_if(time_, [](double stamp) { return !std::isfinite(stamp); });
    put(dropped, Remark{"rows-without-time", Severity::Warning, {}});
  }

  void mendFalls() {
    const double step = medianStep(time_);
    Count bad, restarts;
    double shift = 0;
    for (std::size_t i = 1; i < time_.size(); ++i) {
      time_[i] += shift;
      if (time_[i] >= time_[i - 1]) continue;
      const bool before =
          i >= 2 && time_[i] > time_[i - 2] && time_[i] < time_[i - 2] + gapSteps * step;
      const bool here = i + 1 < time_.size() && time_[i + 1] + shift > time_[i - 1];
      if (before) {
        time_[i - 1] = (time_[i - 2] + time_[i]) / 2;
        bad.add(rowOf(i - 1));
      } else if (here) {
        time_[i] = (time_[i - 1] + time_[i + 1] + shift) / 2;
        bad.add(rowOf(i));
      } else {
        const double back = time_[i - 1] + step - time_[i];
        shift += back;
        time_[i] += back;
        restarts.add(rowOf(i));
      }
    }
    put(bad, Remark{"bad-stamps", Severity::Warning, {}});
    put(restarts, Remark{"clock-restarts", Severity::Note, {}});
  }

  // Rows of one stamp are spread up to the next one. The first stamp may have been under way, and
  // the last one not yet over: there the usual number of rows gives the step.
  void spreadRepeats() {
    const double step = medianStep(time_);
    const std::size_t usual = usualRepeats();
    Count repeated;
    for (std::size_t i = 0; i < time_.size();) {
      std::size_t next = i + 1;
      while (next < time_.size() && time_[next] == time_[i]) repeated.add(rowOf(next++));
      const double rise = next < time_.size() ? time_[next] - time_[i] : step;
      const std::size_t rows = next - i;
      const bool edge = (i == 0 || next == time_.size()) && rows < usual;
      const double share = edge ? step / static_cast<double>(usual)
                                : std::min(rise, step) / static_cast<double>(rows);
      const double start = edge && i == 0 && next < time_.size()
                               ? time_[next] - share * static_cast<double>(rows)
                               : time_[i];
      for (std::size_t k = i; k < next; ++k) time_[k] = start + share * static_cast<double>(k - i);
      i = next;
    }
    put(repeated, Remark{"repeated-stamps", Severity::Note, {}});
  }

  // Rows of one stamp, median of all but the first and the last stamp.
  std::size_t usualRepeats() const {
    std::vector<std::size_t> runs{0};
    for (std::size_t i = 0; i < time_.size(); ++i) {
      if (i > 0 && time_[i] != time_[i - 1]) runs.push_back(0);
      ++runs.back();
    }
    if (runs.size() < 3) return 1;
    const auto middle = runs.begin() + static_cast<std::ptrdiff_t>(runs.size() / 2);
    std::nth_element(runs.begin() + 1, middle, runs.end() - 1);
    return *middle;
  }

  void lookForGaps() {
    const double step = medianStep(time_);
    if (!(step > 0)) return;
    Count gaps;
    double longest = 0, squares = 0;
    std::size_t even = 0;
    for (std::size_t i = 1; i < time_.size(); ++i) {
      const double here = time_[i] - time_[i - 1];
      if (here > gapSteps * step) {
        gaps.add(rowOf(i));
        longest = std::max(longest, here);
      } else {
        squares += (here / step - 1) * (here / step - 1);
        ++even;
      }
    }
    put(gaps, Remark{"gap", Severity::Warning, {{"longest", longest, Quantity::Time}}});
    const double jitter = even > 0 ? std::sqrt(squares / static_cast<double>(even)) : 0;
    if (jitter <= evenWithin) return;
    clock_.remarks.push_back(
        Remark{"uneven-clock", Severity::Warning, {{"jitter", 100 * jitter, Quantity::Percent}}});
  }

  std::vector<double> time_;
  Clock clock_;
};

}  // namespace

Clock makeClock(std::vector<double> stamps) { return ClockMaker(std::move(stamps)).make(); }

std::vector<double> evenClock(std::size_t rows, double rate) {
  std::vector<double> time(rows);
  for (std::size_t i = 0; i < rows; ++i) time[i] = static_cast<double>(i) / rate;
  return time;
}

}  // namespace dampwright
