// NaN, infinities and rounding: nothing may be decided that the enclosures do not prove.
import { describe, expect, test } from "vitest";
import { type Enclosed, endsOf } from "../../src/search/enclosed.ts";
import { greatestBetween, leastBetween } from "../../src/search/endpointForm.ts";
import { readBox } from "../../src/search/readBox.ts";
import { Place, Reader } from "../../src/search/reader.ts";
import { stretchOf } from "../../src/search/stretch.ts";
import { randomNumbers } from "../graph/randomGraph.ts";
import { refusal } from "../refusal.ts";
import { whole } from "./exact.ts";
import { enclosed, type Problem, smooth } from "./problems.ts";
import { zerosOf } from "./zerosOf.ts";

const BAD = [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];

/** The function, with numbers of its readings replaced where `spoil` says so. */
function spoilt(f: Enclosed, spoil: (index: number) => number | undefined): Enclosed {
  const apply = (out: Float64Array, length: number): void => {
    for (let i = 0; i < length; i++) out[i] = spoil(i) ?? (out[i] as number);
  };
  return {
    box(a, b, out) {
      f.box(a, b, out);
      apply(out, 9);
    },
    point(x, out) {
      f.point(x, out);
      apply(out, 6);
    },
  };
}

/** Zeros that are in no bracket and no undecided stretch, and brackets that do not hold exactly one. */
function faults(problem: Problem, f: Enclosed): string[] {
  const { zeros, undecided } = zerosOf(f, problem.range, { effort: 300 });
  const inside = (z: number, [a, b]: readonly [number, number]): boolean => {
    const slack = 5e-15 * Math.abs(z);
    return a <= z + slack && z - slack <= b;
  };
  return [
    ...problem.zeros
      .filter(
        (z) =>
          ![...zeros.map((p) => p.bracket), ...undecided.map((u) => u.interval)].some((i) => inside(z, i)),
      )
      .map((z) => `${problem.title}: ${z} is lost`),
    ...zeros
      .filter((p) => problem.zeros.filter((z) => inside(z, p.bracket)).length !== 1)
      .map((p) => `${problem.title}: [${p.bracket}] is no bracket`),
  ];
}

describe("a number that is not finite decides nothing", () => {
  test.each([0, 1, 2, 3, 4, 5, 6, 7, 8])("number %i of every reading spoilt", (index) => {
    for (const problem of smooth)
      for (const bad of BAD)
        expect(
          faults(
            problem,
            spoilt(enclosed(problem), (i) => (i === index ? bad : undefined)),
          ),
        ).toEqual([]);
  });

  test.each([0, 1, 2])("everything from number %i × 3 on spoilt: nothing can be claimed from it", (part) => {
    for (const problem of smooth)
      for (const bad of BAD) {
        const f = spoilt(enclosed(problem), (i) => (i >= part * 3 ? bad : undefined));
        expect(faults(problem, f)).toEqual([]);
        const { zeros } = zerosOf(f, problem.range, { effort: 300 });
        if (part < 2) expect(zeros).toEqual([]);
      }
  });

  test.each([0, 1, 2])(
    "without bounds of the value over boxes (number %i spoilt) nothing is decided",
    (index) => {
      for (const problem of smooth)
        for (const bad of BAD) {
          const f = enclosed(problem);
          const blind = spoilt(f, (i) => (i === index ? bad : undefined));
          const found = zerosOf({ box: blind.box, point: f.point }, problem.range, { effort: 300 });
          expect(found.zeros).toEqual([]);
          expect(found.undecided[0]?.interval[0]).toBe(problem.range[0]);
          expect(found.undecided.at(-1)?.interval[1]).toBe(problem.range[1]);
          found.undecided.slice(1).forEach((u, k) => {
            expect(u.interval[0]).toBe(found.undecided[k]?.interval[1]);
          });
        }
    },
  );

  test("readings spoilt here and there", () => {
    const random = randomNumbers(3);
    for (let k = 0; k < 60; k++) {
      const often = random() * 0.3;
      for (const problem of smooth) {
        const f = spoilt(enclosed(problem), () =>
          random() < often ? BAD[Math.floor(random() * 3)] : undefined,
        );
        expect(faults(problem, f)).toEqual([]);
      }
    }
  });

  test("a sign needs both bounds finite", () => {
    const sign = (lo: number, hi: number, err: number): number => {
      const f: Enclosed = {
        box: () => undefined,
        point: (_, out) => out.set([lo, hi, err, lo, hi, err]),
      };
      const place = new Reader(endsOf(f)).read(1, new Place());
      expect(place.slopeSign).toBe(place.sign);
      return place.sign;
    };
    expect([sign(1, 2, 0.5), sign(-2, -1, 0.5), sign(1, 2, 1), sign(-2, -1, 1)]).toEqual([1, -1, 0, 0]);
    for (const bad of BAD)
      expect([sign(1, 2, bad), sign(1, bad, 0), sign(bad, 2, 0), sign(-2, bad, 0), sign(bad, -1, 0)]).toEqual(
        Array(5).fill(0),
      );
  });

  test("no slope is claimed where there may be no value, no curvature where there may be no slope", () => {
    const read = (value: number, slope: number, bend: number) =>
      readBox(
        new Reader(
          endsOf({
            box: (_a, _b, out) => out.set([value, 2, 0, slope, 2, 0, bend, 2, 0]),
            point: () => undefined,
          }),
        ),
        0,
        1,
      );
    expect(read(1, 1, 1)).toMatchObject({ sign: 1, slopeSign: 1, bend: 1, smooth: true });
    expect(read(1, 1, Number.NaN)).toMatchObject({ sign: 1, slopeSign: 1, bend: 0, smooth: false });
    expect(read(1, Number.NaN, 1)).toMatchObject({ sign: 1, slopeSign: 0, bend: 0, continuous: false });
    expect(read(Number.NaN, 1, 1)).toMatchObject({ sign: 0, slopeSign: 0, bend: 0, defined: false });
  });

  test("an undecided stretch is not tightened by slopes that are not finite", () => {
    const readings = (slope: number): Enclosed => ({
      box: (_a, _b, out) => out.set([-9, 9, 0, 0.5, slope, 0, 1, 1, 0]),
      point: (x, out) => out.set([x, x, 0, 1, 1, 0]),
    });
    const enclosure = (slope: number) => {
      const reader = new Reader(endsOf(readings(slope)));
      const ends = [reader.read(-1, new Place()), reader.read(1, new Place())] as const;
      return stretchOf("jump", ...ends, readBox(reader, -1, 1)).enclosure.map((x) => Math.round(x));
    };
    expect(enclosure(1)).toEqual([-1, 1]);
    for (const bad of BAD) expect(enclosure(bad)).toEqual([-9, 9]);
  });

  test("a range that is none is refused", () => {
    const [line] = smooth as [Problem];
    for (const range of [
      [1, 1],
      [2, 1],
      [0, Number.NaN],
      [0, Number.POSITIVE_INFINITY],
      [-1.7e308, 1.7e308],
    ] as const)
      expect(refusal(() => zerosOf(enclosed(line), range, { effort: 10 })).code).toBe("out-of-range");
  });
});

describe("rounding is outwards", () => {
  const ONE = 1n << 1074n;
  test("bounds of a reading contain lo − err and hi + err exactly", () => {
    const random = randomNumbers(21);
    for (let k = 0; k < 3000; k++) {
      const [lo, err] = [random() - 0.5, random() * 0.1 * random()];
      const hi = lo + random();
      const f: Enclosed = {
        box: (_a, _b, out) => out.set([lo, hi, err, lo, hi, err, 0, 0, 0]),
        point: (_, out) => out.set([lo, hi, err, lo, hi, err]),
      };
      const reader = new Reader(endsOf(f));
      for (const read of [reader.read(1, new Place()), readBox(reader, 0, 1)]) {
        for (const low of [read.low, read.slopeLow]) expect(whole(low) <= whole(lo) - whole(err)).toBe(true);
        for (const high of [read.high, read.slopeHigh])
          expect(whole(high) >= whole(hi) + whole(err)).toBe(true);
      }
    }
  });

  test("the end-point form is never above the exact bound, and close to it", () => {
    const random = randomNumbers(22);
    for (let k = 0; k < 5000; k++) {
      const [left, right] = [random() * 3 - 1, random() * 3 - 1];
      const [fall, rise, width] = [-random() * 2, random() * 2, random() * random()];
      const [l, r, f, u, w] = [left, right, fall, rise, width].map(whole) as [
        bigint,
        bigint,
        bigint,
        bigint,
        bigint,
      ];
      // (rise·left − fall·right + fall·rise·width) / (rise − fall)
      const exact = (u * l - f * r) * ONE + f * u * w;
      const low = leastBetween({ left, right }, { fall, rise }, width);
      expect(whole(low) * (u - f) * ONE <= exact).toBe(true);
      expect(whole(low + 2e-14) * (u - f) * ONE > exact).toBe(true);
      const high = greatestBetween({ left: -left, right: -right }, { fall: -rise, rise: -fall }, width);
      expect(high).toBe(-low);
    }
  });

  test("the end-point form is a bound of a function that it fits exactly", () => {
    // |x − 1| − p on [0, 3]: least value −p
    expect(leastBetween({ left: 1, right: 2 }, { fall: -1, rise: 1 }, 3)).toBeCloseTo(0, 13);
    expect(leastBetween({ left: 1.5, right: 2 }, { fall: 0, rise: 1 }, 3)).toBe(1.5);
    expect(leastBetween({ left: 1.5, right: 1 }, { fall: -1, rise: 0 }, 3)).toBe(1);
    for (const bad of [Number.NaN]) {
      expect(leastBetween({ left: 1, right: 1 }, { fall: bad, rise: 1 }, 1) > 0).toBe(false);
      expect(leastBetween({ left: 1, right: 1 }, { fall: -1, rise: bad }, 1) > 0).toBe(false);
      expect(leastBetween({ left: 1, right: 1 }, { fall: 1, rise: bad }, 1) > 0).toBe(false);
    }
  });
});

describe("a valley whose bottom is read less well than places beside it", () => {
  /** x⁴ + 10⁻³·x² + rise, read near 0 with an error of 10⁻⁵, elsewhere of 10⁻¹², over boxes of 10⁻⁴ of their width. */
  const valley = (rise: number): Enclosed => {
    const at = (x: number) => x ** 4 + 1e-3 * x * x + rise;
    const slope = (x: number) => 4 * x ** 3 + 2e-3 * x;
    const bend = (x: number) => 12 * x * x + 2e-3;
    return {
      box(a, b, out) {
        const nearest = a <= 0 && b >= 0 ? 0 : Math.min(Math.abs(a), Math.abs(b));
        const farthest = Math.max(Math.abs(a), Math.abs(b));
        out.set([at(nearest), at(farthest), 1e-4 * (b - a), slope(a), slope(b), 1e-12]);
        out.set([bend(nearest), bend(farthest), 1e-12], 6);
      },
      point(x, out) {
        out.set([at(x), at(x), Math.abs(x) < 1e-3 ? 1e-5 : 1e-12, slope(x), slope(x), 1e-12]);
      },
    };
  };

  test("that lies beyond zero holds two zeros, found from places that are read well", () => {
    const { zeros, undecided } = zerosOf(valley(-1e-6), [-8, 8], { effort: 200 });
    expect(undecided).toEqual([]);
    const zero = Math.sqrt((Math.sqrt(5) - 1) * 5e-4);
    // the errors of 1e-12 over a slope of 1e-4
    for (const [i, found] of zeros.entries()) expect(found.at).toBeCloseTo(i === 0 ? -zero : zero, 7);
    expect(zeros).toHaveLength(2);
  });

  test("that is proved clear over a box is not in doubt", () => {
    expect(zerosOf(valley(1e-6), [-8, 8], { effort: 200 })).toMatchObject({ zeros: [], undecided: [] });
  });
});

test("a bracket does not reach out of the range, however little is known near its end", () => {
  const line: Enclosed = {
    box(a, b, out) {
      out.set([a, b, 0, 1, 1, 0, 0, 0, 0]);
    },
    point(x, out) {
      out.set([x, x, Math.abs(x) < 1e-4 ? 1e-3 : 1e-15, 1, 1, 0]);
    },
  };
  for (const range of [[-2e-4, 9] as const, [-9, 2e-4] as const]) {
    const { zeros, undecided } = zerosOf(line, range, { effort: 50 });
    expect(undecided).toEqual([]);
    expect(zeros).toHaveLength(1);
    const [low, high] = zeros[0]?.bracket ?? [Number.NaN, Number.NaN];
    expect(low >= range[0] && low < 0 && high > 0 && high <= range[1]).toBe(true);
  }
});
