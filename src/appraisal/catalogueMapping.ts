// Which columns of a table hold what, and what was read of a row.
import type { AppraisalNote } from "./appraisalNote.ts";
import type { Cell, Column, Refused } from "./catalogueCell.ts";

/** Which columns of a table hold what. Whatever is left out is not read. */
export interface CatalogueMapping {
  /** Column with the name of the planet. */
  readonly name?: string;
  readonly star?: {
    /** Column with the name of the star. */
    readonly name?: string;
    readonly luminosity?: Column;
    readonly radius?: Column;
    readonly effectiveTemperature?: Column;
    readonly mass?: Column;
  };
  readonly orbit?: {
    readonly semiMajorAxis?: Column;
    readonly period?: Column;
    readonly distanceInStellarRadii?: Column;
    readonly flux?: Column;
    readonly eccentricity?: Column;
  };
  readonly rotation?: { readonly period?: Column };
  /** Mass and radius of the planet. */
  readonly mass?: Column;
  readonly radius?: Column;
  readonly internalHeat?: Column;
  /** The temperature that the table gives for the planet, whatever it means there. */
  readonly publishedTemperature?: Column;
  /** Column that says how the planet was found, and the word in it for imaging. */
  readonly discovery?: { readonly column: string; readonly imaging: string };
  /**
   * What the table does not say and you take on yourself: the other fields of a description, such as `redistribution`,
   * `albedo`, `longwave`, `heatCapacity`, or `orbit: { average: "flux" }`. What the row has stays: an assumed eccentricity
   * counts in rows without one.
   */
  readonly assume?: Readonly<Record<string, unknown>>;
}

/** A row that was read. */
export interface CatalogueEntry {
  /** For `appraisePlanet`: what the row and `assume` say, and nothing else. */
  readonly description: Readonly<Record<string, unknown>>;
  /** Fields that are mapped to a column which is empty in this row, such as `star.radius` or `name`. */
  readonly missing: readonly string[];
  /** Columns of the mapping that the row does not have at all. Where no row has one, its name is misspelt. */
  readonly absent: readonly string[];
  /** Cells that are no number, numbers that their field cannot have, and errors below 0. They are left out. */
  readonly refused: readonly Refused[];
  /** The published temperature as the table has it, with unit and errors. */
  readonly publishedTemperature: Cell | null;
  /** Luminosities and semi-major axes that agree or not, and what the published temperature may mean. */
  readonly notes: readonly AppraisalNote[];
}
