// Wrong calls are refused, and the error names what is wrong.
import { describe, expect, test } from "vitest";
import { followState } from "../../src/branches/followState.ts";
import { solveFor } from "../../src/branches/solveFor.ts";
import { statesOnDiagram } from "../../src/branches/statesOnDiagram.ts";
import { tippingMargins } from "../../src/branches/tippingMargins.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import * as core from "../../src/index.ts";
import { refusal } from "../refusal.ts";
import { iceLoop } from "../states/iceLoop.ts";
import { stateOf } from "./loops.ts";

const WITHIN = [150, 400] as const;
const loop = iceLoop();
const state = stateOf(loop, 2);
const diagram = traceBranches(loop, { along: "flux", between: [900, 1900], within: WITHIN });
const BASE = { along: "flux", between: [900, 1900], within: WITHIN };

/** A loop with a given that only the heat capacity depends on. */
const idle = core.closeLoop(({ temperature, given }) => ({
  heating: { sunlight: core.absorbedFlux({ flux: given("flux", 1361, "W m-2"), albedo: 0.3 }) },
  cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
  heatCapacity: given("capacity", 4e8, "J m-2 K-1"),
}));

const trace = (options: object, of: core.Loop = loop) => traceBranches(of, { ...BASE, ...options } as never);

describe("refused", () => {
  test.each([
    ["a parameter that does not exist", () => trace({ along: "fluks" }), "unknown-name", /nearest: flux/],
    [
      "a parameter that has nothing in common with any",
      () => trace({ along: "qqq" }),
      "unknown-name",
      /allowed: flux, \w+ \(docs/,
    ],
    [
      "what is no loop",
      () => traceBranches({ star: {} } as never, BASE as never),
      "unreadable",
      /a loop, as closeLoop returns it and readPlanet holds it/,
    ],
    ["an option that does not exist", () => trace({ betwen: [1, 2] }), "unknown-name", /nearest: between/],
    ["a reversed range", () => trace({ between: [1900, 900] }), "out-of-range", /between\[1\]/],
    ["an empty range", () => trace({ between: [1361, 1361] }), "out-of-range", /between\[1\]/],
    ["a range outside of the given's", () => trace({ between: [-1, 1900] }), "out-of-range", /between\[0\]/],
    ["an empty range of temperature", () => trace({ within: [300, 300] }), "out-of-range", /within\[1\]/],
    ["no range", () => trace({ between: undefined }), "unreadable", /between/],
    ["NaN in a range", () => trace({ between: [Number.NaN, 1900] }), "not-a-number", /between\[0\]/],
    ["the parameter in `at` as well", () => trace({ at: { flux: 1361 } }), "contradiction", /at\.flux/],
    ["a parameter without influence", () => trace({ along: "capacity" }, idle), "contradiction", /flux/],
    [
      "an unknown to solve for that does not exist",
      () => solveFor(loop, { unknown: "emisivity", temperature: 288, within: [0.1, 1] } as never),
      "unknown-name",
      /nearest: emissivity/,
    ],
    [
      "a temperature below zero",
      () => solveFor(loop, { unknown: "emissivity", temperature: -1, within: [0.1, 1] }),
      "out-of-range",
      /temperature/,
    ],
    [
      "a parameter outside of a diagram",
      () => statesOnDiagram(loop, diagram, 2000),
      "out-of-range",
      /900 to 1900/,
    ],
    ["no diagram", () => statesOnDiagram(loop, {} as never, 1361), "unreadable", /traceBranches/],
    [
      "a given to follow that does not exist",
      () => followState(loop, state, { to: { fluxx: 1 } } as never),
      "unknown-name",
      /nearest: flux/,
    ],
    ["nothing to follow to", () => followState(loop, state, {} as never), "missing", /flux, emissivity/],
    [
      "a value out of range",
      () => followState(loop, state, { to: { emissivity: 2 } }),
      "out-of-range",
      /emissivity/,
    ],
    [
      "margins outside of the range",
      () => tippingMargins(loop, state, { along: "flux", between: [1400, 1900] }),
      "out-of-range",
      /between/,
    ],
    [
      "margins without a range",
      () => tippingMargins(idle, stateOf(idle, 0), { along: "flux" }),
      "missing",
      /between/,
    ],
    [
      "a time along what is no luminosity",
      () => tippingMargins(loop, state, { along: "emissivity", brightening: { rate: 1e-18 } }),
      "contradiction",
      /W m-2/,
    ],
  ])("%s", (_, call, code, words) => {
    const error = refusal(call);
    expect(error.code).toBe(code);
    expect(error.message).toMatch(words);
  });
});

describe("a state of another loop", () => {
  const moved = {
    ...state,
    temperature: 300,
    variables: { temperature: { value: 300, bracket: [299.9, 300.1] } },
  };
  const renamed = { ...state, givens: { flux: 1361 } };
  test.each([
    ["moved", moved],
    ["with other givens", renamed],
    ["moved, from JSON", JSON.parse(JSON.stringify(moved))],
  ])("%s", (_, foreign) => {
    for (const call of [
      () => followState(loop, foreign as never, { to: { flux: 1400 } }),
      () => tippingMargins(loop, foreign as never, { along: "flux" }),
    ]) {
      expect(refusal(call).code).toBe("foreign-state");
    }
  });
});
