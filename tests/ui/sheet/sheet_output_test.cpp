// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_output.h"

#include <gtest/gtest.h>

#include <sys/resource.h>
#include <sys/stat.h>

#include <QPrinter>
#include <QRegularExpression>
#include <csignal>
#include <nlohmann/json.hpp>

#include "core/base/sha256.h"
#include "tests/ui/sheet/made_sheet.h"
#include "tests/ui/sheet/pdf_tools.h"
#include "ui/sheet/attachments.h"
#include "ui/text/sentences.h"

namespace dampwright {
namespace {

SheetDocument document(PaperSize paper = PaperSize::A4) {
  return {made::sheet(made::job({"front left", "front right"}), {VerdictWord::Pass}), paper};
}

TEST(SheetPdf, IsOfTheChosenPaper) {
  QTemporaryDir folder;
  const QString path = folder.filePath(QStringLiteral("sheet.pdf"));
  ASSERT_TRUE(writeSheetPdf(path, document(PaperSize::A4)));
  EXPECT_TRUE(pdfFact(path, QStringLiteral("Page size")).contains(QStringLiteral("A4")));
  ASSERT_TRUE(writeSheetPdf(path, document(PaperSize::Letter)));
  EXPECT_TRUE(pdfFact(path, QStringLiteral("Page size")).contains(QStringLiteral("612 x 792")));
  EXPECT_EQ(pdfFact(path, QStringLiteral("Title")),
            QStringLiteral("Damper test sheet, job 2031-0041"));
}

TEST(SheetPdf, EveryFontIsEmbeddedAndOfOneFamily) {
  QTemporaryDir folder;
  const QString path = folder.filePath(QStringLiteral("sheet.pdf"));
  ASSERT_TRUE(writeSheetPdf(path, document()));
  const QStringList lines =
      outputOf(QStringLiteral("pdffonts"), {path}).trimmed().split(QLatin1Char('\n'));
  ASSERT_GE(lines.size(), 3);
  for (const QString& line : lines.mid(2)) {
    EXPECT_TRUE(line.contains(QStringLiteral("DejaVuSans"))) << line.toStdString();
    // the columns emb, sub and uni: embedded, and searchable through a map to Unicode
    EXPECT_TRUE(line.contains(QRegularExpression(QStringLiteral("yes (yes|no ) yes"))))
        << line.toStdString();
  }
}

TEST(SheetPdf, ADetachedFileIsTheInputByteForByteAndTheManifestIsRight) {
  QTemporaryDir folder;
  const QString path = folder.filePath(QStringLiteral("sheet.pdf"));
  const SheetDocument sheet = document();
  ASSERT_TRUE(writeSheetPdf(path, sheet));
  ASSERT_TRUE(QDir(folder.path()).mkdir(QStringLiteral("out")));
  const QString out = folder.filePath(QStringLiteral("out"));
  outputOf(QStringLiteral("pdfdetach"),
           {QStringLiteral("-saveall"), QStringLiteral("-o"), out, path});
  const auto manifest =
      nlohmann::json::parse(bytesOfFile(out + QStringLiteral("/manifest.json")).toStdString());
  ASSERT_EQ(manifest["files"].size(), sheet.content().attachments.size());
  EXPECT_EQ(QDir(out).entryList(QDir::Files).size(),
            static_cast<qsizetype>(sheet.content().attachments.size() + 1));
  for (std::size_t i = 0; i < sheet.content().attachments.size(); ++i) {
    const SheetAttachment& input = sheet.content().attachments[i];
    const auto& row = manifest["files"][i];
    const QByteArray found =
        bytesOfFile(out + QLatin1Char('/') + QString::fromStdString(row["name"]));
    EXPECT_EQ(found, input.bytes);
    EXPECT_EQ(row["sha256"], sha256Hex(found.toStdString()));
    EXPECT_EQ(row["bytes"], found.size());
    EXPECT_EQ(row["kind"], input.kind.toStdString());
    EXPECT_EQ(row["original_name"], input.name.toStdString());
  }
}

TEST(SheetPdf, APathThatCannotBeWrittenIsAClearErrorAndLeavesNothing) {
  QTemporaryDir folder;
  for (const char* name : {"/no/such/folder/sheet.pdf", "/proc/sheet.pdf", ""}) {
    const auto written = writeSheetPdf(QString::fromUtf8(name), document());
    ASSERT_FALSE(written) << name;
    EXPECT_EQ(written.error().code, "sheet-not-written");
    const QString sentence = sentenceText(written.error());
    EXPECT_TRUE(sentence.contains(QString::fromUtf8(name))) << sentence.toStdString();
    EXPECT_FALSE(sentence.contains(QChar(0x2026))) << sentence.toStdString();
  }
  ASSERT_FALSE(writeSheetPdf(folder.path(), document()));  // a folder
  EXPECT_TRUE(QDir(folder.path()).isEmpty());
}

TEST(SheetPdf, APipeOrDeviceIsNotReplaced) {
  QTemporaryDir folder;
  const QByteArray pipe = QFile::encodeName(folder.filePath(QStringLiteral("pipe")));
  ASSERT_EQ(mkfifo(pipe.constData(), 0600), 0);
  EXPECT_FALSE(writeSheetPdf(QFile::decodeName(pipe), document()));
  struct stat status {};
  ASSERT_EQ(stat(pipe.constData(), &status), 0);
  EXPECT_TRUE(S_ISFIFO(status.st_mode));
}

// As on a full disk: writing fails in the middle.
TEST(SheetPdf, AWriteThatFailsMidwayLeavesTheOldSheetWhole) {
  QTemporaryDir folder;
  const QString path = folder.filePath(QStringLiteral("sheet.pdf"));
  ASSERT_TRUE(writeSheetPdf(path, document()));
  const QByteArray before = bytesOfFile(path);
  std::signal(SIGXFSZ, SIG_IGN);
  rlimit usual{};
  getrlimit(RLIMIT_FSIZE, &usual);
  const rlimit small{20000, usual.rlim_max};
  setrlimit(RLIMIT_FSIZE, &small);
  const auto written = writeSheetPdf(path, document());
  setrlimit(RLIMIT_FSIZE, &usual);
  EXPECT_FALSE(written);
  EXPECT_EQ(bytesOfFile(path), before);
  EXPECT_EQ(QDir(folder.path()).entryList(QDir::Files | QDir::Hidden).size(), 1);
}

TEST(SheetPdf, AnOldSheetIsReplacedWhole) {
  QTemporaryDir folder;
  const QString path = folder.filePath(QStringLiteral("sheet.pdf"));
  QFile old(path);
  ASSERT_TRUE(old.open(QIODevice::WriteOnly));
  old.write("old");
  old.close();
  ASSERT_TRUE(writeSheetPdf(path, document()));
  EXPECT_TRUE(bytesOfFile(path).startsWith("%PDF-1.6"));
  EXPECT_EQ(QDir(folder.path()).entryList(QDir::Files).size(), 1);
}

TEST(SheetPrinting, WithoutAPrinterItStillPrintsToAFile) {
  QTemporaryDir folder;
  QPrinter printer(QPrinter::HighResolution);
  printer.setOutputFormat(QPrinter::PdfFormat);
  printer.setOutputFileName(folder.filePath(QStringLiteral("printed.pdf")));
  ASSERT_TRUE(printSheet(printer, document(PaperSize::Letter)));
  const QString path = folder.filePath(QStringLiteral("printed.pdf"));
  EXPECT_TRUE(pdfFact(path, QStringLiteral("Page size")).contains(QStringLiteral("612 x 792")));
  EXPECT_EQ(pdfFact(path, QStringLiteral("Pages")),
            QString::number(document(PaperSize::Letter).pageCount()));
  EXPECT_TRUE(pdfText(path).contains(QStringLiteral("End of sheet")));
}

TEST(SheetNames, TheSuggestedNameFitsAFileSystem) {
  Job job;
  job.number = "20/31";
  job.customer = "A \"B\" <C>";
  EXPECT_EQ(suggestedFileName(job).toStdString(), "Sheet 20_31, A _B_ _C_.pdf");
  EXPECT_EQ(suggestedFileName({}).toStdString(), "Sheet.pdf");
}

}  // namespace
}  // namespace dampwright
