// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
#include <string_view>

#include "core/base/direction.h"
#include "core/trace/trace.h"

namespace dampwright {

/// Where in a name a trade word counts.
enum class Where {
  Anywhere,  ///< also inside a longer word ("Kolbenweg")
  Tail,      ///< a word ends with it ("Radlast")
  Alone,     ///< a word of its own ("pos")
  Whole,     ///< all there is ("t")
  Aside      ///< anywhere, but only where no other word says more ("compression force")
};

/// Trade words of one language for one role: as `folded` makes them (core/intake/letters.h),
/// parted by blanks. Role::Other: the column is none that a damper run needs.
struct ColumnWords {
  Role role;
  Where where;
  std::string_view words;
};

/// All of them; a new language is a few more rows.
std::span<const ColumnWords> columnWords();

/// Words that say that a column is what was asked of the rig, not what was measured.
std::string_view commandWords();

/// Words that lead over to what belongs to the noun before them ("force de compression").
std::string_view linkingWords();

/// Words of one direction of the damper.
struct StrokeWords {
  Direction direction;
  std::string_view words;
};
std::span<const StrokeWords> strokeWords();

/// Words that say "positive" and "negative" of a sign.
std::string_view positiveWords();
std::string_view negativeWords();

}  // namespace dampwright
