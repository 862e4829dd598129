// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/column_words.h"

#include <gtest/gtest.h>

namespace dampwright {
namespace {

TEST(ColumnWords, EnglishAndGermanTradeWordsNameTheirRole) {
  for (const char* name : {"Time", "t", "Elapsed time", "timestamp", "Zeit", "Messzeit"})
    EXPECT_EQ(roleOfName(name), Role::Time) << name;
  for (const char* name : {"Displacement",
                           "Displacment",
                           "Pos.",
                           "Damper travel",
                           "Stroke",
                           "x",
                           "LVDT 1",
                           "Weg",
                           "Kolbenweg",
                           "Hub",
                           "Einfederung",
                           "Compression"})
    EXPECT_EQ(roleOfName(name), Role::Displacement) << name;
  for (const char* name :
       {"Force", "Load cell", "Kraft", "Dämpferkraft", "Radlast", "DÄMPFERKRAFT", "F"})
    EXPECT_EQ(roleOfName(name), Role::Force) << name;
  for (const char* name : {"Velocity", "Vel", "Piston speed", "Geschwindigkeit", "v"})
    EXPECT_EQ(roleOfName(name), Role::Velocity) << name;
  for (const char* name : {"Temperature", "Body temp", "Temperatur", "Öltemperatur"})
    EXPECT_EQ(roleOfName(name), Role::Temperature) << name;
}

TEST(ColumnWords, TheLastWordIsTheNoun) {
  EXPECT_EQ(roleOfName("Stroke speed"), Role::Velocity);
  EXPECT_EQ(roleOfName("Hubgeschwindigkeit"), Role::Velocity);
  EXPECT_EQ(roleOfName("Compression force"), Role::Force);
  EXPECT_EQ(roleOfName("Druckkraft"), Role::Force);
  EXPECT_EQ(roleOfName("Load cell temperature"), Role::Temperature);
}

TEST(ColumnWords, BeforeALinkingWordStandsTheNoun) {
  EXPECT_EQ(roleOfName("Force de compression"), Role::Force);
  EXPECT_EQ(roleOfName("Vitesse de déplacement"), Role::Velocity);
  EXPECT_EQ(roleOfName("Température du capteur de force"), Role::Temperature);
  EXPECT_EQ(roleOfName("Geschwindigkeit des Kolbenwegs"), Role::Velocity);
  EXPECT_EQ(roleOfName("Speed of the position sensor"), Role::Velocity);
  EXPECT_EQ(roleOfName("Célula de carga"), Role::Force);
  EXPECT_EQ(roleOfName("Aceleração no curso"), Role::Other);
}

TEST(ColumnWords, WordsThatOnlyDescribeGiveWay) {
  EXPECT_EQ(roleOfName("Force compression"), Role::Force);
  EXPECT_EQ(roleOfName("Rebound force"), Role::Force);
  EXPECT_EQ(roleOfName("Compression"), Role::Displacement);
}

TEST(ColumnWords, OfJapaneseAndChineseWordsTheLongerOneCounts) {
  EXPECT_EQ(roleOfName("力"), Role::Force);
  EXPECT_EQ(roleOfName("圧力"), Role::Other);
  EXPECT_EQ(roleOfName("压力"), Role::Other);
  EXPECT_EQ(roleOfName("加速度"), Role::Other);
  EXPECT_EQ(roleOfName("変位速度"), Role::Velocity);
  EXPECT_EQ(roleOfName("油温度"), Role::Temperature);
}

TEST(ColumnWords, OtherQuantitiesAreNamedAsSuchAndUnknownWordsNotAtAll) {
  for (const char* name : {"Pressure", "Sample", "Cycle count", "Gasdruck", "Power", "Index"})
    EXPECT_EQ(roleOfName(name), Role::Other) << name;
  for (const char* name : {"", "Crosshead", "Elastic", "Channel 1", "tx", "Body", "x_value"})
    EXPECT_EQ(roleOfName(name), std::nullopt) << name;
}

TEST(ColumnWords, ACommandIsNotAMeasurement) {
  EXPECT_TRUE(isCommand("Weg Soll"));
  EXPECT_TRUE(isCommand("Position command"));
  EXPECT_FALSE(isCommand("Weg Ist"));
}

TEST(ColumnWords, TheDirectionStandsInSomeNames) {
  EXPECT_EQ(directionOfName("Bump travel"), Direction::Compression);
  EXPECT_EQ(directionOfName("Einfederweg"), Direction::Compression);
  EXPECT_EQ(directionOfName("Ausfederung"), Direction::Rebound);
  EXPECT_EQ(directionOfName("Extension"), Direction::Rebound);
  EXPECT_EQ(directionOfName("Bump/rebound travel"), std::nullopt);
  EXPECT_EQ(directionOfName("Travel"), std::nullopt);
}

TEST(ColumnWords, OrInALineAboutSigns) {
  EXPECT_EQ(directionOfLine("Displacement sign compression positive"), Direction::Compression);
  EXPECT_EQ(directionOfLine("Vorzeichen Zug positiv"), Direction::Rebound);
  EXPECT_EQ(directionOfLine("rebound negative, bump positive"), Direction::Compression);
  EXPECT_EQ(directionOfLine("Load compression positive"), std::nullopt);
  EXPECT_EQ(directionOfLine("Position compression stage"), std::nullopt);
  EXPECT_EQ(directionOfLine("Déplacement : compression positive"), Direction::Compression);
  EXPECT_EQ(directionOfLine("変位: 圧縮が正"), Direction::Compression);
  EXPECT_EQ(directionOfLine("位移: 拉伸为正"), Direction::Rebound);
  EXPECT_EQ(directionOfLine("荷重: 圧縮が正"), std::nullopt);
}

}  // namespace
}  // namespace dampwright
