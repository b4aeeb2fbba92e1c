// The folds in two givens of a loop whose budget is a straight line in the first.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import { signOfRange } from "../search/interval.ts";
import type { Branch, BranchEnd } from "./diagram.ts";
import type { Task } from "./diagramOf.ts";
import type { Cusp, FoldCurve, FoldCurveEnd, FoldDiagram, FoldPoint, UndecidedFolds } from "./foldDiagram.ts";
import type { FoldedLoop } from "./foldedLoop.ts";
import { netReader } from "./netReader.ts";
import { partsInColumns } from "./partsInColumns.ts";
import { planeReader } from "./planeReader.ts";
import { signOnParts } from "./signOnParts.ts";

/** What was found. */
export type FoldParts = Pick<
  FoldDiagram,
  "curves" | "cusps" | "touches" | "changes" | "undecided" | "cost" | "method"
>;

/**
 * The folds are the states of a balance of their own, λ(T, q) = 0 on the curve p(T), and their cusps are its folds. The task is
 * that of the second given.
 */
export function foldsOnLine(loop: Loop, line: FoldedLoop, task: Task): FoldParts {
  const { folded, read } = line;
  const { place, givens } = task;
  const parts = partsInColumns(folded, task, netReader(folded, place, givens));
  const readAt = (temperature: number, and: number) =>
    read([temperature, ...givens.map((v, i) => (i === place ? and : v))]);
  const point = ({ at: and, temperature }: { at: number; temperature: number }): FoldPoint =>
    Object.freeze({ at: readAt(temperature, and).at, and, temperature });
  const curves = parts.branches.map((branch): FoldCurve => {
    const middle = branch.points[Math.floor(branch.points.length / 2)] as Branch["points"][number];
    // along the curve p' = -lambda/N_p, so p'' = -lambda'/N_p at a fold
    const { answer } = readAt(middle.temperature, middle.at);
    const exists = -middle.feedbackParameter / answer > 0 ? "above" : "below";
    const ends = [endName(branch.low), endName(branch.high)] as const;
    const points = Object.freeze(branch.points.map(point));
    return Object.freeze({
      kind: "fold",
      exists,
      range: branch.parameters,
      ends: Object.freeze(ends),
      points,
    });
  });
  const cusps = parts.folds.map((fold): Cusp => {
    const { atBracket: andBracket, temperatureBracket, exists, branches } = fold;
    return Object.freeze({ ...point(fold), andBracket, temperatureBracket, exists, curves: branches });
  });
  const undecided = parts.undecided.map(({ parameters, temperatures, kind }): UndecidedFolds => {
    const known = kind === "jump" || kind === "transcritical";
    return { and: parameters, temperatures, kind: known ? kind : "count" };
  });
  if (!loop.sampled && !hasCurve(loop, line, task))
    undecided.push({ and: task.between, temperatures: task.within, kind: "undefined" });
  return { method: "line", curves, cusps, touches: [], changes: [], undecided, cost: parts.cost };
}

function endName({ kind }: BranchEnd): FoldCurveEnd {
  if (kind === "leap") return "undecided";
  return kind === "fold" || kind === "corner" ? "cusp" : kind;
}

/** Whether p = −a/b has a value: where b moves with temperature λ is read with it, elsewhere b must not vanish. */
function hasCurve(
  loop: Loop,
  { answer, answerMoves }: FoldedLoop,
  { place, givens, between, within }: Task,
): boolean {
  if (answerMoves) return true;
  const reader = planeReader(loop, [place], [answer]);
  reader.set(givens);
  return signOnParts(between, (part) => signOfRange(reader.over(within, part)[0] as Range)) !== 0;
}
