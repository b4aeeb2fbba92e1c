// Makes a law from its ports and its formula.
import type { LawCard, Port, Ports } from "../graph/card.ts";
import { type DemandValue, Quantity } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import { checkRecord } from "../ground/names.ts";
import { ANY, checkedNumber } from "../ground/range.ts";
import type { Body, Law, LawFacts, LawSpec } from "./types.ts";
import { isList, wire } from "./wiring.ts";

/**
 * Defines a law of physics once: from its ports come the checks of inputs and units, the notes, the documentation and the
 * printed formula; from its body every reading. The body is nested recordable operations and must not branch on values.
 * Units are products of SI units, and each value is in that of its port; `within` is where the law has a meaning.
 *
 * Throws `unreadable` without ports or body. A wrong unit or range of a port is refused when the law is first recorded
 * (`unknown-unit`, `out-of-range`, `not-a-number`). The law itself throws what `Law` says.
 *
 * @example
 * const heatLeak = defineLaw({
 *   name: "heatLeak",
 *   output: { symbol: "F", unit: "W m-2" },
 *   inputs: { temperature: { symbol: "T", unit: "K", within: [0, 5000] }, slope: { symbol: "B", unit: "W m-2 K-1" } },
 *   write: ({ temperature, slope }) => mul(slope, temperature),
 * });
 */
export function defineLaw<const I extends Ports>(spec: LawSpec<I>): Law<I> {
  const { write, demands = {}, ...facts } = Object(spec) as LawSpec<I>;
  const card = cardOf(facts as LawFacts<I>, write);
  const { name, inputs } = card;
  const law = (wires: unknown): number | Quantity => {
    const { body, flat, graph } = wire(name, inputs, wires);
    const ports = body as Body<I>;
    const run = () => ({
      demands: Object.entries(demands).map(([key, demand]): DemandValue => {
        const value = demand.write(ports);
        if (!(value instanceof Quantity))
          checkedNumber(value, `${name}.${key} (${demand.about})`, demand.unit, demand.within);
        return [key, demand, value];
      }),
      result: write(ports),
    });
    return graph ? graph.lawNode(card, flat, run) : checkedResult(card, run().result);
  };
  return Object.assign(spec.demands ? law : fastPath(inputs, write, law), { card }) as unknown as Law<I>;
}

/** The card of a law from its facts. Throws `unreadable` where one is missing without which there is no law. */
export function cardOf<I extends Ports>(
  facts: LawFacts<I> & { readonly sampled?: true },
  body: unknown,
): LawCard<I> {
  checkRecord(body && facts.output && facts.inputs, "law", "ports, write");
  return Object.freeze({ about: "", source: "", published: {}, sampled: false, ...facts }) as LawCard<I>;
}

type Wired = Readonly<Record<string, unknown>>;

/**
 * The common case with hardly an allocation: every port a number in its range or left to its default. Anything else
 * takes the slow path, which either records a quantity or throws the error that says what is wrong.
 */
function fastPath<I extends Ports>(
  inputs: I,
  write: LawSpec<I>["write"],
  slow: (wires: Wired) => unknown,
): (wires: Wired) => unknown {
  const ports = Object.entries(inputs) as [string, Port][];
  if (ports.some(([, p]) => isList(p) || p.optional)) return slow;
  const limits = ports.map(([name, { within: [low, high] = ANY, default: fallback }]) => {
    return { name, low, high, default: fallback };
  });
  return (wires) => {
    let unmatched = 0;
    for (const _ in wires) unmatched++;
    let body = wires;
    for (const { name, low, high, default: fallback } of limits) {
      let value = wires?.[name];
      if (value === undefined) {
        value = fallback;
        body = { ...body, [name]: value };
      } else unmatched--;
      if (!(Number.isFinite(value) && (value as number) >= low && (value as number) <= high))
        return slow(wires);
    }
    const result = unmatched ? undefined : write(body as Body<I>);
    return Number.isFinite(result) ? result : slow(wires);
  };
}

/** The finite number that a law gives; anything else is an error that names the law. */
function checkedResult({ name, output }: LawCard, result: unknown): number {
  if (Number.isFinite(result)) return result as number;
  return fail("not-finite", { path: name, value: result, allowed: "a finite number", unit: output.unit });
}
