import { max, min } from "../ground/elementary/minMax.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber } from "../ground/range.ts";
import { eccentricityPort } from "../law/ports.ts";
import { angleFrom } from "./angleFrom.ts";

/** An orbit and two fluxes in units of the flux at the distance of its semi-major axis. */
export interface FluxLimits {
  /** Orbital eccentricity, 0 to 0.9999. */
  readonly eccentricity: number;
  /** Least flux over S(a), from 0. */
  readonly low: number;
  /** Greatest flux over S(a), not below `low`. */
  readonly high: number;
}

const PI = 3.141592653589793;

/**
 * Share of its time in which a planet on an eccentric orbit receives between two fluxes, both included:
 * low ≤ S/S(a) ≤ high. No unit, 0 to 1.
 *
 * S/S(a) = (a/r)² and r = a(1 − e·cos E), so that each limit is an eccentric anomaly E, and Kepler's equation
 * M = E − e·sin E gives the time. This is a share of the time: a share of the angle overstates what lies near the star.
 * A circular orbit is inside or it is not: 1 or 0. An ordinary function, not a law: it has a corner at each end of the
 * orbit and a jump at e = 0. Its own rounding is below 10⁻¹⁵; within 10⁻⁸ of the flux at periastron or apoastron the
 * rounding of the limits themselves counts for more.
 * Throws `missing`, `unknown-name`, `not-a-number`, `out-of-range` (also for `high` below `low`), `unreadable`.
 * Source: Kepler's second law.
 */
export function fluxTimeShare(limits: FluxLimits): number {
  const { eccentricity, low, high } = checked(limits);
  if (eccentricity === 0) return low <= 1 && 1 <= high ? 1 : 0;
  return max(0, timeAbove(low, eccentricity) - timeAbove(high, eccentricity));
}

/** Share of the time in which S/S(a) is at least `flux`. */
function timeAbove(flux: number, e: number): number {
  const below = max(0, min(1, halfVersine(flux, e)));
  const along = Math.sqrt(1 - below);
  const across = Math.sqrt(below);
  const anomaly = 2 * angleFrom({ along, across });
  return (anomaly - 2 * e * along * across) / PI;
}

/** sin²(E/2) = (r/a − (1 − e))/2e where the planet receives `flux`; beyond 0 and 1 where it never does. */
function halfVersine(flux: number, e: number): number {
  const root = Math.sqrt(flux);
  if (flux > 4) return (1 / root - (1 - e)) / (2 * e);
  // 1 − r/a without cancellation where the flux is near that at r = a
  return (1 - (flux - 1) / (flux + root) / e) / 2;
}

function checked(limits: FluxLimits): FluxLimits {
  const path = "fluxTimeShare";
  if (typeof limits !== "object" || limits === null)
    fail("unreadable", { path, value: limits, allowed: "an object with eccentricity, low and high" });
  checkKeys(limits, path, ["eccentricity", "low", "high"]);
  const { unit, within } = eccentricityPort();
  const eccentricity = checkedNumber(limits.eccentricity, `${path}.eccentricity`, unit, within);
  const low = checkedNumber(limits.low, `${path}.low`, "1", [0, 1e12]);
  const high = checkedNumber(limits.high, `${path}.high`, "1", [low, 1e12]);
  return { eccentricity, low, high };
}
