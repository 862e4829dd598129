// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/names.h"

#include <gtest/gtest.h>

#include <QLocale>
#include <set>

namespace dampwright {
namespace {

std::string plain(QString text) {
  return text.replace(QChar(0x00A0), QLatin1Char(' ')).toStdString();
}

TEST(Names, EveryVerdictHasAWordOfItsOwn) {
  std::set<QString> words;
  for (const VerdictWord word : {VerdictWord::Pass,
                                 VerdictWord::Fail,
                                 VerdictWord::TooCloseToCall,
                                 VerdictWord::NotTested}) {
    words.insert(verdictName(word));
  }
  EXPECT_EQ(words.size(), 4u);
  EXPECT_FALSE(words.contains(QString()));
}

TEST(Names, EveryCornerOfEveryVehicleHasAName) {
  EXPECT_EQ(cornerName("front left").toStdString(), "Front left");
  EXPECT_EQ(cornerName("rear right").toStdString(), "Rear right");
  EXPECT_EQ(cornerName("third axle").toStdString(), "third axle");
}

TEST(Names, ASettingReadsWithItsAdjustersUnit) {
  Adjuster rebound;
  rebound.name = "rebound";
  rebound.unit = "clicks";
  EXPECT_EQ(plain(settingText({{"rebound", 8}, {"compression", 2.5}}, {rebound})),
            "rebound 8 clicks, compression 2.5");
  EXPECT_EQ(plain(settingText({}, {rebound})), "");
}

TEST(Names, APhaseReadsWithItsSetting) {
  DamperCard card;
  card.adjusters.push_back({"rebound", "rebound", "clicks", 0, 20, "full soft"});
  JobPhase phase;
  EXPECT_EQ(plain(phaseTitle(phase, card)), "As found");
  phase.phase = Phase::AfterWork;
  phase.setting = {{"rebound", 8}};
  EXPECT_EQ(plain(phaseTitle(phase, card)), "After work, rebound 8 clicks");
}

TEST(Names, ADamperWithoutSerialIsKnownByItsPartNumber) {
  DamperCard card;
  EXPECT_EQ(damperName(card).toStdString(), "no serial");
  card.partNumber = "P-7";
  EXPECT_EQ(damperName(card).toStdString(), "P-7");
  card.serial = "DA-1109";
  EXPECT_EQ(damperName(card).toStdString(), "DA-1109");
}

TEST(Names, ADateReadsAsPeopleWriteIt) {
  QLocale::setDefault(QLocale::c());
  EXPECT_EQ(dateText("2031-01-10").toStdString(), "10 January 2031");
  EXPECT_EQ(dateText("2031-01-10T14:05:00+01:00").toStdString(), "10 January 2031, 14:05");
  EXPECT_EQ(dateText("last spring").toStdString(), "last spring");
  EXPECT_EQ(dateText("").toStdString(), "");
}

}  // namespace
}  // namespace dampwright
