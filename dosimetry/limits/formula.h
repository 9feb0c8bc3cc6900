#pragma once

#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace dosimetry {

/// A formula of a limit table, compiled once: numbers, names, + - * / ^ and parentheses, ^ binding strongest
/// and to the right. Values are the plain numbers of the table (nm, s, mrad, m²), not quantities.
class Formula {
  public:
    Formula() = default;
    /// Compiles `text`; each name must be one of `names`, whose index is the index into `values` later.
    /// Throws InputError that quotes what was not understood.
    Formula(std::string_view text, std::span<const std::string> names);

    double value(std::span<const double> values) const;
    const std::string& text() const { return text_; }
    /// The formula with the numbers put in for the names, nine significant digits: "10^(0.002·(905 − 700))".
    std::string with_numbers(std::span<const std::string> names, std::span<const double> values) const;
    /// Indices of the names it uses.
    const std::vector<std::size_t>& used() const { return used_; }

  private:
    enum class Op { number, name, add, subtract, multiply, divide, power, negate };
    struct Step {
        Op op;
        double number = 0.0;
        std::size_t name = 0;
    };
    friend class FormulaCompiler;
    std::string text_;
    std::vector<Step> steps_;  // postfix
    std::vector<std::size_t> used_;
};

/// A formula as it is shown: signs of mathematics in place of those of the keyboard.
std::string pretty_formula(std::string_view text);

}  // namespace dosimetry
