// Reading a description: what becomes of its values, and what the planet then says.
import { describe, expect, it, test } from "vitest";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";
import { orsolne, orsolneWith, simple } from "./orsolne.ts";

const within = [50, 1000] as const;
const statesOf = (description: unknown, at: Record<string, number> = {}) =>
  findStates(readPlanet(description).loop, { within, at }).states;
const givens = (description: unknown) =>
  Object.fromEntries(readPlanet(description).loop.givens.map(({ name, value }) => [name, value]));

/** Relative difference that a handful of rounded operations can make. */
const ROUNDING = 1e-14;
const close = (value: number, expected: number) => Math.abs(value / expected - 1);

describe("the flux", () => {
  it("is that of the Sun at 1 au: 1361.16646541 W m-2 (3.828e26 W over 4π au², worked out in Python)", () => {
    const planet = readPlanet(simple({ star: { luminosity: "1 solLum" }, orbit: { semiMajorAxis: "1 au" } }));
    expect(close(planet.flux, 1361.1664654085753)).toBeLessThan(ROUNDING);
  });
  it("is the same from radius and effective temperature", () => {
    const star = { radius: "1 solRad", effectiveTemperature: "5772 K" };
    const planet = readPlanet(simple({ star, orbit: { semiMajorAxis: "1 au" } }));
    // IAU 2015 B3: the nominal values agree to the digits of 5772 K, half a kelvin in which is 3.5e-4 of the flux
    expect(close(planet.flux, 1361.16646541)).toBeLessThan(3.5e-4);
  });
  it("comes from the period by Kepler's third law: 1 yr around the Sun is 1 au within 3e-5", () => {
    const star = { luminosity: "1 solLum", mass: "1 solMass" };
    const planet = readPlanet(simple({ star, orbit: { period: "1 yr" } }));
    // a Gaussian year is 365.2569 d, so a Julian year gives an axis smaller by 1.25e-5 and a flux larger by 2.5e-5
    expect(close(planet.flux, 1361.16646541 * (1 + 2.5e-5))).toBeLessThan(3e-6);
  });
  it("comes from the distance in stellar radii: S = σT⁴/(a/R)²", () => {
    const star = { radius: "0.5 solRad", effectiveTemperature: "4000 K" };
    const planet = readPlanet(simple({ star, orbit: { distanceInStellarRadii: 100 } }));
    expect(close(planet.flux, (5.670374419e-8 * 4000 * 4000 * 4000 * 4000) / 1e4)).toBeLessThan(ROUNDING);
  });
  it("grows with eccentricity in the mean flux: e = 0.6 gives S/0.8", () => {
    const orbit = { flux: "800 W m-2", eccentricity: 0.6, average: "flux" };
    expect(close(readPlanet(simple({ orbit })).flux, 1000)).toBeLessThan(ROUNDING);
  });
  it("falls with eccentricity in the mean temperature", () => {
    // ⟨T⟩/T(a) = 1 − e²/16 − 15e⁴/1024 (Méndez & Rivera-Valentín 2017, eq. 17, from memory); next term 1e-9 at e = 0.05
    const orbit = { flux: "1000 W m-2", eccentricity: 0.05, average: "temperature" };
    const ratio = 1 - 0.05 ** 2 / 16 - (15 * 0.05 ** 4) / 1024;
    expect(close(readPlanet(simple({ orbit })).flux, 1000 * ratio ** 4)).toBeLessThan(1e-8);
  });
});

describe("the equilibrium temperature", () => {
  it("stands with albedo and redistribution where the albedo is a number", () => {
    const { equilibriumTemperature } = readPlanet(simple());
    // (0.25·1361·0.7/5.670374419e-8)^¼ = 254.58 K; Earth's 255 K in the textbooks
    expect(equilibriumTemperature).toMatchObject({
      unit: "K",
      albedo: 0.3,
      redistribution: 0.25,
      emissivity: 1,
      internalFlux: 0,
    });
    expect(equilibriumTemperature?.value).toBeCloseTo(254.58, 2);
  });
  it("is null where the albedo answers to temperature; each state has its own", () => {
    expect(readPlanet(orsolne()).equilibriumTemperature).toBeNull();
    for (const { report } of statesOf(orsolne())) {
      const heating = 0.25 * (report.flux as number) * (1 - (report.albedo as number)) + 0.08;
      expect(close((report.equilibriumTemperature as number) ** 4, heating / 5.670374419e-8)).toBeLessThan(
        1e-13,
      );
    }
  });
  it.each([
    ["global", 1 / 4],
    ["dayside", 1 / 2],
    ["instant", 2 / 3],
    ["substellar", 1],
  ])("%s is a factor of %d", (redistribution, factor) => {
    const named = readPlanet(simple({ redistribution }));
    expect(named.assumptions.redistribution).toBe(factor);
    expect(named.equilibriumTemperature).toEqual(
      readPlanet(simple({ redistribution: factor })).equilibriumTemperature,
    );
    expect(named.loop.flows[0]?.standardName).toBe(
      factor === 1 / 4 ? "toa_net_downward_shortwave_flux" : null,
    );
  });
});

describe("the inputs", () => {
  it("become givens named by their paths, in SI, with the range of their port", () => {
    expect(Object.keys(givens(orsolne())).sort()).toEqual(
      [
        ...["star.radius", "star.effectiveTemperature", "orbit.semiMajorAxis", "orbit.eccentricity"],
        ...[
          "redistribution",
          "albedo.cold",
          "albedo.warm",
          "albedo.midpoint",
          "albedo.width",
          "internalHeat",
        ],
        ...[
          "longwave.opticalDepth",
          "heatCapacity.depth",
          "heatCapacity.density",
          "heatCapacity.specificHeat",
        ],
      ].sort(),
    );
    expect(givens(orsolne())["orbit.semiMajorAxis"]).toBe(0.46 * 149597870700);
    const cold = readPlanet(orsolne()).loop.givens.find(({ name }) => name === "albedo.cold");
    expect(cold?.within).toEqual([0, 1]);
  });
  it("keep errors and sources, in SI beside the description", () => {
    const planet = readPlanet(orsolne());
    const radius = planet.inputs.find(({ path }) => path === "star.radius");
    expect(radius).toMatchObject({ written: "0.68 +0.02 -0.02 solRad", source: "invented", unit: "m" });
    expect(close(radius?.plus as number, 0.02 * 6.957e8)).toBeLessThan(ROUNDING);
    expect(planet.description.star).toEqual(orsolne().star);
  });
  it("has errors of a temperature in degC as differences", () => {
    const albedo = { ...(orsolne().albedo as object), midpoint: { value: -7.15, unit: "degC", plus: 2 } };
    const midpoint = readPlanet(orsolneWith({ albedo })).inputs.find(
      ({ path }) => path === "albedo.midpoint",
    );
    expect(midpoint).toMatchObject({ value: 266, plus: 2, minus: null });
  });
  it("that do not count are no givens and have a note", () => {
    const planet = readPlanet(orsolneWith({ star: { ...orsolne().star, mass: "0.72 solMass" } }));
    expect(planet.loop.givens.map(({ name }) => name)).not.toContain("star.mass");
    expect(planet.notes.filter(({ code }) => code === "input-unused").map(({ about }) => about)).toEqual([
      "star.mass",
    ]);
  });
  it("that agree within 2 % give the first, and a note", () => {
    const planet = readPlanet(orsolneWith({ star: { ...orsolne().star, luminosity: "0.2 solLum" } }));
    expect(givens(planet.description)).toHaveProperty(["star.luminosity"], 0.2 * 3.828e26);
    expect(planet.notes.filter(({ code }) => code === "inputs-agree")).toHaveLength(1);
    expect(planet.notes.filter(({ code }) => code === "input-unused")).toEqual([]);
  });
});

describe("the example planet", () => {
  it("has an icy stable, an unstable and a temperate stable state", () => {
    const states = statesOf(orsolne());
    expect(states.map(({ stability }) => stability)).toEqual(["stable", "unstable", "stable"]);
    for (const { temperature, report } of states) {
      // the balance written out by hand: f S (1 − α) + 0.08 = σT⁴/(1 + ¾·0.9)
      const open = (1 + Math.tanh((temperature - 266) / 9)) / 2;
      const absorbed = 0.25 * (report.flux as number) * (1 - (0.62 - 0.34 * open));
      const emitted = (5.670374419e-8 * temperature ** 4) / (1 + 0.75 * 0.9);
      expect(Math.abs(absorbed + 0.08 - emitted)).toBeLessThan(1e-10);
    }
  });
  it("has the heat capacity of 60 m of sea water: C = 1025·3990·60 sets the e-folding time", () => {
    for (const { eFoldingTime, feedbackParameter, stability } of statesOf(orsolne())) {
      if (stability !== "stable") continue;
      expect(close((eFoldingTime as number) * -feedbackParameter, 1025 * 3990 * 60)).toBeLessThan(ROUNDING);
    }
  });
  it("keeps one state when its albedo is the number of the warm state", () => {
    const warm = statesOf(orsolne()).at(-1);
    const alone = statesOf(orsolneWith({ albedo: warm?.report.albedo }));
    expect(alone).toHaveLength(1);
    expect(close(alone[0]?.temperature as number, warm?.temperature as number)).toBeLessThan(1e-12);
  });
  it("loses its cold states under a brighter star, and its warm ones under a fainter", () => {
    const at = (factor: number) => statesOf(orsolne(), { "star.effectiveTemperature": 4680 * factor });
    expect(at(1.1).map(({ report }) => report.albedo as number)).toEqual([expect.closeTo(0.28, 2)]);
    expect(at(0.9).map(({ report }) => report.albedo as number)).toEqual([expect.closeTo(0.62, 2)]);
  });
});

describe("covers", () => {
  const covers = (...shares: readonly [number | "rest", number][]) => ({
    covers: shares.map(([share, albedo]) => ({ share, albedo })),
  });
  it("mix by area, with the rest or complete", () => {
    const expected = 0.5 * 0.1 + 0.3 * 0.6 + 0.2 * 0.25;
    for (const share of ["rest", 0.2] as const) {
      const planet = readPlanet(simple({ albedo: covers([0.5, 0.1], [0.3, 0.6], [share, 0.25]) }));
      expect(close(planet.assumptions.albedo as number, expected)).toBeLessThan(ROUNDING);
    }
  });
  it("leave every share but the last free", () => {
    const names = Object.keys(givens(simple({ albedo: covers([0.5, 0.1], [0.5, 0.6]) })));
    expect(names).toContain("albedo.covers[0].share");
    expect(names).not.toContain("albedo.covers[1].share");
    expect(names).toContain("albedo.covers[1].albedo");
    const [state] = statesOf(simple({ albedo: covers([0.5, 0.1], [0.5, 0.6]) }), {
      "albedo.covers[0].share": 1,
    });
    expect(state?.report.albedo).toBeCloseTo(0.1, 15);
  });
  it("are a plain albedo where there is one", () => {
    expect(readPlanet(simple({ albedo: covers([1, 0.4]) })).assumptions.albedo).toBe(0.4);
    expect(readPlanet(simple({ albedo: covers(["rest", 0.4]) })).assumptions.albedo).toBe(0.4);
  });
});

test("internal heat flows from the interior, and adds to what is absorbed", () => {
  const [state] = statesOf(simple({ internalHeat: "10 W m-2" }));
  expect(state?.ledger.flows).toContainEqual(
    expect.objectContaining({ name: "internalHeat", from: "interior", to: "surface", value: 10 }),
  );
  expect(state?.notes).toEqual([]);
  const heating = (0.25 * 1361 * 0.7 + 10) / (0.6 * 5.670374419e-8);
  expect(close((state?.temperature as number) ** 4, heating)).toBeLessThan(1e-13);
});

test("a planet without an input is not changed by reading, and nothing of it can be", () => {
  const description = orsolne();
  const planet = readPlanet(description);
  expect(description).toEqual(orsolne());
  expect(planet.description).toEqual(orsolne());
  expect(Object.isFrozen(planet.description.star)).toBe(true);
  expect(Object.isFrozen(description)).toBe(false);
});

test("a description survives JSON", () => {
  const once = readPlanet(orsolne());
  const again = readPlanet(JSON.parse(JSON.stringify(once.description)));
  expect(JSON.stringify(again)).toBe(JSON.stringify(once));
  expect(JSON.parse(JSON.stringify(once)).notes).toEqual(once.notes);
});
