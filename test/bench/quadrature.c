/* Every integral of every row by adaptive Gauss-Kronrod quadrature (GSL's qag), in a, where the integrands are smooth. */
#include <gsl/gsl_errno.h>
#include <gsl/gsl_integration.h>
#include "rows.h"

static double time_rate(double a, void *m) { return a / sqrt(a4_rate2(m, a)); }

static double conformal_rate(double a, void *m) { return 1 / sqrt(a4_rate2(m, a)); }

#define INTERVALS 1000

struct job {
  const struct model *model;
  double tolerance;
  gsl_integration_workspace *workspace;
};

/* The rule of 15 points is the fastest of GSL's for these integrands. */
static double integral(const struct job *job, double (*f)(double, void *), double from, double to) {
  gsl_function function = {f, (void *)job->model};
  double value, error;
  gsl_integration_qag(&function, from, to, 0, job->tolerance, INTERVALS, GSL_INTEG_GAUSS15, job->workspace, &value,
                      &error);
  return value;
}

void fill(const struct model *m, double from, int rows, double tolerance, double (*table)[COLUMNS]) {
  /* Where rounding keeps an error estimate above the tolerance, the value is still the best there is. */
  gsl_set_error_handler_off();
  const struct job job = {m, tolerance, gsl_integration_workspace_alloc(INTERVALS)};
  for (int i = 0; i < rows; i++) {
    const double a = exp(row_log_scale(from, rows, i));
    table[i][TIME] = integral(&job, time_rate, 0, a);
    table[i][COMOVING] = integral(&job, conformal_rate, a, 1);
    table[i][CONFORMAL] = integral(&job, conformal_rate, 0, a);
    table[i][RATE] = sqrt(a4_rate2(m, a)) / (a * a);
    table[i][SCALE] = a;
  }
  gsl_integration_workspace_free(job.workspace);
}
