#include "assessment/search.h"

#include <algorithm>
#include <boost/math/tools/toms748_solve.hpp>
#include <cmath>
#include <memory>

#include "assessment/exposure.h"

namespace dosimetry {
namespace {

/// Bracket of the zero of ln(ratio) over ln(x), given opposite signs at the ends; each of the result's ends
/// keeps the sign it had.
std::pair<double, double> bracket_crossing(double low, double high,
                                           const std::function<double(double)>& ratio, double relative) {
    const auto log_ratio = [&](double log_x) { return std::log(ratio(std::exp(log_x))); };
    const auto close = [&](double a, double b) { return b - a <= relative; };
    boost::uintmax_t iterations = 200;
    const auto [a, b] =
        boost::math::tools::toms748_solve(log_ratio, std::log(low), std::log(high), close, iterations);
    return {std::exp(a), std::exp(b)};
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
        if (at(start) > 1.0) return {seconds(std::nextafter(start, 0.0)), false};  // a step of the limit
        if (at(end) <= 1.0) continue;
        double permitted = bracket_crossing(start, end, at, 1e-13).first;
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
    for (int i = 0; i <= steps; ++i) grid_m.push_back(nearest.in_si() * std::pow(10.0, decades * i / steps));
    grid_m.back() = farthest.in_si();
    for (Length length : extra)
        if (length > nearest && length < farthest) grid_m.push_back(length.in_si());
    std::sort(grid_m.begin(), grid_m.end());

    const auto at = [&](double m) { return ratio(metres(m)); };
    if (at(grid_m.back()) > 1.0) return {std::nullopt};
    for (std::size_t i = grid_m.size() - 1; i-- > 0;) {
        if (at(grid_m[i]) <= 1.0) continue;
        double edge = bracket_crossing(grid_m[i], grid_m[i + 1], at, 1e-10).second;
        while (edge < grid_m[i + 1] && at(edge) > 1.0) edge *= 1.0 + 1e-15;
        return {metres(std::min(edge, grid_m[i + 1]))};
    }
    return {metres(0)};
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
