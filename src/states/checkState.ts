// What a state's numbers say about the laws behind them: hard ranges, published ranges, layers that do not balance.

import type { LawCard, Port } from "../graph/card.ts";
import { coneOf } from "../graph/cone.ts";
import { deepFreeze } from "../ground/deepFreeze.ts";
import type { Range } from "../ground/range.ts";
import { rootsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import type { Note } from "./note.ts";

/** One quantity to look at in every state, and what is to be said when it lies outside its range. */
export interface Check {
  readonly name: string;
  readonly node: number;
  readonly range: Range;
  readonly note: Omit<Note, "value" | "range">;
}

/** Every port and demand of every law of a loop whose value depends on a quantity, and the heat capacity. */
export function checksOf(loop: Loop): Check[] {
  const { graph, heatCapacity } = loop;
  const checks: Check[] = [];
  const check = (kind: keyof typeof OUTSIDE, about: string, node: number, range: Range, rest: Rest) => {
    if (graph.ops[node] !== "const")
      checks.push({ name: about, node, range, note: { ...OUTSIDE[kind], about, ...rest } });
  };
  check("range", "heatCapacity", heatCapacity, [0, Number.MAX_VALUE], { unit: "J m-2 K-1", source: null });
  for (const id of coneOf(graph, rootsOf(loop))) {
    const meaning = graph.meanings[id];
    if (meaning?.kind !== "law") continue;
    const { card, wires, demands } = meaning;
    const source = card.source || null;
    for (const [wire, node] of Object.entries(wires)) {
      const { within, unit } = portOf(card, wire);
      const published = card.published[wire];
      const about = `${card.name}.${wire}`;
      if (within) check("range", about, node, within, { unit, source });
      if (published) check("published", about, node, published, { unit, source });
    }
    for (const [name, { node, demand }] of Object.entries(demands)) {
      const { within, unit, about } = demand;
      check("range", `${card.name}.${name} (${about})`, node, within, { unit, source });
    }
  }
  return checks;
}

type Rest = Pick<Note, "unit" | "source">;

const OUTSIDE = {
  range: {
    code: "outside-range",
    severity: "invalid",
    text: "outside the range in which it has a meaning; do not use this state",
  },
  published: {
    code: "outside-published",
    severity: "caution",
    text: "outside the range that the source covers; the law is extrapolated",
  },
} as const;

/** The notes of the checks that fail, for the values of the checks' nodes in order. */
export function notesFrom(checks: readonly Check[], values: Float64Array): Note[] {
  const notes: Note[] = [];
  checks.forEach(({ range, note }, i) => {
    const value = values[i] as number;
    const [low, high] = range;
    if (!(value >= low && value <= high))
      notes.push(deepFreeze({ ...note, value, range: [low, high] as const }));
  });
  return notes;
}

/** The port of a wire; `covers[1].albedo` is a port of the records that `covers` lists. */
function portOf(card: LawCard, wire: string): Port {
  const found = /^(.*)\[\d+\]\.(.*)$/.exec(wire);
  const port = card.inputs[found ? (found[1] as string) : wire];
  return (port && "each" in port ? port.each[found?.[2] as string] : port) as Port;
}
