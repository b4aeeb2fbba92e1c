// The published sources behind a loop.
import { coneOf } from "../graph/cone.ts";
import { checkLoop } from "./checkLoop.ts";
import { rootsOf } from "./inputs.ts";
import type { Loop } from "./types.ts";

/** A law that takes part in a loop, and where it is published. */
export interface LawSource {
  readonly law: string;
  readonly about: string;
  readonly source: string;
}

/** The laws of a loop in the order in which they were written, each once, with their sources. Throws `unreadable`. */
export function sourcesOf(loop: Loop): readonly LawSource[] {
  checkLoop(loop, "sourcesOf");
  const found = new Map<string, LawSource>();
  for (const id of coneOf(loop.graph, rootsOf(loop))) {
    const meaning = loop.graph.meanings[id];
    if (meaning?.kind !== "law") continue;
    const { name, about, source } = meaning.card;
    found.set(name, { law: name, about, source });
  }
  return Object.freeze([...found.values()]);
}
