#pragma once

#include <string>
#include <vector>

#include "limits/limit_row.h"

/// A second copy of ICNIRP 2013, typed from the project's notes and not from limits_tables/, with
/// its own arithmetic. The program's table has to give the same at every point.
namespace printed_rows {

struct Value {
    dosimetry::Effect effect{};
    dosimetry::LimitQuantity quantity{};
    double si = 0.0;
    double aperture_mm = 0.0;
};

/// Whether a row holds on its first edge only, or on both.
enum class Ends { first, both };

/// All limits that hold at a point, in the order of the printed rows.
std::vector<Value> limits_at(dosimetry::Tissue tissue, double nm, double t_s, double alpha_mrad,
                             double area_m2, Ends ends);

/// A point inside each printed row, its value known.
struct Inside {
    int row = 0;
    dosimetry::Tissue tissue{};
    double nm = 0.0;
    double t_s = 0.0;
    double alpha_mrad = 0.0;
    Value value;
};
std::vector<Inside> one_point_in_each_row();

/// Where rows, factors or apertures change.
extern const std::vector<double> wavelength_breaks_nm;
extern const std::vector<double> duration_breaks_s;
extern const std::vector<double> subtense_breaks_mrad;
extern const std::vector<double> area_breaks_m2;

double factor(const std::string& symbol, double nm, double t_s, double alpha_mrad);

}  // namespace printed_rows
