// What holds for the equilibria of any climate.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findStates, type State } from "../../src/index.ts";
import { bareLoop, bareStates, climates, kinds, WITHIN } from "./climates.ts";
import { settings } from "./settings.ts";

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
});
