// The two equations of a fold, N = 0 and ∂N/∂T = 0, in temperature T and two givens p and q.
import type { Range } from "../ground/range.ts";
import { kept } from "../loop/kept.ts";
import { meet, minus, over, plus, times } from "../search/interval.ts";
import { boxAt, type FoldBox, type FoldPlace } from "./foldBox.ts";
import { type Pair, type PairSystem, solvedPair } from "./pairSystem.ts";
import type { PlaneReader } from "./planeReader.ts";
import { EQUATIONS, type Equations, equationsOver, planeSlopes } from "./planeSlopes.ts";
import { middleOf } from "./stretch.ts";

/** Bounds of further derivatives over a box. */
export interface Further {
  readonly npp: Range;
  readonly nttt: Range;
  readonly nttp: Range;
  readonly ntpp: Range;
  readonly nttq: Range;
  readonly npq: Range;
}

/** The equations and how they are read. */
export interface FoldSystem extends PairSystem {
  set(givens: readonly number[]): void;
  read(box: FoldBox): Equations;
  further(box: FoldBox): Further;
  /** N_p and N_TT at a place, not proved. */
  signs(place: FoldPlace): { readonly np: number; readonly ntt: number };
}

const FURTHER = ["pp", "ttt", "ttp", "tpp", "ttq", "pq"] as const;

/** The equations of a loop; `places` are those of both givens among its givens, as text with a space between. */
export const foldSystem = /* @__PURE__ */ kept((loop, places): FoldSystem => {
  const readerOf = planeSlopes(loop, places);
  const reader = readerOf(loop.net, EQUATIONS);
  let more: PlaneReader | undefined;
  let set: readonly number[] = [];
  const read = (box: FoldBox): Equations => equationsOver(reader, box);
  const pair = (box: FoldBox): Pair => {
    const { n, nt, np, nq, ntt, ntp, ntq } = read(box);
    return { f: n, ft: nt, fp: np, fq: nq, g: nt, gt: ntt, gp: ntp, gq: ntq };
  };
  return {
    set(givens: readonly number[]) {
      set = givens;
      reader.set(givens);
      more?.set(givens);
    },
    read,
    further({ t, p, q }: FoldBox): Further {
      if (!more) {
        more = readerOf(loop.net, FURTHER);
        more.set(set);
      }
      const bounds = more.over(t, p, q);
      return Object.fromEntries(FURTHER.map((slope, i) => [`n${slope}`, bounds[i]])) as unknown as Further;
    },
    signs(place) {
      const { np, ntt } = middles(read(boxAt(place)));
      return { np, ntt };
    },
    pair,
    speeds(box) {
      // N_T is zero at a fold
      const { fp, fq, gt, gp, gq } = pair(box);
      const byP = minus(over(fq, fp));
      return [minus(over(plus(gq, times(gp, byP)), gt)), byP];
    },
    kind: "fold",
    accepts: () => true,
    solve: (near) => solvedPair(pair, near),
  };
});

/** The middles of bounds. */
export const middles = <T extends Equations | Further>(bounds: T): Record<keyof T, number> =>
  Object.fromEntries(Object.entries(bounds).map(([name, r]) => [name, middleOf(r)])) as Record<
    keyof T,
    number
  >;

/** N and N_T also from their values in the middle and their slopes (mean value form), where these bounds are closer. */
export function closer(system: FoldSystem, box: FoldBox, read: Equations = system.read(box)): Equations {
  const at = { t: middleOf(box.t), p: middleOf(box.p), q: middleOf(box.q) };
  const center = system.read(boxAt(at));
  const [dt, dp, dq] = (["t", "p", "q"] as const).map((x) => plus(box[x], [-at[x], -at[x]])) as [
    Range,
    Range,
    Range,
  ];
  const form = (value: Range, byT: Range, byP: Range, byQ: Range) =>
    plus(plus(value, times(byT, dt)), plus(times(byP, dp), times(byQ, dq)));
  const narrower = (a: Range, b: Range): Range => (b[0] <= b[1] ? meet(a, b) : a);
  const nt = narrower(read.nt, form(center.nt, read.ntt, read.ntp, read.ntq));
  const n = narrower(read.n, form(center.n, nt, read.np, read.nq));
  return { ...read, n, nt };
}
