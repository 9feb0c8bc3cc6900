#pragma once

#include "assessment/assessment.h"
#include "assessment/exposure.h"
#include "assessment/search.h"

/// Derivations in words and numbers. They are composed only when asked for, so the calculation pays nothing
/// for them; each repeats the formula that the calculation uses and shows its intermediate values.
namespace dosimetry {

Trail trail_of_criterion(const LaserSetup& stated, const Arrival& arrival, const Laser& laser,
                         Duration exposure, const Evaluated& evaluated, const LimitSet& set);
Trail trail_of_photon_energy(const Laser& laser);
Trail trail_of_photon_rate(const Laser& laser);
Trail trail_of_photons_per_area(const LaserSetup& stated, const Arrival& arrival, const Laser& laser,
                                Duration exposure);
Trail trail_of_permitted_exposure(const PermittedExposure& permitted,
                                  const std::vector<Evaluated>& at_permitted, const LimitSet& set);
Trail trail_of_permitted_power(const Laser& laser, double governing_ratio);
Trail trail_of_density(Tissue tissue, double largest_ratio);
Trail trail_of_distance(const LaserSetup& stated, const Laser& laser, const LimitSet& set, Tissue tissue,
                        Duration exposure, const OuterEdge& edge);

}  // namespace dosimetry
