// SPDX-License-Identifier: GPL-3.0-or-later
#include <array>
#include <fstream>

#include "app/batch_files.h"
#include "app/batch_verbs.h"
#include "core/base/sha256.h"
#include "core/records/documents.h"
#include "core/verdict/judge.h"

namespace dampwright {
namespace {

/// A measurement and the checksum of its document.
struct Stored {
  Measurement measurement;
  std::string sha256;
};

// Whether a file begins as JSON does. Only its beginning is read: it may be a run of a gigabyte.
bool looksLikeDocument(const std::string& path) {
  std::array<char, 64> start{};
  std::ifstream stream(path, std::ios::binary);
  stream.read(start.data(), start.size());
  std::string_view text(start.data(), static_cast<std::size_t>(stream.gcount()));
  if (text.starts_with("\xEF\xBB\xBF")) text.remove_prefix(3);
  const auto first = text.find_first_not_of(" \t\r\n");
  return first != std::string_view::npos && text[first] == '{';
}

// The stored measurement where the only file is one; nothing where it is a run.
Result<std::optional<Stored>> storedMeasurement(const BatchRequest& request) {
  if (request.files.size() != 1 || request.files.front() == "-") return std::optional<Stored>();
  const std::string& path = request.files.front();
  if (!looksLikeDocument(path)) return std::optional<Stored>();
  const auto bytes = loadInput(path);
  if (!bytes) return bytes.error();
  auto measurement = readMeasurement(bytes.value(), path);
  if (!measurement) return measurement.error();
  return std::optional<Stored>(Stored{std::move(measurement).value(), sha256Hex(bytes.value())});
}

Result<Stored> measurementOf(const BatchRequest& request) {
  auto stored = storedMeasurement(request);
  if (!stored) return stored.error();
  if (stored.value()) return std::move(*stored.value());
  auto measured = measureFiles(request);
  if (!measured) return measured.error();
  const std::string sha256 = sha256Hex(writeMeasurement(measured.value()));
  return Stored{std::move(measured).value(), sha256};
}

}  // namespace

int statusOf(VerdictWord word) {
  switch (word) {
    case VerdictWord::Pass:
      return exit_status::done;
    case VerdictWord::Fail:
      return exit_status::fail;
    case VerdictWord::TooCloseToCall:
    case VerdictWord::NotTested:
      break;
  }
  return exit_status::open;
}

Result<BatchAnswer> judgeVerb(const BatchRequest& request) {
  const auto text = loadInput(request.limits);
  if (!text) return text.error();
  const auto limits = readLimits(text.value(), request.limits);
  if (!limits) return limits.error();
  const auto stored = measurementOf(request);
  if (!stored) return stored.error();
  Verdict verdict = judge(stored.value().measurement, limits.value());
  verdict.measurementSha256 = stored.value().sha256;
  return BatchAnswer{writeVerdict(verdict), statusOf(verdict.word)};
}

}  // namespace dampwright
