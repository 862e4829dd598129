// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>
#include <QRectF>
#include <QString>

#include "core/verdict/verdict.h"
#include "ui/look/palette.h"

namespace dampwright {

/// A verdict as an inspector would press it, told apart by shape before colour:
/// pass: outline and tick; fail: solid with a white cross; too close to call: broken outline and ≈;
/// not tested: dotted grey outline and a dash. `words` (ui/text verdictName) are set in capitals
/// and always fit: on two lines or smaller where the frame is narrow, never cut, never outside.
void paintStamp(QPainter& painter,
                const QRectF& frame,
                VerdictWord verdict,
                const QString& words,
                const Palette& palette);

/// The mark alone (tick, cross, ≈, dash), centred in a square box; for table rows.
void paintMark(QPainter& painter, const QRectF& box, VerdictWord verdict, const QColor& colour);

}  // namespace dampwright
