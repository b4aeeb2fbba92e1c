// Which members of two neighbouring lists in order belong together.

/** Pairs of indices that go on, and those without a partner. */
export interface Matched {
  readonly kept: readonly (readonly [number, number])[];
  readonly lost: readonly number[];
  readonly born: readonly number[];
}

/**
 * Joins two lists in the same order. One of the longer list may be left over, at an end; or two neighbours, those without which
 * the others are least apart in all. Where more differ, or what is left is infinitely far apart, nothing is joined.
 */
export function matchOrdered<T>(
  before: readonly T[],
  after: readonly T[],
  apart: (a: T, b: T) => number,
): Matched {
  const grows = after.length > before.length;
  const [longer, shorter] = grows ? [after, before] : [before, after];
  const out = leftOver(longer, shorter, apart);
  if (!out) return { kept: [], lost: before.map((_, i) => i), born: after.map((_, i) => i) };
  const rest = longer.map((_, i) => i).filter((i) => !out.includes(i));
  const kept = rest.map((i, k) => (grows ? ([k, i] as const) : ([i, k] as const)));
  return { kept, lost: grows ? [] : out, born: grows ? out : [] };
}

function leftOver<T>(
  longer: readonly T[],
  shorter: readonly T[],
  apart: (a: T, b: T) => number,
): readonly number[] | undefined {
  const excess = longer.length - shorter.length;
  if (excess === 0) return [];
  if (excess > 2) return undefined;
  // a single one can only have left at an end
  const step = excess === 1 ? Math.max(1, longer.length - 1) : 1;
  let best: readonly number[] | undefined;
  let least = Infinity;
  for (let i = 0; i + excess <= longer.length; i += step) {
    const out = Array.from({ length: excess }, (_, k) => i + k);
    const rest = longer.filter((_, k) => !out.includes(k));
    const moved = rest.reduce((sum, it, k) => sum + apart(it, shorter[k] as T), 0);
    if (moved < least) [best, least] = [out, moved];
  }
  return best;
}
