import { add, div, log, max, min, mul, sub, sum } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { coefficientsOf, type FiveNumbers, fluxPolynomial, starPort } from "./fluxPolynomial.ts";
import { RUNAWAY_2014 } from "./runawayCoefficients.ts";

/** 0.1 and 5 Earth masses in kg, by whichever value of the Earth's mass; no further. */
const MASSES = [5.97e23, 2.99e25] as const;
/** Mass of the Earth, kg: the nominal mass parameter over G of CODATA 2018. */
const EARTH_MASS = 5.972167867791379e24;
const LOG_5 = 1.6094379124341003;
const LOG_10 = 2.302585092994046;

/**
 * Flux at the limit of the runaway greenhouse for a planet between 0.1 and 5 Earth masses, in W m⁻². The paper computed it for
 * 0.1, 1 and 5 Earth masses, and there this law is the paper's; between them it is a straight line in ln m: the interpolation
 * is this library's, not the paper's. Effective temperature in K from 2600 to 7200, mass in kg from 5.97·10²³
 * to 2.99·10²⁵. Errors: as for every law.
 * Source: Kopparapu et al. 2014, ApJL 787, L29, Table 1.
 */
export const interpolatedRunawayFlux = /* @__PURE__ */ defineLaw({
  name: "interpolatedRunawayFlux",
  about:
    "Flux at the limit of the runaway greenhouse by the planet's mass; between 0.1, 1 and 5 Earth masses the interpolation is ours.",
  output: { symbol: "F_R", unit: "W m-2" },
  inputs: {
    effectiveTemperature: /* @__PURE__ */ starPort(),
    mass: { symbol: "m", unit: "kg", within: MASSES, about: "mass of the planet" },
  },
  source:
    "Kopparapu et al. 2014, ApJL 787, L29 (doi:10.1088/2041-8205/787/2/L29); linear in ln m between its masses, by this library",
  write({ effectiveTemperature, mass }) {
    const fluxFor = (numbers: FiveNumbers) => fluxPolynomial(effectiveTemperature, coefficientsOf(numbers));
    const light = fluxFor(RUNAWAY_2014[0.1]);
    const earth = fluxFor(RUNAWAY_2014[1]);
    const heavy = fluxFor(RUNAWAY_2014[5]);
    const logEarths = log(div(mass, EARTH_MASS));
    const fromLight = min(1, max(0, add(1, div(logEarths, LOG_10))));
    const toHeavy = min(1, max(0, div(logEarths, LOG_5)));
    return sum(light, mul(sub(earth, light), fromLight), mul(sub(heavy, earth), toHeavy));
  },
});
