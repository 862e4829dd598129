// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/fuzz/fuzz_cases.h"

#include <cmath>
#include <string>
#include <vector>

#include "core/base/expects.h"
#include "core/intake/read_run.h"
#include "core/records/documents.h"
#include "core/words/words.h"

namespace dampwright {
namespace {

ReadOptions optionsOf(unsigned bits) {
  ReadOptions options;
  if ((bits & 1) != 0) options.decimal = ",";
  if ((bits & 2) != 0) options.delimiter = ";";
  if ((bits & 4) != 0) options.sampleRate = 200;
  if ((bits & 8) != 0) options.displacement = "1";
  if ((bits & 16) != 0) options.force = "2";
  return options;
}

void checkTrace(const Trace& trace) {
  const std::size_t rows = trace.time.size();
  expects(trace.displacement.size() == rows && trace.force.size() == rows);
  expects(trace.velocity.empty() || trace.velocity.size() == rows);
  expects(trace.temperature.empty() || trace.temperature.size() == rows);
  for (std::size_t i = 0; i < rows; ++i) {
    expects(std::isfinite(trace.time[i]));
    expects(i == 0 || trace.time[i] >= trace.time[i - 1]);
  }
}

void checkReading(const RunReading& reading) {
  bool stops = false;
  for (const OpenPoint& open : reading.open) {
    expects(open.option.starts_with("--"));
    stops = stops || open.point != "direction";
  }
  expects(reading.trace.has_value() != stops);
  for (const Remark& remark : reading.remarks) expects(findSentence(remark.code) != nullptr);
  for (const SourceColumn& column : reading.source.columns) {
    expects(findSentence(column.why) != nullptr);
  }
  if (reading.trace) checkTrace(*reading.trace);
  expects(static_cast<bool>(readColumns(writeColumns(reading), "columns")));
}

template <class T>
void comesBack(std::string_view bytes,
               Result<T> (*read)(std::string_view, std::string_view),
               std::string (*write)(const T&)) {
  const auto value = read(bytes, "any");
  if (!value) {
    expects(findSentence(value.error().code) != nullptr);
    return;
  }
  const std::string once = write(value.value());
  const auto again = read(once, "again");
  expects(static_cast<bool>(again));
  const auto third = read(write(again.value()), "third");
  expects(static_cast<bool>(third));
}

}  // namespace

void readAnyRun(std::string_view bytes) {
  ReadOptions options;
  if (!bytes.empty() && bytes.front() > 0 && bytes.front() < 32 && bytes.front() != '\n' &&
      bytes.front() != '\r' && bytes.front() != '\t') {
    options = optionsOf(static_cast<unsigned char>(bytes.front()));
    bytes.remove_prefix(1);
  }
  const auto reading = readRun(bytes, "any", options, {}, {});
  if (reading) {
    checkReading(reading.value());
  } else {
    expects(findSentence(reading.error().code) != nullptr);
  }
}

void readAnyDocument(std::string_view bytes) {
  comesBack(bytes, readRig, writeRig);
  comesBack(bytes, readDamper, writeDamper);
  comesBack(bytes, readLimits, writeLimits);
  comesBack(bytes, readJob, writeJob);
  comesBack(bytes, readColumns, writeColumns);
  comesBack(bytes, readMeasurement, writeMeasurement);
  comesBack(bytes, readVerdict, writeVerdict);
}

}  // namespace dampwright
