// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/uncertainty/pooled_scatter.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>

#include "core/uncertainty/student_t.h"

namespace dampwright {
namespace {

/// How the cycles of a made bench scatter.
struct Truth {
  double absolute = 0;  ///< N, of single cycles
  double share = 0;     ///< [1] of force
  double noise = 0;     ///< N, of single cycles, by the samples
};

const std::vector<double> forces = {5, -10, 60, 200, 350, 600, 900, 1400, 2000, 2600};
constexpr double cycles = 5, samplesInWindow = 40;

struct Drawn {
  std::vector<Scatter> means;
  std::vector<double> errors;
};

Drawn draw(const Truth& truth, std::mt19937_64& random) {
  std::normal_distribution<double> normal(0, 1);
  Drawn drawn;
  for (const double force : forces) {
    std::chi_squared_distribution<double> noise(samplesInWindow - 5), scatter(cycles - 1);
    const double own = truth.absolute * truth.absolute + std::pow(truth.share * force, 2);
    const double all = (own + truth.noise * truth.noise) / cycles;
    const double noise2 = truth.noise * truth.noise / cycles;
    drawn.means.push_back({force,
                           cycles,
                           std::sqrt(all * scatter(random) / (cycles - 1)),
                           std::sqrt(noise2 * noise(random) / (samplesInWindow - 5)),
                           samplesInWindow - 5});
    drawn.errors.push_back(std::sqrt(all) * normal(random));
  }
  return drawn;
}

/// Percent of draws whose error lies inside the 95 % interval, for each force.
std::vector<double> coverage(const Truth& truth) {
  constexpr int draws = 4000;
  std::mt19937_64 random(11);
  std::vector<double> inside(forces.size());
  for (int i = 0; i < draws; ++i) {
    const Drawn drawn = draw(truth, random);
    const auto pooled = pooledScatter(drawn.means);
    for (std::size_t k = 0; k < forces.size(); ++k) {
      const double limit = coverageFactor(0.95, pooled[k].dof) * pooled[k].u;
      inside[k] += std::abs(drawn.errors[k]) <= limit ? 100.0 / draws : 0;
    }
  }
  return inside;
}

void expectCovered(const Truth& truth) {
  const auto percent = coverage(truth);
  double mean = 0;
  for (std::size_t k = 0; k < forces.size(); ++k) {
    mean += percent[k] / static_cast<double>(forces.size());
    // 93 to 97, and what 4000 draws leave open: 3·√(0.03·0.97/4000) = 0.8
    EXPECT_GE(percent[k], 92.2) << forces[k] << " N";
    EXPECT_LE(percent[k], 97.8) << forces[k] << " N";
  }
  EXPECT_GE(mean, 93);
  EXPECT_LE(mean, 97);
}

TEST(PooledScatter, CoversWhereNoiseIsAll) { expectCovered({0, 0, 0.5}); }

TEST(PooledScatter, CoversScatterInPercentOfForce) { expectCovered({0, 0.003, 0.3}); }

TEST(PooledScatter, CoversScatterThatDoesNotCareForTheForce) { expectCovered({1.5, 0, 0.1}); }

TEST(PooledScatter, CoversBothTogetherAtLowForceToo) { expectCovered({0.6, 0.002, 0.3}); }

TEST(PooledScatter, AForceNearZeroKeepsTheScatterOfItsCycles) {
  // percent of force alone said 0.03 N here, where the cycles scatter by 0.26 N
  const std::vector<Scatter> means = {{-10.6, 20, 0.26, 0.02, 30}, {130, 20, 0.3, 0.02, 30}};
  const auto pooled = pooledScatter(means);
  EXPECT_NEAR(pooled[0].u, 0.26, 0.04);
  EXPECT_NEAR(pooled[1].u, 0.3, 0.04);
  EXPECT_GT(pooled[0].dof, 10);
}

TEST(PooledScatter, ExactSquaresComeBack) {
  std::vector<Scatter> means;
  for (const double force : forces)
    means.push_back({force, 4, std::sqrt((4 + std::pow(0.01 * force, 2)) / 4), 0, 0});
  const auto pooled = pooledScatter(means);
  for (std::size_t k = 0; k < forces.size(); ++k)
    EXPECT_NEAR(pooled[k].u, means[k].u, 1e-6 * means[k].u);
}

TEST(PooledScatter, OneCycleTakesTheScatterOfTheOthers) {
  const std::vector<Scatter> means = {
      {1000, 1, 0.1, 0.1, 50}, {1000, 5, 2, 0.05, 50}, {1000, 5, 2, 0.05, 50}};
  EXPECT_NEAR(pooledScatter(means)[0].u, 2 * std::sqrt(5.0), 0.05);
}

TEST(PooledScatter, NothingKnownIsNothing) {
  EXPECT_TRUE(pooledScatter({}).empty());
  const std::vector<Scatter> means = {{1000, 1, 0, 0, 0}};
  EXPECT_EQ(pooledScatter(means)[0].u, 0);
  EXPECT_EQ(pooledScatter(means)[0].dof, 0);
}

TEST(PooledScatter, ForceTimesTenIsScatterTimesTen) {
  std::mt19937_64 random(5);
  Drawn drawn = draw({0.6, 0.002, 0.3}, random);
  const auto one = pooledScatter(drawn.means);
  for (Scatter& mean : drawn.means) {
    mean.force *= 10;
    mean.u *= 10;
    mean.noiseU *= 10;
  }
  const auto ten = pooledScatter(drawn.means);
  for (std::size_t k = 0; k < forces.size(); ++k)
    EXPECT_NEAR(ten[k].u, 10 * one[k].u, 1e-6 * ten[k].u);
}

}  // namespace
}  // namespace dampwright
