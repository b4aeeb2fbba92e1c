// Every part of the range is either decided by a box that was read, or listed as undecided.
import { describe, expect, test } from "vitest";
import type { Enclosed } from "../../src/search/enclosed.ts";
import { leastBetween } from "../../src/search/endpointForm.ts";
import { randomNumbers } from "../graph/randomGraph.ts";
import { enclosedBy } from "./jet.ts";
import { cornered, doubtful, enclosed, ice, smooth } from "./problems.ts";
import { zerosOf } from "./zerosOf.ts";

interface Box {
  readonly a: number;
  readonly b: number;
  readonly out: Float64Array;
}

/** The same function; the boxes read of it are kept. */
function recorded(f: Enclosed): Enclosed & { readonly boxes: Box[] } {
  const boxes: Box[] = [];
  return {
    boxes,
    point: (x, out) => f.point(x, out),
    box(a, b, out) {
      f.box(a, b, out);
      boxes.push({ a, b, out: out.slice() });
    },
  };
}

/** Whether a box can be decided, from its own reading and those at its ends; written apart from the search. */
function decidable(f: Enclosed, { a, b, out }: Box): boolean {
  const bounds = (at: number, from = out): [number, number] => [
    (from[at] as number) - (from[at + 2] as number),
    (from[at + 1] as number) + (from[at + 2] as number),
  ];
  const signed = ([lo, hi]: [number, number]): boolean => Number.isFinite(lo + hi) && (lo > 0 || hi < 0);
  const [value, slope, bend] = [bounds(0), bounds(3), bounds(6)];
  if (signed(value)) return true;
  const ends = [a, b].map((x) => {
    const point = new Float64Array(6);
    f.point(x, point);
    return bounds(0, point);
  }) as [[number, number], [number, number]];
  if (!ends.every(signed) || !Number.isFinite(slope[0] + slope[1] + value[0] + value[1])) return false;
  if (signed(slope) || signed(bend)) return true;
  const [[low, high], [lowRight, highRight]] = ends;
  const width = b - a;
  return (
    leastBetween({ left: low, right: lowRight }, { fall: slope[0], rise: slope[1] }, width) > 0 ||
    leastBetween({ left: -high, right: -highRight }, { fall: -slope[1], rise: -slope[0] }, width) > 0
  );
}

function uncovered(f: Enclosed, range: readonly [number, number], effort: number, cuts: readonly number[]) {
  const seen = recorded(f);
  const found = zerosOf(seen, range, { effort, cuts });
  const known = [
    ...seen.boxes.filter((box) => decidable(f, box)).map(({ a, b }) => [a, b] as const),
    ...found.undecided.map((u) => u.interval),
  ].sort((x, y) => x[0] - y[0]);
  const gaps: [number, number][] = [];
  let reached = range[0];
  for (const [a, b] of [...known, [range[1], range[1]] as const]) {
    if (a > reached) gaps.push([reached, a]);
    reached = Math.max(reached, b);
  }
  return { gaps, found };
}

describe("nothing is left out", () => {
  test.each([...smooth, ...cornered, ...doubtful])("$title", (problem) => {
    for (const effort of [0, 1, 2, 5, 11, 23, 500])
      expect(uncovered(enclosed(problem), problem.range, effort, problem.cuts ?? []).gaps).toEqual([]);
  });

  test("when the effort is spent, one entry reaches from there to the end, and what was found before stays", () => {
    const f = enclosedBy(ice(1361));
    const whole = zerosOf(f, [2.7, 2000], { effort: 500 });
    expect(whole.boxes).toBeGreaterThan(10);
    for (let effort = 0; effort < whole.boxes; effort++) {
      const { gaps, found } = uncovered(f, [2.7, 2000], effort, []);
      expect(gaps).toEqual([]);
      expect(found.boxes).toBe(effort + 1);
      expect(found.undecided.length).toBe(1);
      const [rest] = found.undecided;
      expect(rest).toMatchObject({ kind: "effort" });
      expect(rest?.interval[1]).toBe(2000);
      expect(found.zeros).toEqual(whole.zeros.filter((z) => z.bracket[1] <= (rest?.interval[0] ?? 0)));
      // the balance is positive at the lower end and negative at the upper one
      expect(rest?.counts).toMatch(found.zeros.length % 2 === 0 ? /^1/ : /^0/);
    }
    expect(zerosOf(f, [2.7, 2000], { effort: whole.boxes }).undecided).toEqual([]);
  });

  test("sub-ranges give the zeros of the whole range", () => {
    const random = randomNumbers(5);
    for (const problem of [...smooth, ...cornered]) {
      const [from, to] = problem.range;
      for (let k = 0; k < 50; k++) {
        const [a, b] = [from + random() * (to - from), from + random() * (to - from)].sort(
          (x, y) => x - y,
        ) as [number, number];
        const found = zerosOf(enclosed(problem), [a, b], { effort: 500 });
        const expected = problem.zeros.filter((z) => z > a && z < b);
        expect(found.undecided).toEqual([]);
        expect(found.zeros.length).toBe(expected.length);
        for (const [i, { bracket }] of found.zeros.entries())
          expect(Math.abs(bracket[0] - (expected[i] as number))).toBeLessThan(2e-11);
      }
    }
  });
});
