// SPDX-License-Identifier: GPL-3.0-or-later
// dampwright-batch: the same engine without a window. Links core only.
#include <csignal>
#include <iostream>
#include <new>

#include "app/batch_files.h"
#include "app/batch_verbs.h"
#include "core/words/words.h"

namespace dampwright {
namespace {

int fail(const Error& error, int status) {
  std::cerr << englishLine(error) << '\n';
  return status;
}

Result<BatchAnswer> answerTo(const BatchRequest& request) {
  switch (request.verb) {
    case BatchVerb::Columns:
      return columnsVerb(request);
    case BatchVerb::Measure:
      return measureVerb(request);
    case BatchVerb::Judge:
      return judgeVerb(request);
    case BatchVerb::Sheet:
      break;
  }
  return Error{"sheet-program-missing", {}, {}};
}

int putOut(const BatchRequest& request, const BatchAnswer& answer) {
  const auto written = writeOutput(request.out, answer.text);
  return written ? answer.status : fail(written.error(), exit_status::noOutput);
}

int run(int argc, char** argv) {
  const ParsedRequest parsed = parseRequest(argc, argv);
  if (!parsed.request) {
    if (parsed.status != exit_status::done) {
      std::cerr << parsed.text;
      return parsed.status;
    }
    return putOut({}, {parsed.text, exit_status::done});
  }
  if (parsed.request->verb == BatchVerb::Sheet) return fail(sheetVerb(argv), exit_status::noOutput);
  const auto answer = answerTo(*parsed.request);
  if (!answer) return fail(answer.error(), exit_status::badInput);
  return putOut(*parsed.request, answer.value());
}

}  // namespace
}  // namespace dampwright

int main(int argc, char** argv) {
  std::signal(SIGPIPE, SIG_IGN);  // a reader that went away is an output that can't be written
  try {
    return dampwright::run(argc, argv);
  } catch (const std::bad_alloc&) {
    return dampwright::fail({"out-of-memory", {}, {}}, dampwright::exit_status::badInput);
  }
}
