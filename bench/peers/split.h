// All zeros of N in a range, without proof: the range is split where N' changes sign, each piece by safeguarded Newton.
#ifndef SPLIT_H
#define SPLIT_H
#include "balance.h"

#define MOST 8 // pieces; N' changes sign at most four times on these budgets

// A zero of N (order 0) or of N' (order 1) between a and b, whose signs differ: Newton, or bisection where that fails.
#define FIND(name, model)                                                                                    \
  INLINE double name(const planet *p, double a, double b, double x, int order, int rising, double close) {  \
    if (!(x > a && x < b)) x = (a + b) / 2;                                                                  \
    for (int step = 0; step < 80; step++) {                                                                  \
      balance y = model(p, x);                                                                               \
      double f = order ? y.slope : y.n, slope = order ? y.bend : y.slope;                                    \
      if ((f > 0) == rising) b = x; else a = x;                                                              \
      double next = x - f / slope;                                                                           \
      if (!(next >= a && next <= b)) next = (a + b) / 2;                                                       \
      double move = fabs(next - x);                                                                          \
      x = next;                                                                                              \
      if (move < close * x) break;                                                                           \
    }                                                                                                        \
    return x;                                                                                                \
  }
FIND(find_ice, ice)
FIND(find_vapour, vapour)

#define SPLIT_CLOSE 1e-6 // relative; the next step of Newton would be a hundred thousand times smaller
#define STATE_CLOSE 1e-8

// Where the albedo's steepness gains most on a slope that grows like T^3: tanh u = -3w/2T.
INLINE double steepest(const planet *p) {
  double x = p->midpoint;
  for (int i = 0; i < 3; i++) {
    double h = 1.5 * p->width / x;
    x = p->midpoint - p->width * h * (1 + h * h / 3);
  }
  return x;
}

// Half the width of the stretch on which the albedo steepens N by more than `slope`; 0 where there is none.
INLINE double reach(const planet *p, double slope) {
  double r2 = p->sun * (p->cold - p->warm) / (2 * p->width * slope);
  return r2 > 1 ? p->width * log(sqrt(r2) + sqrt(r2 - 1)) : 0;
}

INLINE int states_ice(const planet *p, double low, double high, double *out) {
  double cuts[4] = {low}, guess[3];
  int n = 1;
  double top = steepest(p);
  double level = p->sun * (1 - p->cold) + p->internal, open = p->sun * (1 - p->warm) + p->internal;
  double s = p->emissivity * SIGMA;
  guess[0] = sqrt(sqrt(level / s));
  if (ice(p, top).slope > 0) {
    double far = reach(p, 4 * s * top * top * top);
    cuts[1] = find_ice(p, low, top, p->midpoint - far, 1, 1, SPLIT_CLOSE);
    cuts[2] = find_ice(p, top, high, p->midpoint + far, 1, 0, SPLIT_CLOSE);
    guess[1] = top;
    guess[2] = sqrt(sqrt(open / s));
    n = 3;
  } else if (guess[0] > top) guess[0] = sqrt(sqrt(open / s));
  cuts[n] = high;
  int found = 0;
  double before = ice(p, low).n;
  for (int i = 0; i < n; i++) {
    double after = ice(p, cuts[i + 1]).n;
    if ((before > 0) != (after > 0))
      out[found++] = find_ice(p, cuts[i], cuts[i + 1], guess[i], 0, after > 0, STATE_CLOSE);
    before = after;
  }
  return found;
}

// Where the column emits most: 4 (1 + 3/4 τ) T = 3/4 τ_vapour L, in the exponent, which is nearly straight in 1/T.
INLINE double brightest(const planet *p) {
  double x = 330, blanket = 1 + 0.75 * p->dry;
  for (int i = 0; i < 20; i++) {
    double vapour = 4 * x * blanket / (0.75 * (p->latent - 4 * x) * p->wet);
    double next = 1 / (1. / 288 - log(vapour) / p->latent);
    double move = fabs(next - x);
    x = next;
    if (move < 1e-4) break;
  }
  return x;
}

#define BETWEEN 4 // places at which N' is looked at between the steepest albedo and the brightest column

INLINE int states_vapour(const planet *p, double low, double high, double *out) {
  // A little beyond the brightest, so that N' is surely positive there.
  double top = steepest(p), bright = brightest(p) + 0.1, dim = p->latent / 4;
  double cuts[MOST], at[BETWEEN + 5], slope[BETWEEN + 5];
  int places = 0, n = 1;
  cuts[0] = at[places++] = low;
  for (int i = 0; i <= BETWEEN; i++) {
    double rest = 1 - (double)i / BETWEEN; // closer together towards the brightest
    at[places++] = bright - (bright - top) * rest * rest;
  }
  at[places++] = dim * 1.001; // the least emission is below L/4 by a part in 10^5 at most
  at[places++] = high;
  double far = 0;
  for (int i = 0; i < places; i++) slope[i] = vapour(p, at[i]).slope;
  if (slope[1] > 0) far = reach(p, column(p, top).slope);
  for (int i = 1; i < places; i++) {
    int rising = slope[i] > 0;
    if ((slope[i - 1] > 0) == rising) continue;
    double start = i == places - 2 ? dim : i == 1 ? p->midpoint - far : (at[i - 1] + at[i]) / 2;
    cuts[n++] = find_vapour(p, at[i - 1], at[i], start, 1, rising, SPLIT_CLOSE);
  }
  cuts[n] = high;
  double level = p->sun * (1 - p->cold) + p->internal + p->forcing;
  int found = 0;
  double before = vapour(p, low).n;
  for (int i = 0; i < n; i++) {
    double after = vapour(p, cuts[i + 1]).n;
    if ((before > 0) != (after > 0)) {
      double start = cuts[i] > bright - 30 ? cuts[i] + 25 : (cuts[i] + cuts[i + 1]) / 2;
      if (i == 0) start = sqrt(sqrt(level * (1 + 0.75 * p->dry) / SIGMA));
      out[found++] = find_vapour(p, cuts[i], cuts[i + 1], start, 0, after > 0, STATE_CLOSE);
    }
    before = after;
  }
  return found;
}

#endif
