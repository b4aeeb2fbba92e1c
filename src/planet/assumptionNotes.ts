// The assumptions that hold for every number of a planet, in plain words.
import type { PlanetAssumptions } from "./assumptions.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import { REDISTRIBUTIONS } from "./fieldPorts.ts";
import { longwaveNotes } from "./longwaveNotes.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";
import { starNotes } from "./starNotes.ts";

const SPREAD: Readonly<Record<keyof typeof REDISTRIBUTIONS, string>> = {
  global: "heat is spread over the whole sphere",
  dayside: "heat is spread evenly over the day side, and the states are those of the day side",
  instant: "heat is re-radiated where it falls, the day side as seen from the star",
  substellar: "the point under the star, without any transport of heat",
};
const MEAN_FLUX = "the time-mean of the flux, which suits a thermal time much longer than the orbital period";
const MEAN_TEMPERATURE =
  "the flux of the time-mean temperature, which suits a body without thermal inertia and with a constant albedo";

/** Where a Bond albedo comes from that is not stated of the whole planet. */
const OF = {
  planet: "",
  surface: " of the surface",
  "surface and sky": " of surface, air and clouds together",
} as const;
const BELOW = {
  planet: "",
  surface: "; no air and no cloud reflects sunlight",
  "surface and sky": "; light goes to and fro between them any number of times",
} as const;

/** The assumptions as notes in plain words. */
export function assumptionNotes(checked: CheckedPlanet, a: PlanetAssumptions): PlanetNote[] {
  return [
    albedoNote(a),
    spreadNote(checked, a),
    orbitNote(checked, a),
    note("equilibriumTemperature", "the temperature of re-radiation with emissivity 1, not the surface's"),
    ...starNotes(checked),
    ...longwaveNotes(checked.description),
    ...(checked.description.heatCapacity === "unknown"
      ? [note("heatCapacity", "unknown: states are those of any heat capacity, times mean nothing")]
      : []),
  ];
}

function albedoNote({ albedo, albedoLaw, albedoOf }: PlanetAssumptions): PlanetNote {
  const about = albedoOf === "planet" ? "albedo" : "surface";
  const from = albedoLaw === null ? "" : ` from ${albedoLaw}`;
  return albedo === null
    ? note(
        about,
        `Bond albedo${OF[albedoOf]}${from}: it answers to temperature, so each state has its own${BELOW[albedoOf]}`,
      )
    : note(
        about,
        `Bond albedo${OF[albedoOf]}${from} as a number: it does not answer to the climate${BELOW[albedoOf]}`,
        albedo,
      );
}

/** An orbit whose eccentricity is not given is read as a circle. */
function orbitNote({ description }: CheckedPlanet, { average, eccentricity }: PlanetAssumptions): PlanetNote {
  if (description.orbit.eccentricity === undefined)
    return note("orbit.eccentricity", "circular, as none is given: nothing is averaged");
  if (average === null) return note("orbit.average", "a circular orbit, nothing is averaged");
  const text = average === "flux" ? MEAN_FLUX : MEAN_TEMPERATURE;
  return note("orbit.average", `${text} (eccentricity ${eccentricity})`);
}

function spreadNote({ description: d }: CheckedPlanet, { redistribution }: PlanetAssumptions): PlanetNote {
  const names = Object.keys(SPREAD) as (keyof typeof REDISTRIBUTIONS)[];
  const name = names.find((n) => REDISTRIBUTIONS[n] === redistribution);
  const written = d.redistribution;
  const text =
    typeof written === "object" && "side" in written
      ? `the ${written.side} side of a planet that keeps it to its star, with the stated transport of heat`
      : name
        ? SPREAD[name]
        : "a factor between the usual cases";
  return note("redistribution", text, redistribution);
}

const note = (about: string, text: string, value: number | null = null): PlanetNote =>
  planetNote({ code: "assumption", about, text, value });
