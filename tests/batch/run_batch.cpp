// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/batch/run_batch.h"

#include <sys/wait.h>
#include <unistd.h>

#include <cmath>
#include <cstdlib>
#include <fstream>
#include <iterator>
#include <sstream>

#include "tests/core/verdict/made_measurement.h"

namespace dampwright {

namespace fs = std::filesystem;

Folder::Folder() {
  std::string name = (fs::temp_directory_path() / "dampwright-batch-").string();
  name.append(6, 'X');  // what mkdtemp fills in
  path_ = ::mkdtemp(name.data());
}

Folder::~Folder() {
  std::error_code ignored;
  fs::remove_all(path_, ignored);
}

void Folder::write(const std::string& name, const std::string& bytes) const {
  std::ofstream(path_ / name, std::ios::binary) << bytes;
}

std::string Folder::read(const std::string& name) const {
  std::ifstream stream(path_ / name, std::ios::binary);
  return {std::istreambuf_iterator<char>(stream), {}};
}

int Folder::entries() const {
  return static_cast<int>(std::distance(fs::directory_iterator(path_), fs::directory_iterator()));
}

Ended Folder::shell(const std::string& line) const {
  const Folder talk;
  const std::string out = (talk.path_ / "out").string(), err = (talk.path_ / "err").string();
  const std::string whole = "cd '" + path_.string() +
                            "' && BATCH='" DAMPWRIGHT_BINARY_DIR "/bin/dampwright-batch' && { " +
                            line + "\n} >'" + out + "' 2>'" + err + "'";
  const int status = std::system(whole.c_str());
  return {WIFEXITED(status) ? WEXITSTATUS(status) : -1, talk.read("out"), talk.read("err")};
}

std::string linearDamperRun(double coefficient) {
  constexpr double amplitude = 25, rate = 1000;  // mm, Hz
  std::ostringstream text;
  text.imbue(std::locale::classic());
  text.precision(9);
  text << "Time [s],Displacement [mm],Force [N]\n";
  double start = 0;
  for (const double speed : {100.0, 200.0, 300.0}) {  // mm/s
    const double omega = speed / amplitude;
    const double period = 2 * pi / omega;
    const int samples = static_cast<int>(8 * period * rate);
    for (int i = 0; i < samples; ++i) {
      const double t = i / rate;
      const double swing = static_cast<int>(t / period) % 2 == 0 ? 1.002 : 0.998;
      const double x = amplitude * std::sin(omega * t);
      const double v = speed * std::cos(omega * t);
      text << start + t << ',' << x << ',' << coefficient * v / 1000 * swing << '\n';
    }
    start += samples / rate;
  }
  return text.str();
}

Measurement storedMeasurement() {
  Measurement made = madeMeasurement();
  addPoint(made, Direction::Rebound, {0.3, 600, 0.05, 0, 6, 1000});
  addPoint(made, Direction::Compression, {0.3, 600, 0.05, 0, 6, 1000});
  return made;
}

Limits reboundLimits(double min, double max) {
  Check check;
  check.check = "force";
  check.direction = Direction::Rebound;
  check.velocity = 0.3;
  check.min = min;
  check.max = max;
  Limits limits;
  limits.title = "invented";
  limits.checks = {check};
  return limits;
}

}  // namespace dampwright
