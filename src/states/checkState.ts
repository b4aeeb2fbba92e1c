// What a state's numbers say about the laws behind them: hard ranges, published ranges, layers that do not balance.

import type { LawCard, Port } from "../graph/card.ts";
import { coneOf } from "../graph/cone.ts";
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { Note } from "./note.ts";

/** One quantity to look at in every state, and what is to be said when it lies outside its range. */
export interface Check {
  readonly node: number;
  readonly range: Range;
  readonly note: Omit<Note, "value" | "range">;
}

/** Every port and demand of every law of a loop whose value depends on a quantity. */
export function checksOf(loop: Loop): Check[] {
  const { graph } = loop;
  const roots = [
    ...loop.variables.map((v) => v.rate),
    ...loop.flows.map((f) => f.node),
    ...loop.report.map((r) => r.node),
  ];
  const checks: Check[] = [];
  for (const id of coneOf(graph, [...roots, loop.heatCapacity])) {
    const meaning = graph.meanings[id];
    if (meaning?.kind !== "law") continue;
    const { card } = meaning;
    for (const [wire, node] of Object.entries(meaning.wires)) {
      if (graph.ops[node] === "const") continue;
      const port = portOf(card, wire);
      if (port.within) checks.push(hard(card, wire, node, port.within, port.unit));
      const published = card.published[wire];
      if (published) checks.push({ node, range: published, note: soft(card, wire, port.unit) });
    }
    for (const [name, { node, demand }] of Object.entries(meaning.demands)) {
      if (graph.ops[node] !== "const")
        checks.push(hard(card, `${name} (${demand.about})`, node, demand.within, demand.unit));
    }
  }
  return checks;
}

/** The notes of the checks that fail, for the values of the checks' nodes in order. */
export function notesFrom(checks: readonly Check[], values: Float64Array): Note[] {
  const notes: Note[] = [];
  checks.forEach(({ range, note }, i) => {
    const value = values[i] as number;
    if (!(value >= range[0] && value <= range[1])) notes.push(Object.freeze({ ...note, value, range }));
  });
  return notes;
}

function hard(card: LawCard, wire: string, node: number, range: Range, unit: string): Check {
  const text = "outside the range in which this law has a meaning; do not use this state";
  return {
    node,
    range,
    note: {
      code: "outside-range",
      severity: "invalid",
      about: `${card.name}.${wire}`,
      unit,
      text,
      source: card.source || null,
    },
  };
}

function soft(card: LawCard, wire: string, unit: string): Check["note"] {
  const text = "outside the range that the source covers; the law is extrapolated";
  return {
    code: "outside-published",
    severity: "caution",
    about: `${card.name}.${wire}`,
    unit,
    text,
    source: card.source || null,
  };
}

/** The port of a wire; `covers[1].albedo` is a port of the records that `covers` lists. */
function portOf(card: LawCard, wire: string): Port {
  const found = /^(.*)\[\d+\]\.(.*)$/.exec(wire);
  const port = card.inputs[found ? (found[1] as string) : wire];
  return (port && "each" in port ? port.each[found?.[2] as string] : port) as Port;
}
