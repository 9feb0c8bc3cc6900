#pragma once

#include <string>
#include <vector>

#include "assessment/setup.h"
#include "limits/limit_set.h"

namespace dosimetry {

/// The cautions that stand on every window, sheet and report; they cannot be switched off. Those that
/// this setup calls for come first, then the general ones.
std::vector<std::string> cautions_for(const Setup& setup, const std::vector<const LimitSet*>& sets);

/// The caution for a tissue that was left out although its limit is exceeded.
std::string unassessed_caution(const PositionSetup& position, Tissue tissue, double ratio);

/// What was taken for granted, each a sentence that the person who signs can check.
std::vector<std::string> assumptions_for(const Setup& setup);

}  // namespace dosimetry
