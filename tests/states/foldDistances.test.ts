// How far a given is from the fold at which two states merge: the fold's flux, known to 24 digits, must lie in the range.
import { expect, test } from "vitest";
import * as core from "../../src/index.ts";
import table from "../reference/computed/i_tanh_albedo.json" with { type: "json" };

const { inputs, folds } = table.cases.find(
  ({ id }) => id === "i-textbook-sigma2018",
) as (typeof table.cases)[number];
const [middle, half] = [Number(inputs.alpha_mid), Number(inputs.alpha_half_range)];
const loop = core.closeLoop(({ temperature, given }) => {
  const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
  const idle = given("idle", 1, "1");
  const ramp = {
    cold: middle + half,
    warm: middle - half,
    midpoint: Number(inputs.T0),
    width: Number(inputs.width),
  };
  return {
    heating: { sunlight: core.absorbedFlux({ flux, albedo: core.tanhAlbedo({ temperature, ...ramp }) }) },
    cooling: { longwave: core.greyEmission({ temperature, emissivity: Number(inputs.epsilon) }) },
    heatCapacity: 0,
    report: { idle },
  };
});

test("at the corner at which two states merge, a given is as far from it as the balance says", () => {
  const straight = { intercept: 203.3, slope: 2.09, reference: 273.15 };
  const ramp = { cold: 0.7, warm: 0.3, frozenBelow: 250, openAbove: 280 };
  const cornered = core.closeLoop(({ temperature, given }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const albedo = core.rampAlbedo({ temperature, ...ramp });
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
      cooling: { longwave: core.linearEmission({ temperature, ...straight }) },
      heatCapacity: 0,
    };
  });
  // S (1 − 0.7)/4 = 203.3 + 2.09 (250 − 273.15)
  const corner = (203.3 + 2.09 * (250 - 273.15)) / 0.075;
  const found = core.findStates(cornered, { within: [150, 260], at: { flux: corner } });
  const doubt = found.undecided.find(({ kind }) => kind === "corner");
  const [low, high] = doubt?.distances?.flux ?? [NaN, NaN];
  // flows of 155 W m⁻² are rounded by 1e-13, and the flux enters with 0.075
  expect(low <= 0 && high >= 0 && high - low < 1e-10).toBe(true);
});

/** So close to a fold, W m⁻², that rounding hides whether there are two states or none. */
const STEP = 4.6e-13;

test.each(folds)("at the fold of $S W m⁻²", ({ S, T }) => {
  const fold = Number(S);
  // N rises with the flux by (1 − α)/4, here from the formula and the temperature in the table
  const albedo = middle - half * Math.tanh((Number(T) - Number(inputs.T0)) / Number(inputs.width));
  const slope = (1 - albedo) / 4;
  let asked = 0;
  for (let k = -9; k <= 9; k++) {
    const flux = fold + k * STEP;
    const { undecided } = core.findStates(loop, { within: [150, 400], at: { flux } });
    for (const { kind, distances, enclosure } of undecided) {
      if (kind !== "fold") continue;
      const [low, high] = (distances as { flux: unknown }).flux as readonly [number, number];
      // the number nearest to S may be off by half a unit of its last place, 1.2e-13
      expect(low).toBeLessThanOrEqual(fold - flux + 1.2e-13);
      expect(high).toBeGreaterThanOrEqual(fold - flux - 1.2e-13);
      // −N/(∂N/∂S), to first order: the slope changes by less than 1e-6 of itself over so short a stretch
      const [least, most] = enclosure as readonly [number, number];
      expect(low / (-most / slope)).toBeCloseTo(1, 4);
      expect(high / (-least / slope)).toBeCloseTo(1, 4);
      expect(distances?.idle).toBeNull();
      asked++;
    }
  }
  expect(asked).toBeGreaterThan(5);
});
