// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/workshop_settings.h"

#include <QSettings>

namespace dampwright {

namespace {

const QString nameKey = QStringLiteral("workshop/name");
const QString addressKey = QStringLiteral("workshop/address");

}  // namespace

Workshop keptWorkshop() {
  const QSettings settings;
  return {settings.value(nameKey).toString(), settings.value(addressKey).toString()};
}

void keepWorkshop(const Workshop& workshop) {
  QSettings settings;
  settings.setValue(nameKey, workshop.name);
  settings.setValue(addressKey, workshop.address);
}

}  // namespace dampwright
