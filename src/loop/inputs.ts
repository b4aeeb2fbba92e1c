// The inputs of a loop's readings, and their values at a point.
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, type Range } from "../ground/range.ts";
import type { Loop } from "./types.ts";

/** The nodes that a reading of this loop takes as inputs: variables, then givens. */
export const inputsOf = (loop: Loop): number[] => [...loop.variables, ...loop.givens].map((v) => v.node);

/** The nodes of all that a loop computes: rates, flows, heat capacity, what is reported. */
export const rootsOf = ({ variables, flows, report, heatCapacity }: Loop): number[] => [
  ...variables.map((v) => v.rate),
  ...[...flows, ...report].map((r) => r.node),
  heatCapacity,
];

/** The values of the givens, with those in `at` replaced. Throws for an unknown name or a value that is not allowed. */
export function givensAt(loop: Loop, at: Readonly<Record<string, unknown>> = {}): number[] {
  const known = loop.givens.map((g) => g.name);
  checkKeys(at, "at", known);
  return loop.givens.map(({ name, value, unit, within }) => {
    const set = Object.hasOwn(at, name) ? at[name] : undefined;
    return set === undefined ? value : checkedNumber(set, `at.${name}`, unit, within);
  });
}

/** The ranges that variables and givens are declared to keep, by node. */
export function rangesOf({ variables, givens }: Loop): Map<number, Range> {
  const ranges = new Map<number, Range>();
  for (const { node, within } of [...variables, ...givens]) if (within) ranges.set(node, within);
  return ranges;
}
