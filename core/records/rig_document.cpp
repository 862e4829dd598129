// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/describe.h"
#include "core/records/document_words.h"
#include "core/records/documents.h"

namespace dampwright {
namespace {

constexpr DocumentKind rigDocument{"rig", 1};

void describe(Fields& io, RigColumn& column) {
  io.text("name", column.name);
  io.count("number", column.number);
  io.text("unit", column.unit);
  io.number("scale", column.scale);
  io.number("offset", column.offset);
}

void describeColumns(Fields& io, RigProfile& rig) {
  const auto column = [](Fields& inside, RigColumn& one) { describe(inside, one); };
  io.object("time", rig.time, column);
  io.object("displacement", rig.displacement, column);
  io.object("force", rig.force, column);
  io.object("velocity", rig.velocity, column);
  io.object("temperature", rig.temperature, column);
}

void describe(Fields& io, RigProfile& rig) {
  io.text("name", rig.name);
  io.text("signature", rig.signature);
  io.object("text", [&](Fields& text) {
    text.text("encoding", rig.encoding);
    text.text("delimiter", rig.delimiter);
    text.text("decimal", rig.decimal);
    text.text("thousands", rig.thousands);
  });
  io.object("columns", [&](Fields& columns) { describeColumns(columns, rig); });
  io.number("sample_rate_hz", rig.sampleRate, positive);
  io.word("displacement_positive", rig.displacementPositive, words::directions);
  io.word("force_positive", rig.forcePositive, words::directions);
  io.word("zero_state", rig.zeroState, words::zeroStates);
  io.number("force_delay_ms", rig.forceDelay);
  io.number("force_delay_u_ms", rig.forceDelayU, notNegative);
  io.number("moving_mass_kg", rig.movingMass, notNegative);
  io.text("low_pass", rig.lowPass);
  io.object("load_cell", [&](Fields& cell) { describe(cell, rig.loadCell); });
  io.number("displacement_accuracy_mm", rig.displacementAccuracy, notNegative);
  io.number("clock_accuracy_percent", rig.clockAccuracyPercent, notNegative);
  io.number("remount_percent", rig.remountPercent, notNegative);
}

}  // namespace

void describe(Fields& io, LoadCell& cell) {
  io.number("capacity_n", cell.capacity, positive);
  io.number("reading_percent", cell.readingPercent, notNegative);
  io.number("capacity_percent", cell.capacityPercent, notNegative);
  io.number("zero_drift_n", cell.zeroDrift, notNegative);
  io.date("calibrated", cell.calibrated);
  io.date("due", cell.due);
}

Result<RigProfile> readRig(std::string_view bytes, std::string_view file) {
  RigProfile rig;
  const auto read = readDocument(bytes, file, rigDocument, [&](Fields& io) { describe(io, rig); });
  if (!read) return read.error();
  return rig;
}

std::string writeRig(const RigProfile& rig) {
  RigProfile copy = rig;
  return writeDocument(rigDocument, [&](Fields& io) { describe(io, copy); });
}

}  // namespace dampwright
