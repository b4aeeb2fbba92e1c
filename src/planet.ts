// The door of planets: descriptions in the trade's words. Needs mathjs and zod.
export type { PlanetAssumptions } from "./planet/assumptions.ts";
export type { PlanetFacts, StarFacts } from "./planet/facts.ts";
export type { PlanetInput } from "./planet/planetInput.ts";
export type { PlanetNote, PlanetNoteCode } from "./planet/planetNote.ts";
export { type PlanetSchema, planetJsonSchema, planetSchema } from "./planet/planetSchema.ts";
export { PLANET_FORMAT, type PlanetDescription } from "./planet/planetShape.ts";
export type { Planet, PlanetEquilibriumTemperature, PlanetNames } from "./planet/planetTypes.ts";
export { type ReadPlanetOptions, readPlanet } from "./planet/readPlanet.ts";
export { UNITS, type UnitMeaning } from "./planet/units.ts";
