// The state on the same branch at other givens.
import { describe, expect, test } from "vitest";
import { followState } from "../../src/branches/followState.ts";
import { statesOnDiagram } from "../../src/branches/statesOnDiagram.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import * as core from "../../src/index.ts";
import { randomNumbers } from "../graph/randomGraph.ts";
import { refusal } from "../refusal.ts";
import { iceLoop } from "../states/iceLoop.ts";
import { sampledLoop, stateOf, vapourLoop } from "./loops.ts";

const WITHIN = [150, 400] as const;

describe("a state that is followed", () => {
  const loop = iceLoop();
  type State = ReturnType<typeof stateOf<NonNullable<(typeof loop)["names"]>>>;
  const [cold, middle, warm] = [0, 1, 2].map((i) => stateOf(loop, i)) as [State, State, State];

  test("is the state of its branch at the new givens", () => {
    for (const flux of [1200, 1360.9, 1361, 1450, 1670]) {
      const { states } = core.findStates(loop, { within: WITHIN, at: { flux } });
      [cold, middle, warm].forEach((state, i) => {
        const followed = followState(loop, state, { to: { flux } });
        expect(followed).toMatchObject({ lost: null, proof: "proved" });
        expect(followed.state?.stability).toBe(state.stability);
        expect(followed.state?.temperature).toBeCloseTo(states[i]?.temperature as number, 10);
        expect(followed.state?.givens).toEqual({ flux, emissivity: 0.6 });
      });
    }
  });

  test("is lost at the fold, and the jump is that of the diagram", () => {
    const { folds, jumps } = traceBranches(loop, { along: "flux", between: [900, 1900], within: WITHIN });
    const up = followState(loop, cold, { to: { flux: 1800 } });
    expect(up).toMatchObject({ state: null, proof: "proved", lost: { reason: "fold", drift: "warms" } });
    expect(up.lost?.givens.flux).toBeCloseTo(folds[0]?.at as number, 7);
    expect(up.lost?.temperature).toBeCloseTo(folds[0]?.temperature as number, 6);
    expect(up.lost?.next?.temperature).toBeCloseTo(jumps[0]?.to?.temperature as number, 5);
    const down = followState(loop, warm, { to: { flux: 1000 } });
    expect(down.lost).toMatchObject({ reason: "fold", drift: "cools", nextIs: "found" });
    expect(down.lost?.givens.flux).toBeCloseTo(folds[1]?.at as number, 7);
  });

  test("keeps its branch step by step, back and forth, with several givens at once", () => {
    let state = warm;
    for (let i = 0; i <= 200; i++) {
      const to = { flux: 1361 - i, emissivity: 0.6 - i * 2e-4 };
      state = followState(loop, state, { to }).state as State;
      expect(state.stability).toBe("stable");
    }
    for (let i = 200; i >= 0; i--) {
      state = followState(loop, state, { to: { flux: 1361 - i, emissivity: 0.6 - i * 2e-4 } }).state as State;
    }
    expect(state.temperature).toBeCloseTo(warm.temperature, 10);
  });

  test("is refused with a temperature outside of its bracket, however small the step is", () => {
    for (const by of [1e-9, 0.5, -5]) {
      const value = warm.temperature + by;
      const moved = { ...warm, variables: { temperature: { ...warm.variables.temperature, value } } };
      expect(refusal(() => followState(loop, moved, { to: { flux: 1362 } }))).toMatchObject({
        code: "out-of-range",
        path: "state.variables.temperature.value",
      });
    }
  });

  test.each<[string, unknown]>([
    ["a text", "0.6"],
    ["a list", [0.6]],
    ["a big integer", 1n],
    ["a symbol", Symbol("emissivity")],
  ])("is refused with %s for a number", (_, wrong) => {
    const { temperature } = warm.variables;
    const refused = (path: string, changed: object) =>
      expect(refusal(() => followState(loop, { ...warm, ...changed }, { to: { flux: 1362 } }))).toMatchObject(
        {
          code: "not-a-number",
          path,
        },
      );
    refused("state.givens.emissivity", { givens: { ...warm.givens, emissivity: wrong } });
    refused("state.variables.temperature.value", {
      variables: { temperature: { ...temperature, value: wrong } },
    });
    refused("state.variables.temperature.bracket[1]", {
      variables: { temperature: { ...temperature, bracket: [temperature.bracket[0], wrong] } },
    });
  });

  test("may come from JSON, and may stay where it is", () => {
    const again = JSON.parse(JSON.stringify(warm)) as State;
    expect(followState(loop, again, { to: { flux: 1400 } })).toEqual(
      followState(loop, warm, { to: { flux: 1400 } }),
    );
    expect(followState(loop, warm, { to: {} }).state?.temperature).toBeCloseTo(warm.temperature, 11);
  });

  test("may leave the range that is looked at", () => {
    const found = followState(loop, warm, { to: { flux: 3000 }, within: [200, 320] });
    expect(found).toMatchObject({ state: null, lost: { reason: "range" } });
  });
});

test("ΔT of the acceptance case for a doubling of carbon", () => {
  const loop = vapourLoop();
  const state = stateOf(loop, 2);
  const doubled = followState(loop, state, { to: { carbon: 560 } }).state;
  // from an independent computation in high precision
  expect((doubled?.temperature as number) - state.temperature).toBeCloseTo(4.15561428, 8);
});

test("a sampled loop is followed without proof", () => {
  const loop = sampledLoop();
  const state = stateOf(loop, 2);
  const found = followState(loop, state, { to: { flux: 1400 } });
  expect(found.proof).toBe("sampled");
  const { states } = core.findStates(loop, { within: WITHIN, at: { flux: 1400 } });
  expect(found.state?.temperature).toBeCloseTo(states[2]?.temperature as number, 9);
});

describe("a fold at a kink", () => {
  const random = randomNumbers(20261201);
  const within = [150, 400] as const;
  const between = [500, 3500] as const;
  const laws = { ramp: core.rampAlbedo, quadratic: core.quadraticAlbedo };

  test.each(["ramp", "quadratic"] as const)(
    "%s: is found from near and far, however long the path",
    (law) => {
      let met = 0;
      for (let planet = 0; planet < 12; planet++) {
        const frozenBelow = 250 + 8 * random();
        const openAbove = 268 + 15 * random();
        const loop = core.closeLoop(({ temperature, given }) => {
          const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
          const albedo = laws[law]({ temperature, cold: 0.7, warm: 0.3, frozenBelow, openAbove });
          return {
            heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
            cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
            heatCapacity: 4e8,
          };
        });
        const diagram = traceBranches(loop, { along: "flux", between, within });
        expect(diagram.complete).toBe(true);
        for (const { direction, from, at, temperature } of diagram.jumps) {
          const { parameters, low, high } = diagram.branches[from] as core.Branch;
          if ((direction === "rise" ? high : low).kind !== "corner") continue;
          const [near, far] =
            direction === "rise" ? [parameters[0], between[1]] : [parameters[1], between[0]];
          // from somewhere on the branch to somewhere beyond its end, both from close by to far away
          const start = at + (near - at) * 10 ** (-3 * random());
          const goal = at + (far - at) * 10 ** (-3 * random());
          const { states, branches } = statesOnDiagram(loop, diagram, start);
          const state = states[branches.indexOf(from)] as (typeof states)[number];
          const { lost, state: arrived } = followState(loop, state, { to: { flux: goal } });
          expect(arrived).toBeNull();
          expect(lost).toMatchObject({ reason: "corner-fold" });
          expect(Math.abs((lost?.temperature as number) - temperature)).toBeLessThan(1e-6);
          met++;
        }
      }
      expect(met).toBeGreaterThan(8);
    },
  );
});
