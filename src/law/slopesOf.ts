// The slopes of a law at a point, from the same formula as its value.
import type { Port, Ports } from "../graph/card.ts";
import { checkRecord } from "../ground/names.ts";
import { slopeKernel } from "../reading/slopeKernel.ts";
import { recordLaw } from "./recordLaw.ts";
import type { Law, Wires } from "./types.ts";
import { wire } from "./wiring.ts";

/** A law's value and its partial derivatives. */
export interface Slopes {
  readonly value: number;
  /** ∂ value / ∂ port by path (`covers[0].albedo` in lists), in the unit of the law over the unit of the port. */
  readonly slopes: Readonly<Record<string, number>>;
}

/**
 * The value of a law and its slope in every input, from the symbolic derivative of its formula. At a kink the slope is
 * one-sided; for a sampled law it is a difference quotient. A fraction that must be a number (in `mixAlbedo` without
 * `bare`) has no slope of its own and is left out. Throws `unreadable` for what is no law, and what a law throws (`Law`):
 * `missing`, `unknown-name`, `not-a-number`, `out-of-range`, `not-finite`.
 */
export function slopesOf<I extends Ports>(law: Law<I>, wires: Wires<I, number>): Slopes {
  checkRecord((law as Partial<Law> | undefined)?.card, "law", "a card, as a law has");
  const value = law(wires);
  const { flat, body } = wire(law.card.name, law.card.inputs, wires);
  const complete = law.card.inputs.bare !== undefined && body.bare === undefined;
  const { graph, output, inputs } = recordLaw(law, {
    rows: (list) => (body[list] as unknown[]).length,
    has: (port) => body[port] !== undefined,
    fixed: (path) => (complete && path.endsWith(".fraction") ? (flat[path] as number) : undefined),
  });
  const nodes = inputs.map((i) => i.node);
  const out = new Float64Array(1 + nodes.length);
  const point = Float64Array.from(
    inputs,
    ({ path, port }) => (flat[path] ?? (port as Port).default) as number,
  );
  slopeKernel(graph, { inputs: nodes, outputs: [output], wrt: nodes })(point, out);
  const slopes = Object.fromEntries(inputs.map(({ path }, i) => [path, out[1 + i] as number]));
  return Object.freeze({ value, slopes: Object.freeze(slopes) });
}
