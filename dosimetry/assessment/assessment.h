#pragma once

#include <optional>
#include <string>
#include <vector>

#include "assessment/setup.h"
#include "assessment/trail.h"
#include "limits/limit_set.h"

namespace dosimetry {

class LimitLibrary;

/// One exposure held against one limit. Exposure and limit have the same quantity.
struct Criterion {
    std::string limit_set;
    std::string source;
    Length wavelength;
    Tissue tissue{};
    Effect effect{};
    LimitQuantity quantity{};
    LimitValue exposure;
    LimitValue limit;
    double ratio = 0.0;  ///< exposure divided by limit; above 1 is above the limit
    double margin() const { return 1.0 / ratio; }
    std::string rule;
    Length aperture;
    PlaneAngle subtense;  ///< zero where the effect does not depend on it
    std::string clause;
    std::string provenance;
    std::string note;
    Trail trail;
};

/// The ratios of one tissue and effect taken together.
struct CombinedRatio {
    std::string limit_set;
    Tissue tissue{};
    Effect effect{};
    double ratio = 0.0;
};

struct PositionAssessment {
    std::string id;
    Stated<Length> at;
    Stated<Duration> exposure;
    bool eye = false;
    bool skin = false;
    Length beam_diameter;  ///< reference diameter of the profile there
    Irradiance peak_irradiance;
    PhotonExposure photons_per_area;  ///< at the beam's centre, over the exposure
    Trail photons_trail;
    std::vector<Criterion> criteria;
    std::vector<CombinedRatio> combined;
    CombinedRatio governing;  ///< the largest one of the first limit set
    const Criterion* governing_criterion() const;
    bool within_limits() const;  ///< of every limit set chosen
    /// Longest single exposure that is within all limits of the first set, from the shortest duration
    /// upwards; empty if even the shortest covered duration is above a limit. At most the longest covered
    /// duration.
    std::optional<Duration> permitted_exposure;
    bool permitted_for_whole_range = false;  ///< the whole published range of durations is within limits
    Trail permitted_exposure_trail;
    double permitted_power_factor = 0.0;  ///< factor on the power at which the governing ratio is 1
    RadiantPower permitted_power;
    Trail permitted_power_trail;
    std::optional<double> required_density_eye;  ///< optical density; empty if the tissue is not assessed
    std::optional<double> required_density_skin;
    Trail density_trail_eye;
    Trail density_trail_skin;
};

/// Where along the direct beam the exposure falls to the limit for the last time (NOHD for the eye).
struct HazardDistance {
    std::string source;
    std::string limit_set;
    Stated<Duration> exposure;
    Tissue tissue{};
    std::optional<Length> distance;  ///< zero: the limit is not exceeded anywhere in the search range
    std::optional<Length>
        beyond_search;  ///< set instead: still above the limit at this end of the search range
    Trail trail;
};

struct SourceAssessment {
    std::string id;
    PhotonEnergy photon_energy;
    PhotonRate photon_rate;
    Trail photon_energy_trail;
    Trail photon_rate_trail;
};

/// A question that the chosen editions do not answer, with the key of the value that lies outside.
struct Uncovered {
    std::string key;
    std::string reason;
};

/// The answer to a setup. If `uncovered` is not empty there are no positions and no distances: an assessment
/// is never partly made.
struct Assessment {
    std::vector<Uncovered> uncovered;
    std::vector<const LimitSet*> limit_sets;
    std::vector<SourceAssessment> sources;
    std::vector<PositionAssessment> positions;
    std::vector<HazardDistance> hazard_distances;
    std::vector<std::string> cautions;
    std::vector<std::string> assumptions;
    bool covered() const { return uncovered.empty(); }
    bool within_limits() const;
};

enum class Trails { off, record };

/// Assesses a checked setup. Deterministic, reads nothing but its arguments; never throws for a checked
/// setup.
Assessment assess(const Setup& setup, const LimitLibrary& library, Trails trails);

/// Range of distances that hazard distances are searched in.
inline constexpr Length nearest_search = millimetres(1);
inline constexpr Length farthest_search = metres(1e6);

}  // namespace dosimetry
