// Notes on inputs that nothing depends on, so that nobody waits for their effect.
import type { Loop } from "../loop/types.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";
import { starsOf } from "./stars.ts";

/** No number of a state depends on it; it turns margins into times. */
const forMargins = (path: string): boolean => /\.brightening\b/.test(path);

/** Facts that are kept for an appraisal, where the budget does not need them. */
const FACTS: readonly string[] = [
  "atmosphere.pressure",
  "atmosphere.lapseRate",
  "rotation.period",
  "mass",
  "radius",
];

/** Margins follow the light of one star. */
const SEVERAL = "given, but several stars shine: how far one may brighten or fade is not told";

/** One note for every input that is no given of the loop and was not compared with another. */
export function unusedNotes({ description, inputs, agreeing }: CheckedPlanet, loop: Loop): PlanetNote[] {
  const stars = starsOf(description);
  const brightening = stars.length < 2 ? [] : stars.filter(({ star }) => star.brightening !== undefined);
  const givens = new Set(loop.givens.map((given) => given.name));
  const compared = new Set(agreeing.flatMap((note) => note.about.split(" and ")));
  const unused = inputs
    .filter(({ path }) => !givens.has(path) && !compared.has(path) && !forMargins(path))
    .map(({ path, value, unit }) =>
      planetNote({ code: "input-unused", about: path, value, unit, text: reasonOf(path) }),
    );
  const idle = brightening.map(({ path }) =>
    planetNote({ code: "input-unused", about: `${path}.brightening`, text: SEVERAL }),
  );
  return [...unused, ...idle];
}

function reasonOf(path: string): string {
  if (FACTS.includes(path)) return "a fact of the planet on which no state depends";
  if (path.endsWith(".share"))
    return "the last share is what the others leave, so it cannot be set by itself";
  if (path === "orbit.eccentricity")
    return "a circular orbit without an average: the eccentricity cannot be set";
  return "given, but no number of this planet depends on it";
}
