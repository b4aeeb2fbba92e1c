// Holds couplings of a loop at a state.

import { coneOf } from "../graph/cone.ts";
import { substitute } from "../graph/substitute.ts";
import { fail } from "../ground/errors.ts";
import { failUnknown } from "../ground/names.ts";
import { checkBelongs, type StateLike } from "./checkBelongs.ts";
import { checkLoop } from "./checkLoop.ts";
import type { Couplings, Loop } from "./types.ts";

/**
 * The same loop with couplings held at a state: each keeps its dependence on the givens and loses that on the variables,
 * q_held(T, p) = q(T_ref, p) with T_ref the temperature of the state. So a given that enters through a held coupling still
 * acts; freezing its value instead would switch that given off. λ loses exactly the feedback loops through what is held.
 *
 * The result is a loop like any other: it can be searched, analysed and held again, and its couplings keep their names.
 * `state` may come from `JSON.parse`. Temperatures in K.
 *
 * Throws `unknown-name` (with the nearest coupling), `foreign-state` (the state is no equilibrium of this loop),
 * `temperature-unused` (nothing that is left answers to temperature), `unreadable`, `missing`, `not-a-number`,
 * `out-of-range`. Source: partial radiative perturbation, Wetherald & Manabe 1988, J. Atmos. Sci. 45, 1397.
 *
 * @example findStates(holdFixed(loop, ["albedo"], state), { within: [150, 400], at: { flux: 1400 } })
 */
export function holdFixed<N extends string>(
  loop: Loop<N>,
  names: readonly Couplings<N>[],
  state: StateLike<N>,
): Loop<N> {
  checkLoop(loop, "holdFixed");
  const held = couplingsNamed(loop, names, "names");
  const { values } = checkBelongs(loop, state, "state");
  const { graph, variables, givens, couplings, flows, report } = loop;
  const place = new Map(variables.map((v, i) => [v.node, values[i] as number]));
  const roots = [...flows, ...report, ...couplings, ...variables, ...givens].map((r) => r.node);
  roots.push(...variables.map((v) => v.rate), loop.net, loop.heatCapacity);
  const copied = substitute(graph, roots, {
    inputs: new Set(place.keys()),
    inside: new Map(held.map((c) => [c.node, 1])),
    replace: (copy, input, marks) => (marks === 0 ? undefined : copy.constant(place.get(input) as number)),
  });
  const there = <R extends { readonly node: number }>(r: R): R => ({ ...r, node: copied.nodeOf(r.node) });
  const net = copied.nodeOf(loop.net);
  const temperature = copied.nodeOf((variables[0] as { node: number }).node);
  if (!coneOf(copied.graph, [net]).includes(temperature)) {
    fail("temperature-unused", {
      path: "names",
      value: names.join(),
      allowed: "couplings without which a flow still depends on temperature",
    });
  }
  const before = loop.toJSON() as { held?: Readonly<Record<string, number>> };
  const marks = Object.fromEntries(held.map((c) => [c.name, values[0] as number]));
  return Object.freeze({
    ...loop,
    graph: copied.graph,
    net,
    heatCapacity: copied.nodeOf(loop.heatCapacity),
    variables: variables.map((v) => ({ ...there(v), rate: copied.nodeOf(v.rate) })),
    givens: givens.map(there),
    couplings: couplings.map(there),
    flows: flows.map(there),
    report: report.map(there),
    toJSON: () => ({ ...before, held: { ...before.held, ...marks } }),
  });
}

/** The couplings of a loop by these names, each once. Throws `unreadable` and `unknown-name`. */
export function couplingsNamed(loop: Loop, names: readonly string[], path: string): Loop["couplings"] {
  if (!Array.isArray(names))
    fail("unreadable", { path, value: names, allowed: "a list of names of couplings" });
  const known = loop.couplings.map((c) => c.name);
  names.forEach((name, i) => {
    if (!known.includes(name)) failUnknown(`${path}[${i}]`, String(name), known);
  });
  return loop.couplings.filter((c) => names.includes(c.name));
}
