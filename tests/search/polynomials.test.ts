// Counts of zeros against Sturm's theorem in exact integer arithmetic.
import { describe, expect, test } from "vitest";
import type { Enclosed } from "../../src/search/enclosed.ts";
import type { Enumeration } from "../../src/search/enumeration.ts";
import { randomNumbers } from "../graph/randomGraph.ts";
import { countZeros, exactSign, type Polynomial } from "./exact.ts";
import { enclosedBy, polynomial } from "./jet.ts";
import { zerosOf } from "./zerosOf.ts";

describe("the exact count that the others are compared with", () => {
  test("knows polynomials whose zeros are written down", () => {
    // (x − 1)(x − 2)(x − 3), (x² + 1)(x − 5), (x − 2)²
    expect(countZeros([-6n, 11n, -6n, 1n], -9, 9)).toBe(3);
    expect(countZeros([-6n, 11n, -6n, 1n], 1.5, 2.5)).toBe(1);
    expect(countZeros([-5n, 1n, -5n, 1n], -9, 9)).toBe(1);
    expect(countZeros([4n, -4n, 1n], -9, 9)).toBe(1);
    expect(exactSign([-2n, 0n, 1n], Math.SQRT2)).toBe(1);
    expect(exactSign([-2n, 0n, 1n], 1.4142135623730949)).toBe(-1);
  });
});

/** What is wrong with a result: zeros outside of brackets and undecided intervals, brackets that do not keep their promise. */
function faultsOf(
  p: Polynomial,
  { zeros, undecided }: Enumeration,
  [from, to]: readonly [number, number],
): string[] {
  const known = [...zeros.map((z) => z.bracket), ...undecided.map((u) => u.interval)];
  const faults: string[] = [];
  let reached = from;
  for (const [a, b] of [...known.sort((x, y) => x[0] - y[0]), [to, to] as const]) {
    if (a < reached) faults.push(`${p}: overlap at ${a}`);
    if (a > reached && countZeros(p, reached, a) > 0) faults.push(`${p}: a zero in [${reached}, ${a}]`);
    reached = b;
  }
  const slope = p.map((c, i) => c * BigInt(i)).slice(1);
  for (const { at, bracket, direction, slopeSign } of zeros) {
    const [a, b] = bracket;
    const signs = exactSign(p, a) === -direction && exactSign(p, b) === direction;
    const steady = [a, at, b].every((x) => exactSign(slope, x) === slopeSign);
    if (!signs || countZeros(p, a, b) !== 1) faults.push(`${p}: [${bracket}] is no bracket`);
    if (slopeSign !== 0 && !steady) faults.push(`${p}: slope over [${bracket}]`);
    if (!(at >= a && at <= b)) faults.push(`${p}: ${at} outside [${bracket}]`);
  }
  return faults;
}

/** A search and its faults. */
function searched(p: Polynomial, range: readonly [number, number], blur?: (f: Enclosed) => Enclosed) {
  const f = enclosedBy(polynomial(p.map(Number)));
  const found = zerosOf(blur ? blur(f) : f, range, { effort: 3000, fine: 0.1 });
  return { found, faults: faultsOf(p, found, range) };
}
const drawn = (random: () => number, degree: number, most: number): Polynomial => [
  ...Array.from({ length: degree }, () => BigInt(Math.floor(random() * (2 * most + 1)) - most)),
  BigInt(1 + Math.floor(random() * most)),
];
const MINUTE = 60_000;

describe("random polynomials", () => {
  test.each([3, 5])(
    "3,000 of degree %i: every zero, once, in a bracket with exact opposite signs",
    (degree) => {
      const random = randomNumbers(degree);
      const seen = { zeros: 0, several: 0, undecided: 0 };
      const faults: string[] = [];
      for (let k = 0; k < 3000; k++) {
        const p = drawn(random, degree, 200);
        const range = [-2 - random(), 2 + random()] as const;
        const { found, faults: more } = searched(p, range);
        faults.push(...more);
        const count = countZeros(p, ...range);
        if (found.undecided.length > 0) seen.undecided++;
        else if (found.zeros.length !== count) faults.push(`${p}: ${found.zeros.length} instead of ${count}`);
        seen.zeros += count;
        if (count > 1) seen.several++;
      }
      expect(faults).toEqual([]);
      expect(seen.zeros).toBeGreaterThan(3000);
      expect(seen.several).toBeGreaterThan(500);
      expect(seen.undecided).toBeLessThan(3);
    },
    MINUTE,
  );
});

describe("enclosures that are wider than they need be", () => {
  /** The same function; from each lower bound and to each upper one something is taken away or added. */
  const blurred = (f: Enclosed, [down, up]: readonly [readonly number[], readonly number[]]): Enclosed => {
    const blur = (out: Float64Array, parts: number): void => {
      for (let i = 0; i < parts; i++) {
        out[3 * i] = (out[3 * i] as number) - (down[i] as number);
        out[3 * i + 1] = (out[3 * i + 1] as number) + (up[i] as number);
        out[3 * i + 2] = (out[3 * i + 2] as number) * 2 + 1e-15 * ((down[i] as number) + (up[i] as number));
      }
    };
    return {
      box(a, b, out) {
        f.box(a, b, out);
        blur(out, 3);
      },
      point(x, out) {
        f.point(x, out);
        blur(out, 2);
      },
    };
  };

  test(
    "2,000 polynomials of degree 2 to 4: nothing is missed, and no slope is claimed that is not there",
    () => {
      const random = randomNumbers(17);
      const seen = { zeros: 0, undecided: 0, complete: 0 };
      const faults: string[] = [];
      for (let k = 0; k < 2000; k++) {
        const p = drawn(random, 2 + Math.floor(random() * 3), 20);
        const errors = () => [0, 1, 2].map(() => (random() < 0.5 ? 0 : 40 * random() * random() * random()));
        const [down, up] = [errors(), errors()];
        const range = [-3 - random(), 3 + random()] as const;
        const { found, faults: more } = searched(p, range, (f) => blurred(f, [down, up]));
        faults.push(...more.map((fault) => `${fault}, blurred by ${down} and ${up}`));
        seen.zeros += found.zeros.length;
        seen.undecided += found.undecided.length;
        if (found.undecided.length === 0) seen.complete++;
      }
      expect(faults).toEqual([]);
      expect(seen.zeros).toBeGreaterThan(1000);
      expect(Math.min(seen.undecided, seen.complete)).toBeGreaterThan(100);
    },
    MINUTE,
  );
});

describe("polynomials with small coefficients, many with multiple zeros or zeros at the ends of the range", () => {
  test(
    "2,000 of degree 5: no zero is missed, none is listed twice",
    () => {
      const random = randomNumbers(11);
      const seen = { decided: 0, undecided: 0 };
      const faults: string[] = [];
      for (let k = 0; k < 2000; k++) {
        const p: Polynomial = [...drawn(random, 3, 4), BigInt(Math.floor(random() * 9) - 4), 1n];
        const { found, faults: more } = searched(p, [-2, 2]);
        faults.push(...more);
        if (found.undecided.length > 0) seen.undecided++;
        else seen.decided++;
      }
      expect(faults).toEqual([]);
      expect(seen.undecided).toBeGreaterThan(50);
      expect(seen.decided).toBeGreaterThan(1000);
    },
    MINUTE,
  );
});
