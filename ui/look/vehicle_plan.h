// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QPainter>
#include <QPointF>
#include <QRectF>
#include <QSizeF>
#include <string>
#include <vector>

#include "core/job/job.h"
#include "ui/look/palette.h"

namespace dampwright {

/// One place of a damper in a plan view.
struct VehiclePlace {
  std::string corner;  ///< as in cornersOf(kind)
  QRectF card;         ///< where its card sits, inside the area, none over another
};

/// Where the cards of a vehicle sit in `area`, in the order of cornersOf(kind): a car's at its four
/// corners, a motorcycle's and a single damper's beside the drawing. Cards are as asked, or
/// narrower and lower where the area is too small for them.
std::vector<VehiclePlace> vehiclePlaces(VehicleKind kind, const QRectF& area, const QSizeF& card);

/// The vehicle from above, front up, in thin lines; drawn before the cards.
void paintVehicle(QPainter& painter,
                  VehicleKind kind,
                  const QRectF& area,
                  const QSizeF& card,
                  const Palette& palette);

}  // namespace dampwright
