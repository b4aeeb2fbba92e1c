// The folds of the reference tables lie inside the brackets that are proved, and there are no others.
import { describe, expect, test } from "vitest";
import type { Diagram, Fold } from "../../src/branches/diagram.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import * as core from "../../src/index.ts";
import tanhTable from "../reference/computed/i_tanh_albedo.json" with { type: "json" };
import rampTable from "../reference/computed/ii_ramp_linear.json" with { type: "json" };
import vapourTable from "../reference/computed/iii_water_vapour.json" with { type: "json" };
import { nearest, numbers } from "../tables/table.ts";
import { vapourDepth } from "../tables/vapourDepth.ts";

/** A fold of a table, as decimals of many digits. */
interface Row {
  readonly S: string;
  readonly T: string;
}

/** The nearest double of an exact number may lie one unit in the last place outside of its bracket. */
const ULP = 2.3e-16;

function expectFolds(diagram: Diagram, rows: readonly Row[], kind: Fold["kind"] = "fold"): void {
  expect(diagram).toMatchObject({ proof: "proved", complete: true, method: "line", undecided: [] });
  expect(diagram.folds.map((f) => f.kind)).toEqual(rows.map(() => kind));
  diagram.folds.forEach((fold, i) => {
    const { S, T } = rows[i] as Row;
    expectInside(nearest(S), fold.atBracket);
    expectInside(nearest(T), fold.temperatureBracket);
    // no wider than a few hundred roundings of the flux, and than what λ can be told from zero over its slope
    expect(fold.atBracket[1] - fold.atBracket[0]).toBeLessThan(1e-10);
    expect(fold.temperatureBracket[1] - fold.temperatureBracket[0]).toBeLessThan(1e-10);
  });
  expect(diagram.branches).toHaveLength(rows.length + 1);
}

function expectInside(value: number, [low, high]: readonly [number, number]): void {
  expect(value).toBeGreaterThanOrEqual(low * (1 - ULP));
  expect(value).toBeLessThanOrEqual(high * (1 + ULP));
}

describe.each(tanhTable.cases)("$id", ({ inputs, folds, within }) => {
  const p = numbers(inputs);
  const loop = core.closeLoop(({ temperature, given }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const [cold, warm] = [p.alpha_mid + p.alpha_half_range, p.alpha_mid - p.alpha_half_range];
    const albedo = core.tanhAlbedo({ temperature, cold, warm, midpoint: p.T0, width: p.width });
    // another σ is the same budget with another emissivity
    const emissivity = p.epsilon * (p.sigma / core.STEFAN_BOLTZMANN);
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity }) },
      heatCapacity: 4e8,
    };
  });
  test.each([
    [within as [number, number], [100, 20000] as const],
    [[2.7, 2000] as const, [1e-3, 1e5] as const],
    [[200, 300] as const, [1000, 1800] as const],
  ])("within %j K, between %j W m⁻²", (range, between) => {
    expectFolds(traceBranches(loop, { along: "flux", between, within: range }), folds);
  });
});

describe.each(vapourTable.cases)("$id", ({ inputs, folds, within }) => {
  const p = numbers(inputs);
  const loop = core.closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const [cold, warm] = [p.alpha_mid + p.alpha_half_range, p.alpha_mid - p.alpha_half_range];
    const albedo = core.tanhAlbedo({ temperature, cold, warm, midpoint: p.T0, width: p.width });
    const vapour = { dry: p.tau_c, wet: p.tau_w, latent: p.L_over_Rv, reference: p.T_ref };
    const opticalDepth = couple("opticalDepth", vapourDepth({ temperature, ...vapour }));
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
      cooling: { longwave: core.greyColumnEmission({ temperature, opticalDepth }) },
      heatCapacity: 4e8,
    };
  });
  test("has the folds of the table", () => {
    const options = { along: "flux", between: [200, 5000], within: within as [number, number] } as const;
    expectFolds(traceBranches(loop, options), folds);
  });
});

describe.each(rampTable.cases)("$id", ({ id, inputs, unit }) => {
  const zero = unit === "K" ? 0 : 273;
  const p = numbers(inputs);
  const loop = core.closeLoop(({ temperature, given }) => {
    const ramp = {
      ...{ cold: p.alpha_ice, warm: p.alpha_free },
      ...{ frozenBelow: p.T_ice + zero, openAbove: p.T_free + zero },
    };
    return {
      heating: {
        sunlight: core.absorbedFlux({
          flux: given("flux", 1361, "W m-2", { within: [0, 1e5] }),
          albedo: core.rampAlbedo({ temperature, ...ramp }),
        }),
      },
      cooling: {
        longwave: core.linearEmission({ temperature, intercept: p.A, slope: p.B, reference: zero }),
      },
      heatCapacity: 4e8,
    };
  });
  // S = 4(A + BT)/(1 − α) on both sides of the ramp: where it falls from one corner to the other, both are folds
  const fluxAt = (t: number, albedo: number) => (4 * (p.A + p.B * t)) / (1 - albedo);
  const corners = [
    { S: `${fluxAt(p.T_ice, p.alpha_ice)}`, T: `${p.T_ice + zero}` },
    { S: `${fluxAt(p.T_free, p.alpha_free)}`, T: `${p.T_free + zero}` },
  ];
  const options = { along: "flux", between: [500, 3000], within: [181, 460] } as const;
  const diagram = traceBranches(loop, options);

  test("has corner folds where the ramp bends back", () => {
    if (id === "ii-d2-continuum") {
      // a whole ramp of states at 4000/3 W m⁻²
      expect(diagram).toMatchObject({ proof: "partial", undecided: [{ kind: "continuum" }] });
      const { temperatures, parameters } = diagram.undecided[0] as Diagram["undecided"][number];
      expect(temperatures.map((t) => Math.round(t * 1e6) / 1e6)).toEqual([253, 293]);
      const [least, most] = parameters;
      expect(least).toBeLessThan(4000 / 3);
      expect(most).toBeGreaterThan(4000 / 3);
      // the part of the stretch next to a corner is bounded with the slope beyond it
      expect(most - least).toBeLessThan(5);
    } else {
      expectFolds(diagram, Number(corners[0]?.S) > Number(corners[1]?.S) ? corners : [], "corner");
    }
  });
});
