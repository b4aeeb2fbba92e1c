// Proves how many equilibria a loop has for whole intervals of its parameters.
import { deepFreeze } from "../ground/deepFreeze.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys, failUnknown } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { givensAt } from "../loop/inputs.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { type EnclosedBalance, enclosedBalance } from "./enclosedBalance.ts";
import { checkOneVariable } from "./prepared.ts";
import { enumerateBalance } from "./provedSearch.ts";

/** Where to look, over which parameters, and how hard. */
export interface ProveCountOptions<N extends string = string> {
  /** Lowest and highest temperature, K. */
  readonly within: Range;
  /** The parameters that are intervals. */
  readonly over: { readonly [K in Givens<N>]?: Range };
  /** Values of other givens that differ from those the loop was closed with. */
  readonly at?: { readonly [K in Givens<N>]?: number };
  /** How many boxes may be enclosed in all; 20,000 unless said. */
  readonly effort?: number;
}

/** A box of parameters, and the number of states that it is proved to have everywhere. */
export interface CountTile<N extends string = string> {
  readonly over: { readonly [K in Givens<N>]?: Range };
  /** For every choice of parameters in the tile; `null` where it is not proved, as next to a fold. */
  readonly count: number | null;
}

/** Tiles that cover the whole box of parameters. */
export interface ProvedCount<N extends string = string> {
  readonly tiles: readonly CountTile<N>[];
  /** `proved`: every tile has a count. */
  readonly proof: "proved" | "partial";
  /** The share of the box of parameters whose count is proved. */
  readonly provedShare: number;
  readonly within: Range;
  readonly cost: { readonly boxes: number; readonly points: number };
}

/** A tile is not halved below this share of the box in any parameter. */
const FINEST_SHARE = 1e-6;
/** Boxes that one tile may cost before it is halved. */
const TILE_EFFORT = 200;
/** Halves are a hair off the middle, so that a symmetric problem does not put a fold on a seam. */
const SPLIT = 0.503;

/**
 * Proves the number of equilibria in a range of temperature for all parameters in a box at once: the box is tiled, each
 * tile is searched with the parameters as intervals, and one that cannot be decided is halved along its widest side, the
 * largest first, until the effort is spent. Neighbouring tiles of one count are one where a single parameter is an interval.
 *
 * Throws `out-of-range`, `not-a-number`, `unreadable`, `missing` (no parameter in `over`), `unknown-name`,
 * `several-variables`, and `bad-budget` for a loop with a sampled law, which cannot be enclosed.
 *
 * @example proveCount(loop, { within: [150, 400], over: { flux: [1300, 1400] } }).tiles // [{ over: …, count: 3 }]
 */
export function proveCount<N extends string>(loop: Loop<N>, options: ProveCountOptions<N>): ProvedCount<N> {
  checkKeys(options, "proveCount", ["within", "over", "at", "effort"]);
  checkOneVariable(loop, "proveCount");
  if (loop.sampled) {
    fail("bad-budget", { path: "proveCount", value: "a sampled law", allowed: "laws that can be enclosed" });
  }
  const within = checkedRange(options.within, "within", "K", loop.variables[0]?.within);
  const effort = checkedNumber(options.effort ?? 20_000, "effort", "1", [10, 1e9]);
  const box = boxOf(loop, options);
  const wide = new Set(box.sides.map((i) => loop.givens[i]?.node as number));
  const tiled = tile(enclosedBalance(loop, wide), box, within, effort);
  const named = (t: Tile) =>
    Object.fromEntries(box.sides.map((i) => [loop.givens[i]?.name, [t.low[i], t.high[i]]]));
  const total = sizeOf(box, box);
  const proved = tiled.tiles.filter((t) => t.count !== null).reduce((sum, t) => sum + sizeOf(t, box), 0);
  const undecided = tiled.tiles.some((t) => t.count === null);
  return deepFreeze({
    tiles: merged(tiled.tiles, box.sides).map(
      (t) => ({ over: named(t), count: t.count }) as unknown as CountTile<N>,
    ),
    proof: undecided ? "partial" : "proved",
    provedShare: undecided ? proved / total : 1,
    within,
    cost: tiled.cost,
  });
}

interface Box {
  readonly low: readonly number[];
  readonly high: readonly number[];
}
interface Tile extends Box {
  readonly count: number | null;
}

function boxOf(loop: Loop, { over, at }: ProveCountOptions): Box & { readonly sides: readonly number[] } {
  const low = givensAt(loop, at);
  const high = [...low];
  const known = loop.givens.map((g) => g.name);
  const names = Object.keys(over ?? {});
  if (names.length === 0)
    fail("missing", { path: "over", value: over, allowed: `intervals of ${known.join(", ")}` });
  const sides = names.map((name) => {
    const i = known.indexOf(name);
    if (i < 0) failUnknown(`over.${name}`, name, known);
    const { unit, within } = loop.givens[i] as Loop["givens"][number];
    [low[i], high[i]] = checkedRange(over[name], `over.${name}`, unit, within);
    return i;
  });
  return { low, high, sides };
}

function tile(
  balance: EnclosedBalance,
  box: Box & { readonly sides: readonly number[] },
  within: Range,
  effort: number,
) {
  const share = (t: Box, i: number) =>
    ((t.high[i] as number) - (t.low[i] as number)) / ((box.high[i] as number) - (box.low[i] as number));
  // a queue: the oldest tiles are the largest
  const waiting: Box[] = [box];
  const tiles: Tile[] = [];
  let [boxes, points] = [0, 0];
  for (let next = 0; next < waiting.length; next++) {
    const t = waiting[next] as Box;
    const left = Math.min(TILE_EFFORT, effort - boxes);
    if (left <= 0) {
      tiles.push({ ...t, count: null });
      continue;
    }
    balance.set(t.low, t.high);
    const found = enumerateBalance(balance, within, left);
    boxes += found.boxes;
    points += found.points;
    const side = box.sides.reduce((widest, i) => (share(t, i) > share(t, widest) ? i : widest));
    if (found.undecided.length === 0) tiles.push({ ...t, count: found.zeros.length });
    else if (share(t, side) > FINEST_SHARE) waiting.push(...halves(t, side));
    else tiles.push({ ...t, count: null });
  }
  return { tiles, cost: { boxes, points } };
}

function halves(t: Box, side: number): Box[] {
  const low = t.low[side] as number;
  const middle = low + ((t.high[side] as number) - low) * SPLIT;
  return [
    { low: t.low, high: replaced(t.high, side, middle) },
    { low: replaced(t.low, side, middle), high: t.high },
  ];
}

const sizeOf = (t: Box, { sides }: { readonly sides: readonly number[] }): number =>
  sides.reduce((size, i) => size * ((t.high[i] as number) - (t.low[i] as number)), 1);

/** Tiles in order, neighbours of one count joined, where there is one side; as they are otherwise. */
function merged(tiles: readonly Tile[], sides: readonly number[]): Tile[] {
  const [side] = sides as [number];
  if (sides.length > 1) return [...tiles];
  const joined: Tile[] = [];
  for (const t of [...tiles].sort((a, b) => (a.low[side] as number) - (b.low[side] as number))) {
    const last = joined.at(-1);
    if (last && last.count === t.count) joined[joined.length - 1] = { ...last, high: t.high };
    else joined.push(t);
  }
  return joined;
}

const replaced = (list: readonly number[], at: number, value: number): number[] =>
  list.map((v, i) => (i === at ? value : v));
