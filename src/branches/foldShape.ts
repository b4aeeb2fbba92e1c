// What the places have in common in which two folds meet.
import type { Range } from "../ground/range.ts";
import { minus, over, plus, times } from "../search/interval.ts";
import type { FoldBox } from "./foldBox.ts";
import { closer, type FoldSystem } from "./foldSystem.ts";

/**
 * Both kinds of meeting have one shape. One equation is solved for y, as a function y(x, q), wherever its slope in y has one sign
 * and it has opposite signs at both ends of y. What is left is φ(x, q), bent one way in x and at both ends of x on the side to
 * which it bends, so that it has two zeros, or none, as its extremum lies on one side of zero or the other; and as φ only
 * rises or only falls with q, the extremum passes zero once.
 */
export interface Shape {
  readonly x: "t" | "p";
  readonly y: "t" | "p";
  /** The third equation: zero where folds meet, and its slopes in T, p, q. */
  readonly third: (system: FoldSystem, box: FoldBox) => readonly [Range, Range, Range, Range];
  /** The solved equation and its slope in y. */
  readonly solved: (system: FoldSystem, box: FoldBox) => readonly [Range, Range];
  /** φ, its slope in q and its bend in x. */
  readonly left: (system: FoldSystem, box: FoldBox) => readonly [Range, Range, Range];
}

/** N = 0 gives p(T, q); φ = N_T with φ_q = N_Tq − N_Tp·N_q/N_p and the second derivative of N_T along p(T, q). */
export const CUSP: Shape = {
  x: "t",
  y: "p",
  third(system, box) {
    const { ntt } = system.read(box);
    const { nttt, nttp, nttq } = system.further(box);
    return [ntt, nttt, nttp, nttq];
  },
  solved(system, box) {
    const { n, np } = closer(system, box);
    return [n, np];
  },
  left(system, box) {
    const { nt, np, nq, ntt, ntp, ntq } = closer(system, box);
    const { npp, nttt, nttp, ntpp } = system.further(box);
    const turn = minus(over(nt, np));
    const twice = (r: Range) => times([2, 2], r);
    const turning = minus(over(plus(ntt, plus(twice(times(ntp, turn)), times(npp, squared(turn)))), np));
    const bend = plus(
      plus(nttt, twice(times(nttp, turn))),
      plus(times(ntpp, squared(turn)), times(ntp, turning)),
    );
    return [nt, plus(ntq, minus(over(times(ntp, nq), np))), bend];
  },
};

/** N_T = 0 gives T(p, q); φ = N with φ_q = N_q and φ_pp = N_pp − N_Tp²/N_TT along it. */
export const POINT: Shape = {
  x: "p",
  y: "t",
  third(system, box) {
    const { np, ntp } = system.read(box);
    const { npp, npq } = system.further(box);
    return [np, ntp, npp, npq];
  },
  solved(system, box) {
    const { nt, ntt } = closer(system, box);
    return [nt, ntt];
  },
  left(system, box) {
    const { n, nq, ntt, ntp } = closer(system, box);
    return [n, nq, plus(system.further(box).npp, minus(over(squared(ntp), ntt)))];
  },
};

const squared = ([low, high]: Range): Range => {
  const [a, b] = [times([low, low], [low, low]), times([high, high], [high, high])];
  return low <= 0 && high >= 0 ? [0, Math.max(a[1], b[1])] : [Math.min(a[0], b[0]), Math.max(a[1], b[1])];
};
