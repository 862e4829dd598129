// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/columns_preview.h"

#include <utility>

namespace dampwright {

namespace {

constexpr std::size_t headBytes = std::size_t{1} << 18;  // some thousand rows, read in 10 ms

Result<RunReading> readAs(const ColumnsDraft& draft,
                          std::string_view bytes,
                          const std::string& name,
                          const Progress& progress) {
  return readRun(
      bytes,
      name,
      draft.text,
      [&](std::string_view) { return std::optional(draft.rig); },
      progress);
}

void take(ColumnsPreview& preview, Result<RunReading> reading) {
  preview.reading.reset();
  preview.problem.reset();
  if (reading) {
    preview.reading = std::move(reading).value();
  } else {
    preview.problem = reading.error();
  }
}

// The rows as they stand, whatever can be made of them.
std::vector<TextRow> rowsOf(const ColumnsPreview& preview,
                            std::string_view head,
                            const ColumnsDraft& draft) {
  std::string delimiter = draft.text.delimiter.value_or("");
  if (preview.reading) delimiter = preview.reading->source.delimiter;
  auto rows = firstRows(head, draft.text.encoding, delimiter, previewRows);
  return rows ? std::move(rows).value() : std::vector<TextRow>{};
}

}  // namespace

ColumnsPreview previewHead(const LoadRun& load,
                           const std::string& name,
                           const ColumnsDraft& draft,
                           const Progress& progress) {
  ColumnsPreview preview;
  Result<RunText> bytes = load();
  if (!bytes) {
    preview.problem = bytes.error();
    return preview;
  }
  preview.bytes = std::move(bytes).value();
  const std::string_view head = headOf(*preview.bytes, headBytes);
  const auto natural = readRun(head, name, {}, {}, progress);
  if (natural) preview.signature = natural.value().source.signature;
  take(preview, readAs(draft, head, name, progress));
  preview.rows = rowsOf(preview, head, draft);
  return preview;
}

ColumnsPreview previewWhole(ColumnsPreview head,
                            const std::string& name,
                            const ColumnsDraft& draft,
                            const Progress& progress) {
  if (!head.bytes) return head;
  take(head, readAs(draft, *head.bytes, name, progress));
  if (!head.reading || !head.reading->trace) return head;
  MeasureOptions options;
  options.rig = draft.rig;
  Result<Measured> measured = measureRuns({&*head.reading->trace, 1}, options, progress);
  if (measured) {
    head.measured = std::make_shared<const Measured>(std::move(measured).value());
  } else {
    head.unmeasured = measured.error();
  }
  return head;
}

}  // namespace dampwright
