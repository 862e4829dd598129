// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/recognise_other.h"

#include <array>
#include <string>

namespace dampwright {
namespace {

using std::string_view_literals::operator""sv;

struct Mark {
  std::string_view first;  ///< the file's first bytes
  std::string_view kind;
};

constexpr std::array pictures{
    Mark{"\x89PNG\r\n\x1a\n"sv, "PNG"},
    Mark{"\xFF\xD8\xFF"sv, "JPEG"},
    Mark{"GIF87a"sv, "GIF"},
    Mark{"GIF89a"sv, "GIF"},
    Mark{"II*\0"sv, "TIFF"},
    Mark{"MM\0*"sv, "TIFF"},
};
constexpr std::array archives{
    Mark{"PK\x03\x04"sv, "zip archive or workbook"},
    Mark{"\xD0\xCF\x11\xE0\xA1\xB1\x1A\xE1"sv, "old workbook"},
    Mark{"\x1F\x8B"sv, "gzip archive"},
    Mark{"7z\xBC\xAF\x27\x1C"sv, "7z archive"},
    Mark{"Rar!\x1A\x07"sv, "rar archive"},
    Mark{"BZh"sv, "bzip2 archive"},
    Mark{"\xFD"
         "7zXZ\0"sv,
         "xz archive"},
};

template <std::size_t N>
std::string kindOf(std::string_view bytes, const std::array<Mark, N>& marks) {
  for (const Mark& mark : marks) {
    if (bytes.starts_with(mark.first)) return std::string(mark.kind);
  }
  return {};
}

// "BM", then the size, then four bytes that are always zero: text never has those.
bool isBitmap(std::string_view bytes) {
  return bytes.starts_with("BM") && bytes.size() > 10 && bytes.substr(6, 4) == "\0\0\0\0"sv;
}

}  // namespace

std::optional<Error> recogniseOther(std::string_view bytes) {
  const std::string picture = isBitmap(bytes) ? "BMP" : kindOf(bytes, pictures);
  if (!picture.empty()) return Error{"file-is-picture", {{"kind", picture}}, {}};
  if (bytes.starts_with("%PDF-")) return Error{"file-is-document", {{"kind", "PDF"}}, {}};
  const std::string archive = kindOf(bytes, archives);
  if (!archive.empty()) return Error{"file-is-archive", {{"kind", archive}}, {}};
  return std::nullopt;
}

}  // namespace dampwright
