import { add, div, fourth, mul, sqrt, square, sub, sum } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { IF97, LIQUID_WATER, MEGAPASCAL, N1, N2, N3, N4, N5, N6, N7, N8, N9, N10 } from "./saturationLine.ts";

/**
 * Pressure of water vapour in equilibrium with liquid water, in Pa: p = [2C/(−B + √(B² − 4AC))]⁴ MPa with
 * ϑ = T + n₉/(T − n₁₀), A = ϑ² + n₁ϑ + n₂, B = n₃ϑ² + n₄ϑ + n₅, C = n₆ϑ² + n₇ϑ + n₈.
 * Temperature in K between the triple and the critical point, 273.16 to 647.096. Errors: as for every law.
 * Source: IAPWS-IF97, region 4, eq. 30.
 */
export const saturationPressureLiquid = /* @__PURE__ */ defineLaw({
  name: "saturationPressureLiquid",
  about: "Pressure of water vapour in equilibrium with liquid water.",
  output: { symbol: "p_s", unit: "Pa" },
  inputs: {
    temperature: { symbol: "T", unit: "K", within: LIQUID_WATER, about: "temperature of the liquid" },
  },
  source: IF97,
  write({ temperature }) {
    const scaled = add(temperature, div(N9, sub(temperature, N10)));
    const a = sum(square(scaled), mul(N1, scaled), N2);
    const b = sum(mul(N3, square(scaled)), mul(N4, scaled), N5);
    const c = sum(mul(N6, square(scaled)), mul(N7, scaled), N8);
    const discriminant = sub(square(b), mul(4, mul(a, c)));
    const quarterPower = div(mul(2, c), sub(sqrt(discriminant), b));
    return mul(MEGAPASCAL, fourth(quarterPower));
  },
});
