// IEEE 802.3ae contribution (Kolesar, Ehrgott), laser safety standards update and impact on 850 nm, March
// 2000, slides 4 and 5: how much of the light of a fibre passes a 7 mm aperture. The class limits of the same
// slides (IEC 60825-1, Amendment 2 of 2001) are of an older edition and of classes, which are not part of
// this version.

#include "beams/circular_beam.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using namespace testing_support;

// 50 µm fibre, NA 0.2, at 14 mm: the diameter with 63 % of the power is 2 r NA/1.7 = 3.294 mm. The waist is
// left out there.
class Ieee802_3ae : public ::testing::Test {
  protected:
    double to_reference = reference_over_measured(Profile::gaussian, WidthDefinition::enclosed_63);
    CircularBeam beam{Profile::gaussian, nanometres(100), metres(0), radians(2 * 0.2 / 1.7) * to_reference};
};

TEST_F(Ieee802_3ae, DiameterWith63PercentAt14Millimetres) {
    EXPECT_TRUE(agrees(beam.diameter_at(millimetres(14)).in_si() * 1e3 / to_reference, printed(3.294, 3)));
}

// 0.989 of the power passes 7 mm.
TEST_F(Ieee802_3ae, ShareThrough7MillimetresAt14Millimetres) {
    EXPECT_TRUE(agrees(beam.fraction_through(millimetres(7), millimetres(14)), printed(0.989, 3)));
}

}  // namespace
}  // namespace dosimetry
