// What holds for the equilibria of any climate.
import fc from "fast-check";
import { evaluate } from "mathjs";
import { describe, expect, test } from "vitest";
import {
  absorbedFlux,
  closeLoop,
  type FoundStates,
  findStates,
  formulaOf,
  type Ledger,
  linearEmission,
  rampAlbedo,
  type State,
} from "../../src/index.ts";
import { bareLoop, bareStates, climates, kinds, layeredStates, WITHIN } from "./climates.ts";
import { settings } from "./settings.ts";

/** Inflow − outflow of a reservoir, in plain arithmetic. */
const gained = ({ flows }: Ledger, name: string): number =>
  flows.reduce((sum, f) => sum + (f.to === name ? f.value : 0) - (f.from === name ? f.value : 0), 0);

/** A dozen roundings of the largest flow. */
const rounding = ({ flows }: Ledger): number =>
  12 * 2 ** -53 * Math.max(...flows.map((f) => Math.abs(f.value)));

function expectClosed(state: State, reservoirs: readonly string[]): void {
  const { ledger } = state;
  expect(ledger.reservoirs.map((r) => r.name)).toEqual(reservoirs);
  for (const { name, storage } of ledger.reservoirs) {
    if (storage === null) continue;
    expect(Math.abs(gained(ledger, name) - storage), name).toBeLessThanOrEqual(rounding(ledger));
  }
  // what all reservoirs take up is what space and the interior give away
  const outside = gained(ledger, "space") + gained(ledger, "interior");
  const stored = ledger.reservoirs.reduce((sum, { storage }) => sum + (storage ?? 0), 0);
  expect(Math.abs(outside + stored)).toBeLessThanOrEqual(rounding(ledger));
}

function expectFrozen(value: unknown, path: string): void {
  if (typeof value !== "object" || value === null) return;
  expect(Object.isFrozen(value), path).toBe(true);
  for (const [key, inner] of Object.entries(value)) expectFrozen(inner, `${path}.${key}`);
}

describe("a surface alone", () => {
  const searched = fc.tuple(kinds, climates).map(([kind, climate]) => bareStates(kind, climate));

  test("all states are found, and between two stable ones there is an unstable one", () => {
    fc.assert(
      fc.property(searched, (found) => {
        fc.pre(found.undecided.length === 0);
        const { states } = found;
        expect(found.complete).toBe(true);
        // cooling wins at the hot end and sunlight at the cold one: an odd number, the outermost stable
        expect(states.map((s) => s.stability)).toEqual(
          states.map((_, i) => (i % 2 === 0 ? "stable" : "unstable")),
        );
        expect(states.length % 2).toBe(1);
        for (const { stability, feedbackParameter, eFoldingTime, eigenvalues } of states) {
          expect(stability === "stable").toBe(feedbackParameter < 0);
          expect(eFoldingTime === null).toBe(stability !== "stable");
          expect(Math.sign(eigenvalues?.[0]?.re ?? Number.NaN)).toBe(Math.sign(feedbackParameter));
        }
      }),
      settings(300),
    );
  });

  test("climates with three states are among them", () => {
    const counts = fc.sample(searched, { seed: 20251, numRuns: 100 }).map((found) => found.states.length);
    expect(counts.filter((count) => count === 3).length).toBeGreaterThan(20);
  });

  test("the ledger closes, with the storage known apart from the flows", () => {
    fc.assert(
      fc.property(searched, (found) => {
        for (const state of found.states) expectClosed(state, ["space", "surface", "interior"]);
      }),
      settings(200),
    );
  });

  test("flux, internal heat and emission scaled alike leave the states where they are and scale λ", () => {
    fc.assert(
      fc.property(kinds, climates, fc.double({ min: 0.5, max: 1.3, noNaN: true }), (kind, climate, k) => {
        const { flux, emissivity, internalFlux } = climate;
        const more = { flux: k * flux, emissivity: k * emissivity, internalFlux: k * internalFlux };
        const [one, other] = [climate, { ...climate, ...more }].map((c) => bareStates(kind, c));
        fc.pre(one?.undecided.length === 0 && other?.undecided.length === 0);
        expect(other?.states).toHaveLength(one?.states.length as number);
        one?.states.forEach((state, i) => {
          const scaled = other?.states[i] as State;
          const { feedbackParameter: slope, temperature } = state;
          const size = Math.max(...state.ledger.flows.map((f) => Math.abs(f.value)));
          const shift = (64 * 2 ** -53 * size) / Math.abs(slope) + 1e-12;
          expect(Math.abs(scaled.temperature - temperature)).toBeLessThanOrEqual(shift);
          for (const [f, flow] of state.ledger.flows.entries()) {
            const near = Math.abs((scaled.ledger.flows[f]?.value as number) - k * flow.value);
            // no flow answers to temperature by more than 100 W m⁻² K⁻¹
            expect(near).toBeLessThanOrEqual(1e-14 * size + 100 * shift);
          }
          expect(scaled.feedbackParameter / slope).toBeCloseTo(k, 6);
        });
      }),
      settings(150),
    );
  });

  test("a result is frozen, and the same after JSON", () => {
    fc.assert(
      fc.property(searched, (found) => {
        expectFrozen(found, "found");
        expect(JSON.parse(JSON.stringify(found)) as FoundStates).toEqual(found);
      }),
      settings(100),
    );
  });

  test("the givens asked for are the givens of the states", () => {
    fc.assert(
      fc.property(kinds, climates, (kind, climate) => {
        const asked = bareStates(kind, climate);
        const built = findStates(bareLoop(kind, climate), { within: WITHIN });
        expect(asked.states).toEqual(built.states);
        for (const { givens } of asked.states) expect(givens).toEqual(climate);
      }),
      settings(30),
    );
  });

  test("heat from the interior is a source: it leaves no reservoir open", () => {
    fc.assert(
      fc.property(searched, (found) => {
        for (const state of found.states) {
          const open = state.notes.filter((note) => note.code === "open-reservoir");
          expect(open.map((note) => note.about)).toEqual([]);
        }
      }),
      settings(30),
    );
  });
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

describe("a surface under a layer", () => {
  const searched = fc.tuple(kinds, climates).map(([kind, climate]) => layeredStates(kind, climate));

  test("the ledger of every reservoir closes", () => {
    fc.assert(
      fc.property(searched, (found) => {
        for (const state of found.states) {
          expectClosed(state, ["space", "surface", "layer"]);
          expect(state.notes.map((note) => note.code)).not.toContain("open-reservoir");
        }
      }),
      settings(200),
    );
  });
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
