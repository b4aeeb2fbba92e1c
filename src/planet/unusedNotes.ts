// Notes on inputs that nothing depends on, so that nobody waits for their effect.
import type { Loop } from "../loop/types.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";

/** No number of a state depends on it; it turns margins into times. */
const FOR_MARGINS = "star.brightening";

/** One note for every input that is no given of the loop and was not compared with another. */
export function unusedNotes({ inputs, agreeing }: CheckedPlanet, loop: Loop): PlanetNote[] {
  const givens = new Set(loop.givens.map((given) => given.name));
  const compared = new Set(agreeing.flatMap((note) => note.about.split(" and ")));
  return inputs
    .filter(({ path }) => !givens.has(path) && !compared.has(path) && path !== FOR_MARGINS)
    .map(({ path, value, unit }) =>
      planetNote({ code: "input-unused", about: path, value, unit, text: reasonOf(path) }),
    );
}

function reasonOf(path: string): string {
  if (path.endsWith(".share"))
    return "the last share is what the others leave, so it cannot be set by itself";
  if (path === "orbit.eccentricity")
    return "a circular orbit without an average: the eccentricity cannot be set";
  return "given, but no number of this planet depends on it";
}
