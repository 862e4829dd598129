// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/describe.h"
#include "core/records/document_words.h"
#include "core/records/documents.h"
#include "core/verdict/check_kinds.h"

namespace dampwright {
namespace {

constexpr DocumentKind limitsDocument{"limits", 1};
constexpr Range coverage{1, 10, "1 … 10"};

void describeConditions(Fields& io, LimitConditions& conditions) {
  io.number("stroke_mm", conditions.stroke, positive);
  std::vector<double> window;
  if (conditions.temperatureFrom && conditions.temperatureTo)
    window = {*conditions.temperatureFrom, *conditions.temperatureTo};
  io.numbers("temperature_c", window);
  if (io.reading() && !window.empty()) {
    if (window.size() != 2 || !(window[0] <= window[1])) {
      io.complain("document-bad-window", {});
      return;
    }
    conditions.temperatureFrom = window[0];
    conditions.temperatureTo = window[1];
  }
  io.text("setting", conditions.setting);
  io.word("waveform", conditions.waveform, {"sine", "crank", "triangle", "sweep", "other"});
}

// A text of a check that has its default where the sheet is silent.
void describeWord(Fields& io, const CheckField& field, std::string& value) {
  io.word(field.key, value, field.words);
}

void describe(Fields& io, const CheckField& field, Check& check) {
  switch (field.member) {
    case CheckMember::Direction:
      return io.word(field.key, check.direction, words::directions);
    case CheckMember::Velocity:
      return io.number(field.key, check.velocity, positive);
    case CheckMember::Reading:
      return describeWord(io, field, check.reading);
    case CheckMember::Stroke:
      return io.number(field.key, check.stroke, positive);
    case CheckMember::Basis:
      return describeWord(io, field, check.basis);
    case CheckMember::Min:
      return io.number(field.key, check.min);
    case CheckMember::Max:
      return io.number(field.key, check.max);
    case CheckMember::Target:
      return io.number(field.key, check.target);
    case CheckMember::TolerancePercent:
      return io.number(field.key, check.tolerancePercent, notNegative);
    case CheckMember::ToleranceAbsolute:
      return io.number(field.key, check.toleranceAbsolute, notNegative);
  }
}

}  // namespace

void describe(Fields& io, Check& check) {
  std::vector<std::string_view> names;
  for (const CheckKind& kind : checkKinds()) names.push_back(kind.name);
  io.word("check", check.check, names);
  if (const CheckKind* kind = findCheckKind(check.check)) {
    for (const CheckField& field : kind->fields) describe(io, field, check);
  }
}

void describe(Fields& io, Limits& limits) {
  io.text("title", limits.title);
  io.text("source", limits.source);
  io.text("revision", limits.revision);
  io.word("force_basis", limits.forceBasis, words::forceBases);
  io.word("decision_rule", limits.decisionRule, words::decisionRules);
  io.number("coverage_factor", limits.coverageFactor, coverage);
  io.object("conditions", [&](Fields& inside) { describeConditions(inside, limits.conditions); });
  io.list("checks", limits.checks, [](Fields& one, Check& check) {
    describe(one, check);
    if (!one.reading()) return;
    if (const auto problem = problemOf(check)) one.complain(problem->code, problem->values);
  });
}

Result<Limits> readLimits(std::string_view bytes, std::string_view file) {
  Limits limits;
  const auto read =
      readDocument(bytes, file, limitsDocument, [&](Fields& io) { describe(io, limits); });
  if (!read) return read.error();
  return limits;
}

std::string writeLimits(const Limits& limits) {
  Limits copy = limits;
  return writeDocument(limitsDocument, [&](Fields& io) { describe(io, copy); });
}

}  // namespace dampwright
