// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/group_runs.h"

#include <algorithm>
#include <cmath>
#include <optional>

#include "core/job/read_file_name.h"
#include "core/job/read_metadata.h"
#include "core/job/suggest_corner.h"

namespace dampwright {
namespace {

constexpr double sameSpeed = 0.02;  // [1] speeds nearer than this are one

struct Facts {
  std::string serial, corner, stem;
  std::vector<SettingValue> setting;
  std::vector<double> speeds;  ///< m/s; of the name where the run was not measured
};

Facts factsOf(const RunIdentity& run, const std::vector<std::string>& corners) {
  Facts facts;
  facts.serial = serialOf(run.metadata);
  // A vehicle of one place tells nothing apart.
  if (corners.size() > 1)
    facts.corner = suggestCorner(run.file, run.metadata, corners).value_or("");
  facts.stem = stemOfName(run.file);
  facts.setting = settingOfRun(run);
  facts.speeds = run.speeds;
  const auto named = speedInName(run.file);
  if (facts.speeds.empty() && named) facts.speeds.push_back(*named);
  return facts;
}

bool differ(const std::string& one, const std::string& other) {
  return !one.empty() && !other.empty() && one != other;
}

bool agree(const std::string& one, const std::string& other) {
  return !one.empty() && one == other;
}

// Every speed of the one is a speed of the other.
bool repeats(const std::vector<double>& some, const std::vector<double>& others) {
  if (some.empty() || others.empty()) return some.empty() && others.empty();
  return std::ranges::all_of(some, [&](double speed) {
    return std::ranges::any_of(others, [&](double other) {
      return std::abs(speed - other) <= sameSpeed * std::max(std::abs(speed), std::abs(other));
    });
  });
}

bool keptApart(const Facts& one, const Facts& other) {
  return one.setting != other.setting || differ(one.serial, other.serial) ||
         differ(one.corner, other.corner);
}

bool putTogether(const Facts& one, const Facts& other) {
  if (agree(one.serial, other.serial) || agree(one.corner, other.corner)) return true;
  return agree(one.stem, other.stem) && !repeats(one.speeds, other.speeds);
}

Remark reason(std::string code, Values values) {
  return {std::move(code), Severity::Note, std::move(values)};
}

std::string settingText(const std::vector<SettingValue>& setting) {
  std::string text;
  for (const SettingValue& one : setting) {
    text += (text.empty() ? "" : ", ") + one.adjuster + " " +
            std::to_string(static_cast<long>(std::lround(one.value)));
  }
  return text;
}

std::vector<Remark> reasonsOf(const RunGroup& group, const std::vector<Facts>& facts) {
  std::vector<Remark> why;
  if (!group.serial.empty()) why.push_back(reason("runs-by-serial", {{"serial", group.serial}}));
  if (!group.corner.empty()) why.push_back(reason("runs-by-corner", {{"corner", group.corner}}));
  if (!group.setting.empty()) {
    why.push_back(reason("runs-by-setting", {{"setting", settingText(group.setting)}}));
  }
  if (group.runs.size() < 2) return why;
  const std::string& stem = facts[group.runs.front()].stem;
  if (group.serial.empty() && group.corner.empty()) {
    why.push_back(reason("runs-by-name", {{"name", stem}}));
  }
  double low = 0, high = 0;
  for (const std::size_t run : group.runs) {
    for (const double speed : facts[run].speeds) {
      low = low == 0 ? speed : std::min(low, speed);
      high = std::max(high, speed);
    }
  }
  if (high > low) {
    why.push_back(reason("runs-by-speeds",
                         {{"from", low, Quantity::Velocity}, {"to", high, Quantity::Velocity}}));
  }
  return why;
}

void join(RunGroup& group, std::size_t run, const Facts& facts) {
  group.runs.push_back(run);
  if (group.serial.empty()) group.serial = facts.serial;
  if (group.corner.empty()) group.corner = facts.corner;
  group.setting = facts.setting;
}

// The first group that nothing keeps the run out of, and one of whose runs it goes with.
RunGroup* groupFor(std::vector<RunGroup>& groups,
                   const std::vector<Facts>& facts,
                   std::size_t run) {
  for (RunGroup& group : groups) {
    const auto apart = [&](std::size_t other) { return keptApart(facts[run], facts[other]); };
    const auto together = [&](std::size_t other) { return putTogether(facts[run], facts[other]); };
    const auto again = [&](std::size_t other) {
      return !agree(facts[run].serial, facts[other].serial) &&
             !agree(facts[run].corner, facts[other].corner) &&
             repeats(facts[run].speeds, facts[other].speeds);
    };
    if (std::ranges::any_of(group.runs, apart) || std::ranges::any_of(group.runs, again)) continue;
    if (std::ranges::any_of(group.runs, together)) return &group;
  }
  return nullptr;
}

}  // namespace

std::vector<SettingValue> settingOfRun(const RunIdentity& run) {
  std::vector<SettingValue> setting = settingOf(run.metadata);
  return setting.empty() ? settingInName(run.file) : setting;
}

std::vector<RunGroup> groupRuns(std::span<const RunIdentity> runs,
                                const std::vector<std::string>& corners) {
  std::vector<Facts> facts;
  for (const RunIdentity& run : runs) facts.push_back(factsOf(run, corners));
  std::vector<RunGroup> groups;
  for (std::size_t run = 0; run < runs.size(); ++run) {
    RunGroup* group = groupFor(groups, facts, run);
    join(group != nullptr ? *group : groups.emplace_back(), run, facts[run]);
  }
  const auto order = [&](std::size_t run) {
    return std::pair(facts[run].speeds.empty() ? 0.0 : facts[run].speeds.front(), runs[run].file);
  };
  for (RunGroup& group : groups) {
    group.why = reasonsOf(group, facts);
    std::ranges::sort(group.runs, {}, order);
  }
  return groups;
}

}  // namespace dampwright
