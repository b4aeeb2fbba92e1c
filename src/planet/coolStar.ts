// Where stars become so cool that an albedo found under the Sun does not hold under them.

/** Below this effective temperature molecules shape the spectrum: the stars of class M, K (a convention). */
export const COOL_STAR = 3900;
