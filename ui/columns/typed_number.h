// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QLocale>
#include <QString>
#include <cmath>
#include <optional>

namespace dampwright {

/// A number as somebody types it here: by the screen's locale, else with a decimal point.
inline std::optional<double> typedNumber(const QString& text) {
  for (const QLocale& locale : {QLocale(), QLocale::c()}) {
    bool good = false;
    const double value = locale.toDouble(text.trimmed(), &good);
    if (good && std::isfinite(value)) return value;
  }
  return std::nullopt;
}

/// A number as it would be typed, to twelve digits: more than any certificate has.
inline QString typedText(double value) {
  QLocale locale;
  locale.setNumberOptions(QLocale::OmitGroupSeparator);
  return locale.toString(value, 'g', 12);
}

}  // namespace dampwright
