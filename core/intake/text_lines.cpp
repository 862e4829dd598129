// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/text_lines.h"

#include <algorithm>

#include "core/intake/letters.h"

namespace dampwright {
namespace {

constexpr std::size_t lineEndBytes = std::size_t{64} << 10;
constexpr std::size_t headLines = 1000;
constexpr std::size_t mostLines = 2'000'000;  // 100 MB to remember them
constexpr std::size_t spreadPlaces = 40;
constexpr std::size_t linesPerPlace = 25;
constexpr std::size_t placeBytes = std::size_t{64} << 10;
constexpr std::int64_t longestQuoted = 20;  // lines that one quoted field may run over

bool separates(char letter) {
  return letter == ',' || letter == ';' || letter == '\t' || letter == '|' || letter == ' ';
}

// Whether a quoted field is still open at the end. Only a quote at the start of a field opens, so
// that an inch sign in a name does no harm.
bool endsInsideQuotes(std::string_view text) {
  bool inside = false;
  for (std::size_t i = text.find('"'); i < text.size(); i = text.find('"', i + 1)) {
    const bool doubled = inside && i + 1 < text.size() && text[i + 1] == '"';
    if (doubled) {
      ++i;
    } else if (inside || i == 0 || separates(text[i - 1])) {
      inside = !inside;
    }
  }
  return inside;
}

std::string_view withoutReturns(std::string_view line) {
  while (line.ends_with('\r')) line.remove_suffix(1);
  return line;
}

bool hasLoneReturn(std::string_view text) {
  for (std::size_t at = text.find('\r'); at != text.npos; at = text.find('\r', at + 1)) {
    const std::size_t next = text.find_first_not_of('\r', at);
    if (next != text.npos && text[next] != '\n') return true;
    if (next == text.npos) return false;
    at = next;
  }
  return false;
}

}  // namespace

std::optional<std::string> withOneLineEnd(std::string_view text) {
  if (text.find('\n') == text.npos || !hasLoneReturn(text.substr(0, lineEndBytes))) {
    return std::nullopt;
  }
  std::string even;
  even.reserve(text.size());
  bool quoted = false;
  for (std::size_t i = 0; i < text.size(); ++i) {
    quoted = quoted != (text[i] == '"');
    if (text[i] != '\r' || quoted) {
      even += text[i];
      continue;
    }
    const std::size_t next = std::min(text.find_first_not_of('\r', i), text.size());
    if (next == text.size() || text[next] != '\n') even.append(next - i, '\n');
    i = next - 1;
  }
  return even;
}

LineEnd findLineEnd(std::string_view text) {
  const std::size_t first = text.find('\n');
  if (first == text.npos) {
    return text.find('\r') == text.npos ? LineEnd{} : LineEnd{"CR", '\r'};
  }
  const std::size_t end = std::max(std::min(text.size(), lineEndBytes), first + 1);
  std::vector<std::string> kinds;
  for (std::size_t at = first; at < end; at = text.find('\n', at + 1)) {
    std::size_t returns = 0;
    while (returns < 2 && returns < at && text[at - 1 - returns] == '\r') ++returns;
    const std::string kind = returns == 0 ? "LF" : returns == 1 ? "CRLF" : "CRCRLF";
    if (std::find(kinds.begin(), kinds.end(), kind) == kinds.end()) kinds.push_back(kind);
  }
  return {kinds.size() == 1 ? kinds.front() : "mixed", '\n'};
}

LineReader::LineReader(std::string_view text, char lineEnd, std::size_t from, std::int64_t number)
    : text_(text),
      lineEnd_(lineEnd),
      quotes_(text.find('"') != text.npos),
      at_(from),
      number_(number) {}

std::optional<Line> LineReader::next() {
  if (at_ >= text_.size()) return std::nullopt;
  Line line{{}, number_, 0, true};
  std::size_t end = at_;
  while (true) {
    const std::size_t stop = text_.find(lineEnd_, end);
    line.terminated = stop != text_.npos;
    const std::size_t last = line.terminated ? stop : text_.size();
    ++line.count;
    // An open quote that is not closed soon is no quote: the first line then stands alone.
    const bool open = quotes_ && endsInsideQuotes(text_.substr(at_, last - at_));
    if (open && line.terminated && line.count < longestQuoted && last - at_ < longestLine) {
      end = last + 1;
      continue;
    }
    const std::size_t first = open ? std::min(text_.find(lineEnd_, at_), text_.size()) : last;
    if (open) {
      line.terminated = first < text_.size();
      line.count = 1;
    }
    line.text = withoutReturns(text_.substr(at_, first - at_));
    at_ = std::min(first + 1, text_.size());
    number_ += line.count;
    return line;
  }
}

bool isComment(std::string_view line) {
  const std::string_view text = trimmed(line);
  return text.starts_with('#') || text.starts_with('%') || text.starts_with("//");
}

Error lineTooLong(const Line& line) {
  return {"line-too-long",
          {{"most", static_cast<double>(longestLine), Quantity::Count}},
          {"", line.number, 0}};
}

Result<SampleLines> everyLine(std::string_view text, char lineEnd) {
  SampleLines lines;
  LineReader reader(text, lineEnd);
  while (lines.head.size() + lines.spread.size() < mostLines) {
    const auto line = reader.next();
    if (!line) break;
    if (line->text.size() > longestLine) return lineTooLong(*line);
    (lines.head.size() < headLines ? lines.head : lines.spread).push_back(*line);
  }
  return lines;
}

Result<SampleLines> sampleLines(std::string_view text, char lineEnd) {
  SampleLines sample;
  LineReader head(text, lineEnd);
  while (sample.head.size() < headLines) {
    const auto line = head.next();
    if (!line) return sample;
    if (line->text.size() > longestLine) return lineTooLong(*line);
    sample.head.push_back(*line);
  }
  const std::size_t rest = text.size() - head.position();
  for (std::size_t place = 0; place < spreadPlaces; ++place) {
    const std::size_t start = head.position() + rest / spreadPlaces * place;
    const std::string_view part = text.substr(start, placeBytes);
    LineReader reader(part, lineEnd, std::min(part.find(lineEnd), part.size() - 1) + 1, 0);
    for (std::size_t i = 0; i < linesPerPlace; ++i) {
      const auto line = reader.next();
      if (!line || !line->terminated) break;
      sample.spread.push_back({line->text, 0, 1, true});
    }
  }
  return sample;
}

}  // namespace dampwright
