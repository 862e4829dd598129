// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/condition.h"

#include <algorithm>
#include <charconv>
#include <cmath>
#include <string>
#include <string_view>

#include "core/base/units.h"
#include "core/condition/raw_channels.h"
#include "core/signal/local_polynomial.h"
#include "core/signal/robust.h"
#include "core/signal/turning_points.h"

namespace dampwright {
namespace {

constexpr std::size_t fewestRows = 16;
constexpr double narrowestRate = 2.52;  // times the cutoff; 4.2 times a class
constexpr double mostSamples = 20e6;  // that gaps may blow a recording up to, with 4 times its rows

// Carries the bits on to `before` samples earlier and `after` samples later.
std::vector<char> widened(const std::vector<char>& doubt, int bits, int before, int after) {
  std::vector<char> out = doubt;
  const auto size = static_cast<std::ptrdiff_t>(doubt.size());
  for (std::ptrdiff_t i = 0; i < size; ++i) {
    const int found = doubt[static_cast<std::size_t>(i)] & bits;
    if (found == 0) continue;
    const std::ptrdiff_t to = std::min<std::ptrdiff_t>(size - 1, i + after);
    for (std::ptrdiff_t k = std::max<std::ptrdiff_t>(0, i - before); k <= to; ++k)
      out[static_cast<std::size_t>(k)] =
          static_cast<char>(out[static_cast<std::size_t>(k)] | found);
  }
  return out;
}

constexpr int forceBits = ForceClipped | ForceMissing;

// Brings the force back by its delay; what would have to come from beyond the ends is missing.
Motion withoutDelay(Motion motion, double delay) {
  if (delay == 0) return motion;
  const double shift = delay * motion.rate;
  motion.force = shifted(motion.force, shift);
  std::vector<char> moved(motion.size());
  const auto size = static_cast<std::ptrdiff_t>(motion.size());
  const auto whole = static_cast<std::ptrdiff_t>(std::lround(shift));
  for (std::ptrdiff_t i = 0; i < size; ++i) {
    const std::ptrdiff_t from = i + whole;
    const bool inside = from >= 0 && from < size;
    const int force =
        inside ? motion.doubtful[static_cast<std::size_t>(from)] & forceBits : ForceMissing;
    moved[static_cast<std::size_t>(i)] =
        static_cast<char>((motion.doubtful[static_cast<std::size_t>(i)] & PlaceMissing) | force);
  }
  motion.doubtful = widened(moved, forceBits, 4, 4);
  return motion;
}

// Turns per sample [rad] of the fastest part: the tenth percentile of the half strokes' durations.
double fastestAngle(const std::vector<double>& displacement) {
  std::vector<double> durations;
  const auto turns = turningPoints(displacement, {safeHysteresis(displacement), 0.1});
  for (std::size_t i = 1; i < turns.size(); ++i)
    durations.push_back(turns[i].place - turns[i - 1].place);
  if (durations.empty()) return 2 * pi / static_cast<double>(displacement.size());
  const auto tenth = durations.begin() + static_cast<std::ptrdiff_t>(durations.size() / 10);
  std::nth_element(durations.begin(), tenth, durations.end());
  return pi / std::max(*tenth, 2.0);
}

LocalPolynomial derivativeOf(const Motion& motion) {
  LocalPolynomial fit = derivativeFor(fastestAngle(motion.displacement));
  const int most = (static_cast<int>(motion.size()) - 1) / 2;
  fit.halfWidth = std::min(fit.halfWidth, most);
  return fit;
}

Motion withoutInertia(Motion motion, double mass, LocalPolynomial fit) {
  if (mass == 0) return motion;
  fit.derivative = 2;
  const std::vector<double> acceleration = applyLocal(fit, motion.displacement, motion.rate);
  for (std::size_t i = 0; i < motion.size(); ++i) motion.force[i] -= mass * acceleration[i];
  motion.doubtful = widened(motion.doubtful, PlaceMissing, fit.halfWidth, fit.halfWidth);
  return motion;
}

Motion filtered(Motion motion, const std::optional<LowPass>& filter) {
  if (!filter || motion.rate <= narrowestRate * cutoffOf(*filter)) return motion;
  motion.displacement = lowPass(*filter, motion.rate, motion.displacement);
  motion.force = lowPass(*filter, motion.rate, motion.force);
  const int reach = static_cast<int>(std::ceil(motion.rate / cutoffOf(*filter) / 2));
  motion.doubtful = widened(motion.doubtful, forceBits | PlaceMissing, reach, reach);
  return motion;
}

// The file's velocity against ours, by regression either way: noise on one of them leaves the
// other's slope right. Agreed where 1 ± 3 % lies between the two slopes.
std::optional<Remark> velocityRemark(const Motion& motion, const std::vector<double>& recorded) {
  if (recorded.empty()) return std::nullopt;
  double own = 0, other = 0, both = 0;
  for (std::size_t i = 0; i < motion.size(); ++i) {
    own += motion.velocity[i] * motion.velocity[i];
    other += recorded[i] * recorded[i];
    both += motion.velocity[i] * recorded[i];
  }
  if (own == 0 || other == 0) return std::nullopt;
  const double low = both / own, high = other / both, alike = both / std::sqrt(own * other);
  if (alike > 0.5 && low < 1.03 && high > 0.97) return std::nullopt;
  Remark remark{"velocity-disagrees", Severity::Warning, {}, 0, 0};
  const double ratio = std::copysign(std::sqrt(other / own), both);
  remark.values = {{"percent", 100 * ratio, Quantity::Percent}};
  return remark;
}

Error tooShort(const Trace& trace) {
  return {"trace-too-short",
          {{"rows", static_cast<double>(trace.time.size()), Quantity::Count},
           {"needed", static_cast<double>(fewestRows), Quantity::Count}},
          {trace.source.file.name, 0, 0}};
}

bool longEnough(const Trace& trace) {
  const std::size_t rows = trace.time.size();
  if (rows < fewestRows || !(trace.time.back() > trace.time.front())) return false;
  if (trace.displacement.size() != rows || trace.force.size() != rows) return false;
  const auto sound = [](const std::vector<double>& values) {
    return values.size() -
           static_cast<std::size_t>(
               std::count_if(values.begin(), values.end(), [](double v) { return std::isnan(v); }));
  };
  return sound(trace.displacement) >= fewestRows && sound(trace.force) >= fewestRows;
}

std::vector<Remark> withoutRepeated(std::vector<Remark> remarks,
                                    const std::vector<Remark>& already) {
  std::erase_if(remarks, [&](const Remark& remark) {
    return std::any_of(already.begin(), already.end(), [&](const Remark& known) {
      return known.code == remark.code;
    });
  });
  return remarks;
}

Motion motionOf(RawChannels raw, const EvenClock& clock) {
  Motion motion;
  motion.rate = clock.rate;
  motion.startTime = clock.start;
  motion.displacement = std::move(raw.displacement);
  motion.force = std::move(raw.force);
  motion.temperature = std::move(raw.temperature);
  motion.doubtful = std::move(raw.doubt);
  motion.remarks = std::move(raw.remarks);
  return motion;
}

// The number behind the words, and what stands behind the number.
struct Named {
  double number = 0;
  std::string_view rest;
};

std::optional<Named> numberBehind(std::string_view name, std::string_view words) {
  if (!name.starts_with(words)) return std::nullopt;
  Named named;
  const char* end = name.data() + name.size();
  const auto read = std::from_chars(name.data() + words.size(), end, named.number);
  if (read.ec != std::errc() || !(named.number > 0) || !std::isfinite(named.number))
    return std::nullopt;
  named.rest = {read.ptr, static_cast<std::size_t>(end - read.ptr)};
  return named;
}

std::optional<LowPass> filterOf(std::string_view name) {
  if (const auto butterworth = numberBehind(name, "Butterworth "))
    return Butterworth{butterworth->number};
  const auto cfc = numberBehind(name, "CFC ");
  if (!cfc) return std::nullopt;
  return CfcClass{cfc->number, cfc->rest == " ISO" ? CfcRule::Iso6487 : CfcRule::SaeJ211};
}

}  // namespace

ConditionOptions conditionOptions(const RigProfile& rig) {
  ConditionOptions options;
  options.forceDelay = rig.forceDelay;
  options.movingMass = rig.movingMass;
  if (rig.lowPass) options.lowPass = filterOf(*rig.lowPass);
  return options;
}

Result<Motion> condition(const Trace& trace,
                         const ConditionOptions& options,
                         const Progress& progress) {
  if (!longEnough(trace)) return tooShort(trace);
  const ClockFinding clock = lookAtClock(trace.time);
  const auto rows = static_cast<double>(trace.time.size());
  if (static_cast<double>(clock.clock.count) > 4 * rows + mostSamples)
    return Error{"gap-too-long",
                 {{"duration", trace.time.back() - trace.time.front(), Quantity::Time}},
                 {trace.source.file.name, 0, 0}};
  const auto stopped = [&] { return progress.cancelled(); };
  if (stopped()) return Error{"stopped", {}, {}};
  RawChannels raw = onEvenClock(lookThrough(trace, options.spikeThreshold, progress), trace, clock);
  const std::vector<double> recordedVelocity = raw.velocity;
  Motion motion = withoutDelay(motionOf(std::move(raw), clock.clock), options.forceDelay);
  if (stopped()) return Error{"stopped", {}, {}};
  const LocalPolynomial derivative = derivativeOf(motion);
  motion = withoutInertia(std::move(motion), options.movingMass, derivative);
  if (stopped()) return Error{"stopped", {}, {}};
  motion = filtered(std::move(motion), options.lowPass);
  if (stopped()) return Error{"stopped", {}, {}};
  motion.velocity = applyLocal(derivative, motion.displacement, motion.rate);
  if (auto remark = velocityRemark(motion, recordedVelocity)) motion.remarks.push_back(*remark);
  motion.remarks = withoutRepeated(std::move(motion.remarks), trace.remarks);
  return motion;
}

}  // namespace dampwright
