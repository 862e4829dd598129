// SPDX-License-Identifier: GPL-3.0-or-later
// The built program as a shell starts it.
#include <gtest/gtest.h>

#include <QFile>
#include <QImage>
#include <QProcess>
#include <QTemporaryDir>

namespace {

struct Outcome {
  int status = -1;
  QByteArray out, err;
};

Outcome run(const QStringList& arguments, bool withDisplay = false) {
  QProcess process;
  QProcessEnvironment environment = QProcessEnvironment::systemEnvironment();
  environment.remove("QT_QPA_PLATFORM");
  environment.remove("QT_SCALE_FACTOR");
  if (!withDisplay) {
    environment.remove("DISPLAY");
    environment.remove("WAYLAND_DISPLAY");
  }
  process.setProcessEnvironment(environment);
  process.start(DAMPWRIGHT_PROGRAM, arguments);
  process.waitForFinished(120'000);
  return {process.exitStatus() == QProcess::NormalExit ? process.exitCode() : -1,
          process.readAllStandardOutput(),
          process.readAllStandardError()};
}

TEST(Program, HelpAndVersionNeedNoDisplay) {
  const Outcome version = run({"--version"});
  EXPECT_EQ(version.status, 0);
  EXPECT_EQ(version.out, "dampwright " DAMPWRIGHT_VERSION "\n");
  const Outcome help = run({"--help"});
  EXPECT_EQ(help.status, 0);
  EXPECT_TRUE(help.out.contains("--demonstration"));
  EXPECT_TRUE(help.err.isEmpty()) << help.err.toStdString();
}

TEST(Program, WrongUsageIsStatus64) {
  const Outcome wrong = run({"--nonsense"});
  EXPECT_EQ(wrong.status, 64);
  EXPECT_TRUE(wrong.out.isEmpty());
  EXPECT_TRUE(wrong.err.contains("nonsense"));
}

TEST(Program, DrawsTheDemonstrationAndItsSheetWithoutADisplay) {
  QTemporaryDir folder;
  const QString png = folder.filePath("window.png"), pdf = folder.filePath("sheet.pdf");
  const Outcome done = run({"--demonstration",
                            "--book",
                            folder.filePath("book.sqlite"),
                            "--picture",
                            png,
                            "--sheet",
                            pdf});
  EXPECT_EQ(done.status, 0) << done.err.toStdString();
  EXPECT_EQ(QImage(png, "PNG").size(), QSize(1440, 900));
  QFile sheet(pdf);
  ASSERT_TRUE(sheet.open(QIODevice::ReadOnly));
  EXPECT_EQ(sheet.read(5), "%PDF-");
}

TEST(Program, APictureThatCannotBeWrittenIsStatus4) {
  QTemporaryDir folder;
  const Outcome done = run({"--book",
                            folder.filePath("book.sqlite"),
                            "--samples",
                            folder.path(),
                            "--picture",
                            folder.filePath("no/such/folder/a.png")});
  EXPECT_EQ(done.status, 4);
  EXPECT_TRUE(done.err.contains("cannot be written"));
}

}  // namespace
