// Laws of two published budgets that the library does not have, written as a user would write them.
import { defineLaw, div, fourth, mul, product, square, sub, tanh } from "../../src/index.ts";

const temperature = { symbol: "T", unit: "K", within: [0, 1e5] } as const;

/** τ = 0.79·(T/273 K)³, Spiegel, Menou & Scharf 2008. */
export const columnDepth = defineLaw({
  name: "columnDepth",
  output: { symbol: "τ", unit: "1" },
  inputs: { temperature },
  write({ temperature }) {
    const warmth = div(temperature, 273);
    return product(0.79, warmth, square(warmth));
  },
});

/** F = σT⁴·(1 − m·tanh(1.9·10⁻¹⁵·T⁶)) with σ = 5.6697·10⁻⁸, Zaliapin & Ghil 2010. */
export const screenedEmission = defineLaw({
  name: "screenedEmission",
  output: { symbol: "F", unit: "W m-2" },
  inputs: { temperature, share: { symbol: "m", unit: "1", within: [0, 1] } },
  write({ temperature, share }) {
    const sixth = mul(square(temperature), fourth(temperature));
    const screened = mul(share, tanh(mul(1.9e-15, sixth)));
    return product(5.6697e-8, fourth(temperature), sub(1, screened));
  },
});
