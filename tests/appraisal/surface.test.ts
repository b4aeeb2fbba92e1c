// Water and carbon dioxide at the ends of their published lines, the thermal inertia, and the place among limits.
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { orbitAveraging } from "../../src/appraisal/orbitAveraging.ts";
import { surfacePhases } from "../../src/appraisal/surfacePhases.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";
import { firstOf, plain, snowy } from "./planets.ts";

describe("pure water", () => {
  // triple point 273.16 K and 611.657 Pa, critical point 647.096 K and 22.064 MPa: IAPWS R7-97(2012)
  it.each([
    [273.16, 611.7, "liquid"],
    [273.159, 611.7, "ice"],
    [273.16, 611.6, "vapour"],
    [273.159, 611.5, "vapour"],
    [647.096, 22.0641e6, "liquid"],
    [647.096, 22.06e6, "vapour"],
    [647.097, 22.065e6, "supercritical"],
    [647.097, 22.06e6, "vapour"],
    [29, 1e-9, "ice"],
    [250, 0, "vapour"],
  ] as const)("at %d K and %d Pa is %s", (temperature, pressure, water) => {
    expect(surfacePhases({ temperature, pressure }).water).toBe(water);
  });

  test("boils at 373.124 K under 101325 Pa", () => {
    // by the IAPWS-95 and IF97 lines, which give 99.974 °C in place of 100 °C: NIST Chemistry WebBook, from memory
    const { boilingTemperature } = surfacePhases({ temperature: 300, pressure: 101325 });
    expect(Math.abs((boilingTemperature as number) - 373.124)).toBeLessThan(5e-4);
    const at = (temperature: number) => surfacePhases({ temperature, pressure: 101325 }).water;
    expect([at(373.123), at(373.125)]).toEqual(["liquid", "vapour"]);
  });

  test("has the printed pressures of saturation", () => {
    const of = (temperature: number) => surfacePhases({ temperature, pressure: 1e5 }).saturationPressure;
    // IAPWS R7-97(2012), Table 35: p_s(300 K) = 3.53658941 kPa, p_s(500 K) = 2.63889776 MPa
    expect(Math.abs((of(300) as number) / 3536.58941 - 1)).toBeLessThan(3e-9);
    expect(Math.abs((of(500) as number) / 2638897.76 - 1)).toBeLessThan(3e-9);
    expect(of(20)).toBeNull();
    expect(of(700)).toBeNull();
  });

  test("does not boil below the triple or above the critical pressure", () => {
    expect(surfacePhases({ temperature: 300, pressure: 600 }).boilingTemperature).toBeNull();
    expect(surfacePhases({ temperature: 300, pressure: 23e6 }).boilingTemperature).toBeNull();
  });
});

describe("carbon dioxide", () => {
  test("freezes at 148 K under the pressure of Mars", () => {
    // Forget et al. 2013, Icarus 222, 81: the line of Fanale et al. 1982; 148 K at 6.1 mbar is the usual value for Mars, from memory
    const { carbonDioxideFrostPoint, carbonDioxideFreezes } = surfacePhases({
      temperature: 147,
      pressure: 610,
    });
    expect(Math.abs((carbonDioxideFrostPoint as number) - 148)).toBeLessThan(0.5);
    expect(carbonDioxideFreezes).toBe(true);
    expect(surfacePhases({ temperature: 149, pressure: 610 }).carbonDioxideFreezes).toBe(false);
  });

  test("has no frost point above its triple point", () => {
    expect(surfacePhases({ temperature: 200, pressure: 517951 })).toMatchObject({
      carbonDioxideFrostPoint: null,
      carbonDioxideFreezes: null,
    });
  });
});

test("surfaces are told where a pressure is given, also by the heat capacity of the atmosphere", () => {
  expect(appraisePlanet(plain()).states.map(({ surface }) => surface)).toEqual([null]);
  const heatCapacity = {
    law: "atmosphereCapacity",
    surfacePressure: "2 bar",
    gravity: "9 m s-2",
    specificHeat: "1000 J kg-1 K-1",
  };
  expect(firstOf(appraisePlanet(plain({ heatCapacity }))).surface?.pressure).toBe(2e5);
});

describe("thermal time over orbital period", () => {
  const loop = readPlanet(plain()).loop;
  const [state] = findStates(loop, { within: [50, 1000] }).states;
  const slope = () => 4 * 0.6 * 5.670374419e-8 * (state?.temperature as number) ** 3;
  const of = (ratio: number) =>
    orbitAveraging(loop, state as never, { heatCapacity: ratio * 1e6 * slope(), period: 1e6 });

  test("is C/(P·4εσT³) for a grey body", () => {
    const { states } = appraisePlanet(plain());
    const { thermalInertiaRatio } = firstOf({ states } as never).averaging;
    const period = appraisePlanet(plain()).starlight.period as number;
    // a derivative as recorded against one written by hand
    expect(Math.abs(((thermalInertiaRatio as number) * period * slope()) / 4.2e8 - 1)).toBeLessThan(1e-14);
  });

  // about 1 and about 0.01: Ji et al. 2023, abstract
  it.each([
    [1.001, "flux", /mean of the flux/],
    [0.999, null, /neither/],
    [0.0101, null, /neither/],
    [0.0099, "temperature", /its own mean/],
    [0, "temperature", /its own mean/],
  ] as const)("of %d favours %s", (ratio, favours, text) => {
    expect(of(ratio).favours).toBe(favours);
    expect(of(ratio).text).toMatch(text);
  });

  it.each([
    ["a period", { heatCapacity: 1e8, period: null }, "the orbital period is not known"],
    ["a heat capacity", { heatCapacity: null, period: 1e6 }, "the heat capacity is not known"],
    ["ranges", { heatCapacity: 1e8, period: 1e14 }, /beyond/],
  ])("is not told without %s", (_, given, text) => {
    const averaging = orbitAveraging(loop, state as never, given);
    expect(averaging).toMatchObject({ thermalInertiaRatio: null, favours: null });
    expect(averaging.text).toMatch(text);
  });

  it.each([
    ["2.5e8 J m-2 K-1", "flux", false],
    ["2.5e8 J m-2 K-1", "temperature", true],
    ["1e6 J m-2 K-1", "flux", true],
    ["1e3 J m-2 K-1", "flux", true],
  ])("of %s with the average of the %s: a caution is %s", (heatCapacity, average, noted) => {
    const orbit = { semiMajorAxis: "0.46 au", eccentricity: 0.3, average };
    const { notes } = appraisePlanet(plain({ heatCapacity, orbit }));
    expect(notes.some(({ code }) => code === "average-not-favoured")).toBe(noted);
  });
});

describe("the place among limits", () => {
  // Kopparapu et al. 2013 (erratum), Table 3, and 2014, Table 1: distances for the Sun, Teff 5780 K, in au;
  // from memory
  const printed = {
    "2013 recent Venus 1": 0.75,
    "2013 runaway greenhouse 1": 0.98,
    "2013 moist greenhouse 1": 0.99,
    "2013 maximum greenhouse 1": 1.69,
    "2013 early Mars 1": 1.77,
    "2014 recent Venus 1": 0.75,
    "2014 runaway greenhouse 5": 0.917,
    "2014 runaway greenhouse 1": 0.95,
    "2014 runaway greenhouse 0.1": 1.005,
    "2014 maximum greenhouse 1": 1.676,
    "2014 early Mars 1": 1.768,
  };
  const star = { luminosity: "1 solLum", effectiveTemperature: "5780 K" };
  const sunny = (fields: object = {}) => plain({ star, orbit: { semiMajorAxis: "1 au" }, ...fields });

  test("has the printed distances for the Sun", () => {
    const distances = appraisePlanet(sunny()).habitableZone.map(
      ({ name, paper, massEarths, distance }) =>
        [
          `${paper?.match(/20\d\d/)?.[0]} ${name} ${massEarths}`,
          (distance as number) / 149597870700,
        ] as const,
    );
    expect(distances.map(([name]) => name).sort()).toEqual(Object.keys(printed).sort());
    // half a unit of the last printed digit, and rounding
    for (const [name, au] of distances)
      expect(Math.abs(au - printed[name as keyof typeof printed]), name).toBeLessThanOrEqual(
        name.startsWith("2013") ? 0.005 + 1e-12 : 0.0005 + 1e-12,
      );
  });

  test("says on which side the orbit lies", () => {
    const at = (orbit: object) =>
      Object.fromEntries(
        appraisePlanet(sunny({ orbit })).habitableZone.map((l) => [`${l.name} ${l.massEarths}`, l.position]),
      );
    expect(at({ semiMajorAxis: "1.2 au" })).toMatchObject({
      "runaway greenhouse 1": "farther",
      "maximum greenhouse 1": "nearer",
    });
    expect(at({ semiMajorAxis: "1.2 au", eccentricity: 0.5 })).toMatchObject({
      "recent Venus 1": "crosses",
      "early Mars 1": "crosses",
    });
  });

  test("has the limit for the planet's own mass between those that were computed", () => {
    const limits = appraisePlanet(sunny({ mass: "2 earthMass" })).habitableZone;
    const runaway = limits.filter(({ name }) => name.startsWith("runaway greenhouse"));
    const own = runaway.at(-1);
    expect(own).toMatchObject({ name: "runaway greenhouse, interpolated here", edge: "inner" });
    expect(own?.massEarths).toBeCloseTo(2, 12);
    const [, heavy, earth] = runaway.map(({ limit }) => limit.flux) as [number, number, number];
    expect(own?.limit.flux).toBeGreaterThan(earth);
    expect(own?.limit.flux).toBeLessThan(heavy);
    expect(appraisePlanet(sunny({ mass: "8 earthMass" })).habitableZone).toHaveLength(11);
  });
});

describe("the planet's own limits", () => {
  const appraisal = appraisePlanet(snowy());
  const [brighter, fainter] = appraisal.ownLimits;

  test("are the folds of its diagram", () => {
    const now = appraisal.starlight.luminosity as number;
    const mean = appraisal.starlight.mean.flux;
    const folds = appraisal.diagram?.folds ?? [];
    expect(folds).toHaveLength(2);
    expect(appraisal.ownLimits.map(({ temperature }) => temperature)).toEqual(
      folds.map(({ temperature }) => temperature),
    );
    for (const [i, { at }] of folds.entries())
      expect(appraisal.ownLimits[i]?.limit.flux).toBe(mean * (at / now));
    expect(brighter).toMatchObject({ edge: null, paper: null, position: "farther" });
    expect(fainter).toMatchObject({ position: "nearer" });
    expect(brighter?.name).toBe("fold of the climate at 246.00 K, star brighter");
  });

  test("lie where the star gives their flux today", () => {
    for (const { limit, distance } of appraisal.ownLimits) {
      const now = { flux: appraisal.starlight.mean.flux, distance: 0.46 * 149597870700 };
      const flux = now.flux * (now.distance / (distance as number)) ** 2;
      expect(Math.abs(flux / limit.flux - 1)).toBeLessThan(1e-14);
    }
  });
});
