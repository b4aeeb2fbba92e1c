// Counts of zeros against Sturm's theorem in exact integer arithmetic.
import { describe, expect, test } from "vitest";
import { enumerateZeros } from "../../src/search/enumerateZeros.ts";
import { randomNumbers } from "../graph/randomGraph.ts";
import { countZeros, exactSign, type Polynomial } from "./exact.ts";
import { enclosedBy, polynomial } from "./jet.ts";

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

describe("random polynomials", () => {
  test.each([3, 5])(
    "5,000 of degree %i: every zero, once, in a bracket with exact opposite signs",
    (degree) => {
      const random = randomNumbers(degree);
      const seen = { zeros: 0, several: 0, undecided: 0 };
      for (let k = 0; k < 5000; k++) {
        const p: Polynomial = Array.from({ length: degree + 1 }, () =>
          BigInt(Math.floor(random() * 401) - 200),
        );
        const [from, to] = [-2 - random(), 2 + random()];
        if (exactSign(p, from) === 0 || exactSign(p, to) === 0 || p[degree] === 0n) continue;
        const found = enumerateZeros(enclosedBy(polynomial(p.map(Number))), [from, to], {
          effort: 3000,
          fine: 0.1,
        });
        const where = `${p} on [${from}, ${to}]`;
        for (const zero of found.zeros) {
          const [a, b] = zero.bracket;
          expect(exactSign(p, a) * exactSign(p, b), where).toBe(-1);
          expect(exactSign(p, b), where).toBe(zero.direction);
          expect(countZeros(p, a, b), where).toBe(1);
          expect(zero.at >= a && zero.at <= b, where).toBe(true);
        }
        // zeros in undecided stretches are counted there
        const doubtful = found.undecided.reduce((sum, u) => sum + countZeros(p, ...u.interval), 0);
        const count = countZeros(p, from, to);
        expect(found.zeros.length + doubtful, where).toBe(count);
        seen.zeros += count;
        if (count > 1) seen.several++;
        if (found.undecided.length > 0) seen.undecided++;
      }
      expect(seen.zeros).toBeGreaterThan(5000);
      expect(seen.several).toBeGreaterThan(1000);
      expect(seen.undecided).toBeLessThan(3);
    },
  );
});

describe("polynomials with small coefficients, many with multiple zeros or zeros at the ends of the range", () => {
  test("2,000 of degree 4: no zero is missed, none is listed twice", () => {
    const random = randomNumbers(11);
    const seen = { decided: 0, undecided: 0 };
    for (let k = 0; k < 2000; k++) {
      const p: Polynomial = [...Array.from({ length: 4 }, () => BigInt(Math.floor(random() * 9) - 4)), 1n];
      const found = enumerateZeros(enclosedBy(polynomial(p.map(Number))), [-2, 2], {
        effort: 4000,
        fine: 0.1,
      });
      // the stretches outside of brackets and undecided intervals, each between two doubles, hold no zero
      const known = [...found.zeros.map((z) => z.bracket), ...found.undecided.map((u) => u.interval)];
      let from = -2;
      for (const [a, b] of [...known.sort((x, y) => x[0] - y[0]), [2, 2] as const]) {
        expect(a, `${p}: overlap`).toBeGreaterThanOrEqual(from);
        if (a > from) expect(countZeros(p, from, a), `${p} in [${from}, ${a}]`).toBe(0);
        from = b;
      }
      for (const { bracket } of found.zeros) expect(countZeros(p, ...bracket), `${p}`).toBe(1);
      if (found.undecided.length > 0) seen.undecided++;
      else seen.decided++;
    }
    expect(seen.undecided).toBeGreaterThan(50);
    expect(seen.decided).toBeGreaterThan(1000);
  });
});
