// Public functions called with nothing, or with something that is no options, no loop and no law: never a raw TypeError.
import { describe, expect, test } from "vitest";
import * as core from "../../src/index.ts";
import * as planet from "../../src/planet.ts";
import { refusal } from "../refusal.ts";
import { iceLoop } from "../states/iceLoop.ts";

type Call = (...args: readonly unknown[]) => unknown;
const loop = iceLoop();
const state = core.findStates(loop, { within: [150, 400] }).states[2];
const diagram = core.traceBranches(loop, { along: "flux", between: [1300, 1400], within: [150, 400] });
const { closeLoop, defineLaw, sampledLaw, slopesOf } = core as unknown as Record<string, Call>;

/** What each function is given, and the last of it is missing or wrong. */
const BESIDE: readonly (readonly [string, readonly unknown[]])[] = [
  ["findStates", [loop]],
  ["budgetCurve", [loop]],
  ["proveCount", [loop]],
  ["findStatesFor", [loop, { flux: [1361] }]],
  ["traceBranches", [loop]],
  ["traceFolds", [loop]],
  ["solveFor", [loop]],
  ["followState", [loop, state]],
  ["tippingMargins", [loop, state]],
  ["compareHeld", [loop]],
  ["assessedResponse", [core.AR6_FEEDBACKS]],
];

describe.each(BESIDE)("%s", (name, args) => {
  const call = (core as unknown as Record<string, Call>)[name] as Call;
  test.each([[undefined], [null], [3], ["text"]])("with %o for its options", (options) => {
    const error = refusal(() => call(...args, options));
    expect(error).toMatchObject({ code: "unreadable", path: name, value: options });
    expect(error.allowed).toContain("an object with ");
  });
});

describe("every public function", () => {
  const noDiagram = { method: "line", branches: [] };
  const lists = [
    ...[[], [undefined], [null], [3], [{}], [() => 0], [loop, null], [loop, 3], [loop, state, null]],
    ...[
      [null, diagram, 1361],
      [loop, noDiagram, 1361],
      [{}, diagram, 1361],
    ],
  ];
  const functions = Object.entries({ ...core, ...planet }).filter(
    ([name, value]) => typeof value === "function" && name !== "ThermosteadError",
  ) as unknown as (readonly [string, Call])[];

  test("is looked at", () => expect(functions.length).toBeGreaterThan(100));

  test.each(functions)("%s gives an answer or one of our errors", (_, call) => {
    for (const args of lists) {
      try {
        call(...args);
      } catch (error) {
        expect(error).toBeInstanceOf(core.ThermosteadError);
      }
    }
  });
});

describe("what is no function", () => {
  test.each([[undefined], [3], [{}]])("closeLoop(%o)", (write) => {
    expect(refusal(() => closeLoop?.(write))).toMatchObject({
      code: "unreadable",
      path: "closeLoop",
      value: write,
    });
  });

  test("closeLoop with a writer that returns a promise", () => {
    const error = refusal(() => closeLoop?.(async () => ({ heating: {}, cooling: {}, heatCapacity: 0 })));
    expect(error).toMatchObject({ code: "bad-budget", path: "budget", value: "a promise" });
  });

  const output = { symbol: "y", unit: "1" };
  test.each([
    ["nothing", undefined],
    ["no ports", {}],
    ["no body", { name: "f", output, inputs: {} }],
    ["no inputs", { name: "f", output, write: Math.sqrt, compute: Math.sqrt }],
    ["no output", { name: "f", inputs: {}, write: Math.sqrt, compute: Math.sqrt }],
  ])("a law with %s", (_, spec) => {
    for (const define of [defineLaw, sampledLaw])
      expect(refusal(() => define?.(spec))).toMatchObject({ code: "unreadable", path: "law" });
  });

  test.each([[undefined], [{}], [Math.sqrt]])("slopesOf(%o)", (law) => {
    expect(refusal(() => slopesOf?.(law, {}))).toMatchObject({ code: "unreadable", path: "law" });
  });
});
