// A law given as an ordinary function of numbers.
import type { Ports } from "../graph/card.ts";
import { functionLaw, type SampledLawSpec } from "../law/functionLaw.ts";
import type { Law } from "../law/types.ts";
import { sampling } from "./sampledSearch.ts";

/**
 * Makes a law from an ordinary function, for tables and codes that recordable operations cannot express. Its slope is a
 * central difference quotient and is marked so (`card.sampled`), and a loop that uses it is searched by sampling, never
 * proved. Ports are single values. Throws what every law throws; `not-finite` when `compute` gives no finite number.
 */
export function sampledLaw<const I extends Ports>(spec: SampledLawSpec<I>): Law<I> {
  // the search comes with the law, so that a program without such a law does not carry it along
  return functionLaw(spec, sampling);
}
