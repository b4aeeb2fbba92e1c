// The house: which room of src stands on which floor. Imports go to a lower floor, or stay within the room.

const floors = [
  ["ground"],
  ["graph"],
  ["reading"],
  ["law", "search"],
  ["star", "orbit", "albedo", "greenhouse", "forcing", "biosphere", "carbon", "heat", "water", "habitable"],
  ["loop"],
  ["states"],
  ["feedback", "ledger"],
  ["branches", "dynamics"],
  ["planet", "chart", "formula", "sweep"],
  ["appraisal"],
];

export const floorOf: ReadonlyMap<string, number> = new Map(
  floors.flatMap((rooms, floor) => rooms.map((room): [string, number] => [room, floor])),
);

/** Rooms that may import packages, and which. */
export const packages: readonly string[] = ["mathjs", "zod"];
/** Doors stand above all rooms. */
export const doorFloor = floors.length;
export const packageFloor = floors.findIndex((rooms) => rooms.includes("planet"));
