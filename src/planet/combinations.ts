// Fields that need each other, or exclude each other.
import { fail } from "../ground/errors.ts";
import { allOf } from "./faults.ts";
import { lawNamed } from "./fieldLaws.ts";
import { depthLaws, forcingsOf, innerEmission } from "./outgoing.ts";
import { type Written, writtenAs } from "./planetInput.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { companionsOf, hostsOf, starsOf } from "./stars.ts";
import { hasSky } from "./sunlight.ts";
import type { WrittenLaw } from "./wire.ts";

const missing = (path: string, allowed: string): never =>
  fail("missing", { path, value: undefined, allowed });
const contradiction = (path: string, value: unknown, allowed: string): never =>
  fail("contradiction", { path, value, allowed });

/** Throws `missing`, `contradiction`, `unreadable` or `repeated-name` for the combinations that mean nothing. */
export function checkCombinations(d: PlanetDescription): void {
  const checks = [checkReflecting, checkLayers, checkStars, checkEmission, checkForcings, checkRotation];
  allOf(checks.map((check) => () => check(d)));
}

function checkRotation({ rotation }: PlanetDescription): void {
  if (rotation && rotation.period === undefined && rotation.locked === undefined)
    missing("rotation.period", "period or locked");
}

/** A planetary albedo is given or comes out, never both. */
function checkReflecting({ albedo, surface, clouds, atmosphere }: Loose): void {
  if (albedo === undefined && surface === undefined)
    missing("albedo", "albedo, of the planet as a whole, or surface, of what lies below air and clouds");
  if (albedo === undefined) return;
  if (surface !== undefined)
    contradiction(
      "albedo",
      albedo,
      "surface without albedo: what lies below air and clouds, or the planet as a whole",
    );
  if (hasSky({ clouds, atmosphere })) {
    const allowed =
      "surface in its place: with clouds or air that act on sunlight, the planetary albedo comes out";
    contradiction("albedo", albedo, allowed);
  }
}

/** `albedo` and `surface` before it is known that one of them is there. */
type Loose = Pick<PlanetDescription, "clouds" | "atmosphere"> & {
  readonly albedo?: unknown;
  readonly surface?: unknown;
};

function checkLayers({ clouds, atmosphere, surface }: PlanetDescription): void {
  if (atmosphere?.absorptance !== undefined && atmosphere.reflectance === undefined)
    missing("atmosphere.reflectance", "what the clear sky reflects, beside what it absorbs");
  if (!clouds) return;
  const { reflectance, absorptance, emissivity, temperature } = clouds;
  const above = absorptance !== undefined || surface !== undefined;
  if (reflectance === undefined && above)
    missing("clouds.reflectance", "what the clouds reflect, above a surface of its own");
  if (emissivity !== undefined && temperature === undefined)
    missing("clouds.temperature", "the temperature of the clouds' tops, for their emission");
  if (emissivity === undefined && temperature !== undefined)
    missing("clouds.emissivity", "the emissivity of the clouds, for their emission");
  if (reflectance === undefined && emissivity === undefined)
    missing("clouds.emissivity", "emissivity with temperature, or reflectance over a surface");
}

function checkStars(d: PlanetDescription): void {
  const stars = starsOf(d);
  if (stars.length === 0) fail("unreadable", { path: "star", value: d.star, allowed: "at least one star" });
  if (hostsOf(d)[0] !== undefined && companionsOf(d).length > 0 && d.orbit.average === "temperature")
    contradiction(
      "orbit.average",
      "temperature",
      '"flux", where a star shines that the planet does not orbit',
    );
  if (hostsOf(d).length === 0)
    contradiction(
      `${stars[0]?.path}.distance`,
      writtenAs(stars[0]?.star.distance as Written),
      "one star without it, which the planet orbits",
    );
}

function checkEmission({ longwave, atmosphere }: PlanetDescription): void {
  const { written, path } = innerEmission(longwave);
  if (written.law === "heightEmission" && atmosphere?.lapseRate === undefined)
    missing("atmosphere.lapseRate", "the fall of temperature with height, for heightEmission");
  if (!("opticalDepth" in written)) return;
  const { opticalDepth } = written;
  if (Array.isArray(opticalDepth)) needOne(opticalDepth, `${path}.opticalDepth`);
  const scales = depthLaws(opticalDepth).some(({ law }) => law === "pressureOpticalDepth");
  if (scales && atmosphere?.pressure === undefined)
    missing("atmosphere.pressure", "the surface pressure, for pressureOpticalDepth");
}

/** Each gas forces once. */
function checkForcings({ forcing }: PlanetDescription): void {
  if (forcing === undefined) return;
  if (Array.isArray(forcing)) needOne(forcing, "forcing");
  const gases = forcingsOf(forcing).map(({ written }) => gasOf(written));
  const twice = gases.find((gas, i) => gases.indexOf(gas) < i);
  if (twice) fail("repeated-name", { path: "forcing", value: twice, allowed: "one law for each gas" });
}

/** The gas of a forcing: the letter of its output is F with the gas. */
export const gasOf = ({ law }: WrittenLaw): string => lawNamed(law).card.output.symbol.slice(2);

function needOne(list: readonly unknown[], path: string): void {
  if (list.length === 0) fail("unreadable", { path, value: list, allowed: "a list of at least one" });
}
