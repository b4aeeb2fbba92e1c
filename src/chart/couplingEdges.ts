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
  const last = couplings.length + 1;
  const edges = [{ from: 0, to: last, value: reference.feedbackParameter }];
  for (const loop of loops) {
    const places = loop.through.map((name) => couplings.indexOf(name) + 1);
    [...places, last].forEach((to, i) => {
      const from = places[i - 1] ?? 0;
      const known = edges.find((edge) => edge.from === from && edge.to === to);
      if (known) known.value += loop.feedbackParameter;
      else edges.push({ from, to, value: loop.feedbackParameter });
    });
  }
  return { names: ["temperature", ...couplings, "net flux"], edges };
}
