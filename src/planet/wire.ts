// How a description's values reach the laws: as numbers for a first check, as givens when the loop is closed.
import type { Value } from "../graph/quantity.ts";
import { ThermosteadError } from "../ground/errors.ts";
import { elsewhere, lawNamed } from "./fieldLaws.ts";

/** The value at a path of the description. */
export type Wire = (path: string) => Value;

/** The same in numbers, SI. */
export type Numbers = (path: string) => number;

/** What a budget is written from. */
export interface Sources {
  readonly wire: Wire;
  readonly temperature: Value;
  /** Declares what answers to the climate. */
  readonly couple: (name: "albedo" | "surfaceAlbedo" | "opticalDepth", value: Value) => Value;
}

/** A law as it stands in a description. */
export interface WrittenLaw {
  readonly law: string;
}

/** Whether a law's value changes with the temperature of the planet. */
export const answersToTemperature = ({ law }: WrittenLaw): boolean =>
  Object.hasOwn(lawNamed(law).card.inputs, "temperature");

/**
 * A law of a description: its temperature is the planet's, some ports take what stands elsewhere, and `bound` stands in
 * place of the ports of these names.
 */
export function callWritten(
  written: WrittenLaw,
  path: string,
  { wire, temperature }: Pick<Sources, "wire" | "temperature">,
  bound: Readonly<Record<string, Value>> = {},
): Value {
  const law = lawNamed(written.law);
  const given = Object.keys(law.card.inputs).flatMap((port): [string, Value][] => {
    if (port === "temperature") return [[port, temperature]];
    const from = elsewhere(written.law, port);
    return from === undefined ? [] : [[port, wire(from)]];
  });
  return callLaw(law, { path, written, wire, bound: { ...Object.fromEntries(given), ...bound } });
}

/** Fills a law's ports from the fields of `written`; its errors name the place in the description. */
export function callLaw(
  law: unknown,
  {
    path,
    written,
    wire,
    bound = {},
  }: { path: string; written: object; wire: Wire; bound?: Readonly<Record<string, Value>> },
): Value {
  const own = Object.entries(written).filter(([key]) => key !== "law" && !Object.hasOwn(bound, key));
  const wires = wiresOf(path, Object.fromEntries(own), wire);
  try {
    return (law as Call)({ ...wires, ...bound });
  } catch (error) {
    if (!(error instanceof ThermosteadError)) throw error;
    const { code, value, allowed, unit } = error;
    const where = error.path.replace(/^\w+/, path);
    throw new ThermosteadError(code, { path: where, value, allowed, unit });
  }
}

/** Whatever a law is called with here. */
type Call = (wires: Readonly<Record<string, unknown>>) => Value;

/** Each field as the value at its path; a list of records field by field. */
function wiresOf(path: string, record: object, wire: Wire): Record<string, unknown> {
  return Object.fromEntries(
    Object.entries(record).map(([key, value]) => {
      const at = `${path}.${key}`;
      if (!Array.isArray(value)) return [key, wire(at)];
      return [key, value.map((each: object, i) => wiresOf(`${at}[${i}]`, each, wire))];
    }),
  );
}
