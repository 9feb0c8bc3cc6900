#pragma once

#include <gsl/gsl_integration.h>

#include <cmath>
#include <memory>

namespace testing_support {

/// Integral by GSL's adaptive Gauss-Kronrod rule (QUADPACK qag), the outside reference for closed forms.
template <class Function>
double integral(Function function, double from, double to, double relative) {
    struct Free {
        void operator()(gsl_integration_workspace* w) const { gsl_integration_workspace_free(w); }
    };
    const std::unique_ptr<gsl_integration_workspace, Free> workspace(gsl_integration_workspace_alloc(1000));
    gsl_function f;
    f.params = &function;
    f.function = [](double x, void* self) { return (*static_cast<Function*>(self))(x); };
    double result = 0.0;
    double error = 0.0;
    const int status = gsl_integration_qag(&f, from, to, 0.0, relative, 1000, GSL_INTEG_GAUSS61,
                                           workspace.get(), &result, &error);
    return status == 0 ? result : std::nan("");
}

}  // namespace testing_support
