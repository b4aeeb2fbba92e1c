// How much of λ runs along each line between couplings.
import type { Feedbacks } from "../feedback/feedbacks.ts";

/** A line between two places. */
export interface Edge {
  readonly from: number;
  readonly to: number;
  /** The part of λ that runs along it, W m⁻² K⁻¹. */
  readonly value: number;
}

/** What is drawn of the feedbacks of a state. */
export interface Edges {
  /** Temperature, the couplings in an order in which lines go on and never back, and the net flux. */
  readonly names: readonly string[];
  readonly edges: readonly Edge[];
}

export function edgesOf({ through, loops, reference }: Feedbacks): Edges {
  const couplings = through.filter((name) => loops.some((loop) => loop.through.includes(name)));
  const names = ["temperature", ...couplings, "net flux"];
  const paths = [{ ...reference, through: [] }, ...loops].map((loop) => ({
    ...loop,
    steps: ["temperature", ...loop.through, "net flux"],
  }));
  const edges = names.flatMap((end, to) =>
    names.slice(0, to).map((start, from) => {
      const own = paths.filter(({ steps }) => steps[steps.indexOf(start) + 1] === end);
      return { from, to, value: own.reduce((sum, path) => sum + path.feedbackParameter, 0) };
    }),
  );
  return { names, edges: edges.filter((edge) => edge.value) };
}
