#pragma once

/// Physical constants, all exact by definition: SI Brochure, 9th edition (2019), section 2.2; the same values
/// in CODATA 2018. Raw doubles in SI for numeric kernels.
namespace dosimetry::constants {

inline constexpr double planck_J_s = 6.62607015e-34;
inline constexpr double speed_of_light_m_per_s = 299792458.0;
inline constexpr double electronvolt_J = 1.602176634e-19;

}  // namespace dosimetry::constants
