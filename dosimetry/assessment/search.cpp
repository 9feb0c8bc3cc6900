#include "assessment/search.h"

#include <algorithm>
#include <boost/math/tools/minima.hpp>
#include <boost/math/tools/toms748_solve.hpp>
#include <cmath>
#include <memory>

#include "assessment/exposure.h"

namespace dosimetry {
namespace {

struct Point {
    double x = 0.0;
    double ratio = 0.0;
};

/// Bracket of the zero of ln(ratio) over ln(x), given points on opposite sides of it; each of the result's
/// ends keeps the sign it had. Nothing outside the two points is looked at: behind an edge other limits hold.
std::pair<double, double> bracket_crossing(Point low, Point high, const std::function<double(double)>& ratio,
                                           double relative) {
    const auto x_of = [&](double log_x) { return std::clamp(std::exp(log_x), low.x, high.x); };
    const auto log_ratio = [&](double log_x) { return std::log(ratio(x_of(log_x))); };
    const auto close = [&](double a, double b) { return b - a <= relative; };
    boost::uintmax_t iterations = 200;
    const auto [a, b] =
        boost::math::tools::toms748_solve(log_ratio, std::log(low.x), std::log(high.x), std::log(low.ratio),
                                          std::log(high.ratio), close, iterations);
    return {x_of(a), x_of(b)};
}

/// The largest ratio between two distances that hold one maximum between them (Brent's method).
Point summit_between(double low, double high, const std::function<double(double)>& ratio) {
    constexpr int bits = 26;  // half the digits, all that a flat maximum determines
    const auto [log_x, negative] = boost::math::tools::brent_find_minima(
        [&](double x) { return -ratio(std::exp(x)); }, std::log(low), std::log(high), bits);
    return {std::exp(log_x), -negative};
}

}  // namespace

PermittedExposure longest_permitted(const std::vector<Duration>& edges,
                                    const std::function<double(Duration)>& ratio) {
    const auto at = [&](double s) { return ratio(seconds(s)); };
    if (at(edges.front().in_si()) > 1.0) return {};
    for (std::size_t i = 0; i + 1 < edges.size(); ++i) {
        const double start = edges[i].in_si();
        const bool last = i + 2 == edges.size();
        const double end = last ? edges[i + 1].in_si() : std::nextafter(edges[i + 1].in_si(), 0.0);
        const double ratio_at_start = at(start);
        if (ratio_at_start > 1.0) return {seconds(std::nextafter(start, 0.0)), false};  // a step of the limit
        const double ratio_at_end = at(end);
        if (ratio_at_end <= 1.0) continue;
        double permitted = bracket_crossing({start, ratio_at_start}, {end, ratio_at_end}, at, 1e-13).first;
        while (permitted > start && at(permitted) > 1.0) permitted *= 1.0 - 1e-15;  // exp(log x) may round up
        return {seconds(std::max(permitted, start)), false};
    }
    return {edges.back(), true};
}

OuterEdge outer_edge(Length nearest, Length farthest, const std::vector<Length>& extra,
                     const std::function<double(Length)>& ratio) {
    constexpr int steps_per_decade = 32;
    std::vector<double> grid_m;
    const double decades = std::log10(farthest / nearest);
    const int steps = static_cast<int>(std::ceil(decades * steps_per_decade));
    const double step = std::pow(10.0, decades / steps);
    for (double m = nearest.in_si(); static_cast<int>(grid_m.size()) < steps; m *= step) grid_m.push_back(m);
    grid_m.push_back(farthest.in_si());
    const auto regular = static_cast<std::ptrdiff_t>(grid_m.size());
    for (Length length : extra)
        if (length > nearest && length < farthest) grid_m.push_back(length.in_si());
    std::sort(grid_m.begin() + regular, grid_m.end());
    std::inplace_merge(grid_m.begin(), grid_m.begin() + regular, grid_m.end());

    const auto at = [&](double m) { return ratio(metres(m)); };
    const auto edge_between = [&](Point inside, Point outside) {
        double edge = bracket_crossing(inside, outside, at, 1e-10).second;
        while (edge < outside.x && at(edge) > 1.0) edge *= 1.0 + 1e-15;
        return OuterEdge{metres(std::min(edge, outside.x))};
    };
    // A step of the grid changes the ratio by less than 1/32 decade to the power of 2 does, so a lower
    // maximum of the grid cannot hide a ratio of 1.
    constexpr double worth_refining = 0.8;
    Point farther{grid_m.back(), at(grid_m.back())};
    if (farther.ratio > 1.0) return {std::nullopt};
    Point farthest_of_three = farther;
    for (std::size_t i = grid_m.size() - 1; i-- > 0;) {
        const Point here{grid_m[i], at(grid_m[i])};
        if (here.ratio > 1.0) return edge_between(here, farther);
        if (farther.ratio > worth_refining && farther.ratio >= here.ratio &&
            farther.ratio >= farthest_of_three.ratio && here.x < farthest_of_three.x) {
            const Point summit = summit_between(here.x, farthest_of_three.x, at);
            if (summit.ratio > 1.0) return edge_between(summit, farthest_of_three);
        }
        farthest_of_three = farther;
        farther = here;
    }
    return {metres(0)};
}

std::vector<Length> bends_along_beam(const Laser& laser, const LimitSet& set, Tissue tissue,
                                     Duration exposure) {
    std::vector<Length> bends{laser.beam.waist_at()};
    if (laser.apparent_source) {
        bends.push_back(Arrival::nearest_viewing);
        for (PlaneAngle alpha : set.subtense_edges(tissue, laser.wavelength, exposure))
            bends.push_back(*laser.apparent_source * (0.5 / std::tan(alpha.in_si() / 2)));
    }
    for (Area area : set.area_edges(tissue, laser.wavelength, exposure)) {
        const double d = std::sqrt(4 / pi * area.in_si());
        const double waist = laser.beam.waist().in_si();
        if (!(d > waist)) continue;
        const Length from_waist =
            metres(std::sqrt((d - waist) * (d + waist)) / laser.beam.divergence().in_si());
        bends.push_back(laser.beam.waist_at() + from_waist);
        bends.push_back(laser.beam.waist_at() - from_waist);
    }
    // The ratio may step there, so both sides are looked at.
    constexpr double side = 1e-9;
    for (std::size_t i = 0, n = bends.size(); i < n; ++i) {
        bends.push_back(bends[i] * (1 - side));
        bends.push_back(bends[i] * (1 + side));
    }
    return bends;
}

std::function<double(Length)> ratio_along_beam(const Laser& laser, const LimitSet& set, Tissue tissue,
                                               Duration exposure) {
    const auto limits_at = [&laser, &set, tissue, exposure](Length distance) {
        return std::get<std::vector<Limit>>(
            set.limits_for(query_for(Arrival(laser, distance), exposure, tissue)));
    };
    const auto ratio_to = [&laser, exposure](const std::vector<Limit>& limits, Length distance) {
        double largest = 0.0;
        const Arrival arrival(laser, distance);
        for (const Limit& limit : limits)
            if (!limit.row->alternative_form)
                largest = std::max(largest, hold_against(limit, arrival, exposure).ratio);
        return largest;
    };
    auto fixed = std::make_shared<std::vector<Limit>>(limits_at(metres(1)));
    const bool varies = std::any_of(fixed->begin(), fixed->end(), [&laser](const Limit& limit) {
        return limit.row->depends_on_area || (limit.row->depends_on_subtense && laser.apparent_source);
    });
    if (varies) return [=](Length distance) { return ratio_to(limits_at(distance), distance); };
    return [=](Length distance) { return ratio_to(*fixed, distance); };
}

}  // namespace dosimetry
