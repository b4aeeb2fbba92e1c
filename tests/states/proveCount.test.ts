// Counts proved for whole intervals of parameters.
import { describe, expect, test } from "vitest";
import * as core from "../../src/index.ts";
import { refusal } from "../refusal.ts";
import { iceLoop } from "./iceLoop.ts";

const loop = iceLoop();
const within = [150, 400] as const;

describe("proveCount", () => {
  test("proves three states for every flux from 1300 to 1400 in one tile", () => {
    const proved = core.proveCount(loop, { within, over: { flux: [1300, 1400] } });
    expect(proved).toMatchObject({
      proof: "proved",
      provedShare: 1,
      tiles: [{ over: { flux: [1300, 1400] }, count: 3 }],
    });
  });

  test("tiles cover the interval without gaps, and the folds lie in the undecided ones", () => {
    const { tiles, proof } = core.proveCount(loop, { within, over: { flux: [1000, 1900] } });
    expect(proof).toBe("partial");
    const ranges = tiles.map((t) => t.over.flux as core.Range);
    expect(ranges[0]?.[0]).toBe(1000);
    expect(ranges.at(-1)?.[1]).toBe(1900);
    expect(ranges.slice(1).map((r) => r[0])).toEqual(ranges.slice(0, -1).map((r) => r[1]));
    expect(tiles.map((t) => t.count)).toEqual([1, null, 3, null, 1]);
    // folds of the table with σ of CODATA 2018 (mpmath, 70 digits): case i-textbook-sigma2018
    const folds = [1192.371727617463, 1674.98157337436];
    [1, 3].forEach((i, k) => {
      const [low, high] = ranges[i] as core.Range;
      expect(high - low).toBeLessThan(2e-3);
      expect(Math.abs((low + high) / 2 - (folds[k] as number))).toBeLessThan(2e-3);
    });
  });

  test("agrees with single searches inside tiles of two parameters", () => {
    const proved = core.proveCount(loop, {
      within,
      over: { flux: [1100, 1800], emissivity: [0.55, 0.65] },
      effort: 4000,
    });
    expect(proved.provedShare).toBeGreaterThan(0.8);
    expect(proved.cost.boxes).toBeLessThan(4300);
    const decided = proved.tiles.filter((t) => t.count !== null);
    expect(decided.length).toBeGreaterThan(10);
    for (const { over, count } of decided) {
      const at = (share: number) => ({
        flux: (over.flux as core.Range)[0] * (1 - share) + (over.flux as core.Range)[1] * share,
        emissivity:
          (over.emissivity as core.Range)[0] * share + (over.emissivity as core.Range)[1] * (1 - share),
      });
      for (const share of [0, 0.37, 1])
        expect(core.findStates(loop, { within, at: at(share) }).states).toHaveLength(count ?? -1);
    }
  });

  test.each<[string, unknown, Partial<core.ThermosteadError>]>([
    ["no parameter", { within, over: {} }, { code: "missing", path: "over" }],
    ["an unknown parameter", { within, over: { flx: [1, 2] } }, { code: "unknown-name", path: "over.flx" }],
    [
      "a reversed interval",
      { within, over: { flux: [1400, 1300] } },
      { code: "out-of-range", path: "over.flux[1]" },
    ],
    [
      "an interval outside the declared range",
      { within, over: { emissivity: [0.5, 1.5] } },
      { code: "out-of-range" },
    ],
    ["an unknown option", { within, over: { flux: [1, 2] }, tiles: 3 }, { code: "unknown-name" }],
  ])("refuses %s", (_, options, expected) => {
    expect(refusal(() => core.proveCount(loop, options as never))).toMatchObject(expected);
  });
});
