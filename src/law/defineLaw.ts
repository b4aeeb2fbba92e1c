// Makes a law from its ports and its formula.
import type { LawCard, Port, Ports } from "../graph/card.ts";
import { type Meaning, Quantity } from "../graph/node.ts";
import { dimensionOf } from "../ground/dimension.ts";
import { fail } from "../ground/errors.ts";
import { checkedNumber } from "../ground/range.ts";
import type { Body, Law, LawFacts, LawSpec } from "./types.ts";
import { isList, type Wiring, wire } from "./wiring.ts";

/**
 * Defines a law of physics once: from its ports come the checks of inputs and units, the notes, the documentation and the
 * printed formula; from its body every reading. The body is nested recordable operations and must not branch on values.
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
  const card = cardOf(spec, false);
  const slow = (wires: unknown) => record(spec, card, wire(spec.name, spec.inputs, wires));
  return Object.assign(fastPath(spec, slow), { card }) as unknown as Law<I>;
}

/** The card of a law from its facts. */
export function cardOf<I extends Ports>(facts: LawFacts<I>, sampled: boolean): LawCard<I> {
  const { name, about = "", output, inputs, source = "", published = {} } = facts;
  return Object.freeze({
    name,
    about,
    output,
    inputs,
    source,
    published: published as LawCard["published"],
    sampled,
  });
}

/**
 * The common case with hardly an allocation: every port a number in its range or left to its default. Anything else
 * takes the slow path, which either records a quantity or throws the error that says what is wrong.
 */
function fastPath<I extends Ports>(
  spec: LawSpec<I>,
  slow: (wires: unknown) => unknown,
): (wires: Record<string, unknown>) => unknown {
  const ports = Object.entries(spec.inputs);
  if (spec.demands || ports.some(([, p]) => isList(p) || p.optional)) return slow;
  const names = ports.map(([name]) => name);
  const low = Float64Array.from(ports, ([, p]) => (p as Port).within?.[0] ?? -Number.MAX_VALUE);
  const high = Float64Array.from(ports, ([, p]) => (p as Port).within?.[1] ?? Number.MAX_VALUE);
  const defaults = Float64Array.from(ports, ([, p]) => (p as Port).default ?? Number.NaN);
  const write = spec.write as unknown as (wires: unknown) => unknown;
  return (wires) => {
    let unmatched = 0;
    for (const _ in wires) unmatched++;
    let body = wires;
    for (let i = 0; i < names.length; i++) {
      const name = names[i] as string;
      let value = wires?.[name];
      if (value === undefined) {
        value = defaults[i];
        if (body === wires) body = { ...wires };
        if (name in body) unmatched--;
        body[name] = value;
      } else unmatched--;
      if (!(typeof value === "number" && value >= (low[i] as number) && value <= (high[i] as number)))
        return slow(wires);
    }
    if (unmatched !== 0) return slow(wires);
    const result = write(body);
    return typeof result === "number" && Number.isFinite(result) ? result : slow(wires);
  };
}

function record<I extends Ports>(spec: LawSpec<I>, card: LawCard<I>, wiring: Wiring): number | Quantity {
  const { body, flat, graph } = wiring;
  if (graph) graph.depth++;
  try {
    const demands = Object.entries(spec.demands ?? {}).map(
      ([name, d]) => [name, d, d.write(body as Body<I>)] as const,
    );
    for (const [name, d, value] of demands) {
      if (typeof value === "number")
        checkedNumber(value, `${spec.name}.${name} (${d.about})`, d.unit, d.within);
    }
    const result = spec.write(body as Body<I>);
    if (!graph) return checkedResult(spec.name, spec.output.unit, result);
    const g = graph;
    const meaning: Meaning = {
      kind: "law",
      card,
      wires: Object.fromEntries(Object.entries(flat).map(([name, v]) => [name, g.lift(v)])),
      demands: Object.fromEntries(
        demands.map(([name, { unit, within, about }, v]) => [
          name,
          { node: g.lift(v), demand: { unit, within, about } },
        ]),
      ),
    };
    return new Quantity(g, g.mean(g.lift(result, spec.name), meaning, dimensionOf(spec.output.unit)));
  } finally {
    if (graph) graph.depth--;
  }
}

/** The finite number that a law gives; anything else is an error that names the law. */
export function checkedResult(law: string, unit: string, result: unknown): number {
  if (typeof result === "number" && Number.isFinite(result)) return result;
  return fail("not-finite", { path: law, value: result, allowed: "a finite number", unit });
}
