// What a setup must hold before it is assessed.

#include "assessment/assess.h"
#include "support/expect.h"
#include "support/setups.h"

namespace dosimetry {
namespace {

using testing_support::green_laser;
using testing_support::green_setup;
using testing_support::position;

template <class Change>
std::string refusal(Change change) {
    dosimetry::Setup setup = green_setup();
    change(setup);
    try {
        check(setup, testing_support::library());
    } catch (const InputError& error) {
        return error.key() + ": " + error.problem();
    }
    return "accepted";
}

using S = dosimetry::Setup;

TEST(CheckSetup, LimitSets) {
    EXPECT_EQ(refusal([](S& s) { s.limits.clear(); }),
              "assessment.limits: no edition of exposure limits is chosen");
    EXPECT_EQ(refusal([](S& s) { s.limits = {"icnirp_1996"}; }),
              "assessment.limits: the limit set \"icnirp_1996\" is not part of this version");
    EXPECT_EQ(refusal([](S& s) { s.limits.push_back(s.limits[0]); }),
              "assessment.limits: the limit set \"icnirp_2013_laser\" is named twice");
}

TEST(CheckSetup, ExactlyOneSource) {
    EXPECT_EQ(refusal([](S& s) { s.sources.clear(); }), "source: there is no source");
    EXPECT_EQ(refusal([](S& s) { s.sources.push_back(green_laser()); }),
              "source[1]: there are 2 sources; adding up several is not part of this version");
    EXPECT_EQ(refusal([](S& s) { s.sources[0].power = Stated<RadiantPower>("-1 W"); }),
              "source[0].emission.power: the power must be greater than zero, \"-1 W\" is not");
}

TEST(CheckSetup, Positions) {
    EXPECT_EQ(refusal([](S& s) { s.positions.clear(); }), "position: there is no position");
    EXPECT_EQ(refusal([](S& s) { s.positions.push_back(position("operator", "1 m", "1 s")); }),
              "position[1].id: two positions are called \"operator\"");
    EXPECT_EQ(refusal([](S& s) { s.positions[0].at = Stated<Length>("0 m"); }),
              "position[0].at: the distance of a position must be greater than zero, \"0 m\" is not");
    EXPECT_EQ(refusal([](S& s) { s.positions[0].at = Stated<Length>("1001 km"); }),
              "position[0].at: the distance of a position \"1001 km\" is outside what can be calculated");
    EXPECT_EQ(refusal([](S& s) { s.positions[0].exposure = Stated<Duration>("-1 s"); }),
              "position[0].exposure: the exposure must be greater than zero, \"-1 s\" is not");
    EXPECT_EQ(refusal([](S& s) { s.positions[0].eye = s.positions[0].skin = false; }),
              "position[0].tissues: no tissue is named");
}

TEST(CheckSetup, WhatATableDoesNotCoverIsInOrder) {
    EXPECT_EQ(refusal([](S& s) { s.positions[0].exposure = Stated<Duration>("35 fs"); }), "accepted");
    EXPECT_EQ(refusal([](S& s) { s.sources[0].wavelength = Stated<Length>("5 mm"); }), "accepted");
}

}  // namespace
}  // namespace dosimetry
