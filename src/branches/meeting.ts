// What happens in a narrow stretch of parameters with as many states on one side as on the other, two of them close together.
import type { Range } from "../ground/range.ts";
import { kept } from "../loop/kept.ts";
import { enclosedBalance } from "../states/enclosedBalance.ts";
import { crossingFinder } from "./crossingFinder.ts";
import type { Meeting } from "./met.ts";
import { restCounter } from "./passage.ts";
import { saddleFinder } from "./saddleFinder.ts";
import type { Stretch } from "./stretch.ts";

/** The states on both sides of a stretch, by rising temperature. */
export interface Sides {
  readonly parameters: Range;
  readonly before: readonly number[];
  readonly after: readonly number[];
}

/** Two neighbours (the index of the cooler) and how they meet. */
export type Met = Meeting & { readonly index: number };

/** Looks how two states meet, if nothing else happens in the stretch. */
export type MeetingOf = (sides: Sides, task: Pick<Stretch, "within" | "givens">) => Met | undefined;

/** How far a box reaches beyond the states in it, as a share of their distance. */
const REACH = 1;

/** Prepares the proofs for a loop along one of its givens. */
export const meetingOf = /* @__PURE__ */ kept<MeetingOf>((loop, along) => {
  const place = loop.givens.findIndex((g) => g.name === along);
  const rest = restCounter(enclosedBalance(loop, new Set([loop.givens[place]?.node as number])), place);
  const crossing = crossingFinder(loop, place);
  const saddle = saddleFinder(loop, place);
  return ({ parameters, before, after }, { within, givens }) => {
    const others = before.length - 2;
    for (const { index, box } of pairs(before, after)) {
      if (!(box[0] > within[0] && box[1] < within[1])) continue;
      if (!rest({ parameters, temperatures: [], others, within, givens }, box)) continue;
      const met = crossing(box, parameters, givens) ?? saddle(box, parameters, givens);
      if (met) return { ...met, index };
    }
    return undefined;
  };
});

/** Neighbours and the box around them on both sides, the closest first. */
function pairs(before: readonly number[], after: readonly number[]) {
  return before
    .slice(1)
    .map((_, index) => {
      const four = [before, after].flatMap((list) => list.slice(index, index + 2));
      const [low, high] = [Math.min(...four), Math.max(...four)];
      const reach = REACH * (high - low);
      return { index, width: high - low, box: [low - reach, high + reach] as const };
    })
    .sort((a, b) => a.width - b.width);
}
