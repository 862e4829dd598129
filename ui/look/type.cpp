// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/type.h"

#include <QFontMetricsF>
#include <QRegularExpression>
#include <QTextLayout>
#include <algorithm>
#include <cmath>

namespace dampwright {

namespace {

// Text is laid out at this size and drawn scaled, so that no device rounds its advances.
constexpr double designSize = 200;

QFont designFont(const TextStyle& style) {
  QFont font(fontFamily());
  font.setPixelSize(static_cast<int>(designSize));
  font.setBold(style.bold);
  font.setHintingPreference(QFont::PreferNoHinting);
  return font;
}

double perDesign(const TextStyle& style) { return style.size / designSize; }

constexpr QChar wordJoiner(0x2060);  // no width, and no line ends beside it

// No line may end inside a unit (mm/s), a range (870–1120) or before what a dash leads to.
QString unbroken(QString text) {
  static const QRegularExpression slash(QStringLiteral("(?<=[A-Za-z])/(?=(s|m|mm)\\b)"));
  static const QRegularExpression dash(QStringLiteral("–(?=[\\d\u00A0])"));
  const QString joiner(wordJoiner);
  return text.replace(slash, QLatin1Char('/') + joiner).replace(dash, QStringLiteral("–") + joiner);
}

}  // namespace

QString fontFamily() { return QStringLiteral("DejaVu Sans"); }

QFont screenFont(TextSize size) {
  QFont font(fontFamily());
  switch (size) {
    case TextSize::Quiet:
      font.setPixelSize(11);
      break;
    case TextSize::Text:
      font.setPixelSize(13);
      break;
    case TextSize::Heading:
      font.setPixelSize(14);
      break;
    case TextSize::Job:
      font.setPixelSize(18);
      break;
    case TextSize::Verdict:
      font.setPixelSize(32);
      break;
  }
  font.setBold(size == TextSize::Heading || size == TextSize::Job || size == TextSize::Verdict);
  return font;
}

double textWidth(const QString& text, const TextStyle& style) {
  return QFontMetricsF(designFont(style)).horizontalAdvance(text) * perDesign(style);
}

double lineHeight(const TextStyle& style) {
  return QFontMetricsF(designFont(style)).lineSpacing() * perDesign(style);
}

QStringList wrapped(const QString& text, double width, const TextStyle& style) {
  QStringList lines;
  for (const QString& paragraph : text.split(QLatin1Char('\n'))) {
    const QString joined = unbroken(paragraph);
    QTextLayout layout(joined, designFont(style));
    QTextOption option;
    option.setWrapMode(QTextOption::WrapAtWordBoundaryOrAnywhere);
    layout.setTextOption(option);
    layout.beginLayout();
    for (QTextLine line = layout.createLine(); line.isValid(); line = layout.createLine()) {
      line.setLineWidth(std::max(width, style.size) / perDesign(style));
      lines << joined.mid(line.textStart(), line.textLength()).remove(wordJoiner).trimmed();
    }
    layout.endLayout();
    if (paragraph.isEmpty()) lines << QString();
  }
  return lines;
}

QString elided(const QString& text, double width, const TextStyle& style, Qt::TextElideMode mode) {
  return QFontMetricsF(designFont(style)).elidedText(text, mode, width / perDesign(style));
}

void drawText(QPainter& painter,
              const QRectF& box,
              const QString& text,
              const TextStyle& style,
              Qt::Alignment alignment) {
  const double scale = perDesign(style);
  painter.save();
  painter.translate(box.topLeft());
  painter.scale(scale, scale);
  painter.setFont(designFont(style));
  painter.setPen(style.colour);
  painter.drawText(QRectF(0, 0, box.width() / scale, box.height() / scale),
                   static_cast<int>(alignment) | Qt::TextSingleLine | Qt::TextDontClip,
                   text);
  painter.restore();
}

}  // namespace dampwright
