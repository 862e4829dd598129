// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QStringList>

namespace dampwright {

/// What a person at a damper rig must know, one caution each, whole sentences. The same words at
/// the first start, in the help menu and on every sheet.
QStringList cautions();

}  // namespace dampwright
