/* One run of GSL's rk8pd (Prince & Dormand 1981) over the rows in ln a, from radiation and matter alone far back. */
#include <gsl/gsl_errno.h>
#include <gsl/gsl_odeiv2.h>
#include "rows.h"

/* Here curvature and dark energy are below 1e-15 of E^2, as in every model that this program is given. */
#define START 1e-6

static int rates(double N, const double y[], double dy[], void *m) {
  (void)y;
  const double a = exp(N);
  const double rate = a / sqrt(a4_rate2(m, a));
  dy[0] = a * rate;
  dy[1] = rate;
  return GSL_SUCCESS;
}

/* Closed forms for radiation and matter, with x = matter a/radiation and s = sqrt(1 + x), free of cancellation. */
static void begin(const struct model *m, double a, double y[2]) {
  const double x = m->matter * a / m->radiation, s = sqrt(1 + x), less = x / (s + 1), root = sqrt(m->radiation);
  y[0] = 2 * m->radiation * root / (3 * m->matter * m->matter) * less * less * (s + 2);
  y[1] = 2 * root / m->matter * less;
}

void fill(const struct model *m, double from, int rows, double tolerance, double (*table)[COLUMNS]) {
  gsl_odeiv2_system system = {rates, NULL, 2, (void *)m};
  gsl_odeiv2_driver *driver = gsl_odeiv2_driver_alloc_y_new(&system, gsl_odeiv2_step_rk8pd, 0.05, 0, tolerance);
  double N = log(START), y[2];
  begin(m, START, y);
  for (int i = 0; i < rows; i++) {
    const double next = row_log_scale(from, rows, i), a = exp(next);
    if (next > N) gsl_odeiv2_driver_apply(driver, &N, next, y);
    table[i][TIME] = y[0];
    table[i][CONFORMAL] = y[1];
    table[i][RATE] = sqrt(a4_rate2(m, a)) / (a * a);
    table[i][SCALE] = a;
  }
  for (int i = 0; i < rows; i++) table[i][COMOVING] = table[rows - 1][CONFORMAL] - table[i][CONFORMAL];
  gsl_odeiv2_driver_free(driver);
}
