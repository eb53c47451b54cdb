/* What every program here makes: rows equally spaced in ln a, from a = `from` to today, of five numbers in 1/H0, c/H0 and H0. */
#ifndef ROWS_H
#define ROWS_H

#include <math.h>

enum { TIME, COMOVING, CONFORMAL, RATE, SCALE, COLUMNS };

/* Densities today over the critical density. */
struct model {
  double radiation, matter, curvature, dark;
};

/* a^4 E^2 */
static inline double a4_rate2(const struct model *m, double a) {
  return m->radiation + a * (m->matter + a * (m->curvature + a * a * m->dark));
}

static inline double row_log_scale(double from, int rows, int i) {
  return log(from) * (rows - 1 - i) / (rows - 1);
}

/* Fills rows of COLUMNS numbers, with a relative tolerance for every integral. */
void fill(const struct model *m, double from, int rows, double tolerance, double (*table)[COLUMNS]);

#endif
