// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/check_text.h"

#include <gtest/gtest.h>

#include <QLocale>

namespace dampwright {
namespace {

std::string plain(QString text) {
  return text.replace(QChar(0x00A0), QLatin1Char(' ')).toStdString();
}

Check forceCheck() {
  Check check;
  check.check = "force";
  check.direction = Direction::Rebound;
  check.velocity = 0.3;
  return check;
}

CheckVerdict judged(double y, double u, std::optional<double> min, std::optional<double> max) {
  CheckVerdict verdict;
  verdict.check = forceCheck();
  verdict.measured = y;
  verdict.expandedUncertainty = u;
  verdict.coverageFactor = 2.064;
  verdict.min = min;
  verdict.max = max;
  verdict.margin = std::min(y - min.value_or(-1e9), max.value_or(1e9) - y);
  verdict.verdict = VerdictWord::Pass;
  return verdict;
}

class CheckTexts : public testing::Test {
 protected:
  void SetUp() override { QLocale::setDefault(QLocale::c()); }
};

TEST_F(CheckTexts, TitlesSayWhatIsAsked) {
  Check check = forceCheck();
  EXPECT_EQ(plain(checkTitle(check)), "Rebound at 300 mm/s");
  check.reading = "largest";
  check.direction = Direction::Compression;
  check.velocity = 0.2618;
  check.stroke = 0.08;
  EXPECT_EQ(plain(checkTitle(check)), "Compression at 261.8 mm/s, largest, 80 mm stroke");
  check.check = "gas force";
  EXPECT_EQ(plain(checkTitle(check)), "Gas force");
  check.check = "friction";
  EXPECT_EQ(plain(checkTitle(check)), "Friction (half difference)");
  check.basis = "dry";
  EXPECT_EQ(plain(checkTitle(check)), "Friction (dry)");
}

TEST_F(CheckTexts, AJudgedCheckReadsWithLimitsMarginAndCoverage) {
  const CheckText text = checkText(judged(964.04, 9.13, 870, 1120));
  EXPECT_EQ(plain(text.limits), "870–1120 N");
  EXPECT_EQ(plain(text.measured), "964.0 ± 9.1 N");
  EXPECT_EQ(plain(text.uncertainty), "U = 9.1 N, k = 2.06");
  EXPECT_EQ(plain(text.margin), "+94.0 N");
  EXPECT_EQ(plain(text.verdict), "Pass");
}

TEST_F(CheckTexts, ATargetReadsWithItsTolerance) {
  Check check = forceCheck();
  check.target = 1150;
  check.tolerancePercent = 10;
  EXPECT_EQ(plain(targetText(check, Quantity::Force)), "1150 N ± 10 %");
  check.toleranceAbsolute = 20;
  EXPECT_EQ(plain(targetText(check, Quantity::Force)), "1150 N ± 10 % ± 20 N");
}

TEST_F(CheckTexts, WhatWasNotTestedHasNoFigures) {
  CheckVerdict verdict = judged(0, 0, 870, 1120);
  verdict.measured.reset();
  verdict.margin.reset();
  verdict.verdict = VerdictWord::NotTested;
  const CheckText text = checkText(verdict);
  EXPECT_EQ(plain(text.measured), "not tested");
  EXPECT_EQ(plain(text.margin), "");
  EXPECT_EQ(plain(text.limits), "870–1120 N");
}

// Just outside by less than the printed digit: more digits, or the reader sees "45 of ≤ 45: fail".
TEST_F(CheckTexts, NobodyReadsAFigureOnTheOtherSideOfItsLimit) {
  EXPECT_EQ(plain(checkText(judged(45.002, 0, {}, 45)).measured), "45.002 N");
  EXPECT_EQ(plain(checkText(judged(45.02, 12, {}, 45)).measured), "45.02 ± 12.00 N");
}

TEST_F(CheckTexts, PrintedFiguresGiveTheSameVerdictAsTheUnrounded) {
  // 1129.06 − 9.04 > 1120 fails; so do the rounded 1129.1 − 9.0
  EXPECT_EQ(plain(checkText(judged(1129.06, 9.04, 870, 1120)).measured), "1129.1 ± 9.0 N");
  // 1129.14 − 9.16 < 1120 does not; nor do the rounded 1129.1 − 9.2
  EXPECT_EQ(plain(checkText(judged(1129.14, 9.16, 870, 1120)).measured), "1129.1 ± 9.2 N");
  // 1129.149 − 9.148 > 1120 fails, but 1129.1 − 9.1 = 1120.0 would not: two more digits
  EXPECT_EQ(plain(checkText(judged(1129.149, 9.148, 870, 1120)).measured), "1129.149 ± 9.148 N");
}

TEST_F(CheckTexts, TheSummaryCountsTheWorstKind) {
  Verdict verdict;
  EXPECT_EQ(plain(verdictSummary(verdict)), "No check was asked for");
  for (int i = 0; i < 9; ++i) verdict.checks.push_back(judged(964, 9, 870, 1120));
  EXPECT_EQ(plain(verdictSummary(verdict)), "All 9 checks pass");
  verdict.checks[2].verdict = VerdictWord::NotTested;
  EXPECT_EQ(plain(verdictSummary(verdict)), "1 of 9 checks was not tested");
  verdict.checks[3].verdict = VerdictWord::TooCloseToCall;
  EXPECT_EQ(plain(verdictSummary(verdict)), "1 of 9 checks is too close to call");
  verdict.checks[4].verdict = VerdictWord::Fail;
  verdict.checks[5].verdict = VerdictWord::Fail;
  EXPECT_EQ(plain(verdictSummary(verdict)), "2 of 9 checks fail");
}

}  // namespace
}  // namespace dampwright
