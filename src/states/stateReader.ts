// Reads everything about a state of a loop of one variable at a temperature.

import { derivative } from "../graph/derivative.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { checksOf, notesFrom } from "./checkState.ts";
import { ledgerOf, openReservoirs } from "./ledger.ts";
import type { Note } from "./note.ts";
import type { State } from "./state.ts";

/** What a search found about a state before it is read. */
export interface Located {
  readonly at: number;
  readonly bracket: readonly [number, number];
}

/** Makes states from temperatures. */
export type StateReader = (located: Located, givens: readonly number[]) => State;

/** λ that is this small against the largest slope of a single flow cannot be told from zero. */
const SLOPE_NOISE = 1e-13;

/** Prepares one kernel that reads all that a state holds. */
export function stateReader(loop: Loop): StateReader {
  const { graph, net, heatCapacity, flows, couplings, report, givens } = loop;
  const inputs = inputsOf(loop);
  const temperature = inputs[0] as number;
  const slopeOf = (node: number) => derivative(graph, node, temperature, inputs);
  const checks = checksOf(loop);
  const flowSlopes = flows.map((f) => slopeOf(f.node));
  const nodes = [
    ...[net, slopeOf(net), heatCapacity, ...flowSlopes],
    ...[...flows, ...couplings, ...report, ...checks].map((r) => r.node),
  ];
  const kernel = valueKernel(graph, { inputs, outputs: nodes });
  const values = new Float64Array(nodes.length);
  const place = new Map(nodes.map((node, i) => [node, i]));
  const valueAt = (node: number) => values[place.get(node) as number] as number;
  const named = (list: readonly { name: string; node: number }[]) =>
    Object.fromEntries(list.map(({ name, node }) => [name, valueAt(node)]));
  return ({ at, bracket }, given) => {
    kernel(Float64Array.of(at, ...given), values);
    const lambda = valueAt(nodes[1] as number);
    const scale = Math.max(...flowSlopes.map((s) => Math.abs(valueAt(s))));
    const capacity = valueAt(heatCapacity);
    const stability =
      Math.abs(lambda) > SLOPE_NOISE * scale ? (lambda < 0 ? "stable" : "unstable") : "undecided";
    const ledger = ledgerOf(flows, valueAt(net), valueAt);
    return deepFreeze({
      variables: { temperature: { value: at, bracket } },
      temperature: at,
      bracket,
      givens: Object.fromEntries(givens.map(({ name }, i) => [name, given[i] as number])),
      couplings: named(couplings),
      report: named(report),
      stability,
      eigenvalues: capacity > 0 ? [{ re: lambda / capacity, im: 0 }] : null,
      feedbackParameter: lambda,
      settledFeedbackParameter: lambda,
      eFoldingTime: stability === "stable" ? -capacity / lambda : null,
      imbalance: { temperature: Math.abs(valueAt(net)) },
      ledger,
      notes: [...notesFrom(checks, valueAt), ...openReservoirs(ledger), ...capacityNotes(capacity)],
    });
  };
}

function capacityNotes(capacity: number): Note[] {
  if (capacity >= 0) return [];
  const text = "a heat capacity below zero has no meaning; do not use this state's times";
  const range = [0, Number.MAX_VALUE] as const;
  const rest = { value: capacity, range, unit: "J m-2 K-1", text, source: null };
  return [{ code: "negative-heat-capacity", severity: "invalid", about: "heatCapacity", ...rest }];
}

function deepFreeze<T>(value: T): T {
  if (typeof value === "object" && value !== null && !Object.isFrozen(value)) {
    Object.values(value).forEach(deepFreeze);
    Object.freeze(value);
  }
  return value;
}
