import { add, div, mul, product, sqrt, sub } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort, fluxPort } from "../law/ports.ts";

/** Redistribution factor 1/4: heat spread over the whole sphere. Source: Hansen 2008, ApJS 179, 484. */
export const REDISTRIBUTION_GLOBAL = 0.25;
/** Redistribution factor 1/2: heat spread evenly over the day side. Source: Hansen 2008, ApJS 179, 484. */
export const REDISTRIBUTION_DAYSIDE = 0.5;
/** Redistribution factor 2/3: heat re-radiated where it falls, seen from the star. Source: Hansen 2008, ApJS 179, 484. */
export const REDISTRIBUTION_INSTANT = 0.6666666666666666;
/** Redistribution factor 1: the substellar point without any transport. Source: Cowan & Agol 2011, ApJ 729, 54. */
export const REDISTRIBUTION_SUBSTELLAR = 1;

/**
 * Equilibrium temperature: εσT⁴ = f·S(1 − A) + F_i, solved for T in K. It is not the surface temperature.
 * Stellar flux normal to the beam from 0 to 10¹² and internal flux (per unit of whole area, not multiplied by
 * f) from 0 to 10⁹ in W m⁻², Bond albedo between 0 and 1, emissivity from 10⁻⁹ to 1 (1 unless said). The
 * redistribution factor f between 0 and 1 must be given: 1/4 whole sphere, 1/2 day side, 2/3 day side without
 * transport seen from the star, 1 substellar point, from 0 to 1/4 a night side. Errors: as for every law.
 * Source: Hansen 2008, ApJS 179, 484; Cowan & Agol 2011, ApJ 729, 54.
 */
export const equilibriumTemperature = /* @__PURE__ */ defineLaw({
  name: "equilibriumTemperature",
  about: "Temperature at which a body re-radiates what it absorbs; not the surface temperature.",
  output: { symbol: "T_eq", unit: "K", about: "equilibrium temperature" },
  inputs: {
    flux: /* @__PURE__ */ fluxPort(),
    albedo: /* @__PURE__ */ albedoPort("A"),
    redistribution: { symbol: "f", unit: "1", within: [0, 1], about: "redistribution factor" },
    emissivity: { symbol: "ε", unit: "1", within: [1e-9, 1], default: 1, about: "emissivity" },
    internalFlux: { symbol: "F_i", unit: "W m-2", within: [0, 1e9], default: 0, about: "internal heat" },
  },
  source:
    "Hansen 2008, ApJS 179, 484 (doi:10.1086/591964); Cowan & Agol 2011, ApJ 729, 54 (doi:10.1088/0004-637X/729/1/54)",
  write({ flux, albedo, redistribution, emissivity, internalFlux }) {
    const heating = add(product(redistribution, flux, sub(1, albedo)), internalFlux);
    const fourthPower = div(heating, mul(emissivity, STEFAN_BOLTZMANN));
    return sqrt(sqrt(fourthPower));
  },
});
