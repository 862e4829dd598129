// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/signature.h"

#include "core/intake/letters.h"

namespace dampwright {
namespace {

std::string asciiLowered(std::string text) {
  for (char& letter : text) {
    if (letter >= 'A' && letter <= 'Z') letter = static_cast<char>(letter - 'A' + 'a');
  }
  return text;
}

}  // namespace

std::string signatureOf(std::span<const SignatureColumn> columns) {
  std::string signature;
  for (const SignatureColumn& column : columns) {
    if (&column != columns.data()) signature += '|';
    signature += asciiLowered(withSingleBlanks(column.name));
    if (!column.unit.empty()) signature.append(" [").append(column.unit).append("]");
  }
  return signature;
}

std::string signatureOfUnnamed(std::size_t columns, std::string_view delimiter) {
  return "unnamed|" + std::to_string(columns) + " columns|" + std::string(delimiter);
}

}  // namespace dampwright
