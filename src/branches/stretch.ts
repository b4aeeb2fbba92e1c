// A narrow stretch of parameters in which the number of states changes, and what its proofs share.
import type { Range } from "../ground/range.ts";
import { roundoffAt } from "../search/roundoff.ts";
import type { BranchEnd } from "./diagram.ts";

/** A stretch, the temperatures of the one or two states that one side has and the other not, and how many go on. */
export interface Stretch {
  readonly parameters: Range;
  readonly temperatures: readonly number[];
  readonly others: number;
  readonly within: Range;
  readonly givens: readonly number[];
}

/** True if exactly `others` states are proved outside of a range of temperature for all parameters of a stretch. */
export type Rest = (stretch: Stretch, except: Range) => boolean;

/** How far a box reaches beyond the two states that meet in it, as a share of their distance. */
export const REACH = 1;
/** Boxes that a search along one line may cost. */
export const LINE_EFFORT = 200;

export const middleOf = (r: Range): number => r[0] + (r[1] - r[0]) / 2;

/** Where and how the branches of a stretch end. */
export const endOf = (
  kind: BranchEnd["kind"],
  temperatures: Range,
  parameters: Range,
  temperature = middleOf(temperatures),
  at = middleOf(parameters),
): BranchEnd =>
  Object.freeze({
    ...{ kind, at, temperature },
    atBracket: Object.freeze([parameters[0], parameters[1]] as const),
    temperatureBracket: Object.freeze([temperatures[0], temperatures[1]] as const),
  });

/** The nearest place on a side where something is proved; at last the end of the range, where it is known. */
export function nearestProved(
  at: number,
  side: 1 | -1,
  [low, high]: Range,
  proved: (x: number) => boolean,
): number {
  let gap = roundoffAt(at);
  for (let x = at + side * gap; x > low && x < high; gap *= 4, x = at + side * gap) if (proved(x)) return x;
  return side > 0 ? high : low;
}
