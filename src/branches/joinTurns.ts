// Joins the turns of columns into fold curves.
import type { Range } from "../ground/range.ts";
import type { BranchEnd } from "./diagram.ts";
import type { FoldCurveEnd } from "./foldDiagram.ts";
import { matchTurns } from "./matchTurns.ts";
import type { TurnPassage } from "./turnPassage.ts";
import type { Turn } from "./turns.ts";

/** The turns at one value of the second given, by rising temperature. */
export interface TurnColumn {
  readonly and: number;
  readonly turns: readonly Turn[];
}

/** Where a curve ends. */
export interface TurnEnd {
  readonly kind: FoldCurveEnd;
  readonly and: number;
  readonly temperature: number;
}

/** A turn that moves with the second given. */
export interface TurnCurve extends Pick<Turn, "kind" | "direction"> {
  /** By rising second given, ends not counted. */
  readonly points: { readonly and: number; readonly temperature: number }[];
  readonly low: TurnEnd;
  high: TurnEnd;
}

/** A place at which two curves end. */
export interface TurnMeeting {
  readonly end: BranchEnd;
  /** `below`: both are there at lower values of the second given; `change`: one below and the other above. */
  readonly exists: "below" | "above" | "change";
  readonly curves: readonly TurnCurve[];
}

/** What was joined: curves by rising temperature, the places where two end, and the stretches in which that is proved. */
export interface JoinedTurns {
  readonly curves: readonly TurnCurve[];
  readonly meetings: readonly TurnMeeting[];
  readonly proved: ReadonlySet<number>;
}

/** Curves of groups of columns, by rising second given; the turns of a group have the same kinds throughout. */
export function joinTurns(
  groups: readonly (readonly TurnColumn[])[],
  passage: TurnPassage,
  between: Range,
): JoinedTurns {
  const curves: TurnCurve[] = [];
  const meetings: TurnMeeting[] = [];
  const proved = new Set<number>();
  const start = ({ and }: TurnColumn, { kind, direction, temperature }: Turn, low?: TurnEnd): TurnCurve => {
    const open: TurnEnd = { kind: "undecided", and, temperature };
    const curve = { kind, direction, points: [{ and, temperature }], low: low ?? open, high: open };
    curves.push(curve);
    return curve;
  };
  const outer = (and: number, limit: number, { temperature }: Turn): TurnEnd => ({
    ...{ kind: and === limit ? "between" : "undecided", and, temperature },
  });
  const grow = ({ points }: TurnCurve, { and }: TurnColumn, { temperature }: Turn): void => {
    points.push({ and, temperature });
  };

  /** The curves behind a stretch between two groups. */
  const passed = (left: readonly TurnCurve[], from: TurnColumn, to: TurnColumn): TurnCurve[] => {
    const matched = matchTurns(from.turns, to.turns);
    const { kept, changed, lost, born } = matched;
    const parameters: Range = [from.and, to.and];
    const changes = changed.length + lost.length + born.length > 0;
    const end = changes ? passage({ parameters, before: from.turns, after: to.turns, matched }) : undefined;
    if (end) proved.add(from.and);
    const right: TurnCurve[] = [];
    for (const [i, j] of kept) {
      right[j] = left[i] as TurnCurve;
      grow(right[j], to, to.turns[j] as Turn);
    }
    const endAs = (kind: FoldCurveEnd, turn: Turn, and: number): TurnEnd =>
      end
        ? { kind, and: end.at, temperature: end.temperature }
        : { kind: "undecided", and, temperature: turn.temperature };
    const ended: TurnCurve[] = [];
    const stop = (i: number, kind: FoldCurveEnd): void => {
      const curve = left[i] as TurnCurve;
      curve.high = endAs(kind, from.turns[i] as Turn, from.and);
      ended.push(curve);
    };
    const begin = (j: number, kind: FoldCurveEnd): void => {
      const turn = to.turns[j] as Turn;
      right[j] = start(to, turn, endAs(kind, turn, to.and));
      ended.push(right[j]);
    };
    for (const [i, j] of changed) {
      stop(i, (to.turns[j] as Turn).kind);
      begin(j, (from.turns[i] as Turn).kind);
    }
    const kind = end?.kind === "within" ? "within" : "cusp";
    for (const i of lost) stop(i, kind);
    for (const j of born) begin(j, kind);
    if (end && ended.length === 2) {
      const exists = changed.length > 0 ? "change" : lost.length > 0 ? "below" : "above";
      meetings.push({ end, exists, curves: ended });
    }
    return right;
  };

  let open: TurnCurve[] = [];
  let before: TurnColumn | undefined;
  for (const group of groups) {
    const [first, ...rest] = group as readonly [TurnColumn, ...TurnColumn[]];
    open = before
      ? passed(open, before, first)
      : first.turns.map((turn) => start(first, turn, outer(first.and, between[0], turn)));
    for (const column of rest)
      for (const [i, curve] of open.entries()) grow(curve, column, column.turns[i] as Turn);
    before = group.at(-1);
  }
  for (const [i, curve] of open.entries())
    curve.high = outer((before as TurnColumn).and, between[1], before?.turns[i] as Turn);
  const coldest = new Map(curves.map((c) => [c, Math.min(...c.points.map((p) => p.temperature))]));
  curves.sort((a, b) => (coldest.get(a) as number) - (coldest.get(b) as number));
  return { curves, meetings, proved };
}
