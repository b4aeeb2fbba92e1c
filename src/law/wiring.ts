// Checks what a caller connects to the ports of a law, and fills in defaults.
import type { ListPort, Port, Ports } from "../graph/card.ts";
import { Quantity, type Recorder } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber } from "../ground/range.ts";

/** Checked wires: the body's input, and every single wire by its path. */
export interface Wiring {
  readonly body: Record<string, unknown>;
  readonly flat: Readonly<Record<string, number | Quantity>>;
  /** The loop's graph, if any wire is a quantity. */
  readonly graph: Recorder | undefined;
}

/** Throws the error of the first wire that is missing, unknown, out of range, in the wrong unit or of another loop. */
export function wire(law: string, ports: Ports, wires: unknown): Wiring {
  const flat: Record<string, number | Quantity> = {};
  let graph: Recorder | undefined;
  const connect = (port: Port | ListPort, value: unknown, name: string): unknown => {
    const path = `${law}.${name}`;
    if (isList(port)) {
      if (!(Array.isArray(value) && value.length)) {
        return fail("unreadable", { path, value, allowed: "a list of records" });
      }
      return value.map((row, i) => connectAll(port.each, row, `${name}[${i}].`));
    }
    const wired = value === undefined ? port.default : value;
    if (wired === undefined && port.optional) return wired;
    if (wired instanceof Quantity) {
      graph ??= wired.graph;
      graph.checkWire(wired, port.unit, path);
    } else checkedNumber(wired, path, port.unit, port.within);
    flat[name] = wired as number | Quantity;
    return wired;
  };
  const connectAll = (named: Ports, given: unknown, prefix: string): Record<string, unknown> => {
    const path = `${law}.${prefix}`.slice(0, -1);
    checkKeys(given instanceof Quantity ? "quantity" : given, path, Object.keys(named));
    return Object.fromEntries(
      Object.entries(named).map(([k, port]) => [k, connect(port, (given as Wires)[k], prefix + k)]),
    );
  };
  return { body: connectAll(ports, wires, ""), flat, graph };
}

type Wires = Readonly<Record<string, unknown>>;

/** True for a port that takes a list of records. */
export const isList = (port: Port | ListPort): port is ListPort => "each" in port;
