// The door of planets: descriptions in the trade's words. Needs mathjs and zod.
export type { Appraisal, AppraisalSource, AppraisedDiagram, MissingField } from "./appraisal/appraisal.ts";
export type { AppraisalNote, AppraisalNoteCode } from "./appraisal/appraisalNote.ts";
export type {
  ConventionalTemperature,
  EquilibriumTemperatures,
  PlaceTemperatures,
  Starlight,
  StatedFlux,
} from "./appraisal/appraisedLight.ts";
export type {
  OrbitAveraging,
  Sensitivity,
  StateAppraisal,
  SurfacePhases,
} from "./appraisal/appraisedState.ts";
export { type AppraisePlanetOptions, appraisePlanet } from "./appraisal/appraisePlanet.ts";
export type { CatalogueRow, Cell, Column, Refused } from "./appraisal/catalogueCell.ts";
export type { CatalogueEntry, CatalogueMapping } from "./appraisal/catalogueMapping.ts";
export { fromCatalogueRow } from "./appraisal/fromCatalogueRow.ts";
export type { StarBrightening } from "./appraisal/starBrightening.ts";
export type { StatedLimit } from "./appraisal/statedLimit.ts";
export { toMarkdown } from "./appraisal/toMarkdown.ts";
export { type AppraisalRow, toRows } from "./appraisal/toRows.ts";
export { toText } from "./appraisal/toText.ts";
export type { PlanetAssumptions } from "./planet/assumptions.ts";
export type { PlanetFacts, StarFacts } from "./planet/facts.ts";
export type { PlanetInput } from "./planet/planetInput.ts";
export type { PlanetNote, PlanetNoteCode } from "./planet/planetNote.ts";
export { type PlanetSchema, planetJsonSchema, planetSchema } from "./planet/planetSchema.ts";
export { PLANET_FORMAT, type PlanetDescription } from "./planet/planetShape.ts";
export type { Planet, PlanetEquilibriumTemperature, PlanetNames } from "./planet/planetTypes.ts";
export { type ReadPlanetOptions, readPlanet } from "./planet/readPlanet.ts";
export { UNITS, type UnitMeaning } from "./planet/units.ts";
export type { WrittenUnit } from "./planet/writtenUnits.ts";
