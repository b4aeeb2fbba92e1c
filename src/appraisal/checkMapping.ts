// A mapping is checked as a whole, whatever the row holds.
import type { Port, Ports } from "../graph/card.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { exampleOf } from "../planet/examples.ts";
import { readInput } from "../planet/planetInput.ts";
import type { CatalogueMapping } from "./catalogueMapping.ts";

/** The ports behind the columns of a mapping, by place; those of the planet itself stand at "". */
export type MappedPorts = Readonly<Record<string, Readonly<Record<string, Port>>>>;

const TEXTS: Readonly<Record<string, readonly string[]>> = { "": ["name"], star: ["name"] };

/** Throws `unreadable`, `unknown-name`, `unknown-unit`, `unit-mismatch` at the part of the mapping that is wrong. */
export function checkMapping(mapping: CatalogueMapping, ports: MappedPorts): void {
  checkObject(mapping, "mapping");
  const { "": own = {}, ...places } = ports;
  checkKeys(mapping, "mapping", ["name", ...Object.keys({ ...places, ...own }), "discovery", "assume"]);
  checkFields(mapping, "mapping", own, TEXTS[""]);
  for (const [place, fields] of Object.entries(places)) {
    const written = (mapping as Readonly<Record<string, unknown>>)[place];
    if (written === undefined) continue;
    const path = `mapping.${place}`;
    checkObject(written, path);
    checkKeys(written as object, path, [...(TEXTS[place] ?? []), ...Object.keys(fields)]);
    checkFields(written as object, path, fields, TEXTS[place]);
  }
  checkDiscovery(mapping.discovery);
  checkAssumed(mapping, Object.keys(places));
}

function checkFields(written: object, path: string, ports: Ports, texts: readonly string[] = []): void {
  for (const [field, value] of Object.entries(written)) {
    if (value === undefined) continue;
    if (texts.includes(field)) checkText(value, `${path}.${field}`, "the name of a column");
    else if (ports[field]) checkColumn(value, `${path}.${field}`, ports[field] as Port);
  }
}

/** A column of anything but pure numbers needs a unit, of which its field can have values. */
function checkColumn(column: unknown, path: string, { unit }: Port): void {
  const isPlain = typeof column === "string";
  const { column: name, ...rest } = isPlain
    ? { column }
    : ((column ?? {}) as Readonly<Record<string, unknown>>);
  if (typeof name !== "string")
    fail("unreadable", { path, value: column, allowed: "the name of a column, or { column, unit }" });
  checkKeys({ ...rest }, path, ["column", "unit", "minus", "plus"]);
  for (const side of ["minus", "plus"])
    if (rest[side] !== undefined) checkText(rest[side], `${path}.${side}`, "the name of a column");
  const written = rest.unit;
  if (written !== undefined) checkText(written, `${path}.unit`, "the text of a unit");
  if (unit === "1" ? written === undefined || written === "1" : written !== undefined) {
    // any number tells whether the unit is one of the field
    readInput(path, { symbol: "", unit }, { value: 1, unit: (written ?? "1") as string });
    return;
  }
  const example = exampleOf(unit).split(" ").slice(1).join(" ");
  const allowed =
    unit === "1" ? "a pure number, without a unit" : `${unit}, as in { column, unit: "${example}" }`;
  fail("unit-mismatch", { path, value: written, allowed });
}

function checkDiscovery(discovery: unknown): void {
  if (discovery === undefined) return;
  const path = "mapping.discovery";
  checkObject(discovery, path);
  checkKeys(discovery as object, path, ["column", "imaging"]);
  const { column, imaging } = discovery as Readonly<Record<string, unknown>>;
  checkText(column, `${path}.column`, "the name of a column");
  checkText(imaging, `${path}.imaging`, "the word in that column for imaging");
}

/** What is joined with columns must be an object; a list of stars cannot be. */
function checkAssumed({ assume, ...mapping }: CatalogueMapping, places: readonly string[]): void {
  if (assume === undefined) return;
  checkObject(assume, "mapping.assume");
  for (const place of places) {
    const isFree = (mapping as Readonly<Record<string, unknown>>)[place] === undefined;
    const value = assume[place];
    if (value !== undefined && !(isFree && Array.isArray(value)))
      checkObject(value, `mapping.assume.${place}`);
  }
}

function checkText(value: unknown, path: string, allowed: string): void {
  if (typeof value !== "string") fail("unreadable", { path, value, allowed });
}

/** Throws `unreadable` for what is no object. */
export function checkObject(value: unknown, path: string): void {
  if (typeof value !== "object" || value === null || Array.isArray(value))
    fail("unreadable", { path, value, allowed: "an object" });
}
