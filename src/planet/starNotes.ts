// What is assumed of the light of the stars.
import { hasBands, visibleShareOf } from "./bands.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import { COOL_STAR } from "./coolStar.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";
import { hostsOf, starsOf } from "./stars.ts";
import { temperatureWays } from "./ways.ts";

/** A black body where nothing is known of the spectrum; one distance for all stars that the planet orbits. */
export function starNotes({ description: d, numbers }: CheckedPlanet): PlanetNote[] {
  const notes: PlanetNote[] = [];
  if (hostsOf(d).length > 1) {
    const text = "all stars that the planet orbits are taken to be at the distance of the semi-major axis";
    notes.push(planetNote({ code: "assumption", about: "star", text }));
  }
  if (!hasBands(d)) return notes;
  for (const described of starsOf(d)) {
    if (described.star.visibleShare !== undefined) continue;
    const temperature = temperatureWays(described)[0]?.of(numbers) as number;
    const cool = temperature < COOL_STAR;
    const text = `share of a black body's energy below 0.7 µm${cool ? ": a poor likeness of so cool a star" : ""}`;
    const about = `${described.path}.visibleShare`;
    const value = visibleShareOf(described, numbers) as number;
    notes.push(planetNote({ code: "assumption", severity: cool ? "caution" : "info", about, text, value }));
  }
  return notes;
}
