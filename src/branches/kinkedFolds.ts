// The folds and corners in two givens of a loop with kinks whose budget is a straight line in the first given.
import type { Loop } from "../loop/types.ts";
import type { Task } from "./diagramOf.ts";
import type { Cusp, FoldChange, FoldCurve, FoldPoint, UndecidedFolds } from "./foldDiagram.ts";
import type { FoldParts } from "./foldsOnLine.ts";
import { joinTurns, type TurnColumn, type TurnCurve, type TurnEnd } from "./joinTurns.ts";
import { placesIn } from "./placesIn.ts";
import { turnPassage } from "./turnPassage.ts";
import type { TurnDoubt, TurnReader } from "./turns.ts";
import { kindsOf, type TurnTile, turnTiles } from "./turnTiles.ts";

/** What the turns of one column may cost. */
const COLUMN_EFFORT = 2000;

/** What a doubt about the turns of a tile is in the diagram. */
const KINDS: Readonly<Record<TurnDoubt, UndecidedFolds["kind"]>> = {
  fold: "count",
  corner: "count",
  edge: "edge",
  flat: "continuum",
  jump: "jump",
  undefined: "undefined",
  effort: "effort",
  kink: "kink",
};

/**
 * A fold is a zero of λ on the curve p(T), and a corner a kink at which λ leaps through zero. Their kinds are proved over
 * tiles of the second given; in a tile they never meet, so they keep their order and are joined into curves. What happens
 * in the narrow stretches between is proved, or the stretch is undecided.
 */
export function kinkedFolds(loop: Loop, reader: TurnReader, task: Task): FoldParts {
  const { place, givens, within, between, effort } = task;
  reader.set(givens);
  const { tiles, cost } = turnTiles(reader, between, within, effort);
  const turnsAt = (and: number) => {
    const found = reader.turnsIn(within, [and, and], COLUMN_EFFORT);
    cost.boxes += found.boxes;
    cost.points += found.points;
    return found;
  };
  const groups = tiles.map(({ parameters, kinds }): TurnColumn[] => {
    if (kinds === null) return [];
    return placesIn(parameters)
      .map((and) => ({ and, ...turnsAt(and) }))
      .filter(({ turns, doubt }) => doubt === undefined && kindsOf(turns) === kinds);
  });
  const passage = turnPassage(loop, reader, { within, givens });
  const { curves, meetings, proved } = joinTurns(
    groups.filter((group) => group.length > 0),
    passage,
    between,
  );
  const at = (and: number, temperature: number): FoldPoint => {
    const set = givens.map((v, i) => (i === place ? and : v));
    return Object.freeze({ at: reader.read([temperature, ...set]).at, and, temperature });
  };
  const numbers = new Map(curves.map((curve, i) => [curve, i]));
  const pairOf = (pair: readonly TurnCurve[]) =>
    Object.freeze(pair.map((curve) => numbers.get(curve))) as readonly [number, number];
  const placeOf = ({ end, curves: pair }: (typeof meetings)[number]) => {
    const { atBracket: andBracket, temperatureBracket } = end;
    return { ...at(end.at, end.temperature), andBracket, temperatureBracket, curves: pairOf(pair) };
  };
  const cusps: Cusp[] = [];
  const changes: FoldChange[] = [];
  for (const meeting of [...meetings].sort((a, b) => a.end.temperature - b.end.temperature)) {
    if (meeting.exists === "change") changes.push(Object.freeze(placeOf(meeting)));
    else cusps.push(Object.freeze({ ...placeOf(meeting), exists: meeting.exists }));
  }
  const isProved = ({ parameters }: TurnTile) => proved.has(parameters[0]);
  const undecided = tiles.flatMap((tile): UndecidedFolds[] => {
    if (tile.kinds !== null || isProved(tile)) return [];
    return [{ and: tile.parameters, temperatures: within, kind: KINDS[tile.doubt ?? "fold"] }];
  });
  const curveOf = ({ kind, direction, points, low, high }: TurnCurve): FoldCurve => {
    const middle = points[Math.floor(points.length / 2)] as (typeof points)[number];
    const b = reader.answerIn(within, [middle.and, middle.and]);
    const inner = points.filter(({ and }) => and > low.and && and < high.and);
    const drawn: readonly (TurnEnd | (typeof points)[number])[] = [low, ...inner, high];
    return Object.freeze({
      kind,
      // along the curve p' = -lambda/N_p
      exists: -direction * b > 0 ? "above" : "below",
      range: Object.freeze([low.and, high.and] as const),
      ends: Object.freeze([low.kind, high.kind] as const),
      points: Object.freeze(drawn.map(({ and, temperature }) => at(and, temperature))),
    });
  };
  return { method: "line", curves: curves.map(curveOf), cusps, touches: [], changes, undecided, cost };
}
