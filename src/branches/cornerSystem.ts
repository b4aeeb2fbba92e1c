// The two equations of a corner, N = 0 and the place of a kink, in temperature T and two givens p and q.
import type { Range } from "../ground/range.ts";
import { kept } from "../loop/kept.ts";
import { signOfRange } from "../search/interval.ts";
import type { FoldBox } from "./foldBox.ts";
import { type Pair, type PairSystem, solvedPair, speedsOf } from "./pairSystem.ts";
import type { PlaneReader } from "./planeReader.ts";
import { EQUATIONS, type Equations, equationsOver, planeSlopes } from "./planeSlopes.ts";
import { placedKinks, withoutKinks } from "./withoutKinks.ts";

/** One kink. */
export interface CornerSystem extends PairSystem {
  set(givens: readonly number[]): void;
  /** What is zero at the kink, and its slopes: `g` of the pair. */
  kink(box: FoldBox): Pick<Pair, "g" | "gt" | "gp" | "gq">;
  /** N where the kink's difference is below zero, or above, as if it went on like that on the other side. */
  side(more: boolean, box: FoldBox): Equations;
  /** The signs of ∂N/∂T on both sides of the kink all over a box. */
  slopes(box: FoldBox): readonly [less: 1 | -1 | 0, more: 1 | -1 | 0];
}

/** The systems of a loop's kinks; `places` are those of both givens among its givens, as text with a space between. */
export const cornerSystems = /* @__PURE__ */ kept((loop, places): readonly CornerSystem[] => {
  const readerOf = planeSlopes(loop, places);
  return placedKinks(loop).map((kink): CornerSystem => {
    const [less, more] = [true, false].map((less) =>
      readerOf(withoutKinks(loop, [{ kink, less }]), EQUATIONS),
    ) as [PlaneReader, PlaneReader];
    const difference = readerOf(kink.node, ["", "t", "p", "q"]);
    const side = (isMore: boolean, box: FoldBox): Equations => equationsOver(isMore ? more : less, box);
    const at = ({ t, p, q }: FoldBox) => {
      const [g, gt, gp, gq] = difference.over(t, p, q) as [Range, Range, Range, Range];
      return { g, gt, gp, gq };
    };
    const pair = (box: FoldBox): Pair => {
      const { n, nt, np, nq } = side(false, box);
      return { f: n, ft: nt, fp: np, fq: nq, ...at(box) };
    };
    const slopes: CornerSystem["slopes"] = (box) => [
      signOfRange(side(false, box).nt),
      signOfRange(side(true, box).nt),
    ];
    return {
      kind: "corner",
      set(givens) {
        for (const reader of [less, more, difference]) reader.set(givens);
      },
      ...{ side, pair, slopes, kink: at },
      speeds: (box) => speedsOf(pair(box)),
      accepts(box) {
        const [below, above] = slopes(box);
        return below !== 0 && below === -above && signOfRange(at(box).gt) !== 0;
      },
      solve: (near) => solvedPair(pair, near),
    };
  });
});
