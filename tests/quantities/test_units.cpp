// Values with units: every accepted spelling, and the refusals word for word.

#include <cmath>

#include "quantities/radiometry.h"
#include "quantities/stated.h"
#include "quantities/units.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::message_of;
using testing_support::relatively_near;

struct Spelling {
    const char* text;
    double si;
    Dimension dimension;
};

class Spellings : public ::testing::TestWithParam<Spelling> {};

TEST_P(Spellings, IsRead) {
    const Spelling& s = GetParam();
    const ReadQuantity read = read_quantity(s.text, DecimalMark::point);
    EXPECT_TRUE(relatively_near(read.value_si, s.si, 4e-16)) << s.text;
    EXPECT_EQ(read.dimension, s.dimension) << s.text;
}

constexpr Dimension one{};

INSTANTIATE_TEST_SUITE_P(
    Power, Spellings,
    ::testing::Values(
        Spelling{"5 mW", 5e-3, RadiantPower::dimension}, Spelling{"5mW", 5e-3, RadiantPower::dimension},
        Spelling{"  5  mW\t", 5e-3, RadiantPower::dimension},
        Spelling{"5\u00A0mW", 5e-3, RadiantPower::dimension},
        Spelling{"5\u202FmW", 5e-3, RadiantPower::dimension},
        Spelling{"1 \u00B5W", 1e-6, RadiantPower::dimension},
        Spelling{"1 \u03BCW", 1e-6, RadiantPower::dimension}, Spelling{"1 uW", 1e-6, RadiantPower::dimension},
        Spelling{"1 aW", 1e-18, RadiantPower::dimension}, Spelling{"1 fW", 1e-15, RadiantPower::dimension},
        Spelling{"1 pW", 1e-12, RadiantPower::dimension}, Spelling{"1 nW", 1e-9, RadiantPower::dimension},
        Spelling{"1 kW", 1e3, RadiantPower::dimension}, Spelling{"1 MW", 1e6, RadiantPower::dimension},
        Spelling{"1 GW", 1e9, RadiantPower::dimension}, Spelling{"1 TW", 1e12, RadiantPower::dimension},
        Spelling{"1 PW", 1e15, RadiantPower::dimension}, Spelling{"1 J/s", 1.0, RadiantPower::dimension}));

INSTANTIATE_TEST_SUITE_P(IrradianceAndExposure, Spellings,
                         ::testing::Values(Spelling{"0.2 \u00B5W/cm\u00B2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 \u03BCW/cm\u00B2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 uW/cm2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 uW/cm^2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 uW cm-2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 uW cm^-2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 uW cm\u207B\u00B2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 uW cm\u2212\u00B2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 uW\u00B7cm\u207B\u00B2", 2e-3,
                                                    Irradiance::dimension},
                                           Spelling{"0.2 uW\u22C5cm-2", 2e-3, Irradiance::dimension},
                                           Spelling{"0.2 uW*cm-2", 2e-3, Irradiance::dimension},
                                           Spelling{"20 J/cm2", 2e5, RadiantExposure::dimension},
                                           Spelling{"3 mJ/cm²", 30.0, RadiantExposure::dimension},
                                           Spelling{"7 W s/m2", 7.0, RadiantExposure::dimension}));

INSTANTIATE_TEST_SUITE_P(RadianceAndIntensity, Spellings,
                         ::testing::Values(Spelling{"100 W/(m2 sr)", 100.0, Radiance::dimension},
                                           Spelling{"100 W/(m² sr)", 100.0, Radiance::dimension},
                                           Spelling{"100 W/(sr m2)", 100.0, Radiance::dimension},
                                           Spelling{"100 W/( m2 sr )", 100.0, Radiance::dimension},
                                           Spelling{"100 W/m2/sr", 100.0, Radiance::dimension},
                                           Spelling{"100 W m-2 sr-1", 100.0, Radiance::dimension},
                                           Spelling{"100 W m^-2 sr^-1", 100.0, Radiance::dimension},
                                           Spelling{"100 W m\u207B² sr\u207B¹", 100.0, Radiance::dimension},
                                           Spelling{"1 W/(cm2 sr)", 1e4, Radiance::dimension},
                                           Spelling{"1e6 J/(m2 sr)", 1e6, RadianceDose::dimension},
                                           Spelling{"0.5 W/sr", 0.5, RadiantIntensity::dimension}));

INSTANTIATE_TEST_SUITE_P(
    LengthTimeAngleEnergy, Spellings,
    ::testing::Values(
        Spelling{"532 nm", 532e-9, Length::dimension}, Spelling{"10.6 um", 10.6e-6, Length::dimension},
        Spelling{"30 cm", 0.3, Length::dimension}, Spelling{"2 dm", 0.2, Length::dimension},
        Spelling{"-40 mm", -0.04, Length::dimension}, Spelling{"3 mm2", 3e-6, Area::dimension},
        Spelling{"35 fs", 35e-15, Duration::dimension}, Spelling{"8 h", 28800.0, Duration::dimension},
        Spelling{"2 min", 120.0, Duration::dimension}, Spelling{"20 kHz", 2e4, Frequency::dimension},
        Spelling{"1.2 mrad", 1.2e-3, PlaneAngle::dimension},
        // SI Brochure, 9th edition, table 8: 1° = (π/180) rad
        Spelling{"180 deg", 3.14159265358979323846, PlaneAngle::dimension},
        Spelling{"180°", 3.14159265358979323846, PlaneAngle::dimension},
        Spelling{"0.1 sr", 0.1, SolidAngle::dimension},
        // SI Brochure, 9th edition, table 8: 1 eV = 1.602176634e-19 J
        Spelling{"5 eV", 8.01088317e-19, RadiantEnergy::dimension},
        Spelling{"2 keV", 3.204353268e-16, RadiantEnergy::dimension}, Spelling{"1.2", 1.2, one}));

TEST(Units, AWrongDimensionIsNamed) {
    EXPECT_EQ(message_of([] { parse<RadiantPower>("5 nm"); }),
              "power expected, \"5 nm\" is a length; accepted: a value such as 5 mW");
    EXPECT_EQ(message_of([] { parse<RadiantPower>("5 mJ"); }),
              "power expected, \"5 mJ\" is an energy; accepted: a value such as 5 mW");
    EXPECT_EQ(message_of([] { parse<Irradiance>("5 W/(m2 sr)"); }),
              "irradiance expected, \"5 W/(m2 sr)\" is a radiance; accepted: a value such as 0.2 uW/cm2");
    EXPECT_EQ(message_of([] { parse<RadiantExposure>("5 W/m2"); }),
              "radiant exposure expected, \"5 W/m2\" is an irradiance; accepted: a value such as 20 J/cm2");
    EXPECT_EQ(message_of([] { parse<Length>("1 mrad"); }),
              "length expected, \"1 mrad\" is an angle; accepted: a value such as 532 nm");
    EXPECT_EQ(message_of([] { parse<Duration>("1 kHz"); }),
              "duration expected, \"1 kHz\" is a frequency; accepted: a value such as 0.25 s");
    EXPECT_EQ(message_of([] { parse<Length>("532"); }),
              "length expected, \"532\" has no unit; accepted: a value such as 532 nm");
    EXPECT_EQ(message_of([] { parse<Length>("5 m/s"); }),
              "length expected, \"5 m/s\" is a quantity in m s-1; accepted: a value such as 532 nm");
}

TEST(Units, AnUnknownUnitIsQuoted) {
    EXPECT_EQ(
        message_of([] { parse<RadiantPower>("5 Watt"); }),
        "power expected, \"Watt\" in \"5 Watt\" is not a known unit; accepted: m, s, min, h, J, W, eV, Hz, "
        "rad, deg, sr with SI prefixes, such as nm, mW, W/cm2, mrad (for example 5 mW)");
    for (const char* text :
         {"5 w",  "5 mw",   "5 kmin", "5 mh", "5 mdeg", "5 mm4",   "5 W/",  "5 /m", "5 W//m2",
          "5 (W", "5 W)",   "5 ()",   "5 m-", "5 m^",   "5 m^-",   "5 dBm", "5 %",  "5 nm nm)",
          "5 Å",  "5 inch", "5 µ",    "5 k",  "5 mum",  "5 W / (", "0x10 W"})
        EXPECT_THROW(read_quantity(text, DecimalMark::point), InputError) << text;
}

TEST(Units, RefusesWhatIsNoNumber) {
    EXPECT_EQ(message_of([] { parse<Duration>(""); }),
              "duration expected, the text is empty; accepted: a number and a "
              "unit (for example 0.25 s)");
    EXPECT_EQ(
        message_of([] { parse<RadiantPower>("a lot"); }),
        "power expected, \"a lot\" does not start with a number; accepted: a number and a unit (for example "
        "5 mW)");
    for (const char* text : {"nan W", "inf W", "-inf W", "NaN", "-", "+", "- W", "   ", "mW", "mW 5",
                             "1e400 W", "1e-400 W", "1,5 W", "1.2.3 W", "5..5 W"})
        EXPECT_THROW(parse<RadiantPower>(text), InputError) << text;
}

TEST(Units, RefusesValuesThatOverflowOnlyInTheSiUnit) {
    EXPECT_THROW(parse<RadiantPower>("1e300 PW"), InputError);
    EXPECT_THROW(parse<RadiantPower>("1e-320 fW"), InputError);
    EXPECT_EQ(parse<RadiantPower>("0 fW").in_si(), 0.0);
}

TEST(Units, CommasAreAcceptedWhereTheyAreAskedFor) {
    EXPECT_EQ(parse<Length>("1,064 um", DecimalMark::point_or_comma).in_si(),
              parse<Length>("1.064 um", DecimalMark::point).in_si());
    EXPECT_EQ(message_of([] { parse<Length>("1,064 um"); }),
              "length expected, a comma stands in the number \"1,064\"; accepted: a number with a decimal "
              "point, such "
              "as 0.25 or 2.5e-3 (for example 532 nm)");
}

TEST(Units, DeepNestingIsRefusedNotFollowed) {
    const std::string deep = "5 W/" + std::string(900'000, '(') + "m2";
    EXPECT_THROW(read_quantity(deep, DecimalMark::point), InputError);
    EXPECT_EQ(parse<Irradiance>("5 W/((m2))"), watts_per_m2(5));
}

TEST(Units, EveryExampleReadsAsTheDimensionItIsAnExampleOf) {
    for (Dimension d : {Length::dimension, Area::dimension, Duration::dimension, Frequency::dimension,
                        RadiantEnergy::dimension, RadiantPower::dimension, PlaneAngle::dimension,
                        SolidAngle::dimension, Irradiance::dimension, RadiantExposure::dimension,
                        RadiantIntensity::dimension, Radiance::dimension, RadianceDose::dimension, one})
        EXPECT_EQ(read_quantity(example_of(d), DecimalMark::point).dimension, d) << example_of(d);
}

TEST(Stated, KeepsTheTextAndComparesIt) {
    const Stated<Length> given("  0.532 um ");
    EXPECT_EQ(given.text, "  0.532 um ");
    EXPECT_TRUE(relatively_near(given.value.in_si(), 532e-9, 1e-15));
    EXPECT_NE(Stated<Length>("2 mm"), Stated<Length>("2.0 mm"));
    EXPECT_EQ(Stated<Length>("2 mm"), Stated<Length>("2 mm"));
}

TEST(RequireBetween, NamesTheValueAndTheRange) {
    const auto check = [](const char* text) {
        require_between(Stated<RadiantPower>(text), "1 fW", "1e15 W", "the power",
                        "source[0].emission.power");
    };
    EXPECT_NO_THROW(check("1 fW"));
    EXPECT_NO_THROW(check("1e15 W"));
    EXPECT_EQ(message_of([&] { check("0 W"); }),
              "the power must be greater than zero, \"0 W\" is not; accepted: from 1 fW to 1e15 W");
    EXPECT_EQ(message_of([&] { check("-5 mW"); }),
              "the power must be greater than zero, \"-5 mW\" is not; accepted: from 1 fW to 1e15 W");
    EXPECT_EQ(message_of([&] { check("2e15 W"); }),
              "the power \"2e15 W\" is outside what can be calculated; accepted: from 1 fW to 1e15 W");
    try {
        check("0 W");
        FAIL();
    } catch (const InputError& error) {
        EXPECT_EQ(error.key(), "source[0].emission.power");
    }
    EXPECT_THROW(require_between(std::nan(""), "?", 0, 1, "x", "range", "key"), InputError);
}

}  // namespace
}  // namespace dosimetry
