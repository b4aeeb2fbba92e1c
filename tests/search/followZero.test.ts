// Following a zero of a function of known shape: the same zero all the way, whatever Newton's method guesses.
import { expect, test } from "vitest";
import { followZero } from "../../src/search/followZero.ts";
import type { Moving } from "../../src/search/moving.ts";

const cubic = (x: number): number => 3 * x - x ** 3;
/** Numbers that only round; far more than the operations below can be wrong by. */
const ERROR = 1e-13;

type Along = (stage: number) => number;

/** c from one value to another. */
const straight =
  (from: number, to: number): Along =>
  (stage) =>
    from + stage * (to - from);

/** N = 3x − x³ − c, with c along a line or two: zeros on both branches outside of x = ±1, where they end at c = ±2. */
function moving(c: Along): Moving {
  let [low, high] = [c(0), c(0)];
  const values = (a: number, b: number): [number, number] => {
    const ends = [cubic(a), cubic(b)];
    for (const turn of [-1, 1]) if (a < turn && turn < b) ends.push(cubic(turn));
    return [Math.min(...ends) - high, Math.max(...ends) - low];
  };
  const slopes = (a: number, b: number): [number, number] => {
    const nearest = a < 0 && b > 0 ? 0 : Math.min(a * a, b * b);
    return [3 - 3 * Math.max(a * a, b * b), 3 - 3 * nearest];
  };
  const write = (a: number, b: number, out: Float64Array) => {
    const size = 1 + Math.max(Math.abs(a), Math.abs(b)) ** 3;
    out.set([...values(a, b), ERROR * size, ...slopes(a, b), ERROR * size]);
  };
  return {
    ...{ sampled: false, responds: true, unbroken: () => true },
    between(from, to) {
      const at = [from, to, ...(from < 0.5 && to > 0.5 ? [0.5] : [])].map(c);
      [low, high] = [Math.min(...at), Math.max(...at)];
    },
    point: (x, out) => write(x, x, out),
    box(a, b, out) {
      write(a, b, out);
      out.set([-6 * b, -6 * a, ERROR], 6);
    },
  };
}

const start = { x: 1.5, low: 1.5 - 1e-6, high: 1.5 + 1e-6, slope: -1 } as const;

test("a guess on the other branch is not taken for the zero that ends on its own", () => {
  // from x = 1.5 at c = 2.9625, Newton's method passes 1.01, where the slope is nearly 0, and ends at −2.1
  const followed = followZero(moving(straight(1.125, 2.9625)), start, [-20, 20]);
  expect(followed.outcome).toBe("turned");
  if (followed.outcome !== "turned") return;
  const { x, stage, sign, corner } = followed.turning;
  expect(Math.abs(x - 1)).toBeLessThan(1e-3);
  expect(Math.abs(stage - (2 - 1.125) / (2.9625 - 1.125))).toBeLessThan(1e-6);
  expect({ sign, corner }).toEqual({ sign: -1, corner: false });
});

test("a zero that ends on the way is lost, even if the function is at last what it was at first", () => {
  const followed = followZero(
    moving((stage) => 1.125 + 1.375 * (1 - Math.abs(2 * stage - 1))),
    start,
    [-20, 20],
  );
  expect(followed.outcome).toBe("turned");
  if (followed.outcome !== "turned") return;
  expect(Math.abs(followed.turning.stage - 0.875 / 2.75)).toBeLessThan(1e-6);
});

test("a zero that goes far without ending arrives, and is the only one in its bracket", () => {
  const followed = followZero(moving(straight(1.125, -998)), start, [-20, 20]);
  expect(followed.outcome).toBe("arrived");
  if (followed.outcome !== "arrived") return;
  const { at, bracket, direction } = followed.zero;
  // 3x − x³ = −998
  expect(Math.abs(cubic(at) + 998)).toBeLessThan(1e-9);
  expect(bracket[0] <= at && at <= bracket[1] && direction === -1).toBe(true);
});

test("a zero that leaves the range is not said to arrive", () => {
  expect(followZero(moving(straight(1.125, -998)), start, [-20, 9]).outcome).toBe("left");
  expect(followZero(moving(straight(1.125, 1.9)), start, [1.3, 20]).outcome).toBe("left");
});
