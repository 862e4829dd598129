// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/describe.h"
#include "core/records/document_words.h"
#include "core/records/documents.h"
#include "core/records/key_unit.h"

namespace dampwright {
namespace {

constexpr DocumentKind measurementDocument{"measurement", 1};

/// Whether a figure means anything; where it does not, it is null and stays at its default.
enum class Known { Yes, No };

Known known(const std::optional<double>& value) { return value ? Known::Yes : Known::No; }

void numberIf(Fields& io, std::string_view key, double& value, Known is) {
  std::optional<double> shown = is == Known::Yes ? std::optional(value) : std::nullopt;
  io.number(key, shown);
  if (is == Known::Yes) value = shown.value_or(unitOfKey(key).whenNull);
}

/// The standard uncertainty of a figure and its degrees of freedom: "force_n" and "_fit" are
/// "force_n_fit_u" and "force_n_fit_dof".
struct Uncertainty {
  double& u;
  double& dof;
};

void describe(Fields& io, const std::string& stem, Uncertainty uncertainty, Known is) {
  numberIf(io, stem + "_u", uncertainty.u, is);
  numberIf(io, stem + "_dof", uncertainty.dof, is);
}

void describe(Fields& io, MeasuredRun& run) {
  describe(io, run.source);
  io.number("sample_rate_hz", run.sampleRate);
  io.word("zero_state", run.zeroState, words::zeroStates);
  io.flag("direction_settled", run.directionSettled);
  describeSpans(io, "struck_out_s", run.struckOut);
  describeRemarks(io, run.remarks);
}

void describe(Fields& io, std::string_view velocityKey, Reading& reading) {
  io.number(velocityKey, reading.peakVelocity);
  io.number("displacement_mm", reading.displacement);
  io.number("force_n", reading.force);
  const Known read = reading.isRead() ? Known::Yes : Known::No;
  describe(io, "force_n", {reading.forceTotalU, reading.forceTotalDof}, read);
  describe(io, "force_n_cycles", {reading.forceU, reading.forceDof}, read);
  describe(io, "force_n_pooled", {reading.cyclesU, reading.cyclesDof}, read);
  io.number("damping_force_n", reading.dampingForce);
  describe(io,
           "damping_force_n",
           {reading.dampingForceTotalU, reading.dampingForceTotalDof},
           known(reading.dampingForce));
  io.number("largest_force_n", reading.largestForce);
  io.number("largest_force_n_cycles_u", reading.largestForceU);
  describe(io, "largest_force_n_pooled", {reading.largestCyclesU, reading.largestCyclesDof}, read);
  io.number("energy_j", reading.energy);
}

void describe(Fields& io, Cycle& cycle) {
  io.number("start_s", cycle.start);
  io.number("top_s", cycle.top);
  io.number("end_s", cycle.end);
  io.flag("conditioning", cycle.conditioning);
  io.flag("struck_out", cycle.struckOut);
}

void describe(Fields& io, MeasuredBlock& measured) {
  Block& block = measured.block;
  io.count("run", measured.run);
  io.word("kind", block.kind, words::blockKinds);
  io.number("start_s", block.start);
  io.number("end_s", block.end);
  io.derived("cycles", double(block.cycles.size()));
  io.derived("cycles_used", block.cyclesUsed());
  const Known moves = block.kind == BlockKind::Hold ? Known::No : Known::Yes;
  const Known holds = block.kind == BlockKind::Hold ? Known::Yes : Known::No;
  numberIf(io, "frequency_hz", block.frequency, moves);
  io.number("stroke_mm", block.stroke);
  io.number("mid_mm", block.mid);
  numberIf(io, "hold_force_n", block.holdForce, holds);
  numberIf(io, "hold_force_n_u", block.holdForceU, holds);
  io.number("temperature_c", block.temperature);
  io.number("energy_j", measured.energy);
  io.number("mean_power_w", measured.meanPower);
  io.number("equivalent_damping_n_s_per_m", measured.equivalentDamping);
  io.number("loop_width_n", measured.loopWidth);
  io.number("half_speed_width_n", measured.halfSpeedWidth);
  io.number("phase_lag_deg", measured.phaseLag);
  std::vector<double> ends(measured.endForces.begin(), measured.endForces.end());
  io.numbers("end_forces_n", ends);
  if (ends.size() == 2) measured.endForces = {ends[0], ends[1]};
  const auto reading = [](Reading& one) {
    return [&one](Fields& inside) { describe(inside, "peak_velocity_mm_s", one); };
  };
  io.object("compression", reading(measured.compression));
  io.object("rebound", reading(measured.rebound));
  io.list("cycle_times", block.cycles, [](Fields& one, Cycle& cycle) { describe(one, cycle); });
  describeRemarks(io, block.remarks);
}

void describe(Fields& io, CurvePoint& point) {
  io.count("block", point.block);
  io.number("stroke_mm", point.stroke);
  describe(io, "velocity_mm_s", point.reading);
}

void describe(Fields& io, Gas& gas) {
  io.number("force_n", gas.force);
  describe(io, "force_n", {gas.totalU, gas.totalDof}, known(gas.force));
  describe(io, "force_n_fit", {gas.forceU, gas.forceDof}, known(gas.force));
  io.number("rate_n_per_mm", gas.rate);
  numberIf(io, "rate_n_per_mm_u", gas.rateU, known(gas.rate));
  numberIf(io, "column_length_mm", gas.columnLength, known(gas.force));
  io.number("exponent", gas.exponent);
  numberIf(io, "mid_mm", gas.mid, known(gas.force));
  io.number("temperature_c", gas.temperature);
  io.text("method", gas.method);
  io.text("reason", gas.reason);
}

void describe(Fields& io, Friction& friction) {
  io.number("dry_n", friction.dry);
  const Known dry = known(friction.dry);
  describe(io, "dry_n", {friction.dryTotalU, friction.dryTotalDof}, dry);
  describe(io, "dry_n_fit", {friction.dryU, friction.dryDof}, dry);
  io.number("half_difference_n", friction.halfDifference);
  const Known half = known(friction.halfDifference);
  describe(io,
           "half_difference_n",
           {friction.halfDifferenceTotalU, friction.halfDifferenceTotalDof},
           half);
  describe(
      io, "half_difference_n_cycles", {friction.halfDifferenceU, friction.halfDifferenceDof}, half);
  numberIf(io, "at_velocity_mm_s", friction.atVelocity, half);
  io.text("method", friction.method);
  io.text("reason", friction.reason);
}

void describe(Fields& io, FittedLaw& law) {
  std::vector<std::pair<std::string, double>> values, errors;
  for (const FittedParameter& parameter : law.parameters) {
    values.emplace_back(parameter.name, parameter.value);
    errors.emplace_back(parameter.name, parameter.u);
  }
  io.text("law", law.law);
  io.flag("chosen", law.chosen);
  io.numberByName("parameters", values, NameUnits::InName);
  io.numberByName("standard_errors", errors, NameUnits::InName);
  io.number("rms_n", law.rms);
  io.number("aicc", law.aicc);
  io.text("status", law.status);
  io.text("why", law.why);
  if (!io.reading()) return;
  law.parameters.clear();
  for (std::size_t i = 0; i < values.size() && i < errors.size(); ++i) {
    const auto& [name, value] = values[i];
    law.parameters.push_back({name, value, errors[i].second, unitOfKey(name).quantity});
  }
}

void describe(Fields& io, RigAccuracy& rig) {
  io.object("load_cell", [&](Fields& cell) { describe(cell, rig.loadCell); });
  io.number("displacement_accuracy_mm", rig.displacementAccuracy);
  io.number("clock_accuracy_percent", rig.clockAccuracyPercent);
  io.number("remount_percent", rig.remountPercent);
  io.text("low_pass", rig.lowPass);
}

// Two lists, one for each direction.
template <class T>
void describePair(Fields& io,
                  std::string_view key,
                  std::vector<T>& compression,
                  std::vector<T>& rebound) {
  io.object(key, [&](Fields& inside) {
    const auto each = [](Fields& one, T& item) { describe(one, item); };
    inside.list("compression", compression, each);
    inside.list("rebound", rebound, each);
  });
}

void describe(Fields& io, Measurement& measurement) {
  io.require(Keys::Required);
  io.text("program", measurement.program);
  io.count("method", measurement.method);
  io.list("runs", measurement.runs, [](Fields& one, MeasuredRun& run) { describe(one, run); });
  io.list("blocks", measurement.blocks, [](Fields& one, MeasuredBlock& b) { describe(one, b); });
  describePair(io, "curve", measurement.compression.points, measurement.rebound.points);
  io.object("gas", [&](Fields& gas) { describe(gas, measurement.gas); });
  io.object("friction", [&](Fields& inside) { describe(inside, measurement.friction); });
  describePair(io, "laws", measurement.compressionLaws, measurement.reboundLaws);
  io.number("cycles_percent_u", measurement.typeAPercent);
  io.number("cycles_percent_dof", measurement.typeADof);
  io.object("rig", [&](Fields& rig) { describe(rig, measurement.rig); });
  io.list("budget", measurement.budget, [](Fields& one, BudgetLine& l) { describe(one, l); });
  describeRemarks(io, measurement.remarks);
}

}  // namespace

void describe(Fields& io, BudgetLine& line) {
  io.text("quantity", line.quantity);
  io.text("part", line.part);
  io.number("u", line.u);
  io.number("dof", line.dof);
}

Result<Measurement> readMeasurement(std::string_view bytes, std::string_view file) {
  Measurement measurement;
  const auto read = readDocument(
      bytes, file, measurementDocument, [&](Fields& io) { describe(io, measurement); });
  if (!read) return read.error();
  const auto known = [&](const auto& items, auto index, std::size_t size) {
    for (const auto& item : items)
      if (item.*index >= size) return false;
    return true;
  };
  if (!known(measurement.blocks, &MeasuredBlock::run, measurement.runs.size()) ||
      !known(measurement.compression.points, &CurvePoint::block, measurement.blocks.size()) ||
      !known(measurement.rebound.points, &CurvePoint::block, measurement.blocks.size()))
    return Error{"measurement-out-of-joint", {}, {std::string(file), 0, 0}};
  return measurement;
}

std::string writeMeasurement(const Measurement& measurement) {
  Measurement copy = measurement;
  return writeDocument(measurementDocument, [&](Fields& io) { describe(io, copy); });
}

}  // namespace dampwright
