// Makes a description of a row of any table of planets.
import type { Port } from "../graph/card.ts";
import { fail, ThermosteadError } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { temperaturePort } from "../law/ports.ts";
import { checkStarAndOrbit } from "../planet/agreement.ts";
import { exampleOf } from "../planet/examples.ts";
import { ORBIT_PORTS, STAR_PORTS } from "../planet/fieldPorts.ts";
import { type PlanetInput, readInput } from "../planet/planetInput.ts";
import { PLANET_FORMAT } from "../planet/planetShape.ts";
import type { Lit } from "../planet/stars.ts";
import { type AppraisalNote, appraisalNote } from "./appraisalNote.ts";
import { type CatalogueRow, type Cell, type Column, cellOf, type Refused, textOf } from "./catalogueCell.ts";
import type { CatalogueEntry, CatalogueMapping } from "./catalogueMapping.ts";

const { luminosity, radius, effectiveTemperature, mass } = STAR_PORTS;
const STAR = { luminosity, radius, effectiveTemperature, mass };
const { semiMajorAxis, period, distanceInStellarRadii, flux, eccentricity } = ORBIT_PORTS;
const ORBIT = { semiMajorAxis, period, distanceInStellarRadii, flux, eccentricity };
const TEMPERATURE = temperaturePort();

/**
 * A description of a planet from a row of any table: `mapping` says which column holds what, and in which unit. What is
 * missing is reported, not guessed; what is no number is reported and left out. Values keep their errors, so that they
 * reach the appraisal. Units are those of `UNITS`.
 *
 * Throws `unreadable` for a row or a mapping that is no object, `unknown-name` for a field that a mapping does not have,
 * `unknown-unit` and `unit-mismatch` for a unit that its field cannot have.
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
  checkObject(mapping, "mapping");
  checkKeys(mapping, "mapping", ["name", "star", "orbit", "publishedTemperature", "discovery", "assume"]);
  checkKeys(mapping.star ?? {}, "mapping.star", ["name", ...Object.keys(STAR)]);
  checkKeys(mapping.orbit ?? {}, "mapping.orbit", Object.keys(ORBIT));
  const missing: string[] = [];
  const values = new Map<string, number>();
  const refused: Refused[] = [];
  const read = (path: string, column: Column | undefined, port: Port): Cell | null => {
    if (column === undefined) return null;
    checkUnit(column, path, port);
    const before = refused.length;
    const cell = cellOf(row, column, `mapping.${path}`, refused);
    if (cell === null && refused.length === before) missing.push(path);
    const input = cell && allowed(cell, { path, column, port }, refused);
    if (input) values.set(path, input.value);
    return input && cell;
  };
  const part = <K extends string>(place: "star" | "orbit", ports: Readonly<Record<K, Port>>) => {
    const columns = (mapping[place] ?? {}) as Readonly<Partial<Record<K, Column>>>;
    return Object.fromEntries(
      (Object.keys(ports) as K[]).flatMap((field) => {
        const cell = read(`${place}.${field}`, columns[field], ports[field]);
        return cell === null ? [] : [[field, cell]];
      }),
    );
  };
  const { assume = {}, publishedTemperature } = mapping;
  const [name, starName] = [textOf(row, mapping.name), textOf(row, mapping.star?.name)];
  const cells = { star: part("star", STAR), orbit: part("orbit", ORBIT) };
  const star = {
    ...(starName === null ? {} : { name: starName }),
    ...cells.star,
    ...under(assume, "star"),
  };
  const orbit = { ...cells.orbit, ...under(assume, "orbit") };
  const published = read("publishedTemperature", publishedTemperature, TEMPERATURE);
  const description = {
    format: PLANET_FORMAT,
    ...(name === null ? {} : { name }),
    ...assume,
    ...(Object.keys(star).length === 0 ? {} : { star }),
    orbit,
  };
  return Object.freeze({
    description,
    missing,
    refused,
    publishedTemperature: published,
    notes: [
      // what is assumed is compared when the description is appraised
      ...checkStarAndOrbit(cells as Lit, (path) => values.get(path) as number, "note"),
      ...(published === null ? [] : notesOn(published, row, mapping)),
    ],
  });
}

/** A column of anything but pure numbers needs a unit, in every row. Throws `unit-mismatch`. */
function checkUnit(column: Column, path: string, { unit }: Port): void {
  const written = typeof column === "string" ? undefined : column?.unit;
  if (unit === "1" || written !== undefined) return;
  const allowed = `${unit}, as in { column, unit: "${exampleOf(unit).split(" ").slice(1).join(" ")}" }`;
  fail("unit-mismatch", { path: `mapping.${path}`, value: written, allowed });
}

/** Errors of a number; those of a unit are errors of the mapping. */
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

const under = (assume: Readonly<Record<string, unknown>>, place: string): object =>
  typeof assume[place] === "object" && assume[place] !== null ? assume[place] : {};

function checkObject(value: unknown, path: string): void {
  if (typeof value !== "object" || value === null || Array.isArray(value))
    fail("unreadable", { path, value, allowed: "an object" });
}
