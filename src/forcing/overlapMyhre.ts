// What methane and nitrous oxide absorb in the same bands, in the fit of Myhre et al. 1998.
import { add, exp, log, mul, product, sqrt } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { ppb } from "./concentration.ts";

/** f(M, N) = 0.47·ln[1 + 2.01·10⁻⁵(MN)^0.75 + 5.31·10⁻¹⁵·M(MN)^1.52] in W m⁻², M and N in ppb. */
export function overlapMyhre(methane: Value, nitrousOxide: Value): Value {
  const both = mul(ppb(methane), ppb(nitrousOxide));
  const root = sqrt(both);
  const weak = product(2.01e-5, root, sqrt(root));
  const strong = product(5.31e-15, ppb(methane), exp(mul(1.52, log(both))));
  return mul(0.47, log(add(add(1, weak), strong)));
}
