// What the grey column and its layers have in common: how much more the ground emits than leaves at the top.
import { add, mul, product, sqrt } from "../graph/operations.ts";
import type { Of, Value } from "../graph/quantity.ts";

/** Longwave optical depth of a whole column. Where it follows temperature, as on a hot branch, `deepest` must be large. */
export const opticalDepthPort = <const D extends number = 1e6>(deepest: D = 1e6 as D) =>
  ({
    symbol: "τ",
    unit: "1",
    within: [0, deepest],
    about: "longwave optical depth of the whole column",
  }) as const;

/** Closure of the two-stream equations. */
export const closurePort = () =>
  ({ symbol: "D", unit: "1", within: [1, 2], default: 1.5, about: "diffusivity factor" }) as const;

/** Optical depth along the slanted path of the streams, halved: ½Dτ. */
export const halfSlantDepth = <N extends string = never>(closure: Value<N>, opticalDepth: Value<N>): Of<N> =>
  product(0.5, closure, opticalDepth);

/** σT⁴ of the ground over what leaves at the top of a column in radiative equilibrium: 1 + ½Dτ. */
export const greyBlanket = <N extends string = never>(closure: Value<N>, opticalDepth: Value<N>): Of<N> =>
  add(1, halfSlantDepth(closure, opticalDepth) as Value<N>);

/** Temperature of the ground where σT⁴ there is so many times what leaves at the top. */
export const groundUnder = <N extends string = never>(
  blanket: Value<N>,
  effectiveTemperature: Value<N>,
): Of<N> => mul(sqrt(sqrt(blanket) as Value<N>) as Value<N>, effectiveTemperature);
