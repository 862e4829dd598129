// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/plots/run_figure.h"

#include <gtest/gtest.h>

#include "tests/ui/made_measured.h"

namespace dampwright {
namespace {

TEST(RunFigure, BlocksAreShadedAndNamedBySpeed) {
  const RunFigure figure = runFigure(made::measured({0.1, 0.3}));
  ASSERT_EQ(figure.shades.size(), 2u);
  EXPECT_EQ(figure.shades[0].label, QStringLiteral("100"));
  EXPECT_EQ(figure.shades[1].label, QStringLiteral("300"));
  EXPECT_EQ(figure.cycles.size(), 2u * made::cyclesEach);
}

TEST(RunFigure, AnInstantGoesThereAndBack) {
  const RunFigure figure = runFigure(made::measured({0.1, 0.3}));
  for (double time = 0.05; time < figure.end(); time += 0.1) {
    const auto instant = instantAt(figure, time);
    if (!instant) continue;
    const auto back = timeOf(figure, *instant);
    ASSERT_TRUE(back);
    EXPECT_NEAR(*back, time, 1e-9);
  }
}

TEST(RunFigure, AnInstantOfALoopStandsInAUsedCycle) {
  const RunFigure figure = runFigure(made::measured({0.1, 0.3}));
  const auto time = timeOf(figure, Instant{1, 0.25, std::nullopt});
  ASSERT_TRUE(time);
  const auto cycle = cycleAt(figure, *time);
  ASSERT_TRUE(cycle);
  EXPECT_EQ(figure.cycles[*cycle].block, 1u);
  EXPECT_TRUE(figure.cycles[*cycle].used());
}

TEST(RunFigure, SeveralFilesStandOneBehindTheOther) {
  auto measured = made::measured({0.1});
  const auto second = made::measured({0.3});
  measured->motions.push_back(second->motions.front());
  measured->measurement.runs.emplace_back();
  measured->measurement.blocks.push_back(second->measurement.blocks.front());
  measured->measurement.blocks.back().run = 1;
  const RunFigure figure = runFigure(measured);
  ASSERT_EQ(figure.stretches.size(), 2u);
  EXPECT_GT(figure.stretches[1].from, figure.stretches[0].to);
  EXPECT_GE(figure.shades[1].from, figure.stretches[1].from);
  // What is struck out is named on the clock of its own file.
  EXPECT_EQ(figure.cycles.back().run, 1u);
  EXPECT_LT(figure.cycles.back().span.end, figure.stretches[0].to);
}

TEST(RunFigure, PuttingBackNamesTheSpanThatWasStruckOut) {
  auto measured = made::measured({0.1});
  Cycle& cycle = measured->measurement.blocks[0].block.cycles[2];
  cycle.struckOut = true;
  const TimeSpan struck{cycle.start - 0.01, cycle.end + 0.01};
  measured->measurement.runs[0].struckOut.push_back(struck);
  const RunFigure figure = runFigure(measured);
  EXPECT_EQ(struckSpan(figure, figure.cycles[2]), struck);
  EXPECT_EQ(struckSpan(figure, figure.cycles[3]), figure.cycles[3].span);
}

TEST(RunFigure, TheSummaryCountsWhatIsLeftOut) {
  auto measured = made::measured({0.1, 0.3});
  measured->measurement.blocks[0].block.cycles[2].struckOut = true;
  const QString text = runSummary(runFigure(measured));
  EXPECT_EQ(text,
            QString::fromUtf8("2 speed blocks · 9 cycles used · 2 conditioning left out · "
                              "1 struck out"));
}

TEST(RunFigure, NothingIsEmpty) {
  const RunFigure figure = runFigure(nullptr);
  EXPECT_TRUE(figure.empty());
  EXPECT_FALSE(instantAt(figure, 0.5));
}

}  // namespace
}  // namespace dampwright
