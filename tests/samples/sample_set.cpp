// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/samples/sample_set.h"

#include <future>

#include "tests/samples/sample_documents.h"

namespace dampwright::samples {

std::vector<SampleFile> makeSamples() {
  const std::vector<SampleVehicle> vehicles = {car(), motorcycle()};
  const std::vector<std::vector<SampleDamper>> dampers = {carDampers(), motorcycleDampers()};
  std::vector<std::future<SampleTruth>> running;
  for (std::size_t i = 0; i < vehicles.size(); ++i)
    for (const SampleDamper& damper : dampers[i])
      running.push_back(std::async(std::launch::async, [damper, vehicle = vehicles[i]] {
        return truthOf(damper, vehicle);
      }));
  std::vector<SampleTruth> truths;
  for (auto& one : running) truths.push_back(one.get());
  std::vector<SampleFile> files = documentsOf(vehicles, truths);
  files.push_back(truthDocument(vehicles, truths));
  files.push_back(readme(vehicles, truths));
  for (const SampleTruth& truth : truths)
    files.insert(files.end(), truth.files.begin(), truth.files.end());
  return files;
}

}  // namespace dampwright::samples
