// SPDX-License-Identifier: GPL-3.0-or-later
#include "made_jobs.h"

#include <random>

#include "core/base/sha256.h"

namespace dampwright {

Job madeJob(const std::string& number) {
  Job job;
  job.number = number;
  job.customer = "A. Customer";
  job.vehicle = "invented estate car";
  job.plate = "AB 123";
  job.opened = "2031-05-06T07:08:09+02:00";
  for (const std::string& corner : cornersOf(job.kind)) job.items.push_back({corner, {}, {}});
  job.items[0].damper.serial = "Sn-0042";
  job.items[0].damper.partNumber = "P 7";
  return job;
}

RunBytes runOf(const std::string& bytes) {
  return {"run.csv", sha256Hex(bytes), std::make_shared<const std::string>(bytes)};
}

Job jobWithRun(const std::string& number, const std::string& notes, const std::string& bytes) {
  Job job = madeJob(number);
  job.notes = notes;
  JobRun run;
  run.file = "run.csv";
  run.sha256 = sha256Hex(bytes);
  job.items[0].phases = {{Phase::AsFound, {}, {run}}};
  return job;
}

std::string bytesOf(int seed, std::size_t size) {
  std::mt19937 random(static_cast<unsigned>(seed));
  std::string bytes;
  bytes.reserve(size);
  while (bytes.size() < size) bytes += static_cast<char>(random() & 0xffU);
  return bytes;
}

}  // namespace dampwright
