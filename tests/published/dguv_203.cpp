// DGUV Information 203-042 (May 2018) and 203-036: simplified limits and examples.
//
// 203-042, Annex 6, table A6.1, gives one value for a band of wavelengths and durations, the lowest of the
// limits in it. Left out: 1.5e-4 and 5e-3 J/m² for the retina below 1 ns and 0.5 ms, which ICNIRP 2013
// lowered and changed.

#include <algorithm>

#include "published/limit_value.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using namespace testing_support;

/// The lowest limit of the eye in a band, small source; durations up to but not at the end.
double lowest(double nm_from, double nm_to, double s_from, double s_to, bool as_dose) {
    double smallest = std::numeric_limits<double>::infinity();
    constexpr int steps = 200;
    for (int i = 0; i <= steps; ++i)
        for (int j = 0; j < steps; ++j) {
            const double nm = nm_from * std::pow(nm_to / nm_from, static_cast<double>(i) / steps);
            const double t = s_from * std::pow(s_to / s_from, static_cast<double>(j) / steps);
            smallest = std::min(smallest, strictest_W_per_m2(Tissue::eye, nm, t) * (as_dose ? t : 1));
        }
    return smallest;
}

// 30 J/m² over 30000 s.
TEST(Dguv203_042TableA6_1, ContinuousUltraviolet180To315) {
    EXPECT_TRUE(agrees(std::min(lowest(180, 315, 1, 3e4, false), strictest_W_per_m2(Tissue::eye, 250, 3e4)),
                       printed(0.001, 3)));
}
// 18 · 10^-0.25 = 10.12 W/m², rounded to the 10 W/m² that hold from 10 s on.
TEST(Dguv203_042TableA6_1, Continuous315To1400) {
    EXPECT_TRUE(agrees(lowest(400, 1399, 5e-4, 10, false), printed(10, 0)));
    EXPECT_TRUE(agrees(strictest_W_per_m2(Tissue::eye, 650, 10), printed(10, 0)));
}
TEST(Dguv203_042TableA6_1, ContinuousBeyond1400) {
    for (double nm : {1450.0, 1600.0, 2000.0, 10600.0})
        EXPECT_EQ(strictest_W_per_m2(Tissue::eye, nm, 100), 1000.0);
}
TEST(Dguv203_042TableA6_1, UltravioletShorterThan1Nanosecond) {
    EXPECT_TRUE(relatively_near(lowest(180, 302, 1e-13, 1e-9, false), 3e10, 1e-12));
}
TEST(Dguv203_042TableA6_1, UltravioletPulses180To315) {
    EXPECT_TRUE(relatively_near(lowest(180, 314.999, 1.001e-9, 0.1, true), 30, 1e-12));
}
TEST(Dguv203_042TableA6_1, InfraredShorterThan1Nanosecond) {
    EXPECT_TRUE(relatively_near(lowest(1401, 1e6, 1e-13, 1e-9, false), 1e11, 1e-12));
}
// 5600 · (1e-7)^0.25 = 99.6 J/m² at 100 ns, printed 100 J/m².
TEST(Dguv203_042TableA6_1, InfraredPulses) {
    EXPECT_TRUE(agrees(lowest(1401, 1e6, 1e-9, 0.1, true), printed(100, 0)));
    EXPECT_TRUE(agrees(strictest_W_per_m2(Tissue::eye, 10600, 1e-7) * 1e-7, printed(100, 0)));
}

// 2.2 and 6.1: alignment eyewear lets 1 mW through, 18 · 0.25^-0.25 over the pupil of 7 mm: 0.98 mW, rounded
// there.
TEST(Dguv203_042Section2_2, AlignmentPowerQuarterSecond) {
    EXPECT_TRUE(agrees(power_mW(strictest_W_per_m2(Tissue::eye, 550, 0.25), 7), printed(1, 0)));
}

// 203-036, Annex 4: 0.5 mW meet the limit for 4 s. Rounded upward there: 0.4898 mW.
TEST(Dguv203_036Annex4, HalfAMilliwattForFourSeconds) {
    EXPECT_TRUE(agrees(power_mW(strictest_W_per_m2(Tissue::eye, 550, 4), 7), printed(0.5, 1)));
}

}  // namespace
}  // namespace dosimetry
