// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/base/units.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace dampwright {
namespace {

struct Row {
  std::string symbol;
  double value;
  double si;
  Quantity quantity;
};

TEST(Units, SymbolsOfFilesBecomeSi) {
  // Exact definitions: inch 25.4 mm; kgf 9.80665 N; lbf 0.45359237 kg · 9.80665 m/s² (SI Brochure,
  // NIST SP 811 app. B).
  const std::vector<Row> rows = {{"mm", 25.4, 0.0254, Quantity::Length},
                                 {"in", 1, 0.0254, Quantity::Length},
                                 {"cm", 2, 0.02, Quantity::Length},
                                 {"kN", 1.5, 1500, Quantity::Force},
                                 {"daN", 3, 30, Quantity::Force},
                                 {"kgf", 10, 98.0665, Quantity::Force},
                                 {"lbf", 100, 444.82216152605, Quantity::Force},
                                 {"ms", 250, 0.25, Quantity::Time},
                                 {"µs", 5, 5e-6, Quantity::Time},
                                 {"min", 2, 120, Quantity::Time},
                                 {"mm/s", 131, 0.131, Quantity::Velocity},
                                 {"in/s", 10, 0.254, Quantity::Velocity},
                                 {"°F", 212, 100, Quantity::Temperature},
                                 {"K", 293.15, 20, Quantity::Temperature},
                                 {"°C", 20, 20, Quantity::Temperature},
                                 {"M/S", 1, 1, Quantity::Velocity}};
  for (const Row& row : rows) {
    const auto unit = unitFromSymbol(row.symbol);
    ASSERT_TRUE(unit) << row.symbol;
    EXPECT_EQ(unit->quantity, row.quantity) << row.symbol;
    EXPECT_NEAR(unit->toSi(row.value), row.si, 1e-12 * (1 + row.si))
        << row.symbol;  // rounding of one product
    EXPECT_NEAR(unit->fromSi(row.si), row.value, 1e-12 * (1 + row.value)) << row.symbol;
  }
}

TEST(Units, UnknownSymbolsAreNotGuessed) {
  for (const char* symbol : {"", "furlong", "N/m", "mmm", "sN", "-"}) {
    EXPECT_FALSE(unitFromSymbol(symbol)) << symbol;
  }
}

}  // namespace
}  // namespace dampwright
