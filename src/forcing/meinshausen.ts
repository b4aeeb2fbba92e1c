// The fits of Meinshausen et al. 2020 (AR6 WGI, Table 7.SM.1), of which both the adjusted and the effective forcings are made.
import { add, div, log, max, min, mul, sqrt, square, sub, sum } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { ppb, ppm } from "./concentration.ts";
import type { NamedValues } from "./ports.ts";

/** C_max − C₀ = −b₁/2a₁ in ppm: above, the coefficient of the logarithm grows no further. */
const PARABOLA_SPAN = 1531.289086140811;

/** [α + c₁√N]·ln(C/C₀), α = d₁ + b₁x + a₁x² with x = C − C₀ kept between 0 and C_max − C₀: flat below and above. */
export function co2Meinshausen({
  concentration,
  reference,
  nitrousOxide,
}: NamedValues<"concentration" | "reference" | "nitrousOxide">): Value {
  const above = min(max(sub(ppm(concentration), ppm(reference)), 0), PARABOLA_SPAN);
  const alone = sum(mul(-2.4785e-7, square(above)), mul(0.00075906, above), 5.2488);
  const overlap = mul(-0.0021492, sqrt(ppb(nitrousOxide)));
  return mul(add(alone, overlap), log(div(concentration, reference)));
}

/** (a₃√M + b₃√N + d₃)·(√M − √M₀). */
export function ch4Meinshausen({
  concentration,
  reference,
  nitrousOxide,
}: NamedValues<"concentration" | "reference" | "nitrousOxide">): Value {
  const [root, before] = [sqrt(ppb(concentration)), sqrt(ppb(reference))];
  const efficiency = sum(mul(-8.9603e-5, root), mul(-0.00012462, sqrt(ppb(nitrousOxide))), 0.045194);
  return mul(efficiency, sub(root, before));
}

/** (a₂√C + b₂√N + c₂√M + d₂)·(√N − √N₀). */
export function n2oMeinshausen({
  concentration,
  reference,
  co2,
  methane,
}: NamedValues<"concentration" | "reference" | "co2" | "methane">): Value {
  const [root, before] = [sqrt(ppb(concentration)), sqrt(ppb(reference))];
  const overlap = add(mul(-0.00034197, sqrt(ppm(co2))), mul(-0.00024357, sqrt(ppb(methane))));
  return mul(sum(overlap, mul(0.00025455, root), 0.12173), sub(root, before));
}
