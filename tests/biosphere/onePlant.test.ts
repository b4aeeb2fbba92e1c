// Planets with one species of plants: onsets, folds and steady states against a table made without the library.
import { describe, expect, test } from "vitest";
import { mixAlbedo } from "../../src/albedo/mixAlbedo.ts";
import { steadyCover } from "../../src/biosphere/steadyCover.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { fourth, inUnit, mul, product, sub } from "../../src/graph/operations.ts";
import { closeLoop } from "../../src/loop/closeLoop.ts";
import { findStates } from "../../src/states/findStates.ts";
import table from "../reference/computed/iv_plant_cover.json" with { type: "json" };
import { numbers } from "../tables/table.ts";

const within = table.within as [number, number];
/** Doubles of the inputs, over slopes dT/dL of some 300 K; near a fold T goes with the root of the distance in L. */
const CLOSE = 1e-9;

type Place = (typeof table.cases)[number]["onsets"][number];

function expectAround([low, high]: readonly [number, number], value: number): void {
  expect(low).toBeLessThanOrEqual(value + 1e-12);
  expect(high).toBeGreaterThanOrEqual(value - 1e-12);
  expect(high - low).toBeLessThan(1e-10);
}

/** A planet whose variable is the temperature among its plants. */
function planetOf({ exchange, inputs }: (typeof table.cases)[number]) {
  const p = numbers(inputs);
  const growth = { best: p.best, halfWidth: Math.sqrt(1 / p.k), deathRate: p.death_rate };
  const linear = exchange === "linear";
  return closeLoop(({ temperature, given, couple }) => {
    const luminosity = given("luminosity", 1, "1", { within: [0.01, 100] });
    const cover = couple("cover", steadyCover({ temperature, ...growth, available: p.available }));
    const albedo = mixAlbedo({ covers: [{ fraction: cover, albedo: p.plants }], bare: p.ground });
    const contrast = sub(albedo, p.plants);
    // linear: the plants are warmer than the planet by q·contrast; else the same in fourth powers, as a flow of heat
    const emitting = linear ? sub(temperature, inUnit(mul(p.q, contrast), "K")) : temperature;
    return {
      heating: {
        sunlight: inUnit(product(p.S, luminosity, sub(1, albedo)), "W m-2"),
        carried: linear ? 0 : inUnit(product(p.sigma, p.q, contrast), "W m-2"),
      },
      cooling: { longwave: inUnit(mul(p.sigma, fourth(emitting)), "W m-2") },
      heatCapacity: 4e8,
    };
  });
}

test("the table has both species, both death rates and both ways of carrying heat", () => {
  expect(table.cases.map((c) => c.rows.length)).toEqual(Array(8).fill(13));
  expect(table.cases.flatMap((c) => c.rows.flatMap((row) => row.states))).toHaveLength(148);
});

describe.each(table.cases)("$id", (reference) => {
  const loop = planetOf(reference);

  test.each(reference.rows)("every state at L = $L", ({ L, states }) => {
    const found = findStates(loop, { within, at: { luminosity: Number(L) } });
    expect(found).toMatchObject({ complete: true, proof: "proved", undecided: [] });
    expect(found.states.map((s) => s.stability)).toEqual(
      states.map((s) => (s.stable ? "stable" : "unstable")),
    );
    found.states.forEach((state, i) => {
      expect(Math.abs(state.temperature - Number(states[i]?.T))).toBeLessThan(CLOSE);
      expect(Math.abs(state.couplings.cover - Number(states[i]?.cover))).toBeLessThan(CLOSE);
      // bare ground is bare to the last bit
      if (states[i]?.cover === "0.0") expect(state.couplings.cover).toBe(0);
    });
  });

  // dark plants that set in warm the planet further, bright plants that die of heat too: there the branch turns back
  const { onsets, folds } = reference;
  const [turning, passing] = Number(reference.inputs.plants) < 0.5 ? onsets : [...onsets].reverse();

  test("its fold, the corner fold at one onset, and nothing else", () => {
    const diagram = traceBranches(loop, { along: "luminosity", between: [0.4, 2], within });
    const expected = [
      ...folds.map((fold) => ({ kind: "fold", ...fold })),
      { kind: "corner", ...(turning as Place) },
    ].sort((a, b) => Number(a.T) - Number(b.T));
    expect(diagram.folds.map((f) => f.kind)).toEqual(expected.map((e) => e.kind));
    diagram.folds.forEach((f, i) => {
      expect(Math.abs(f.at - Number(expected[i]?.L))).toBeLessThan(CLOSE);
      // a fold is flat: T goes with the root of the rounding in L
      expect(Math.abs(f.temperature - Number(expected[i]?.T))).toBeLessThan(1e-6);
    });
    // the albedo stands twice in the balance, so the kink that is no fold may stay open, no wider than rounding
    expect(diagram.undecided.length).toBeLessThanOrEqual(1);
    for (const { temperatures, parameters } of diagram.undecided) {
      expectAround(temperatures, Number(passing?.T));
      expectAround(parameters, Number(passing?.L));
    }
  });

  test.each(onsets)("plants set in at L = $L", (onset) => {
    // next to the onset on either side: one state, bare or covered; or on one side both, on the other none
    const sides = [-1e-6, 1e-6].map((step) => {
      const at = { luminosity: Number(onset.L) * (1 + step) };
      const near: [number, number] = [Number(onset.T) - 0.1, Number(onset.T) + 0.1];
      const found = findStates(loop, { within: near, at });
      expect(found.complete).toBe(true);
      return found.states.map((state) => state.couplings.cover > 0).sort();
    });
    expect(sides.sort()).toEqual(onset === turning ? [[], [false, true]] : [[false], [true]]);
  });
});
