#pragma once

#include <vector>

#include "assessment/setup.h"

namespace dosimetry {

class LimitLibrary;

/// One tissue along the beam, one value a distance. Exposure and limit are those of the limit with the
/// largest ratio there, as irradiance averaged over its aperture (a dose limit divided by the exposure
/// duration).
struct TissueCourse {
    Tissue tissue{};
    std::vector<Irradiance> exposure;
    std::vector<Irradiance> limit;
    std::vector<double> ratio;
};

/// What the direct beam does along its way, for drawing.
struct Course {
    std::vector<Length> distances;
    std::vector<Length> diameters;      ///< reference diameter of the profile
    std::vector<TissueCourse> tissues;  ///< eye, skin; empty where the exposure or wavelength is not covered
};

/// The course of the first source of a checked setup for one exposure and the first limit set, at distances >
/// 0.
Course course_along_beam(const Setup& setup, const LimitLibrary& library, Duration exposure,
                         std::vector<Length> distances);

/// `count` distances from `from` to `to`, both included, evenly spaced on a logarithmic axis.
std::vector<Length> logarithmic_distances(Length from, Length to, int count);

}  // namespace dosimetry
