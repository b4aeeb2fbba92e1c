// A function that is read by a kernel of spans, as searches want it.
import type { SpanKernel } from "../reading/spanKernel.ts";
import type { Enclosed, Ends } from "../search/enclosed.ts";

/** The kernel reads value and slope at ends, both over spans, and the curvature over spans. */
export function enclosedBy({ size, point, over }: SpanKernel): Enclosed {
  const [box, bend] = over as [Ends["box"], Ends["bend"]];
  return enclosedByEnds({ ...{ size, at: 1 }, point, box, bend });
}

/** A function that is read by its ends; it can also be read at once. */
export function enclosedByEnds(ends: Ends): Enclosed {
  const { size, at, point, box, bend } = ends;
  const left = new Float64Array(size);
  const right = new Float64Array(size);
  const curvature = new Float64Array(3);
  return {
    ends,
    point(x, out) {
      left[0] = x;
      point(left);
      for (let i = 0; i < 6; i++) out[i] = left[at + i] as number;
    },
    box(a, b, out) {
      left[0] = a;
      right[0] = b;
      point(left);
      point(right);
      box(left, right, out);
      bend(left, right, curvature);
      out.set(curvature, 6);
    },
  };
}
