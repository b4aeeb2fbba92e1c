// The assumptions behind every number of a planet, echoed with them.
import { CONSTANT_SET } from "../ground/constants.ts";
import { REDISTRIBUTIONS } from "./fieldPorts.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";
import type { PlanetDescription } from "./planetShape.ts";

/** What every number of a planet rests on. */
export interface PlanetAssumptions {
  /** The Bond albedo as a number, or null where it answers to temperature. */
  readonly albedo: number | null;
  /** The law of the albedo, or null where it is a number. */
  readonly albedoLaw: string | null;
  readonly redistribution: number;
  readonly eccentricity: number;
  /** What is averaged over the orbit, or null where nothing is. */
  readonly average: "flux" | "temperature" | null;
  /** W m⁻². */
  readonly internalHeat: number;
  /** The set of constants. */
  readonly constants: string;
}

/** The assumptions of a description. */
export function assumptionsOf(
  d: PlanetDescription,
  numbers: (path: string) => number | undefined,
  albedo: number,
): PlanetAssumptions {
  const law = typeof d.albedo === "object" && "law" in d.albedo ? d.albedo.law : null;
  const eccentricity = numbers("orbit.eccentricity") ?? 0;
  return {
    albedo: law === null ? albedo : null,
    albedoLaw: law,
    redistribution: numbers("redistribution") as number,
    eccentricity,
    average: eccentricity === 0 ? null : (d.orbit.average ?? null),
    internalHeat: numbers("internalHeat") ?? 0,
    constants: CONSTANT_SET,
  };
}

const SPREAD: Readonly<Record<keyof typeof REDISTRIBUTIONS, string>> = {
  global: "heat is spread over the whole sphere",
  dayside: "heat is spread evenly over the day side, and the states are those of the day side",
  instant: "heat is re-radiated where it falls, the day side as seen from the star",
  substellar: "the point under the star, without any transport of heat",
};
const MEAN_FLUX = "the time-mean of the flux, which suits a thermal time much longer than the orbital period";
const MEAN_TEMPERATURE =
  "the flux of the time-mean temperature, which suits a body without thermal inertia and with a constant albedo";

/** The assumptions as notes in plain words. */
export function assumptionNotes(a: PlanetAssumptions): PlanetNote[] {
  const note = (about: string, text: string, value: number | null = null) =>
    planetNote({ code: "assumption", about, text, value });
  const names = Object.keys(SPREAD) as (keyof typeof REDISTRIBUTIONS)[];
  const name = names.find((n) => REDISTRIBUTIONS[n] === a.redistribution);
  return [
    a.albedoLaw === null
      ? note("albedo", "Bond albedo as a number: it does not answer to the climate", a.albedo)
      : note(
          "albedo",
          `Bond albedo from ${a.albedoLaw}: it answers to temperature, so each state has its own`,
        ),
    note("redistribution", name ? SPREAD[name] : "a factor between the usual cases", a.redistribution),
    a.average === null
      ? note("orbit.average", "a circular orbit, nothing is averaged")
      : note("orbit.average", a.average === "flux" ? MEAN_FLUX : MEAN_TEMPERATURE, a.eccentricity),
    note("equilibriumTemperature", "the temperature of re-radiation with emissivity 1, not the surface's"),
  ];
}
