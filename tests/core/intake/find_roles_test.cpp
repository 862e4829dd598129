// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/find_roles.h"

#include <gmock/gmock.h>

#include <cmath>
#include <random>

#include "core/base/units.h"

namespace dampwright {
namespace {

using testing::ElementsAre;

// Made channels, 1000 rows at 200 Hz, 2 Hz: a digressive force with noise.
struct Channels {
  std::vector<double> time, displacement, velocity, force;

  Channels() {
    std::mt19937 random(11);
    std::normal_distribution<double> noise(0, 2);
    for (int i = 0; i < 1000; ++i) {
      const double t = i / 200.0, phase = 4 * pi * t;
      time.push_back(t);
      displacement.push_back(25 * std::sin(phase));
      velocity.push_back(25 * 4 * pi * std::cos(phase));
      force.push_back(900 * std::tanh(2 * std::cos(phase)) + noise(random));
    }
  }
};

ColumnFacts column(std::string_view heading, const std::vector<double>& values) {
  return {splitNameAndUnit(heading), values};
}

const Channels made;

Roles rolesOf(const std::vector<ColumnFacts>& columns,
              const ReadOptions& options = {},
              const std::optional<RigProfile>& rig = {}) {
  return findRoles(columns, options, rig).value();
}

TEST(FindRoles, ByName) {
  const Roles roles = rolesOf({column("Load", made.force),
                               column("Speed", made.velocity),
                               column("Travel", made.displacement),
                               column("Time", made.time)});
  EXPECT_EQ(roles.force.column, 0u);
  EXPECT_EQ(roles.velocity.column, 1u);
  EXPECT_EQ(roles.displacement.column, 2u);
  EXPECT_EQ(roles.time.column, 3u);
  EXPECT_EQ(roles.force.why, "role-by-name");
  EXPECT_TRUE(roles.open.empty());
}

TEST(FindRoles, ByUnitWhereTheNameSaysNothing) {
  const Roles roles = rolesOf({column("Ch 1 [s]", made.time),
                               column("Ch 2 [mm]", made.displacement),
                               column("Ch 3 [kN]", made.force)});
  EXPECT_EQ(roles.displacement.column, 1u);
  EXPECT_EQ(roles.force.column, 2u);
  EXPECT_EQ(roles.force.why, "role-by-unit");
}

TEST(FindRoles, AUnitOfAnotherQuantityDiscreditsAName) {
  const Roles roles =
      rolesOf({column("x (mm)", made.displacement), column("Compression (N)", made.force)});
  EXPECT_EQ(roles.displacement.column, 0u);
  EXPECT_EQ(roles.force.column, 1u);
}

TEST(FindRoles, ByShapeWithoutAnyNames) {
  const Roles roles = rolesOf({column("", made.force),
                               column("", made.velocity),
                               column("", made.displacement),
                               column("", made.time)});
  EXPECT_EQ(roles.time.column, 3u);
  EXPECT_EQ(roles.displacement.column, 2u);
  EXPECT_EQ(roles.velocity.column, 1u);
  EXPECT_EQ(roles.force.column, 0u);
  EXPECT_EQ(roles.force.why, "role-by-shape");
}

TEST(FindRoles, TheSmootherOfTwoIsDisplacementHoweverTheForceIsTurned) {
  std::vector<double> turned = made.force;
  for (double& force : turned) force = -force;
  for (const auto& force : {made.force, turned}) {
    const Roles roles =
        rolesOf({column("", made.time), column("", force), column("", made.displacement)});
    EXPECT_EQ(roles.displacement.column, 2u);
    EXPECT_EQ(roles.force.column, 1u);
  }
}

TEST(FindRoles, MeasuredBeatsCommanded) {
  const Roles roles = rolesOf({column("Position command (mm)", made.velocity),
                               column("Position (mm)", made.displacement),
                               column("Force (N)", made.force)});
  EXPECT_EQ(roles.displacement.column, 1u);
}

TEST(FindRoles, ADeadChannelIsNoRival) {
  const std::vector<double> dead(1000, 0.0);
  const Roles roles = rolesOf({column("Force A (N)", dead),
                               column("Force B (N)", made.force),
                               column("Travel (mm)", made.displacement)});
  EXPECT_EQ(roles.force.column, 1u);
}

TEST(FindRoles, OptionsBeatNamesByNameOrNumber) {
  ReadOptions options;
  options.force = "travel (mm)";
  options.displacement = "1";
  const Roles roles =
      rolesOf({column("Load (N)", made.force), column("Travel (mm)", made.displacement)}, options);
  EXPECT_EQ(roles.force.column, 1u);
  EXPECT_EQ(roles.displacement.column, 0u);
  EXPECT_EQ(roles.force.why, "role-by-option");
}

TEST(FindRoles, AProfileBeatsNames) {
  RigProfile rig;
  rig.force = RigColumn{"ch b", {}, "kN"};
  rig.displacement = RigColumn{"", 1, ""};
  rig.temperature = RigColumn{"gone", {}, ""};
  const Roles roles = rolesOf({column("Ch A", made.displacement),
                               column("Ch B", made.force),
                               column("Force", made.velocity)},
                              {},
                              rig);
  EXPECT_EQ(roles.force.column, 1u);
  EXPECT_EQ(roles.force.rig->unit, "kN");
  EXPECT_EQ(roles.displacement.column, 0u);
  ASSERT_EQ(roles.remarks.size(), 1u);
  EXPECT_EQ(roles.remarks[0].code, "rig-column-missing");
}

// Its signs would be applied to columns that it does not know.
TEST(FindRoles, AProfileWithoutItsForceColumnIsAnotherRigs) {
  RigProfile rig;
  rig.force = RigColumn{"gone", {}, ""};
  const std::vector<ColumnFacts> columns = {column("Travel (mm)", made.displacement),
                                            column("Load (N)", made.force)};
  const auto roles = findRoles(columns, {}, rig);
  ASSERT_FALSE(roles);
  EXPECT_EQ(roles.error().code, "rig-of-another-file");
}

// Where nothing settles it.

TEST(FindRoles, TwoForcesAreAsked) {
  const Roles roles = rolesOf({column("Force A (N)", made.velocity),
                               column("Force B (N)", made.force),
                               column("Travel (mm)", made.displacement)});
  EXPECT_FALSE(roles.force.column.has_value());
  ASSERT_EQ(roles.open.size(), 1u);
  EXPECT_EQ(roles.open[0].point, "force");
  EXPECT_EQ(roles.open[0].option, "--force");
  EXPECT_THAT(roles.open[0].candidates, ElementsAre("Force A", "Force B"));
}

TEST(FindRoles, ThreeUnknownChannelsAreAskedByNumberWhereNamesAreAlike) {
  std::vector<double> other = made.force;
  for (double& value : other) value = value * value;
  const Roles roles = rolesOf(
      {column("U (V)", made.displacement), column("U (V)", made.force), column("U (V)", other)});
  ASSERT_EQ(roles.open.size(), 2u);
  EXPECT_THAT(roles.open[0].candidates, ElementsAre("1", "2", "3"));
}

TEST(FindRoles, AFewRowsHaveNoShape) {
  const std::vector<double> a = {1, 2, 3, 4}, b = {5, 1, 7, 2};
  const Roles roles = rolesOf({column("a", a), column("b", b)});
  EXPECT_FALSE(roles.displacement.column.has_value());
  EXPECT_FALSE(roles.time.column.has_value());
  EXPECT_EQ(roles.open.size(), 2u);
}

TEST(FindRoles, AColumnThatIsNotThereIsNamedWithWhatThereIs) {
  ReadOptions options;
  for (const char* wrong : {"Druck", "0", "3", "1.5e9", "Note"}) {
    options.force = wrong;
    const std::vector<ColumnFacts> columns = {column("Load", made.force), column("Note", {})};
    const auto roles = findRoles(columns, options, std::nullopt);
    ASSERT_FALSE(roles) << wrong;
    EXPECT_EQ(roles.error().code, "column-not-found");
    EXPECT_EQ(std::get<std::string>(roles.error().values[2].value), "Load, Note");
  }
}

}  // namespace
}  // namespace dampwright
