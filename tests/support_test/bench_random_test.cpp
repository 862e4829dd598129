// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/bench_random.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>

namespace dampwright::bench {
namespace {

// The generator's bits are promised by the C++ standard: the 10000th number of a default one.
TEST(BenchRandom, TheGeneratorUnderneathIsTheOneOfTheStandard) {
  std::mt19937_64 bits;
  bits.discard(9999);
  EXPECT_EQ(bits(), 9981545732273789042ULL);  // ISO C++ [rand.predef]
}

TEST(BenchRandom, MomentsAreThoseOfANormalLaw) {
  NormalSource normal(7);
  const int n = 1'000'000;
  double sum = 0, squares = 0, fourth = 0;
  int beyondTwo = 0;
  for (int i = 0; i < n; ++i) {
    const double value = normal.next();
    sum += value;
    squares += value * value;
    fourth += value * value * value * value;
    beyondTwo += std::abs(value) > 2 ? 1 : 0;
  }
  EXPECT_NEAR(sum / n, 0, 4e-3);                   // 4 standard errors of 1/√n
  EXPECT_NEAR(squares / n, 1, 6e-3);               // 4·√(2/n)
  EXPECT_NEAR(fourth / n, 3, 0.04);                // 4·√(96/n)
  EXPECT_NEAR(1.0 * beyondTwo / n, 0.0455, 9e-4);  // 4·√(p(1 − p)/n)
}

TEST(BenchRandom, TheSameSeedGivesTheSameNumbersAndAnotherSeedOthers) {
  NormalSource first(3), again(3), other(4);
  int same = 0;
  for (int i = 0; i < 100; ++i) {
    const double value = first.next();
    EXPECT_EQ(value, again.next());
    same += value == other.next() ? 1 : 0;
  }
  EXPECT_EQ(same, 0);
}

}  // namespace
}  // namespace dampwright::bench
