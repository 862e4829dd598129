// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/identify/fitted_law.h"

#include "core/laws/law.h"

namespace dampwright {

double FittedLaw::at(double velocity) const {
  const Law* form = findLaw(law);
  if (form == nullptr || parameters.size() != form->parameters.size()) return 0;
  std::vector<double> values;
  values.reserve(parameters.size());
  for (const FittedParameter& parameter : parameters) values.push_back(parameter.value);
  return form->force(values, velocity);
}

const FittedLaw* chosenLaw(std::span<const FittedLaw> laws) {
  for (const FittedLaw& law : laws) {
    if (law.chosen) return &law;
  }
  return nullptr;
}

}  // namespace dampwright
