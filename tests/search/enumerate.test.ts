// The proved search on functions whose zeros are known.
import { describe, expect, test } from "vitest";
import type { UndecidedStretch } from "../../src/search/enumeration.ts";
import { enclosedBy, shift, squared } from "./jet.ts";
import { cornered, doubtful, enclosed, ice, type Problem, ramp, smooth } from "./problems.ts";
import { zerosOf } from "./zerosOf.ts";

const search = (p: Problem, effort = 500) =>
  zerosOf(enclosed(p), p.range, { effort, ...(p.cuts && { cuts: p.cuts }) });

describe("functions whose zeros can all be proved", () => {
  test.each([...smooth, ...cornered])("$title", (problem) => {
    const found = search(problem);
    expect(found.undecided).toEqual([]);
    expect(found.zeros.length).toBe(problem.zeros.length);
    found.zeros.forEach(({ at, bracket: [a, b], direction, slopeSign }, i) => {
      const zero = problem.zeros[i] as number;
      // the zeros are written with 16 digits, and the bracket may be narrower
      expect(a).toBeLessThanOrEqual(zero + 5e-15 * Math.abs(zero));
      expect(b).toBeGreaterThanOrEqual(zero - 5e-15 * Math.abs(zero));
      expect(at >= a && at <= b && b - a <= 1e-11).toBe(true);
      expect(slopeSign).toBe(direction);
      // zeros of a continuous function alternate
      expect(direction).toBe((found.zeros[0]?.direction ?? 0) * (i % 2 === 0 ? 1 : -1));
    });
  });
});

describe("functions that cannot be decided everywhere", () => {
  test.each(doubtful)("$title", (problem) => {
    const found = search(problem);
    expect(found.undecided.map((u) => u.kind)).toEqual(problem.doubts);
    const places = [...found.zeros.map((z) => z.bracket), ...found.undecided.map((u) => u.interval)];
    for (const zero of problem.zeros)
      expect(places.filter(([a, b]) => a <= zero && zero <= b).length).toBe(1);
    for (const { enclosure } of found.undecided) expect(enclosure[0] <= 0 && enclosure[1] >= 0).toBe(true);
  });

  test.each([
    ["a double zero", "0 or 2", 1e-12],
    ["a triple zero", "1, or an odd number", 1e-4],
    ["|x − 1|", "0, or an even number", 1e-12],
    ["a zero at the lower end", "0 or 1", 1e-15],
    ["a step through zero", "0 or more", 1e-12],
    ["a pole", "0 or more", 1e-12],
  ])("%s: counts and narrow interval", (title, counts, width) => {
    const [only] = search(doubtful.find((p) => p.title === title) as Problem).undecided;
    expect(only?.counts).toBe(counts);
    const [a, b] = (only as UndecidedStretch).interval;
    expect(b - a).toBeLessThan(width);
  });

  test("a continuum reaches from kink to kink and holds the function within its rounding", () => {
    for (const cuts of [[], [250, 282]]) {
      const [only] = zerosOf(enclosedBy(ramp(128, 32)), [2.7, 2000], { effort: 500, cuts }).undecided;
      const [a, b] = (only as UndecidedStretch).interval;
      expect([a, b].map((x) => Number(x.toFixed(9)))).toEqual([250, 282]);
      expect(a <= 250 && b >= 282).toBe(true);
      // four flows of up to 600, each rounded by the tests' own 1e-15
      for (const bound of only?.enclosure ?? [1]) expect(Math.abs(bound)).toBeLessThan(1e-11);
    }
  });
});

describe("x² = p", () => {
  const at = (p: number) =>
    zerosOf(
      enclosedBy((x) => shift(squared(x), -p)),
      [-10, 12],
      { effort: 40 },
    );
  test.each([1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 1e-12, 1e-20])("two zeros at %d", (p) => {
    const { zeros, undecided } = at(p);
    expect(undecided).toEqual([]);
    expect(zeros.length).toBe(2);
    // the square root of a double is wrong by half a unit in the last place
    for (const { bracket } of zeros) {
      expect(Math.min(...bracket.map(Math.abs))).toBeLessThanOrEqual(Math.sqrt(p) * (1 + 3e-16));
      expect(Math.max(...bracket.map(Math.abs))).toBeGreaterThanOrEqual(Math.sqrt(p) * (1 - 3e-16));
    }
    expect(at(-p)).toMatchObject({ zeros: [], undecided: [] });
  });
  test("undecided at 0", () => {
    expect(at(0)).toMatchObject({ zeros: [], undecided: [{ kind: "fold", counts: "0 or 2" }] });
  });
});

describe("near a fold", () => {
  // flux and temperature of the folds: tests/reference/computed/i_tanh_albedo.json, case i-textbook-sigma5.67e-8
  const FOLDS = [
    { flux: 1674.8709731071854, t: 252.062923816742, inside: -1 },
    { flux: 1192.2929944339212, t: 274.23365877996423, inside: 1 },
  ];
  test.each([1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 1e-12])(
    "few boxes and points at a distance of %d",
    (distance) => {
      for (const { flux, t, inside } of FOLDS) {
        for (const side of [inside, -inside]) {
          const found = zerosOf(enclosedBy(ice(flux + side * distance)), [2.7, 2000], { effort: 500 });
          expect(found.boxes).toBeLessThanOrEqual(24);
          expect(found.points).toBeLessThanOrEqual(60);
          const near = found.zeros.filter((z) => Math.abs(z.at - t) < 2);
          // the balance is a sum of numbers near 400, so the tests' own rounding of 1e-15 hides a distance of 1e-10
          if (distance >= 1e-8)
            expect([near.length, found.undecided.length]).toEqual([side === inside ? 2 : 0, 0]);
          else if (found.undecided.length > 0) {
            expect(found.undecided).toMatchObject([{ kind: "fold", counts: "0 or 2" }]);
            const [a, b] = found.undecided[0]?.interval ?? [0, 0];
            expect(a < t && t < b && b - a < 1e-4).toBe(true);
            expect(near).toEqual([]);
          } else expect(near.length).toBe(side === inside ? 2 : 0);
          expect(found.zeros.length - near.length).toBe(1);
        }
      }
    },
  );

  test("three smooth zeros take few boxes and points", () => {
    const found = zerosOf(enclosedBy(ice(1361)), [2.7, 2000], { effort: 500 });
    expect(found).toMatchObject({ zeros: { length: 3 }, undecided: [] });
    expect(found.boxes).toBeLessThanOrEqual(24);
    expect(found.points).toBeLessThanOrEqual(32);
  });
});
