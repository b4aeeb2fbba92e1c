// Inputs that say the same thing twice must agree, and the orbit must stay outside the stars.
import { fail } from "../ground/errors.ts";
import { approaches } from "./approaches.ts";
import { isTable, tableWays } from "./brighteningTable.ts";
import { keysOf } from "./keysOf.ts";
import { type Written, writtenAs } from "./planetInput.ts";
import { type PlanetNote, planetNote } from "./planetNote.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { fluxWays } from "./starlight.ts";
import { type Lit, starsOf } from "./stars.ts";
import { direct, distanceWays, luminosityWays, periodWays, pressureWays, type Way } from "./ways.ts";
import type { Numbers } from "./wire.ts";

/** How far two inputs for one quantity may lie apart: common practice, larger than rounded catalogue values differ. */
const AGREEMENT = 0.02;

/** A number in words; inputs that lie 2 % apart differ in few digits. */
const told = (value: number): string =>
  value >= 1e9 ? Number(value.toPrecision(6)).toExponential() : String(Number(value.toPrecision(6)));

/** What becomes of two inputs for one quantity that lie far apart: an error, or a caution and the first of them is used. */
export type Contradictions = "refuse" | "note";

/** Notes on inputs that agree. Throws `contradiction` with both numbers unless that is to be noted, `missing`. */
export function checkAgreement(
  d: PlanetDescription,
  numbers: Numbers,
  contradictions: Contradictions,
): PlanetNote[] {
  const compare = (ways: readonly Way[], name: string, unit: string) =>
    compared(ways, { d, numbers, contradictions }, { name, unit });
  return [
    ...checkStarAndOrbit(d, numbers, contradictions),
    ...compare(fluxWays(d), "flux at the semi-major axis", "W m-2"),
    ...compare(rotationWays(d), "rotation period of a locked planet", "s"),
    ...compare(pressureWays(d), "surface pressure", "Pa"),
    ...approaches(d, numbers).flatMap((approach) => checkedApproach(approach, contradictions)),
  ];
}

/** The same for luminosities and the semi-major axis alone, which can be had where a flux cannot. */
export function checkStarAndOrbit(d: Lit, numbers: Numbers, contradictions: Contradictions): PlanetNote[] {
  const from = { d, numbers, contradictions };
  const luminosity = { name: "luminosity", unit: "W" };
  const axis = { name: "semi-major axis", unit: "m" };
  return [
    ...starsOf(d).flatMap((star) =>
      compared([...luminosityWays(star), ...tableWays(star, numbers)], from, luminosity),
    ),
    ...compared(distanceWays(d), from, axis),
  ];
}

/** A locked planet turns once in an orbit. */
function rotationWays(d: PlanetDescription): Way[] {
  if (!d.rotation?.locked || d.rotation.period === undefined) return [];
  const instead = "rotation without locked";
  return [...periodWays(d), { ...direct("rotation.period"), instead }];
}

/** What is compared, and what becomes of a contradiction. */
interface Compared {
  readonly d: object;
  readonly numbers: Numbers;
  readonly contradictions: Contradictions;
}

/** A value as its author wrote it. */
function writtenAt(d: object, path: string): string {
  const at = (held: unknown, key: string | number) => (held as Readonly<Record<string, unknown>>)[key];
  const written = keysOf(path).reduce(at, d as unknown);
  return isTable(written) ? "its table, today" : writtenAs(written as Written);
}

function compared(
  [first, ...others]: readonly Way[],
  { d, numbers, contradictions }: Compared,
  { name, unit }: { readonly name: string; readonly unit: string },
): PlanetNote[] {
  return others.map((other) => {
    const [used, spare] = [(first as Way).of(numbers) as number, other.of(numbers) as number];
    const [from, by] = [(first as Way).uses.join(" and "), other.uses.join(" and ")];
    const gives = other.uses.length === 1 ? "gives" : "give";
    const as = (way: Way) => `(${way.uses.map((path) => writtenAt(d, path)).join(" and ")})`;
    if (Math.abs(spare - used) <= AGREEMENT * used) {
      const text = `${by} ${gives} the ${name} within 2 % of ${from}, which is used`;
      return planetNote({ code: "inputs-agree", about: by, value: spare, unit, text });
    }
    if (contradictions === "refuse") {
      const instead = other.instead === undefined ? "" : `${other.instead}, or `;
      const verb = (first as Way).uses.length === 1 ? "gives" : "give";
      const allowed = `${instead}2 % around what ${from} ${as(first as Way)} ${verb}, ${told(used)}`;
      fail("contradiction", { path: by, value: spare, allowed, unit });
    }
    const text = `${by} ${as(other)} ${gives} another ${name} than ${from} ${as(first as Way)}, which is used: ${told(spare)} against ${told(used)} ${unit}`;
    return contradicting({ about: by, value: spare, unit, text });
  });
}

/** A planet that comes as near to a star's centre as the star is large: an error, or a caution. */
function checkedApproach(
  { periastron, radius }: { readonly periastron: number; readonly radius: number },
  contradictions: Contradictions,
): PlanetNote[] {
  if (periastron > radius) return [];
  const allowed = `a periastron a(1 − e) above the radius of the star, ${told(radius)}`;
  const unit = "m";
  if (contradictions === "refuse") fail("contradiction", { path: "orbit", value: periastron, allowed, unit });
  const text = `the orbit passes through the star: ${told(periastron)} m is not ${allowed} m`;
  return [contradicting({ about: "orbit", value: periastron, unit, text })];
}

const contradicting = (note: Pick<PlanetNote, "about" | "value" | "unit" | "text">): PlanetNote =>
  planetNote({ code: "inputs-contradict", severity: "caution", ...note });
