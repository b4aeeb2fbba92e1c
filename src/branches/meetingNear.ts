// Looks for a place in which two folds meet.

import { boxAt, type FoldPlace } from "./foldBox.ts";
import type { Shape } from "./foldShape.ts";
import { type FoldSystem, middles } from "./foldSystem.ts";
import { solved3 } from "./solved3.ts";
import { middleOf } from "./stretch.ts";

const MOST_STEPS = 40;

/** Newton's method on N = N_T = 0 and the third equation of a shape; not proved. */
export function meetingNear(system: FoldSystem, near: FoldPlace, shape: Shape): FoldPlace | undefined {
  let at = near;
  for (let i = 0; i < MOST_STEPS; i++) {
    const box = boxAt(at);
    const m = middles(system.read(box));
    const [f, ft, fp, fq] = shape.third(system, box).map(middleOf) as [number, number, number, number];
    const step = solved3(
      [
        [m.nt, m.np, m.nq],
        [m.ntt, m.ntp, m.ntq],
        [ft, fp, fq],
      ],
      [m.n, m.nt, f],
    );
    if (!step.every(Number.isFinite)) return undefined;
    at = { t: at.t - step[0], p: at.p - step[1], q: at.q - step[2] };
    const size = [at.t, at.p, at.q].map(Math.abs) as [number, number, number];
    if (step.every((s, j) => Math.abs(s) <= 1e-13 * (size[j] as number) + 1e-15)) return at;
  }
  return at;
}
