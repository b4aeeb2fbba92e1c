// Numbers to test with, the same on every run.

/** Numbers between low and high (Park and Miller's generator). */
export function between(low: number, high: number, count = 20_000, seed = 20230): number[] {
  let state = seed;
  return Array.from({ length: count }, () => {
    state = (state * 48271) % 2147483647;
    return low + (high - low) * (state / 2147483647);
  });
}

/** Numbers of either sign with 53 random bits and sizes from 2^-spread to 2^spread. */
export function doubles(spread: number, count: number, seed: number): number[] {
  const upper = between(-1, 1, count, seed);
  const lower = between(0, 2 ** -30, count, seed + 1);
  const exponents = between(-spread, spread, count, seed + 2);
  return upper.map((x, i) => (x + (lower[i] as number)) * 2 ** Math.round(exponents[i] as number));
}
