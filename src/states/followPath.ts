// What becomes of a state while givens change slowly from one set of values to another.
import type { Range } from "../ground/range.ts";
import { endsOf, type Sign } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { ProvedZero } from "../search/enumeration.ts";
import { followZero } from "../search/followZero.ts";
import type { Moving, Start, Turning } from "../search/moving.ts";
import { readBox } from "../search/readBox.ts";
import { Reader } from "../search/reader.ts";
import { roundoffAt } from "../search/roundoff.ts";
import { scanZeros } from "../search/scanZeros.ts";
import type { Located } from "./located.ts";
import { located as stateOf } from "./provedSearch.ts";

/** Where a branch ends. The stage runs from 0, the old givens, to 1, the new ones. */
export interface LostAt {
  readonly outcome: "lost";
  readonly turning: Turning;
  /** The state to which the climate goes from there, at the later of the two stages; `null` where none is found. */
  readonly next: Located | null;
  /** `outside`: no state lies that way inside the range. `undecided`: the first one that way is not proved. */
  readonly nextIs: "found" | "outside" | "undecided";
}

/** What becomes of a state. */
export type PathOutcome =
  | { readonly outcome: "arrived"; readonly located: Located }
  | LostAt
  /** The branch leaves the range; or nothing answers to temperature; or it cannot be told what becomes of it. */
  | { readonly outcome: "left" | "no-response" | "undecided"; readonly stage: number; readonly x: number };

/** A bracket around a state is widened up to this, K. */
const WIDEST_START = 1e-3;
/** What finding the next state may cost, as in a search for states. */
const NEXT_EFFORT = 500;
const NEXT_SAMPLES = 20_000;

/**
 * Follows the state of a balance on its branch from stage 0 to 1. `within`: the range of temperature, K. With proof, unless
 * the balance is sampled: the branch is the same from stage to stage, or it is proved to end between two of them. Where it
 * ends, the balance has one sign, and the climate warms or cools to the next state in that direction.
 */
export function followPath(
  f: Moving,
  { value, bracket }: { readonly value: number; readonly bracket: Range },
  within: Range,
): PathOutcome {
  f.between(0, 0);
  if (!f.responds) return { outcome: "no-response", stage: 0, x: value };
  const start = startAt(f, value, bracket);
  if (!start) return { outcome: "undecided", stage: 0, x: value };
  const followed = followZero(f, start, within);
  if (followed.outcome === "turned") return { outcome: "lost", ...lost(f, followed.turning, within) };
  if (followed.outcome !== "arrived") return followed;
  f.between(1, 1);
  return { outcome: "arrived", located: located(f, followed.zero) };
}

/** The bracket of a state, widened until the signs at its ends and the sign of the slope between are known. */
function startAt(f: Moving, x: number, [from, to]: Range): Start | undefined {
  const reader = new Reader(endsOf(f));
  const place = reader.take();
  for (
    let gap = Math.max(Math.min((to - from) / 2, WIDEST_START / 1e3), 4 * roundoffAt(x));
    gap < WIDEST_START;
    gap *= 4
  ) {
    const [low, high] = [x - gap, x + gap];
    const slope = readBox(reader, low, high).slopeSign;
    if (slope === 0) continue;
    const below = reader.read(low, place).sign;
    if (below === -slope && reader.read(high, place).sign === slope) return { x, low, high, slope };
  }
  return undefined;
}

function lost(f: Moving, turning: Turning, within: Range): Omit<LostAt, "outcome"> {
  const { sign, around, stages } = turning;
  f.between(stages[1], stages[1]);
  const ahead: Range = sign > 0 ? [around[1], within[1]] : [within[0], around[0]];
  if (!(ahead[0] < ahead[1])) return { turning, next: null, nextIs: "outside" };
  const next = f.sampled ? sampledNext(f, ahead, sign) : provedNext(f, ahead, sign);
  if (next === "outside" || next === "undecided") return { turning, next: null, nextIs: next };
  return { turning, next: located(f, next), nextIs: "found" };
}

/** A zero as a state; its bounds mean nothing if it was sampled. */
const located = (f: Moving, zero: ProvedZero): Located =>
  f.sampled ? { ...stateOf(zero), slope: null } : stateOf(zero);

type Next = ProvedZero | "outside" | "undecided";

/** The first zero in the direction of the drift: upwards where the balance is positive. */
function provedNext(f: Moving, ahead: Range, sign: Sign): Next {
  const { zeros, undecided } = enumerateZeros(endsOf(f), ahead, { effort: NEXT_EFFORT });
  const zero = sign > 0 ? zeros[0] : zeros.at(-1);
  const doubt = sign > 0 ? undecided[0] : undecided.at(-1);
  const doubtFirst =
    doubt && (!zero || (sign > 0 ? doubt.interval[0] < zero.at : doubt.interval[1] > zero.at));
  return doubtFirst ? "undecided" : (zero ?? "outside");
}

function sampledNext(f: Moving, ahead: Range, sign: Sign): Next {
  const read = new Float64Array(9);
  const at = (x: number, out: Float64Array) => {
    f.point(x, read);
    out.set([read[0] as number, read[3] as number, 0]);
  };
  const { crossings } = scanZeros({ at }, ahead, NEXT_SAMPLES);
  const first = sign > 0 ? crossings[0] : crossings.at(-1);
  if (!first) return "outside";
  const { at: x, bracket } = first;
  const direction = first.falling ? -1 : 1;
  f.point(x, read);
  const [size, slope] = [Math.abs(read[0] as number), read[3] as number];
  return { at: x, bracket, slopeSign: direction, direction, size, slope, slopes: [slope, slope] };
}
