// Many planets of one loop: the same states as one by one, and no row is dropped.
import { describe, expect, test } from "vitest";
import * as core from "../../src/index.ts";
import { refusal } from "../refusal.ts";
import { iceLoop } from "./iceLoop.ts";

const loop = iceLoop();
const within = [100, 500] as const;
/** Five states around its middle. */
const wavy = core.closeLoop(({ temperature, given }) => {
  const x = core.div(core.sub(temperature, given("middle", 300, "K")), 10);
  const factors = [-4, -2, 0, 2, 4].map((root) => core.sub(x, root));
  return {
    heating: { imagined: core.inUnit(core.product(...factors), "W m-2") },
    cooling: {},
    heatCapacity: 1,
  };
});
const flux = Float64Array.from({ length: 200 }, (_, i) => 900 + 5 * i);

describe("findStatesFor", () => {
  test("gives the bits of findStates, row by row", () => {
    const emissivity = flux.map((_, i) => 0.55 + 0.0005 * i);
    const found = core.findStatesFor(loop, { flux, emissivity }, { within });
    flux.forEach((_, row) => {
      const { states } = core.findStates(loop, {
        within,
        at: { flux: flux[row], emissivity: emissivity[row] },
      });
      const [start, end] = [found.first[row], found.first[row + 1]];
      expect(found.counts[row]).toBe(states.length);
      expect([...found.temperatures.slice(start, end)]).toEqual(states.map((s) => s.temperature));
      expect([...found.feedbackParameters.slice(start, end)]).toEqual(states.map((s) => s.feedbackParameter));
      const sign = { stable: -1, undecided: 0, unstable: 1 };
      expect([...found.stability.slice(start, end)]).toEqual(states.map((s) => sign[s.stability]));
      expect(core.ROW_STATUS[found.status[row] as number]).toBe("proved");
    });
    expect(found.reasons).toEqual([]);
  });

  test("flags a row that is refused, with its reason, and goes on", () => {
    const found = core.findStatesFor(
      loop,
      { flux: [1000, Number.NaN, -5, Number.POSITIVE_INFINITY, 1361] },
      { within },
    );
    expect([...found.counts]).toEqual([1, 0, 0, 0, 3]);
    expect([...found.status].map((s) => core.ROW_STATUS[s])).toEqual([
      "proved",
      "refused",
      "refused",
      "refused",
      "proved",
    ]);
    expect(found.reasons.map((r) => [r.row, r.code])).toEqual([
      [1, "not-a-number"],
      [2, "out-of-range"],
      [3, "not-a-number"],
    ]);
    expect(found.reasons[1]?.text).toContain("0 to 100000 W m-2");
  });

  test("says of a row what is undecided in it", () => {
    const found = core.findStatesFor(wavy, { middle: [300] }, { within, effort: 10 });
    expect(core.ROW_STATUS[found.status[0] as number]).toBe("partial");
    expect(found.reasons).toMatchObject([{ row: 0, code: "undecided" }]);
  });

  test("can be switched to sampling, which says so", () => {
    const found = core.findStatesFor(loop, { flux }, { within, proof: false });
    const proved = core.findStatesFor(loop, { flux }, { within });
    expect(new Set([...found.status].map((s) => core.ROW_STATUS[s]))).toEqual(new Set(["sampled"]));
    expect(found.counts).toEqual(proved.counts);
    const apart = found.temperatures.map((t, i) => Math.abs(t - (proved.temperatures[i] as number)));
    expect(Math.max(...apart)).toBeLessThan(1e-10);
  });

  test("takes more states than three a row", () => {
    const middle = Float64Array.from({ length: 50 }, (_, i) => 290 + i / 3);
    const found = core.findStatesFor(wavy, { middle }, { within });
    expect([...found.counts]).toEqual(Array(50).fill(5));
    expect(found.temperatures).toHaveLength(250);
    expect(found.temperatures[245]).toBeCloseTo((middle[49] as number) - 40, 9);
  });

  test.each<[string, unknown]>([
    ["null, as JSON writes NaN", null],
    ["a text", "1361"],
    ["true", true],
    ["a list", [1361]],
    ["a big integer", 1361n],
    ["a symbol", Symbol("flux")],
    ["an object with a value", { valueOf: () => 1361 }],
  ])("takes no number from %s, and goes on", (_, value) => {
    const found = core.findStatesFor(loop, { flux: [1361, value, 1361] as number[] }, { within });
    expect([...found.counts]).toEqual([3, 0, 3]);
    expect([...found.status].map((s) => core.ROW_STATUS[s])).toEqual(["proved", "refused", "proved"]);
    expect(found.reasons).toMatchObject([{ row: 1, code: "not-a-number" }]);
    expect(JSON.parse(JSON.stringify(found.reasons))).toEqual(found.reasons);
  });

  test("refuses the rows of a typed array of big integers", () => {
    const found = core.findStatesFor(loop, { flux: new BigInt64Array([1361n]) as never }, { within });
    expect(found.reasons).toMatchObject([{ row: 0, code: "not-a-number" }]);
  });

  test("takes more states in a row than a byte can count", () => {
    // a zigzag of slopes 1 and -1, which turns every kelvin between 199.5 and 200.5, 256 times; and levels beyond them
    const zigzag = core.closeLoop(({ temperature, given }) => {
      const t = core.inUnit(temperature, "1");
      const turns = Array.from({ length: 256 }, (_, i) =>
        core.mul(i % 2 ? 2 : -2, core.max(0, core.sub(t, 200.5 + i))),
      );
      const net = core.add(core.sub(t, given("level", 200.2, "1")), core.sum(...turns));
      return { heating: { imagined: core.inUnit(net, "W m-2") }, cooling: {}, heatCapacity: 1 };
    });
    const level = [100, 200.2, 300];
    const found = core.findStatesFor(zigzag, { level }, { within: [199, 455.9], effort: 1e5 });
    // it passes 200.2 once on each of its pieces but the last, of which the range has too little
    expect([...found.counts]).toEqual([0, 256, 0]);
    expect([...found.first]).toEqual([0, 0, 256, 256]);
    for (let i = 0; i < 256; i++) expect(found.temperatures[i]).toBeCloseTo(i + (i % 2 ? 199.8 : 200.2), 9);
  });

  test.each<[string, unknown, unknown, Partial<core.ThermosteadError>]>([
    ["no columns", {}, { within }, { code: "missing", path: "columns" }],
    ["an unknown column", { flx: [1] }, { within }, { code: "unknown-name", path: "columns.flx" }],
    [
      "columns of different lengths",
      { flux: [1], emissivity: [0.5, 0.6] },
      { within },
      { code: "contradiction", path: "columns.emissivity" },
    ],
    ["a number for a column", { flux: 1361 }, { within }, { code: "unreadable", path: "columns.flux" }],
    ["no range", { flux: [1361] }, {}, { code: "unreadable", path: "within" }],
  ])("refuses %s", (_, columns, options, expected) => {
    expect(refusal(() => core.findStatesFor(loop, columns as never, options as never))).toMatchObject(
      expected,
    );
  });
});
