// The parts of a diagram without a curve: states in columns of one parameter each, joined where their number is constant.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import { proveCount } from "../states/proveCount.ts";
import type { BranchEnd, UndecidedStretch } from "./diagram.ts";
import type { Parts, Task } from "./diagramOf.ts";
import { fixedGivens } from "./fixedGivens.ts";
import { goesOnOf } from "./goesOn.ts";
import { type Change, type Column, joinColumns } from "./joinColumns.ts";
import { type Counted, lookedInto } from "./lookedInto.ts";
import type { Met } from "./meeting.ts";
import type { NetReader } from "./netReader.ts";
import { passageOf } from "./passage.ts";
import { placesIn } from "./placesIn.ts";
import { middleOf } from "./stretch.ts";

const SAMPLES = 200;
/** What the states of one column may cost. */
const COLUMN_EFFORT = 2000;

/**
 * Proves the number of states over tiles of the parameter's range (or samples it, for a loop that cannot be enclosed) and
 * joins the states of each tile into branches: where their number is proved they never meet, so they keep their order. In
 * the narrow stretches between, a fold, a crossing or a state that leaves the range is proved, or the stretch is undecided.
 */
export function partsInColumns(loop: Loop, task: Task, net: NetReader): Parts {
  const { within, givens } = task;
  const { stretches: found, cost } = loop.sampled ? sampledStretches(task, net) : provedStretches(loop, task);
  const columnAt = (at: number): Column => {
    const { zeros, boxes, points } = net.enumerate(at, within, COLUMN_EFFORT);
    cost.boxes += boxes;
    cost.points += points;
    const states = zeros.map(({ at: temperature, slopeSign: sign }) => {
      return { at, temperature, feedbackParameter: 0 + net.feedback(at, temperature), sign };
    });
    return { at, states };
  };
  const { stretches, met, folded } = loop.sampled
    ? { stretches: found, met: new Map<number, Met>(), folded: new Map<number, BranchEnd>() }
    : lookedInto(loop, task, found, columnAt);
  const groups = stretches.flatMap(({ parameters, count }) => {
    if (count === null) return [];
    const columns = placesIn(parameters).map(columnAt);
    return [columns.filter((c) => c.states.length === count)].filter((group) => group.length > 0);
  });
  const proved = new Set<number>();
  const endOf = (change: Change) => {
    const end = loop.sampled
      ? sampledEnd(change, within)
      : (folded.get(change.parameters[0]) ?? passageOf(loop, task.name)({ ...change, within, givens }));
    if (end) proved.add(change.parameters[0]);
    return end;
  };
  const metIn = ([from]: Range) => {
    const meeting = met.get(from);
    if (meeting?.kind === "crossing") proved.add(from);
    return meeting?.kind === "crossing" || meeting?.kind === "near" ? meeting : undefined;
  };
  const counted = (parameters: Range) => ({ temperatures: within, parameters, kind: "count" as const });
  /** A stretch in whose middle nothing is undecided but one leap of the balance through zero. */
  const leapIn = (parameters: Range): UndecidedStretch | undefined => {
    const { undecided } = net.enumerate(middleOf(parameters), within, COLUMN_EFFORT);
    const [leap, ...others] = undecided;
    return leap?.kind === "jump" && others.length === 0
      ? { temperatures: leap.interval, parameters, kind: "jump" }
      : undefined;
  };
  const goesOn = loop.sampled ? () => true : goesOnOf(loop, task);
  const { branches, folds, crossings } = joinColumns(groups, { endOf, metIn, goesOn }, task.between);
  const undecided = stretches
    .filter(({ count, parameters }) => count === null && !proved.has(parameters[0]))
    .map(({ parameters }): UndecidedStretch => {
      const meeting = met.get(parameters[0]);
      if (meeting?.kind !== "near")
        return loop.sampled ? counted(parameters) : (leapIn(parameters) ?? counted(parameters));
      return { temperatures: meeting.end.temperatureBracket, parameters, kind: "transcritical" };
    });
  return { method: loop.sampled ? "samples" : "tiles", branches, folds, crossings, undecided, cost };
}

function provedStretches(loop: Loop, { name, givens, between, within, effort }: Task) {
  const at = fixedGivens(loop, name, givens);
  const { tiles, cost } = proveCount(loop, { within, over: { [name]: between }, at, effort });
  const stretches = tiles.map(({ over, count }): Counted => ({ parameters: over[name] as Range, count }));
  return { stretches, cost: { ...cost } };
}

function sampledStretches({ between: [low, high], within }: Task, net: NetReader) {
  const cost = { boxes: 0, points: 0 };
  const stretches: Counted[] = [];
  for (let i = 0; i <= SAMPLES; i++) {
    const at = i === SAMPLES ? high : low + ((high - low) * i) / SAMPLES;
    const { zeros, points } = net.enumerate(at, within, COLUMN_EFFORT);
    cost.points += points;
    const last = stretches.at(-1);
    if (last?.count === zeros.length)
      stretches[stretches.length - 1] = { ...last, parameters: [last.parameters[0], at] };
    else {
      if (last) stretches.push({ parameters: [last.parameters[1], at], count: null });
      stretches.push({ parameters: [at, at], count: zeros.length });
    }
  }
  return { stretches, cost };
}

/** What two samples tell: two states meet somewhere between, one leaves the range. */
function sampledEnd({ parameters, temperatures }: Change, within: Range) {
  const [first, second] = temperatures as [number, number?];
  const at = parameters[0] + (parameters[1] - parameters[0]) / 2;
  const edge = first - within[0] < within[1] - first ? within[0] : within[1];
  const [low, high] = second === undefined ? [Math.min(first, edge), Math.max(first, edge)] : [first, second];
  return Object.freeze({
    kind: second === undefined ? ("within" as const) : ("fold" as const),
    ...{ at, atBracket: Object.freeze(parameters) },
    temperature: second === undefined ? edge : (first + second) / 2,
    temperatureBracket: Object.freeze([low, high] as const),
  });
}
