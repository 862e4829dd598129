// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QString>

#include "ui/look/palette.h"

namespace dampwright {

/// How Qt's own widgets look: cards, buttons, fields, menus. Set once on the application, and again
/// with the palette when the theme changes. A frame named "card" is a card; a button named
/// "primary" is the one to press next; a label named "quiet" is secondary; a frame named "notice"
/// asks for something.
QString styleSheet(const Palette& palette);

}  // namespace dampwright
