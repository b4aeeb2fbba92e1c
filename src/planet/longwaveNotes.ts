// What is assumed of the longwave.
import { gasOf } from "./combinations.ts";
import { forcingsOf, innerEmission, isDry } from "./outgoing.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";
import type { PlanetDescription } from "./planetShape.ts";

/** Carbon dioxide that may count twice, and heat in layers that the surface must give. */
export function longwaveNotes({ longwave, forcing }: PlanetDescription): PlanetNote[] {
  const notes: PlanetNote[] = [];
  const { written, path } = innerEmission(longwave);
  const gases = forcing === undefined ? [] : forcingsOf(forcing).map((each) => gasOf(each.written));
  if (gases.includes("CO2") && "opticalDepth" in written && isDry(written.opticalDepth)) {
    const text = "CO₂ may count twice: in this optical depth, and in the forcing against its reference";
    const about = `${path}.opticalDepth and forcing`;
    notes.push(planetNote({ code: "counted-twice", severity: "caution", about, text }));
  }
  if ("layers" in written) {
    const text =
      "the heat put into the layers is taken from the surface: it adds nothing to what the planet absorbs";
    notes.push(planetNote({ code: "assumption", about: `${path}.layers`, text }));
  }
  return notes;
}
