// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/sentences.h"

#include <QCoreApplication>
#include <QStringList>

#include "core/words/words.h"
#include "ui/text/numbers.h"

namespace dampwright {

namespace {

struct Sentences {
  Q_DECLARE_TR_FUNCTIONS(Sentences)
};

constexpr QChar ellipsis(0x2026);

QString valueText(const NamedValue& value) {
  if (const auto* words = std::get_if<std::string>(&value.value)) {
    return QString::fromStdString(*words);
  }
  return quantityText(std::get<double>(value.value), value.quantity);
}

QString valueCalled(QStringView name, const Values& values) {
  for (const NamedValue& value : values) {
    if (name == QString::fromStdString(value.name)) return valueText(value);
  }
  return QString(ellipsis);
}

// One pass, so that a value holding braces is not filled in again.
QString filled(const QString& sentence, const Values& values) {
  QString text;
  qsizetype from = 0;
  while (true) {
    const qsizetype open = sentence.indexOf(QLatin1Char('{'), from);
    const qsizetype close = open < 0 ? -1 : sentence.indexOf(QLatin1Char('}'), open);
    if (close < 0) return text + sentence.mid(from);
    text += sentence.mid(from, open - from);
    text += valueCalled(QStringView(sentence).mid(open + 1, close - open - 1), values);
    from = close + 1;
  }
}

QString translated(std::string_view english, const Values& values) {
  const std::string source(english);
  return filled(QCoreApplication::translate("words", source.c_str()), values);
}

Values withCounts(const Remark& remark) {
  Values values = remark.values;
  values.push_back({"count", static_cast<double>(remark.count), Quantity::Count});
  values.push_back({"first_row", static_cast<double>(remark.firstRow), Quantity::Count});
  return values;
}

Values withPlace(const Error& error) {
  Values values = error.values;
  values.push_back({"file", error.place.file, Quantity::None});
  values.push_back({"row", static_cast<double>(error.place.row), Quantity::Count});
  values.push_back({"column", static_cast<double>(error.place.column), Quantity::Count});
  return values;
}

QString placeText(const Place& place) {
  QStringList parts;
  if (!place.file.empty()) parts << QString::fromStdString(place.file);
  if (place.row > 0) parts << Sentences::tr("row %1").arg(place.row);
  if (place.column > 0) parts << Sentences::tr("column %1").arg(place.column);
  return parts.join(QStringLiteral(", "));
}

}  // namespace

QString sentenceText(const std::string& code, const Values& values) {
  if (code.empty()) return {};
  const Sentence* sentence = findSentence(code);
  return sentence != nullptr ? translated(sentence->text, values) : QString::fromStdString(code);
}

QString hintText(const std::string& code, const Values& values) {
  const Sentence* sentence = findSentence(code);
  return sentence != nullptr ? translated(sentence->hint, values) : QString();
}

QString sentenceText(const Remark& remark) { return sentenceText(remark.code, withCounts(remark)); }

QString hintText(const Remark& remark) { return hintText(remark.code, withCounts(remark)); }

QString sentenceText(const Error& error) {
  const Values values = withPlace(error);
  const QString place = placeText(error.place);
  const QString what = sentenceText(error.code, values);
  const QString hint = hintText(error.code, values);
  QString text = place.isEmpty() ? what : place + QStringLiteral(": ") + what;
  if (!hint.isEmpty()) text += QLatin1Char(' ') + hint;
  return text;
}

}  // namespace dampwright
