// Places in a stretch at which what was proved for all of it is read.
import type { Range } from "../ground/range.ts";

const COLUMNS = 33;

/** Closer together towards the ends, where branches are steep. */
export function placesIn([low, high]: Range): number[] {
  if (low === high) return [low];
  return Array.from({ length: COLUMNS }, (_, i) => {
    const s = (2 * i) / (COLUMNS - 1) - 1;
    const share = 0.5 + (s * (3 - s * s)) / 4;
    return i === COLUMNS - 1 ? high : low + (high - low) * share;
  });
}
