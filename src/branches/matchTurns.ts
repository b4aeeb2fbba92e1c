// Which turns of a curve at two neighbouring values of the second given belong together.
import { type Matched, matchOrdered } from "./matchOrdered.ts";
import type { Turn } from "./turns.ts";

/** Those that go on as what they are, and pairs of indices that change their kind. */
export interface MatchedTurns extends Matched {
  readonly changed: readonly (readonly [number, number])[];
}

/** Joins turns, both by rising temperature. Where one or two are left over, the kinds of the others agree. */
export function matchTurns(before: readonly Turn[], after: readonly Turn[]): MatchedTurns {
  const { kept: pairs, lost, born } = matchOrdered(before, after, apart);
  const isSame = ([i, j]: readonly [number, number]) => before[i]?.kind === after[j]?.kind;
  return { kept: pairs.filter(isSame), changed: pairs.filter((pair) => !isSame(pair)), lost, born };
}

const apart = (a: Turn, b: Turn): number =>
  a.kind === b.kind ? Math.abs(a.temperature - b.temperature) : Infinity;
