// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/palette.h"

#include <algorithm>
#include <cmath>

namespace dampwright {

namespace {

double linear(double channel) {
  return channel <= 0.04045 ? channel / 12.92 : std::pow((channel + 0.055) / 1.055, 2.4);
}

double relativeLuminance(const QColor& colour) {
  return 0.2126 * linear(colour.redF()) + 0.7152 * linear(colour.greenF()) +
         0.0722 * linear(colour.blueF());
}

}  // namespace

const Palette& lightPalette() {
  static const Palette palette{QColor(0xFBFAF7),
                               QColor(0xFFFFFF),
                               QColor(0x1F2430),
                               QColor(0x667085),
                               QColor(0xD0D5DD),
                               QColor(0x005A8C),
                               QColor(0xFFFFFF),
                               QColor(0xEDF3F8),
                               QColor(0xA84300),
                               QColor(0x007A5A),
                               QColor(0x7A4A86),
                               QColor(0xE9EEF2),
                               QColor(0x7F8A9C)};
  return palette;
}

const Palette& darkPalette() {
  static const Palette palette{QColor(0x14171C),
                               QColor(0x1D2128),
                               QColor(0xE9ECF1),
                               QColor(0x949DAD),
                               QColor(0x3B4250),
                               QColor(0x74B9E8),
                               QColor(0x10141A),
                               QColor(0x24303C),
                               QColor(0xE79A62),
                               QColor(0x52B592),
                               QColor(0xC3A0CC),
                               QColor(0x2A313B),
                               QColor(0x6B7688)};
  return palette;
}

const Palette& printPalette() {
  static const Palette palette = [] {
    Palette print = lightPalette();
    print.paper = print.card;
    return print;
  }();
  return palette;
}

const Palette& paletteFor(const QPalette& window) {
  const bool dark =
      window.color(QPalette::WindowText).lightness() > window.color(QPalette::Window).lightness();
  return dark ? darkPalette() : lightPalette();
}

QPalette asQPalette(const Palette& palette) {
  QPalette qt(palette.ink,
              palette.card,
              palette.hairline,
              palette.hairline,
              palette.quiet,
              palette.ink,
              palette.card,
              palette.card,
              palette.paper);
  qt.setColor(QPalette::Window, palette.paper);
  qt.setColor(QPalette::AlternateBase, palette.paper);
  qt.setColor(QPalette::Button, palette.card);
  qt.setColor(QPalette::ToolTipBase, palette.card);
  qt.setColor(QPalette::ToolTipText, palette.ink);
  qt.setColor(QPalette::PlaceholderText, palette.quiet);
  qt.setColor(QPalette::Highlight, palette.action);
  qt.setColor(QPalette::HighlightedText, palette.onAction);
  qt.setColor(QPalette::Link, palette.action);
  qt.setColor(QPalette::LinkVisited, palette.fourth);
  for (const auto role : {QPalette::WindowText, QPalette::Text, QPalette::ButtonText}) {
    qt.setColor(QPalette::Disabled, role, palette.quiet);
  }
  return qt;
}

double contrastRatio(const QColor& one, const QColor& other) {
  const auto [dark, light] = std::minmax({relativeLuminance(one), relativeLuminance(other)});
  return (light + 0.05) / (dark + 0.05);
}

}  // namespace dampwright
