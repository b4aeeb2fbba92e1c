// The spacing of doubles.

/** About one unit in the last place of x; near zero, something that matters to nobody. */
export const roundoffAt = (x: number): number => Math.abs(x) * 2.3e-16 + 1e-30;
