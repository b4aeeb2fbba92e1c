// Every planet of an open catalogue, appraised from its row, when THERMOSTEAD_CATALOGUE holds the path of its table: see
// catalogue.test.ts. The counts were made once from the same rows by a script that does not read this library.
import { describe, expect, test } from "vitest";
import { appraisePlanet, fromCatalogueRow } from "../../src/planet.ts";
import { type Planet, readCatalogue } from "./catalogue.ts";

const path = process.env.THERMOSTEAD_CATALOGUE;

const column = (name: string, unit: string) => ({
  ...{ column: name, unit },
  ...{ minus: `${name}_err_minus`, plus: `${name}_err_plus` },
});
const MAPPING = {
  name: "planet",
  star: {
    name: "star",
    radius: column("star_radius_rsun", "solRad"),
    effectiveTemperature: column("star_teff_k", "K"),
    mass: column("star_mass_msun", "solMass"),
  },
  orbit: {
    semiMajorAxis: column("semimajor_axis_au", "au"),
    period: column("period_day", "d"),
    eccentricity: column("eccentricity", "1"),
  },
  publishedTemperature: column("planet_temperature_k", "K"),
  discovery: { column: "discovery_method", imaging: "imaging" },
};

if (path === undefined) {
  test("without THERMOSTEAD_CATALOGUE no catalogue is appraised", () => {
    console.log("catalogue of planets: not appraised; set THERMOSTEAD_CATALOGUE to the path of its table");
    expect(path).toBeUndefined();
  });
} else {
  describe("the catalogue, planet by planet", () => {
    const planets = readCatalogue(path);
    const entries = planets.map((planet) => ({ planet, entry: fromCatalogueRow(planet, MAPPING) }));
    const has = (planet: Planet, ...columns: string[]) => columns.every((name) => Number(planet[name]) > 0);
    const usable = entries.filter(
      ({ planet }) =>
        has(planet, "star_radius_rsun", "star_teff_k") &&
        (has(planet, "semimajor_axis_au") || has(planet, "period_day", "star_mass_msun")),
    );
    const appraised = usable.map(({ planet, entry }) => ({
      ...{ planet, entry },
      appraisal: appraisePlanet(entry.description),
    }));
    const confirmed = appraised.filter(({ planet }) => planet.status === "confirmed");

    test("every usable row is appraised", () => {
      expect([usable.length, confirmed.length]).toEqual([4438, 4349]);
    });

    test("published temperatures gather at albedo 0 and at albedo 0.3, and most say neither", () => {
      const published = confirmed.flatMap(({ entry, appraisal }) => {
        const { publishedTemperature } = entry;
        return publishedTemperature && publishedTemperature.value > 0
          ? [{ value: publishedTemperature.value, conventional: appraisal.equilibrium.conventional }]
          : [];
      });
      expect(published).toHaveLength(1424);
      const near = (albedo: number) =>
        published.filter(({ value, conventional }) => {
          const ours = conventional.find((c) => c.albedo === albedo && c.redistribution === 0.25);
          return Math.abs(value / (ours?.value ?? Number.NaN) - 1) <= 0.01;
        }).length;
      expect([near(0), near(0.3)]).toEqual([455, 574]);
    });

    test("52 semi-major axes contradict period and mass by more than a fifth, and each is noted by name", () => {
      const noted = entries.flatMap(({ planet, entry }) =>
        entry.notes
          .filter((n) => n.code === "inputs-contradict" && n.unit === "m")
          .map((note) => ({ planet, note })),
      );
      expect(noted.length).toBeGreaterThan(52);
      for (const { note } of noted) expect(note.about).toBe("orbit.period and star.mass");
      const far = noted.filter(({ planet, note }) => {
        const axis = Number(planet.semimajor_axis_au) * 149597870700;
        return Math.abs(axis / (note.value as number) - 1) > 0.2;
      });
      expect(new Set(far.map(({ planet }) => planet.planet)).size).toBe(52);
    });

    test("61 imaged planets have a temperature of their own, and each is noted by name", () => {
      const glows = ({ code, severity }: { code: string; severity: string }) =>
        code === "published-temperature" && severity === "caution";
      const glowing = entries.filter(({ entry }) => entry.notes.some(glows));
      expect(glowing).toHaveLength(61);
      expect(new Set(glowing.map(({ entry }) => entry.description.name)).size).toBe(61);
    });

    test("an error below 0 is refused by name", () => {
      const refused = entries.filter(({ entry }) => entry.refused.length > 0);
      expect(refused.map(({ entry }) => entry.description.name)).toContain("WASP-117 b");
    });
  });
}
