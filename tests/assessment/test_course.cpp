// The course of the beam that charts and the route show is what an assessment at the same place gives.

#include "assessment/course.h"

#include "assessment/assess.h"
#include "support/expect.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::any_setup;
using testing_support::assessed;
using testing_support::green_setup;
using testing_support::library;
using testing_support::relatively_near;

RC_GTEST_PROP(CourseProperty, AgreesWithTheAssessment, ()) {
    const dosimetry::Setup setup = *any_setup();
    const PositionSetup& stated = setup.positions.front();
    const PositionAssessment p = assessed(setup).positions.front();
    const Course course = course_along_beam(setup, library(), stated.exposure.value, {stated.at.value});
    RC_ASSERT(course.diameters.front() == p.beam_diameter);
    RC_ASSERT(course.tissues.size() == 2u);
    for (const TissueCourse& line : course.tissues) {
        double largest = 0;
        for (const Criterion& c : p.criteria)
            if (c.tissue == line.tissue) largest = std::max(largest, c.ratio);
        RC_ASSERT(line.ratio.front() == largest);
        RC_ASSERT(relatively_near(line.exposure.front() / line.limit.front(), largest, 1e-12));
    }
}

TEST(Course, IsEmptyWhereNothingIsCovered) {
    const Course course = course_along_beam(green_setup(), library(), seconds(35e-15), {metres(1)});
    EXPECT_EQ(course.diameters.size(), 1u);
    for (const TissueCourse& line : course.tissues) EXPECT_TRUE(line.ratio.empty());
}

TEST(LogarithmicDistances, FromEndToEndInEqualSteps) {
    const auto distances = logarithmic_distances(metres(0.1), metres(1000), 5);
    ASSERT_EQ(distances.size(), 5u);
    const double expected[]{0.1, 1, 10, 100, 1000};
    for (std::size_t i = 0; i < 5; ++i)
        EXPECT_TRUE(relatively_near(distances[i].in_si(), expected[i], 1e-12));
}

}  // namespace
}  // namespace dosimetry
