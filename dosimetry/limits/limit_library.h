#pragma once

#include <memory>
#include <string>
#include <vector>

#include "limits/limit_set.h"

namespace dosimetry {

/// The editions that the program carries, in the order of their file names; read once and shared.
class LimitLibrary {
  public:
    static const LimitLibrary& embedded();

    const std::vector<LimitSet>& sets() const { return sets_; }
    /// Null if there is no such edition.
    const LimitSet* find(const std::string& id) const;
    /// "icnirp_2013_laser, …" for messages.
    std::string ids() const;

  private:
    std::vector<LimitSet> sets_;
};

}  // namespace dosimetry
