// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

enum class Theme { Light, Dark };

/// Style, font, palette and style sheet of the whole application. Light is the default: it reads
/// better in a workshop's glare.
void applyTheme(Theme theme);

/// As chosen last; light where nothing or nonsense is kept.
Theme keptTheme();
void keepTheme(Theme theme);

}  // namespace dampwright
