// Makes a law of an ordinary function of numbers: it can be read and searched, but not enclosed.
import type { Ports } from "../graph/card.ts";
import type { Compute } from "../graph/op.ts";
import type { Quantity } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import type { Range } from "../ground/range.ts";
import { cardOf } from "./defineLaw.ts";
import type { Law, LawFacts, NumberBody } from "./types.ts";
import { wire } from "./wiring.ts";

/** The definition of a sampled law. */
export interface SampledLawSpec<I extends Ports> extends LawFacts<I> {
  /** From numbers to a number, the same answer for the same numbers. */
  readonly compute: (ports: NumberBody<I>) => number;
}

/** Half the step of a difference quotient relative to its argument: the cube root of 2⁻⁵², where both errors balance. */
const STEP = 6.055454452393343e-6;

/** The function of a law, as the graph holds it, with what searches the loops that depend on it. */
export interface SearchedFunction<S> extends Compute {
  readonly search: S;
}

/** The law of an ordinary function, whose slopes are difference quotients; with it comes what searches the loops that use it. */
export function functionLaw<const I extends Ports>(spec: SampledLawSpec<I>, search: unknown): Law<I> {
  const { compute: body, ...facts } = Object(spec) as SampledLawSpec<I>;
  const card = cardOf({ ...facts, sampled: true }, body);
  const names = Object.keys(card.inputs);
  const ranges = names.map((n) => (card.inputs[n] as { within?: Range }).within);
  const value = (...inputs: number[]): number => {
    const ports = Object.fromEntries(names.map((n, i) => [n, inputs[i]]));
    const result = body(ports as NumberBody<I>);
    if (Number.isFinite(result)) return result;
    const here = names.map((n, i) => `${n} = ${inputs[i]}`).join(", ");
    return fail("not-finite", {
      path: card.name,
      value: result,
      allowed: `a finite number in ${card.output.unit}, here for ${here}`,
    });
  };
  const compute: SearchedFunction<unknown> = { ...differentiable(value, ranges), search };
  const apply = (wires: unknown): number | Quantity => {
    const { flat, graph } = wire(card.name, card.inputs, wires);
    if (!graph) return value(...names.map((n) => flat[n] as number));
    return graph.lawNode(card, flat, () => ({ demands: [], result: graph.callNode(compute, flat) }));
  };
  return Object.assign(apply, { card }) as unknown as Law<I>;
}

/** A function with difference quotients as partial derivatives; the step stays inside the ranges of the ports. */
function differentiable(value: Compute["value"], ranges: readonly (Range | undefined)[]): Compute {
  const partials = new Map<number, Compute>();
  const partial = (index: number): Compute => {
    let found = partials.get(index);
    if (!found) {
      found = differentiable((...inputs) => differenceQuotient(value, inputs, index, ranges[index]), ranges);
      partials.set(index, found);
    }
    return found;
  };
  return { value, partial };
}

function differenceQuotient(
  f: Compute["value"],
  inputs: readonly number[],
  index: number,
  range?: Range,
): number {
  const x = inputs[index] as number;
  const h = STEP * Math.max(1, Math.abs(x));
  const low = Math.max(x - h, range?.[0] ?? x - h);
  const high = Math.min(x + h, range?.[1] ?? x + h);
  const at = (v: number) => f(...inputs.map((w, i) => (i === index ? v : w)));
  return (at(high) - at(low)) / (high - low);
}
