// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QWidget>

namespace dampwright {

/// Version, licence and what the program is made with.
void showAbout(QWidget* parent);

}  // namespace dampwright
