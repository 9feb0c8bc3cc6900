// The two searches on functions whose answers are known.

#include "assessment/search.h"
#include "support/expect.h"
#include "support/property.h"

namespace dosimetry {
namespace {

using testing_support::log_uniform;
using testing_support::relatively_near;

const std::vector<Duration> edges{seconds(1e-13), seconds(1e-6), seconds(1), seconds(3e4)};

RC_GTEST_PROP(LongestPermitted, FindsACrossingAnywhere, ()) {
    const double crossing_s = *log_uniform(1.01e-13, 2.9e4);
    const double power = *log_uniform(0.05, 1);
    const auto ratio = [&](Duration t) { return std::pow(t.in_si() / crossing_s, power); };
    const PermittedExposure permitted = longest_permitted(edges, ratio);
    RC_ASSERT(!permitted.whole_range);
    RC_ASSERT(relatively_near(permitted.duration->in_si(), crossing_s, 1e-11));
    RC_ASSERT(ratio(*permitted.duration) <= 1.0);
}

TEST(LongestPermitted, AStepUpAtAnEdge) {
    const auto ratio = [](Duration t) { return t < seconds(1) ? 0.9 : 1.1; };
    EXPECT_EQ(longest_permitted(edges, ratio).duration, seconds(std::nextafter(1.0, 0.0)));
}

// Above the limit, then a step down: what comes after the first crossing does not count.
TEST(LongestPermitted, AStepDownBehindTheCrossing) {
    const auto ratio = [](Duration t) { return t < seconds(1) ? t.in_si() / 0.5 : 0.1; };
    EXPECT_TRUE(relatively_near(longest_permitted(edges, ratio).duration->in_si(), 0.5, 1e-11));
}

TEST(LongestPermitted, NothingOrEverything) {
    EXPECT_FALSE(longest_permitted(edges, [](Duration) { return 1.5; }).duration.has_value());
    const PermittedExposure all = longest_permitted(edges, [](Duration) { return 1.0; });
    EXPECT_TRUE(all.whole_range);
    EXPECT_EQ(all.duration, seconds(3e4));
}

RC_GTEST_PROP(OuterEdgeSearch, FindsACrossingAnywhere, ()) {
    const double crossing_m = *log_uniform(1.01e-3, 9e5);
    const auto ratio = [&](Length z) { return std::pow(z.in_si() / crossing_m, -2); };
    const OuterEdge edge = outer_edge(metres(1e-3), metres(1e6), {}, ratio);
    RC_ASSERT(relatively_near(edge.distance->in_si(), crossing_m, 1e-9));
    RC_ASSERT(ratio(*edge.distance) <= 1.0);
}

// A summit between two steps of the scan, pointed or round, that only just passes the limit.
RC_GTEST_PROP(OuterEdgeSearch, FindsASmallSummit, ()) {
    const double summit_m = *log_uniform(1e-2, 1e5);
    const double height = 1 + *log_uniform(1e-6, 1e-1);
    const bool pointed = *rc::gen::arbitrary<bool>();
    const auto ratio = [&](Length z) {
        const double x = std::log(z.in_si() / summit_m);
        return height * std::exp(pointed ? -std::fabs(x) : -x * x);
    };
    const OuterEdge edge = outer_edge(metres(1e-3), metres(1e6), {}, ratio);
    const double x = pointed ? std::log(height) : std::sqrt(std::log(height));
    RC_ASSERT(edge.distance > metres(0));
    RC_ASSERT(relatively_near(edge.distance->in_si(), summit_m * std::exp(x), 1e-8));
}

TEST(OuterEdgeSearch, NowhereAndBeyond) {
    EXPECT_EQ(outer_edge(metres(1e-3), metres(1e6), {}, [](Length) { return 0.5; }).distance, metres(0));
    EXPECT_FALSE(outer_edge(metres(1e-3), metres(1e6), {}, [](Length) { return 1.5; }).distance.has_value());
}

}  // namespace
}  // namespace dosimetry
