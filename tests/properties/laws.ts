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
export const JOINED: readonly string[] = [
  "bandFraction",
  "mixAlbedo",
  "quadraticAlbedo",
  "rampAlbedo",
  "iceShare",
  "bondAlbedo",
  "cloudyAlbedo",
  "surfaceShareBelowCloud",
  "cloudShareAbsorbed",
  "leakyStackEmission",
];

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
  "J m-2 K-1": [1e6, 1e9],
  "K m-1": [1e-3, 1e-2],
  "m2 kg-1": [1e-3, 1],
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
  height: [100, 10000],
  // together no more than all light
  reflectance: [0.05, 0.6],
  absorptance: [0.05, 0.35],
  geometric: [0.05, 0.6],
  // apart from temperatures and emissions, so that few inputs stand on a kink
  hotAbove: [50, 140],
  ceiling: [250, 600],
  phaseIntegral: [0.5, 1.6],
  exponent: [0.6, 2.5],
  radii: [2, 500],
  mass: [2e29, 1e31],
  from: [1e-6, 8e-6],
  to: [1e-5, 5e-5],
  // gases by their symbols; a forcing is smooth on either side of its reference
  "concentration C": [3e-4, 1.9e-3],
  "reference C_0": [2e-4, 2.9e-4],
  "concentration M": [9e-7, 3.5e-6],
  "reference M_0": [3.4e-7, 8e-7],
  "concentration N": [3e-7, 5e-7],
  "reference N_0": [2e-7, 2.9e-7],
  co2: [2e-4, 1.9e-3],
  // of a planet in Earth's range, short of the ends where its interpolation stops
  "mass m": [6.5e23, 2.9e25],
  sunlike: [0.3, 1.8],
  linear: [5e-5, 2e-4],
  quadratic: [1e-9, 3e-8],
  cubic: [-1e-11, -2e-12],
  quartic: [-3e-15, -4e-16],
  // inside the ends of its range, so that differences can be taken on both sides
  redistribution: [0.26, 0.95],
};

/** Numbers for a port where laws are used. */
function usual(name: string, { symbol, unit, within = [-1e300, 1e300] }: Port): fc.Arbitrary<number> {
  const range = USUAL_PORTS[`${name} ${symbol}`] ?? USUAL_PORTS[name] ?? USUAL[unit];
  if (!range) throw new Error(`no usual range for ${name} in ${unit}`);
  // inside the ends of the range, so that differences can be taken on both sides
  const [low, high] = [within[0] + 1e-3 * Math.abs(within[0]), within[1] - 1e-3 * Math.abs(within[1])];
  const [min, max] = [Math.max(range[0], low), Math.min(range[1], high)];
  // a port that allows nothing of what is usual for its unit says itself where it is used
  return fc.double(min < max ? { min, max, noNaN: true } : { min: low, max: high, noNaN: true });
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
