// The parts of a diagram whose branches are the pieces of one curve p(T).

import { boundsOf, branchesOf } from "./branchesOf.ts";
import type { Critical } from "./criticals.ts";
import type { Curve } from "./curve.ts";
import type { Branch, BranchEnd, Fold, UndecidedStretch } from "./diagram.ts";
import type { Parts, Task } from "./diagramOf.ts";
import { foldAt } from "./foldAt.ts";
import { type Crossing, mergedCrossings, runsOf } from "./runs.ts";
import { isToldAs, settledRun } from "./settledRun.ts";
import { criticalDoubt, crossingDoubt } from "./undecided.ts";
import type { ZeroReader } from "./zeroReader.ts";

/** The branches, folds and doubts along a curve that has its givens set. */
export function partsOnCurve(curve: Curve, task: Task, net: ZeroReader): Parts {
  const { between, within, effort } = task;
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
    ...unknown.map((temperatures) => ({ temperatures, parameters: between, kind: "other" as const })),
  ];
  const branches: Branch[] = [];
  const folds: Fold[] = [];
  const open: Critical[] = [];
  for (const whole of runs) {
    const reach = curve.reachesBeyond ? ([0, 1] as const) : ([1, 0] as const);
    const found = curve.criticals([whole.from.bracket[reach[0]], whole.to.bracket[reach[1]]], left());
    spend(found);
    const { run, inside } = settledRun(whole, found.list);
    const first = branches.length;
    branches.push(...branchesOf(curve, run, inside, task));
    inside.forEach((critical, i) => {
      if (critical.decided) folds.push(foldBetween(branches, [first + i, first + i + 1]));
    });
    open.push(...found.list.filter((critical) => !critical.decided));
  }
  undecided.push(
    ...merged
      .filter(({ doubt, bracket }) => doubt !== "jump" || !isToldAs(open, bracket))
      .flatMap((crossing) => crossingDoubt(crossing, between)),
    ...open.map((critical) => criticalDoubt(critical, boundsOf(curve, critical.bracket, between))),
  );
  for (const { stability, temperatures, parameters } of branches) {
    if (stability === "undecided") undecided.push({ temperatures, parameters, kind: "other" });
  }
  return { method: curve.method, branches, folds, crossings: [], undecided, cost };
}

/** The fold at the end that two branches share. */
export function foldBetween(branches: readonly Branch[], pair: readonly [number, number]): Fold {
  const [cool, warm] = pair.map((i) => branches[i]) as [Branch, Branch];
  const end = (cool.low === warm.low ? cool.low : cool.high) as BranchEnd;
  return foldAt(end, end === cool.low ? "above" : "below", Object.freeze(pair));
}
