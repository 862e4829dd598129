// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/main_window/about.h"

#include <QCoreApplication>
#include <QMessageBox>

namespace dampwright {

namespace {

struct About {
  Q_DECLARE_TR_FUNCTIONS(About)
};

}  // namespace

void showAbout(QWidget* parent) {
  QMessageBox::about(
      parent,
      About::tr("About Dampwright"),
      About::tr(
          "Dampwright %1\n\nFrom a damper's run file to a verdict with its uncertainty and a sheet "
          "for the customer.\n\nFree software under the GNU General Public License, version 3 or "
          "later. It comes without any warranty. Made with Qt, QCustomPlot, Eigen, nlohmann/json, "
          "Boost, OpenSSL and CLI11.")
          .arg(QStringLiteral(DAMPWRIGHT_VERSION)));
}

}  // namespace dampwright
