// Chooses the points of a branch for drawing.
import type { Range } from "../ground/range.ts";
import type { Curve } from "./curve.ts";
import type { BranchEnd, BranchPoint } from "./diagram.ts";

const FIRST_PARTS = 4;
const MOST_HALVINGS = 12;

/** Points from the cool end of a branch to the warm one; nothing between them misses a straight line by more than `tolerance`. */
export function pointsOf(
  curve: Curve,
  cool: BranchEnd,
  warm: BranchEnd,
  { between, tolerance }: { readonly between: Range; readonly tolerance: number },
): BranchPoint[] {
  // adding 0 turns -0, which JSON does not keep, into 0
  const feedbackAt = (temperature: number) => 0 + curve.feedbackAt(temperature);
  const least = tolerance * (between[1] - between[0]);
  const read = (temperature: number): BranchPoint => ({
    at: inside(curve.at(temperature), between),
    temperature,
    feedbackParameter: feedbackAt(temperature),
  });
  const points: BranchPoint[] = [];
  const halve = (a: BranchPoint, b: BranchPoint, left: number): void => {
    const middle = read(a.temperature + (b.temperature - a.temperature) / 2);
    const straight = Math.abs(middle.at - (a.at + b.at) / 2) <= least;
    if (straight || left === 0) return;
    halve(a, middle, left - 1);
    points.push(Object.freeze(middle));
    halve(middle, b, left - 1);
  };
  const end = ({ temperature, at }: BranchEnd): BranchPoint =>
    Object.freeze({ at, temperature, feedbackParameter: feedbackAt(temperature) });
  let previous = end(cool);
  points.push(previous);
  const width = warm.temperature - cool.temperature;
  for (let i = 1; i <= FIRST_PARTS && width > 0; i++) {
    const next = i === FIRST_PARTS ? end(warm) : read(cool.temperature + (width * i) / FIRST_PARTS);
    halve(previous, next, MOST_HALVINGS);
    points.push(Object.freeze(next));
    previous = next;
  }
  return points;
}

const inside = (p: number, [low, high]: Range): number => 0 + Math.max(low, Math.min(high, p));
