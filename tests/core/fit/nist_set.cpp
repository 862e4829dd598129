// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/core/fit/nist_set.h"

#include <gtest/gtest.h>

#include <cmath>
#include <fstream>
#include <map>
#include <sstream>

namespace dampwright::test {
namespace {

using Eigen::VectorXd;

VectorXd column(const std::vector<std::vector<double>>& rows, std::size_t index) {
  VectorXd values(static_cast<Eigen::Index>(rows.size()));
  for (std::size_t i = 0; i < rows.size(); ++i) {
    values[static_cast<Eigen::Index>(i)] = rows[i].at(index);
  }
  return values;
}

std::vector<double> numbersOf(const std::string& text) {
  std::istringstream stream(text);
  std::vector<double> numbers;
  for (double number = 0; stream >> number;) numbers.push_back(number);
  return numbers;
}

double cubicOverCubic(double x, const VectorXd& b) {
  return (b[0] + x * (b[1] + x * (b[2] + x * b[3]))) / (1 + x * (b[4] + x * (b[5] + x * b[6])));
}

}  // namespace

NistSet readNistSet(const std::string& name) {
  const std::string path = DAMPWRIGHT_SOURCE_DIR "/tests/reference/nist/" + name + ".dat";
  std::ifstream file(path);
  EXPECT_TRUE(file.good()) << path;
  NistSet set;
  set.name = name;
  std::vector<std::vector<double>> parameters;
  std::vector<std::vector<double>> data;
  int dataHeadings = 0;  // "Data:" stands once above the description and once above the numbers
  for (std::string line; std::getline(file, line);) {
    const auto equals = line.find(" = ");
    if (line.rfind("Data:", 0) == 0) ++dataHeadings;
    if (line.rfind("  b", 0) == 0 && equals != std::string::npos) {
      parameters.push_back(numbersOf(line.substr(equals + 3)));
    } else if (line.rfind("Residual Sum of Squares:", 0) == 0) {
      set.rss = numbersOf(line.substr(24)).at(0);
    } else if (dataHeadings == 2 && numbersOf(line).size() == 2) {
      data.push_back(numbersOf(line));
    }
  }
  set.start1 = column(parameters, 0);
  set.start2 = column(parameters, 1);
  set.certified = column(parameters, 2);
  set.deviations = column(parameters, 3);
  set.y = column(data, 0);
  set.x = column(data, 1);
  return set;
}

NistModel nistModel(const std::string& name) {
  static const std::map<std::string, NistModel> models = {
      {"Misra1a", [](double x, const VectorXd& b) { return b[0] * (1 - std::exp(-b[1] * x)); }},
      {"Hahn1", cubicOverCubic},
      {"Thurber", cubicOverCubic},
      {"MGH17",
       [](double x, const VectorXd& b) {
         return b[0] + b[1] * std::exp(-x * b[3]) + b[2] * std::exp(-x * b[4]);
       }},
      {"MGH09",
       [](double x, const VectorXd& b) {
         return b[0] * (x * x + x * b[1]) / (x * x + x * b[2] + b[3]);
       }},
      {"Rat43", [](double x, const VectorXd& b) {
         return b[0] / std::pow(1 + std::exp(b[1] - b[2] * x), 1 / b[3]);
       }}};
  return models.at(name);
}

double rightDigits(const VectorXd& found, const VectorXd& certified) {
  const double worst = (found - certified).cwiseQuotient(certified).cwiseAbs().maxCoeff();
  return std::isfinite(worst) ? std::min(11.0, -std::log10(worst)) : 0;
}

}  // namespace dampwright::test
