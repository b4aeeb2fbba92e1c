// The two budgets in C: net flux N(T) and its first two derivatives, W m-2 and K.
#ifndef BALANCE_H
#define BALANCE_H
#include <math.h>

#define SIGMA 5.670374419e-8
#define INLINE static inline __attribute__((always_inline))

// The columns of a row, in the order in which they are written to the file.
enum { FLUX, INTERNAL, COLD, WARM, MIDPOINT, WIDTH, EMISSIVITY, ICE_COLUMNS };
enum { DRY = 6, WET, LATENT, CONCENTRATION, VAPOUR_COLUMNS };

typedef struct {
  double sun, internal, cold, warm, midpoint, width, emissivity; // sun: flux / 4
  double dry, wet, latent, forcing;
} planet;

typedef struct {
  double n, slope, bend; // N, N', N''
} balance;

INLINE planet icy(const double *row) {
  return (planet){.sun = row[FLUX] / 4, .internal = row[INTERNAL], .cold = row[COLD], .warm = row[WARM],
                  .midpoint = row[MIDPOINT], .width = row[WIDTH], .emissivity = row[EMISSIVITY]};
}

INLINE planet vaporous(const double *row) {
  return (planet){.sun = row[FLUX] / 4, .internal = row[INTERNAL], .cold = row[COLD], .warm = row[WARM],
                  .midpoint = row[MIDPOINT], .width = row[WIDTH], .dry = row[DRY], .wet = row[WET],
                  .latent = row[LATENT], .forcing = 5.35 * log(row[CONCENTRATION] / 280)};
}

INLINE balance absorbed(const planet *p, double x) {
  double t = tanh((x - p->midpoint) / p->width);
  double half = (p->cold - p->warm) / 2;
  double steep = p->sun * half / p->width;
  double rest = 1 - t * t;
  return (balance){p->sun * (1 - (p->cold + p->warm) / 2 + half * t) + p->internal, steep * rest,
                   -2 * steep * t * rest / p->width};
}

INLINE balance grey(const planet *p, double x) {
  double s = p->emissivity * SIGMA;
  return (balance){s * (x * x) * (x * x), 4 * s * x * x * x, 12 * s * x * x};
}

INLINE balance column(const planet *p, double x) {
  double vapour = p->wet * exp(p->latent * (1. / 288 - 1 / x));
  double share = 1 / (1 + 0.75 * (p->dry + vapour));
  double e = SIGMA * (x * x) * (x * x) * share;
  double tau1 = vapour * p->latent / (x * x);
  double tau2 = tau1 * (p->latent / (x * x) - 2 / x);
  double r = 0.75 * tau1 * share;
  double rate = 4 / x - r;
  return (balance){e - p->forcing, e * rate, e * (rate * rate - 4 / (x * x) - (0.75 * tau2 * share - r * r))};
}

INLINE balance minus(balance a, balance b) {
  return (balance){a.n - b.n, a.slope - b.slope, a.bend - b.bend};
}
INLINE balance ice(const planet *p, double x) { return minus(absorbed(p, x), grey(p, x)); }
INLINE balance vapour(const planet *p, double x) { return minus(absorbed(p, x), column(p, x)); }

#endif
