// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/stamp.h"

#include <algorithm>
#include <array>
#include <chrono>

#include "core/intake/letters.h"

namespace dampwright {
namespace {

constexpr std::size_t longestStamp = 64;

// What a cell says, before it is known which of its numbers is the day.
struct Parts {
  std::array<int, 3> date{};  ///< in the order written
  bool hasDate = false, yearFirst = false, named = false, points = false;
  int colons = 0;          ///< 1: two numbers only
  double seconds = 0;      ///< of the day; of a MinuteClock as if it were hours and minutes
  double minuteClock = 0;  ///< the first two numbers as minutes and seconds
};

constexpr std::string_view months = "janfebmaraprmayjunjulaugsepoctnovdec";

class Reader {
 public:
  explicit Reader(std::string_view text) : rest_(text) {}

  std::optional<Parts> read() {
    if (!rest_.empty() && !readDate() && parts_.hasDate) return std::nullopt;
    if (rest_.empty()) return parts_.hasDate ? std::optional(parts_) : std::nullopt;
    if (!readTime()) return std::nullopt;
    readHalfOfDay();
    readZone();
    return rest_.empty() ? std::optional(parts_) : std::nullopt;
  }

 private:
  bool take(std::string_view text) {
    if (!rest_.starts_with(text)) return false;
    rest_.remove_prefix(text.size());
    return true;
  }

  bool takeOneOf(std::string_view letters) {
    if (rest_.empty() || letters.find(rest_.front()) == letters.npos) return false;
    rest_.remove_prefix(1);
    return true;
  }

  void skipBlanks() {
    while (takeOneOf(" \t")) {
    }
  }

  // Up to `most` digits; -1 where there are none or more.
  int digits(std::size_t most) {
    std::size_t count = 0;
    int value = 0;
    while (count < rest_.size() && rest_[count] >= '0' && rest_[count] <= '9') {
      if (++count > most) return -1;
      value = 10 * value + (rest_[count - 1] - '0');
    }
    rest_.remove_prefix(count);
    return count == 0 ? -1 : value;
  }

  int monthName() {
    if (rest_.size() < 3) return -1;
    const std::size_t at = months.find(rest_.substr(0, 3));
    if (at == months.npos || at % 3 != 0) return -1;
    rest_.remove_prefix(3);
    return static_cast<int>(at / 3) + 1;
  }

  // Leaves the text as it was where no date stands there.
  bool readDate() {
    const std::string_view before = rest_;
    const std::size_t firstDigits = std::min(rest_.find_first_not_of("0123456789"), rest_.size());
    const int first = digits(4);
    if (first < 0 || rest_.empty()) return giveBack(before);
    const bool wide = take("年");
    const char sign = wide ? '\0' : rest_.front();
    if (!wide && !takeOneOf("-/.")) return giveBack(before);
    int second = digits(2);
    if (second < 0) {
      second = monthName();
      parts_.named = second > 0;
    }
    const bool parted = wide ? take("月") : (!rest_.empty() && rest_.front() == sign);
    if (second < 0 || !parted) return giveBack(before);
    if (!wide) rest_.remove_prefix(1);
    const bool oneDigit = std::min(rest_.find_first_not_of("0123456789"), rest_.size()) == 1;
    const int third = digits(4);
    if (third < 0 || (oneDigit && firstDigits != 4) || (wide && !take("日")))
      return giveBack(before);
    parts_.date = {first, second, third};
    parts_.yearFirst = firstDigits == 4;
    parts_.points = sign == '.';
    parts_.hasDate = true;
    if (!rest_.empty() && !takeOneOf("t ,_")) return false;
    skipBlanks();
    return true;
  }

  bool giveBack(std::string_view text) {
    rest_ = text;
    parts_.named = false;
    return false;
  }

  // h:m, h:m:s or h:m:s:ms with a fraction of the last number.
  bool readTime() {
    constexpr std::array<std::string_view, 3> wide{"時", "分", "秒"};
    std::array<double, 4> numbers{};
    std::size_t count = 0;
    const bool am = take("上午") || take("午前");
    half_ = am ? 1 : take("下午") || take("午後") ? 2 : 0;
    skipBlanks();
    while (count < 4) {
      const int number = digits(count == 0 ? 4 : count == 3 ? 6 : 2);
      if (number < 0 || (count > 0 && count < 3 && number > 60)) return false;
      numbers[count++] = number;
      if (count < 4 && take(":")) continue;
      if (count < 4 && (take(wide[count - 1]) || (count == 1 && take("时")))) {
        if (rest_.empty()) break;
        continue;
      }
      break;
    }
    if (count < 2) return false;
    parts_.colons = static_cast<int>(std::min<std::size_t>(count, 3)) - 1;
    if (count == 4) numbers[2] += numbers[3] / 1000;
    const double fraction = readFraction();
    numbers[count == 2 ? 1 : 2] += fraction;
    parts_.seconds = 3600 * numbers[0] + 60 * numbers[1] + numbers[2];
    parts_.minuteClock = 60 * numbers[0] + numbers[1];
    return true;
  }

  double readFraction() {
    if (!takeOneOf(".,")) return 0;
    double value = 0, unit = 0.1;
    while (!rest_.empty() && rest_.front() >= '0' && rest_.front() <= '9') {
      value += unit * (rest_.front() - '0');
      unit /= 10;
      rest_.remove_prefix(1);
    }
    return value;
  }

  void readHalfOfDay() {
    skipBlanks();
    if (take("am") || take("a.m.")) half_ = 1;
    if (take("pm") || take("p.m.")) half_ = 2;
    if (half_ == 0) return;
    parts_.colons = 2;  // "1:05 PM" is hours and minutes
    const double noon = 12 * 3600.0;
    if (parts_.seconds >= noon && parts_.seconds < noon + 3600) parts_.seconds -= noon;
    if (half_ == 2) parts_.seconds += noon;
  }

  void readZone() {
    skipBlanks();
    if (take("z") || take("utc") || take("gmt") || rest_.empty()) return;
    const double sign = rest_.front() == '-' ? 1 : -1;
    if (!takeOneOf("+-")) return;
    const int hours = digits(4);
    const int minutes = take(":") ? digits(2) : 0;
    if (hours < 0 || minutes < 0) return;
    const int whole = hours > 99 ? hours / 100 * 60 + hours % 100 : 60 * hours + minutes;
    parts_.seconds += sign * 60 * whole;
  }

  std::string_view rest_;
  Parts parts_;
  int half_ = 0;  ///< 1 before noon, 2 after
};

std::optional<Parts> partsOf(std::string_view cell) {
  if (cell.size() < 4 || cell.size() > longestStamp) return std::nullopt;
  const std::string text = lowered(cell);
  return Reader(text).read();
}

std::optional<std::int64_t> dayOf(const Parts& parts, StampKind kind) {
  auto [year, month, day] = parts.date;
  if (!parts.yearFirst) {
    year = parts.date[2] < 100 ? 2000 + parts.date[2] : parts.date[2];
    const bool dayFirst = kind == StampKind::DayFirst || parts.named;
    day = parts.date[dayFirst ? 0 : 1];
    month = parts.date[dayFirst ? 1 : 0];
  }
  const std::chrono::year_month_day date{std::chrono::year{year},
                                         std::chrono::month{static_cast<unsigned>(month)},
                                         std::chrono::day{static_cast<unsigned>(day)}};
  if (!date.ok()) return std::nullopt;
  return std::chrono::sys_days{date}.time_since_epoch().count();
}

}  // namespace

std::optional<double> readStamp(std::string_view cell, StampForm form) {
  const auto parts = partsOf(cell);
  if (!parts || form.kind == StampKind::None) return std::nullopt;
  const bool dated = form.kind >= StampKind::YearFirst;
  if (dated != parts->hasDate) return std::nullopt;
  if (form.kind == StampKind::MinuteClock && parts->colons == 1) return parts->minuteClock;
  if (!dated) return parts->seconds;
  const auto day = dayOf(*parts, form.kind);
  if (!day || parts->yearFirst != (form.kind == StampKind::YearFirst)) return std::nullopt;
  return 86400.0 * static_cast<double>(*day - form.firstDay) + parts->seconds;
}

void StampVotes::add(std::string_view cell) {
  const auto parts = partsOf(cell);
  if (!parts) return;
  ++stamps_;
  minutes_ += parts->colons == 1 ? 1 : 0;
  if (!parts->hasDate) return;
  if (dates_++ == 0) firstDate_ = std::string(cell);
  yearFirst_ += parts->yearFirst ? 1 : 0;
  if (parts->yearFirst) return;
  const auto [first, second, third] = parts->date;
  dayFirst_ += parts->points || parts->named || first > 12 ? 1 : 0;
  monthFirst_ += second > 12 ? 1 : 0;
  if (lastFirst_ >= 0) {
    firstChanges_ += first != lastFirst_ ? 1 : 0;
    secondChanges_ += second != lastSecond_ ? 1 : 0;
  }
  lastFirst_ = first;
  lastSecond_ = second;
}

StampForm StampVotes::form() const {
  StampForm form;
  if (stamps_ == 0) return form;
  if (dates_ == 0) {
    form.kind = 2 * minutes_ > stamps_ ? StampKind::MinuteClock : StampKind::Clock;
    return form;
  }
  form.kind = StampKind::YearFirst;
  if (2 * yearFirst_ <= dates_) {
    const bool dayFirst =
        dayFirst_ != monthFirst_ ? dayFirst_ > monthFirst_ : firstChanges_ >= secondChanges_;
    form.kind = dayFirst ? StampKind::DayFirst : StampKind::MonthFirst;
  }
  const auto parts = partsOf(firstDate_);
  form.firstDay = parts ? dayOf(*parts, form.kind).value_or(0) : 0;
  return form;
}

std::string_view stampName(StampKind kind) {
  if (kind == StampKind::Clock) return "hh:mm:ss";
  if (kind == StampKind::MinuteClock) return "mm:ss";
  if (kind == StampKind::YearFirst) return "year, month, day, hh:mm:ss";
  if (kind == StampKind::DayFirst) return "day, month, year, hh:mm:ss";
  return "month, day, year, hh:mm:ss";
}

}  // namespace dampwright
