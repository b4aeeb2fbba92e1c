// Branches followed with proof, against states found anew along the way.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findStates, type State } from "../../src/index.ts";
import { allowGeneration } from "../../src/reading/generation.ts";
import { followPath, type PathOutcome } from "../../src/states/followPath.ts";
import { pathBalanceOf } from "../../src/states/pathBalance.ts";
import { settings } from "../properties/settings.ts";
import { warmLoop } from "./warmLoop.ts";

const within = [150, 450] as const;
type Givens = { readonly flux: number; readonly carbonDioxide: number };
const loop = warmLoop();
const statesAt = (at: Givens) => findStates(loop, { within, at });

function follow(state: State, from: Givens, to: Givens, of = loop): PathOutcome {
  const values = (g: Givens) => [g.flux, g.carbonDioxide];
  const balance = pathBalanceOf(of, [], [0, 1]);
  const path = balance({ from: values(from), to: values(to), held: 0, reference: 0 });
  return followPath(path, { value: state.temperature, bracket: state.bracket }, within);
}
const between = (from: Givens, to: Givens, stage: number): Givens => ({
  flux: from.flux + stage * (to.flux - from.flux),
  carbonDioxide: from.carbonDioxide + stage * (to.carbonDioxide - from.carbonDioxide),
});

const givens = fc.record({
  flux: fc.double({ min: 1000, max: 1800, noNaN: true }),
  carbonDioxide: fc.double({ min: 50, max: 2000, noNaN: true }),
});

describe("random paths in two givens", () => {
  test("a branch arrives where many small steps arrive, or is lost where they lose it", () => {
    const ends = { arrived: 0, lost: 0 };
    fc.assert(
      fc.property(givens, givens, fc.nat(3), (from, to, index) => {
        const { states, complete } = statesAt(from);
        const state = states[index % Math.max(1, states.length)];
        if (!state || !complete) return;
        const outcome = follow(state as never, from, to);
        if (outcome.outcome === "arrived") {
          ends.arrived++;
          expect(
            Math.abs(outcome.located.at - stepped(state.temperature, state.stability, from, to)),
          ).toBeLessThan(1e-9);
        } else if (outcome.outcome === "lost") {
          ends.lost++;
          expectLost(outcome, from, to);
        } else {
          expect(outcome.outcome).toBe("left");
          expect(Math.min(outcome.x - within[0], within[1] - outcome.x)).toBeLessThan(0.1);
        }
      }),
      settings(40),
    );
    expect(ends.arrived).toBeGreaterThan(10);
    expect(ends.lost).toBeGreaterThan(10);
  });

  /** The temperature after steps so small that the nearest state of the same stability is the same branch. */
  function stepped(start: number, stability: string, from: Givens, to: Givens): number {
    const steps = 40;
    let T = start;
    for (let i = 1; i <= steps; i++) {
      const same = statesAt(between(from, to, i / steps)).states.filter((s) => s.stability === stability);
      T = same.reduce(
        (best, s) => (Math.abs(s.temperature - T) < Math.abs(best - T) ? s.temperature : best),
        Infinity,
      );
    }
    return T;
  }

  function expectLost(
    { turning, next, nextIs }: Extract<PathOutcome, { outcome: "lost" }>,
    from: Givens,
    to: Givens,
  ): void {
    const near = ({ states }: ReturnType<typeof statesAt>) =>
      states.filter((s) => s.temperature > turning.around[0] && s.temperature < turning.around[1]);
    const [before, behind] = turning.stages;
    expect(near(statesAt(between(from, to, before)))).toHaveLength(2);
    const after = statesAt(between(from, to, behind));
    expect(near(after)).toHaveLength(0);
    const ahead =
      turning.sign > 0
        ? after.states.find((s) => s.temperature > turning.x)
        : after.states.filter((s) => s.temperature < turning.x).at(-1);
    expect(nextIs).toBe(ahead ? "found" : "outside");
    if (ahead) expect(Math.abs((next?.at ?? 0) - ahead.temperature)).toBeLessThan(1e-9);
  }
});

test("interpreted code follows to the same place", () => {
  const from = { flux: 1361, carbonDioxide: 280 };
  const ends = [
    { flux: 1361, carbonDioxide: 560 },
    { flux: 1700, carbonDioxide: 280 },
    { flux: 1200, carbonDioxide: 250 },
  ];
  const state = statesAt(from).states[2] as never;
  const generated = ends.map((to) => follow(state, from, to));
  try {
    allowGeneration(false);
    const fresh = warmLoop();
    expect(ends.map((to) => follow(state, from, to, fresh))).toEqual(generated);
  } finally {
    allowGeneration(true);
  }
});

test("a path that goes nowhere ends where it starts", () => {
  const at = { flux: 1361, carbonDioxide: 280 };
  for (const state of statesAt(at).states) {
    const outcome = follow(state as never, at, at);
    expect(outcome).toMatchObject({ outcome: "arrived", located: { stability: state.stability } });
    if (outcome.outcome === "arrived") expect(outcome.located.at).toBeCloseTo(state.temperature, 11);
  }
});

test("a path that ends just before a fold arrives, one that ends just behind it does not", () => {
  // the fold of the acceptance case
  const fold = 1471.9530876739;
  const from = { flux: 1361, carbonDioxide: 280 };
  const cold = statesAt(from).states[0] as never;
  expect(follow(cold, from, { ...from, flux: fold - 1e-6 }).outcome).toBe("arrived");
  expect(follow(cold, from, { ...from, flux: fold + 1e-5 }).outcome).toBe("lost");
});
