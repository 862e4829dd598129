// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>

#include "app/batch_request.h"
#include "core/base/result.h"
#include "core/measure/measurement.h"
#include "core/verdict/verdict.h"

namespace dampwright {

/// What a verb has to say: the text that goes out, and the status to end with when it has gone.
struct BatchAnswer {
  std::string text;
  int status = exit_status::done;
};

// One file for each verb, of the same name. Errors: the input can't be used.
Result<BatchAnswer> columnsVerb(const BatchRequest& request);
Result<BatchAnswer> measureVerb(const BatchRequest& request);
Result<BatchAnswer> judgeVerb(const BatchRequest& request);

/// What a program ends with after this verdict.
int statusOf(VerdictWord word);

/// Runs `dampwright` beside this program with the same arguments and without a window, in place of
/// this process: only comes back with an error, sheet-program-missing {path}.
Error sheetVerb(char** argv);

/// One run file read by the request's rig profile and answers.
Result<RunReading> readRunFile(const BatchRequest& request, const std::string& path);

/// The request's files, measured. Warnings go to standard error. Errors: those of reading,
/// run-given-twice, open-points, and the errors of core/measure and of the documents.
Result<Measurement> measureFiles(const BatchRequest& request);

}  // namespace dampwright
