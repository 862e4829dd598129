// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/rig_folder/complete_files.h"

#include <gmock/gmock.h>

namespace dampwright {
namespace {

using testing::ElementsAre;
using testing::IsEmpty;

std::vector<std::string> names(const std::vector<ListedFile>& files) {
  std::vector<std::string> list;
  for (const ListedFile& file : files) list.push_back(file.name);
  return list;
}

TEST(CompleteFiles, AFileIsCompleteWhenTwoLooksFindItUnchanged) {
  CompleteFiles files;
  const ListedFile run{"run.csv", 100, 5, 1};
  EXPECT_THAT(files.look({run}, 0).complete, IsEmpty()) << "one look tells nothing";
  EXPECT_THAT(files.look({run}, 100).complete, IsEmpty()) << "too soon after the first";
  EXPECT_THAT(names(files.look({run}, 2000).complete), ElementsAre("run.csv"));
  EXPECT_THAT(files.look({run}, 4000).complete, IsEmpty()) << "only once";
}

TEST(CompleteFiles, AGrowingFileIsWaitedFor) {
  CompleteFiles files;
  for (int i = 0; i < 20; ++i) {
    const auto bytes = static_cast<std::uint64_t>(100 * (i + 1));
    EXPECT_THAT(files.look({{"run.csv", bytes, i, 1}}, 2000 * i).complete, IsEmpty()) << i;
  }
  const ListedFile last{"run.csv", 2000, 19, 1};
  EXPECT_THAT(files.look({last}, 40'000).complete, IsEmpty()) << "its pauses were 2 s";
  EXPECT_THAT(files.look({last}, 42'000).complete, IsEmpty());
  EXPECT_THAT(names(files.look({last}, 44'000).complete), ElementsAre("run.csv"));
}

TEST(CompleteFiles, ALoggerThatWritesEveryTenSecondsIsWaitedForThreeTimesAsLong) {
  CompleteFiles files;
  std::vector<std::int64_t> given;
  std::uint64_t bytes = 0;
  for (std::int64_t now = 0; now <= 120'000; now += 2000) {
    if (now % 10'000 == 0 && now <= 50'000) bytes += 100;
    const auto look = files.look({{"run.csv", bytes, static_cast<std::int64_t>(bytes), 1}}, now);
    if (!look.complete.empty()) given.push_back(now);
  }
  // Nobody can know at the first pause; once it went on, it is given no more before its end.
  EXPECT_THAT(given, ElementsAre(2000, 80'000));
}

TEST(CompleteFiles, WhatChangesAfterAllIsWithdrawn) {
  CompleteFiles files;
  files.look({{"run.csv", 100, 5, 1}}, 0);
  files.look({{"run.csv", 100, 5, 1}}, 2000);
  const auto look = files.look({{"run.csv", 150, 6, 1}}, 4000);
  EXPECT_THAT(look.withdrawn, ElementsAre("run.csv"));
  EXPECT_THAT(look.complete, IsEmpty());
}

TEST(CompleteFiles, ASwapByAnotherFileCountsThoughSizeAndTimeAreTheSame) {
  CompleteFiles files;
  files.look({{"run.csv", 100, 5, 1}}, 0);
  files.look({{"run.csv", 100, 5, 1}}, 2000);
  EXPECT_THAT(files.look({{"run.csv", 100, 5, 2}}, 4000).withdrawn, ElementsAre("run.csv"));
  EXPECT_THAT(names(files.look({{"run.csv", 100, 5, 2}}, 6000).complete), ElementsAre("run.csv"));
}

TEST(CompleteFiles, AFileThatGoesIsWithdrawnAndNewWhenItIsBack) {
  CompleteFiles files;
  const ListedFile run{"run.csv", 100, 5, 1};
  files.look({run}, 0);
  files.look({run}, 2000);
  EXPECT_THAT(files.look({}, 4000).withdrawn, ElementsAre("run.csv"));
  EXPECT_THAT(files.look({run}, 6000).complete, IsEmpty());
  EXPECT_THAT(names(files.look({run}, 8000).complete), ElementsAre("run.csv"));
}

TEST(CompleteFiles, WhatWasThereFirstIsOldUntilItChanges) {
  const ListedFile old{"old.csv", 100, 5, 1};
  CompleteFiles files({old});
  files.look({old}, 0);
  EXPECT_THAT(files.look({old}, 9000).complete, IsEmpty());
  const ListedFile again{"old.csv", 100, 7, 2};
  files.look({again}, 10'000);
  EXPECT_THAT(names(files.look({again}, 12'000).complete), ElementsAre("old.csv"));
}

TEST(CompleteFiles, EmptyFilesAndThoseOfProgramsAreNotOffered) {
  CompleteFiles files;
  const std::vector<ListedFile> listing = {{"empty.csv", 0, 1, 1},
                                           {".~lock.run.csv#", 9, 1, 2},
                                           {"run.csv.part", 9, 1, 3},
                                           {"run.csv~", 9, 1, 4},
                                           {"Lauf 3.TXT", 9, 1, 5}};
  files.look(listing, 0);
  EXPECT_THAT(names(files.look(listing, 9000).complete), ElementsAre("Lauf 3.TXT"));
}

TEST(CompleteFiles, OneThatCouldNotBeReadIsGivenAgainLater) {
  CompleteFiles files;
  const ListedFile run{"run.csv", 100, 5, 1};
  files.look({run}, 0);
  files.look({run}, 2000);
  files.again("run.csv", 2100);
  EXPECT_THAT(files.look({run}, 4000).complete, IsEmpty());
  EXPECT_THAT(names(files.look({run}, 4100).complete), ElementsAre("run.csv"));
  files.again("gone.csv", 5000);  // harmless
}

}  // namespace
}  // namespace dampwright
