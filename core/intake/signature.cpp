// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/signature.h"

namespace dampwright {
namespace {

bool isBlank(char letter) { return letter == ' ' || letter == '\t'; }

char lower(char letter) {
  return letter >= 'A' && letter <= 'Z' ? static_cast<char>(letter - 'A' + 'a') : letter;
}

std::string tidyName(std::string_view name) {
  std::string tidy;
  for (const char letter : name) {
    if (!isBlank(letter)) {
      tidy += lower(letter);
    } else if (!tidy.empty() && tidy.back() != ' ') {
      tidy += ' ';
    }
  }
  if (!tidy.empty() && tidy.back() == ' ') tidy.pop_back();
  return tidy;
}

}  // namespace

std::string signatureOf(std::span<const SignatureColumn> columns) {
  std::string signature;
  for (const SignatureColumn& column : columns) {
    if (&column != columns.data()) signature += '|';
    signature += tidyName(column.name);
    if (!column.unit.empty()) signature.append(" [").append(column.unit).append("]");
  }
  return signature;
}

std::string signatureOfUnnamed(std::size_t columns, std::string_view delimiter) {
  return "unnamed|" + std::to_string(columns) + " columns|" + std::string(delimiter);
}

}  // namespace dampwright
