// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_content.h"

#include <gtest/gtest.h>

#include "core/records/documents.h"
#include "tests/ui/sheet/made_sheet.h"

namespace dampwright {
namespace {

const PhaseResult nothingMeasured = [](std::size_t, std::size_t) { return SheetPhase{}; };
const RunBytesOf someBytes = [](const std::string&) -> Result<std::string> {
  return std::string("bytes");
};

TEST(SheetContents, AnEmptyPlaceOfTheVehicleIsLeftOut) {
  Job job = made::job({"front left"});
  job.items.push_back({"front right", {}, {}});
  const auto content = sheetContent(job, {}, nothingMeasured, someBytes);
  ASSERT_TRUE(content);
  EXPECT_EQ(content.value().items.size(), 1u);
}

TEST(SheetContents, ADamperThatWasReceivedAndNotTestedStays) {
  Job job = made::job({"front left"});
  job.items[0].phases.clear();
  const auto content = sheetContent(job, {}, nothingMeasured, someBytes);
  ASSERT_TRUE(content);
  ASSERT_EQ(content.value().items.size(), 1u);
  EXPECT_TRUE(content.value().items[0].phases.empty());
}

TEST(SheetContents, CarriesTheJobTheLimitsAndEveryRunOnce) {
  Job job = made::job({"front left", "front right"});
  job.items[1].phases[0].runs.push_back(job.items[0].phases[0].runs[0]);
  const auto content = sheetContent(job, {}, nothingMeasured, someBytes);
  ASSERT_TRUE(content);
  const auto& files = content.value().attachments;
  ASSERT_EQ(files.size(), 4u);
  const auto again = readJob(files[0].bytes.toStdString(), "job.json");
  ASSERT_TRUE(again);
  EXPECT_EQ(again.value(), job);
  EXPECT_EQ(files[1].kind, QStringLiteral("limits"));
}

TEST(SheetContents, ARunWhoseBytesAreGoneIsAnError) {
  const auto content = sheetContent(made::job({"front left"}),
                                    {},
                                    nothingMeasured,
                                    [](const std::string&) -> Result<std::string> {
                                      return Error{"run-file-missing", {}, {}};
                                    });
  ASSERT_FALSE(content);
  EXPECT_EQ(content.error().code, "run-file-missing");
}

}  // namespace
}  // namespace dampwright
