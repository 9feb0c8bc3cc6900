#pragma once

#include <compare>

namespace dosimetry {

/// Exponents of the base dimensions. Energy is a base here (radiometry never needs mass); plane angle,
/// solid angle and photon count are kept, so that radiance is not irradiance and a photon rate is not a
/// frequency.
struct Dimension {
    int length = 0;
    int time = 0;
    int energy = 0;
    int angle = 0;
    int solid_angle = 0;
    int photons = 0;

    friend constexpr bool operator==(const Dimension&, const Dimension&) = default;
    friend constexpr Dimension operator+(Dimension a, Dimension b) {
        return {a.length + b.length,           a.time + b.time,      a.energy + b.energy, a.angle + b.angle,
                a.solid_angle + b.solid_angle, a.photons + b.photons};
    }
    constexpr Dimension times(int n) const {
        return {length * n, time * n, energy * n, angle * n, solid_angle * n, photons * n};
    }
    friend constexpr Dimension operator-(Dimension a, Dimension b) { return a + b.times(-1); }
};

/// Tag of quantities that no action spectrum has weighted. A weighted quantity carries the tag of its action
/// spectrum and cannot meet one with another tag, although both have the same unit.
struct Unweighted;

/// A physical quantity: one double in SI units (m, s, J, rad, sr, photons) whose dimension and weighting are
/// part of the type. Only operations that keep both right exist; there is no way to or from a bare number
/// except `from_si` and `in_si`.
template <Dimension D, class Weighting = Unweighted>
class Quantity {
  public:
    static constexpr Dimension dimension = D;

    constexpr Quantity() = default;
    static constexpr Quantity from_si(double value_si) { return Quantity(value_si); }
    constexpr double in_si() const { return value_si_; }

    friend constexpr auto operator<=>(Quantity, Quantity) = default;
    friend constexpr bool operator==(Quantity, Quantity) = default;
    friend constexpr Quantity operator+(Quantity a, Quantity b) {
        return Quantity(a.value_si_ + b.value_si_);
    }
    friend constexpr Quantity operator-(Quantity a, Quantity b) {
        return Quantity(a.value_si_ - b.value_si_);
    }
    friend constexpr Quantity operator*(Quantity a, double b) { return Quantity(a.value_si_ * b); }
    friend constexpr Quantity operator*(double a, Quantity b) { return Quantity(a * b.value_si_); }
    friend constexpr Quantity operator/(Quantity a, double b) { return Quantity(a.value_si_ / b); }
    /// The ratio of two like quantities is a plain number.
    friend constexpr double operator/(Quantity a, Quantity b) { return a.value_si_ / b.value_si_; }

  private:
    constexpr explicit Quantity(double value_si) : value_si_(value_si) {}
    double value_si_ = 0.0;
};

/// Weighted times unweighted stays weighted; two weighted quantities are never multiplied.
template <Dimension A, class W, Dimension B>
constexpr auto operator*(Quantity<A, W> a, Quantity<B> b) {
    return Quantity<A + B, W>::from_si(a.in_si() * b.in_si());
}
template <Dimension A, class W, Dimension B>
requires(!(A == B)) constexpr auto operator/(Quantity<A, W> a, Quantity<B> b) {
    return Quantity<A - B, W>::from_si(a.in_si() / b.in_si());
}

}  // namespace dosimetry
