// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string_view>

namespace dampwright {

/// Reads any bytes as a run file and aborts where the reading breaks a promise: channels of one
/// length, a clock that never falls, codes that core/words knows. A first byte of 1 to 31 stands
/// for answers that the user gave (decimal mark, delimiter, rate, columns) and is taken off.
void readAnyRun(std::string_view bytes);

/// Reads any bytes as each of the JSON documents and aborts where one that was understood does not
/// come back the same from what is written.
void readAnyDocument(std::string_view bytes);

}  // namespace dampwright
