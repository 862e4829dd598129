// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <vector>

#include "tests/samples/scenario_truth.h"

// The documents that go with the sample runs, written here by hand from the scenario (not by the
// program's own writers, which read them in tests), and the truth as a document for tests.
namespace dampwright::samples {

/// Rig profiles, damper cards, limit sheets and jobs.
std::vector<SampleFile> documentsOf(const std::vector<SampleVehicle>& vehicles,
                                    const std::vector<SampleTruth>& truths);

/// truth.json: for each damper and setting its files, documents, true readings and promises.
SampleFile truthDocument(const std::vector<SampleVehicle>& vehicles,
                         const std::vector<SampleTruth>& truths);

/// README.md with the scenario and the truth as tables.
SampleFile readme(const std::vector<SampleVehicle>& vehicles,
                  const std::vector<SampleTruth>& truths);

/// File names of the documents.
std::string rigFile(const SampleRig& rig);
std::string cardFile(const SampleDamper& damper);

/// "compression" or "rebound".
std::string nameOf(Direction direction);

}  // namespace dampwright::samples
