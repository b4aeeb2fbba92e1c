// Every numeric value of a description, read in SI under its path.
import type { ListPort, Port, Ports } from "../graph/card.ts";
import { isTable, tableReadings } from "./brighteningTable.ts";
import { allOf } from "./faults.ts";
import { isDifference, isLaw, lawNamed } from "./fieldLaws.ts";
import {
  ALBEDO_PORT,
  ATMOSPHERE_PORTS,
  BODY_PORTS,
  CLOUD_PORTS,
  COVERED_PORTS,
  HEAT_CAPACITY_PORT,
  INTERNAL_HEAT_PORT,
  ORBIT_PORTS,
  REDISTRIBUTION_PORT,
  REDISTRIBUTIONS,
  ROTATION_PORTS,
  STAR_PORTS,
  SURFACE_PORT,
  TRANSPORT_PORTS,
} from "./fieldPorts.ts";
import { type PlanetInput, readInput, type Written, writtenAs } from "./planetInput.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { type DescribedStar, starsOf } from "./stars.ts";

/** A value that is still to be read. */
type Reading = () => PlanetInput;

/** Reads all values of a description. Throws the error of the first that is wrong, with those of the others. */
export function planetInputs(d: PlanetDescription): PlanetInput[] {
  return allOf([
    ...starsOf(d).flatMap(starInputs),
    ...inputsIn("orbit", ORBIT_PORTS, d.orbit),
    ...redistributionInputs(d.redistribution),
    ...albedoInputs("albedo", ALBEDO_PORT, d.albedo),
    ...albedoInputs("surface", SURFACE_PORT, d.surface),
    ...inputsIn("clouds", CLOUD_PORTS, d.clouds),
    ...inputsIn("atmosphere", ATMOSPHERE_PORTS, d.atmosphere),
    ...inputsAt("longwave", undefined, d.longwave),
    ...inputsAt("forcing", undefined, d.forcing),
    ...inputsAt("heatCapacity", HEAT_CAPACITY_PORT, d.heatCapacity),
    ...inputsAt("internalHeat", INTERNAL_HEAT_PORT, d.internalHeat),
    ...inputsIn("rotation", ROTATION_PORTS, d.rotation),
    ...Object.entries(BODY_PORTS).flatMap(([name, port]) =>
      inputsAt(name, port, d[name as keyof typeof BODY_PORTS]),
    ),
  ]);
}

/** A brightening is a value, or a table of values. A star of a list is left out where its shape is wrong. */
function starInputs({ path, star }: Pick<DescribedStar, "path"> & Partial<DescribedStar>): Reading[] {
  const { brightening, ...values } = star ?? {};
  if (!isTable(brightening)) return inputsIn(path, STAR_PORTS, star);
  return [...inputsIn(path, STAR_PORTS, values), ...tableReadings(`${path}.brightening`, brightening)];
}

/** The fields of `record` that have a port, each with its path. */
function inputsIn(path: string, ports: Ports, record: object = {}): Reading[] {
  const held = record as Readonly<Record<string, unknown>>;
  return Object.entries(ports).flatMap(([name, port]) =>
    inputsAt(`${path}.${name}`, port, held[name], isDifference(held.law, name)),
  );
}

/** Words that stand in place of a value. */
const WORDS: readonly unknown[] = [undefined, "rest", "unknown"];

/** What stands in one place: nothing, a word, a law with its ports, a list, or a value. */
function inputsAt(
  path: string,
  port: Port | ListPort | undefined,
  value: unknown,
  difference = false,
): Reading[] {
  if (WORDS.includes(value)) return [];
  if (isLaw(value)) return inputsIn(path, lawNamed(value.law).card.inputs, value);
  if (Array.isArray(value)) {
    return value.flatMap((each: object, i) => {
      const at = `${path}[${i}]`;
      return port && "each" in port ? inputsIn(at, port.each, each) : inputsAt(at, port, each);
    });
  }
  return port === undefined || "each" in port
    ? []
    : [() => readInput(path, port, value as Written, difference)];
}

function albedoInputs(
  path: string,
  port: Port,
  albedo: PlanetDescription["albedo"] | PlanetDescription["surface"],
): Reading[] {
  if (typeof albedo === "object" && "covers" in albedo) return inputsIn(path, COVERED_PORTS, albedo);
  return inputsAt(path, port, albedo);
}

/** Left out only where its shape is wrong. */
function redistributionInputs(redistribution: PlanetDescription["redistribution"] | undefined): Reading[] {
  const path = "redistribution";
  if (redistribution === undefined) return [];
  if (typeof redistribution === "object" && "side" in redistribution)
    return inputsIn(path, TRANSPORT_PORTS, redistribution);
  const factor = typeof redistribution === "string" ? REDISTRIBUTIONS[redistribution] : redistribution;
  return [() => ({ ...readInput(path, REDISTRIBUTION_PORT, factor), written: writtenAs(redistribution) })];
}
