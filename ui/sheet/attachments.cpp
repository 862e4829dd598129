// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/attachments.h"

#include <QSet>
#include <nlohmann/json.hpp>

#include "core/base/sha256.h"

namespace dampwright {

namespace {

constexpr qsizetype longestName = 100;

bool plainLetter(QChar letter) {
  const ushort code = letter.unicode();
  return (code >= 'a' && code <= 'z') || (code >= 'A' && code <= 'Z') ||
         (code >= '0' && code <= '9') || code == '.' || code == '-' || code == '_';
}

QString unique(const QString& name, QSet<QString>& taken) {
  const qsizetype dot = name.lastIndexOf(QLatin1Char('.'));
  const QString stem = dot > 0 ? name.left(dot) : name;
  const QString ending = dot > 0 ? name.mid(dot) : QString();
  QString candidate = name;
  for (int number = 2; taken.contains(candidate.toLower()); ++number) {
    candidate = stem + QLatin1Char('-') + QString::number(number) + ending;
  }
  taken.insert(candidate.toLower());
  return candidate;
}

std::string sha256Of(const QByteArray& bytes) {
  return sha256Hex({bytes.constData(), static_cast<std::size_t>(bytes.size())});
}

}  // namespace

QString sanitisedName(const QString& name) {
  const QString last =
      QString(name).replace(QLatin1Char('\\'), QLatin1Char('/')).section(QLatin1Char('/'), -1, -1);
  QString plain;
  for (const QChar letter : last.normalized(QString::NormalizationForm_KD)) {
    if (plainLetter(letter))
      plain += letter;
    else if (!letter.isMark())
      plain += QLatin1Char('_');
  }
  while (plain.startsWith(QLatin1Char('.'))) plain.remove(0, 1);
  // The ending stays: it says what opens the file.
  const qsizetype dot = plain.lastIndexOf(QLatin1Char('.'));
  const QString ending = dot > 0 && plain.size() - dot <= 12 ? plain.mid(dot) : QString();
  plain = plain.chopped(ending.size()).left(longestName - ending.size()) + ending;
  return plain.isEmpty() ? QStringLiteral("file") : plain;
}

std::vector<NamedAttachment> namedAttachments(const SheetContent& content) {
  using Json = nlohmann::ordered_json;
  QSet<QString> taken = {QStringLiteral("manifest.json")};
  std::vector<NamedAttachment> named;
  Json files = Json::array();
  for (const SheetAttachment& attachment : content.attachments) {
    const bool json = attachment.kind != QStringLiteral("run");
    const QString name = unique(sanitisedName(attachment.name), taken);
    named.push_back({name,
                     json ? QStringLiteral("application/json") : QStringLiteral("text/plain"),
                     attachment.bytes});
    files.push_back({{"name", name.toStdString()},
                     {"kind", attachment.kind.toStdString()},
                     {"original_name", attachment.name.toStdString()},
                     {"bytes", attachment.bytes.size()},
                     {"sha256", sha256Of(attachment.bytes)}});
  }
  const Json manifest = {{"document", "dampwright sheet manifest"},
                         {"version", 1},
                         {"program", DAMPWRIGHT_VERSION},
                         {"job", content.job.number},
                         {"printed", content.printed.toStdString()},
                         {"files", files}};
  const std::string text = manifest.dump(2, ' ', false, Json::error_handler_t::replace) + "\n";
  named.push_back({QStringLiteral("manifest.json"),
                   QStringLiteral("application/json"),
                   QByteArray::fromStdString(text)});
  return named;
}

}  // namespace dampwright
