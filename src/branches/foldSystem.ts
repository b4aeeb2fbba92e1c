// The two equations of a fold, N = 0 and ∂N/∂T = 0, in temperature T and two givens p and q.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import { meet, minus, over, plus, times } from "../search/interval.ts";
import { boxAt, type FoldBox, type FoldPlace } from "./foldBox.ts";
import { type Pair, type PairSystem, solvedPair } from "./pairSystem.ts";
import { type PlaneReader, planeReader } from "./planeReader.ts";
import { middleOf } from "./stretch.ts";

/** Bounds over a box. */
export interface Equations {
  readonly n: Range;
  readonly nt: Range;
  readonly np: Range;
  readonly nq: Range;
  readonly ntt: Range;
  readonly ntp: Range;
  readonly ntq: Range;
}
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

const EQUATIONS = ["n", "nt", "np", "nq", "ntt", "ntp", "ntq"] as const;
const FURTHER = ["npp", "nttt", "nttp", "ntpp", "nttq", "npq"] as const;

/** The equations of a loop; `places` are those of both givens among its givens, as text with a space between. */
export const foldSystem = /* @__PURE__ */ kept((loop, places): FoldSystem => {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const [first, second] = places.split(" ").map(Number) as [number, number];
  const inputOf = {
    t: inputs[0] as number,
    p: inputs[first + loop.variables.length] as number,
    q: inputs[second + loop.variables.length] as number,
  };
  /** The reader of the derivatives with these names: `ntp` is ∂²N/∂T∂p. */
  const readerOf = (names: readonly string[]): PlaneReader => {
    const nodes = names.map((name) =>
      [...name.slice(1)].reduce((node, x) => derivative(graph, node, inputOf[x as "t"], inputs), net),
    );
    return planeReader(loop, [first, second], nodes);
  };
  const reader = readerOf(EQUATIONS);
  let more: PlaneReader | undefined;
  let set: readonly number[] = [];
  const named = (names: readonly string[], bounds: readonly Range[]): unknown =>
    Object.fromEntries(names.map((name, i) => [name, bounds[i]]));
  const read = ({ t, p, q }: FoldBox): Equations => {
    const [n, nt, np, nq, ntt, ntp, ntq] = reader.over(t, p, q) as [
      Range,
      Range,
      Range,
      Range,
      Range,
      Range,
      Range,
    ];
    return { n, nt, np, nq, ntt, ntp, ntq };
  };
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
        more = readerOf(FURTHER);
        more.set(set);
      }
      return named(FURTHER, more.over(t, p, q)) as Further;
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
