// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>

#include "core/job/job.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// One line of a list of jobs, read without opening the job.
struct JobSummary {
  std::string number, customer, vehicle, plate;
  std::string opened;  ///< ISO 8601 with offset
  bool invented = false;
  std::optional<VerdictWord> verdict;  ///< of the job as a whole; nothing: not yet judged

  bool operator==(const JobSummary&) const = default;
};

}  // namespace dampwright
