// SPDX-License-Identifier: GPL-3.0-or-later
// bench_accuracy [runs] [seed]: how well the measurement meets its targets on made runs with known
// truth. Prints a table for each kind of run.
#include <algorithm>
#include <atomic>
#include <cstdio>
#include <cstdlib>
#include <mutex>
#include <thread>
#include <vector>

#include "tests/bench/accuracy/compare.h"

namespace dampwright::accuracy {
namespace {

struct Tallies {
  Tally standardKnown, standardUnknown, drawnKnown, drawnUnknown;

  Tally& of(const MadeCase& made) {
    if (made.standardBench) return made.knownForms ? standardKnown : standardUnknown;
    return made.knownForms ? drawnKnown : drawnUnknown;
  }
};

Tallies compareAll(std::uint64_t runs, std::uint64_t seed) {
  Tallies tallies;
  std::mutex lock;
  std::atomic<std::uint64_t> next{0};
  std::vector<std::jthread> workers;
  const unsigned threads = std::max(1u, std::thread::hardware_concurrency());
  for (unsigned i = 0; i < threads; ++i) {
    workers.emplace_back([&] {
      for (std::uint64_t number = next++; number < runs; number = next++) {
        const MadeCase made = drawCase(seed, number);
        const Tally tally = compare(made, seed * 7919 + 2 * number);
        const std::lock_guard guard(lock);
        tallies.of(made).merge(tally);
      }
    });
  }
  workers.clear();
  return tallies;
}

void print(const char* title, const Tally& tally, Judged judged) {
  std::printf("\n### %s\n\n", title);
  tally.print(judged);
}

}  // namespace
}  // namespace dampwright::accuracy

int main(int argc, char** argv) {
  using namespace dampwright::accuracy;
  const auto number = [&](int place, std::uint64_t otherwise) {
    return argc > place ? std::strtoull(argv[place], nullptr, 10) : otherwise;
  };
  const std::uint64_t runs = number(1, 300), seed = number(2, 1);
  if (runs == 0) {
    std::fprintf(stderr, "usage: bench_accuracy [runs] [seed]\n");
    return 64;
  }
  const Tallies tallies = compareAll(runs, seed);
  std::printf("%llu runs, seed %llu\n",
              static_cast<unsigned long long>(runs),
              static_cast<unsigned long long>(seed));
  print("2 kHz, 2 N and 0.01 mm of noise, sine or crank; forms known to core/laws",
        tallies.standardKnown,
        Judged::Everything);
  print("The same bench; valve and friction of forms that core/laws does not have",
        tallies.standardUnknown,
        Judged::Everything);
  print("Rates of 1 to 5 kHz, 0.5 to 5 N, 0.002 to 0.02 mm, sine, crank or triangle; known forms",
        tallies.drawnKnown,
        Judged::CoverageOnly);
  print("The same benches; unknown forms", tallies.drawnUnknown, Judged::CoverageOnly);
  return 0;
}
