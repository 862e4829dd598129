// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/job/job.h"

namespace dampwright {

std::vector<std::string> cornersOf(VehicleKind kind) {
  switch (kind) {
    case VehicleKind::Car:
      return {"front left", "front right", "rear left", "rear right"};
    case VehicleKind::Motorcycle:
      return {"front", "rear"};
    case VehicleKind::SingleDamper:
      break;
  }
  return {"damper"};
}

}  // namespace dampwright
