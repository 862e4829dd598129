// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/sheet_command.h"

#include <gtest/gtest.h>

#include <sys/wait.h>
#include <unistd.h>

#include <cstdio>
#include <nlohmann/json.hpp>

#include "core/base/sha256.h"
#include "core/records/documents.h"
#include "tests/batch/run_batch.h"

namespace dampwright {
namespace {

// The command as gui_main calls it, in a process of its own: an application can't be made twice.
Ended sheet(const Folder& folder, std::vector<std::string> arguments) {
  arguments.insert(arguments.begin(), {"dampwright", "sheet"});
  std::vector<char*> argv;
  for (std::string& argument : arguments) argv.push_back(argument.data());
  argv.push_back(nullptr);
  const std::string out = (folder.path() / "out").string(), err = (folder.path() / "err").string();
  const pid_t child = ::fork();
  if (child == 0) {
    if (::chdir(folder.path().c_str()) != 0 || !std::freopen(out.c_str(), "w", stdout) ||
        !std::freopen(err.c_str(), "w", stderr)) {
      ::_exit(99);
    }
    const int status = runSheetCommand(static_cast<int>(argv.size()) - 1, argv.data());
    std::fflush(nullptr);
    ::_exit(status);
  }
  int status = 0;
  ::waitpid(child, &status, 0);
  return {WIFEXITED(status) ? WEXITSTATUS(status) : -1, folder.read("out"), folder.read("err")};
}

// 2000 N·s/m: 600 N at 300 mm/s.
class SheetCommand : public testing::Test {
 protected:
  void SetUp() override {
    folder_.write("run one.csv", linearDamperRun(2000));
    folder_.write("pass.json", writeLimits(reboundLimits(500, 700)));
    folder_.write("fail.json", writeLimits(reboundLimits(100, 200)));
  }
  std::vector<std::string> asked(const std::string& limits) const {
    return {"run one.csv",
            "--limits",
            limits,
            "--pdf",
            "s.pdf",
            "--displacement-positive",
            "compression"};
  }
  bool noPdf() const { return !std::filesystem::exists(folder_.path() / "s.pdf"); }
  Folder folder_;
};

TEST_F(SheetCommand, PrintsThePathAndEndsWithTheVerdict) {
  const Ended pass = sheet(folder_, asked("pass.json"));
  EXPECT_EQ(pass.status, 0) << pass.err;
  EXPECT_EQ(pass.out, "s.pdf\n");
  EXPECT_TRUE(folder_.read("s.pdf").starts_with("%PDF-1.6"));
  EXPECT_EQ(sheet(folder_, asked("fail.json")).status, 1);
}

TEST_F(SheetCommand, ASheetThatWaitsForItsDirectionIsNotAPass) {
  const Ended ended = sheet(folder_, {"run one.csv", "--limits", "pass.json", "--pdf", "s.pdf"});
  EXPECT_EQ(ended.status, 2) << ended.err;
  EXPECT_FALSE(noPdf());
}

TEST_F(SheetCommand, TheRunInsideThePdfIsTheFile) {
  ASSERT_EQ(sheet(folder_, asked("pass.json")).status, 0);
  ASSERT_EQ(folder_.shell("pdfdetach -saveall -o . s.pdf").status, 0);
  EXPECT_EQ(folder_.read("run_one.csv"), folder_.read("run one.csv"));
  const auto manifest = nlohmann::json::parse(folder_.read("manifest.json"));
  EXPECT_EQ(manifest["files"][2]["original_name"], "run one.csv");
  EXPECT_EQ(manifest["files"][2]["sha256"], sha256Hex(folder_.read("run one.csv")));
  const auto job = readJob(folder_.read("job.json"), "job.json");
  ASSERT_TRUE(job);
  EXPECT_EQ(job.value().items.at(0).phases.at(0).runs.at(0).file, "run one.csv");
}

TEST_F(SheetCommand, BadInputEndsWithThreeAndNoSheet) {
  folder_.write("empty.csv", "");
  for (const char* file : {"missing.csv", "empty.csv", "pass.json"}) {
    const Ended ended = sheet(folder_, {file, "--limits", "pass.json", "--pdf", "s.pdf"});
    EXPECT_EQ(ended.status, 3) << file;
    EXPECT_NE(ended.err.find(file), std::string::npos) << ended.err;
    EXPECT_TRUE(noPdf());
  }
  EXPECT_EQ(sheet(folder_, asked("missing.json")).status, 3);
}

TEST_F(SheetCommand, AnUnwritablePathEndsWithFourAndSaysWhy) {
  const Ended ended =
      sheet(folder_, {"run one.csv", "--limits", "pass.json", "--pdf", "no/such/folder/s.pdf"});
  EXPECT_EQ(ended.status, 4);
  EXPECT_NE(ended.err.find("sheet-not-written"), std::string::npos) << ended.err;
  EXPECT_EQ(ended.out, "");
}

TEST_F(SheetCommand, WrongUsageEndsWithSixtyFour) {
  EXPECT_EQ(sheet(folder_, {"run one.csv", "--pdf", "s.pdf"}).status, 64);
  EXPECT_EQ(sheet(folder_, {"--help"}).status, 0);
}

TEST_F(SheetCommand, WhoAsksForASheetIsKnownByTheFirstWord) {
  const char* sheetWords[] = {"dampwright", "sheet", "a.csv"};
  const char* windowWords[] = {"dampwright", "a.csv"};
  EXPECT_TRUE(asksForSheet(3, sheetWords));
  EXPECT_FALSE(asksForSheet(2, windowWords));
  EXPECT_FALSE(asksForSheet(1, windowWords));
}

}  // namespace
}  // namespace dampwright
