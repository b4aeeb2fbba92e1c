// Where the climate goes when a slow change of the parameter passes the end of a stable branch.
import type { Branch, BranchEnd, Jump } from "./diagram.ts";

/** The temperature of a branch at a parameter inside its range. */
export type TemperatureOn = (branch: Branch, parameter: number) => number;

type Landing = Pick<Jump, "to" | "leaves">;
type Step = Landing & { readonly end: BranchEnd };

/**
 * The jumps of all stable branches. Beyond a fold N has one sign up to the next state: where the branch lost its state to a
 * warmer neighbour, nothing cools the planet any more, and it warms; where to a cooler one, it cools.
 */
export function jumpsOf(branches: readonly Branch[], temperatureOn: TemperatureOn): Jump[] {
  const jumps: Jump[] = [];
  branches.forEach((branch, from) => {
    if (branch.stability !== "stable") return;
    for (const direction of ["fall", "rise"] as const) {
      const step = stepFrom(branches, from, direction, temperatureOn);
      if (!step) continue;
      const { end, to, leaves } = step;
      const { at, atBracket, temperature } = end;
      const returnsAt = to ? returnOf(branches, from, { to, direction }, temperatureOn) : null;
      jumps.push(Object.freeze({ direction, from, at, atBracket, temperature, to, leaves, returnsAt }));
    }
  });
  return jumps;
}

/** What happens at the end of a branch in a direction; undefined where it does not end in a fold or corner. */
function stepFrom(
  branches: readonly Branch[],
  from: number,
  direction: Jump["direction"],
  temperatureOn: TemperatureOn,
): Step | undefined {
  const branch = branches[from] as Branch;
  const end = direction === "rise" ? branch.high : branch.low;
  if (end.kind !== "fold" && end.kind !== "corner") return undefined;
  const side = end.temperature >= branch.temperatures[1] ? 1 : -1;
  // past the neighbour that ends in the same fold
  for (let i = from + 2 * side; i >= 0 && i < branches.length; i += side) {
    const next = branches[i] as Branch;
    if (!(next.parameters[0] <= end.at && end.at <= next.parameters[1])) continue;
    const to = Object.freeze({ branch: i, temperature: temperatureOn(next, end.at) });
    return { end, to, leaves: null };
  }
  return { end, to: null, leaves: side > 0 ? "hotter" : "colder" };
}

/** Follows a slow way back from a landing until it meets the branch that was left. */
function returnOf(
  branches: readonly Branch[],
  home: number,
  { to, direction }: { to: { readonly branch: number }; direction: Jump["direction"] },
  temperatureOn: TemperatureOn,
): number | null {
  const back = direction === "rise" ? "fall" : "rise";
  let at = to.branch;
  for (let i = 0; i < branches.length; i++) {
    const step = stepFrom(branches, at, back, temperatureOn);
    if (!step?.to) return null;
    at = step.to.branch;
    if (at === home) return step.end.at;
  }
  return null;
}
