// All powers of two that are doubles, and exact scaling by them.

const LEAST = -1074;
const GREATEST = 1023;

/** 2^n at index n + 1074; zeros until filled. */
const powers = /* @__PURE__ */ new Float64Array(GREATEST - LEAST + 1);

/** Fills the table of powers of two; every table that is filled on first use calls this. */
export function fillPowersOfTwo(): void {
  let power = 1;
  for (let n = 0; n <= GREATEST; n++) {
    powers[n - LEAST] = power;
    power *= 2;
  }
  power = 1;
  for (let n = 0; n >= LEAST; n--) {
    powers[n - LEAST] = power;
    power /= 2;
  }
}

/** 2^n for an integer n in [−1074, 1023]. */
export function powerOfTwo(n: number): number {
  return powers[n - LEAST] as number;
}

/** x·2^n, rounded once, for an integer n in [−1075, 1024] and x in [1/2, 4) (or far smaller). */
export function scale(x: number, n: number): number {
  if (n > GREATEST) return x * 2 * powerOfTwo(GREATEST);
  if (n < LEAST) return (x / 2) * powerOfTwo(LEAST);
  return x * powerOfTwo(n);
}
