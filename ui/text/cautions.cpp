// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/text/cautions.h"

#include <QCoreApplication>

namespace dampwright {

namespace {

struct Cautions {
  Q_DECLARE_TR_FUNCTIONS(Cautions)
};

}  // namespace

QStringList cautions() {
  return {
      Cautions::tr("Gas-charged dampers are under pressure: do not puncture, heat or open one "
                   "before its charge is let out by the maker's procedure."),
      Cautions::tr("A coil-over's spring stores enough energy to kill: take it off with a proper "
                   "compressor before the bench test, and never stand in line with it."),
      Cautions::tr("Keep hands clear of the moving crosshead, use the guard and the stop button."),
      Cautions::tr("The body gets hot enough to burn."),
      Cautions::tr("Wear eye protection."),
      Cautions::tr("Stay inside the damper's stroke and the load cell's range."),
  };
}

}  // namespace dampwright
