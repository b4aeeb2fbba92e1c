// Notes on inputs that nothing depends on, so that nobody waits for their effect.
import type { Loop } from "../loop/types.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";

/** No number of a state depends on it; it turns margins into times. */
const forMargins = (path: string): boolean => path.endsWith(".brightening");

/** Facts that are kept for an appraisal, where the budget does not need them. */
const FACTS: readonly string[] = [
  "atmosphere.pressure",
  "atmosphere.lapseRate",
  "rotation.period",
  "mass",
  "radius",
];

/** One note for every input that is no given of the loop and was not compared with another. */
export function unusedNotes({ inputs, agreeing }: CheckedPlanet, loop: Loop): PlanetNote[] {
  const givens = new Set(loop.givens.map((given) => given.name));
  const compared = new Set(agreeing.flatMap((note) => note.about.split(" and ")));
  return inputs
    .filter(({ path }) => !givens.has(path) && !compared.has(path) && !forMargins(path))
    .map(({ path, value, unit }) =>
      planetNote({ code: "input-unused", about: path, value, unit, text: reasonOf(path) }),
    );
}

function reasonOf(path: string): string {
  if (FACTS.includes(path)) return "a fact of the planet on which no state depends";
  if (path.endsWith(".share"))
    return "the last share is what the others leave, so it cannot be set by itself";
  if (path === "orbit.eccentricity")
    return "a circular orbit without an average: the eccentricity cannot be set";
  return "given, but no number of this planet depends on it";
}
