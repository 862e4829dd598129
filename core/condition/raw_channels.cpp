// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/condition/raw_channels.h"

#include <algorithm>
#include <cmath>
#include <cstdint>
#include <string>

#include "core/condition/clipped.h"
#include "core/condition/motion.h"
#include "core/condition/spikes.h"

namespace dampwright {
namespace {

std::int64_t rowOf(const Trace& trace, std::size_t index) {
  const std::int64_t first = trace.source.firstDataRow > 0 ? trace.source.firstDataRow : 1;
  return first + static_cast<std::int64_t>(index);
}

std::vector<std::size_t> missingIn(const std::vector<double>& values) {
  std::vector<std::size_t> missing;
  for (std::size_t i = 0; i < values.size(); ++i)
    if (std::isnan(values[i])) missing.push_back(i);
  return missing;
}

// A straight line across each stretch of NaN, the nearest value at the ends; zeros where there is
// no value at all.
std::vector<double> filled(std::vector<double> values) {
  const auto sound = [](double value) { return !std::isnan(value); };
  auto from = std::find_if(values.begin(), values.end(), sound);
  std::fill(values.begin(), from, from == values.end() ? 0.0 : *from);
  while (from != values.end()) {
    const auto hole = std::find_if_not(from, values.end(), sound);
    if (hole == values.end()) break;
    const auto to = std::find_if(hole, values.end(), sound);
    const double before = *(hole - 1), after = to == values.end() ? before : *to;
    const auto length = static_cast<double>(to - hole + 1);
    for (auto it = hole; it != to; ++it)
      *it = before + (after - before) * static_cast<double>(it - hole + 1) / length;
    from = to;
  }
  return values;
}

RawChannels marked(RawChannels raw, const std::vector<std::size_t>& samples, int bit) {
  for (const std::size_t i : samples) raw.doubt[i] = static_cast<char>(raw.doubt[i] | bit);
  return raw;
}

Remark remarkAt(const Trace& trace,
                const std::string& code,
                Severity severity,
                std::size_t count,
                std::size_t first) {
  return {code, severity, {}, static_cast<std::int64_t>(count), rowOf(trace, first)};
}

RawChannels withMissing(RawChannels raw, const Trace& trace) {
  const std::vector<std::size_t> place = missingIn(trace.displacement);
  const std::vector<std::size_t> force = missingIn(trace.force);
  if (place.empty() && force.empty()) return raw;
  raw = marked(marked(std::move(raw), place, PlaceMissing), force, ForceMissing);
  const std::size_t first = std::min(place.empty() ? force.front() : place.front(),
                                     force.empty() ? place.front() : force.front());
  const std::size_t count = place.size() + force.size();
  raw.remarks.push_back(remarkAt(trace, "missing-values", Severity::Warning, count, first));
  return raw;
}

using Channel = std::vector<double> RawChannels::*;

RawChannels withoutSpikesOf(RawChannels raw,
                            Channel channel,
                            const std::string& name,
                            const Trace& trace,
                            double threshold) {
  const std::vector<Spike> spikes = findSpikes(raw.*channel, threshold);
  if (spikes.empty()) return raw;
  Remark remark =
      remarkAt(trace, "spikes-removed", Severity::Note, spikes.size(), spikes.front().first);
  remark.values = {{"channel", name}};
  raw.remarks.push_back(std::move(remark));
  raw.*channel = withoutSpikes(std::move(raw.*channel), spikes);
  return raw;
}

RawChannels withClipped(RawChannels raw, const Trace& trace) {
  for (const ClippedSide& side : findClipped(raw.force)) {
    raw = marked(std::move(raw), side.samples, ForceClipped);
    Remark remark = remarkAt(
        trace, "clipped-force", Severity::Warning, side.samples.size(), side.samples.front());
    remark.values = {{"level", side.level, Quantity::Force}};
    raw.remarks.push_back(std::move(remark));
  }
  return raw;
}

// Rows whose stamp is later than that of the row before.
std::vector<std::size_t> risingRows(const std::vector<double>& times) {
  std::vector<std::size_t> rows;
  for (std::size_t i = 0; i < times.size(); ++i)
    if (rows.empty() || times[i] > times[rows.back()]) rows.push_back(i);
  return rows;
}

std::vector<double> picked(const std::vector<double>& values,
                           const std::vector<std::size_t>& rows) {
  std::vector<double> some;
  some.reserve(rows.size());
  if (!values.empty())
    for (const std::size_t row : rows) some.push_back(values[row]);
  return some;
}

std::vector<char> doubtOnClock(const std::vector<char>& doubt,
                               const std::vector<double>& times,
                               const ClockFinding& finding) {
  std::vector<char> out(finding.clock.count);
  std::vector<char> gap(times.size());
  for (const std::size_t row : finding.gapsBehind) gap[row] = PlaceMissing | ForceMissing;
  std::size_t next = 0;
  for (std::size_t i = 0; i < out.size(); ++i) {
    const double at = finding.clock.start + static_cast<double>(i) / finding.clock.rate;
    while (next < times.size() && times[next] < at) ++next;
    const std::size_t after = std::min(next, times.size() - 1), before = next == 0 ? 0 : next - 1;
    const bool between = times[after] - at > 0 && at - times[before] > 0;
    out[i] = static_cast<char>(doubt[before] | doubt[after] | (between ? gap[before] : 0));
  }
  return out;
}

std::vector<Remark> clockRemarks(const Trace& trace, const ClockFinding& finding) {
  std::vector<Remark> remarks;
  if (finding.uneven) {
    Remark remark{"uneven-clock", Severity::Warning, {}, 0, 0};
    remark.values = {{"worst", finding.worstStep, Quantity::Time},
                     {"step", 1 / finding.clock.rate, Quantity::Time}};
    remarks.push_back(std::move(remark));
  }
  if (finding.gapsBehind.empty()) return remarks;
  double longest = 0;
  for (const std::size_t row : finding.gapsBehind)
    longest = std::max(longest, trace.time[row + 1] - trace.time[row]);
  Remark remark = remarkAt(
      trace, "gap", Severity::Warning, finding.gapsBehind.size(), finding.gapsBehind.front() + 1);
  remark.values = {{"longest", longest, Quantity::Time}};
  remarks.push_back(std::move(remark));
  return remarks;
}

}  // namespace

RawChannels lookThrough(const Trace& trace, double spikeThreshold, const Progress& progress) {
  RawChannels raw;
  raw.doubt.resize(trace.displacement.size());
  raw.displacement = filled(trace.displacement);
  raw.force = filled(trace.force);
  raw.velocity = filled(trace.velocity);
  raw.temperature = filled(trace.temperature);
  raw = withMissing(std::move(raw), trace);
  if (progress.cancelled()) return raw;
  raw = withoutSpikesOf(
      std::move(raw), &RawChannels::displacement, "displacement", trace, spikeThreshold);
  if (progress.cancelled()) return raw;
  raw = withoutSpikesOf(std::move(raw), &RawChannels::force, "force", trace, spikeThreshold);
  if (progress.cancelled()) return raw;
  return withClipped(std::move(raw), trace);
}

RawChannels onEvenClock(RawChannels raw, const Trace& trace, const ClockFinding& finding) {
  for (Remark& remark : clockRemarks(trace, finding)) raw.remarks.push_back(std::move(remark));
  if (finding.even) return raw;
  const std::vector<std::size_t> rows = risingRows(trace.time);
  const std::vector<double> times = picked(trace.time, rows);
  for (std::vector<double>* channel :
       {&raw.displacement, &raw.force, &raw.velocity, &raw.temperature})
    if (!channel->empty()) *channel = resample(times, picked(*channel, rows), finding.clock);
  raw.doubt = doubtOnClock(raw.doubt, trace.time, finding);
  return raw;
}

}  // namespace dampwright
