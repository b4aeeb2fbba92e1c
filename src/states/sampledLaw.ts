// A law given as an ordinary function of numbers.
import type { Ports } from "../graph/card.ts";
import { functionLaw, type SampledLawSpec } from "../law/functionLaw.ts";
import type { Law } from "../law/types.ts";
import { sampling } from "./sampledSearch.ts";

/**
 * Makes a law from an ordinary function, for tables and codes that recordable operations cannot express. Its slope is a
 * central difference quotient, (f(x + h) − f(x − h))/2h with h = 6·10⁻⁶·max(1, |x|), one-sided at an end of a port's
 * range, and is marked so (`card.sampled`). A loop that uses it is searched by sampling, never proved. Ports are single
 * values, in their own units. Throws `unreadable` without ports or `compute`; the law throws what every law throws, and
 * `not-finite` when `compute` gives no finite number.
 */
export function sampledLaw<const I extends Ports>(spec: SampledLawSpec<I>): Law<I> {
  // the search comes with the law, so that a program without such a law does not carry it along
  return functionLaw(spec, sampling);
}
