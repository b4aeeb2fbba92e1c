import { add, div, exp, log, max, min, mix, mul, sub } from "../graph/operations.ts";
import type { Quantity, Value } from "../graph/quantity.ts";
import { SOLAR_LUMINOSITY } from "../ground/constants.ts";
import { deepFreeze } from "../ground/deepFreeze.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { SOLAR_MASS } from "./stellarBrightening.ts";

/**
 * The steps of `massLuminosity`: log₁₀(L/L☉) = slope·log₁₀(M/M☉) + intercept up to and including `upTo` solar masses; the
 * first begins at 0.179. Source: Eker et al. 2018, MNRAS 479, 5491, table 4.
 */
export const MASS_LUMINOSITY_STEPS = /* @__PURE__ */ deepFreeze([
  { name: "ultra-low mass", upTo: 0.45, slope: 2.028, intercept: -0.976 },
  { name: "very low mass", upTo: 0.72, slope: 4.572, intercept: -0.102 },
  { name: "low mass", upTo: 1.05, slope: 5.743, intercept: -0.007 },
  { name: "intermediate mass", upTo: 2.4, slope: 4.329, intercept: 0.01 },
  { name: "high mass", upTo: 7, slope: 3.967, intercept: 0.093 },
  { name: "very high mass", upTo: 31, slope: 2.865, intercept: 1.105 },
]);

const LN10 = 2.302585092994046;
/** 2⁴⁸: a jump lies between 2⁻⁴⁸ and 2⁻⁴⁷ of the mass above its edge, where changes of unit cannot move it. */
const STEEPNESS = 281474976710656;

/**
 * Luminosity of a main-sequence star from its mass, in W: log₁₀(L/L☉) = a·log₁₀(M/M☉) + b in six steps of mass
 * (`MASS_LUMINOSITY_STEPS`). Mass in kg; published for 0.179 to 31 M☉, extrapolated to 0.08 and 120.
 *
 * The source fits each step by itself, and the fits do not meet: just above 0.45, 0.72, 1.05 and 2.4 M☉ the luminosity falls
 * by 1.9, 15.3, 2.9 and 11.8 %, above 7 M☉ it rises by 20.4 %. These jumps are kept, each just above its edge, so that near
 * one a heavier star may be given the lower luminosity. Stars of one mass scatter by tens of percent, and the Sun has
 * 0.984 L☉ here: a measured luminosity is always better.
 * Errors: as for every law. Source: Eker et al. 2018, MNRAS 479, 5491, table 4.
 */
export const massLuminosity = /* @__PURE__ */ defineLaw({
  name: "massLuminosity",
  about: "Luminosity of a main-sequence star from its mass, in six steps that do not quite meet.",
  output: { symbol: "L", unit: "W", about: "luminosity of the star" },
  inputs: {
    // 0.08 to 120 solar masses
    mass: {
      symbol: "M",
      unit: "kg",
      within: [1.590727896558441e29, 2.386091844837662e32],
      about: "mass of the star",
    },
  },
  // 0.179 to 31 solar masses
  published: { mass: [3.559253668549511e29, 6.164070599163958e31] },
  source: "Eker et al. 2018, MNRAS 479, 5491 (doi:10.1093/mnras/sty1834), table 4",
  write({ mass }) {
    const suns = div(mass, SOLAR_MASS);
    const logMass = div(log(suns), LN10);
    const [first, ...rest] = MASS_LUMINOSITY_STEPS.map((step) =>
      add(mul(step.slope, logMass), step.intercept),
    ) as [Value, ...Value[]];
    const logLuminosity = rest.reduce<Value>(
      (below, here, i) => mix(below, here, beyond(suns, MASS_LUMINOSITY_STEPS[i]?.upTo as number)),
      first,
    );
    return mul(SOLAR_LUMINOSITY, exp(mul(LN10, logLuminosity)));
  },
});

/** 0 up to an edge, 1 above it. */
function beyond(suns: Quantity | number, edge: number): Value {
  const excess = mul(STEEPNESS, sub(div(suns, edge), 1));
  return min(1, max(0, sub(excess, 1)));
}
