// What leaves the planet: emission laws, optical depths that answer or scale, forcings.
import { describe, expect, it, test } from "vitest";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";
import { simple } from "./orsolne.ts";

const within = [50, 2500] as const;
const statesOf = (longwave: object, fields: object = {}) =>
  findStates(readPlanet(simple({ longwave, ...fields })).loop, { within }).states;
const couplingsOf = (longwave: object, fields: object = {}) =>
  readPlanet(simple({ longwave, ...fields })).loop.couplings.map(({ name }) => name);

/** f·S(1 − α) of the simple planet, W m⁻². */
const absorbed = (0.7 * 1361) / 4;
const close = (value: number | undefined, expected: number, tolerance = 1e-13) =>
  expect(Math.abs((value as number) / expected - 1)).toBeLessThan(tolerance);

describe("published lines", () => {
  it.each([
    // Budyko 1969: 202 + 1.45(T − 273.15); North 1981 in the values of North & Kim: 203.3 + 2.09
    ["budykoEmission", 273.15 + (absorbed - 202) / 1.45],
    // Koll & Cronin 2018: slope 2.2 through the present Earth
    ["kollCroninEmission", 288 + (absorbed - 240.1) / 2.2],
  ])("%s", (law, temperature) => {
    close(statesOf({ law })[0]?.temperature, temperature);
  });
  it("northEmission stands between", () => {
    expect(statesOf({ law: "northEmission" })).toHaveLength(1);
  });
});

test("a height of emission takes the lapse rate of the atmosphere, which is then no idle fact", () => {
  const longwave = { law: "heightEmission", height: "5 km" };
  const atmosphere = { lapseRate: "6 K km-1" };
  const [state] = statesOf(longwave, { atmosphere });
  // (0.25·1361·0.7/σ)^¼ = 254.58 K at 5 km, and 30 K more at the ground
  expect(state?.temperature).toBeCloseTo(254.58 + 30, 2);
  const planet = readPlanet(simple({ longwave, atmosphere }));
  expect(planet.loop.givens.map(({ name }) => name)).toContain("atmosphere.lapseRate");
  expect(planet.notes.filter(({ code }) => code === "input-unused")).toEqual([]);
});

test("leaky layers from a list: one of emissivity 1 without heating is an opaque layer, T⁴ = 2F/σ", () => {
  const layers = [{ emissivity: 1, heating: "0 W m-2" }];
  const longwave = { law: "leakyStackEmission", layers };
  const [state] = statesOf(longwave);
  close((state?.temperature as number) ** 4, (2 * absorbed) / 5.670374419e-8);
  const planet = readPlanet(simple({ longwave }));
  expect(planet.loop.givens.map(({ name }) => name)).toContain("longwave.layers[0].emissivity");
  expect(planet.notes.map(({ about }) => about)).toContain("longwave.layers");
});

describe("optical depth", () => {
  const vapour = { law: "vapourOpticalDepth", referenceTemperature: "288 K", referenceDepth: 0.8 };
  const dry = { law: "pressureOpticalDepth", referencePressure: "1 bar", referenceDepth: 0.4, exponent: 2 };
  const atmosphere = { pressure: "2 bar" };
  const column = (opticalDepth: unknown) => ({ law: "greyColumnEmission", opticalDepth });

  it("of vapour is a coupling", () => {
    expect(couplingsOf(column(vapour))).toEqual(["opticalDepth"]);
    for (const { couplings, report } of statesOf(column(vapour)))
      expect(couplings.opticalDepth).toBe(report.opticalDepth);
  });
  it("that scales with pressure is none: 0.4·2² = 1.6", () => {
    expect(couplingsOf(column(dry), { atmosphere })).toEqual([]);
    close(statesOf(column(dry), { atmosphere })[0]?.report.opticalDepth, 1.6);
    close(
      statesOf(column(dry), { atmosphere })[0]?.temperature,
      statesOf(column(1.6))[0]?.temperature as number,
    );
  });
  it("takes the pressure of the atmosphere, which is then a given", () => {
    const { loop } = readPlanet(simple({ longwave: column(dry), atmosphere }));
    const [state] = findStates(loop, { within, at: { "atmosphere.pressure": 1e5 } }).states;
    close(state?.report.opticalDepth, 0.4);
  });
  it("adds in a list, and is one coupling", () => {
    const parts = [0.1, dry, vapour];
    expect(couplingsOf(column(parts), { atmosphere })).toEqual(["opticalDepth"]);
    // a fainter star, or vapour would run away
    const fields = { atmosphere, orbit: { flux: "700 W m-2" } };
    const [state] = statesOf(column(parts), fields);
    const [alone] = statesOf(column([0.1, dry]), fields);
    close(alone?.report.opticalDepth, 1.7);
    const wet = (state?.report.opticalDepth ?? 0) - 1.7;
    // Clausius–Clapeyron with L/R_v = 2.5e6/461.5 K
    close(wet, 0.8 * Math.exp((2.5e6 / 461.5) * (1 / 288 - 1 / (state?.temperature as number))));
  });
  it("may stand below a ceiling, whose runaway lands on the hot branch", () => {
    const longwave = {
      law: "ceilingEmission",
      ceiling: "282 W m-2",
      emission: { law: "kollCroninEmission" },
    };
    const bright = statesOf(longwave, { orbit: { flux: "1800 W m-2" } });
    // 0.7·1800/4 − 282 = 33 W m⁻² are left for the glow: σ(T⁴ − 1400⁴) = 33
    expect(bright).toHaveLength(1);
    close((bright[0]?.temperature as number) ** 4, 1400 ** 4 + 33 / 5.670374419e-8);
    const below = { ...longwave, emission: column(vapour) };
    expect(couplingsOf(below)).toEqual(["opticalDepth"]);
    const names = readPlanet(simple({ longwave: below })).loop.givens.map(({ name }) => name);
    expect(names).toContain("longwave.emission.opticalDepth.referenceDepth");
  });
});

describe("forcing", () => {
  const longwave = { law: "budykoEmission" };
  const doubled = { law: "co2AdjustedForcingMyhre", concentration: 560e-6, reference: 280e-6 };
  it("reduces what leaves: a doubling of CO₂ is 5.35·ln 2 = 3.708 W m⁻² (Myhre et al. 1998)", () => {
    const [state] = statesOf(longwave, { forcing: doubled });
    const [without] = statesOf(longwave);
    expect(state?.report.forcing).toBeCloseTo(3.708, 3);
    expect((state?.temperature ?? 0) - (without?.temperature ?? 0)).toBeCloseTo(3.7083374 / 1.45, 6);
    close(state?.ledger.flows.find(({ name }) => name === "longwave")?.value, absorbed);
  });
  it("adds in a list, one law for a gas", () => {
    const methane = {
      law: "ch4EffectiveForcingAr6",
      concentration: 1866e-9,
      reference: 729e-9,
      nitrousOxide: 273e-9,
    };
    const one = statesOf(longwave, { forcing: methane })[0]?.report.forcing as number;
    const two = statesOf(longwave, { forcing: [doubled, methane] })[0]?.report.forcing as number;
    close(two, one + 5.35 * Math.log(2));
  });
  it("has a note where an optical depth may hold the same CO₂, and none where it is that of vapour", () => {
    const codes = (opticalDepth: unknown) =>
      readPlanet(simple({ longwave: { law: "greyColumnEmission", opticalDepth }, forcing: doubled }))
        .notes.filter(({ severity }) => severity === "caution")
        .map(({ code }) => code);
    const vapour = { law: "vapourOpticalDepth", referenceTemperature: "288 K", referenceDepth: 0.8 };
    expect(codes(0.9)).toEqual(["counted-twice"]);
    expect(codes([0.2, vapour])).toEqual(["counted-twice"]);
    expect(codes(vapour)).toEqual([]);
  });
});

test("beyond the runaway ceiling a wet planet lands on the hot branch, as a state that can be used", () => {
  const vapour = { law: "vapourOpticalDepth", referenceTemperature: "288 K", referenceDepth: 0.8 };
  const emission = { law: "greyColumnEmission", opticalDepth: vapour };
  const longwave = { law: "ceilingEmission", ceiling: "282 W m-2", emission };
  const states = statesOf(longwave, { orbit: { flux: "2000 W m-2" }, albedo: 0.3 });
  const hottest = states.at(-1);
  expect(hottest?.temperature).toBeGreaterThan(1400);
  expect(hottest).toMatchObject({ stability: "stable", proved: true });
});
