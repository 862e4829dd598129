// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QColor>
#include <QPalette>

namespace dampwright {

/// Colours by what they are for. Text roles reach 4.5:1 on `card` and `paper`, lines and marks 3:1
/// (WCAG 2.2, 1.4.3 and 1.4.11); a hairline only divides and carries no meaning.
struct Palette {
  QColor paper;        ///< behind everything
  QColor card;         ///< behind text and data
  QColor ink;          ///< text, stamps
  QColor quiet;        ///< secondary text
  QColor hairline;     ///< frames and grid
  QColor action;       ///< what can be pressed or is selected; first series
  QColor onAction;     ///< text on `action`
  QColor selected;     ///< fill behind what is selected
  QColor evidence;     ///< what a finding points at; second series
  QColor third;        ///< third series
  QColor fourth;       ///< fourth series
  QColor band;         ///< fill of a limit band, drawn before everything else
  QColor bandOutline;  ///< its outline: a fill alone dies on a copier
};

const Palette& lightPalette();
const Palette& darkPalette();
/// White paper with the light palette's inks: sheets are never dark.
const Palette& printPalette();

/// The palette that fits a window's own colours: dark where its text is lighter than its ground.
/// Widgets ask with their palette() and again on QEvent::PaletteChange.
const Palette& paletteFor(const QPalette& window);

/// The same roles for Qt's own widgets.
QPalette asQPalette(const Palette& palette);

/// Contrast of two opaque colours, 1 to 21. Source: WCAG 2.2, definition of contrast ratio and
/// relative luminance (sRGB, threshold 0.04045).
double contrastRatio(const QColor& one, const QColor& other);

}  // namespace dampwright
