// Makes a description of a row of any table of planets.
import type { Port } from "../graph/card.ts";
import { ThermosteadError } from "../ground/errors.ts";
import { temperaturePort } from "../law/ports.ts";
import { checkStarAndOrbit } from "../planet/agreement.ts";
import {
  BODY_PORTS,
  INTERNAL_HEAT_PORT,
  ORBIT_PORTS,
  ROTATION_PORTS,
  STAR_PORTS,
} from "../planet/fieldPorts.ts";
import { type PlanetInput, readInput } from "../planet/planetInput.ts";
import { PLANET_FORMAT } from "../planet/planetShape.ts";
import type { Lit } from "../planet/stars.ts";
import { type AppraisalNote, appraisalNote } from "./appraisalNote.ts";
import {
  type CatalogueRow,
  type Cell,
  type Column,
  cellOf,
  namesIn,
  type Refused,
  textOf,
} from "./catalogueCell.ts";
import type { CatalogueEntry, CatalogueMapping } from "./catalogueMapping.ts";
import { checkMapping, checkObject } from "./checkMapping.ts";

const { luminosity, radius, effectiveTemperature, mass } = STAR_PORTS;
const { semiMajorAxis, period, distanceInStellarRadii, flux, eccentricity } = ORBIT_PORTS;
const PORTS = {
  star: { luminosity, radius, effectiveTemperature, mass },
  orbit: { semiMajorAxis, period, distanceInStellarRadii, flux, eccentricity },
  rotation: ROTATION_PORTS,
  "": { ...BODY_PORTS, internalHeat: INTERNAL_HEAT_PORT, publishedTemperature: temperaturePort() },
} as const;

/**
 * A description of a planet from a row of any table: `mapping` says which column holds what, and in which unit. What is
 * missing is reported, not guessed; what is no number is reported and left out. Values keep their errors, so that they
 * reach the appraisal. Units are those of `UNITS`. What `mapping.assume` says counts where the row says nothing.
 *
 * Throws `unreadable` for a row or a part of a mapping that is of the wrong kind, `unknown-name` for a field that a mapping
 * does not have, `unknown-unit` and `unit-mismatch` for a unit that its field cannot have. A column that the row does not
 * have is no error, as rows may leave out what is empty: it is listed as `absent`.
 *
 * @example
 * const { description, missing } = fromCatalogueRow(
 *   { planet: "Vellamar b", teff: "4680", radius: "0.68", a: "0.46" },
 *   {
 *     name: "planet",
 *     star: { radius: { column: "radius", unit: "solRad" }, effectiveTemperature: { column: "teff", unit: "K" } },
 *     orbit: { semiMajorAxis: { column: "a", unit: "au" } },
 *   },
 * );
 */
export function fromCatalogueRow(row: CatalogueRow, mapping: CatalogueMapping): CatalogueEntry {
  checkObject(row, "row");
  checkMapping(mapping, PORTS);
  const missing: string[] = [];
  const values = new Map<string, number>();
  const refused: Refused[] = [];
  const read = (path: string, column: Column | undefined, port: Port): Cell | null => {
    if (column === undefined) return null;
    const before = refused.length;
    const cell = cellOf(row, column, refused);
    if (cell === null && refused.length === before) missing.push(path);
    const input = cell && allowed(cell, { path, column, port }, refused);
    if (input) values.set(path, input.value);
    return input && cell;
  };
  const named = (path: string, column: string | undefined) => {
    const name = textOf(row, column);
    if (name === null && column !== undefined) missing.push(path);
    return name === null ? {} : { name };
  };
  const part = (place: keyof typeof PORTS): Readonly<Record<string, Cell>> => {
    const mapped: object | undefined = place === "" ? mapping : mapping[place];
    const columns = (mapped ?? {}) as Readonly<Record<string, Column>>;
    return Object.fromEntries(
      Object.entries(PORTS[place]).flatMap(([field, port]) => {
        const cell = read(place === "" ? field : `${place}.${field}`, columns[field], port);
        return cell === null ? [] : [[field, cell]];
      }),
    );
  };
  const { assume = {} } = mapping;
  const name = named("name", mapping.name);
  const starName = named("star.name", mapping.star?.name);
  const cells = { star: part("star"), orbit: part("orbit"), rotation: part("rotation") };
  const { publishedTemperature: published = null, ...body } = part("");
  // what the row says stays, whatever is assumed of planets like it
  const joined = (place: keyof typeof cells, measured: object): object => {
    const assumed = assume[place];
    if (Array.isArray(assumed)) return { [place]: assumed };
    const fields = { ...(assumed as object | undefined), ...measured };
    return Object.keys(fields).length === 0 && place !== "orbit" ? {} : { [place]: fields };
  };
  const description = {
    format: PLANET_FORMAT,
    ...assume,
    ...name,
    ...joined("star", { ...starName, ...cells.star }),
    ...joined("orbit", cells.orbit),
    ...joined("rotation", cells.rotation),
    ...body,
  };
  return Object.freeze({
    description,
    missing,
    absent: columnsOf(mapping).filter((column) => !Object.hasOwn(row, column)),
    refused,
    publishedTemperature: published,
    notes: [
      // what is assumed is compared when the description is appraised
      ...checkStarAndOrbit(cells as Lit, (path) => values.get(path) as number, "note"),
      ...(published === null ? [] : notesOn(published, row, mapping)),
    ],
  });
}

/** The names of all columns in a mapping, each once. */
function columnsOf({ name, discovery, assume: _, ...columns }: CatalogueMapping): string[] {
  const { star = {}, orbit = {}, rotation = {}, ...own } = columns;
  const { name: starName, ...light } = star;
  const all = [light, orbit, rotation, own].flatMap((place) => Object.values(place) as Column[]);
  const texts = [name, starName, discovery?.column].filter((column) => column !== undefined);
  return [...new Set([...texts, ...all.filter((column) => column !== undefined).flatMap(namesIn)])];
}

/** Errors of a number; a unit was checked with the mapping. */
const OF_A_CELL: readonly string[] = ["out-of-range", "not-a-number"];

/** The cell in SI, if a description may hold it; a number outside of the range of its field is refused. */
function allowed(
  cell: Cell,
  { path, column, port }: { path: string; column: Column; port: Port },
  refused: Refused[],
): PlanetInput | null {
  try {
    return readInput(path, port, cell);
  } catch (error) {
    if (!(error instanceof ThermosteadError) || !OF_A_CELL.includes(error.code)) throw error;
    const name = typeof column === "string" ? column : column.column;
    const reason = `${path} is ${error.code.replace(/-/g, " ")}; allowed: ${error.allowed}`;
    refused.push({ column: name, value: cell.value, reason });
    return null;
  }
}

function notesOn(published: Cell, row: CatalogueRow, { discovery }: CatalogueMapping): AppraisalNote[] {
  const note = {
    code: "published-temperature",
    about: "publishedTemperature",
    value: published.value,
    unit: published.unit,
  } as const;
  if (discovery && textOf(row, discovery.column) === discovery.imaging) {
    const text = "the planet was imaged: its temperature is that of its own glow, not of its star's light";
    return [appraisalNote({ ...note, severity: "caution", text })];
  }
  const text =
    "tables mix surface temperatures with equilibrium temperatures for albedo 0 and for 0.3; try both";
  return [appraisalNote({ ...note, text })];
}
