// Joins the states of columns into branches.

import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import type { Branch, BranchCrossing, BranchEnd, BranchPoint, Fold } from "./diagram.ts";
import { foldAt } from "./foldAt.ts";
import type { GoesOn } from "./goesOn.ts";
import { matchOrdered } from "./matchOrdered.ts";

/** The states at one parameter, by rising temperature. */
export interface Column {
  readonly at: number;
  readonly states: readonly (BranchPoint & { readonly sign: Sign })[];
}

/** What is known of the stretch between two columns in which the number of states changes. */
export interface Change {
  readonly parameters: Range;
  /** Temperatures of the states that one side has and the other not, on that side. */
  readonly temperatures: readonly number[];
  /** How many states go on. */
  readonly others: number;
}

/** The common end of the branches that are lost or born in a stretch; undefined where it is not proved. */
export type EndOf = (change: Change) => BranchEnd | undefined;

/** Where two branches meet and four end, in a stretch with as many states on both sides; undefined where none is known. */
export type MetIn = (parameters: Range) => { readonly index: number; readonly end: BranchEnd } | undefined;

/** A branch while it grows to the right. */
interface Growing {
  readonly points: (BranchPoint & { readonly sign: Sign })[];
  readonly low: BranchEnd;
  high?: BranchEnd;
}

/** What is proved of the stretches between groups of columns. */
export interface Between {
  readonly endOf: EndOf;
  readonly metIn: MetIn;
  readonly goesOn: GoesOn;
}

/** Branches and folds of groups of columns, by rising parameter; the number of states is constant in each group. */
export function joinColumns(
  groups: readonly (readonly Column[])[],
  { endOf, metIn, goesOn }: Between,
  between: Range,
): { branches: Branch[]; folds: Fold[]; crossings: BranchCrossing[] } {
  const all: Growing[] = [];
  const crossed: { end: BranchEnd; below: readonly Growing[]; above: readonly Growing[] }[] = [];
  const pairs: { end: BranchEnd; exists: Fold["exists"]; pair: readonly Growing[] }[] = [];
  const start = ({ states }: Column, i: number, low: BranchEnd): Growing => {
    const grown = { points: [states[i] as Growing["points"][number]], low };
    all.push(grown);
    return grown;
  };
  let open: Growing[] = [];
  let before: Column | undefined;
  for (const columns of groups) {
    const [first, ...rest] = columns as readonly [Column, ...Column[]];
    if (before) open = passed(open, before, first);
    else open = first.states.map((s, i) => start(first, i, outerEnd(s, [between[0], s.at])));
    for (const { states } of rest)
      for (const [i, { points }] of open.entries()) points.push(states[i] as Growing["points"][number]);
    before = columns.at(-1);
  }
  for (const grown of open) {
    const last = grown.points.at(-1) as BranchPoint;
    grown.high = outerEnd(last, [last.at, between[1]]);
  }

  /** The branches that are open behind a stretch. */
  function passed(left: readonly Growing[], from: Column, to: Column): Growing[] {
    const parameters: Range = [from.at, to.at];
    const temperaturesOf = ({ states }: Column) => states.map((s) => s.temperature);
    const { kept, lost, born } = matchOrdered(temperaturesOf(from), temperaturesOf(to), (a, b) =>
      Math.abs(a - b),
    );
    const others = kept.length;
    const met = lost.length + born.length === 0 ? metIn(parameters) : undefined;
    const meets = (i: number) => met !== undefined && (i === met.index || i === met.index + 1);
    let isProved = met !== undefined;
    const endsOf = (which: readonly number[], { states }: Column): BranchEnd[] => {
      const gone = which.map((i) => states[i] as BranchPoint);
      const temperatures = gone.map((s) => s.temperature);
      const end =
        which.length === 0 || which.length > 2 ? undefined : endOf({ parameters, temperatures, others });
      if (end) isProved = true;
      return gone.map((s) => end ?? openEnd(parameters, s));
    };
    const lastEnds = endsOf(lost, from);
    const firstEnds = endsOf(born, to);
    const right: Growing[] = [];
    for (const [i, j] of kept) {
      const grown = left[i] as Growing;
      if (met && meets(i)) {
        grown.high = met.end;
        right[j] = start(to, j, met.end);
        continue;
      }
      const [here, there] = [from.states[i], to.states[j]] as [Growing["points"][number], BranchPoint];
      if (!isProved && !goesOn(here, there)) {
        grown.high = openEnd(parameters, here);
        right[j] = start(to, j, openEnd(parameters, there));
        continue;
      }
      grown.points.push(to.states[j] as Growing["points"][number]);
      right[j] = grown;
    }
    if (met?.end.kind === "transcritical") {
      const pair = (list: readonly Growing[]) => list.filter((_, i) => meets(i));
      crossed.push({ end: met.end, below: pair(left), above: pair(right) });
    }
    for (const [k, i] of lost.entries()) (left[i] as Growing).high = lastEnds[k] as BranchEnd;
    for (const [k, j] of born.entries()) right[j] = start(to, j, firstEnds[k] as BranchEnd);
    if (isFold(lastEnds[0]))
      pairs.push({ end: lastEnds[0], exists: "below", pair: lost.map((i) => left[i] as Growing) });
    if (isFold(firstEnds[0]))
      pairs.push({ end: firstEnds[0], exists: "above", pair: born.map((j) => right[j] as Growing) });
    return right;
  }

  const coldest = new Map(all.map((g) => [g, Math.min(...g.points.map((p) => p.temperature))]));
  all.sort((a, b) => (coldest.get(a) as number) - (coldest.get(b) as number));
  const indices = (pair: readonly Growing[]) =>
    Object.freeze(pair.map((g) => all.indexOf(g))) as [number, number];
  const folds = pairs.map(({ end, exists, pair }) => foldAt(end, exists, indices(pair)));
  folds.sort((a, b) => a.temperature - b.temperature);
  const crossings = crossed.map(({ end, below, above }): BranchCrossing => {
    const { at, atBracket, temperature, temperatureBracket } = end;
    const around = { at, atBracket, temperature, temperatureBracket };
    return Object.freeze({ kind: "transcritical", ...around, below: indices(below), above: indices(above) });
  });
  crossings.sort((a, b) => a.temperature - b.temperature);
  return { branches: all.map(branchOf), folds, crossings };
}

const isZero = (kind: BranchEnd["kind"]): boolean => kind === "fold" || kind === "transcritical";

const isFold = (end: BranchEnd | undefined): end is BranchEnd =>
  end?.kind === "fold" || end?.kind === "corner";

const exactEnd = (kind: BranchEnd["kind"], { at, temperature }: BranchPoint): BranchEnd =>
  Object.freeze({
    ...{ kind, at, temperature },
    atBracket: Object.freeze([at, at] as const),
    temperatureBracket: Object.freeze([temperature, temperature] as const),
  });

/** The end of a branch at a stretch in which nothing is proved. */
const openEnd = (parameters: Range, last: BranchPoint): BranchEnd =>
  Object.freeze({ ...exactEnd("undecided", last), atBracket: Object.freeze(parameters) });

/** The end of a branch at the first or last column, which lies at the end of the parameter's range unless that is undecided. */
const outerEnd = (point: BranchPoint, beyond: Range): BranchEnd =>
  beyond[0] === beyond[1] ? exactEnd("between", point) : openEnd(beyond, point);

const STABILITY = { [-1]: "stable", 0: "undecided", 1: "unstable" } as const;

function branchOf({ points, low, high }: Growing): Branch {
  const ends = [low, high as BranchEnd] as const;
  // at a fold and at a crossing λ is zero; a state that leaves the range has that of its last point
  const [left, right] = ends.map(({ kind, at, temperature }, i): BranchPoint => {
    const next = (i === 0 ? points[0] : points.at(-1)) as BranchPoint;
    return { at, temperature, feedbackParameter: isZero(kind) ? 0 : next.feedbackParameter };
  }) as [BranchPoint, BranchPoint];
  const inner = points.map(({ at, temperature, feedbackParameter }) => ({
    at,
    temperature,
    feedbackParameter,
  }));
  const drawn = [left, ...inner.filter((p) => p.at > left.at && p.at < right.at), right];
  const temperatures = drawn.map((p) => p.temperature);
  return Object.freeze({
    stability: STABILITY[points.find((p) => p.sign !== 0)?.sign ?? 0],
    parameters: Object.freeze([left.at, right.at] as const),
    temperatures: Object.freeze([Math.min(...temperatures), Math.max(...temperatures)] as const),
    low: ends[0],
    high: ends[1],
    points: Object.freeze(drawn.map((p) => Object.freeze(p))),
  });
}
