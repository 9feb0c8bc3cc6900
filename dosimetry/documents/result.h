#pragma once

#include <string>

#include "assessment/assessment.h"

namespace dosimetry {

/// "photon-margin 0.1.0"
std::string program_name();

/// The result of a covered assessment as JSON (docs/assessment_file.md): SI base units in the key's suffix,
/// every number finite, null for what does not exist. Ends with a line break.
std::string result_json(const Setup& setup, const Assessment& assessment, const std::string& input_sha256);

/// The result for people at a terminal, UTF-8. Exposures and distances are rounded up, limits and permitted
/// values down.
std::string report(const Setup& setup, const Assessment& assessment);

/// The two values of a criterion, four digits: exposures rounded up, limits down.
std::string exposure_text(const Criterion& criterion);
std::string limit_text(const Criterion& criterion);

/// An optical density rounded up to two decimals.
std::string density_text(double density);

/// The verdict on a position in words that need no colour: "ABOVE THE LIMIT. At 0.5 m the eye would receive
/// 5104 times the limit (retinal thermal)." A tissue that is not assessed is named.
std::string verdict(const PositionAssessment& position);

/// " (eye only)" where the other tissue is not assessed, otherwise empty.
std::string tissue_remark(const PositionAssessment& position);

/// "none", "beyond 1000 km", or the distance rounded up.
std::string distance_text(const HazardDistance& distance);

/// "longer than …", "none" or the duration rounded down.
std::string permitted_exposure_text(const PositionAssessment& position);

}  // namespace dosimetry
