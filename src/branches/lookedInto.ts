// What happens between stretches with as many states on one side as on the other.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { BranchEnd } from "./diagram.ts";
import type { Task } from "./diagramOf.ts";
import type { Column } from "./joinColumns.ts";
import { type Met, meetingOf } from "./meeting.ts";

/** A stretch of parameters with a number of states; `null` where it is not known. */
export interface Counted {
  readonly parameters: Range;
  readonly count: number | null;
}

/** Looks into the stretches between two of the same number of states, where two of them may meet. */
export function lookedInto(
  loop: Loop,
  { name, within, givens }: Task,
  found: readonly Counted[],
  columnAt: (at: number) => Column,
) {
  const met = new Map<number, Met>();
  const folded = new Map<number, BranchEnd>();
  const stretches = found.flatMap((stretch, i): Counted[] => {
    const { parameters, count } = stretch;
    const around = [found[i - 1]?.count ?? null, found[i + 1]?.count ?? null];
    if (count !== null || around[0] === null || around[0] !== around[1]) return [stretch];
    const [before, after] = parameters.map((p) => columnAt(p).states.map((s) => s.temperature)) as [
      number[],
      number[],
    ];
    if (before.length !== around[0] || after.length !== around[0]) return [stretch];
    const meeting = meetingOf(loop, name)({ parameters, before, after }, { within, givens });
    if (!meeting) return [stretch];
    if (meeting.kind === "apart") return [{ parameters, count: around[0] }];
    if (meeting.kind !== "gap") {
      met.set(parameters[0], meeting);
      return [stretch];
    }
    const { at, ends } = meeting;
    folded.set(parameters[0], ends[0]);
    folded.set(at, ends[1]);
    return [
      { parameters: [parameters[0], at], count: null },
      { parameters: [at, at], count: around[0] - 2 },
      { parameters: [at, parameters[1]], count: null },
    ];
  });
  return { stretches, met, folded };
}
