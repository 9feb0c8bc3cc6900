// From what a person states about a beam to the beam: every accepted combination and every refusal.

#include "sources/laser_setup.h"
#include "support/expect.h"
#include "support/setups.h"

namespace dosimetry {
namespace {

using testing_support::green_laser;
using testing_support::message_of;
using testing_support::relatively_near;

LaserSetup with_beam(const char* diameter, const char* divergence, double m2, const char* waist,
                     const char* waist_at) {
    LaserSetup setup = green_laser();
    setup.beam = {};
    if (diameter) setup.beam.diameter = Stated<Length>(diameter);
    if (divergence) setup.beam.divergence = Stated<PlaneAngle>(divergence);
    if (m2 > 0) setup.beam.m2 = m2;
    if (waist) setup.beam.waist = Stated<Length>(waist);
    if (waist_at) setup.beam.waist_at = Stated<Length>(waist_at);
    return setup;
}

std::string refusal(const LaserSetup& setup) {
    try {
        check(setup, "source[0]");
    } catch (const InputError& error) {
        return error.key() + ": " + error.problem();
    }
    return "accepted";
}

TEST(MakeLaser, DiameterAndDivergencePutTheWaistAtTheExit) {
    const CircularBeam beam = make_laser(with_beam("2 mm", "1 mrad", 0, nullptr, nullptr)).beam;
    EXPECT_EQ(beam.waist(), millimetres(2));
    EXPECT_EQ(beam.waist_at(), metres(0));
    EXPECT_EQ(beam.divergence(), milliradians(1));
}

TEST(MakeLaser, WidthAndDivergenceFollowTheDefinition) {
    LaserSetup setup = with_beam("2 mm", "1 mrad", 0, nullptr, nullptr);
    setup.beam.measured_at = WidthDefinition::one_over_e;
    const CircularBeam beam = make_laser(setup).beam;
    EXPECT_TRUE(relatively_near(beam.waist().in_si(), 2e-3 * std::sqrt(2.0), 1e-15));
    EXPECT_TRUE(relatively_near(beam.divergence().in_si(), 1e-3 * std::sqrt(2.0), 1e-15));
}

// By hand: θ = 4 · 1.2 · 532e-9 / (π · 2e-3) = 4.06418e-4 rad.
TEST(MakeLaser, M2GivesTheDivergence) {
    const CircularBeam beam = make_laser(with_beam("2 mm", nullptr, 1.2, nullptr, nullptr)).beam;
    EXPECT_NEAR(beam.divergence().in_si(), 4.06418e-4, 5e-10);
}

TEST(MakeLaser, M2UsesTheSecondMomentDiameterWhateverWasMeasured) {
    LaserSetup setup = with_beam("2 mm", nullptr, 1.2, nullptr, nullptr);
    setup.beam.measured_at = WidthDefinition::fwhm;
    const CircularBeam beam = make_laser(setup).beam;
    EXPECT_TRUE(
        relatively_near(beam.divergence().in_si() * beam.waist().in_si(), 4 * 1.2 * 532e-9 / pi, 1e-14));
}

TEST(MakeLaser, DiameterAndWaistGiveTheDivergence) {
    for (const char* waist_at : {"0.5 m", "-0.5 m"}) {
        const LaserSetup setup = with_beam("2 mm", nullptr, 0, "0.1 mm", waist_at);
        check(setup, "source[0]");
        const CircularBeam beam = make_laser(setup).beam;
        EXPECT_TRUE(relatively_near(beam.diameter_at(metres(0)).in_si(), 2e-3, 1e-14));
        EXPECT_TRUE(relatively_near(beam.diameter_at(setup.beam.waist_at->value).in_si(), 1e-4, 1e-14));
    }
}

TEST(MakeLaser, WaistWithDivergenceOrM2) {
    const CircularBeam stated = make_laser(with_beam(nullptr, "10 mrad", 0, "0.1 mm", "30 mm")).beam;
    EXPECT_EQ(stated.waist_at(), millimetres(30));
    EXPECT_EQ(stated.divergence(), milliradians(10));
    const CircularBeam by_m2 = make_laser(with_beam(nullptr, nullptr, 1, "0.1 mm", "30 mm")).beam;
    EXPECT_TRUE(relatively_near(by_m2.divergence().in_si(), 4 * 532e-9 / (pi * 1e-4), 1e-14));
}

TEST(MakeLaser, ApparentSourceIsCarriedOver) {
    LaserSetup setup = green_laser();
    EXPECT_FALSE(make_laser(setup).apparent_source.has_value());
    setup.apparent_source = Stated<Length>("3 mm");
    EXPECT_EQ(make_laser(setup).apparent_source, millimetres(3));
}

TEST(CheckLaser, AcceptsEveryCombination) {
    EXPECT_EQ(refusal(with_beam("2 mm", "1 mrad", 0, nullptr, nullptr)), "accepted");
    EXPECT_EQ(refusal(with_beam("2 mm", nullptr, 1, nullptr, nullptr)), "accepted");
    EXPECT_EQ(refusal(with_beam("2 mm", nullptr, 0, "1 mm", "1 m")), "accepted");
    EXPECT_EQ(refusal(with_beam(nullptr, "1 mrad", 0, "1 mm", "1 m")), "accepted");
    EXPECT_EQ(refusal(with_beam(nullptr, nullptr, 1, "1 mm", "0 m")), "accepted");
}

TEST(CheckLaser, RefusesEveryOtherCombination) {
    EXPECT_EQ(refusal(with_beam(nullptr, nullptr, 0, nullptr, nullptr)),
              "source[0].beam: the size of the beam is missing");
    EXPECT_EQ(refusal(with_beam(nullptr, "1 mrad", 0, nullptr, nullptr)),
              "source[0].beam: the size of the beam is missing");
    EXPECT_EQ(refusal(with_beam("2 mm", nullptr, 0, nullptr, nullptr)),
              "source[0].beam: the divergence of the beam is missing");
    EXPECT_EQ(refusal(with_beam(nullptr, nullptr, 0, "1 mm", "1 m")),
              "source[0].beam: the divergence of the beam is missing");
    EXPECT_EQ(refusal(with_beam("2 mm", "1 mrad", 1, nullptr, nullptr)),
              "source[0].beam.m2: the divergence of the beam is stated more than once");
    EXPECT_EQ(refusal(with_beam("2 mm", "1 mrad", 0, "1 mm", "1 m")),
              "source[0].beam.divergence: the divergence of the beam is stated more than once");
    EXPECT_EQ(refusal(with_beam("2 mm", nullptr, 0, "1 mm", nullptr)),
              "source[0].beam.waist: waist is given without waist_at");
    EXPECT_EQ(refusal(with_beam("2 mm", nullptr, 0, nullptr, "1 m")),
              "source[0].beam.waist_at: waist_at is given without waist");
}

TEST(CheckLaser, RefusesContradictions) {
    EXPECT_EQ(refusal(with_beam("2 mm", nullptr, 0, "1 mm", "0 m")),
              "source[0].beam.waist_at: waist_at is zero, so diameter and waist state the same thing and no "
              "divergence "
              "follows");
    EXPECT_EQ(
        refusal(with_beam("2 mm", nullptr, 0, "2 mm", "1 m")),
        "source[0].beam.waist: the waist \"2 mm\" is not smaller than the diameter \"2 mm\" at the exit");
}

TEST(CheckLaser, RefusesValuesOutsideWhatCanBeCalculated) {
    LaserSetup setup = green_laser();
    setup.power = Stated<RadiantPower>("0 W");
    EXPECT_EQ(refusal(setup),
              "source[0].emission.power: the power must be greater than zero, \"0 W\" is not");
    setup = green_laser();
    setup.wavelength = Stated<Length>("-532 nm");
    EXPECT_EQ(refusal(setup),
              "source[0].wavelength: the wavelength must be greater than zero, \"-532 nm\" is not");
    setup.wavelength = Stated<Length>("1 m");
    EXPECT_EQ(refusal(setup),
              "source[0].wavelength: the wavelength \"1 m\" is outside what can be calculated");
    EXPECT_EQ(
        refusal(with_beam("2 mm", "3.2 rad", 0, nullptr, nullptr)),
        "source[0].beam.divergence: the full-angle divergence \"3.2 rad\" is outside what can be calculated");
    EXPECT_EQ(refusal(with_beam("2 mm", nullptr, 0.99, nullptr, nullptr)),
              "source[0].beam.m2: the beam propagation ratio m2 \"0.99\" is outside what can be calculated");
    EXPECT_EQ(refusal(with_beam(nullptr, "1 mrad", 0, "1 mm", "1001 km")),
              "source[0].beam.waist_at: the waist position \"1001 km\" is outside what can be calculated");
    setup = green_laser();
    setup.apparent_source = Stated<Length>("0 mm");
    EXPECT_EQ(refusal(setup),
              "source[0].apparent_source: the apparent source must be greater than zero, \"0 mm\" is not");
    // A wavelength that no table covers is in order here: the assessment answers "not covered".
    setup = green_laser();
    setup.wavelength = Stated<Length>("100 nm");
    EXPECT_EQ(refusal(setup), "accepted");
}

}  // namespace
}  // namespace dosimetry
