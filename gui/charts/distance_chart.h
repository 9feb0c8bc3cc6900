#pragma once

#include "assessment/assessment.h"
#include "charts/chart_model.h"
#include "route_view/route_model.h"

/// Exposure and limits over distance for the current position's exposure, on the route's axis.
ChartModel distanceChart(const dosimetry::Setup& setup, int currentPosition, const RouteModel& route);
