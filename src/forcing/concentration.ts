// Concentrations in the units of the published formulas.
import { mul } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";

/** Parts per million of a mole fraction. */
export const ppm = (share: Value): Value => mul(share, 1e6);
/** Parts per billion (10⁻⁹) of a mole fraction. */
export const ppb = (share: Value): Value => mul(share, 1e9);
