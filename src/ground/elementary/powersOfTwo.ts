// Powers of two as products of a fine and a coarse one, so that few need to be tabulated.

/** 2^(i − 1) at index i; zeros until filled. */
const fine = /* @__PURE__ */ new Float64Array(32);
/** 2^(32i − 1074) at index i. */
const coarse = /* @__PURE__ */ new Float64Array(66);

/** Fills the powers; every table that is filled on first use calls this. */
export function fillPowersOfTwo(): void {
  let [small, large] = [0.5, 5e-324];
  for (let i = 0; i < 66; i++) {
    fine[i] = small;
    coarse[i] = large;
    small *= 2;
    large *= 4294967296;
  }
}

/** x·2^n, rounded once: n an integer in [−1075, 1024], |x| in [1/2, 4), or smaller if n is above −1022. */
export function scale(x: number, n: number): number {
  const i = n + 1075;
  return x * (fine[i & 31] as number) * (coarse[i >> 5] as number);
}

/** 2^n for an integer n in [−1074, 1023]. */
export function powerOfTwo(n: number): number {
  return scale(1, n);
}
