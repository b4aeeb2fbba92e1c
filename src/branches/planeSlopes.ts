// Encloses a balance and its slopes over boxes of temperature T and two givens p and q.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import type { FoldBox } from "./foldBox.ts";
import { type PlaneReader, planeReader } from "./planeReader.ts";

/** Bounds of N over a box, and of its slopes: `ntp` is ∂²N/∂T∂p. */
export interface Equations {
  readonly n: Range;
  readonly nt: Range;
  readonly np: Range;
  readonly nq: Range;
  readonly ntt: Range;
  readonly ntp: Range;
  readonly ntq: Range;
}

/** The slopes that `equationsOver` reads. */
export const EQUATIONS = ["", "t", "p", "q", "tt", "tp", "tq"] as const;

/** Makes readers of a node and its slopes, named by letters; `places` are those of p and q among the givens, with a space between. */
export function planeSlopes(
  loop: Loop,
  places: string,
): (node: number, slopes: readonly string[]) => PlaneReader {
  const { graph, variables } = loop;
  const inputs = inputsOf(loop);
  const [first, second] = places.split(" ").map(Number) as [number, number];
  const inputOf = {
    t: inputs[0] as number,
    p: inputs[first + variables.length] as number,
    q: inputs[second + variables.length] as number,
  };
  const slopeOf = (node: number, slope: string): number =>
    [...slope].reduce((of, x) => derivative(graph, of, inputOf[x as "t"], inputs), node);
  return (node, slopes) =>
    planeReader(
      loop,
      [first, second],
      slopes.map((slope) => slopeOf(node, slope)),
    );
}

/** What a reader of `EQUATIONS` reads over a box. */
export function equationsOver(reader: PlaneReader, { t, p, q }: FoldBox): Equations {
  const [n, nt, np, nq, ntt, ntp, ntq] = reader.over(t, p, q) as [
    ...[n: Range, nt: Range, np: Range, nq: Range],
    ...[ntt: Range, ntp: Range, ntq: Range],
  ];
  return { n, nt, np, nq, ntt, ntp, ntq };
}
