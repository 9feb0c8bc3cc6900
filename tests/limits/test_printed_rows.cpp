// The table of the program against the second copy: every row at a point inside it, and all rows
// together on a grid that visits every edge from both sides.

#include <algorithm>
#include <cmath>

#include "limits/icnirp.h"
#include "limits/printed_rows.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::limits_of;
using testing_support::relatively_near;
using testing_support::si;

/// Wavelengths are compared with the edges of rows as multiples of 1e-9 nm; here one below and one above each
/// edge.
std::vector<double> wavelengths_with_neighbours() {
    constexpr double resolution_nm = 1e-9;
    std::vector<double> values;
    const auto& breaks = printed_rows::wavelength_breaks_nm;
    for (std::size_t i = 0; i < breaks.size(); ++i) {
        if (i > 0) values.push_back(std::round(std::sqrt(breaks[i - 1] * breaks[i]) * 1e3) / 1e3);
        if (i > 0) values.push_back(breaks[i] - resolution_nm);
        values.push_back(breaks[i]);
        if (i + 1 < breaks.size()) values.push_back(breaks[i] + resolution_nm);
    }
    return values;
}

std::vector<double> durations_with_neighbours() {
    std::vector<double> values;
    const auto& breaks = printed_rows::duration_breaks_s;
    for (std::size_t i = 0; i < breaks.size(); ++i) {
        if (i > 0) values.push_back(std::sqrt(breaks[i - 1] * breaks[i]));
        if (i > 0) values.push_back(std::nextafter(breaks[i], 0.0));
        values.push_back(breaks[i]);
        if (i + 1 < breaks.size()) values.push_back(std::nextafter(breaks[i], 1e9));
    }
    return values;
}

std::string place(const LimitQuery& q) {
    std::ostringstream text;
    text.precision(17);
    text << name_of(q.tissue) << " " << q.wavelength.in_si() * 1e9 << " nm " << q.exposure.in_si() << " s "
         << q.subtense.in_si() * 1e3 << " mrad " << q.exposed_area.in_si() << " m²";
    return text.str();
}

bool is(const Limit& limit, const printed_rows::Value& v) {
    return v.effect == limit.row->effect && v.quantity == limit.row->quantity &&
           relatively_near(si(limit.value), v.si, 1e-12) &&
           relatively_near(limit.aperture.in_si() * 1e3, v.aperture_mm, 1e-12);
}

/// Every limit of the rows that start here or go on, and no other than those of rows that end exactly here.
::testing::AssertionResult same_limits(const LimitQuery& query, double nm) {
    const auto expected = [&](printed_rows::Ends ends) {
        return printed_rows::limits_at(query.tissue, nm, query.exposure.in_si(), query.subtense.in_si() * 1e3,
                                       query.exposed_area.in_si(), ends);
    };
    const std::vector<Limit> ours = limits_of(query);
    for (const printed_rows::Value& v : expected(printed_rows::Ends::first))
        if (std::none_of(ours.begin(), ours.end(), [&](const Limit& limit) { return is(limit, v); }))
            return ::testing::AssertionFailure()
                   << name_of(v.effect) << " = " << v.si << " is missing at " << place(query);
    const auto allowed = expected(printed_rows::Ends::both);
    for (const Limit& limit : ours)
        if (std::none_of(allowed.begin(), allowed.end(), [&](const auto& v) { return is(limit, v); }))
            return ::testing::AssertionFailure() << name_of(limit.row->effect) << " = " << si(limit.value)
                                                 << " is not in the second copy at " << place(query);
    if (ours.size() > allowed.size())
        return ::testing::AssertionFailure() << "more limits than rows at " << place(query);
    return ::testing::AssertionSuccess();
}

TEST(Icnirp2013Rows, EveryPrintedRowGivesItsValueInside) {
    const auto points = printed_rows::one_point_in_each_row();
    ASSERT_EQ(points.size(), 93u);
    std::vector<const LimitRow*> seen;
    for (const auto& p : points) {
        const LimitQuery query{p.tissue, nanometres(p.nm), seconds(p.t_s), milliradians(p.alpha_mrad),
                               Area::from_si(1e-6)};
        int matches = 0;
        for (const Limit& limit : limits_of(query))
            if (limit.row->effect == p.value.effect && limit.row->quantity == p.value.quantity &&
                relatively_near(si(limit.value), p.value.si, 1e-12)) {
                ++matches;
                seen.push_back(limit.row);
            }
        EXPECT_EQ(matches, 1) << "row " << p.row << " at " << place(query);
    }
    // and no row of the program is left over
    for (const LimitRow& row : testing_support::icnirp().rows())
        EXPECT_TRUE(std::find(seen.begin(), seen.end(), &row) != seen.end()) << "line " << row.line;
}

class Grid : public ::testing::TestWithParam<Tissue> {};

TEST_P(Grid, AllLimitsAgreeOnBothSidesOfEveryEdge) {
    const std::vector<double> nms = wavelengths_with_neighbours();
    const std::vector<double> durations = durations_with_neighbours();
    std::vector<double> subtenses_rad{0.0, 1e-4, 3e-3, 0.02, 0.3};
    for (double mrad : printed_rows::subtense_breaks_mrad)
        for (double rad : {mrad * 1e-3, std::nextafter(mrad * 1e-3, 0.0), std::nextafter(mrad * 1e-3, 1.0)})
            subtenses_rad.push_back(rad);
    std::size_t failures = 0;
    for (double nm : nms)
        for (double t : durations)
            for (double rad : subtenses_rad) {
                const auto result =
                    same_limits({GetParam(), nanometres(nm), seconds(t), radians(rad), Area{}}, nm);
                if (!result && ++failures < 10) ADD_FAILURE() << result.message();
            }
    EXPECT_EQ(failures, 0u);
}

INSTANTIATE_TEST_SUITE_P(Tissues, Grid, ::testing::Values(Tissue::eye, Tissue::skin),
                         [](const auto& tissue) { return name_of(tissue.param); });

TEST(Icnirp2013Rows, LargeAreasOfSkin) {
    for (double nm : {1399.0, 1400.0, 1600.0, 10600.0, 2e5})
        for (double t : {9.9, 10.0, 100.0, 3e4})
            for (double area : {0.0, 0.01, std::nextafter(0.01, 1.0), 0.03, 0.1, std::nextafter(0.1, 0.0),
                                std::nextafter(0.1, 1.0), 5.0})
                EXPECT_TRUE(same_limits(
                    {Tissue::skin, nanometres(nm), seconds(t), radians(0), Area::from_si(area)}, nm));
}

TEST(Icnirp2013Rows, BothSidesOfT2) {
    for (double mrad : {2.0, 10.0, 50.0, 99.0, 150.0}) {
        const double t2 = printed_rows::factor("T2", 0, 0, mrad);
        for (double t : {t2 * (1 - 1e-9), t2 * (1 + 1e-9)})
            for (double nm : {550.0, 900.0, 1300.0})
                EXPECT_TRUE(
                    same_limits({Tissue::eye, nanometres(nm), seconds(t), milliradians(mrad), Area{}}, nm));
    }
}

}  // namespace
}  // namespace dosimetry
