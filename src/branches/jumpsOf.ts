// Where the climate goes when a slow change of the parameter passes the end of a stable branch.
import { holds } from "../ground/range.ts";
import type { Branch, BranchCrossing, BranchEnd, Fold, Jump, UndecidedStretch } from "./diagram.ts";
import type { ZeroReader } from "./zeroReader.ts";

interface Met {
  readonly branches: readonly Branch[];
  readonly folds: readonly Fold[];
  readonly crossings: readonly BranchCrossing[];
  readonly undecided: readonly UndecidedStretch[];
}

type Returning = Pick<Jump, "returnsAt" | "noReturn">;

interface Lost {
  readonly end: BranchEnd;
  readonly to: Jump["to"];
  readonly leaves: Jump["leaves"];
}

/**
 * The jumps of all stable branches; where two branches cross the climate goes on along the one that is stable. Beyond a fold N
 * has one sign up to the next state: where the branch lost its state to a warmer neighbour, nothing cools the planet any more,
 * and it warms; where to a cooler one, it cools.
 */
export function jumpsOf(
  { branches, folds, crossings, undecided }: Met,
  { temperatureOn, sign }: Pick<ZeroReader, "temperatureOn" | "sign">,
): Jump[] {
  const known = new Map<string, Lost | undefined>();
  const lostFrom = (from: number, direction: Jump["direction"]): Lost | undefined => {
    const key = `${direction} ${from}`;
    if (!known.has(key)) known.set(key, landing(from, direction));
    return known.get(key);
  };
  const landing = (from: number, direction: Jump["direction"]): Lost | undefined => {
    const branch = branches[from] as Branch;
    const end = direction === "rise" ? branch.high : branch.low;
    const edge = end.kind === "leap" ? leapEdge(branch, from, { end, sign }) : foldEdge(folds, from, end);
    if (!edge) return undefined;
    const { side, lost } = edge;
    const isAhead = (temperature: number): boolean => side * (temperature - end.temperature) > 0;
    /** Temperatures at which something on the way may hold the climate, though it is not known that it does. */
    const doubts = undecided
      .filter((u) => holds(u.parameters, end.at) && u.temperatures[0] !== end.temperatureBracket[0])
      .map((u) => u.temperatures);
    let to: Jump["to"] = null;
    branches.forEach((next, i) => {
      if (lost.includes(i) || !holds(next.parameters, end.at)) return;
      const temperature = temperatureOn(next, end.at);
      if (temperature === undefined) doubts.push(next.temperatures);
      else if (isAhead(temperature) && (!to || side * (to.temperature - temperature) > 0))
        to = Object.freeze({ branch: i, temperature });
    });
    const goal = (to as Jump["to"])?.temperature ?? side * Infinity;
    if (
      doubts.some(
        ([low, high]) => isAhead(side > 0 ? high : low) && side * (goal - (side > 0 ? low : high)) > 0,
      )
    )
      return { end, to: null, leaves: null };
    return { end, to, leaves: to ? null : side > 0 ? "hotter" : "colder" };
  };
  /** The stable branch behind a crossing in which a branch ends. */
  const onward = (from: number, direction: Jump["direction"]): number | undefined => {
    const [here, beyond] =
      direction === "rise" ? (["below", "above"] as const) : (["above", "below"] as const);
    const crossing = crossings.find((c) => c[here].includes(from));
    return crossing?.[beyond].find((i) => branches[i]?.stability === "stable");
  };
  /** Follows a slow way back from a landing until it meets the branch that was left, or the end of the parameter's range. */
  const returnOf = (home: number, { to }: Lost, back: Jump["direction"]): Returning => {
    let at = to?.branch;
    for (let i = 0; at !== undefined && i < branches.length; i++) {
      const { low, high }: Branch = branches[at] as Branch;
      const end = back === "rise" ? high : low;
      const lost = lostFrom(at, back);
      at = lost ? lost.to?.branch : onward(at, back);
      if (at === home) return { returnsAt: lost ? lost.end.at : end.at, noReturn: false };
      if (at === undefined && !lost && end.kind === "between") return { returnsAt: null, noReturn: true };
    }
    return { returnsAt: null, noReturn: false };
  };
  return branches.flatMap((branch, from) => {
    if (branch.stability !== "stable") return [];
    return (["fall", "rise"] as const).flatMap((direction): Jump[] => {
      const lost = lostFrom(from, direction);
      if (!lost) return [];
      const { end, to, leaves } = lost;
      const { at, atBracket, temperature } = end;
      const returning = returnOf(from, lost, direction === "rise" ? "fall" : "rise");
      return [Object.freeze({ direction, from, at, atBracket, temperature, to, leaves, ...returning })];
    });
  });
}

/** What a state meets where it is lost: the side on which N drives it away, and the branches that end there. */
interface Edge {
  readonly side: 1 | -1;
  readonly lost: readonly number[];
}

function foldEdge(folds: readonly Fold[], from: number, end: BranchEnd): Edge | undefined {
  const fold = folds.find((f) => f.branches.includes(from) && f.temperature === end.temperature);
  if (!fold || (end.kind !== "fold" && end.kind !== "corner")) return undefined;
  // the cooler of the two loses its state to a warmer one
  return { side: fold.branches[0] === from ? 1 : -1, lost: fold.branches };
}

/** A leap that drives the state on: beyond it N goes on with the sign that drives the state there. Otherwise N holds the climate. */
function leapEdge(
  { temperatures }: Branch,
  from: number,
  { end, sign }: { readonly end: BranchEnd; readonly sign: ZeroReader["sign"] },
): Edge | undefined {
  const side = end.temperature === temperatures[1] ? 1 : -1;
  const beyond = end.temperatureBracket[side > 0 ? 1 : 0];
  return sign(end.at, beyond) === side ? { side, lost: [from] } : undefined;
}
