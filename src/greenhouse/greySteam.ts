// A grey atmosphere of water vapour over an ocean: what the two limits of its emission have in common.
import { div, log, product } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";

/** Latent heat over the gas constant, K: 43 655 J mol⁻¹ over 8.314 462 618 J mol⁻¹ K⁻¹ (Nakajima et al. 1992). */
export const VAPOUR_TEMPERATURE = 5250.489659486974;
/** Pressure scale of the saturation line p = p₀·exp(−ℓ/RT), Pa (Nakajima et al. 1992). */
const PRESSURE_SCALE = 1.4e11;
/** Eddington's diffusivity factor. */
const CLOSURE = 1.5;

/** Port: what vapour absorbs. */
export const STEAM_ABSORPTION = {
  symbol: "k",
  unit: "m2 kg-1",
  within: [1e-4, 10],
  about: "grey absorption coefficient of vapour",
} as const;

/** Port: what holds the column. */
export const STEAM_GRAVITY = {
  symbol: "g",
  unit: "m s-2",
  within: [0.1, 100],
  about: "gravity at the surface",
} as const;

/** ln(D·k·p₀/g): the logarithm of slant optical depth that an endlessly warm ocean would have above it. */
export const logDepth = (absorption: Value, gravity: Value): Value =>
  log(div(product(CLOSURE * PRESSURE_SCALE, absorption), gravity));
