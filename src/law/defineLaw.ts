// Makes a law from its ports and its formula.
import type { LawCard, Port, Ports } from "../graph/card.ts";
import { type DemandValue, Quantity } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import { checkedNumber } from "../ground/range.ts";
import type { Body, Law, LawDemand, LawFacts, LawSpec } from "./types.ts";
import { isList, wire } from "./wiring.ts";

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
  const { write: _, demands: __, ...facts } = spec;
  const card = cardOf(facts as LawFacts<I>, false);
  const slow = (wires: Wired) => apply(spec, card, wires);
  return Object.assign(fastPath(spec, slow), { card }) as unknown as Law<I>;
}

/** The card of a law from its facts. */
export const cardOf = <I extends Ports>(facts: LawFacts<I>, sampled: boolean): LawCard<I> =>
  Object.freeze({ about: "", source: "", published: {}, ...facts, sampled }) as LawCard<I>;

type Wired = Record<string, unknown>;

/**
 * The common case with hardly an allocation: every port a number in its range or left to its default. Anything else
 * takes the slow path, which either records a quantity or throws the error that says what is wrong.
 */
function fastPath<I extends Ports>(
  spec: LawSpec<I>,
  slow: (wires: Wired) => unknown,
): (wires: Wired) => unknown {
  const ports = Object.entries(spec.inputs) as [string, Port][];
  if (spec.demands || ports.some(([, p]) => isList(p) || p.optional)) return slow;
  const { MAX_VALUE } = Number;
  const limits = ports.map(
    ([name, { within: [low, high] = [-MAX_VALUE, MAX_VALUE], default: fallback }]) => ({
      ...{ name, low, high, fallback },
    }),
  );
  const write = spec.write as unknown as (wires: Wired) => unknown;
  return (wires) => {
    let unmatched = 0;
    for (const _ in wires) unmatched++;
    let body = wires;
    for (const { name, low, high, fallback } of limits) {
      let value = wires?.[name];
      if (value === undefined) {
        value = fallback;
        if (body === wires) body = { ...wires };
        body[name] = value;
      } else unmatched--;
      if (!(typeof value === "number" && value >= low && value <= high)) return slow(wires);
    }
    const result = unmatched === 0 ? write(body) : undefined;
    return Number.isFinite(result) ? result : slow(wires);
  };
}

function apply<I extends Ports>(spec: LawSpec<I>, card: LawCard<I>, wires: unknown): number | Quantity {
  const { body, flat, graph } = wire(spec.name, spec.inputs, wires);
  const ports = body as Body<I>;
  const run = () => ({
    demands: Object.entries(spec.demands ?? {}).map(
      ([name, d]): DemandValue => [name, d, checkedDemand(spec.name, name, d, ports)],
    ),
    result: spec.write(ports),
  });
  if (!graph) return checkedResult(card, run().result);
  const { demands, result } = graph.inBody(run);
  return graph.lawNode(card, flat, demands, result);
}

/** Evaluates or records a demand; a number outside its range is refused at once. */
function checkedDemand<I extends Ports>(
  law: string,
  name: string,
  demand: LawDemand<I>,
  ports: Body<I>,
): unknown {
  const value = demand.write(ports);
  if (!(value instanceof Quantity)) {
    checkedNumber(value, `${law}.${name} (${demand.about})`, demand.unit, demand.within);
  }
  return value;
}

/** The finite number that a law gives; anything else is an error that names the law. */
export function checkedResult({ name, output }: LawCard, result: unknown): number {
  if (Number.isFinite(result)) return result as number;
  return fail("not-finite", { path: name, value: result, allowed: "a finite number", unit: output.unit });
}
