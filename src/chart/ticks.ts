// Round places on an axis.
import type { Range } from "../ground/range.ts";
import { numeral } from "./wording.ts";

/** A place on an axis and what is written there. */
export interface Tick {
  readonly at: number;
  readonly text: string;
}

/** Multiples of 1, 2 or 5 times a power of ten in a range: about as many as asked for. */
export function ticksIn([low, high]: Range, about: number): Tick[] {
  const [digits, power] = ((high - low) / about).toExponential().split("e");
  const step = Number(`1e${power}`) * ([1, 2, 5, 10].find((k) => k >= Number(digits)) as number);
  const ticks: Tick[] = [];
  for (let i = Math.ceil(low / step); i * step <= high; i++) {
    // 12 digits: a multiple of a decimal fraction is written as people write it; and no −0
    const at = Number((i * step).toPrecision(12)) + 0;
    ticks.push({ at, text: numeral(at, 12) });
  }
  return ticks;
}
