// Every exported law, and random inputs for it.
import fc from "fast-check";
import type { LawCard, Port, Ports } from "../../src/graph/card.ts";
import * as door from "../../src/index.ts";

/** A law with its types forgotten. */
export interface AnyLaw {
  (wires: unknown): number;
  readonly card: LawCard;
}

/** All laws of the core door. */
export const laws: readonly AnyLaw[] = Object.values(door).filter(
  (value): value is never => typeof value === "function" && "card" in value,
) as unknown as AnyLaw[];

/** Laws with conditions that join several ports, so that inputs may be refused though each is in its range. */
export const JOINED: readonly string[] = ["mixAlbedo", "quadraticAlbedo", "rampAlbedo"];

/** Inputs by port; a list port holds records. */
export type Inputs = Readonly<Record<string, number | readonly Readonly<Record<string, number>>[]>>;

/** How long lists are. */
export const ROWS = 3;

/** Values as the trade meets them, by unit; a port's own range is kept. */
const USUAL: Readonly<Record<string, readonly [number, number]>> = {
  K: [150, 450],
  "W m-2": [1, 2000],
  "1": [0.05, 0.95],
  W: [1e23, 1e28],
  m: [1e8, 1e12],
  s: [1e5, 1e9],
  kg: [1e29, 1e31],
  Pa: [1e2, 1e7],
  "m s-2": [1, 30],
  "J kg-1 K-1": [500, 5000],
  "kg m-3": [500, 5000],
  "W m-2 K-1": [0.5, 5],
};
/** Ports for which the unit says too little. */
const USUAL_PORTS: Readonly<Record<string, readonly [number, number]>> = {
  depth: [0.1, 1000],
  width: [2, 50],
  frozenBelow: [230, 262],
  openAbove: [268, 300],
  closure: [1.1, 1.9],
  layers: [0.5, 10],
  opticalDepth: [0.01, 50],
  effectiveTemperature: [150, 7000],
  radius: [1e8, 1e10],
  // inside the ends of its range, so that differences can be taken on both sides
  redistribution: [0.26, 0.95],
};

/** Numbers for a port where laws are used. */
function usual(name: string, { unit, within = [-1e300, 1e300] }: Port): fc.Arbitrary<number> {
  const range = USUAL_PORTS[name] ?? USUAL[unit];
  if (!range) throw new Error(`no usual range for ${name} in ${unit}`);
  const [min, max] = [Math.max(range[0], within[0]), Math.min(range[1], within[1])];
  return fc.double({ min, max, noNaN: true });
}

/** Any number that a port allows, small and large ones alike. */
function allowed(_: string, { within = [-1e12, 1e12] }: Port): fc.Arbitrary<number> {
  const [min, max] = within;
  const even = fc.double({ min, max, noNaN: true });
  if (min < 0) return even;
  const least = Math.max(min, max * 1e-18);
  const logarithmic = fc
    .double({ min: Math.log(least), max: Math.log(max), noNaN: true })
    .map((x) => Math.min(max, Math.max(min, Math.exp(x))));
  return fc.oneof(even, logarithmic, fc.constantFrom(min, max));
}

type Pick = (name: string, port: Port) => fc.Arbitrary<number>;

function inputsOf(ports: Ports, pick: Pick): fc.Arbitrary<Inputs> {
  const list = (each: Readonly<Record<string, Port>>) => {
    const record = Object.fromEntries(Object.entries(each).map(([k, port]) => [k, pick(k, port)]));
    // fractions of a surface must not exceed it together
    const shared = record.fraction ? { ...record, fraction: record.fraction.map((f) => f / ROWS) } : record;
    return fc.array(fc.record(shared), { minLength: ROWS, maxLength: ROWS });
  };
  const arbitraries = Object.entries(ports).map(
    ([name, port]) => [name, "each" in port ? list(port.each) : pick(name, port)] as const,
  );
  return fc.record(Object.fromEntries(arbitraries) as Record<string, fc.Arbitrary<never>>);
}

/** Inputs where laws are used, optional ports and defaults filled in. */
export const usualInputs = ({ card }: AnyLaw): fc.Arbitrary<Inputs> => inputsOf(card.inputs, usual);

/** Inputs anywhere in the ranges of the ports; conditions that join ports may still refuse them. */
export const allowedInputs = ({ card }: AnyLaw): fc.Arbitrary<Inputs> => inputsOf(card.inputs, allowed);

/** The wires of some inputs by path, as slopes and formulas name them. */
export function wiresOf(inputs: Inputs): Record<string, number> {
  const wires: Record<string, number> = {};
  for (const [name, value] of Object.entries(inputs)) {
    if (typeof value === "number") wires[name] = value;
    else
      value.forEach((row, i) => {
        for (const [key, number] of Object.entries(row)) wires[`${name}[${i}].${key}`] = number;
      });
  }
  return wires;
}

/** The port of a wire. */
export function portOf({ card }: AnyLaw, path: string): Port {
  const [, list, key] = /^(.*)\[\d+\]\.(.*)$/.exec(path) ?? [];
  const port = card.inputs[list ?? path];
  if (!port) throw new Error(`${card.name} has no port ${path}`);
  return "each" in port ? (port.each[key as string] as Port) : port;
}

/** The inputs with one wire replaced. */
export function withWire(inputs: Inputs, path: string, value: number): Inputs {
  const [, list, row, key] = /^(.*)\[(\d+)\]\.(.*)$/.exec(path) ?? [];
  if (list === undefined) return { ...inputs, [path]: value };
  const rows = inputs[list] as readonly Readonly<Record<string, number>>[];
  return {
    ...inputs,
    [list]: rows.map((record, i) => (i === Number(row) ? { ...record, [key as string]: value } : record)),
  };
}
