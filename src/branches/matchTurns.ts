// Which turns of a curve at two neighbouring values of the second given belong together.
import type { Turn } from "./turns.ts";

/** Pairs of indices that go on, those of them that change their kind, and those without a partner. */
export interface Matched {
  readonly kept: readonly (readonly [number, number])[];
  readonly changed: readonly (readonly [number, number])[];
  readonly lost: readonly number[];
  readonly born: readonly number[];
}

/**
 * Joins turns, both by rising temperature. One of the longer list may be left over, at an end; or two neighbours, those without
 * which the kinds agree and the others move least. Where more differ nothing is joined.
 */
export function matchTurns(before: readonly Turn[], after: readonly Turn[]): Matched {
  const grows = after.length > before.length;
  const [longer, shorter] = grows ? [after, before] : [before, after];
  const out = leftOver(longer, shorter);
  const all = (list: readonly Turn[]) => list.map((_, i) => i);
  if (!out) return { kept: [], changed: [], lost: all(before), born: all(after) };
  const pairs = all(longer)
    .filter((i) => !out.includes(i))
    .map((i, k) => (grows ? ([k, i] as const) : ([i, k] as const)));
  const isSame = ([i, j]: readonly [number, number]) => before[i]?.kind === after[j]?.kind;
  const changed = pairs.filter((pair) => !isSame(pair));
  return { kept: pairs.filter(isSame), changed, lost: grows ? [] : out, born: grows ? out : [] };
}

function leftOver(longer: readonly Turn[], shorter: readonly Turn[]): readonly number[] | undefined {
  const excess = longer.length - shorter.length;
  if (excess === 0) return [];
  if (excess > 2) return undefined;
  const step = excess === 1 ? Math.max(1, longer.length - 1) : 1;
  let best: readonly number[] | undefined;
  let least = Number.POSITIVE_INFINITY;
  for (let i = 0; i + excess <= longer.length; i += step) {
    const out = Array.from({ length: excess }, (_, k) => i + k);
    const rest = longer.filter((_, k) => !out.includes(k));
    if (!rest.every((turn, k) => turn.kind === shorter[k]?.kind)) continue;
    const moved = rest.reduce(
      (sum, turn, k) => sum + Math.abs(turn.temperature - (shorter[k] as Turn).temperature),
      0,
    );
    if (moved < least) [best, least] = [out, moved];
  }
  return best;
}
