// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// What a number is a measure of. Inside the program every number is in the SI unit of its
/// quantity.
enum class Quantity {
  None,         ///< [1] a plain number
  Count,        ///< [1] a whole number of things
  Time,         ///< s
  Length,       ///< m
  Velocity,     ///< m/s
  Force,        ///< N
  Temperature,  ///< °C (the one quantity kept in a non-SI unit: damper temperatures are only ever
                ///< compared)
  Energy,       ///< J
  Power,        ///< W
  Damping,      ///< N·s/m
  Stiffness,    ///< N/m
  Mass,         ///< kg
  Frequency,    ///< Hz
  Angle,        ///< rad
  Voltage,      ///< V, a channel that still needs a scale
  Percent       ///< %
};

}  // namespace dampwright
