// A university faculty of science (Australia), laser safety, Appendix X: Sample Calculations, 2 September
// 2015. It applies AS/NZS IEC 60825.1:2011, whose visible limit 18 t^0.75 J/m² is the same in ICNIRP 2013.

#include "beams/circular_beam.h"
#include "published/limit_value.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using namespace testing_support;

// Calculation 1: 10 W, flat top of 10 mm: 12.7 W/cm².
TEST(AustralianSampleCalculation1, IrradianceOfATopHat) {
    const CircularBeam beam(Profile::top_hat, millimetres(10), metres(0), radians(0));
    EXPECT_TRUE(agrees(beam.peak_irradiance(watts(10), metres(1)).in_si() * 1e-4, printed(12.7, 1)));
}

// Calculation 2: 488 nm, 0.25 s: 2.55 mW/cm².
TEST(AustralianSampleCalculation2, LimitAt488NanometresQuarterSecond) {
    EXPECT_TRUE(agrees(strictest_W_per_m2(Tissue::eye, 488, 0.25) * 0.1, printed(2.55, 2)));
}

}  // namespace
}  // namespace dosimetry
