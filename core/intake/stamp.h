// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>

namespace dampwright {

/// How a column writes the time of day.
enum class StampKind {
  None,
  Clock,        ///< 12:00:01.250, also 12:00:01:250, 1:05 PM; without a date
  MinuteClock,  ///< 05:01.250: minutes and seconds, without a date
  YearFirst,    ///< 2031-03-04 12:00:01.250, 2031/3/4T12:00:01Z, 2031年3月4日 12時00分01秒
  DayFirst,     ///< 04.03.2031 12:00:01,250; 4-Mar-2031 12:00
  MonthFirst    ///< 3/4/2031 12:00:01.250 PM
};

struct StampForm {
  StampKind kind = StampKind::None;
  std::int64_t firstDay = 0;  ///< stamps with a date count from its midnight, days since 1970-01-01

  bool operator==(const StampForm&) const = default;
};

/// s since midnight of the form's first day; nothing where the cell is no stamp of this form. The
/// fraction has a point or a comma. Knows no locale.
std::optional<double> readStamp(std::string_view cell, StampForm form);

/// What the cells of a column give away about its stamps.
class StampVotes {
 public:
  void add(std::string_view cell);
  int stamps() const { return stamps_; }

  /// Of the date 3/4/2031 the number that changes more often is the day, a number over 12 surely;
  /// where the whole column holds one date it does not matter.
  StampForm form() const;

 private:
  int stamps_ = 0, dates_ = 0, yearFirst_ = 0, minutes_ = 0;
  int dayFirst_ = 0, monthFirst_ = 0;  ///< cells that prove it
  int firstChanges_ = 0, secondChanges_ = 0;
  int lastFirst_ = -1, lastSecond_ = -1;
  std::string firstDate_;  ///< the first cell that holds a date
};

/// "hh:mm:ss", "mm:ss", "date-time": as a remark calls it.
std::string_view stampName(StampKind kind);

}  // namespace dampwright
