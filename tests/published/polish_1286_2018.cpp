// Polish regulation of 12 June 2018 (Dz.U. 2018 item 1286), annex 2 part D, Table 6, after Directive
// 2006/25/EC. The two rows that ICNIRP 2013 has with the same numbers; it starts them earlier (5 µs, 13 µs).
// The four rows for shorter durations are of the older edition and left out.

#include "published/limit_value.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using namespace testing_support;

// 18 CA CE t^0.75 J/m²; CA(900 nm) = 10^0.4, CE = 1 for a small source.
TEST(Polish1286Table6, From400To1050NanometresTo10Seconds) {
    EXPECT_TRUE(relatively_near(
        icnirp(Tissue::eye, Effect::retinal_thermal, LimitQuantity::radiant_exposure, 900, 1e-3),
        18 * std::pow(10, 0.4) * std::pow(1e-3, 0.75), 1e-12));
}

// 90 CC CE t^0.75 J/m²; CC(1100 nm) = 1.
TEST(Polish1286Table6, From1050To1400NanometresTo10Seconds) {
    EXPECT_TRUE(relatively_near(
        icnirp(Tissue::eye, Effect::retinal_thermal, LimitQuantity::radiant_exposure, 1100, 1e-3),
        90 * std::pow(1e-3, 0.75), 1e-12));
}

}  // namespace
}  // namespace dosimetry
