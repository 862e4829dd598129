// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QColor>
#include <QFont>
#include <QPainter>
#include <QRectF>
#include <QString>
#include <QStringList>

namespace dampwright {

/// One family for screens and sheets, so that both look and measure alike (its figures are all of
/// one width).
QString fontFamily();

enum class TextSize { Quiet, Text, Heading, Job, Verdict };

/// 11 quiet, 13 text, 14 bold headings, 18 job, 32 bold verdict; device-independent pixels.
QFont screenFont(TextSize size);

/// Text in a painter's own units, whatever they are: pixels on a screen, millimetres on a sheet.
/// Lines break and elide at the same letters on every device.
struct TextStyle {
  double size = 13;  ///< em, in the painter's units
  bool bold = false;
  QColor colour = Qt::black;
};

double textWidth(const QString& text, const TextStyle& style);
double lineHeight(const TextStyle& style);

/// Lines that fit the width; a word that is too long by itself is broken inside.
QStringList wrapped(const QString& text, double width, const TextStyle& style);
/// The text, its end or its middle left out (…) where it is too wide.
QString elided(const QString& text,
               double width,
               const TextStyle& style,
               Qt::TextElideMode mode = Qt::ElideRight);

/// One line inside `box`, aligned as said, never clipped.
void drawText(QPainter& painter,
              const QRectF& box,
              const QString& text,
              const TextStyle& style,
              Qt::Alignment alignment = Qt::AlignLeft | Qt::AlignVCenter);

}  // namespace dampwright
