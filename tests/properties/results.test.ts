// What holds for any result: it is frozen, survives JSON, and agrees with the printed budget.
import fc from "fast-check";
import { evaluate } from "mathjs";
import { expect, test } from "vitest";
import {
  absorbedFlux,
  closeLoop,
  type FoundStates,
  findStates,
  formulaOf,
  linearEmission,
  rampAlbedo,
} from "../../src/index.ts";
import { bareLoop, bareStates, climates, kinds } from "./climates.ts";
import { settings } from "./settings.ts";

function expectFrozen(value: unknown, path: string): void {
  if (typeof value !== "object" || value === null) return;
  expect(Object.isFrozen(value), path).toBe(true);
  for (const [key, inner] of Object.entries(value)) expectFrozen(inner, `${path}.${key}`);
}

const searched = fc.tuple(kinds, climates).map(([kind, climate]) => bareStates(kind, climate));

test("a result is frozen, and the same after JSON", () => {
  fc.assert(
    fc.property(searched, (found) => {
      expectFrozen(found, "found");
      expect(JSON.parse(JSON.stringify(found)) as FoundStates).toEqual(found);
    }),
    settings(100),
  );
});

test("an undecided result is frozen, and the same after JSON", () => {
  // the flux at which the frozen branch ends, on the corner of a ramp
  const loop = closeLoop(({ temperature }) => {
    const albedo = rampAlbedo({ temperature, cold: 0.6, warm: 0.3, frozenBelow: 263, openAbove: 283 });
    return {
      heating: { sunlight: absorbedFlux({ flux: 1800, albedo }) },
      cooling: { longwave: linearEmission({ temperature, intercept: 200, slope: 2, reference: 273 }) },
      heatCapacity: 4e8,
    };
  });
  const found = findStates(loop, { within: [100, 400] });
  expect(found.undecided).toHaveLength(1);
  // a warm state outside the range that the emission was published for, so that there is a note
  expect(found.states.flatMap((state) => state.notes)).not.toEqual([]);
  expectFrozen(found, "found");
  expect(JSON.parse(JSON.stringify(found)) as unknown).toEqual(found);
});

test("the printed budget of a loop gives the flows of its states", () => {
  const printed = { tanh: formulaOf(bareLoop("tanh")), ramp: formulaOf(bareLoop("ramp")) };
  fc.assert(
    fc.property(kinds, climates, (kind, climate) => {
      for (const state of bareStates(kind, climate).states) {
        const scope = { temperature: state.temperature, ...state.givens };
        const { heating, cooling, couplings } = printed[kind];
        const { albedo } = state.couplings as { albedo: number };
        expect(evaluate(couplings.albedo as string, { ...scope })).toBeCloseTo(albedo, 13);
        for (const { name, value } of state.ledger.flows) {
          const formula = (heating[name] ?? cooling[name]) as string;
          const read = evaluate(formula, { ...scope, albedo }) as number;
          expect(Math.abs(read - value), name).toBeLessThanOrEqual(1e-14 * Math.abs(value));
        }
      }
    }),
    settings(100),
  );
});
