// Checks what a caller connects to the ports of a law, and fills in defaults.
import type { ListPort, Port, Ports } from "../graph/card.ts";
import { BARE, type Graph, Quantity } from "../graph/node.ts";
import { dimensionOf, showDimension } from "../ground/dimension.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, showRange } from "../ground/range.ts";

/** Checked wires: the body's input, and every single wire by its path. */
export interface Wiring {
  readonly body: Record<string, unknown>;
  readonly flat: Readonly<Record<string, number | Quantity>>;
  /** The loop's graph, if any wire is a quantity. */
  readonly graph: Graph | undefined;
}

/** Throws the error of the first wire that is missing, unknown, out of range, in the wrong unit or of another loop. */
export function wire(law: string, ports: Ports, wires: unknown): Wiring {
  const given = asRecord(wires, law);
  checkKeys(given, law, Object.keys(ports));
  const body: Record<string, unknown> = {};
  const flat: Record<string, number | Quantity> = {};
  let graph: Graph | undefined;
  const connect = (port: Port, value: unknown, name: string): number | Quantity | undefined => {
    const checked = checkedWire(port, value, `${law}.${name}`);
    if (checked === undefined) return undefined;
    if (checked instanceof Quantity) {
      graph ??= checked.graph;
      graph.lift(checked, `${law}.${name}`);
    }
    flat[name] = checked;
    return checked;
  };
  for (const [name, port] of Object.entries(ports)) {
    if (!isList(port)) {
      body[name] = connect(port, given[name], name);
      continue;
    }
    body[name] = rowsOf(given[name], `${law}.${name}`).map((row, i) => {
      const path = `${name}[${i}]`;
      checkKeys(row, `${law}.${path}`, Object.keys(port.each));
      return Object.fromEntries(
        Object.entries(port.each).map(([k, p]) => [k, connect(p, row[k], `${path}.${k}`)]),
      );
    });
  }
  return { body, flat, graph };
}

/** True for a port that takes a list of records. */
export const isList = (port: Port | ListPort): port is ListPort => "each" in port;

function asRecord(value: unknown, path: string): Record<string, unknown> {
  if (typeof value !== "object" || value === null || value instanceof Quantity) {
    fail("unreadable", { path, value, allowed: "one object with a value for each port" });
  }
  return value as Record<string, unknown>;
}

function rowsOf(value: unknown, path: string): Record<string, unknown>[] {
  if (value === undefined) fail("missing", { path, value, allowed: "as a list of records" });
  if (!Array.isArray(value) || value.length === 0) {
    fail("unreadable", { path, value, allowed: "a list of at least one record" });
  }
  return value.map((row, i) => asRecord(row, `${path}[${i}]`));
}

function checkedWire(port: Port, value: unknown, path: string): number | Quantity | undefined {
  if (value === undefined) {
    if (port.default !== undefined || port.optional) return port.default;
    fail("missing", {
      path,
      value,
      allowed: port.within ? `between ${showRange(port.within)}` : "",
      unit: port.unit,
    });
  }
  if (!(value instanceof Quantity)) return checkedNumber(value, path, port.unit, port.within);
  const found = value.graph.dimensions[value.id];
  if (found !== undefined && found !== BARE && found !== dimensionOf(port.unit)) {
    fail("unit-mismatch", { path, value: showDimension(found), allowed: port.unit });
  }
  return value;
}
