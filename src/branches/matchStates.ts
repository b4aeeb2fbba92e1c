// Which states of two neighbouring columns belong together.

/** Pairs of indices that go on, and those without a partner. */
export interface Matched {
  readonly kept: readonly (readonly [number, number])[];
  readonly lost: readonly number[];
  readonly born: readonly number[];
}

/**
 * Joins temperatures, both by rising order. One or two of the longer list may be left over, neighbours of each other: those
 * without which the others move least. Where more differ, nothing is joined.
 */
export function matchStates(before: readonly number[], after: readonly number[]): Matched {
  const grows = after.length > before.length;
  const [longer, shorter] = grows ? [after, before] : [before, after];
  const out = leftOver(longer, shorter);
  if (!out) return { kept: [], lost: before.map((_, i) => i), born: after.map((_, i) => i) };
  const rest = longer.map((_, i) => i).filter((i) => !out.includes(i));
  const kept = rest.map((i, k) => (grows ? ([k, i] as const) : ([i, k] as const)));
  return { kept, lost: grows ? [] : out, born: grows ? out : [] };
}

function leftOver(longer: readonly number[], shorter: readonly number[]): readonly number[] | undefined {
  const excess = longer.length - shorter.length;
  if (excess > 2) return undefined;
  // a single one can only have left at an end
  const step = excess === 1 ? Math.max(1, longer.length - 1) : 1;
  let best: readonly number[] | undefined;
  let least = Number.POSITIVE_INFINITY;
  for (let i = 0; i + excess <= longer.length; i += step) {
    const out = Array.from({ length: excess }, (_, k) => i + k);
    const rest = longer.filter((_, k) => !out.includes(k));
    const moved = rest.reduce((sum, t, k) => sum + Math.abs(t - (shorter[k] as number)), 0);
    if (moved < least) [best, least] = [out, moved];
    if (excess === 0) break;
  }
  return best;
}
