// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/attachments.h"

#include <gtest/gtest.h>

#include <QSet>

namespace dampwright {
namespace {

TEST(Attachments, NamesFitEveryFileSystem) {
  const std::vector<std::pair<const char*, const char*>> rows = {
      {"front left.csv", "front_left.csv"},
      {"../../etc/passwd", "passwd"},
      {"C:\\runs\\a.txt", "a.txt"},
      {"..", "file"},
      {"", "file"},
      {".hidden", "hidden"},
      {"Stoßdämpfer v/r.csv", "r.csv"},
      {"dämpfer.csv", "dampfer.csv"},
      {"a\nb\t\"c\".csv", "a_b__c_.csv"},
      {"減衰.csv", "__.csv"}};
  for (const auto& [name, expected] : rows) {
    EXPECT_EQ(sanitisedName(QString::fromUtf8(name)).toStdString(), expected) << name;
  }
}

TEST(Attachments, ALongNameKeepsItsEnding) {
  const QString name = sanitisedName(QString(400, QLatin1Char('x')) + QStringLiteral(".csv"));
  EXPECT_EQ(name.size(), 100);
  EXPECT_TRUE(name.endsWith(QStringLiteral(".csv")));
}

TEST(Attachments, NoNameStandsTwice) {
  SheetContent content;
  for (const char* name : {"run.csv", "RUN.csv", "r/run.csv", "manifest.json", "run-2.csv"}) {
    content.attachments.push_back({QStringLiteral("run"), QString::fromUtf8(name), "x"});
  }
  QSet<QString> seen;
  for (const NamedAttachment& one : namedAttachments(content)) seen.insert(one.name.toLower());
  EXPECT_EQ(seen.size(), 6);
}

}  // namespace
}  // namespace dampwright
