// The two equations of a corner, N = 0 and the place of a kink, in temperature T and two givens p and q.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import { signOfRange } from "../search/interval.ts";
import type { FoldBox } from "./foldBox.ts";
import { kinksOf, withoutKinks } from "./kinkNodes.ts";
import { type Pair, type PairSystem, solvedPair, speedsOf } from "./pairSystem.ts";
import { planeReader } from "./planeReader.ts";

/** Bounds of N on one side of a kink, as if it went on like that, and of its slopes. */
export interface SideBounds {
  readonly n: Range;
  readonly nt: Range;
  readonly np: Range;
  readonly nq: Range;
  readonly ntt: Range;
  readonly ntp: Range;
  readonly ntq: Range;
}

/** One kink. */
export interface CornerSystem extends PairSystem {
  set(givens: readonly number[]): void;
  /** What is zero at the kink, and its slopes: `g` of the pair. */
  kink(box: FoldBox): Pick<Pair, "g" | "gt" | "gp" | "gq">;
  /** N where the kink's difference is below zero, and where it is above. */
  side(more: boolean, box: FoldBox): SideBounds;
  /** The signs of ∂N/∂T on both sides of the kink all over a box. */
  slopes(box: FoldBox): readonly [less: 1 | -1 | 0, more: 1 | -1 | 0];
}

const SLOPES = ["", "t", "p", "q", "tt", "tp", "tq"] as const;

/** The systems of a loop's kinks; `places` are those of both givens among its givens, as text with a space between. */
export const cornerSystems = /* @__PURE__ */ kept((loop, places): readonly CornerSystem[] => {
  const { graph } = loop;
  const inputs = inputsOf(loop);
  const [first, second] = places.split(" ").map(Number) as [number, number];
  const inputOf = {
    t: inputs[0] as number,
    p: inputs[first + loop.variables.length] as number,
    q: inputs[second + loop.variables.length] as number,
  };
  const slopeOf = (node: number, names: string): number =>
    [...names].reduce((of, x) => derivative(graph, of, inputOf[x as "t"], inputs), node);
  return kinksOf(loop).map((kink): CornerSystem => {
    const sides = [true, false].map((less) => withoutKinks(loop, [{ kink, less }]));
    const [less, more] = sides.map((node) =>
      planeReader(
        loop,
        [first, second],
        SLOPES.map((names) => slopeOf(node, names)),
      ),
    ) as [ReturnType<typeof planeReader>, ReturnType<typeof planeReader>];
    const difference = planeReader(
      loop,
      [first, second],
      ["", "t", "p", "q"].map((names) => slopeOf(kink.node, names)),
    );
    const side = (isMore: boolean, { t, p, q }: FoldBox): SideBounds => {
      const [n, nt, np, nq, ntt, ntp, ntq] = (isMore ? more : less).over(t, p, q) as Seven;
      return { n, nt, np, nq, ntt, ntp, ntq };
    };
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

type Seven = [Range, Range, Range, Range, Range, Range, Range];
