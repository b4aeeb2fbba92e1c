// The dimension of an arithmetic node from those of its arguments.
import {
  type Dimension,
  multiplyDimensions,
  NO_DIMENSION,
  rootDimension,
  showDimension,
} from "../ground/dimension.ts";
import { fail } from "../ground/errors.ts";
import type { Op } from "./op.ts";

/** Dimension of a bare number: it takes the other operand's in a sum and has none in a product. */
export const BARE = "bare";

/** True for the dimension of a pure number. */
export const isPure = (d: Dimension | undefined): boolean => d === NO_DIMENSION || d === BARE;

/** What the rule needs of a graph. */
interface Dimensioned {
  readonly dimensions: readonly (Dimension | undefined)[];
  readonly depth: number;
}

/**
 * In + − min max a bare number takes the other operand's unit, in × ÷ it has none; exp, log and tanh take pure numbers, a
 * step takes anything and is one.
 * Outside law bodies a disagreement throws `unit-mismatch`; inside, the dimension is left open (`undefined`), because a
 * law's body may hold an empirical formula: it is checked at its ports.
 */
export function dimensionOfNode(g: Dimensioned, op: Op, args: readonly number[]): Dimension | undefined {
  const [x, y] = args.map((a) => g.dimensions[a]);
  if (x === undefined || (args.length === 2 && y === undefined)) return undefined;
  const pure = (d: Dimension) => (d === BARE ? NO_DIMENSION : d);
  switch (op) {
    case "mul":
    case "div":
      return multiplyDimensions(pure(x), pure(y as Dimension), op === "mul" ? 1 : -1);
    case "sqrt":
      return rootDimension(pure(x));
    case "neg":
      return x;
    case "step":
      return NO_DIMENSION;
    case "exp":
    case "log":
    case "tanh":
      return isPure(x) ? NO_DIMENSION : refused(g, op, x, NO_DIMENSION);
    default:
      if (x === y || y === BARE) return x;
      return x === BARE ? y : refused(g, op, y as Dimension, x);
  }
}

function refused(g: Dimensioned, op: Op, found: Dimension, needed: Dimension): undefined {
  if (g.depth > 0) return undefined;
  return fail("unit-mismatch", { path: op, value: showDimension(found), allowed: showDimension(needed) });
}
