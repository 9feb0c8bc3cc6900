#include "assessment/course.h"

#include <cmath>
#include <utility>

#include "assessment/exposure.h"
#include "limits/limit_library.h"

namespace dosimetry {

Course course_along_beam(const Setup& setup, const LimitLibrary& library, Duration exposure,
                         std::vector<Length> distances) {
    const Laser laser = make_laser(setup.sources.front());
    const LimitSet& set = *library.find(setup.limits.front());
    Course course;
    course.distances = std::move(distances);
    for (Length z : course.distances) course.diameters.push_back(laser.beam.diameter_at(z));
    for (Tissue tissue : {Tissue::eye, Tissue::skin}) {
        TissueCourse line;
        line.tissue = tissue;
        for (Length z : course.distances) {
            const Arrival arrival(laser, z);
            const auto answer = evaluate(arrival, exposure, tissue, set);
            const auto* evaluated = std::get_if<std::vector<Evaluated>>(&answer);
            if (!evaluated) return course;
            const Evaluated* worst = &evaluated->front();
            for (const Evaluated& e : *evaluated)
                if (e.ratio > worst->ratio) worst = &e;
            const Irradiance averaged =
                arrival.averaged_over(worst->limit.aperture) * worst->acceptance_share;
            line.exposure.push_back(averaged);
            line.limit.push_back(averaged / worst->ratio);
            line.ratio.push_back(worst->ratio);
        }
        course.tissues.push_back(std::move(line));
    }
    return course;
}

std::vector<Length> logarithmic_distances(Length from, Length to, int count) {
    std::vector<Length> distances;
    const double decades = std::log10(to / from);
    for (int i = 0; i < count; ++i) distances.push_back(from * std::pow(10.0, decades * i / (count - 1)));
    return distances;
}

}  // namespace dosimetry
