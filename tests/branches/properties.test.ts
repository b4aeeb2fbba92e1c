// Diagrams of random climates agree with searches for states at single parameters.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Branch, Diagram } from "../../src/branches/diagram.ts";
import { statesOnDiagram } from "../../src/branches/statesOnDiagram.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { findStates } from "../../src/index.ts";
import { bareLoop, climates, kinds, WITHIN } from "../properties/climates.ts";
import { settings } from "../properties/settings.ts";

/** Parameters and their ranges, for each way in which the budget depends on one. */
const ALONG = [
  ["flux", [700, 2200]],
  ["emissivity", [0.4, 0.9]],
  ["internalFlux", [0, 60]],
  ["warm", [0.05, 0.6]],
  ["cold", [0.4, 0.9]],
  ["middle", [230, 300]],
  ["width", [3, 40]],
] as const;
const alongs = fc.constantFrom(...ALONG);
const shares = fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 4, maxLength: 4 });

const holds = ([low, high]: readonly [number, number], x: number) => low <= x && x <= high;

describe("a diagram of a random climate", () => {
  test("has as many branches above each parameter as there are states, of the same stability", () => {
    let compared = 0;
    fc.assert(
      fc.property(kinds, climates, alongs, shares, (kind, values, [along, between], places) => {
        const loop = bareLoop(kind, values);
        const diagram = traceBranches(loop, { along, between, within: WITHIN });
        for (const share of places) {
          const at = between[0] + share * (between[1] - between[0]);
          const found = findStates(loop, { within: WITHIN, at: { [along]: at } });
          const here = statesOnDiagram(loop, diagram, at);
          if (!found.complete || !here.complete) continue;
          compared++;
          expect(here.states.map((s) => s.stability)).toEqual(found.states.map((s) => s.stability));
          here.states.forEach((state, i) => {
            expect(Math.abs(state.temperature - (found.states[i]?.temperature as number))).toBeLessThan(1e-8);
            const branch = diagram.branches[here.branches[i] as number] as Branch;
            expect(state.stability).toBe(branch.stability);
          });
        }
      }),
      settings(40),
    );
    // most are decided: what is left out are parameters on folds and climates on a cusp
    expect(compared).toBeGreaterThan(100);
  });

  test("every point of a branch is a state of its stability", () => {
    fc.assert(
      fc.property(kinds, climates, alongs, (kind, values, [along, between]) => {
        const loop = bareLoop(kind, values);
        const { branches } = traceBranches(loop, { along, between, within: WITHIN, tolerance: 0.05 });
        for (const { points, stability } of branches) {
          for (const { at, temperature, feedbackParameter } of points.slice(1, -1)) {
            const { states } = findStates(loop, { within: WITHIN, at: { [along]: at } });
            const near = states.find((s) => Math.abs(s.temperature - temperature) < 1e-6);
            expect(near?.stability).toBe(stability);
            expect(feedbackParameter < 0).toBe(stability === "stable");
          }
        }
      }),
      settings(25),
    );
  });

  test("does not depend on the size of the ranges, nor on the order of questions", () => {
    fc.assert(
      fc.property(kinds, climates, (kind, values) => {
        const loop = bareLoop(kind, values);
        const wide = traceBranches(loop, { along: "flux", between: [100, 9000], within: [50, 900] });
        traceBranches(loop, { along: "emissivity", between: [0.4, 0.9], within: WITHIN });
        const narrow = traceBranches(loop, { along: "flux", between: [700, 2200], within: WITHIN });
        const inside = (d: Diagram) => d.folds.filter((f) => holds([700.001, 2199.999], f.at));
        expect(inside(narrow).length).toBe(inside(wide).length);
        inside(narrow).forEach((fold, i) => {
          const other = inside(wide)[i] as Diagram["folds"][number];
          // the same exact point lies in both brackets
          expect(fold.atBracket[0]).toBeLessThanOrEqual(other.atBracket[1]);
          expect(fold.atBracket[1]).toBeGreaterThanOrEqual(other.atBracket[0]);
          expect([fold.kind, fold.exists]).toEqual([other.kind, other.exists]);
        });
        const again = traceBranches(loop, { along: "flux", between: [700, 2200], within: WITHIN });
        expect(again).toEqual(narrow);
      }),
      settings(20),
    );
  });

  test("on both sides of a fold the number of states differs by two", () => {
    fc.assert(
      fc.property(kinds, climates, (kind, values) => {
        const loop = bareLoop(kind, values);
        const diagram = traceBranches(loop, { along: "flux", between: [700, 2200], within: WITHIN });
        for (const { at, exists } of diagram.folds) {
          if (!holds([700.1, 2199.9], at)) continue;
          const near = 1e-6 * at;
          const nearest = Math.min(
            ...diagram.folds.filter((f) => f.at !== at).map((f) => Math.abs(f.at - at)),
          );
          if (nearest < 3 * near) continue;
          const counts = [at - near, at + near].map(
            (flux) => findStates(loop, { within: WITHIN, at: { flux } }).states.length,
          ) as [number, number];
          expect(counts[1] - counts[0]).toBe(exists === "above" ? 2 : -2);
        }
      }),
      settings(40),
    );
  });

  test("closes its hysteresis loop where both jumps land inside", () => {
    let closed = 0;
    fc.assert(
      fc.property(kinds, climates, (kind, values) => {
        const loop = bareLoop(kind, values);
        const { jumps } = traceBranches(loop, { along: "flux", between: [300, 5000], within: WITHIN });
        for (const up of jumps.filter((j) => j.direction === "rise" && j.to)) {
          const back = jumps.find((j) => j.direction === "fall" && j.from === up.to?.branch);
          if (back?.to?.branch !== up.from) continue;
          closed++;
          expect(up.returnsAt).toBe(back.at);
          expect(back.returnsAt).toBe(up.at);
          expect(up.at).toBeGreaterThan(back.at);
          expect(up.to?.temperature).toBeGreaterThan(up.temperature);
        }
      }),
      settings(40),
    );
    expect(closed).toBeGreaterThan(10);
  });
});
