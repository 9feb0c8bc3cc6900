#pragma once

#include <string>
#include <vector>

#include "limits/limit_row.h"
#include "sources/laser_setup.h"

namespace dosimetry {

class LimitLibrary;

/// A place where a person may be.
struct PositionSetup {
    std::string id;
    Stated<Length> at;          ///< along the beam from the exit of the source
    Stated<Duration> exposure;  ///< longest exposure to be assumed in a day
    bool eye = true;
    bool skin = true;
    friend bool operator==(const PositionSetup&, const PositionSetup&) = default;
    bool has(Tissue tissue) const { return tissue == Tissue::eye ? eye : skin; }
};

/// One assessment as the user states it: a plain value that files, undo steps and the calculation share.
struct Setup {
    std::string title;
    std::string place;
    std::string assessor;
    std::string date;  ///< YYYY-MM-DD, or empty
    std::string note;
    std::vector<std::string> limits;  ///< edition ids; the first one is reported as governing
    std::vector<LaserSetup> sources;
    std::vector<PositionSetup> positions;
    friend bool operator==(const Setup&, const Setup&) = default;
};

/// Throws InputError, with the key of the value, for whatever cannot be assessed: values that are not
/// positive or too large to calculate with, contradictions, unknown editions, no source or position. Values
/// that are merely outside a published table are in order here; the assessment then answers "not covered".
void check(const Setup& setup, const LimitLibrary& library);

}  // namespace dosimetry
