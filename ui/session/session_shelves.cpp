// SPDX-License-Identifier: GPL-3.0-or-later
// Limit sheets.
#include <algorithm>
#include <utility>

#include "ui/session/session.h"

namespace dampwright {

namespace {

// "C" becomes "C2", "C2" becomes "C3", none becomes "2".
std::string nextRevision(const std::string& revision) {
  std::size_t digits = revision.size();
  while (digits > 0 && revision[digits - 1] >= '0' && revision[digits - 1] <= '9') --digits;
  const QString number = QString::fromStdString(revision.substr(digits));
  const int next = number.isEmpty() ? 2 : number.toInt() + 1;
  return revision.substr(0, digits) + std::to_string(next);
}

}  // namespace

bool Session::limitsTaken(const Limits& limits) const {
  return std::ranges::any_of(knownLimits_, [&](const Limits& known) {
    return known.title == limits.title && known.revision == limits.revision && known != limits;
  });
}

void Session::keepLimits(const Limits& limits) {
  wasBusy_ = true;
  keeper_.write({[limits](Book& book) { return book.addLimits(limits); }, {}});
  const auto same = std::ranges::find(knownLimits_, limits.title, &Limits::title);
  if (same == knownLimits_.end()) {
    knownLimits_.push_back(limits);
    std::ranges::sort(knownLimits_, {}, &Limits::title);
  } else {
    *same = limits;
  }
  emit limitsKnownChanged();
}

void Session::chooseLimits(const Limits& given) {
  if (!hasJob()) return;
  Limits limits = given;
  while (limitsTaken(limits)) limits.revision = nextRevision(limits.revision);
  if (std::ranges::find(knownLimits_, limits) == knownLimits_.end()) keepLimits(limits);
  Job after = *job_;
  after.limits = limits;
  edit(tr("limits %1").arg(QString::fromStdString(limits.title)), std::move(after));
}

}  // namespace dampwright
