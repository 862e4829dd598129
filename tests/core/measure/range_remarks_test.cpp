// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/measure/range_remarks.h"

#include <gtest/gtest.h>

#include <cmath>
#include <optional>
#include <string_view>

#include "core/base/units.h"
#include "core/measure/measure_runs.h"

namespace dampwright {
namespace {

// Ten seconds of x = amplitude · sin(2π·2t) at 1 kHz with F = 1000 N · cos(2π·2t).
Trace sine(double amplitude) {
  Trace trace;
  trace.source.firstDataRow = 3;
  for (int i = 0; i < 10000; ++i) {
    const double phase = 4 * pi * i / 1000;
    trace.time.push_back(i / 1000.0);
    trace.displacement.push_back(amplitude * std::sin(phase));
    trace.force.push_back(1000 * std::cos(phase));
  }
  return trace;
}

std::optional<Remark> remarkOf(const Trace& trace,
                               const MeasureOptions& options,
                               std::string_view code) {
  const Trace traces[] = {trace};
  const auto measured = measureRuns(traces, options, {});
  if (!measured) return Remark{"no-measurement", Severity::Warning, {}};
  for (const Remark& remark : measured.value().measurement.runs[0].remarks) {
    if (remark.code == code) return remark;
  }
  return std::nullopt;
}

DamperCard cardWith(double travel) {
  DamperCard card;
  card.openLength = 0.5;
  card.closedLength = 0.5 - travel;
  return card;
}

TEST(RangeRemarks, AStrokeBeyondTheDampersOwnIsSaid) {
  MeasureOptions options;
  options.card = cardWith(0.045);
  const auto remark = remarkOf(sine(0.025), options, "stroke-beyond-damper");
  ASSERT_TRUE(remark.has_value());
  EXPECT_NEAR(std::get<double>(remark->values[0].value), 0.050, 1e-6);
  EXPECT_NEAR(std::get<double>(remark->values[1].value), 0.045, 1e-12);
  options.card = cardWith(0.05);
  EXPECT_EQ(remarkOf(sine(0.025), options, "stroke-beyond-damper"), std::nullopt);
  options.card = DamperCard{};  // lengths unknown
  EXPECT_EQ(remarkOf(sine(0.025), options, "stroke-beyond-damper"), std::nullopt);
}

TEST(RangeRemarks, AForceBeyondTheCellIsCountedWithItsFirstRow) {
  MeasureOptions options;
  options.rig.loadCell.capacity = 999;
  const auto remark = remarkOf(sine(0.025), options, "force-beyond-cell");
  ASSERT_TRUE(remark.has_value());
  EXPECT_EQ(remark->firstRow, 3);
  // |cos| > 0.999 within acos(0.999)/π of the time: 2.847 %, 40 half cycles of 7 or 8 rows.
  EXPECT_NEAR(static_cast<double>(remark->count), 284.7, 40);
  options.rig.loadCell.capacity = 1000;
  EXPECT_EQ(remarkOf(sine(0.025), options, "force-beyond-cell"), std::nullopt);
}

TEST(RangeRemarks, MetresTakenForMillimetresAreImplausible) {
  EXPECT_NE(remarkOf(sine(25), {}, "motion-implausible"), std::nullopt);
  EXPECT_EQ(remarkOf(sine(0.025), {}, "motion-implausible"), std::nullopt);
}

TEST(RangeRemarks, ABlockThatGivesEnergyIsSaid) {
  Trace trace = sine(0.025);
  for (int i = 0; i < 5000; ++i) {  // another block, of half the stroke, whose force drives
    const double phase = 4 * pi * i / 1000;
    trace.time.push_back(10 + i / 1000.0);
    trace.displacement.push_back(0.0125 * std::sin(phase));
    trace.force.push_back(-300 * std::cos(phase));
  }
  const auto remark = remarkOf(trace, {}, "block-absorbs-no-energy");
  ASSERT_TRUE(remark.has_value());
  EXPECT_EQ(remark->count, 1);
  EXPECT_EQ(remarkOf(sine(0.025), {}, "block-absorbs-no-energy"), std::nullopt);
}

}  // namespace
}  // namespace dampwright
