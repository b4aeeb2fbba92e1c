// Says what is not decided about folds in a space of temperature and two givens.
import type { Range } from "../ground/range.ts";
import type { FoldBox } from "./foldBox.ts";
import type { ChainEnd } from "./foldChain.ts";
import type { UndecidedFolds } from "./foldDiagram.ts";
import type { FoldSystem } from "./foldSystem.ts";

/** A box in which it is not decided whether there is a fold; `spent`: the search stopped before. */
export interface OpenBox extends FoldBox {
  readonly spent: boolean;
}

const finite = (r: Range): boolean => Number.isFinite(r[1] - r[0]);

/** The undecided values of a box. */
export function openBox(system: FoldSystem, box: OpenBox): UndecidedFolds {
  const { n, ntt } = system.read(box);
  const here = (kind: UndecidedFolds["kind"]): UndecidedFolds => ({ and: box.q, temperatures: box.t, kind });
  if (box.spent) return here("effort");
  // a curvature has no value at a kink
  return here(!finite(n) ? "undefined" : !finite(ntt) ? "kink" : "count");
}

/** Those of a fold that could not be followed on. */
export const lostEnd = ({ at, atBracket }: ChainEnd): UndecidedFolds => ({
  ...{ and: atBracket, temperatures: [at.t, at.t], kind: "lost" },
});

/** Overlapping ones of a kind as one, by rising value. */
export function joinedUndecided(list: readonly UndecidedFolds[]): UndecidedFolds[] {
  const apart: UndecidedFolds[] = [];
  for (const next of [...list].sort((a, b) => a.and[0] - b.and[0])) {
    const i = apart.findIndex((u) => u.kind === next.kind && next.and[0] <= u.and[1]);
    const other = apart[i];
    if (other) apart[i] = { kind: other.kind, ...hulls(other, next) };
    else apart.push(next);
  }
  return apart;
}

const hulls = (a: UndecidedFolds, b: UndecidedFolds) => ({
  and: hull(a.and, b.and),
  temperatures: hull(a.temperatures, b.temperatures),
});
const hull = (a: Range, b: Range): Range =>
  Object.freeze([Math.min(a[0], b[0]), Math.max(a[1], b[1])] as const);
