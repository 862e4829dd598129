// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_document.h"

#include <gtest/gtest.h>

#include <QImage>
#include <QRegularExpression>
#include <QSet>

#include "tests/ui/sheet/made_sheet.h"
#include "tests/ui/sheet/pdf_tools.h"
#include "ui/sheet/sheet_output.h"

namespace dampwright {
namespace {

using enum VerdictWord;

const std::vector<std::string> car = {"front left", "front right", "rear left", "rear right"};

class EachPaper : public testing::TestWithParam<PaperSize> {
 protected:
  QString pdfOf(const SheetContent& content) {
    const QString path = folder_.filePath(QStringLiteral("sheet.pdf"));
    EXPECT_TRUE(writeSheetPdf(path, SheetDocument(content, GetParam())));
    return path;
  }
  QTemporaryDir folder_;
};

void expectAll(const QString& text, const QStringList& items) {
  for (const QString& item : items) {
    EXPECT_TRUE(text.contains(plainText(item))) << item.toStdString();
  }
}

TEST_P(EachPaper, OneDamperTakesOnePageAndSaysEverything) {
  SheetContent content = made::sheet(made::job({"rear left"}), {Fail});
  content.workshop = {QStringLiteral("Quay Damper Works"), QStringLiteral("4 Quay Road")};
  content.job.notes = "Customer asks for a call.";
  const QString path = pdfOf(content);
  EXPECT_EQ(pdfFact(path, QStringLiteral("Pages")), QStringLiteral("1"));
  expectAll(pdfText(path),
            {"Damper test sheet",
             "Quay Damper Works",
             "4 Quay Road",
             "Job 2031-0041",
             "Page 1 of 1",
             "Saltmarsh Motor Club",
             "rally hatchback",
             "KX 31 DMP",
             "M. Thornbury",
             "14 March 2031",
             "Rally hatchback, street, revision C",
             "(workshop",
             "sheet 12)",
             "guarded",
             "Rear left · DA-1107",
             "part number PN-4711-B",
             "monotube",
             "As found",
             "FAIL",
             "1 of 8 checks fails",
             "Force–velocity",
             "Force–displacement"});
}

TEST_P(EachPaper, EachCheckStandsWithTargetLimitsUncertaintyKMarginAndVerdict) {
  const QString text = pdfText(pdfOf(made::sheet(made::job({"rear left"}), {Fail})));
  expectAll(text,
            {"Rebound at 300 mm/s",
             "532–668 N",
             "600.0 ± 9.0 N",
             "2.00",
             "+68.0 N",
             "100 N ± 8 %",
             "Compression at 300 mm/s",
             "−31.0 N",
             "Fail",
             "Gas force",
             "150.3 ± 3.2 N",
             "2.06",
             "Friction (half difference)",
             "≤ 45 N"});
}

TEST_P(EachPaper, ConditionsCautionsAndScopeAreThere) {
  const QString text = pdfText(pdfOf(made::sheet(made::job({"rear left"}), {Pass})));
  expectAll(text,
            {"50, 100, 200, 300, 600, 1000 mm/s",
             "stroke 50 mm",
             "sine",
             "30 cycles averaged",
             "6 left out for conditioning",
             "30 °C to 34 °C",
             "force zero with no damper on the rig",
             "gas force removed",
             "no filter",
             "bench 1",
             "calibrated 10 January 2031",
             "DA-1107 as found.csv",
             "no leak",
             "Cautions",
             "do not puncture",
             "never stand in line",
             "eye protection",
             "not a roadworthiness certificate",
             "local rules and licensed inspection",
             "relate only to the items tested, in the condition tested",
             "Authorised by",
             "Tested by",
             "Date",
             "End of sheet",
             "Dampwright " DAMPWRIGHT_VERSION});
  const std::string hash = made::job({"rear left"}).items[0].phases[0].runs[0].sha256;
  EXPECT_TRUE(text.contains(QString::fromStdString(hash.substr(0, 12))));
  EXPECT_FALSE(text.contains(QStringLiteral("Invented")));
}

TEST_P(EachPaper, ACarTakesTwoPagesWithTheSameHead) {
  SheetContent content = made::sheet(made::job(car), {Pass, Fail, TooCloseToCall, NotTested});
  content.job.invented = true;
  const QString path = pdfOf(content);
  EXPECT_EQ(pdfFact(path, QStringLiteral("Pages")), QStringLiteral("2"));
  for (int page = 1; page <= 2; ++page) {
    expectAll(pdfPageText(path, page),
              {"Job 2031-0041",
               QStringLiteral("Page %1 of 2").arg(page),
               "Invented demonstration data",
               "relate only to the items tested"});
  }
  expectAll(
      pdfText(path),
      {"Front left · DA-1107", "Rear right · DA-1110", "PASS", "FAIL", "TOO CLOSE", "NOT TESTED"});
  EXPECT_EQ(pdfText(path).count(QStringLiteral("End of sheet")), 1);
}

// Four dampers on four rigs, nine checks each, as a workshop has them on a busy day.
TEST_P(EachPaper, ACarOnUnlikeRigsTakesTwoPagesAndSaysEverything) {
  const SheetContent content = made::unlikeRigs(made::sheet(made::job(car), {Pass}));
  const QString path = pdfOf(content);
  EXPECT_EQ(pdfFact(path, QStringLiteral("Pages")), QStringLiteral("2"));
  expectAll(pdfPageText(path, 1), {"Front left · DA-1107", "Front right · DA-1108", "bench 1"});
  const QString rear = pdfPageText(path, 2);
  expectAll(rear,
            {"Rear left · DA-1109",
             "Rear right · DA-1110",
             "part number PN-4711-B",
             "Compression at 300 mm/s",
             "100 N ± 8 %",
             "600.0 ± 9.0 N",
             "150.3 ± 3.2 N",
             "2.06",
             "+68.0 N",
             "−31.0 N",
             "1 of 9 checks fails",
             "bench 3",
             "bench 4",
             "calibrated 10 January 2031",
             "DA-1109 as found.csv",
             "DA-1110 as found.csv",
             "no leak",
             "Authorised by",
             "Cautions"});
  for (const SheetItem& item : content.items) {
    const std::string hash = item.phases[0].measured->measurement.runs[0].source.file.sha256;
    EXPECT_TRUE(pdfText(path).contains(QString::fromStdString(hash.substr(0, 12))));
  }
}

TEST_P(EachPaper, ACoverageFactorOfAllChecksIsSaidOnce) {
  SheetContent content = made::unlikeRigs(made::sheet(made::job(car), {Pass}));
  for (SheetItem& item : content.items) {
    for (CheckVerdict& check : item.phases[0].verdict->checks) check.coverageFactor = 2.13;
  }
  const QString rear = pdfPageText(pdfOf(content), 2);
  EXPECT_EQ(rear.count(QStringLiteral("2.13")), 1);
  EXPECT_EQ(rear.count(QStringLiteral("Pass")), 17);  // there is room for the words then
  EXPECT_EQ(rear.count(QStringLiteral("Fail")), 1);
}

TEST_P(EachPaper, FiveSettingsOfOneDamperTakeThreePages) {
  SheetContent content = made::sheet(made::job({"rear"}), {Pass});
  content.items[0].phases[0].phase.setting = {{"rebound", 2}};
  for (const double clicks : {6, 10, 14, 18}) {
    content.items[0].phases.push_back(content.items[0].phases[0]);
    content.items[0].phases.back().phase.setting = {{"rebound", clicks}};
  }
  const QString path = pdfOf(content);
  EXPECT_EQ(pdfFact(path, QStringLiteral("Pages")), QStringLiteral("3"));
  expectAll(pdfText(path), {"rebound 2", "rebound 6", "rebound 10", "rebound 14", "rebound 18"});
}

TEST_P(EachPaper, ManyChecksRunOverToPagesWithTheSameHead) {
  SheetContent content = made::sheet(made::job({"rear left"}), {Pass});
  auto& checks = content.items[0].phases[0].verdict->checks;
  for (int speed = 1; speed <= 90; ++speed) {
    checks.push_back(made::forceCheck(Direction::Rebound, 0.001 * speed, 0, 900, Pass));
  }
  const QString path = pdfOf(content);
  const int pages = pdfFact(path, QStringLiteral("Pages")).toInt();
  EXPECT_GE(pages, 2);
  for (int page = 1; page <= pages; ++page) {
    expectAll(pdfPageText(path, page),
              {"Job 2031-0041", QStringLiteral("Page %1 of %2").arg(page).arg(pages)});
  }
  const QString text = pdfText(path);
  for (int speed = 1; speed <= 90; ++speed) {
    EXPECT_TRUE(text.contains(QStringLiteral("Rebound at %1 mm/s").arg(speed))) << speed;
  }
  EXPECT_TRUE(pdfPageText(path, 2).contains(QStringLiteral("Measured ± U")));
}

TEST_P(EachPaper, LongNamesAreWrappedOrElidedNeverOutsideThePage) {
  Job job = made::job({"rear left"});
  job.customer = std::string(40, 'C') + " " + std::string(300, 'c');
  job.vehicle =
      "a very long vehicle name that goes on and on and on and on and on and on to the end";
  job.number = std::string(80, '7');
  job.items[0].damper.serial = std::string(200, 'S');
  job.items[0].phases[0].runs[0].file = std::string(200, 'f') + ".csv";
  SheetContent content = made::sheet(job, {Pass});
  content.workshop = {QString(200, QLatin1Char('W')), QString(200, QLatin1Char('a'))};
  const SheetDocument document(content, GetParam());
  const QSizeF size = paperFormat(GetParam()).size;
  for (int page = 0; page < document.pageCount(); ++page) {
    QImage image((size * 3).toSize(), QImage::Format_RGB32);
    image.fill(Qt::white);
    QPainter painter(&image);
    painter.scale(3, 3);
    document.paintPage(painter, page);
    painter.end();
    // 6.4 mm at the edges stay white: printers can't reach them.
    for (int y = 0; y < image.height(); ++y) {
      for (int x : {0, 6, 12, 18, image.width() - 19, image.width() - 10, image.width() - 1}) {
        ASSERT_EQ(image.pixel(x, y), 0xFFFFFFFF) << x << "," << y << " on page " << page;
      }
    }
  }
  expectAll(pdfText(pdfOf(content)), {"on and on to the end"});
}

TEST_P(EachPaper, ASheetThatWaitsSaysSoAndGivesNoFinalVerdict) {
  SheetContent content = made::sheet(made::job({"rear left"}), {Pass});
  content.items[0].phases[0].verdict->waiting.push_back({"direction-assumed", {}});
  const QString text = pdfText(pdfOf(content));
  expectAll(text,
            {"WAITS FOR", "CONFIRMATION", "its verdict is not final", "Confirm the direction"});
  EXPECT_FALSE(text.contains(QStringLiteral("PASS")));
  EXPECT_EQ(text.count(QStringLiteral("waits")), 6 + 1);  // six checks by direction, one sentence
}

TEST_P(EachPaper, WhatWasReceivedAndNotTestedIsPrinted) {
  SheetContent content = made::sheet(made::job({"rear left"}), {Pass});
  SheetItem spare;
  spare.corner = "rear right";
  spare.damper.serial = "DA-2000";
  content.items.push_back(spare);
  expectAll(pdfText(pdfOf(content)),
            {"Rear right · DA-2000", "Received, not tested", "NOT TESTED"});
}

TEST_P(EachPaper, AsFoundAndAfterWorkStandUnderTheirNames) {
  Job job = made::job({"rear left"});
  SheetContent content = made::sheet(job, {Fail});
  content.items[0].phases.push_back(content.items[0].phases[0]);
  content.items[0].phases[1].phase.phase = Phase::AfterWork;
  content.items[0].phases[1].phase.setting = {{"rebound", 8}};
  content.items[0].phases[1].verdict = made::nineChecks(Pass);
  expectAll(pdfText(pdfOf(content)),
            {"As found · 1 of 8 checks fails", "After work, rebound 8 · All 8 checks pass"});
}

TEST_P(EachPaper, ARunThatCouldNotBeMeasuredSaysWhy) {
  SheetContent content = made::sheet(made::job({"rear left"}), {Pass});
  SheetPhase& phase = content.items[0].phases[0];
  phase.measured.reset();
  phase.verdict.reset();
  phase.problem = Error{"no-full-cycle", {}, {"run.csv", 0, 0}};
  expectAll(pdfText(pdfOf(content)), {"run.csv", "no full cycle", "NOT TESTED"});
}

TEST_P(EachPaper, ASheetWithoutLimitsIsMeasuredNotJudged) {
  SheetContent content = made::sheet(made::job({"rear left"}), {Pass});
  content.job.limits.reset();
  content.items[0].phases[0].verdict.reset();
  expectAll(pdfText(pdfOf(content)), {"measured, no limits chosen", "none chosen", "NOT TESTED"});
}

INSTANTIATE_TEST_SUITE_P(A4AndLetter, EachPaper, testing::Values(PaperSize::A4, PaperSize::Letter));

// Whole numbers are left aside: plots of another height have other ticks and speed labels.
TEST(SheetDocuments, BothPapersSayTheSame) {
  const SheetContent content = made::sheet(made::job({"rear left"}), {Fail});
  const QRegularExpression tick(QStringLiteral("^[−0-9]+$"));
  QTemporaryDir folder;
  QSet<QString> words[2];
  for (int i = 0; i < 2; ++i) {
    const QString path = folder.filePath(QString::number(i));
    ASSERT_TRUE(writeSheetPdf(path, SheetDocument(content, static_cast<PaperSize>(i))));
    // A line may end at a hyphen on one paper only.
    const QString text = pdfText(path).replace(QStringLiteral("- "), QStringLiteral("-"));
    for (const QString& word : text.split(QLatin1Char(' '))) {
      if (!tick.match(word).hasMatch()) words[i].insert(word);
    }
  }
  const auto missing = [](QSet<QString> from, const QSet<QString>& in) {
    return from.subtract(in).values().join(QLatin1Char(' ')).toStdString();
  };
  EXPECT_EQ(missing(words[0], words[1]), "");
  EXPECT_EQ(missing(words[1], words[0]), "");
}

}  // namespace
}  // namespace dampwright
