// Puts a diagram together from a curve.
import { CONSTANT_SET } from "../ground/constants.ts";
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import { type Sign, signOf } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import { enumerateBalance } from "../states/provedSearch.ts";
import { balanceOf } from "./balanceOf.ts";
import { boundsOf, branchesOf } from "./branchesOf.ts";
import { criticalsOf } from "./criticals.ts";
import type { Curve } from "./curve.ts";
import type { Branch, BranchEnd, Diagram, Fold, UndecidedStretch } from "./diagram.ts";
import { gapsOf } from "./gapsOf.ts";
import { jumpsOf } from "./jumpsOf.ts";
import { type Crossing, mergedCrossings, runsOf } from "./runs.ts";
import { criticalDoubt, crossingDoubt, stoppedNote } from "./undecided.ts";

/** A diagram that is asked for. */
export interface Task {
  readonly name: string;
  /** The place of the given among the loop's inputs. */
  readonly place: number;
  readonly givens: readonly number[];
  readonly between: Range;
  readonly within: Range;
  readonly effort: number;
  readonly tolerance: number;
}

/** The diagram of a loop whose curve has its givens set. */
export function diagramOf(loop: Loop, curve: Curve, task: Task): Diagram {
  const { between, within, effort } = task;
  const net = netReader(loop, task);
  const cost = { boxes: 0, points: 0 };
  const spend = ({ boxes, points }: { boxes: number; points: number }) => {
    cost.boxes += boxes;
    cost.points += points;
  };
  const left = () => Math.max(1, effort - cost.boxes);

  const crossings = ([0, 1] as const).flatMap((end) => {
    const found = net.enumerate(between[end], within, left());
    spend(found);
    return [
      ...found.zeros.map(({ at, bracket }): Crossing => ({ end, at, bracket, doubt: null })),
      ...found.undecided.map(({ interval, kind }): Crossing => {
        const at = interval[0] + (interval[1] - interval[0]) / 2;
        return { end, at, bracket: interval, doubt: kind };
      }),
    ];
  });
  const merged = mergedCrossings(crossings);
  const { runs, unknown } = runsOf(merged, within, (t) => [net.sign(between[0], t), net.sign(between[1], t)]);
  const undecided: UndecidedStretch[] = [
    ...merged.flatMap((crossing) => crossingDoubt(crossing, between)),
    ...unknown.map((temperatures) => ({ temperatures, parameters: between, kind: "other" as const })),
  ];

  const branches: Branch[] = [];
  const folds: Fold[] = [];
  for (const run of runs) {
    const found = criticalsOf(curve, [run.from.bracket[0], run.to.bracket[1]], left());
    spend(found);
    const first = branches.length;
    branches.push(...branchesOf(curve, run, found.list, task));
    found.list.forEach((critical, i) => {
      const pair = [first + i, first + i + 1] as const;
      const { decided, bracket } = critical;
      if (decided) folds.push(foldBetween(branches, pair));
      else undecided.push(criticalDoubt(critical, boundsOf(curve, bracket, between)));
    });
  }
  for (const branch of branches) {
    if (branch.stability !== "undecided") continue;
    const { temperatures, parameters } = branch;
    undecided.push({ temperatures, parameters, kind: "other" });
  }

  const complete = undecided.length === 0;
  return Object.freeze({
    along: task.name,
    unit: loop.givens[task.place - loop.variables.length]?.unit ?? "1",
    between: Object.freeze(between),
    within: Object.freeze(within),
    fixed: fixedGivens(loop, task),
    method: curve.method,
    branches: Object.freeze(branches),
    folds: Object.freeze(folds),
    jumps: Object.freeze(jumpsOf(branches, net.temperatureOn)),
    gaps: Object.freeze(
      gapsOf(branches, between, (p) => net.sign(p, within[0] + (within[1] - within[0]) / 2)),
    ),
    undecided: Object.freeze(undecided.map((u) => Object.freeze(u))),
    complete,
    proof: complete ? "proved" : "partial",
    cost: Object.freeze(cost),
    notes: Object.freeze(stoppedNote(undecided)),
    constants: CONSTANT_SET,
  });
}

/** Reads N of a loop at parameters and temperatures. */
function netReader(loop: Loop, { place, givens }: Task) {
  const balance = balanceOf(loop);
  const set = [...givens];
  const out = new Float64Array(9);
  const at = (parameter: number) => {
    set[place - loop.variables.length] = parameter;
    balance.set(set, set);
  };
  return {
    enumerate(parameter: number, within: Range, effort: number) {
      at(parameter);
      return enumerateBalance(balance, within, effort);
    },
    sign(parameter: number, temperature: number): Sign {
      at(parameter);
      balance.net.point(temperature, out);
      return signOf(out[0] as number, out[1] as number, out[2] as number);
    },
    temperatureOn(branch: Branch, parameter: number): number {
      at(parameter);
      const [low, high] = branch.temperatures;
      const [zero] = enumerateZeros(balance.net, [low, high], { effort: 200 }).zeros;
      return zero ? zero.at : low + (high - low) / 2;
    },
  };
}

/** The other givens and their values. */
export const fixedGivens = (loop: Loop, { name, givens }: Pick<Task, "name" | "givens">) =>
  Object.freeze(
    Object.fromEntries(
      loop.givens.flatMap((g, i) => (g.name === name ? [] : [[g.name, givens[i] as number]])),
    ),
  );

function foldBetween(branches: readonly Branch[], pair: readonly [number, number]): Fold {
  const [cool, warm] = pair.map((i) => branches[i]) as [Branch, Branch];
  const shared = [cool.low, cool.high].find((e) => e === warm.low || e === warm.high);
  const end = (shared ?? sameEnd(cool, warm)) as BranchEnd;
  const { at, atBracket, temperature, temperatureBracket } = end;
  const exists = end === cool.low ? "above" : "below";
  const kind = end.kind as Fold["kind"];
  return Object.freeze({ kind, at, atBracket, temperature, temperatureBracket, exists, branches: pair });
}

const sameEnd = (cool: Branch, warm: Branch): BranchEnd | undefined =>
  [cool.low, cool.high].find((e) => e.temperature === warm.temperatures[0]);
