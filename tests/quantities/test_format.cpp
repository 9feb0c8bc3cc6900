// Numbers and quantities as people read them.

#include <cmath>
#include <cstdlib>

#include "quantities/format.h"
#include "quantities/radiometry.h"
#include "support/expect.h"
#include "support/property.h"

namespace dosimetry {
namespace {

using testing_support::relatively_near;
constexpr Rounding nearest = Rounding::nearest;

TEST(FormatNumber, PlainWhereReadAtAGlancePowersOfTenElsewhere) {
    EXPECT_EQ(format_number(25.4558, 3, Rounding::down), "25.4");
    EXPECT_EQ(format_number(0.01234, 3, nearest), "0.0123");
    EXPECT_EQ(format_number(0.0001, 2, nearest), "0.00010");
    EXPECT_EQ(format_number(0.00001, 2, nearest), "1.0×10⁻⁵");
    EXPECT_EQ(format_number(999999, 6, nearest), "999999");
    EXPECT_EQ(format_number(1e6, 3, nearest), "1.00×10⁶");
    EXPECT_EQ(format_number(1.34e19, 4, nearest), "1.340×10¹⁹");
    EXPECT_EQ(format_number(-5.0, 2, nearest), "−5.0");
    EXPECT_EQ(format_number(0.0, 4, nearest), "0");
    EXPECT_EQ(format_number(999999.5, 4, Rounding::up), "1.000×10⁶");
}

TEST(FormatQuantity, TakesThePrefixThatSuits) {
    EXPECT_EQ(format(watts(5e-3), 3, nearest), "5.00 mW");
    EXPECT_EQ(format(watts(5), 3, nearest), "5.00 W");
    EXPECT_EQ(format(watts(5e3), 3, nearest), "5.00 kW");
    EXPECT_EQ(format(watts(5e6), 3, nearest), "5.00 MW");
    EXPECT_EQ(format(watts(5e-7), 3, nearest), "500 nW");
    EXPECT_EQ(format(watts(5e-16), 3, nearest), "0.500 fW");
    EXPECT_EQ(format(metres(532e-9), 3, nearest), "532 nm");
    EXPECT_EQ(format(metres(2e-3), 2, nearest), "2.0 mm");
    EXPECT_EQ(format(metres(1234), 4, nearest), "1.234 km");
    EXPECT_EQ(format(seconds(35e-15), 2, nearest), "35 fs");
    EXPECT_EQ(format(seconds(3e4), 3, nearest), "30000 s");
    EXPECT_EQ(format(joules(2.5e-6), 2, nearest), "2.5 µJ");
    EXPECT_EQ(format(radians(1.5e-3), 2, nearest), "1.5 mrad");
    EXPECT_EQ(format(radians(0.5), 2, nearest), "500 mrad");
    EXPECT_EQ(format(watts(0), 3, nearest), "0 W");
}

TEST(FormatQuantity, ACarryMovesToTheNextPrefix) {
    EXPECT_EQ(format(watts(0.99999), 3, nearest), "1.00 W");
    EXPECT_EQ(format(watts(0.99999), 3, Rounding::down), "999 mW");
    EXPECT_EQ(format(metres(999.96), 4, Rounding::up), "1.000 km");
}

TEST(FormatQuantity, FarOutsideTheLadderPowersOfTen) {
    EXPECT_EQ(format(watts(1e15), 3, nearest), "1.00×10¹⁵ W");
    EXPECT_EQ(format(metres(1e-14), 3, nearest), "1.00×10⁻¹⁴ m");
}

TEST(FormatQuantity, RadiometricQuantitiesStayInTheSiUnit) {
    EXPECT_EQ(format(watts_per_m2(25.4558), 4, Rounding::down), "25.45 W/m²");
    EXPECT_EQ(format(joules_per_m2(0.001), 2, nearest), "0.0010 J/m²");
    EXPECT_EQ(format(PhotonRate::from_si(1.339e19), 4, nearest), "1.339×10¹⁹ 1/s");
    EXPECT_EQ(format(Radiance::from_si(100), 3, nearest), "100 W/(m² sr)");
}

TEST(SiUnit, OfEveryQuantity) {
    EXPECT_EQ(si_unit(Length::dimension), "m");
    EXPECT_EQ(si_unit(Area::dimension), "m²");
    EXPECT_EQ(si_unit(Duration::dimension), "s");
    EXPECT_EQ(si_unit(Frequency::dimension), "1/s");
    EXPECT_EQ(si_unit(RadiantEnergy::dimension), "J");
    EXPECT_EQ(si_unit(RadiantPower::dimension), "W");
    EXPECT_EQ(si_unit(PlaneAngle::dimension), "rad");
    EXPECT_EQ(si_unit(SolidAngle::dimension), "sr");
    EXPECT_EQ(si_unit(Irradiance::dimension), "W/m²");
    EXPECT_EQ(si_unit(RadiantExposure::dimension), "J/m²");
    EXPECT_EQ(si_unit(RadiantIntensity::dimension), "W/sr");
    EXPECT_EQ(si_unit(Radiance::dimension), "W/(m² sr)");
    EXPECT_EQ(si_unit(RadianceDose::dimension), "J/(m² sr)");
    EXPECT_EQ(si_unit(PhotonRate::dimension), "1/s");
    EXPECT_EQ(si_unit(PhotonExposure::dimension), "1/m²");
    EXPECT_EQ(si_unit(Dimension{}), "");
}

TEST(ExactNumber, NineDigitsWithoutTrailingZeros) {
    EXPECT_EQ(exact_number(6.36396103067893), "6.36396103");
    EXPECT_EQ(exact_number(0.25), "0.25");
    EXPECT_EQ(exact_number(30000), "30000");
    EXPECT_EQ(exact_number(5.32e-7), "5.32×10⁻⁷");
    EXPECT_EQ(exact_number(0), "0");
    EXPECT_EQ(exact(watts_per_m2(25.455844122715714)), "25.4558441 W/m²");
    EXPECT_EQ(exact_term(5.32e-7), "(5.32×10⁻⁷)");
    EXPECT_EQ(exact_term(0.25), "0.25");
}

/// Undoes the typography of exact_number.
double read_back(std::string text) {
    const auto replace = [&text](const std::string& from, const std::string& to) {
        for (auto at = text.find(from); at != std::string::npos; at = text.find(from))
            text.replace(at, from.size(), to);
    };
    replace("−", "-");
    replace("×10", "e");
    replace("⁻", "-");
    const char* digits[]{"⁰", "¹", "²", "³", "⁴", "⁵", "⁶", "⁷", "⁸", "⁹"};
    for (int i = 0; i < 10; ++i) replace(digits[i], std::to_string(i));
    return std::strtod(text.c_str(), nullptr);
}

RC_GTEST_PROP(ExactNumberProperty, ReadsBackWithNineDigits, ()) {
    const auto digits = static_cast<double>(*rc::gen::inRange<std::int64_t>(1, 100000000000));
    const double value = digits * std::pow(10.0, *rc::gen::inRange(-40, 20));
    RC_ASSERT(relatively_near(read_back(exact_number(value)), value, 5.0001e-9));
}

}  // namespace
}  // namespace dosimetry
