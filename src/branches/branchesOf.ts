// Makes the branches of a run: the pieces of a curve between its critical places.
import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import type { Critical } from "./criticals.ts";
import type { Curve } from "./curve.ts";
import type { Branch, BranchEnd } from "./diagram.ts";
import { pointsOf } from "./pointsOf.ts";
import type { Run, RunEnd } from "./runs.ts";

/** What is needed besides the run. */
export interface Drawing {
  readonly between: Range;
  /** Share of both ranges by which straight lines between points may miss the curve. */
  readonly tolerance: number;
  readonly within: Range;
}

/** The branches of a run by rising temperature, one more than it has critical places. */
export function branchesOf(
  curve: Curve,
  { from, to }: Run,
  criticals: readonly Critical[],
  drawing: Drawing,
): Branch[] {
  // at a leap, and at what is undecided, the two branches end at different parameters
  const ends = [
    { warm: runEnd(curve, from, drawing), cool: undefined },
    ...criticals.map((c) => {
      const cool = criticalEnd(curve, c, drawing, 0);
      return { cool, warm: c.decided ? cool : criticalEnd(curve, c, drawing, 1) };
    }),
    { warm: undefined, cool: runEnd(curve, to, drawing) },
  ];
  return ends.slice(1).map((next, i) => {
    const [cool, warm] = [ends[i]?.warm, next.cool] as [BranchEnd, BranchEnd];
    const rises = signBetween(cool, warm, curve.rises) || warm.at - cool.at;
    const [low, high] = rises >= 0 ? [cool, warm] : [warm, cool];
    const points = pointsOf(curve, cool, warm, drawing);
    if (low === warm) points.reverse();
    return Object.freeze({
      stability: stabilityOf(curve, cool, warm),
      // an end that is not proved may lie beyond the other by rounding
      parameters: frozen([Math.min(low.at, high.at), Math.max(low.at, high.at)]),
      temperatures: frozen([cool.temperature, warm.temperature]),
      low,
      high,
      points: Object.freeze(points),
    });
  });
}

const frozen = (range: Range): Range => Object.freeze(range);

function runEnd(curve: Curve, { kind, end, at, bracket }: RunEnd, { between }: Drawing): BranchEnd {
  const exact = kind === "between" ? between[end] : undefined;
  return Object.freeze({
    kind,
    at: exact ?? clamped(curve.at(at), between),
    atBracket: exact === undefined ? boundsOf(curve, bracket, between) : frozen([exact, exact]),
    temperature: at,
    temperatureBracket: frozen(bracket),
  });
}

function criticalEnd(curve: Curve, critical: Critical, { between }: Drawing, side: 0 | 1): BranchEnd {
  const { kind, decided, bracket } = critical;
  const temperature = decided ? critical.temperature : bracket[side];
  return Object.freeze({
    kind: decided || kind === "leap" ? (kind as "fold" | "corner" | "leap") : "undecided",
    at: clamped(curve.at(temperature), between),
    atBracket: boundsOf(curve, bracket, between),
    temperature,
    temperatureBracket: frozen(bracket),
  });
}

/** Proved bounds of the parameter over a bracket: at least, the range that was asked for. */
export function boundsOf(curve: Curve, [low, high]: Range, between: Range): Range {
  const [least, greatest] = curve.over(low, high);
  return frozen([clamped(least, between, between[0]), clamped(greatest, between, between[1])]);
}

function clamped(p: number, [low, high]: Range, otherwise = (low + high) / 2): number {
  // adding 0 turns -0, which JSON does not keep, into 0
  return 0 + (p < low ? low : p > high ? high : Number.isFinite(p) ? p : otherwise);
}

/** The sign of λ anywhere on the branch: it has no zero there. */
function stabilityOf(curve: Curve, cool: BranchEnd, warm: BranchEnd): Branch["stability"] {
  const sign = signBetween(cool, warm, curve.signAt);
  return sign === 0 ? "undecided" : sign < 0 ? "stable" : "unstable";
}

/** A sign that is the same on the whole branch, from the first place at which it is proved. */
function signBetween(cool: BranchEnd, warm: BranchEnd, signAt: (temperature: number) => Sign): Sign {
  const [low, high] = [cool.temperatureBracket[1], warm.temperatureBracket[0]];
  for (const share of [0.5, 0.371, 0.629, 0, 1]) {
    const sign = signAt(low + (high - low) * share);
    if (sign !== 0) return sign;
  }
  return 0;
}
