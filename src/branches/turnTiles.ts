// Tiles of the second given in which the same turns are proved throughout.
import type { Range } from "../ground/range.ts";
import type { Turn, TurnDoubt, TurnReader } from "./turns.ts";

/** A stretch of the second given and the kinds of its turns by rising temperature, as text; `null` where they are not proved. */
export interface TurnTile {
  readonly parameters: Range;
  readonly kinds: string | null;
  /** Why not; `effort`: the effort was spent before. */
  readonly doubt?: TurnDoubt | undefined;
}

/** A tile is not halved below this share of the whole. */
const FINEST_SHARE = 1e-6;
/** Boxes that one tile may cost before it is halved. */
const TILE_EFFORT = 200;
/** Halves are a hair off the middle, so that a symmetric problem does not put a fold on a seam. */
const SPLIT = 0.503;

/** The kinds of turns as text. */
export const kindsOf = (turns: readonly Pick<Turn, "kind">[]): string => turns.map((t) => t.kind).join(" ");

/** Halves the range, the largest tile first, until each is decided or small. Neighbours with the same kinds are one. */
export function turnTiles(reader: TurnReader, between: Range, within: Range, effort: number) {
  const waiting: Range[] = [between];
  const tiles: TurnTile[] = [];
  const cost = { boxes: 0, points: 0 };
  for (let next = 0; next < waiting.length; next++) {
    const parameters = waiting[next] as Range;
    const [low, high] = parameters;
    if (cost.boxes >= effort) {
      tiles.push({ parameters, kinds: null, doubt: "effort" });
      continue;
    }
    const found = reader.turnsIn(within, parameters, Math.min(TILE_EFFORT, effort - cost.boxes));
    cost.boxes += found.boxes;
    cost.points += found.points;
    if (found.doubt === undefined) tiles.push({ parameters, kinds: kindsOf(found.turns) });
    else if (high - low > FINEST_SHARE * (between[1] - between[0])) {
      const middle = low + (high - low) * SPLIT;
      waiting.push([low, middle], [middle, high]);
    } else tiles.push({ parameters, kinds: null, doubt: found.doubt === "effort" ? "fold" : found.doubt });
  }
  return { tiles: merged(tiles), cost };
}

function merged(tiles: readonly TurnTile[]): TurnTile[] {
  const joined: TurnTile[] = [];
  for (const tile of [...tiles].sort((a, b) => a.parameters[0] - b.parameters[0])) {
    const last = joined.at(-1);
    if (last && last.kinds === tile.kinds)
      joined[joined.length - 1] = {
        ...(tile.doubt === "effort" ? tile : last),
        parameters: [last.parameters[0], tile.parameters[1]],
      };
    else joined.push(tile);
  }
  return joined;
}
