// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/suggest_corner.h"

#include <gtest/gtest.h>

#include "core/job/job.h"
#include "core/job/words_of.h"

namespace dampwright {
namespace {

using Words = std::vector<std::string>;

const Words car = cornersOf(VehicleKind::Car);
const Words motorcycle = cornersOf(VehicleKind::Motorcycle);

struct Row {
  const char* said;
  const char* corner;  // empty: nothing can be told
};

TEST(SuggestCorner, AFileNameOfACarTellsItsCorner) {
  for (const Row& row : std::initializer_list<Row>{{"FL.csv", "front left"},
                                                   {"run_fr_50mm.txt", "front right"},
                                                   {"car_rear_left.csv", "rear left"},
                                                   {"RearRight2.csv", "rear right"},
                                                   {"frontleft.csv", "front left"},
                                                   {"VL 100.csv", "front left"},
                                                   {"vorn rechts.txt", "front right"},
                                                   {"HL-2.csv", "rear left"},
                                                   {"HR.csv", "rear right"},
                                                   {"left front (2).csv", "front left"},
                                                   {"AVG.csv", "front left"},
                                                   {"run12.csv", ""},
                                                   {"front.csv", ""},
                                                   {"left.csv", ""},
                                                   {"front_against_rear_left.csv", ""},
                                                   {"flow_rate.csv", ""},
                                                   {"current.csv", ""},
                                                   {"", ""}}) {
    EXPECT_EQ(suggestCorner(row.said, {}, car).value_or(""), row.corner) << row.said;
  }
}

TEST(SuggestCorner, AMotorcycleHasForkAndRear) {
  for (const Row& row : std::initializer_list<Row>{{"left fork leg.csv", "front"},
                                                   {"fork.csv", "front"},
                                                   {"motorcycle_rear_02.csv", "rear"},
                                                   {"hinten.csv", "rear"},
                                                   {"shock.csv", ""}}) {
    EXPECT_EQ(suggestCorner(row.said, {}, motorcycle).value_or(""), row.corner) << row.said;
  }
}

TEST(SuggestCorner, ALineThatTellsAPositionBeatsTheName) {
  const Metadata lines = {{"Bench", "bench 1"}, {"Position", "FL"}};
  EXPECT_EQ(suggestCorner("rear_right.csv", lines, car), "front left");
  EXPECT_EQ(suggestCorner("x.csv", {{"Axle", "rear"}, {"Side", "left"}}, car), "rear left");
  EXPECT_EQ(suggestCorner("x.csv", {{"Einbauort", "hinten rechts"}}, car), "rear right");
}

TEST(SuggestCorner, AShortLineOfPlaceWordsAloneTellsToo) {
  EXPECT_EQ(suggestCorner("x.csv", {{"Title", "front left"}}, car), "front left");
  EXPECT_EQ(suggestCorner("x.csv", {{"FL", ""}}, car), "front left");
  EXPECT_EQ(suggestCorner("x.csv", {{"Note", "left front wheel bearing noisy"}}, car), std::nullopt)
      << "a sentence is no position";
}

TEST(SuggestCorner, ASingleDamperHasOnlyOnePlace) {
  EXPECT_EQ(suggestCorner("FL.csv", {}, cornersOf(VehicleKind::SingleDamper)), "damper");
}

TEST(SuggestCorner, WordsOfACardAreUnderstood) {
  EXPECT_EQ(cornerFromWords("front left", car), "front left");
  EXPECT_EQ(cornerFromWords("HR", car), "rear right");
  EXPECT_EQ(cornerFromWords("left fork leg", motorcycle), "front");
  EXPECT_EQ(cornerFromWords("", car), std::nullopt);
}

TEST(WordsOf, WordsEndAtGapsDigitsAndCapitals) {
  EXPECT_EQ(wordsOf("FrontLeft_2.csv"), (Words{"front", "left", "2", "csv"}));
  EXPECT_EQ(wordsOf("VL50mm"), (Words{"vl", "50", "mm"}));
  EXPECT_EQ(wordsOf("  "), Words{});
  EXPECT_EQ(wordsOf("arri\u00e8re"), Words{"arri\u00e8re"});
}

}  // namespace
}  // namespace dampwright
