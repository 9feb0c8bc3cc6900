#include "assessment/arithmetic.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <cstdlib>
#include <stdexcept>

namespace testing_support {
namespace {

constexpr std::array<std::string_view, 10> superscripts{"⁰", "¹", "²", "³", "⁴", "⁵", "⁶", "⁷", "⁸", "⁹"};

class Reader {
  public:
    explicit Reader(std::string_view text) : all_(text), rest_(text) {}

    double whole() {
        const double value = sum();
        if (!rest_.empty()) fail();
        return value;
    }

    double number() {
        std::size_t n = 0;
        while (n < rest_.size() && ((rest_[n] >= '0' && rest_[n] <= '9') || rest_[n] == '.')) ++n;
        if (n == 0) fail();
        const double value = std::strtod(std::string(rest_.substr(0, n)).c_str(), nullptr);
        rest_.remove_prefix(n);
        return take("×10") ? value * std::pow(10.0, superscript()) : value;
    }

    bool take(std::string_view token) {
        while (rest_.starts_with(" ")) rest_.remove_prefix(1);
        if (!rest_.starts_with(token)) return false;
        rest_.remove_prefix(token.size());
        return true;
    }

  private:
    [[noreturn]] void fail() const {
        throw std::runtime_error("not understood at \"" + std::string(rest_) + "\" in \"" +
                                 std::string(all_) + "\"");
    }
    void expect(std::string_view token) {
        if (!take(token)) fail();
    }
    int superscript() {
        const int sign = take("⁻") ? -1 : 1;
        int value = 0;
        bool any = false;
        while (true) {
            int digit = -1;
            for (std::size_t i = 0; i < superscripts.size(); ++i)
                if (rest_.starts_with(superscripts[i])) digit = static_cast<int>(i);
            if (digit < 0) break;
            rest_.remove_prefix(superscripts[static_cast<std::size_t>(digit)].size());
            value = 10 * value + digit;
            any = true;
        }
        if (!any) fail();
        return sign * value;
    }
    double sum() {
        double value = product();
        while (true) {
            if (take("+"))
                value += product();
            else if (take("−"))
                value -= product();
            else
                return value;
        }
    }
    double product() {
        double value = power();
        while (true) {
            if (take("·"))
                value *= power();
            else if (take("/"))
                value /= power();
            else if (take("atan"))  // "2 atan(x)"
                value *= std::atan(in_brackets());
            else
                return value;
        }
    }
    double power() {
        if (take("−")) return -power();
        double value = atom();
        if (take("²")) value *= value;
        return take("^") ? std::pow(value, power()) : value;
    }
    double in_brackets() {
        expect("(");
        const double value = sum();
        expect(")");
        return value;
    }
    double atom() {
        if (take("π")) return 3.14159265358979323846;
        if (take("√")) return std::sqrt(in_brackets());
        if (take("exp")) return std::exp(in_brackets());
        if (take("log₁₀")) return std::log10(atom());
        if (take("min")) return two_arguments([](double a, double b) { return std::min(a, b); });
        if (take("max")) return two_arguments([](double a, double b) { return std::max(a, b); });
        if (take("|")) {
            const double value = sum();
            expect("|");
            return std::fabs(value);
        }
        if (take("(")) {
            const double value = sum();
            expect(")");
            return value;
        }
        return number();
    }
    template <class Operation>
    double two_arguments(Operation operation) {
        expect("(");
        const double a = sum();
        expect(",");
        const double b = sum();
        expect(")");
        return operation(a, b);
    }

    std::string_view all_;
    std::string_view rest_;
};

}  // namespace

double value_of(std::string_view text) {
    return Reader(text).whole();
}

double leading_number(std::string_view text) {
    Reader reader(text);
    const bool negative = reader.take("−");
    return negative ? -reader.number() : reader.number();
}

}  // namespace testing_support
