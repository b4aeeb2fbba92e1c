import { add, div, mul, neg, sqrt, square, sub, sum } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import {
  IF97,
  LINE_PRESSURES,
  MEGAPASCAL,
  N1,
  N2,
  N3,
  N4,
  N5,
  N6,
  N7,
  N8,
  N9,
  N10,
} from "./saturationLine.ts";

/**
 * Temperature at which liquid water boils under a pressure, in K, the inverse of `saturationPressureLiquid`:
 * T = ½[n₁₀ + D − √((n₁₀ + D)² − 4(n₉ + n₁₀D))] with D = 2G/(−F − √(F² − 4EG)), β = (p/MPa)^¼,
 * E = β² + n₃β + n₆, F = n₁β² + n₄β + n₇, G = n₂β² + n₅β + n₈. Pressure in Pa, from 611.657 to 22.064 MPa.
 * Errors: as for every law. Source: IAPWS-IF97, region 4, eq. 31.
 */
export const saturationTemperature = /* @__PURE__ */ defineLaw({
  name: "saturationTemperature",
  about: "Temperature at which liquid water boils under a pressure.",
  output: { symbol: "T_s", unit: "K" },
  inputs: {
    pressure: { symbol: "p", unit: "Pa", within: LINE_PRESSURES, about: "pressure of the vapour" },
  },
  source: IF97,
  write({ pressure }) {
    const half = sqrt(div(pressure, MEGAPASCAL));
    const quarter = sqrt(half);
    const e = sum(half, mul(N3, quarter), N6);
    const f = sum(mul(N1, half), mul(N4, quarter), N7);
    const g = sum(mul(N2, half), mul(N5, quarter), N8);
    const discriminant = sub(square(f), mul(4, mul(e, g)));
    const scaled = div(mul(2, g), neg(add(f, sqrt(discriminant))));
    const total = add(N10, scaled);
    const spread = sub(square(total), mul(4, add(N9, mul(N10, scaled))));
    return mul(0.5, sub(total, sqrt(spread)));
  },
});
