// Where the climate goes when a slow change of the parameter passes the end of a stable branch.
import type { Branch, BranchCrossing, BranchEnd, Fold, Jump } from "./diagram.ts";

/** The temperature of a branch at a parameter inside its range, if its state is found. */
export type TemperatureOn = (branch: Branch, parameter: number) => number | undefined;

interface Met {
  readonly branches: readonly Branch[];
  readonly folds: readonly Fold[];
  readonly crossings: readonly BranchCrossing[];
}

interface Lost {
  readonly end: BranchEnd;
  readonly to: Jump["to"];
  readonly leaves: Jump["leaves"];
}

/**
 * The jumps of all stable branches; where two branches cross the climate goes on along the one that is stable. Beyond a fold N has one sign up to the next state: where the branch lost its state to a
 * warmer neighbour, nothing cools the planet any more, and it warms; where to a cooler one, it cools.
 */
export function jumpsOf({ branches, folds, crossings }: Met, temperatureOn: TemperatureOn): Jump[] {
  const known = new Map<string, Lost | undefined>();
  const lostFrom = (from: number, direction: Jump["direction"]): Lost | undefined => {
    const key = `${direction} ${from}`;
    if (!known.has(key)) known.set(key, landing(from, direction));
    return known.get(key);
  };
  const landing = (from: number, direction: Jump["direction"]): Lost | undefined => {
    const branch = branches[from] as Branch;
    const end = direction === "rise" ? branch.high : branch.low;
    const fold = folds.find((f) => f.branches.includes(from) && f.temperature === end.temperature);
    if (!fold || (end.kind !== "fold" && end.kind !== "corner")) return undefined;
    // the cooler of the two loses its state to a warmer one
    const side = fold.branches[0] === from ? 1 : -1;
    let to: Jump["to"] = null;
    branches.forEach((next, i) => {
      const [low, high] = next.parameters;
      if (fold.branches.includes(i) || !(low <= end.at && end.at <= high)) return;
      const temperature = temperatureOn(next, end.at);
      if (temperature === undefined) return;
      const ahead = side * (temperature - end.temperature) > 0;
      if (ahead && (!to || side * (to.temperature - temperature) > 0))
        to = Object.freeze({ branch: i, temperature });
    });
    return { end, to, leaves: to ? null : side > 0 ? "hotter" : "colder" };
  };
  /** The stable branch behind a crossing in which a branch ends. */
  const onward = (from: number, direction: Jump["direction"]): number | undefined => {
    const [here, beyond] =
      direction === "rise" ? (["below", "above"] as const) : (["above", "below"] as const);
    const crossing = crossings.find((c) => c[here].includes(from));
    return crossing?.[beyond].find((i) => branches[i]?.stability === "stable");
  };
  /** Follows a slow way back from a landing until it meets the branch that was left. */
  const returnOf = (home: number, { to }: Lost, back: Jump["direction"]): number | null => {
    let at = to?.branch;
    for (let i = 0; at !== undefined && i < branches.length; i++) {
      const { low, high }: Branch = branches[at] as Branch;
      const lost = lostFrom(at, back);
      at = lost ? lost.to?.branch : onward(at, back);
      if (at === home) return lost ? lost.end.at : (back === "rise" ? high : low).at;
    }
    return null;
  };
  return branches.flatMap((branch, from) => {
    if (branch.stability !== "stable") return [];
    return (["fall", "rise"] as const).flatMap((direction): Jump[] => {
      const lost = lostFrom(from, direction);
      if (!lost) return [];
      const { end, to, leaves } = lost;
      const { at, atBracket, temperature } = end;
      const returnsAt = returnOf(from, lost, direction === "rise" ? "fall" : "rise");
      return [Object.freeze({ direction, from, at, atBracket, temperature, to, leaves, returnsAt })];
    });
  });
}
