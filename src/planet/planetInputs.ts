// Every numeric value of a description, read in SI under its path.
import type { Port } from "../graph/card.ts";
import { checkedNumber, type Range } from "../ground/range.ts";
import {
  ALBEDO_LAWS,
  ALBEDO_PORT,
  BOUND_PORT,
  COVER_PORTS,
  DIFFERENCES,
  HEAT_CAPACITY_LAWS,
  HEAT_CAPACITY_PORT,
  INTERNAL_HEAT_PORT,
  LONGWAVE_LAWS,
  ORBIT_PORTS,
  REDISTRIBUTION_PORT,
  REDISTRIBUTIONS,
  STAR_PORTS,
} from "./fieldPorts.ts";
import { inSI, mismatch } from "./inSI.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { quantityOf } from "./quantityText.ts";

/** A numeric value of a description. */
export interface PlanetInput {
  /** Where it stands, such as `star.luminosity`; the name under which it can be set and swept. */
  readonly path: string;
  readonly about: string;
  /** In `unit`, which is coherent SI. */
  readonly value: number;
  readonly unit: string;
  /** Lower and upper error in `unit`, where they are given. */
  readonly minus: number | null;
  readonly plus: number | null;
  /** The value as it is written, such as `0.61 au` or `4680 +60 -60 K`. */
  readonly written: string;
  readonly source: string | null;
  readonly within: Range | null;
}

type Written =
  | string
  | number
  | {
      readonly value: number;
      readonly unit?: string | undefined;
      readonly minus?: number | undefined;
      readonly plus?: number | undefined;
      readonly source?: string | undefined;
    };

const LAWS: Readonly<Record<string, { readonly card: { readonly inputs: object } }>> = {
  ...ALBEDO_LAWS,
  ...LONGWAVE_LAWS,
  ...HEAT_CAPACITY_LAWS,
};

/** Reads all values of a description. Throws the error of the first that is wrong. */
export function planetInputs(d: PlanetDescription): PlanetInput[] {
  const { star = {}, orbit, redistribution, albedo, longwave, heatCapacity, internalHeat } = d;
  const factor = typeof redistribution === "string" ? REDISTRIBUTIONS[redistribution] : redistribution;
  return [
    ...fields("star", STAR_PORTS, star),
    ...fields("orbit", ORBIT_PORTS, orbit),
    { ...input("redistribution", REDISTRIBUTION_PORT, factor), written: writtenAs(redistribution) },
    ...(typeof albedo === "object" && "covers" in albedo
      ? albedo.covers.flatMap((cover, i) => coverInputs(`albedo.covers[${i}]`, cover))
      : valueOrLaw("albedo", ALBEDO_PORT, albedo)),
    ...valueOrLaw("longwave", undefined, longwave),
    ...valueOrLaw("heatCapacity", HEAT_CAPACITY_PORT, heatCapacity),
    ...(internalHeat === undefined ? [] : [input("internalHeat", INTERNAL_HEAT_PORT, internalHeat)]),
  ];
}

/** The fields of `record` that have a port, each with its path. */
function fields(path: string, ports: Readonly<Record<string, Port>>, record: object): PlanetInput[] {
  const held = record as Readonly<Record<string, Written | undefined>>;
  return Object.entries(ports).flatMap(([name, port]) => {
    const value = held[name];
    if (value === undefined || name === BOUND_PORT) return [];
    const law = "law" in record ? String(record.law) : "";
    return [input(`${path}.${name}`, port, value, DIFFERENCES.includes(`${law}.${name}`))];
  });
}

function valueOrLaw(
  path: string,
  port: Port | undefined,
  value: Written | { readonly law: string },
): PlanetInput[] {
  if (typeof value === "object" && "law" in value)
    return fields(path, (LAWS[value.law]?.card.inputs ?? {}) as Readonly<Record<string, Port>>, value);
  return port ? [input(path, port, value)] : [];
}

function coverInputs(path: string, cover: { share: Written; albedo: Written }): PlanetInput[] {
  const albedo = input(`${path}.albedo`, COVER_PORTS.albedo, cover.albedo);
  return cover.share === "rest"
    ? [albedo]
    : [input(`${path}.share`, COVER_PORTS.fraction, cover.share), albedo];
}

function input(path: string, port: Port, written: Written, difference = false): PlanetInput {
  const { unit, within, about = "" } = port;
  const wanted = { unit, difference };
  const described = typeof written === "object" ? written : null;
  const read = (value: number, of: string | undefined, at: string) =>
    unit === "1" ? value : of === undefined ? mismatch(value, wanted, at) : inSI(value, of, wanted, at);
  const plain = typeof written === "string" ? quantityOf(written, unit, path) : null;
  const number = plain?.value ?? described?.value ?? written;
  const value = checkedNumber(
    read(number as number, plain?.unit ?? described?.unit, path),
    path,
    unit,
    within,
  );
  const error = (side: "minus" | "plus"): number | null => {
    const width = described?.[side];
    if (width === undefined) return null;
    const at = `${path}.${side}`;
    // the width of an error bar is a difference, in kelvin also where the value is in degrees Celsius
    const of = described?.unit === "degC" ? "K" : described?.unit;
    return checkedNumber(read(width, of, at), at, unit, [0, Number.MAX_VALUE]);
  };
  return {
    ...{ path, about, value, unit, minus: error("minus"), plus: error("plus"), written: writtenAs(written) },
    ...{ source: described?.source ?? null, within: within ?? null },
  };
}

function writtenAs(written: Written): string {
  if (typeof written !== "object") return String(written);
  const { value, unit = "1", minus, plus } = written;
  const errors = `${plus === undefined ? "" : ` +${plus}`}${minus === undefined ? "" : ` -${minus}`}`;
  return `${value}${errors}${unit === "1" ? "" : ` ${unit}`}`;
}
