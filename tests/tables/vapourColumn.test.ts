// Table iii: every equilibrium with a tanh albedo and a grey column that thickens with water vapour, a user's own law.
import { describe, expect, test } from "vitest";
import {
  absorbedFlux,
  closeLoop,
  findStates,
  greyColumnEmission,
  STEFAN_BOLTZMANN,
  type State,
  slopesOf,
  tanhAlbedo,
} from "../../src/index.ts";
import table from "../reference/computed/iii_water_vapour.json" with { type: "json" };
import { expectRow, type Reading } from "./compareState.ts";
import { nearest, numbers, of, type ReferenceCase } from "./table.ts";
import { vapourDepth } from "./vapourDepth.ts";

const cases = table.cases as unknown as ReferenceCase<
  "alpha_mid" | "alpha_half_range" | "T0" | "width" | "tau_c" | "tau_w" | "L_over_Rv" | "T_ref" | "sigma"
>[];

describe.each(cases)("$id", ({ inputs, within, rows }) => {
  const p = numbers(inputs);
  const albedo = {
    cold: p.alpha_mid + p.alpha_half_range,
    warm: p.alpha_mid - p.alpha_half_range,
    midpoint: p.T0,
    width: p.width,
  };
  const vapour = { dry: p.tau_c, wet: p.tau_w, latent: p.L_over_Rv, reference: p.T_ref };
  const loop = closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const opticalDepth = couple("opticalDepth", vapourDepth({ temperature, ...vapour }));
    return {
      heating: {
        sunlight: absorbedFlux({ flux, albedo: couple("albedo", tanhAlbedo({ temperature, ...albedo })) }),
      },
      cooling: { longwave: greyColumnEmission({ temperature, opticalDepth }) },
      heatCapacity: 4e8,
    };
  });

  const read = ({ temperature, givens, couplings, ledger }: State): Reading => {
    const opticalDepth = of(couplings, "opticalDepth");
    const { slopes } = slopesOf(greyColumnEmission, { temperature, opticalDepth });
    const thickening = of(slopesOf(vapourDepth, { temperature, ...vapour }).slopes, "temperature");
    const darkening = of(slopesOf(tanhAlbedo, { temperature, ...albedo }).slopes, "temperature");
    return {
      // the exponent L/R·(1/T₀ − 1/T) is a difference of two terms near 20 whose roundings reach the emission
      size:
        ledger.flows.reduce((sum, flow) => sum + Math.abs(flow.value), 0) * (1 + p.L_over_Rv / p.T_ref / 4),
      parts: {
        planck: -of(slopes, "temperature"),
        water_vapour: -of(slopes, "opticalDepth") * thickening,
        albedo: (-of(givens, "flux") / 4) * darkening,
      },
      reference: "planck",
    };
  };

  test.each(rows)("S = $S", (row) => {
    const found = findStates(loop, { within, at: { flux: nearest(row.S) } });
    expectRow(found, row, 0, read);
  });
});

test("the table has every row, and its σ is ours", () => {
  expect(cases.map((c) => c.rows.length)).toEqual([20, 19, 19]);
  expect(cases.flatMap((c) => c.rows.flatMap((row): readonly unknown[] => row.states))).toHaveLength(86);
  for (const { inputs } of cases) expect(Number(inputs.sigma)).toBe(STEFAN_BOLTZMANN);
});
