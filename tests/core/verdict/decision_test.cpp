// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/verdict/decision.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>

#include "core/words/words.h"

namespace dampwright {
namespace {

constexpr double infinity = std::numeric_limits<double>::infinity();
constexpr LimitRange published{1020, 1380};  // N

Decision guarded(double value, double expanded, const LimitRange& range) {
  return decide({value, expanded, Quantity::Force}, range, DecisionRule::Guarded);
}

VerdictWord word(double value, double expanded, const LimitRange& range) {
  return guarded(value, expanded, range).word;
}

// The probability that the true value conforms, JCGM 106:2012 sec. 7: Φ((TU − y)/u) − Φ((TL −
// y)/u).
double conformance(double value, double u, const LimitRange& range) {
  const auto phi = [](double z) { return 0.5 * std::erfc(-z / std::sqrt(2.0)); };
  return phi((range.max.value_or(infinity) - value) / u) -
         phi((range.min.value_or(-infinity) - value) / u);
}

// JCGM 106:2012 sec. 7, one-sided, u = 20 N: y 1340 → 0.977250, 1360 → 0.841345, 1380 → 0.5,
// 1395 → 0.226627 (values printed to six digits). The rule must pass only what conforms with
// 97.7 % or more, and fail only what conforms with 2.3 % or less.
TEST(Decision, TheThreeStatesStandWhereTheConformanceProbabilitySaysSo) {
  struct Row {
    double value, probability;
    VerdictWord word;
  };
  constexpr double u = 20;
  for (const Row& row : {Row{1340, 0.977250, VerdictWord::Pass},
                         Row{1360, 0.841345, VerdictWord::TooCloseToCall},
                         Row{1380, 0.5, VerdictWord::TooCloseToCall},
                         Row{1395, 0.226627, VerdictWord::TooCloseToCall}}) {
    EXPECT_NEAR(conformance(row.value, u, published), row.probability, 5e-7) << row.value;
    EXPECT_EQ(word(row.value, 2 * u, published), row.word) << row.value;
  }
}

TEST(Decision, NothingPassesOrFailsAgainstTheOddsOfItsOwnUncertainty) {
  constexpr double u = 20;
  const double atGuardBand = 0.5 * std::erfc(2 / std::sqrt(2.0));  // 2.275 %, JCGM 106 sec. 8.3
  for (double value = 900; value <= 1500; value += 0.5) {
    const double probability = conformance(value, u, published);
    const VerdictWord found = word(value, 2 * u, published);
    // far limits 18 u away: the other tail is nothing
    if (found == VerdictWord::Pass) {
      EXPECT_GE(probability, 1 - atGuardBand - 1e-12) << value;
    }
    if (found == VerdictWord::Fail) {
      EXPECT_LE(probability, atGuardBand + 1e-12) << value;
    }
    if (found == VerdictWord::TooCloseToCall) {
      EXPECT_LT(probability, 1 - atGuardBand) << value;
      EXPECT_GE(probability, atGuardBand - 1e-12) << value;
    }
  }
}

TEST(Decision, TheEdgesBelongToTheBetterSide) {
  EXPECT_EQ(word(1060, 40, published), VerdictWord::Pass);
  EXPECT_EQ(word(std::nextafter(1060, 0), 40, published), VerdictWord::TooCloseToCall);
  EXPECT_EQ(word(1340, 40, published), VerdictWord::Pass);
  EXPECT_EQ(word(std::nextafter(1340, 2000), 40, published), VerdictWord::TooCloseToCall);
  EXPECT_EQ(word(980, 40, published), VerdictWord::TooCloseToCall);
  EXPECT_EQ(word(std::nextafter(980, 0), 40, published), VerdictWord::Fail);
  EXPECT_EQ(word(1420, 40, published), VerdictWord::TooCloseToCall);
  EXPECT_EQ(word(std::nextafter(1420, 2000), 40, published), VerdictWord::Fail);
}

TEST(Decision, OneLimitIsJudgedAlone) {
  EXPECT_EQ(word(1e6, 40, {1020, {}}), VerdictWord::Pass);
  EXPECT_EQ(word(1060, 40, {1020, {}}), VerdictWord::Pass);
  EXPECT_EQ(word(1000, 40, {1020, {}}), VerdictWord::TooCloseToCall);
  EXPECT_EQ(word(970, 40, {1020, {}}), VerdictWord::Fail);
  EXPECT_EQ(word(-1e6, 40, {{}, 60}), VerdictWord::Pass);
  EXPECT_EQ(word(20, 40, {{}, 60}), VerdictWord::Pass);
  EXPECT_EQ(word(21, 40, {{}, 60}), VerdictWord::TooCloseToCall);
  EXPECT_EQ(word(101, 40, {{}, 60}), VerdictWord::Fail);
  EXPECT_EQ(guarded(50, 4, {{}, 60}).margin, 10);
  EXPECT_EQ(guarded(50, 4, {60, {}}).margin, -10);
}

TEST(Decision, LimitsNarrowerThanTheUncertaintyCanNeverBePassedButFailed) {
  const LimitRange narrow{100, 110};  // 2U = 12
  for (double value = 94; value <= 116; value += 0.25) {
    const Decision decision = guarded(value, 6, narrow);
    EXPECT_EQ(decision.word, VerdictWord::TooCloseToCall) << value;
    EXPECT_EQ(decision.reason.code, "limits-narrower-than-uncertainty") << value;
  }
  EXPECT_EQ(word(93.9, 6, narrow), VerdictWord::Fail);
  EXPECT_EQ(word(116.1, 6, narrow), VerdictWord::Fail);
  // exactly 2U wide: the middle passes, and the reason of the rest is another
  EXPECT_EQ(word(105, 5, narrow), VerdictWord::Pass);
  EXPECT_EQ(guarded(106, 5, narrow).reason.code, "close-inside-limit");
}

TEST(Decision, NegativeForcesAreJudgedAsTheyAre) {
  const LimitRange slow{-120, -80};  // rebound at a slow speed with much gas
  EXPECT_EQ(word(-100, 15, slow), VerdictWord::Pass);
  EXPECT_EQ(word(-75, 15, slow), VerdictWord::TooCloseToCall);
  EXPECT_EQ(word(100, 15, slow), VerdictWord::Fail);
  EXPECT_EQ(guarded(-110, 15, slow).margin, 10);
}

TEST(Decision, TheSimpleRuleDoesNotCountTheUncertainty) {
  const auto simple = [](double value) {
    return decide({value, 40, Quantity::Force}, published, DecisionRule::Simple);
  };
  EXPECT_EQ(simple(1020).word, VerdictWord::Pass);
  EXPECT_EQ(simple(1380).word, VerdictWord::Pass);
  EXPECT_EQ(simple(std::nextafter(1020, 0)).word, VerdictWord::Fail);
  EXPECT_EQ(simple(std::nextafter(1380, 2000)).word, VerdictWord::Fail);
  EXPECT_EQ(simple(1400).margin, -20);
  EXPECT_EQ(simple(1400).reason.code, "outside-limits");
}

TEST(Decision, WithoutAnyLimitNothingWasTested) {
  EXPECT_EQ(word(5, 1, {}), VerdictWord::NotTested);
  EXPECT_EQ(guarded(5, 1, {}).margin, std::nullopt);
}

TEST(Decision, MarginIsTheDistanceToTheNearerLimitWithoutTheUncertainty) {
  EXPECT_EQ(guarded(1100, 40, published).margin, 80);
  EXPECT_EQ(guarded(1350, 40, published).margin, 30);
  EXPECT_EQ(guarded(1395, 40, published).margin, -15);
  EXPECT_EQ(guarded(1000, 40, published).margin, -20);
}

TEST(Decision, AReasonNeverComparesTwoFiguresThatPrintAlike) {
  const Decision decision = guarded(1420.0004, 40, published);
  EXPECT_EQ(decision.word, VerdictWord::Fail);
  const std::string text = englishText(decision.reason.code, decision.reason.values);
  EXPECT_NE(text.find("0.0004 N more than its uncertainty"), std::string::npos) << text;
}

TEST(Decision, ADistanceIsGivenInThreeDigitsAndTheLimitInAll) {
  const Decision decision = guarded(1112.3456, 10.98765, {1129.5, {}});
  EXPECT_EQ(
      englishText(decision.reason.code, decision.reason.values),
      "The figure lies 17.2 N outside the limit of 1129.5 N: 6.17 N more than its uncertainty "
      "of 11 N explains.");
}

TEST(Decision, ATargetHasPercentAndNewtonsAdded) {
  Check check;
  check.target = 1150;
  check.tolerancePercent = 10;
  check.toleranceAbsolute = 5;
  EXPECT_DOUBLE_EQ(*rangeOf(check).min, 1150 - 115 - 5);
  EXPECT_DOUBLE_EQ(*rangeOf(check).max, 1150 + 115 + 5);
  check.target = -100;
  EXPECT_DOUBLE_EQ(*rangeOf(check).min, -115);
  EXPECT_DOUBLE_EQ(*rangeOf(check).max, -85);
}

// Two-sided 95 % of Student's t: 2.776 at 4, 2.086 at 20 degrees of freedom (JCGM 100:2008 table
// G.2, three digits), 1.960 for the normal law.
TEST(Decision, CoverageIsTheLargerOfTheSheetsFactorAndStudentsT) {
  EXPECT_NEAR(coverageOf(2, 4), 2.776, 5e-3);
  EXPECT_NEAR(coverageOf(2, 20), 2.086, 5e-3);
  EXPECT_EQ(coverageOf(2, infinity), 2);
  EXPECT_EQ(coverageOf(3, 20), 3);
}

TEST(Decision, TheWholeIsTheWorstOfItsChecks) {
  const auto whole = [](std::initializer_list<VerdictWord> words) {
    std::vector<CheckVerdict> checks;
    for (const VerdictWord one : words) checks.emplace_back().verdict = one;
    return overall(checks);
  };
  using enum VerdictWord;
  EXPECT_EQ(whole({Pass, NotTested, TooCloseToCall, Fail}), Fail);
  EXPECT_EQ(whole({Pass, NotTested, TooCloseToCall}), TooCloseToCall);
  EXPECT_EQ(whole({Pass, NotTested}), NotTested);
  EXPECT_EQ(whole({Pass, Pass}), Pass);
  EXPECT_EQ(whole({}), NotTested);
}

}  // namespace
}  // namespace dampwright
