#include "limits/formula.h"

#include <algorithm>
#include <array>
#include <cmath>

#include "quantities/decimal.h"
#include "quantities/format.h"
#include "quantities/input_error.h"

namespace dosimetry {
namespace {

constexpr std::size_t deepest = 32;

bool starts_name(char c) {
    return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || c == '_';
}
bool continues_name(char c) {
    return starts_name(c) || (c >= '0' && c <= '9');
}

std::size_t name_length(std::string_view text) {
    std::size_t n = 0;
    if (!text.empty() && starts_name(text[0]))
        while (n < text.size() && continues_name(text[n])) ++n;
    return n;
}

}  // namespace

class FormulaCompiler {
  public:
    FormulaCompiler(std::string_view text, std::span<const std::string> names)
        : all_(text), rest_(text), names_(names) {}

    std::vector<Formula::Step> compile() {
        sum();
        if (!peek_is_end()) fail();
        return std::move(steps_);
    }

  private:
    using Op = Formula::Op;

    [[noreturn]] void fail() const {
        throw InputError("the formula " + quoted(std::string(all_)) + " is not understood at " +
                             quoted(std::string(rest_)),
                         "numbers, + - * / ^ ( ) and the names of variables and factors given before");
    }
    void skip_spaces() {
        while (!rest_.empty() && rest_.front() == ' ') rest_.remove_prefix(1);
    }
    bool peek_is_end() {
        skip_spaces();
        return rest_.empty();
    }
    bool take(char c) {
        skip_spaces();
        if (rest_.empty() || rest_.front() != c) return false;
        rest_.remove_prefix(1);
        return true;
    }
    void emit(Op op, double number = 0.0, std::size_t name = 0) {
        steps_.push_back({op, number, name});
        if (op == Op::number || op == Op::name) {
            if (++depth_ > deepest) fail();
        } else if (op != Op::negate) {
            --depth_;
        }
    }
    void sum() {
        product();
        while (true) {
            if (take('+'))
                product(), emit(Op::add);
            else if (take('-'))
                product(), emit(Op::subtract);
            else
                break;
        }
    }
    void product() {
        signed_power();
        while (true) {
            if (take('*'))
                signed_power(), emit(Op::multiply);
            else if (take('/'))
                signed_power(), emit(Op::divide);
            else
                break;
        }
    }
    void signed_power() {
        if (take('-')) {
            nest();
            signed_power();
            --nesting_;
            emit(Op::negate);
        } else {
            atom();
            if (take('^')) {
                nest();
                signed_power();
                --nesting_;
                emit(Op::power);
            }
        }
    }
    void nest() {
        if (++nesting_ > deepest) fail();
    }
    void atom() {
        if (take('(')) {
            nest();
            sum();
            --nesting_;
            if (!take(')')) fail();
            return;
        }
        skip_spaces();
        if (const std::size_t n = name_length(rest_); n > 0) {
            const auto found = std::find(names_.begin(), names_.end(), rest_.substr(0, n));
            if (found == names_.end()) fail();
            rest_.remove_prefix(n);
            emit(Op::name, 0.0, static_cast<std::size_t>(found - names_.begin()));
            return;
        }
        const std::size_t n = number_prefix_length(rest_);
        if (n == 0 || rest_[0] == '+') fail();
        emit(Op::number, parse_number(rest_.substr(0, n), DecimalMark::point));
        rest_.remove_prefix(n);
    }

    std::string_view all_;
    std::string_view rest_;
    std::span<const std::string> names_;
    std::vector<Formula::Step> steps_;
    std::size_t depth_ = 0;
    std::size_t nesting_ = 0;
};

Formula::Formula(std::string_view text, std::span<const std::string> names)
    : text_(text), steps_(FormulaCompiler(text, names).compile()) {
    for (const Step& step : steps_)
        if (step.op == Op::name && std::find(used_.begin(), used_.end(), step.name) == used_.end())
            used_.push_back(step.name);
}

double Formula::value(std::span<const double> values) const {
    std::array<double, deepest + 1> stack{};
    std::size_t top = 0;
    const auto binary = [&](auto operation) {
        stack[top - 2] = operation(stack[top - 2], stack[top - 1]);
        --top;
    };
    for (const Step& step : steps_) {
        switch (step.op) {
            case Op::number:
                stack[top++] = step.number;
                break;
            case Op::name:
                stack[top++] = values[step.name];
                break;
            case Op::add:
                binary([](double a, double b) { return a + b; });
                break;
            case Op::subtract:
                binary([](double a, double b) { return a - b; });
                break;
            case Op::multiply:
                binary([](double a, double b) { return a * b; });
                break;
            case Op::divide:
                binary([](double a, double b) { return a / b; });
                break;
            case Op::power:
                binary([](double a, double b) { return std::pow(a, b); });
                break;
            case Op::negate:
                stack[top - 1] = -stack[top - 1];
                break;
        }
    }
    return stack[0];
}

std::string Formula::with_numbers(std::span<const std::string> names, std::span<const double> values) const {
    std::string result;
    std::string_view rest = text_;
    while (!rest.empty()) {
        if (const std::size_t n = name_length(rest); n > 0) {
            const auto found = std::find(names.begin(), names.end(), rest.substr(0, n));
            result += exact_term(values[static_cast<std::size_t>(found - names.begin())]);
            rest.remove_prefix(n);
        } else if (const std::size_t m = number_prefix_length(rest);
                   m > 0 && rest[0] >= '0' && rest[0] <= '9') {
            result += rest.substr(0, m);
            rest.remove_prefix(m);
        } else {
            result += pretty_formula(rest.substr(0, 1));
            rest.remove_prefix(1);
        }
    }
    return result;
}

std::string pretty_formula(std::string_view text) {
    std::string result;
    for (char c : text) {
        if (c == '*')
            result += "·";
        else if (c == '-')
            result += "−";
        else
            result += c;
    }
    return result;
}

}  // namespace dosimetry
