// In which powers of temperature a quantity depends on it.
import { coneOf } from "../graph/cone.ts";
import type { Graph } from "../graph/node.ts";
import type { Op } from "../graph/op.ts";

/** The powers in a sum of powers of temperature, rising; `null`: no such sum, as for an exponential. */
export type Powers = readonly number[] | null;

/** A sum of more powers than this is not looked into. */
const MOST = 4;

/** The powers of temperature in some nodes, with `held` and all other inputs taken as independent of it. */
export function temperaturePowers(
  g: Graph,
  nodes: readonly number[],
  temperature: number,
  held: readonly number[],
): Powers[] {
  const known = new Map<number, Powers>([[temperature, [1]], ...held.map((id) => [id, [0]] as const)]);
  for (const id of coneOf(g, nodes, known.keys())) {
    if (known.has(id)) continue;
    const args = (g.args[id] as readonly number[]).map((a) => known.get(a) as Powers);
    const independent = args.every((powers) => powers?.length === 1 && powers[0] === 0);
    known.set(id, independent ? [0] : powersOf(g.ops[id] as Op, args));
  }
  return nodes.map((id) => known.get(id) as Powers);
}

function powersOf(op: Op, [a, b]: readonly Powers[]): Powers {
  if (a === null || a === undefined || b === null) return null;
  switch (op) {
    case "mean":
    case "neg":
      return a;
    case "sqrt":
      return a.length === 1 ? [(a[0] as number) / 2] : null;
    case "add":
    case "sub":
      return collected([...a, ...(b as readonly number[])]);
    case "mul":
      return collected(a.flatMap((x) => (b as readonly number[]).map((y) => x + y)));
    case "div":
      return b?.length === 1 ? a.map((x) => x - (b[0] as number)) : null;
    default:
      return null;
  }
}

function collected(powers: readonly number[]): Powers {
  const all = [...new Set(powers)].sort((x, y) => x - y);
  return all.length > MOST ? null : all;
}
