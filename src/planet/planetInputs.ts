// Every numeric value of a description, read in SI under its path.
import type { ListPort, Port, Ports } from "../graph/card.ts";
import { DIFFERENCES, portsOf } from "./fieldLaws.ts";
import {
  ALBEDO_PORT,
  COVERED_PORTS,
  HEAT_CAPACITY_PORT,
  INTERNAL_HEAT_PORT,
  ORBIT_PORTS,
  REDISTRIBUTION_PORT,
  REDISTRIBUTIONS,
  STAR_PORTS,
} from "./fieldPorts.ts";
import { type PlanetInput, readInput, type Written, writtenAs } from "./planetInput.ts";
import type { PlanetDescription } from "./planetShape.ts";

export type { PlanetInput };

/** Reads all values of a description. Throws the error of the first that is wrong. */
export function planetInputs(d: PlanetDescription): PlanetInput[] {
  return [
    ...inputsIn("star", STAR_PORTS, d.star),
    ...inputsIn("orbit", ORBIT_PORTS, d.orbit),
    redistributionInput(d.redistribution),
    ...albedoInputs("albedo", d.albedo),
    ...inputsAt("longwave", undefined, d.longwave),
    ...inputsAt("heatCapacity", HEAT_CAPACITY_PORT, d.heatCapacity),
    ...inputsAt("internalHeat", INTERNAL_HEAT_PORT, d.internalHeat),
  ];
}

/** The fields of `record` that have a port, each with its path. */
function inputsIn(path: string, ports: Ports, record: object = {}): PlanetInput[] {
  const held = record as Readonly<Record<string, unknown>>;
  return Object.entries(ports).flatMap(([name, port]) =>
    inputsAt(`${path}.${name}`, port, held[name], DIFFERENCES.includes(`${held.law}.${name}`)),
  );
}

/** What stands in one place: nothing, a word, a law with its ports, a list of records, or a value. */
function inputsAt(
  path: string,
  port: Port | ListPort | undefined,
  value: unknown,
  difference = false,
): PlanetInput[] {
  if (value === undefined || value === "rest") return [];
  if (isLaw(value)) return inputsIn(path, portsOf(value.law), value);
  if (port === undefined) return [];
  if (!("each" in port)) return [readInput(path, port, value as Written, difference)];
  return (value as object[]).flatMap((record, i) => inputsIn(`${path}[${i}]`, port.each, record));
}

const albedoInputs = (path: string, albedo: PlanetDescription["albedo"]): PlanetInput[] =>
  typeof albedo === "object" && "covers" in albedo
    ? inputsIn(path, COVERED_PORTS, albedo)
    : inputsAt(path, ALBEDO_PORT, albedo);

function redistributionInput(redistribution: PlanetDescription["redistribution"]): PlanetInput {
  const factor = typeof redistribution === "string" ? REDISTRIBUTIONS[redistribution] : redistribution;
  const read = readInput("redistribution", REDISTRIBUTION_PORT, factor);
  return { ...read, written: writtenAs(redistribution) };
}

const isLaw = (value: unknown): value is { readonly law: string } =>
  typeof value === "object" && value !== null && "law" in value;
