// Puts a diagram together from its parts.
import { CONSTANT_SET } from "../ground/constants.ts";
import { deepFreeze } from "../ground/deepFreeze.ts";
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { Branch, BranchCrossing, Diagram, Fold, UndecidedStretch } from "./diagram.ts";
import { fixedGivens } from "./fixedGivens.ts";
import { gapsOf } from "./gapsOf.ts";
import { jumpsOf } from "./jumpsOf.ts";
import { diagramNotes } from "./undecided.ts";
import type { ZeroReader } from "./zeroReader.ts";

/** A diagram that is asked for. */
export interface Task {
  readonly name: string;
  /** The place of the given among the givens of the loop. */
  readonly place: number;
  readonly givens: readonly number[];
  readonly between: Range;
  readonly within: Range;
  readonly effort: number;
  readonly tolerance: number;
}

/** What was found. */
export interface Parts {
  readonly method: Diagram["method"];
  readonly branches: readonly Branch[];
  readonly folds: readonly Fold[];
  readonly crossings: readonly BranchCrossing[];
  readonly undecided: readonly UndecidedStretch[];
  readonly cost: Diagram["cost"];
}

/** The diagram of these parts. */
export function diagramOf(loop: Loop, task: Task, net: ZeroReader, parts: Parts): Diagram {
  const { name, place, givens, between, within } = task;
  const { method, branches, folds, crossings, undecided, cost } = parts;
  const complete = undecided.length === 0 && !loop.sampled;
  const middle = within[0] + (within[1] - within[0]) / 2;
  return Object.freeze({
    along: name,
    unit: loop.givens[place]?.unit ?? "1",
    between: Object.freeze(between),
    within: Object.freeze(within),
    fixed: fixedGivens(loop, name, givens),
    units: Object.freeze(loop.givens.map(({ name, unit }) => Object.freeze({ name, unit }))),
    method,
    branches: Object.freeze(branches),
    folds: Object.freeze(folds),
    crossings: Object.freeze(crossings),
    jumps: Object.freeze(jumpsOf({ branches, folds, crossings, undecided }, net)),
    gaps: Object.freeze(gapsOf({ branches, undecided }, between, (p) => net.sign(p, middle))),
    undecided: deepFreeze(undecided),
    complete,
    proof: loop.sampled ? "sampled" : complete ? "proved" : "partial",
    cost: Object.freeze(cost),
    notes: Object.freeze(diagramNotes(loop.sampled, undecided)),
    constants: CONSTANT_SET,
  });
}
