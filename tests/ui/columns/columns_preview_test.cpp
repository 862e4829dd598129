// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/columns_preview.h"

#include <gtest/gtest.h>

#include <algorithm>

#include "made_run.h"

namespace dampwright {
namespace {

ColumnsPreview whole(const std::string& text, const ColumnsDraft& draft) {
  return previewWhole(
      previewHead(made::inMemory(text), "run.csv", draft, {}), "run.csv", draft, {});
}

TEST(ColumnsPreview, TheHeadTellsTheColumnsAndTheWholeTheLoops) {
  const std::string text = made::viscousRun("Rig: 1\nTime (s),Travel (mm),Load (N)\n");
  const ColumnsPreview head = previewHead(made::inMemory(text), "run.csv", {}, {});
  ASSERT_TRUE(head.reading);
  EXPECT_EQ(head.signature, "time [s]|travel [mm]|load [N]");
  EXPECT_EQ(head.reading->source.columns[2].role, Role::Force);
  EXPECT_EQ(head.rows.size(), previewRows);
  EXPECT_EQ(head.rows[1].cells[1], "Travel (mm)");
  EXPECT_FALSE(head.measured);
  const ColumnsPreview all = previewWhole(head, "run.csv", {}, {});
  ASSERT_TRUE(all.measured);
  EXPECT_EQ(all.reading->source.rows, 4000);
  EXPECT_FALSE(all.measured->measurement.blocks.empty());
}

TEST(ColumnsPreview, TheHeadOfALongFileIsAPartOfIt) {
  const ColumnsPreview head =
      previewHead(made::inMemory(made::viscousRun("Time (s),Travel (mm),Load (N)\n", 300'000)),
                  "r.csv",
                  {},
                  {});
  ASSERT_TRUE(head.reading);
  EXPECT_GT(head.reading->source.rows, 1000);
  EXPECT_LT(head.reading->source.rows, 50'000);
}

TEST(ColumnsPreview, AQuestionIsAnsweredByTheDraft) {
  const std::string text = made::twoForces();
  ColumnsPreview asked = whole(text, {});
  ASSERT_TRUE(asked.reading);
  ASSERT_FALSE(asked.reading->trace);
  EXPECT_EQ(asked.reading->open.front().point, "force");
  const ColumnsDraft draft = withRole({}, asked.reading->source, Role::Force, 3);
  const ColumnsPreview answered = whole(text, draft);
  EXPECT_TRUE(answered.reading->trace);
  EXPECT_TRUE(answered.measured);
}

TEST(ColumnsPreview, AFileThatCannotBeReadShowsItsRowsAllTheSame) {
  const std::string text = "Dear customer,\nthe dampers are ready.\n";
  const ColumnsPreview head = previewHead(made::inMemory(text), "run.csv", {}, {});
  ASSERT_TRUE(head.problem);
  EXPECT_FALSE(head.reading);
  ASSERT_EQ(head.rows.size(), 2u);
  EXPECT_EQ(head.rows[0].cells[0], "Dear customer,");
  EXPECT_EQ(head.signature, "");
  EXPECT_TRUE(previewWhole(head, "run.csv", {}, {}).problem);
}

TEST(ColumnsPreview, ARunThatCannotBeMeasuredIsStillRead) {
  const ColumnsPreview all = whole(made::viscousRun("Time (s),Travel (mm),Load (N)\n", 60), {});
  ASSERT_TRUE(all.reading);
  EXPECT_TRUE(all.reading->trace);
  EXPECT_FALSE(all.measured);
  EXPECT_TRUE(all.unmeasured);
}

TEST(ColumnsPreview, BytesThatCannotBeLoadedAreSaid) {
  const LoadRun broken = []() -> Result<RunText> { return Error{"run-file-missing", {}, {}}; };
  const ColumnsPreview head = previewHead(broken, "run.csv", {}, {});
  EXPECT_EQ(head.problem->code, "run-file-missing");
  EXPECT_EQ(previewWhole(head, "run.csv", {}, {}).problem->code, "run-file-missing");
}

}  // namespace
}  // namespace dampwright
