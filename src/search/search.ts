// What the parts of a proved search share.

import type { Sign } from "./enclosed.ts";
import type { ProvedZero } from "./enumeration.ts";
import type { Place, Reader } from "./reader.ts";
import { refineProved } from "./refineProved.ts";
import type { Stretch } from "./stretch.ts";

/** A search under way: what it reads and what it has found, from left to right. */
export interface Search {
  readonly reader: Reader;
  readonly range: readonly [number, number];
  /** A length over which the function changes little; sets how far boxes are halved. */
  readonly fine: number;
  readonly zeros: ProvedZero[];
  readonly doubts: Stretch[];
}

/** Adds the zero between two places, if their proved signs differ; at most one is known to be there. */
export function addZero(search: Search, left: Place, right: Place, slope: Sign): void {
  if (left.sign !== right.sign) search.zeros.push(refineProved(search.reader, left, right, slope));
}
