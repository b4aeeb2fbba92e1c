// The proved search: every equilibrium in a range of temperature, each enclosed, and proof that there is no other.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import { above, below } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { Enumeration, ProvedZero } from "../search/enumeration.ts";
import { type EnclosedBalance, enclosedBalance } from "./enclosedBalance.ts";
import { foldDistances } from "./foldDistances.ts";
import type { Located, StateSearch } from "./located.ts";
import type { State } from "./state.ts";

/** Boxes that finding the place of one kink may cost; a kink that is not found only makes the search longer. */
const KINK_EFFORT = 60;

/** Prepares the proved search of a loop. Its effort is a number of boxes. */
export function provedSearch(loop: Loop): StateSearch {
  const balance = enclosedBalance(loop);
  const distancesOf = foldDistances(loop);
  return (givens, within, effort) => {
    balance.set(givens, givens);
    const { zeros, undecided, boxes, points } = enumerateBalance(balance, within, effort);
    return {
      located: zeros.map((zero) => locate(balance, zero)),
      undecided: undecided.map(({ interval, kind, counts, enclosure }) => ({
        interval,
        kind,
        counts,
        enclosure: enclosure.every(Number.isFinite) ? enclosure : null,
        distances: kind === "fold" || kind === "corner" ? distancesOf(givens, { interval, enclosure }) : null,
      })),
      cost: { boxes, points },
    };
  };
}

/** Enumerates the zeros of a balance whose givens are set; the range is cut at both ends of each kink's bracket first. */
export function enumerateBalance(
  { net, kinks }: EnclosedBalance,
  within: Range,
  effort: number,
): Enumeration {
  const cuts: number[] = [];
  for (const kink of kinks) {
    for (const { bracket } of enumerateZeros(kink, within, { effort: KINK_EFFORT }).zeros)
      cuts.push(...bracket);
  }
  return enumerateZeros(net, within, { effort, cuts });
}

const values = /* @__PURE__ */ new Float64Array(9);
const STABILITY: Readonly<Record<number, State["stability"]>> = {
  [-1]: "stable",
  0: "undecided",
  1: "unstable",
};

/** Bounds of N at the temperature and of λ over the bracket. */
export function locate(
  { net }: Pick<EnclosedBalance, "net">,
  { at, bracket, slopeSign }: ProvedZero,
): Located {
  const value = (i: number) => values[i] as number;
  net.point(at, values);
  const imbalance = above(Math.max(value(2) - value(0), value(1) + value(2)));
  const lambda = value(3) + (value(4) - value(3)) / 2;
  net.box(bracket[0], bracket[1], values);
  const slope: Range = [below(value(3) - value(5)), above(value(4) + value(5))];
  return { at, bracket, stability: STABILITY[slopeSign] ?? "undecided", lambda, slope, imbalance };
}
