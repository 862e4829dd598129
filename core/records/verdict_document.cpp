// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/records/describe.h"
#include "core/records/document_words.h"
#include "core/records/documents.h"
#include "core/words/words.h"

namespace dampwright {
namespace {

constexpr DocumentKind verdictDocument{"verdict", 1};

void describe(Fields& io, Reason& reason) {
  io.derived("reason", englishText(reason.code, reason.values));
  io.text("reason_code", reason.code);
  describeValues(io, "reason_values", reason.values);
}

// Without a figure there is no uncertainty: null, never 0.
void describeFigure(Fields& io, CheckVerdict& verdict) {
  const auto withFigure = [&](std::string_view key, double& value) {
    std::optional<double> known = verdict.measured ? std::optional(value) : std::nullopt;
    io.number(key, known);
    const bool infinite = verdict.measured && key == "dof";
    value = known.value_or(infinite ? std::numeric_limits<double>::infinity() : 0);
  };
  io.number("measured", verdict.measured);
  io.word("unit", verdict.quantity, words::quantities);
  withFigure("standard_uncertainty", verdict.standardUncertainty);
  withFigure("dof", verdict.dof);
  withFigure("coverage_factor", verdict.coverageFactor);
  withFigure("expanded_uncertainty", verdict.expandedUncertainty);
}

void describe(Fields& io, CheckVerdict& verdict) {
  describe(io, verdict.check);
  describeFigure(io, verdict);
  io.number("min", verdict.min);
  io.number("max", verdict.max);
  io.number("margin", verdict.margin);
  io.word("verdict", verdict.verdict, words::verdicts);
  describe(io, verdict.reason);
  describeRemarks(io, verdict.remarks);
  io.list("budget", verdict.budget, [](Fields& one, BudgetLine& line) { describe(one, line); });
}

void describe(Fields& io, Verdict& verdict) {
  io.require(Keys::Required);
  io.count("method", verdict.method);
  io.word("verdict", verdict.word, words::verdicts);
  io.list("checks", verdict.checks, [](Fields& one, CheckVerdict& c) { describe(one, c); });
  io.object("limits", [&](Fields& limits) {
    limits.text("title", verdict.title);
    limits.text("source", verdict.source);
    limits.text("revision", verdict.revision);
    limits.word("decision_rule", verdict.decisionRule, words::decisionRules);
    limits.word("force_basis", verdict.forceBasis, words::forceBases);
  });
  io.list("waiting", verdict.waiting, [](Fields& one, Reason& reason) { describe(one, reason); });
  io.text("measurement_sha256", verdict.measurementSha256);
}

}  // namespace

Result<Verdict> readVerdict(std::string_view bytes, std::string_view file) {
  Verdict verdict;
  const auto read =
      readDocument(bytes, file, verdictDocument, [&](Fields& io) { describe(io, verdict); });
  if (!read) return read.error();
  return verdict;
}

std::string writeVerdict(const Verdict& verdict) {
  Verdict copy = verdict;
  return writeDocument(verdictDocument, [&](Fields& io) { describe(io, copy); });
}

}  // namespace dampwright
