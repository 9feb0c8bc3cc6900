// University of British Columbia, physics laser demonstrations: sunlight of 1000 W/m² sends 3 mW through a
// pupil of 2 mm and 12 mW through one of 4 mm (12.57, digits cut off there).

#include "published/limit_value.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using namespace testing_support;

TEST(UbcLaserDemonstrations, SunlightThroughThePupil) {
    EXPECT_TRUE(agrees(power_mW(1000, 2), printed(3, 0)));
    EXPECT_EQ(std::floor(power_mW(1000, 4)), 12.0);
}

}  // namespace
}  // namespace dosimetry
