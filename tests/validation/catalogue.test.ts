// Thousands of planets of an open catalogue, when the variable THERMOSTEAD_CATALOGUE holds the path of its table.
//
// The table has one row for each planet of the Open Exoplanet Catalogue (Rein 2012, arXiv:1211.7121; census of October
// 2023, 5,414 rows). The counts were made once from the same rows by a script that does not read this library.
import { describe, expect, test } from "vitest";
import {
  ASTRONOMICAL_UNIT,
  equilibriumTemperature,
  GRAVITATION,
  REDISTRIBUTION_GLOBAL,
  SOLAR_LUMINOSITY,
  SOLAR_MASS_PARAMETER,
  SOLAR_RADIUS,
  semiMajorAxis,
  stellarFlux,
  stellarLuminosity,
} from "../../src/index.ts";
import { type Planet, positive, readCatalogue } from "./catalogue.ts";

const path = process.env.THERMOSTEAD_CATALOGUE;

/** Semi-major axis from period and mass of the star, au. */
function keplerAxis(planet: Planet): number | undefined {
  const days = positive(planet, "period_day");
  const mass = positive(planet, "star_mass_msun");
  if (!days || !mass) return undefined;
  const sun = SOLAR_MASS_PARAMETER / GRAVITATION;
  return semiMajorAxis({ period: days * 86400, mass: mass * sun }) / ASTRONOMICAL_UNIT;
}

/** Flux at the semi-major axis, W m⁻². */
function fluxOf(planet: Planet): number | undefined {
  const radius = positive(planet, "star_radius_rsun");
  const temperature = positive(planet, "star_teff_k");
  const axis = positive(planet, "semimajor_axis_au") ?? keplerAxis(planet);
  if (!radius || !temperature || !axis) return undefined;
  const luminosity = stellarLuminosity({ radius: radius * SOLAR_RADIUS, effectiveTemperature: temperature });
  return stellarFlux({ luminosity, distance: axis * ASTRONOMICAL_UNIT });
}

if (path === undefined) {
  test("without THERMOSTEAD_CATALOGUE no catalogue is compared", () => {
    console.log("catalogue of planets: not compared; set THERMOSTEAD_CATALOGUE to the path of its table");
    expect(path).toBeUndefined();
  });
} else {
  describe("catalogue of planets", () => {
    const planets = readCatalogue(path);
    const confirmed = planets.filter((planet) => planet.status === "confirmed");
    const lit = confirmed.flatMap((planet) => {
      const flux = fluxOf(planet);
      return flux === undefined ? [] : [{ planet, flux }];
    });
    /** Published temperature over ours for a black planet with heat spread over the whole sphere. */
    const ratios = lit.flatMap(({ planet, flux }) => {
      const published = positive(planet, "planet_temperature_k");
      const ours = equilibriumTemperature({ flux, albedo: 0, redistribution: REDISTRIBUTION_GLOBAL });
      return published ? [published / ours] : [];
    });
    const near = (ratio: number) => ratios.filter((r) => Math.abs(r / ratio - 1) <= 0.01).length;

    test("flux can be had for as many planets as the table's description says", () => {
      expect([planets.length, confirmed.length, lit.length]).toEqual([5414, 5288, 4349]);
    });

    test("published temperatures gather at albedo 0 and at albedo 0.3", () => {
      expect(ratios).toHaveLength(1424);
      expect(near(1)).toBe(455);
      expect(near(0.7 ** 0.25)).toBe(574);
      const median = ratios.sort((a, b) => a - b)[712] as number;
      expect(median).toBeCloseTo(0.931, 3);
    });

    test("the catalogue's Sun is at 5778 K, so that its Earth gets 1.0042 nominal fluxes", () => {
      const earth = planets.find((planet) => planet.planet === "Earth") as Planet;
      const nominal = stellarFlux({ luminosity: SOLAR_LUMINOSITY, distance: ASTRONOMICAL_UNIT });
      expect((fluxOf(earth) as number) / nominal).toBeCloseTo(1.0042, 4);
    });

    test("published axes obey Kepler's third law as often as the table's description says", () => {
      const both = confirmed.flatMap((planet) => {
        const axis = positive(planet, "semimajor_axis_au");
        const kepler = keplerAxis(planet);
        return axis && kepler ? [axis / kepler] : [];
      });
      const within = (share: number) => both.filter((r) => Math.abs(r - 1) <= share).length;
      expect([both.length, within(0.01), within(0.05)]).toEqual([2432, 1888, 2237]);
    });
  });
}
