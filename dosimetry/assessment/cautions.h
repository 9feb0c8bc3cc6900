#pragma once

#include <string>
#include <vector>

#include "assessment/setup.h"
#include "limits/limit_set.h"

namespace dosimetry {

/// The cautions that stand on every window, sheet and report; they cannot be switched off. The general ones
/// come first, then those that this setup calls for.
std::vector<std::string> cautions_for(const Setup& setup, const std::vector<const LimitSet*>& sets);

/// What was taken for granted, each a sentence that the person who signs can check.
std::vector<std::string> assumptions_for(const Setup& setup);

}  // namespace dosimetry
