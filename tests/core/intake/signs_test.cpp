// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/signs.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <vector>

#include "core/base/units.h"

namespace dampwright {
namespace {

struct Loop {
  std::vector<double> displacement, force;
};

// One cycle of X = 25 mm at 2 Hz, F = preload + c·v, c = 1000 N·s/m.
Loop viscousLoop(double preload, double sign) {
  Loop loop;
  const double omega = 2 * pi * 2;
  for (int i = 0; i <= 1000; ++i) {
    const double t = 0.5 * i / 1000;
    loop.displacement.push_back(0.025 * std::sin(omega * t));
    loop.force.push_back(preload + sign * 1000 * 0.025 * omega * std::cos(omega * t));
  }
  return loop;
}

TEST(AbsorbedEnergy, IsPiOmegaCXSquaredForAViscousDamper) {
  const Loop loop = viscousLoop(0, 1);
  const double expected = pi * 1000 * (2 * pi * 2) * 0.025 * 0.025;
  // polygon of 1000 samples a cycle: relative loss (2π/n)²/6 = 7e-6
  EXPECT_NEAR(absorbedEnergy(loop.displacement, loop.force), expected, 1e-5 * expected);
}

TEST(AbsorbedEnergy, IsNegativeWhereTheForceIsTurned) {
  const Loop loop = viscousLoop(0, -1);
  EXPECT_LT(absorbedEnergy(loop.displacement, loop.force), 0);
}

TEST(AbsorbedEnergy, PreloadDoesNotWeighInWhereTheRecordingDoesNotClose) {
  Loop loop = viscousLoop(-5000, 1);
  loop.displacement.resize(900);
  loop.force.resize(900);
  EXPECT_GT(absorbedEnergy(loop.displacement, loop.force), 0);
}

TEST(AbsorbedEnergy, LeavesMissingSamplesOut) {
  Loop loop = viscousLoop(0, 1);
  loop.force[300] = std::numeric_limits<double>::quiet_NaN();
  EXPECT_GT(absorbedEnergy(loop.displacement, loop.force), 0);
  EXPECT_EQ(absorbedEnergy({}, {}), 0);
}

TEST(ChooseDirection, OptionBeatsProfileBeatsNameBeatsPreamble) {
  const Metadata says = {{"sign", "rebound positive"}};
  const auto rising = [&](auto asked, auto rig, std::string_view name) {
    return chooseDirection(asked, rig, name, says).rising;
  };
  using Choice = std::optional<Direction>;
  const Choice none, compression = Direction::Compression, rebound = Direction::Rebound;
  EXPECT_EQ(rising(compression, rebound, "Extension"), Direction::Compression);
  EXPECT_EQ(rising(none, compression, "Extension"), Direction::Compression);
  EXPECT_EQ(rising(none, none, "Bump travel"), Direction::Compression);
  EXPECT_EQ(rising(none, none, "Travel"), Direction::Rebound);
}

TEST(ChooseDirection, WithoutEvidenceCompressionIsAssumedAndNotSettled) {
  const DirectionChoice choice = chooseDirection({}, {}, "Travel", {});
  EXPECT_EQ(choice.rising, Direction::Compression);
  EXPECT_FALSE(choice.settled);
}

}  // namespace
}  // namespace dampwright
