// A law that a user might write: the optical depth of a column whose water vapour follows saturation.
import { add, defineLaw, div, exp, mul, sub } from "../../src/index.ts";

const TEMPERATURE = { symbol: "T", unit: "K", within: [1, 5000] } as const;

/** τ = dry + wet·exp(L/R·(1/T₀ − 1/T)). */
export const vapourDepth = defineLaw({
  name: "vapourDepth",
  about: "Longwave optical depth of a column with saturated water vapour.",
  output: { symbol: "τ", unit: "1" },
  inputs: {
    temperature: TEMPERATURE,
    dry: { symbol: "τ_0", unit: "1", within: [0, 100] },
    wet: { symbol: "τ_1", unit: "1", within: [0, 100] },
    latent: { symbol: "L/R", unit: "K", within: [0, 1e5] },
    reference: { ...TEMPERATURE, symbol: "T_0" },
  },
  write({ temperature, dry, wet, latent, reference }) {
    const warmth = sub(div(1, reference), div(1, temperature));
    const vapour = exp(mul(latent, warmth));
    return add(dry, mul(wet, vapour));
  },
});
