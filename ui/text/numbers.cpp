// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/numbers.h"

#include <QLocale>
#include <algorithm>
#include <cmath>

#include "core/base/expects.h"
#include "core/base/units.h"

namespace dampwright {

namespace {

constexpr QChar noBreakSpace(0x00A0);
constexpr QChar minusSign(0x2212);
constexpr QChar enDash(0x2013);

struct Shown {
  const char16_t* symbol;
  double perSi;      // shown = si · perSi
  int mostDecimals;  // finer than this nobody in a workshop reads
};

// No default: a quantity without a row does not compile.
Shown shownOf(Quantity quantity) {
  switch (quantity) {
    case Quantity::None:
      return {u"", 1, 3};
    case Quantity::Count:
      return {u"", 1, 0};
    case Quantity::Time:
      return {u"s", 1, 3};
    case Quantity::Length:
      return {u"mm", 1e3, 2};
    case Quantity::Velocity:
      return {u"mm/s", 1e3, 1};
    case Quantity::Force:
      return {u"N", 1, 1};
    case Quantity::Temperature:
      return {u"°C", 1, 0};
    case Quantity::Energy:
      return {u"J", 1, 2};
    case Quantity::Power:
      return {u"W", 1, 1};
    case Quantity::Damping:
      return {u"N·s/m", 1, 0};
    case Quantity::Stiffness:
      return {u"N/mm", 1e-3, 2};
    case Quantity::Mass:
      return {u"kg", 1, 3};
    case Quantity::Frequency:
      return {u"Hz", 1, 3};
    case Quantity::Angle:
      return {u"°", 180 / pi, 1};
    case Quantity::Voltage:
      return {u"V", 1, 3};
    case Quantity::Percent:
      return {u"%", 1, 1};
  }
  expects(false);
  return {u"", 1, 0};
}

// Power of ten of the leading digit; 0 for 0.
int leadingPower(double value) {
  return value == 0 ? 0 : static_cast<int>(std::floor(std::log10(std::abs(value))));
}

QString withoutTrailingZeros(QString number) {
  const QString point = QLocale().decimalPoint();
  if (!number.contains(point)) return number;
  while (number.endsWith(QLocale().zeroDigit())) number.chop(1);
  if (number.endsWith(point)) number.chop(point.size());
  return number;
}

QString joined(const QString& number, Quantity quantity) {
  const QString unit = unitSymbol(quantity);
  if (unit.isEmpty()) return number;
  if (quantity == Quantity::Angle) return number + unit;
  return number + noBreakSpace + unit;
}

QString exactNumber(double si, Quantity quantity) {
  const double shown = shownFromSi(si, quantity);
  return withoutTrailingZeros(numberText(shown, std::clamp(6 - leadingPower(shown), 0, 9)));
}

}  // namespace

QString unitSymbol(Quantity quantity) { return QString::fromUtf16(shownOf(quantity).symbol); }

double shownFromSi(double si, Quantity quantity) { return si * shownOf(quantity).perSi; }

double siFromShown(double shown, Quantity quantity) { return shown / shownOf(quantity).perSi; }

QString numberText(double shown, int decimals) {
  expects(decimals >= 0 && decimals <= 9);
  if (!std::isfinite(shown)) return QString(enDash);
  QLocale locale;
  locale.setNumberOptions(QLocale::OmitGroupSeparator);
  const QString magnitude = locale.toString(std::abs(shown), 'f', decimals);
  const bool zero = magnitude == locale.toString(0.0, 'f', decimals);
  return shown < 0 && !zero ? minusSign + magnitude : magnitude;
}

QString quantityText(double si, Quantity quantity) {
  const double shown = shownFromSi(si, quantity);
  if (!std::isfinite(shown)) return QString(enDash);
  const int decimals = std::clamp(3 - leadingPower(shown), 0, shownOf(quantity).mostDecimals);
  return joined(withoutTrailingZeros(numberText(shown, decimals)), quantity);
}

QString exactText(double si, Quantity quantity) {
  if (!std::isfinite(si)) return QString(enDash);
  return joined(exactNumber(si, quantity), quantity);
}

int decimalsForUncertainty(double expandedSi, Quantity quantity) {
  const double shown = std::abs(shownFromSi(expandedSi, quantity));
  if (!(shown > 0) || !std::isfinite(shown)) return shownOf(quantity).mostDecimals;
  int decimals = 1 - leadingPower(shown);
  // 9.96 rounds up to 10: one decimal less, or it would have three digits.
  if (std::round(shown * std::pow(10.0, decimals)) >= 100) --decimals;
  return std::clamp(decimals, 0, 9);
}

QString measuredText(double si, double expandedSi, Quantity quantity) {
  return measuredText(si, expandedSi, quantity, decimalsForUncertainty(expandedSi, quantity));
}

QString measuredText(double si, double expandedSi, Quantity quantity, int decimals) {
  QString text = numberText(shownFromSi(si, quantity), decimals);
  if (expandedSi > 0) {
    text += noBreakSpace + QStringLiteral("±") + noBreakSpace +
            numberText(shownFromSi(expandedSi, quantity), decimals);
  }
  return joined(text, quantity);
}

QString rangeText(std::optional<double> minSi, std::optional<double> maxSi, Quantity quantity) {
  if (minSi && maxSi) {
    return joined(exactNumber(*minSi, quantity) + enDash + exactNumber(*maxSi, quantity), quantity);
  }
  if (maxSi) return QStringLiteral("≤") + noBreakSpace + exactText(*maxSi, quantity);
  if (minSi) return QStringLiteral("≥") + noBreakSpace + exactText(*minSi, quantity);
  return {};
}

}  // namespace dampwright
