// The runaway greenhouse of Kopparapu et al. 2014, Table 1, the one limit that was computed for three masses.
import type { FiveNumbers } from "./fluxPolynomial.ts";

/** S₀, a, b, c, d by Earth masses. */
export const RUNAWAY_2014 = {
  "0.1": [0.99, 1.209e-4, 1.404e-8, -7.418e-12, -1.713e-15],
  "1": [1.107, 1.332e-4, 1.58e-8, -8.308e-12, -1.931e-15],
  "5": [1.188, 1.433e-4, 1.707e-8, -8.968e-12, -2.084e-15],
} as const satisfies Readonly<Record<string, FiveNumbers>>;
