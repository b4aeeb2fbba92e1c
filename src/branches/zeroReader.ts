// Reads a function over temperature that has the zeros of N, at parameters.
import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { DoubtKind, ProvedZero } from "../search/enumeration.ts";
import type { EnclosedBalance } from "../states/enclosedBalance.ts";
import { enumerateBalance } from "../states/provedSearch.ts";
import { signAt } from "./criticals.ts";
import type { Branch, BranchEnd, BranchPoint } from "./diagram.ts";

/** What a diagram asks of a loop along one of its givens, the others set. */
export interface ZeroReader {
  /** All states at a parameter. */
  enumerate(parameter: number, within: Range, effort: number): StatesAt;
  /** The sign of N, proved unless the loop is sampled. */
  sign(parameter: number, temperature: number): Sign;
  /** The temperature of a branch at a parameter inside its range; undefined where its state is not found. */
  temperatureOn(branch: Branch, parameter: number): number | undefined;
}

/** The states at a parameter, and what is undecided there. */
export interface StatesAt {
  readonly zeros: readonly { readonly at: number; readonly bracket: Range; readonly slopeSign: Sign }[];
  readonly undecided: readonly { readonly interval: Range; readonly kind: DoubtKind }[];
  readonly boxes: number;
  readonly points: number;
}

/** A function with the zeros of N. */
export interface Alike {
  /** Set to a parameter. */
  at(parameter: number): EnclosedBalance;
  /** The sign of N over that of the function. */
  sign(): Sign;
}

/** Boxes that finding a state on its branch may cost. */
const ON_BRANCH = 200;
/** Relative to the temperature. */
const LEAST_REACH = 1e-9;

/** The reader of a function that has the zeros of N. */
export function zeroReader({ at, sign }: Alike): ZeroReader {
  const signed = (s: Sign): Sign => (s * sign()) as Sign;
  return {
    enumerate(parameter, within, effort) {
      const { zeros, ...rest } = enumerateBalance(at(parameter), within, effort);
      const turned = zeros.map(({ at, bracket, slopeSign }) => {
        return { at, bracket, slopeSign: signed(slopeSign) };
      });
      return { ...rest, zeros: turned };
    },
    sign: (parameter, temperature) => signed(signAt(at(parameter).net, temperature)),
    temperatureOn: (branch, parameter) => zeroOn(at(parameter), branch, { parameter, sign: sign() })?.at,
  };
}

/** The zero on a branch at the parameter to which a function is set; `sign` is that of N over the function. */
export function zeroOn(
  balance: EnclosedBalance,
  branch: Branch,
  { parameter, sign }: { readonly parameter: number; readonly sign: Sign },
): ProvedZero | undefined {
  const { zeros } = enumerateZeros(balance.net, reachOf(branch), { effort: ON_BRANCH });
  // branches of tiles may reach over each other
  const opposite = branch.stability === "stable" ? 1 : branch.stability === "unstable" ? -1 : Number.NaN;
  return nearest(
    zeros.filter(({ slopeSign }) => slopeSign * sign !== opposite),
    branch,
    parameter,
  );
}

/**
 * The temperatures of a branch with the brackets of its ends. Beyond a fold its neighbour begins; on other sides a little more,
 * because a branch may keep its temperature.
 */
export function reachOf({ temperatures: [cold, hot], low, high }: Branch): Range {
  const ends = [low, high];
  const [from, to] = [
    Math.min(cold, ...ends.map((e) => e.temperatureBracket[0])),
    Math.max(hot, ...ends.map((e) => e.temperatureBracket[1])),
  ];
  const slackAt = (side: 0 | 1, x: number): number =>
    ends.some((e) => isTurn(e) && e.temperatureBracket[side] === x) ? 0 : LEAST_REACH * hot;
  return [from - slackAt(0, from), to + slackAt(1, to)];
}

const isTurn = ({ kind }: BranchEnd): boolean => kind === "fold" || kind === "corner" || kind === "leap";

/** The one nearest to where the points of a branch say that it is. */
export function nearest<Z extends { readonly at: number }>(
  zeros: readonly Z[],
  { points }: Branch,
  parameter: number,
): Z | undefined {
  if (zeros.length < 2) return zeros[0];
  const after = Math.max(
    1,
    points.findIndex((p) => p.at >= parameter),
  );
  const [a, b] = [points[after - 1], points[after]] as [BranchPoint, BranchPoint];
  const share = b.at > a.at ? (parameter - a.at) / (b.at - a.at) : 0;
  const guess = a.temperature + share * (b.temperature - a.temperature);
  return zeros.reduce((x, y) => (Math.abs(y.at - guess) < Math.abs(x.at - guess) ? y : x));
}
