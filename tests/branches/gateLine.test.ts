// The gate less its curve, where everything is known: N = b·(p − (T⁴ − 6T²)) with b = 2 or b = −2, by hand.
import { describe, expect, test } from "vitest";
import { gateCurve, gateNodes } from "../../src/branches/gateCurve.ts";
import { gateLine } from "../../src/branches/gateLine.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import * as core from "../../src/index.ts";
import { atOnce } from "../../src/search/enclosed.ts";
import { formulaLoop } from "./loops.ts";

const { mul, sub } = core;
const quarticLoop = (b: number) => formulaLoop((t, p) => mul(b, sub(p, mul(mul(t, t), sub(mul(t, t), 6)))));
const curve = (t: number) => t * t * (t * t - 6);
const slope = (t: number) => 12 * t - 4 * t * t * t;

/** The least and the greatest number that three numbers of an enclosure admit. */
const rangeOf = (out: Float64Array, i: number) => [
  (out[3 * i] as number) - (out[3 * i + 2] as number),
  (out[3 * i + 1] as number) + (out[3 * i + 2] as number),
];

/** Expects three enclosures to hold what functions give at places of a box. */
function expectHeld(out: Float64Array, functions: readonly ((t: number) => number)[], box: core.Range): void {
  functions.forEach((f, i) => {
    const [low, high] = rangeOf(out, i) as [number, number];
    for (let k = 0; k <= 20; k++) {
      const t = box[0] + ((box[1] - box[0]) * k) / 20;
      expect(f(t)).toBeGreaterThanOrEqual(low);
      expect(f(t)).toBeLessThanOrEqual(high);
    }
    // and not everything else
    expect(high - low).toBeLessThan(100);
  });
}

describe.each([2, -2])("b = %d", (b) => {
  const loop = quarticLoop(b);
  const nodes = gateNodes(loop, "p");
  if (!nodes) throw new Error("no gate");
  const line = gateLine(loop, nodes);
  line.set([0.5], [0.5, 0.5]);
  const box = [1.5, 2.25] as const;
  const out = new Float64Array(9);

  test("the distance with its slope and curvature", () => {
    atOnce(line.distance).box(box[0], box[1], out);
    expectHeld(out, [(t) => 0.5 - curve(t), slope, (t) => 12 - 12 * t * t], box);
  });

  test("the slope with its slope and curvature", () => {
    atOnce(line.slope).box(box[0], box[1], out);
    expectHeld(out, [slope, (t) => 12 - 12 * t * t, (t) => -24 * t], box);
  });

  test("bounds of the curve hold its ends and its values between", () => {
    for (const [from, to] of [box, [1.7, 1.75], [2, 2]] as const) {
      const [low, high] = line.curveOver(from, to);
      for (let k = 0; k <= 20; k++) {
        const p = curve(from + ((to - from) * k) / 20);
        expect(p).toBeGreaterThanOrEqual(low);
        expect(p).toBeLessThanOrEqual(high);
      }
      expect(high - low).toBeLessThan(100 * (to - from) + 1e-12);
    }
  });

  test("stability, gaps and folds have the sign of N and λ themselves", () => {
    // T > 2 only: p = T⁴ − 6T² rises from −8, with λ = b·(12T − 4T³)
    const diagram = traceBranches(loop, { along: "p", between: [-10, 10], within: [2, 4] });
    expect(diagram).toMatchObject({ complete: true, method: "line" });
    expect(diagram.branches.map((branch) => branch.stability)).toEqual([b > 0 ? "stable" : "unstable"]);
    // below −8 N has the sign of −b at all temperatures
    expect(diagram.gaps.map((gap) => gap.too)).toEqual([b > 0 ? "cold" : "hot"]);
  });
});

test("a curve reads anew when its givens change", () => {
  const loop = core.closeLoop(({ temperature, given }) => ({
    heating: { sunlight: core.absorbedFlux({ flux: given("flux", 1361, "W m-2"), albedo: 0.3 }) },
    cooling: { longwave: core.greyEmission({ temperature, emissivity: given("emissivity", 0.6, "1") }) },
    heatCapacity: 1,
  }));
  const along = gateCurve(loop, "flux");
  const at = [0.6, 0.9].map((emissivity) => {
    along?.set([1361, emissivity], [100, 5000], [200, 400]);
    return along?.at(288) as number;
  });
  expect((at[1] as number) / (at[0] as number)).toBeCloseTo(1.5, 12);
});
