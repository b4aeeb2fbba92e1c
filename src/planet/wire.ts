// How a description's values reach the laws: as numbers for a first check, as givens when the loop is closed.
import type { Value } from "../graph/quantity.ts";
import { ThermosteadError } from "../ground/errors.ts";

/** The value at a path of the description. */
export type Wire = (path: string) => Value;

/** Whatever a law is called with here. */
type Call = (wires: Record<string, Value>) => Value;

/** Fills a law's ports from the fields of `written`; its errors name the place in the description. */
export function callLaw(
  law: unknown,
  {
    path,
    written,
    wire,
    bound,
  }: { path: string; written: object; wire: Wire; bound?: Record<string, Value> },
): Value {
  const ports = Object.keys(written).filter((key) => key !== "law");
  const wires = Object.fromEntries(ports.map((port) => [port, wire(`${path}.${port}`)]));
  try {
    return (law as Call)({ ...bound, ...wires });
  } catch (error) {
    if (!(error instanceof ThermosteadError)) throw error;
    const { code, value, allowed, unit } = error;
    const where = error.path.replace(/^\w+/, path);
    throw new ThermosteadError(code, { path: where, value, allowed, unit });
  }
}
