// Inputs that say the same thing twice must agree, and the orbit must stay outside the star.
import { blackbodyFlux } from "../greenhouse/blackbodyFlux.ts";
import { fail } from "../ground/errors.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { distanceWays, fluxWays, luminosityWays, type Way } from "./starlight.ts";

/** How far two inputs for one quantity may lie apart: common practice, larger than rounded catalogue values differ. */
const AGREEMENT = 0.02;

/** The values of a description by path. */
export type Numbers = (path: string) => number;

/** What becomes of two inputs for one quantity that lie far apart: an error, or a caution and the first of them is used. */
export type Contradictions = "refuse" | "note";

/** Notes on inputs that agree. Throws `contradiction` with both numbers unless that is to be noted, `missing`. */
export function checkAgreement(
  d: PlanetDescription,
  numbers: Numbers,
  contradictions: Contradictions,
): PlanetNote[] {
  const compare = (ways: readonly Way[], name: string, unit: string) =>
    compared(ways, numbers, { name, unit, contradictions });
  const notes = [
    ...compare(luminosityWays(d), "luminosity", "W"),
    ...compare(distanceWays(d), "semi-major axis", "m"),
    ...compare(fluxWays(d), "flux at the semi-major axis", "W m-2"),
  ];
  return [...notes, ...checkPeriastron(d, numbers, contradictions)];
}

function compared(
  [first, ...others]: readonly Way[],
  numbers: Numbers,
  { name, unit, contradictions }: { name: string; unit: string; contradictions: Contradictions },
): PlanetNote[] {
  return others.map((other) => {
    const [used, spare] = [(first as Way).of(numbers) as number, other.of(numbers) as number];
    const [from, by] = [(first as Way).uses.join(" and "), other.uses.join(" and ")];
    if (!(Math.abs(spare - used) <= AGREEMENT * used)) {
      if (contradictions === "note") {
        const text = `${by} give another ${name} than ${from}, which is used: ${spare} against ${used} ${unit}`;
        return planetNote({
          code: "inputs-contradict",
          severity: "caution",
          about: by,
          value: spare,
          unit,
          text,
        });
      }
      fail("contradiction", {
        path: by,
        value: spare,
        allowed: `2 % around what ${from} gives, ${used}`,
        unit,
      });
    }
    const text = `${by} give the ${name} within 2 % of ${from}, which is used`;
    return planetNote({ code: "inputs-agree", about: by, value: spare, unit, text });
  });
}

/** A planet that comes as near to the star's centre as the star is large: an error, or a caution. */
function checkPeriastron(
  d: PlanetDescription,
  numbers: Numbers,
  contradictions: Contradictions,
): PlanetNote[] {
  const luminosity = luminosityWays(d)[0]?.of(numbers) as number | undefined;
  const distance = distanceOf(d, numbers, luminosity);
  const radius = radiusOf(d, numbers, luminosity);
  if (distance === undefined || radius === undefined) return [];
  const eccentricity = d.orbit.eccentricity === undefined ? 0 : numbers("orbit.eccentricity");
  const periastron = distance * (1 - eccentricity);
  if (periastron > radius) return [];
  const allowed = `a periastron a(1 − e) above the radius of the star, ${radius}`;
  if (contradictions === "refuse")
    fail("contradiction", { path: "orbit", value: periastron, allowed, unit: "m" });
  const text = `the orbit passes through the star: ${periastron} m is not ${allowed} m`;
  return [
    planetNote({
      code: "inputs-contradict",
      severity: "caution",
      about: "orbit",
      value: periastron,
      unit: "m",
      text,
    }),
  ];
}

function distanceOf(d: PlanetDescription, numbers: Numbers, luminosity?: number): number | undefined {
  const stated = distanceWays(d)[0]?.of(numbers) as number | undefined;
  if (stated !== undefined || luminosity === undefined || d.orbit.flux === undefined) return stated;
  return distanceAt({ luminosity, flux: numbers("orbit.flux") });
}

function radiusOf(d: PlanetDescription, numbers: Numbers, luminosity?: number): number | undefined {
  if (d.star?.radius !== undefined) return numbers("star.radius");
  if (d.star?.effectiveTemperature === undefined || luminosity === undefined) return undefined;
  return distanceAt({
    luminosity,
    flux: blackbodyFlux({ temperature: numbers("star.effectiveTemperature") }),
  });
}

/** Where the star has this flux: the inverse-square law from its value at 1 m. */
function distanceAt({ luminosity, flux }: { luminosity: number; flux: number }): number {
  return Math.sqrt(stellarFlux({ luminosity, distance: 1 }) / flux);
}
