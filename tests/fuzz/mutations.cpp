// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/fuzz/mutations.h"

#include <algorithm>

namespace dampwright {
namespace {

constexpr std::size_t longest = 6000;  // bytes: small files reach every branch sooner

std::size_t below(std::mt19937& random, std::size_t end) { return end == 0 ? 0 : random() % end; }

std::string once(std::string text,
                 const std::vector<std::string>& seeds,
                 const std::vector<std::string_view>& words,
                 std::mt19937& random) {
  const std::size_t at = below(random, text.size() + 1);
  const std::size_t length = 1 + below(random, random() % 4 == 0 ? 400 : 8);
  const std::string part = at < text.size() ? text.substr(at, length) : std::string();
  switch (random() % 7) {
    case 0:
      if (at < text.size()) text[at] = static_cast<char>(random() % 256);
      return text;
    case 1:
      return text.erase(std::min(at, text.size()), length);
    case 2:
      return text.insert(at, part);
    case 3:
      return text.substr(0, at);
    case 4: {
      const std::string& other = seeds[below(random, seeds.size())];
      const std::size_t from = below(random, other.size());
      return text.insert(at, other.substr(from, 1 + below(random, 300)));
    }
    default:
      return text.insert(at, words[below(random, words.size())]);
  }
}

}  // namespace

std::string mutated(const std::vector<std::string>& seeds,
                    const std::vector<std::string_view>& words,
                    std::mt19937& random) {
  std::string text = seeds[below(random, seeds.size())];
  const std::size_t changes = 1 + below(random, 6);
  for (std::size_t i = 0; i < changes; ++i) text = once(std::move(text), seeds, words, random);
  if (text.size() > longest) text.resize(longest);
  return text;
}

}  // namespace dampwright
