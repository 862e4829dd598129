// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/check_text.h"

#include <QCoreApplication>
#include <algorithm>
#include <array>
#include <cmath>

#include "ui/text/names.h"
#include "ui/text/numbers.h"
#include "ui/text/sentences.h"

namespace dampwright {

namespace {

struct Checks {
  Q_DECLARE_TR_FUNCTIONS(Checks)
};

constexpr QChar noBreakSpace(0x00A0);

// Where y stands against both limits, alone and with U: all that any decision rule looks at.
std::array<bool, 6> standing(double y, double u, double min, double max) {
  return {y >= min, y <= max, y >= min + u, y <= max - u, y<min - u, y> max + u};
}

double roundedTo(double shown, int decimals) {
  const double scale = std::pow(10.0, decimals);
  return std::round(shown * scale) / scale;
}

// Fewest decimals, from two digits of U on, at which the printed figures stand to the limits as the
// unrounded ones do; at most four more.
int honestDecimals(const CheckVerdict& check) {
  const Quantity quantity = check.quantity;
  const double y = shownFromSi(*check.measured, quantity);
  const double u = shownFromSi(check.expandedUncertainty, quantity);
  const double min = shownFromSi(check.min.value_or(-INFINITY), quantity);
  const double max = shownFromSi(check.max.value_or(INFINITY), quantity);
  const int first = decimalsForUncertainty(check.expandedUncertainty, quantity);
  const int last = std::min(first + 4, 9);
  for (int decimals = first; decimals <= last; ++decimals) {
    if (standing(roundedTo(y, decimals), roundedTo(u, decimals), min, max) ==
        standing(y, u, min, max)) {
      return decimals;
    }
  }
  return first;
}

QString forceTitle(const Check& check) {
  const QString direction = directionName(check.direction.value_or(Direction::Compression));
  QString title = direction;
  if (check.velocity) {
    title = Checks::tr("%1 at %2").arg(direction, exactText(*check.velocity, Quantity::Velocity));
  }
  if (check.reading == "largest") title = Checks::tr("%1, largest").arg(title);
  if (check.stroke) {
    title = Checks::tr("%1, %2 stroke").arg(title, exactText(*check.stroke, Quantity::Length));
  }
  return title;
}

QString signedText(double si, Quantity quantity, int decimals) {
  const QString number = measuredText(si, 0, quantity, decimals);
  return si > 0 ? QLatin1Char('+') + number : number;
}

int countOf(const Verdict& verdict, VerdictWord word) {
  return static_cast<int>(std::count_if(
      verdict.checks.begin(), verdict.checks.end(), [word](const CheckVerdict& check) {
        return check.verdict == word;
      }));
}

}  // namespace

QString checkTitle(const Check& check) {
  if (check.check == "force") return forceTitle(check);
  if (check.check == "gas force") return Checks::tr("Gas force");
  if (check.check == "friction") {
    return check.basis == "dry" ? Checks::tr("Friction (dry)")
                                : Checks::tr("Friction (half difference)");
  }
  return QString::fromStdString(check.check);
}

QString targetText(const Check& check, Quantity quantity) {
  if (!check.target) return {};
  QString text = exactText(*check.target, quantity);
  const QString plusMinus = QStringLiteral("±") + noBreakSpace;  // its own number never leaves it
  if (check.tolerancePercent > 0) {
    text += noBreakSpace + plusMinus + exactText(check.tolerancePercent, Quantity::Percent);
  }
  if (check.toleranceAbsolute > 0) {
    text += QLatin1Char(' ') + plusMinus + exactText(check.toleranceAbsolute, quantity);
  }
  return text;
}

CheckText checkText(const CheckVerdict& check) {
  CheckText text;
  text.title = checkTitle(check.check);
  text.target = targetText(check.check, check.quantity);
  text.limits = rangeText(check.min, check.max, check.quantity);
  text.verdict = verdictName(check.verdict);
  text.reason = sentenceText(check.reason.code, check.reason.values);
  if (!check.measured) {
    text.measured = Checks::tr("not tested");
    return text;
  }
  const int decimals = honestDecimals(check);
  text.measured =
      measuredText(*check.measured, check.expandedUncertainty, check.quantity, decimals);
  if (check.coverageFactor > 0) {
    text.coverage = QStringLiteral("k") + noBreakSpace + QLatin1Char('=') + noBreakSpace +
                    numberText(check.coverageFactor, 2);
    text.uncertainty = QStringLiteral("U") + noBreakSpace + QLatin1Char('=') + noBreakSpace +
                       measuredText(check.expandedUncertainty, 0, check.quantity, decimals) +
                       QStringLiteral(", ") + text.coverage;
  }
  if (check.margin) text.margin = signedText(*check.margin, check.quantity, decimals);
  return text;
}

QString verdictSummary(const Verdict& verdict) {
  const int all = static_cast<int>(verdict.checks.size());
  if (all == 0) return Checks::tr("No check was asked for");
  const auto of = [&](VerdictWord word, const char* one, const char* many) {
    const int count = countOf(verdict, word);
    if (count == 0) return QString();
    return QCoreApplication::translate("Checks", count == 1 ? one : many).arg(count).arg(all);
  };
  const QString fails = of(VerdictWord::Fail,
                           QT_TRANSLATE_NOOP("Checks", "%1 of %2 checks fails"),
                           QT_TRANSLATE_NOOP("Checks", "%1 of %2 checks fail"));
  if (!fails.isEmpty()) return fails;
  const QString close = of(VerdictWord::TooCloseToCall,
                           QT_TRANSLATE_NOOP("Checks", "%1 of %2 checks is too close to call"),
                           QT_TRANSLATE_NOOP("Checks", "%1 of %2 checks are too close to call"));
  if (!close.isEmpty()) return close;
  const QString open = of(VerdictWord::NotTested,
                          QT_TRANSLATE_NOOP("Checks", "%1 of %2 checks was not tested"),
                          QT_TRANSLATE_NOOP("Checks", "%1 of %2 checks were not tested"));
  if (!open.isEmpty()) return open;
  return all == 1 ? Checks::tr("The one check passes") : Checks::tr("All %1 checks pass").arg(all);
}

}  // namespace dampwright
