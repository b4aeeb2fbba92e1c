// Table i: every equilibrium with a tanh albedo and grey emission.
import { describe, expect, test } from "vitest";
import { tanhAlbedo } from "../../src/albedo/tanhAlbedo.ts";
import { greyEmission } from "../../src/greenhouse/greyEmission.ts";
import { STEFAN_BOLTZMANN } from "../../src/ground/constants.ts";
import { slopesOf } from "../../src/law/slopesOf.ts";
import { closeLoop } from "../../src/loop/closeLoop.ts";
import { absorbedFlux } from "../../src/star/absorbedFlux.ts";
import { findStates } from "../../src/states/findStates.ts";
import { sampledLaw } from "../../src/states/sampledLaw.ts";
import type { State } from "../../src/states/state.ts";
import table from "../reference/computed/i_tanh_albedo.json" with { type: "json" };
import { expectRow, type Reading } from "./compareState.ts";
import { nearest, numbers, of, type ReferenceCase } from "./table.ts";

const cases = table.cases as unknown as ReferenceCase<
  "alpha_mid" | "alpha_half_range" | "T0" | "width" | "epsilon" | "sigma"
>[];

describe.each(cases)("$id", ({ inputs, within, rows }) => {
  const p = numbers(inputs);
  const albedo = {
    cold: p.alpha_mid + p.alpha_half_range,
    warm: p.alpha_mid - p.alpha_half_range,
    midpoint: p.T0,
    width: p.width,
  };
  // another σ is the same budget with another emissivity
  const emissivity = p.epsilon * (p.sigma / STEFAN_BOLTZMANN);
  const loop = closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    return {
      heating: {
        sunlight: absorbedFlux({ flux, albedo: couple("albedo", tanhAlbedo({ temperature, ...albedo })) }),
      },
      cooling: { longwave: greyEmission({ temperature, emissivity }) },
      heatCapacity: 4e8,
    };
  });

  const read = ({ temperature, givens, ledger }: State): Reading => ({
    size: ledger.flows.reduce((sum, flow) => sum + Math.abs(flow.value), 0),
    parts: {
      planck: -of(slopesOf(greyEmission, { temperature, emissivity }).slopes, "temperature"),
      albedo:
        (-of(givens, "flux") / 4) *
        of(slopesOf(tanhAlbedo, { temperature, ...albedo }).slopes, "temperature"),
    },
    reference: "planck",
  });

  test("the sampled search finds the same with an ordinary function in place of the law", () => {
    const plainAlbedo = sampledLaw({
      name: "plainAlbedo",
      output: { symbol: "α", unit: "1", within: [0, 1] },
      inputs: { temperature: { symbol: "T", unit: "K", within: [0, 1e5] } },
      compute: ({ temperature }) => tanhAlbedo({ temperature, ...albedo }),
    });
    const sampled = closeLoop(({ temperature, given }) => ({
      heating: {
        sunlight: absorbedFlux({
          flux: given("flux", 1361, "W m-2", { within: [0, 1e5] }),
          albedo: plainAlbedo({ temperature }),
        }),
      },
      cooling: { longwave: greyEmission({ temperature, emissivity }) },
      heatCapacity: 4e8,
    }));
    for (const { S, states } of rows) {
      const found = findStates(sampled, { within, at: { flux: nearest(S) } });
      expect({ proof: found.proof, complete: found.complete }).toEqual({ proof: "sampled", complete: false });
      const stabilities = states.map((state) => (state.stable ? "stable" : "unstable"));
      expect(found.states.map((state) => state.stability)).toEqual(stabilities);
      // the balance is the same to its last bits; only slopes are quotients
      states.forEach((state, i) => {
        expect(found.states[i]?.temperature).toBeCloseTo(Number(state.T), 10);
      });
    }
  });

  test.each(rows)("S = $S", (row) => {
    const found = findStates(loop, { within, at: { flux: nearest(row.S) } });
    expectRow(found, row, 0, read);
  });
});

test("the table has every row", () => {
  expect(cases.map((c) => c.rows.length)).toEqual([39, 39, 17, 9, 17]);
  expect(cases.flatMap((c) => c.rows.flatMap((row) => row.states))).toHaveLength(249);
});
